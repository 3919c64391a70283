import { readFileSync } from 'node:fs';
import * as v from 'valibot';
import { type Finding, InputError } from '../../src/finding.ts';

/** Arithmetic of setup and tick that a budget can allow. */
export type Arithmetic = 'f64' | 'f64-setup-f32-tick' | 'f32';

/** What a team allows one kernel. */
export interface Budget {
  readonly model: string;
  readonly domain: string;
  /** Largest error allowed to each output wanted; outputs without a limit are not generated. */
  readonly error: { readonly position_m?: number | undefined; readonly clock_s?: number | undefined };
  /** Arithmetic that the part and its engine have; all when not given. */
  readonly arithmetic?: readonly Arithmetic[] | undefined;
  readonly tick_operations?: number | undefined;
  readonly setup_operations?: number | undefined;
  readonly state_bytes?: number | undefined;
  readonly code_bytes?: number | undefined;
  readonly minified_bytes?: number | undefined;
}

const amount = v.pipe(v.number(), v.finite(), v.gtValue(0, 'must be above zero'));

const entries = {
  model: v.string(),
  domain: v.string(),
  error: v.pipe(
    v.strictObject({ position_m: v.optional(amount), clock_s: v.optional(amount) }),
    v.check((error) => Object.keys(error).length > 0, 'must limit at least one output: position_m, clock_s'),
  ),
  arithmetic: v.optional(
    v.pipe(
      v.array(v.picklist(['f64', 'f64-setup-f32-tick', 'f32'])),
      v.minLength(1, 'must allow at least one arithmetic'),
    ),
  ),
  tick_operations: v.optional(amount),
  setup_operations: v.optional(amount),
  state_bytes: v.optional(amount),
  code_bytes: v.optional(amount),
  minified_bytes: v.optional(amount),
};

/** Output groups that a budget asks for, by the key that limits their error. */
export const ERROR_KEYS: Readonly<Record<keyof Budget['error'], string>> = {
  position_m: 'position',
  clock_s: 'clock',
};

/**
 * Reads a budget file.
 *
 * @throws InputError with one finding for each fault, its place being the path inside the JSON
 */
export function readBudget(file: string): Budget {
  let text: string;
  try {
    text = readFileSync(file, 'utf8');
  } catch {
    throw new InputError(fault(file, 'budget.missing', 'the file cannot be read', 'Correct the path.'));
  }
  if (text.trim() === '')
    throw new InputError(
      fault(file, 'budget.empty', 'the budget is empty', 'Write model, domain and error.'),
    );
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch (error) {
    throw new InputError(
      fault(file, 'budget.syntax', `not JSON: ${(error as Error).message}`, 'Mend the syntax.'),
    );
  }
  const result = v.safeParse(v.strictObject(entries), json);
  if (result.success) return result.output;
  throw new InputError(
    ...result.issues.map((issue) =>
      fault(
        file,
        'budget.value',
        `${v.getDotPath(issue) ?? 'the budget'}: ${issue.message}`,
        `Known keys are ${Object.keys(entries).join(', ')}.`,
      ),
    ),
  );
}

function fault(file: string, code: string, what: string, remedy: string): Finding {
  return {
    code,
    place: { file },
    what,
    why: 'A budget is a JSON record whose keys carry their units.',
    remedy,
  };
}
