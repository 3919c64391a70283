import type { Box, Proof } from '../../../codegen/bound/proof.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import type { Analysis } from '../faulty.ts';
import { demand } from './demand.ts';

/** Distance of a box from a point, in its widest variable. */
function distance({ lo, hi }: Box, point: readonly number[]): number {
  return Math.max(...point.map((x, k) => Math.max(lo[k]! - x, x - hi[k]!, 0)));
}

/** The part of a proof that a subdivision sees: heights of cones, exact over every box, with a price for its width. */
function cones(peaks: readonly (readonly number[])[], heights: readonly number[]): Proof {
  const size = peaks[0]!.length;
  let last: readonly number[] = [];
  const proof = {
    replaced: peaks[0]!.map(() => false),
    root: (): Box => ({ lo: new Float64Array(size), hi: new Float64Array(size).fill(1) }),
    bound: (box: Box): number => {
      const width = box.hi.reduce((sum, hi, k) => sum + (hi - box.lo[k]!), 0);
      last = peaks.map((peak, k) => heights[k]! - distance(box, peak));
      return Math.max(...last) + width;
    },
    axes: () => last.slice(0, 3) as unknown as readonly [number, number, number],
  };
  return proof as unknown as Proof;
}

/** Subdivision never loses the place where a function is largest, wherever it is, and comes close to it. */
export function subdivision({ subdivide }: Analysis): void {
  const random = new Random(95);
  for (let round = 0; round < 60; round++) {
    const peaks = Array.from({ length: 3 }, () =>
      [0, 0].map(() => [0, 1, random.next(), random.next()][random.below(4)]!),
    );
    const heights = [2, 1.5 + 0.499 * random.next(), 1.9];
    const found = subdivide(cones(peaks, heights), { boxes: 20 + 40 * round });
    demand(found.bound >= 2, () => `the largest value 2 at ${peaks[0]} is bounded by ${found.bound}`);
    demand(
      round < 20 || found.bound <= 2.1,
      () => `the largest value 2 is bounded by no less than ${found.bound}`,
    );
    for (const [k, axis] of found.axes!.entries())
      demand(axis >= heights[k]!, () => `axis ${k} reaches ${heights[k]} and is bounded by ${axis}`);
  }
}

/** Errors by cells of the mean anomaly and eccentricity: every cell that a range touches counts, in any turn. */
export function cells({ errorsByCell }: Analysis): void {
  const random = new Random(96);
  const height = (M: number, e: number) => 1 + e * (1 + Math.sin(3 * M) + 0.5 * Math.cos(M));
  const range = { lo: 0.05, hi: 0.8 };
  // the largest of so many numbers, and what a cell can hold above them
  const most = (M: { lo: number; hi: number }): number => {
    let largest = 0;
    for (let k = 0; k <= 8; k++)
      largest = Math.max(largest, height(M.lo + ((M.hi - M.lo) * k) / 8, 1) - 1 + (3.5 * (M.hi - M.lo)) / 16);
    return largest;
  };
  const table = errorsByCell(range, (M, e) => {
    const error = 1 + e.hi * most(M);
    return { error, rounding: error / 1.02 };
  });
  for (let round = 0; round < 3000; round++) {
    const lo = 20 * random.next() - 10;
    const M = { lo, hi: lo + (round % 5 === 0 ? 7 * random.next() : 0.1 * random.next()) };
    const e1 = range.lo + (range.hi - range.lo) * random.next();
    const e = { lo: e1, hi: e1 + (range.hi - e1) * random.next() };
    const bound = table.offset(M, e);
    for (const m of [M.lo, M.hi, M.lo + (M.hi - M.lo) * random.next()])
      for (const ecc of [e.lo, e.hi])
        demand(height(m, ecc) <= bound, () => `the cells miss ${height(m, ecc)} at M = ${m}, e = ${ecc}`);
    if (M.hi - M.lo < 0.01 && e.hi - e.lo < 0.01)
      demand(bound <= 1.2 * height(M.lo, e.hi), () => `the cells give ${bound} at ${M.lo}`);
  }
}
