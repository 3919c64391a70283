import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Finding } from '../../src/finding.ts';
import { InputError } from '../../src/finding.ts';
import { certify, type GroupProof, PROOF_EFFORT } from '../bound/certify.ts';
import { remarksOf } from '../choose/remarks.ts';
import { taskOf } from '../choose/task.ts';
import { describeVariant, makeVariant, type Task, type Variant } from '../choose/variant.ts';
import { codeSize } from '../cost/code-size.ts';
import { digest } from '../files/digest.ts';
import { printFormula } from '../formula/text.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { Judge } from '../observe/judge.ts';
import { importKernel } from '../observe/module.ts';
import type { Worst } from '../observe/observe.ts';
import { compareKernel } from '../parse/compare.ts';
import { parseKernel } from '../parse/parse.ts';
import type { ParsedKernel } from '../parse/parsed.ts';
import { toKernel } from '../parse/to-kernel.ts';
import { type Certificate, ERROR_KEY_OF_GROUP } from './certificate.ts';
import { anatomyOf, FILES } from './files.ts';
import { outputsDigest } from './outputs-digest.ts';

/** What a recheck found. */
export interface Recheck {
  readonly findings: readonly Finding[];
  /** What was proven of the file's own lines; empty when they are not those of the model. */
  readonly proofs: readonly GroupProof[];
}

/**
 * Checks the files of a variant against the model, from scratch: the model is lowered again and the emitted text, read
 * back into lines, compared with it; the error of the lines that stand in the file is proven again; operations and sizes
 * are counted, outputs computed and the worst inputs replayed.
 *
 * @param folder the variant's folder
 * @param progress told the share of the proof that is done
 * @throws InputError when a file is missing or is no certificate
 */
export async function recheck(
  folder: string,
  progress: (share: number) => void = () => {},
): Promise<Recheck> {
  const certificate = parse<Certificate>(folder, FILES.certificate);
  const worst = parse<Record<string, readonly Worst[]>>(folder, FILES.worst);
  const code = read(folder, FILES.code);
  const allowed = Object.fromEntries(
    Object.entries(certificate.error).map(([key, entry]) => [key, entry.allowed]),
  );
  const source = join(folder, FILES.certificate);
  const task = taskOf({ model: certificate.model, domain: certificate.domain.name, error: allowed }, source);
  const expected = makeVariant(task, certificate.choices);
  const file = join(folder, FILES.code);
  const { parsed, findings: lines } = compareLines(file, code, expected);
  const facts = [
    ...(await compareCertificate(folder, certificate, task, expected, code)),
    ...(await replay(folder, certificate, task, worst, code)),
  ];
  const others = lines.some((finding) => finding.code !== 'parse.other-constant');
  if (parsed === undefined || others) return { findings: [...lines, ...facts], proofs: [] };
  const kernel = toKernel(parsed, expected.kernel);
  const proofs = certify({ ...expected.lowered, kernel }, PROOF_EFFORT, progress);
  const remarks = remarksOf(kernel, certificate.error, proofs);
  const { code: due } = describeVariant(task, expected.lowered, remarks);
  const text = lines.length > 0 ? lines : compareText(file, code, due);
  return { findings: [...text, ...facts, ...compareProof(folder, certificate, kernel, proofs)], proofs };
}

/** What was proven again beside what is stated. */
function compareProof(
  folder: string,
  certificate: Certificate,
  kernel: Kernel,
  proofs: readonly GroupProof[],
): readonly Finding[] {
  const anatomy = proofs.flatMap((proof) => anatomyOf(kernel, proof));
  const bounds = proofs.flatMap(({ group, bound, limit, boxes, axes }) => {
    const stated = certificate.error[ERROR_KEY_OF_GROUP[group]!]!;
    const parts = [stated.radial, stated.along, stated.cross].map((part) => part?.certified ?? null);
    return [
      ['certified', stated.certified, bound],
      ['limit', stated.limit, limit],
      ['boxes', stated.boxes, boxes],
      ['certified radial, along, cross', parts, axes ?? [null, null, null]],
    ].map(([name, have, want]) => [`${group}: ${name}`, have, want] as const);
  });
  return compareFacts(folder, [...bounds, ['anatomy', certificate.anatomy, anatomy]]);
}

/** The rest of a text whose lines are those of the model: names and comments. */
function compareText(file: string, code: string, expected: string): readonly Finding[] {
  if (code === expected) return [];
  const [have, want] = [code.split('\n'), expected.split('\n')];
  const index = want.findIndex((line, k) => line !== have[k]);
  const line = index < 0 ? want.length : index;
  return [
    {
      code: 'recheck.code',
      place: { file, line: line + 1 },
      what: `the line reads "${(have[line] ?? '').trim()}", the model gives "${(want[line] ?? '').trim()}"`,
      why: 'The file computes what the certificate says, but its text is not the one that was generated.',
      remedy: 'Generate the folder again.',
    },
  ];
}

/** Reads the emitted text back into lines and compares them with the kernel that the model gives. */
function compareLines(
  file: string,
  code: string,
  expected: Variant,
): { readonly parsed?: ParsedKernel; readonly findings: readonly Finding[] } {
  try {
    const parsed = parseKernel(file, code);
    return { parsed, findings: compareKernel(parsed, expected.kernel, file) };
  } catch (error) {
    if (error instanceof InputError) return { findings: error.findings };
    throw error;
  }
}

async function compareCertificate(
  folder: string,
  certificate: Certificate,
  task: Task,
  expected: Variant,
  code: string,
): Promise<readonly Finding[]> {
  const judge = new Judge(task.formula, await importKernel(code), task.model.frameRate);
  const names = task.formula.inputs.map((input) => input.name);
  const ranges = Object.fromEntries(
    task.formula.inputs.map(({ name, unit }) => [name, { ...task.domain[name]!, unit }]),
  );
  const facts: readonly Fact[] = [
    ['domain.ranges', certificate.domain.ranges, ranges],
    ['operations', certificate.operations, expected.cost],
    ['state', certificate.state, { words: expected.kernel.state.length, bytes: expected.stateBytes }],
    ['code', certificate.code, await codeSize(code)],
    ['digest.kernel', certificate.digest.kernel, digest(code)],
    ['digest.model', certificate.digest.model, digest(printFormula(task.formula))],
    ['digest.outputs', certificate.digest.outputs, outputsDigest(judge, task.domain, names)],
  ];
  return compareFacts(folder, facts);
}

type Fact = readonly [name: string, stated: unknown, found: unknown];

function compareFacts(folder: string, facts: readonly Fact[]): readonly Finding[] {
  return facts.flatMap(([name, stated, found]) =>
    JSON.stringify(stated) === JSON.stringify(found)
      ? []
      : [
          differs(
            folder,
            `${name} is stated as ${JSON.stringify(stated)} and found to be ${JSON.stringify(found)}`,
          ),
        ],
  );
}

/** Runs the worst inputs again: each must give the error that is kept with it, and none more than is stated. */
async function replay(
  folder: string,
  certificate: Certificate,
  task: Task,
  worst: Readonly<Record<string, readonly Worst[]>>,
  code: string,
): Promise<readonly Finding[]> {
  const judge = new Judge(task.formula, await importKernel(code), task.model.frameRate);
  const findings: Finding[] = [];
  for (const group of judge.groups) {
    const stated = certificate.error[ERROR_KEY_OF_GROUP[group]!]?.observed;
    const kept = worst[group] ?? [];
    if (kept.length === 0 || stated === undefined) {
      findings.push(differs(folder, `no worst input of ${group} is kept`));
      continue;
    }
    const found = kept.map(({ point }) => judge.errors(point).get(group)!.size);
    for (const [k, { size }] of kept.entries()) {
      if (found[k] !== size)
        findings.push(
          differs(folder, `worst input ${k} of ${group} is kept with error ${size} and gives ${found[k]}`),
        );
    }
    if (Math.max(...found) !== stated)
      findings.push(
        differs(
          folder,
          `the observed error of ${group} is stated as ${stated} and its worst input gives ${Math.max(...found)}`,
        ),
      );
  }
  return findings;
}

function differs(folder: string, what: string): Finding {
  return {
    code: 'recheck.certificate',
    place: { file: join(folder, FILES.certificate) },
    what,
    why: 'A certificate is worth what can be found again.',
    remedy: 'Generate the folder again, or find out who changed it.',
  };
}

function read(folder: string, name: string): string {
  const path = join(folder, name);
  if (!existsSync(path)) {
    throw new InputError({
      code: 'recheck.missing',
      place: { file: path },
      what: 'the file is missing',
      why: `A variant's folder holds ${Object.values(FILES).join(', ')}.`,
      remedy: 'Name the folder of a variant, or generate it.',
    });
  }
  return readFileSync(path, 'utf8');
}

function parse<T>(folder: string, name: string): T {
  const text = read(folder, name);
  try {
    return JSON.parse(text) as T;
  } catch (error) {
    throw new InputError({
      code: 'recheck.syntax',
      place: { file: join(folder, name) },
      what: `not JSON: ${(error as Error).message}`,
      why: 'The file is truncated or was edited.',
      remedy: 'Generate the folder again.',
    });
  }
}
