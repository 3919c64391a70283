import type { Domain } from '../../src/models/description.ts';
import type { Lowered } from '../lower/lower.ts';
import type { Intervals } from '../numbers/interval.ts';
import { KernelBlocks } from './blocks.ts';
import { largestPointwise } from './pointwise.ts';
import { Proof } from './proof.ts';
import { type ProofEffort, subdivide } from './search.ts';
import type { Span } from './tape.ts';

/** The effort behind every certified figure of a certificate. */
export const PROOF_EFFORT: ProofEffort = { boxes: 60_000 };

/** What is proven of one output group of a kernel. */
export interface GroupProof {
  readonly group: string;
  /** Bound on the error over the whole domain, in the group's unit. */
  readonly bound: number;
  /** Largest bound found at a single point: subdivision cannot get below it. */
  readonly limit: number;
  /** Inputs with the largest bounds at a single point: where an error is worth looking for. */
  readonly points: readonly Readonly<Record<string, number>>[];
  /** Bounds on the radial, along-track and cross-track parts; null for groups without an orbit's axes. */
  readonly axes: readonly [number, number, number] | null;
  readonly boxes: number;
  /** Share of lines in the bound of the worst box, by line of the kernel, 0 to 1. */
  readonly shares: ReadonlyMap<number, number>;
  /** Ranges of the values of lines over the whole domain, as far as the proof knows them. */
  readonly ranges: ReadonlyMap<number, Span>;
}

/**
 * Proves a bound on the error of every output group of a kernel against the exact formula.
 *
 * @param lowered the kernel with its exact formula
 * @param effort how many boxes a group
 * @param progress told the share done, from 0 to 1
 * @throws InputError with code bound.unsupported or bound.block for a kernel that the proof does not cover
 */
export function certify(
  lowered: Lowered,
  effort: ProofEffort = PROOF_EFFORT,
  progress: (share: number) => void = () => {},
): readonly GroupProof[] {
  const blocks = new KernelBlocks(lowered);
  const groups = [...new Set(lowered.exact.outputs.map((output) => output.group))];
  return groups.map((group, index) => {
    const proof = new Proof(lowered, group, blocks);
    const found = subdivide(proof, effort, (share) => progress((index + share) / groups.length));
    const top = largestPointwise(proof, domainOf(lowered, proof));
    return {
      group,
      bound: found.bound,
      limit: top.bound,
      points: top.points,
      axes: found.axes,
      boxes: found.boxes,
      shares: shares(proof, found.worst[0]!),
      ranges: rangesOfLines(proof),
    };
  });
}

function domainOf(lowered: Lowered, proof: Proof): Domain {
  return Object.fromEntries(proof.inputs.map((name) => [name, lowered.kernel.domain[name]!]));
}

/** Ranges of lines over the whole domain: of numbers, and of the cosines and sines of turns. */
function rangesOfLines(proof: Proof): ReadonlyMap<number, Span> {
  proof.evaluate(proof.root());
  const { value, sine } = proof.forward;
  const ranges = new Map<number, Span>();
  const note = (line: number, from: Intervals, k: number): void => {
    if (line < 0) return;
    const before = ranges.get(line) ?? { lo: -Infinity, hi: Infinity };
    ranges.set(line, { lo: Math.max(before.lo, from.lo[k]!), hi: Math.min(before.hi, from.hi[k]!) });
  };
  for (const [k, entry] of proof.tape.entries.entries()) {
    if (entry.kind === 'leaf') continue;
    note(entry.line, value, k);
    if ('sinLine' in entry) note(entry.sinLine, sine, k);
  }
  return ranges;
}

/** How much each line contributes to the bound over a box, in the direction in which it is largest. */
function shares(proof: Proof, box: Parameters<Proof['bound']>[0]): ReadonlyMap<number, number> {
  proof.evaluate(box);
  const parts = proof.vector.shares(proof.vector.worstDirection());
  const lines = new Map<number, number>();
  for (const [k, entry] of proof.tape.entries.entries()) {
    if (entry.line < 0 || !(parts[k]! > 0)) continue;
    lines.set(entry.line, (lines.get(entry.line) ?? 0) + parts[k]!);
  }
  return lines;
}
