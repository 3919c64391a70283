import type { Domain } from '../../src/models/description.ts';
import type { Judge } from './judge.ts';
import { type Point, Points } from './points.ts';
import { Random } from './random.ts';

/** How hard to look for the worst error. The same effort gives the same answer. */
export interface Effort {
  /** Points drawn over the whole domain. */
  readonly points: number;
  /** Starts of the climb: the worst of the points drawn. */
  readonly starts: number;
  /** Steps of each climb. */
  readonly steps: number;
  readonly seed: number;
}

/** The effort behind every observed figure of a certificate. */
export const FULL_EFFORT: Effort = { points: 100_000, starts: 10, steps: 8000, seed: 1 };

/** The largest error seen in an output group and the input that gives it. */
export interface Observed {
  readonly group: string;
  readonly size: number;
  readonly at: Point;
  /** Largest radial, along-track and cross-track parts at the worst points; null for groups that are no position. */
  readonly parts: readonly [number, number, number] | null;
  /** The worst point of each of the best climbs, worst first. */
  readonly worst: readonly Candidate[];
}

/** An error and the input that gives it. */
export interface Candidate {
  readonly size: number;
  readonly point: Point;
}

/** The smallest step of a climb, as a power of two of a range: rounding errors change with the last bits of the inputs. */
const FINEST = 40;

/** Worst points that are kept. */
const KEPT = 4;

/**
 * Looks for the largest error of a kernel over a domain: points drawn at random, then climbs from the worst of them
 * by normal steps of all sizes, from half of each range down to the last bits.
 *
 * @param judge the kernel and its formula
 * @param domain ranges of the inputs
 * @param names inputs that the formula uses
 * @param effort how hard to look
 * @param progress told the share done, from 0 to 1
 */
export function observe(
  judge: Judge,
  domain: Domain,
  names: readonly string[],
  effort: Effort,
  progress: (share: number) => void = () => {},
): readonly Observed[] {
  const random = new Random(effort.seed);
  const points = new Points(domain, names, random);
  const best = new Map<string, Candidate[]>(judge.groups.map((group) => [group, []]));
  const work = effort.points + judge.groups.length * effort.starts * effort.steps;
  let done = 0;
  const tick = () => {
    if (++done % 1000 === 0) progress(done / work);
  };
  for (let k = 0; k < effort.points; k++, tick()) {
    const point = points.draw();
    for (const [group, { size }] of judge.errors(point))
      keep(best.get(group)!, { size, point }, effort.starts);
  }
  return judge.groups.map((group) => {
    const tops = best
      .get(group)!
      .map((start) => climb(judge, points, random, group, start, effort.steps, tick));
    const [top] = tops.sort((a, b) => b.size - a.size) as [Candidate, ...Candidate[]];
    return {
      group,
      size: top.size,
      at: top.point,
      parts: largestParts(judge, group, tops),
      worst: tops.slice(0, KEPT),
    };
  });
}

function climb(
  judge: Judge,
  points: Points,
  random: Random,
  group: string,
  start: Candidate,
  steps: number,
  tick: () => void,
): Candidate {
  let top = start;
  for (let k = 0; k < steps; k++, tick()) {
    const point = points.near(top.point, 2 ** (-1 - FINEST * random.next()));
    const size = judge.errors(point).get(group)!.size;
    if (size > top.size) top = { size, point };
  }
  return top;
}

/** Keeps the worst `count` candidates, worst first. */
function keep(list: Candidate[], candidate: Candidate, count: number): void {
  if (list.length === count && candidate.size <= list.at(-1)!.size) return;
  const place = list.findIndex((other) => other.size < candidate.size);
  list.splice(place < 0 ? list.length : place, 0, candidate);
  list.length = Math.min(list.length, count);
}

function largestParts(judge: Judge, group: string, list: readonly Candidate[]): Observed['parts'] {
  let largest: [number, number, number] | null = null;
  for (const { point } of list) {
    const parts = judge.parts(point).get(group)!.parts;
    if (parts === undefined) return null;
    const sizes = parts.map(Math.abs) as [number, number, number];
    largest =
      largest === null
        ? sizes
        : (largest.map((part, k) => Math.max(part, sizes[k]!)) as [number, number, number]);
  }
  return largest;
}
