import type { Domain, ModelDescription } from '../../src/models/description.ts';
import { type Cost, countOperations } from '../cost/count.ts';
import { emitCode } from '../emit/code.ts';
import { stateType } from '../emit/documentation.ts';
import { digest } from '../files/digest.ts';
import type { Formula } from '../formula/node.ts';
import { printFormula } from '../formula/text.ts';
import type { Choices } from '../kernel/choices.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { type Lowered, lower } from '../lower/lower.ts';
import { Judge } from '../observe/judge.ts';
import { importKernel } from '../observe/module.ts';

/** What is to be generated: a model's formula over a named domain. */
export interface Task {
  readonly model: ModelDescription;
  readonly formula: Formula;
  readonly domainName: string;
  /** Ranges of the inputs that the formula uses. */
  readonly domain: Domain;
}

/** One lowering of a task with its code and cost. */
export interface Variant {
  readonly lowered: Lowered;
  readonly kernel: Kernel;
  readonly code: string;
  readonly cost: Cost;
  readonly stateBytes: number;
}

/** What an emitted file says of its errors. */
export interface Remarks {
  /** Sentences on the errors, for the doc block. */
  readonly errors: readonly string[];
  /** What stands beside lines, by line. */
  readonly notes: ReadonlyMap<number, string>;
}

const NO_REMARKS: Remarks = { errors: [], notes: new Map() };

/** Lowers, emits and counts one variant. */
export function makeVariant(task: Task, choices: Choices): Variant {
  return describeVariant(task, lower(task.formula, task.domain, choices));
}

/** Emits and counts a lowered kernel. */
export function describeVariant(task: Task, lowered: Lowered, remarks: Remarks = NO_REMARKS): Variant {
  const { kernel } = lowered;
  const code = emitCode(kernel, {
    title: task.model.title,
    source: task.model.source,
    formulaDigest: digest(printFormula(task.formula)),
    domainName: task.domainName,
    units: task.model.units,
    ...remarks,
  });
  const wordBytes = stateType(kernel) === 'Float32Array' ? 4 : 8;
  return {
    lowered,
    kernel,
    code,
    cost: countOperations(kernel),
    stateBytes: kernel.state.length * wordBytes,
  };
}

/** The judge of a variant's own code. */
export async function judgeOf(task: Task, variant: Variant): Promise<Judge> {
  return new Judge(task.formula, await importKernel(variant.code), task.model.frameRate);
}
