import { certify, type GroupProof, PROOF_EFFORT } from '../bound/certify.ts';
import { codeSize } from '../cost/code-size.ts';
import { arithmeticName, type Choices } from '../kernel/choices.ts';
import { type Effort, FULL_EFFORT, type Observed, observe } from '../observe/observe.ts';
import { type Budget, ERROR_KEYS } from './budget.ts';
import { candidates } from './candidates.ts';
import { remarksOf } from './remarks.ts';
import { describeVariant, judgeOf, makeVariant, type Task, type Variant } from './variant.ts';

/** A short look that can only rule variants out: an error seen is an error. */
const FIRST_LOOK: Effort = { points: 2000, places: 0, draws: 0, pool: 1, steps: 0, seed: 3 };

/** A limit that a variant breaks. */
export interface Excess {
  readonly limit: string;
  readonly allowed: number;
  readonly found: number;
}

/** A variant that was tried, with what was seen of its errors and the limits that it breaks. */
export interface Trial {
  readonly choices: Choices;
  readonly variant: Variant;
  readonly observed: readonly Observed[];
  /** Proven bounds by output group; empty for a variant that was ruled out before. */
  readonly proofs: readonly GroupProof[];
  readonly excesses: readonly Excess[];
  /** How long the proofs took, s. */
  readonly seconds: number;
}

/** Told what is being done, and the share of it from 0 to 1. */
export type Progress = (what: string, share: number) => void;

/**
 * Finds the cheapest variant within a budget: variants in the order of their operations a tick (roundings counted),
 * the first whose size and certified error fit. An error that is seen rules a variant out before the proof is begun.
 *
 * @param task what is generated
 * @param budget limits
 * @param progress told what is going on
 * @returns every trial in order; the last one fits if any does
 */
export async function choose(task: Task, budget: Budget, progress: Progress): Promise<readonly Trial[]> {
  const trials: Trial[] = [];
  for (const [choices, variant] of inOrderOfCost(task, budget)) {
    const first = await look(task, variant, FIRST_LOOK, () => {});
    const early = [...(await sizeExcesses(variant, budget)), ...errorExcesses(first, budget)];
    if (early.length > 0) {
      trials.push({ choices, variant, observed: first, proofs: [], excesses: early, seconds: 0 });
      continue;
    }
    const start = performance.now();
    const proofs = certify(variant.lowered, PROOF_EFFORT, (share) =>
      progress(`${variantName(choices)}: proving`, share),
    );
    const seconds = (performance.now() - start) / 1000;
    const beyond = boundExcesses(proofs, budget);
    if (beyond.length > 0) {
      trials.push({ choices, variant, observed: first, proofs, excesses: beyond, seconds });
      continue;
    }
    const observed = await look(task, variant, FULL_EFFORT, (share) =>
      progress(`${variantName(choices)}: observing`, share),
    );
    requireObservedBelow(proofs, observed);
    const final = described(task, variant, observed, proofs);
    const large = await sizeExcesses(final, budget); // the remarks beside the lines count in the size of the file
    trials.push({ choices, variant: final, observed, proofs, excesses: large, seconds });
    if (large.length === 0) return trials;
  }
  return trials;
}

/** A variant with remarks on its errors in its text. */
function described(
  task: Task,
  variant: Variant,
  observed: readonly Observed[],
  proofs: readonly GroupProof[],
): Variant {
  const errors = Object.fromEntries(
    Object.entries(ERROR_KEYS).flatMap(([key, group]) => {
      const proof = proofs.find((candidate) => candidate.group === group);
      const seen = observed.find((candidate) => candidate.group === group);
      if (proof === undefined || seen === undefined) return [];
      return [[key, { certified: proof.bound, observed: seen.size }] as const];
    }),
  );
  return describeVariant(task, variant.lowered, remarksOf(variant.kernel, errors, proofs));
}

/** Observes a variant's own code over the task's domain. */
export async function look(
  task: Task,
  variant: Variant,
  effort: Effort,
  progress: (share: number) => void,
): Promise<readonly Observed[]> {
  const names = task.formula.inputs.map((input) => input.name);
  return observe(await judgeOf(task, variant), variant.kernel, task.domain, names, effort, progress);
}

/** A variant by its arithmetic and cap, such as `f64, cap 2`. */
export function variantName(choices: Choices): string {
  return `${arithmeticName(choices)}, cap ${choices.cap}`;
}

function inOrderOfCost(task: Task, budget: Budget): readonly (readonly [Choices, Variant])[] {
  const cost = ({ cost: { tick, setup } }: Variant) =>
    [tick.total + tick.round, setup.total + setup.round] as const;
  return candidates(budget, task.domain)
    .map((choices) => [choices, makeVariant(task, choices)] as const)
    .sort(([, a], [, b]) => cost(a)[0] - cost(b)[0] || cost(a)[1] - cost(b)[1]);
}

async function sizeExcesses(variant: Variant, budget: Budget): Promise<readonly Excess[]> {
  const { bytes, minified_bytes } = await codeSize(variant.code);
  return excesses([
    ['tick_operations', budget.tick_operations, variant.cost.tick.total],
    ['setup_operations', budget.setup_operations, variant.cost.setup.total],
    ['state_bytes', budget.state_bytes, variant.stateBytes],
    ['code_bytes', budget.code_bytes, bytes],
    ['minified_bytes', budget.minified_bytes, minified_bytes],
  ]);
}

function errorExcesses(observed: readonly Observed[], budget: Budget): readonly Excess[] {
  return excesses(
    Object.entries(ERROR_KEYS).map(([key, group]) => [
      key,
      budget.error[key as keyof Budget['error']],
      observed.find((entry) => entry.group === group)?.size ?? 0,
    ]),
  );
}

function boundExcesses(proofs: readonly GroupProof[], budget: Budget): readonly Excess[] {
  return excesses(
    Object.entries(ERROR_KEYS).map(([key, group]) => [
      key,
      budget.error[key as keyof Budget['error']],
      proofs.find((proof) => proof.group === group)?.bound ?? 0,
    ]),
  );
}

/** An observed error above the certified one is a defect of the proof: nothing may be generated. */
function requireObservedBelow(proofs: readonly GroupProof[], observed: readonly Observed[]): void {
  for (const { group, size } of observed) {
    const bound = proofs.find((proof) => proof.group === group)!.bound;
    if (size > bound)
      throw new Error(`the proof is wrong: ${group} has error ${size}, proven to be at most ${bound}`);
  }
}

function excesses(
  list: readonly (readonly [limit: string, allowed: number | undefined, found: number])[],
): readonly Excess[] {
  return list.flatMap(([limit, allowed, found]) =>
    allowed !== undefined && found > allowed ? [{ limit, allowed, found }] : [],
  );
}
