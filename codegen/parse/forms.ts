import { isRounded, type Operation } from '../kernel/kernel.ts';
import { type Token, tokensOf } from './tokens.ts';

/** A hole of a form: what may stand there. */
type Hole = 'name' | 'field' | 'number' | 'operand';

/** One line of an emitted file, token by token; a hole takes one token, or two where a number has a sign. */
export interface Form {
  readonly text: string;
  readonly parts: readonly (string | { readonly hole: Hole })[];
}

/** What fills the holes of a form, in order; a negative number is one token here. */
export type Filled = readonly Token[];

/** How far a line fits a form: the token at which it does not, and what had to stand there. */
export interface Misfit {
  readonly at: number;
  readonly due: string;
}

export const FROUND: Form = form('const fround = Math.fround;');
export const STATE_WORDS: Form = form('export const stateWords = $number;');
export const SETUP: Form = form('export function setup(elements, state) {');
export const POSITION: Form = form('export function position(t, state, out) {');
export const CLOSE: Form = form('}');

export const CLEAR: Form = form('state[$number] = 0;');
export const READ: Form = form('const $name = elements.$field;');
export const ROUND: Form = form('const $name = fround($name);');
export const CHECK: Form = form(
  'if (!($name >= $number && $name <= $number)) return $name - $name === 0 ? $number : $number;',
);
export const ROUNDED_CHECK: Form = form(
  'if (!($name >= $number && $name <= $number)) return fround($name - $name) === 0 ? $number : $number;',
);
export const STORE: Form = form('state[$number] = $name;');
export const LOAD: Form = form('const $name = state[$number];');
export const GUARD: Form = form('if (!($name > 0)) return $number;');
export const OUTPUT: Form = form('out[$number] = $operand;');
export const RETURN: Form = form('return $number;');

/** The form of an assignment: its operation, and whether the result is rounded to float32. */
export interface Assignment {
  readonly form: Form;
  readonly operation: Exclude<Operation, 'constant' | 'input'>;
  readonly rounded: boolean;
}

const EXPRESSIONS: Readonly<Record<Exclude<Assignment['operation'], 'round'>, string>> = {
  add: '$operand + $operand',
  sub: '$operand - $operand',
  mul: '$operand * $operand',
  div: '$operand / $operand',
  neg: '-$name',
  sqrt: 'Math.sqrt($operand)',
  abs: 'Math.abs($operand)',
  floor: 'Math.floor($operand)',
  select: '$operand < $operand ? $operand : $operand',
};

/** All assignments: one operation each; only those that round take a rounding to float32 with it. */
export const ASSIGNMENTS: readonly Assignment[] = [
  { form: ROUND, operation: 'round', rounded: true },
  ...(Object.keys(EXPRESSIONS) as (keyof typeof EXPRESSIONS)[]).flatMap((operation) => {
    const text = EXPRESSIONS[operation];
    const plain = { form: form(`const $name = ${text};`), operation, rounded: false };
    if (!isRounded(operation)) return [plain];
    return [plain, { form: form(`const $name = fround(${text});`), operation, rounded: true }];
  }),
];

/** Compares the tokens of a line with a form: no token of either may be left over. */
export function fitLine(form: Form, tokens: readonly Token[]): Filled | Misfit {
  const filled: Token[] = [];
  let at = 0;
  for (const part of form.parts) {
    if (typeof part === 'string') {
      if (tokens[at]?.kind === 'other' || tokens[at]?.text !== part) return { at, due: part };
      at++;
      continue;
    }
    const filling = fill(part.hole, tokens, at);
    if (filling === undefined) return { at, due: `a ${part.hole}` };
    at += filling.length;
    filled.push(joined(filling));
  }
  return at === tokens.length ? filled : { at, due: 'the end of the line' };
}

/** Whether a line fits. */
export function isFilled(result: Filled | Misfit): result is Filled {
  return !('due' in result);
}

function fill(hole: Hole, tokens: readonly Token[], at: number): readonly Token[] | undefined {
  const [first, second] = [tokens[at], tokens[at + 1]];
  const kind = first?.kind;
  if (hole === 'field') return kind === 'name' || kind === 'word' ? [first!] : undefined;
  if (kind === 'name') return hole === 'number' ? undefined : [first!];
  if (hole === 'name') return undefined;
  if (kind === 'number') return [first!];
  return first?.text === '-' && second?.kind === 'number' ? [first, second] : undefined;
}

function joined(filling: readonly Token[]): Token {
  const [first, second] = filling as readonly [Token, Token?];
  return second === undefined ? first : { ...second, ...first, text: `-${second.text}`, kind: 'number' };
}

/** Reads a form from its text, in which `$` starts a hole. */
function form(text: string): Form {
  const parts = tokensOf(text).map((token) =>
    token.text.startsWith('$') ? { hole: token.text.slice(1) as Hole } : token.text,
  );
  return { text: text.replaceAll('$', ''), parts };
}
