import type { Budget } from '../choose/budget.ts';
import { describeVariant, judgeOf, type Task, type Variant } from '../choose/variant.ts';
import { codeSize } from '../cost/code-size.ts';
import { emitDeclarations } from '../emit/declarations.ts';
import { digest } from '../files/digest.ts';
import { toolVersion } from '../files/version.ts';
import { printFormula } from '../formula/text.ts';
import { type Effort, FULL_EFFORT, type Observed } from '../observe/observe.ts';
import {
  ASSUMPTIONS,
  CAUTION,
  type Certificate,
  ERROR_KEY_OF_GROUP,
  type ErrorEntry,
} from './certificate.ts';
import { outputsDigest } from './outputs-digest.ts';

/** Names of the files that stand together in the folder of a variant. */
export const FILES = {
  code: 'kernel.js',
  types: 'kernel.d.ts',
  certificate: 'certificate.json',
  worst: 'worst.json',
} as const;

/** One sentence on the error of an output group, for doc blocks: the figure is rounded up. */
export function errorSentence(key: string, entry: Pick<ErrorEntry, 'certified' | 'observed'>): string {
  return `Error ${key}: ${ceilTo3(entry.observed)} observed, not yet certified.`;
}

/** Everything that stands in the folder of a variant, as text by file name. */
export async function variantFiles(
  task: Task,
  budget: Budget,
  variant: Variant,
  observed: readonly Observed[],
): Promise<ReadonlyMap<string, string>> {
  const entries = observed.map(
    (entry) => [ERROR_KEY_OF_GROUP[entry.group]!, errorEntry(entry, budget)] as const,
  );
  const final = describeVariant(
    task,
    variant.kernel,
    entries.map(([key, entry]) => errorSentence(key, entry)),
  );
  const certificate = await certify(task, final, Object.fromEntries(entries));
  const worst = Object.fromEntries(observed.map((entry) => [entry.group, entry.worst]));
  return new Map([
    [FILES.code, final.code],
    [FILES.types, emitDeclarations(final.kernel, task.model.units)],
    [FILES.certificate, json(certificate)],
    [FILES.worst, json(worst)],
  ]);
}

/** The certificate of a variant whose code is final. */
async function certify(
  task: Task,
  variant: Variant,
  error: Certificate['error'],
  effort: Effort = FULL_EFFORT,
): Promise<Certificate> {
  const { kernel, code, cost } = variant;
  const names = task.formula.inputs.map((input) => input.name);
  return {
    schema: 'bound-orbit certificate 1',
    tool: toolVersion(),
    model: kernel.model,
    choices: kernel.choices,
    domain: {
      name: task.domainName,
      ranges: Object.fromEntries(
        task.formula.inputs.map(({ name, unit }) => [name, { ...task.domain[name]!, unit }]),
      ),
    },
    error,
    anatomy: [],
    operations: cost,
    state: { words: kernel.state.length, bytes: variant.stateBytes },
    code: await codeSize(code),
    effort,
    assumptions: ASSUMPTIONS,
    digest: {
      kernel: digest(code),
      model: digest(printFormula(task.formula)),
      outputs: outputsDigest(await judgeOf(task, variant), task.domain, names),
    },
    caution: CAUTION,
  };
}

function errorEntry(observed: Observed, budget: Budget): ErrorEntry {
  const [radial, along, cross] = observed.parts ?? [null, null, null];
  const key = ERROR_KEY_OF_GROUP[observed.group] as keyof Budget['error'];
  return {
    certified: null,
    observed: observed.size,
    limit: budget.error[key] ?? null,
    at: observed.at,
    radial,
    along,
    cross,
  };
}

function json(value: unknown): string {
  return `${JSON.stringify(value, null, 2)}\n`;
}

function ceilTo3(x: number): string {
  const short = Number(x.toPrecision(3));
  return (short >= x ? short : Number((x * 1.005).toPrecision(3))).toPrecision(3);
}
