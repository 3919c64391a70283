import type { GroupProof } from '../bound/certify.ts';
import type { Budget } from '../choose/budget.ts';
import type { Trial } from '../choose/choose.ts';
import { judgeOf, type Task, type Variant } from '../choose/variant.ts';
import { codeSize } from '../cost/code-size.ts';
import { emitDeclarations } from '../emit/declarations.ts';
import { digest } from '../files/digest.ts';
import { toolVersion } from '../files/version.ts';
import { printFormula } from '../formula/text.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { FULL_EFFORT, type Observed } from '../observe/observe.ts';
import {
  type AnatomyEntry,
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

/** Lines that the anatomy names for each output. */
const ANATOMY = 10;

/** Everything that stands in the folder of a variant, as text by file name. */
export async function variantFiles(
  task: Task,
  budget: Budget,
  { variant, observed, proofs }: Trial,
): Promise<ReadonlyMap<string, string>> {
  const errors = Object.fromEntries(
    observed.map((seen) => {
      const proof = proofs.find((candidate) => candidate.group === seen.group)!;
      return [ERROR_KEY_OF_GROUP[seen.group]!, errorEntry(seen, proof, budget)] as const;
    }),
  );
  const certificate = await composeCertificate(task, variant, errors, proofs);
  const worst = Object.fromEntries(observed.map((entry) => [entry.group, entry.worst]));
  return new Map([
    [FILES.code, variant.code],
    [FILES.types, emitDeclarations(variant.kernel, task.model.units)],
    [FILES.certificate, json(certificate)],
    [FILES.worst, json(worst)],
  ]);
}

/** The certificate of a variant whose code is final. */
async function composeCertificate(
  task: Task,
  variant: Variant,
  error: Certificate['error'],
  proofs: readonly GroupProof[],
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
    anatomy: proofs.flatMap((proof) => anatomyOf(kernel, proof)),
    operations: cost,
    state: { words: kernel.state.length, bytes: variant.stateBytes },
    code: await codeSize(code),
    effort: FULL_EFFORT,
    assumptions: ASSUMPTIONS,
    digest: {
      kernel: digest(code),
      model: digest(printFormula(task.formula)),
      outputs: outputsDigest(await judgeOf(task, variant), task.domain, names),
    },
    caution: CAUTION,
  };
}

/** The lines with the largest shares in the bound of an output. */
export function anatomyOf(kernel: Kernel, { group, shares }: GroupProof): readonly AnatomyEntry[] {
  return [...shares]
    .sort((a, b) => b[1] - a[1] || a[0] - b[0])
    .slice(0, ANATOMY)
    .map(([line, share]) => ({
      output: group,
      line: kernel.lines[line]!.name,
      share: Number(share.toPrecision(3)),
    }));
}

/** What is certified and observed of an output group. */
function errorEntry(observed: Observed, proof: GroupProof, budget: Budget): ErrorEntry {
  const key = ERROR_KEY_OF_GROUP[observed.group] as keyof Budget['error'];
  const part = (axis: 0 | 1 | 2) =>
    observed.parts === null
      ? null
      : { certified: proof.axes?.[axis] ?? null, observed: observed.parts[axis] };
  return {
    certified: proof.bound,
    observed: observed.size,
    limit: proof.limit,
    allowed: budget.error[key]!,
    certified_to_observed: Number((proof.bound / observed.size).toPrecision(4)),
    certified_to_limit: Number((proof.bound / proof.limit).toPrecision(4)),
    boxes: proof.boxes,
    at: observed.at,
    radial: part(0),
    along: part(1),
    cross: part(2),
  };
}

function json(value: unknown): string {
  return `${JSON.stringify(value, null, 2)}\n`;
}
