import * as pairs from '../../../codegen/numbers/double-double.ts';
import * as functions from '../../../codegen/numbers/double-double-functions.ts';
import type { Intervals } from '../../../codegen/numbers/interval.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import type { Analysis } from '../faulty.ts';
import { demand } from './demand.ts';

/** An interval and numbers of it: its ends and one between. */
interface Sample {
  readonly lo: number;
  readonly hi: number;
  readonly points: readonly number[];
}

function sample(random: Random, least: number, most: number): Sample {
  const x = least + (most - least) * random.next();
  const y = random.below(3) === 0 ? x : least + (most - least) * random.next();
  return ends(Math.min(x, y), Math.max(x, y), random);
}

function ends(lo: number, hi: number, random: Random): Sample {
  return { lo, hi, points: [lo, hi, Math.min(hi, lo + (hi - lo) * random.next())] };
}

/** Intervals left of, right of and about zero, of many sizes, and single numbers. */
function anySign(random: Random): Sample {
  const size = 2 ** (40 * random.next() - 20);
  const [least, most] = [
    [0.3, 1],
    [-1, -0.3],
    [-1, 1],
    [0, 1],
    [-1, 0],
  ][random.below(5)]!;
  return sample(random, least! * size, most! * size);
}

/** Whether an interval holds a double-double number. */
function holds(r: Intervals, d: number, p: pairs.Pairs, k: number): boolean {
  return r.lo[d]! - p.hi[k]! - p.lo[k]! <= 0 && r.hi[d]! - p.hi[k]! - p.lo[k]! >= 0;
}

/** Sums, products, quotients, roots and what decides: every result of numbers of the operands lies inside. */
export function arithmetic({ interval }: Analysis): void {
  const random = new Random(81);
  const r = new interval.Intervals(8);
  const p = new pairs.Pairs(4);
  const plain = ['add', 'sub', 'mul', 'div'] as const;
  for (let round = 0; round < 3000; round++) {
    const [a, b] = [anySign(random), anySign(random)];
    interval.set(r, 0, a.lo, a.hi);
    interval.set(r, 1, b.lo, b.hi);
    for (const name of plain) {
      interval[name](r, 2, 0, 1);
      for (const x of a.points) {
        for (const y of b.points) {
          if (name === 'div' && (y === 0 || (b.lo <= 0 && b.hi >= 0))) continue;
          pairs.set(p, 0, x);
          pairs.set(p, 1, y);
          pairs[name](p, 2, 0, 1);
          demand(holds(r, 2, p, 2), () => `${name} of ${x} and ${y} lies outside`);
        }
      }
      if (a.lo === a.hi && b.lo === b.hi)
        demand(!(r.hi[2]! - r.lo[2]! > 2 ** -49 * Math.abs(r.hi[2]!) + 1e-300), () => `${name} is loose`);
    }
    one(interval, r, p, a);
    choice(interval, r, a, b);
  }
}

function one(interval: Analysis['interval'], r: Intervals, p: pairs.Pairs, a: Sample): void {
  interval.sqr(r, 2, 0);
  interval.abs(r, 3, 0);
  interval.neg(r, 4, 0);
  interval.floor(r, 5, 0);
  interval.sqrt(r, 6, 0);
  for (const x of a.points) {
    pairs.product(p, 2, x, x);
    demand(holds(r, 2, p, 2), () => `the square of ${x} lies outside`);
    for (const [register, y] of [
      [3, Math.abs(x)],
      [4, -x],
      [5, Math.floor(x)],
    ] as const)
      demand(r.lo[register]! <= y && y <= r.hi[register]!, () => `register ${register} at ${x} misses ${y}`);
    if (x < 0) continue;
    pairs.set(p, 0, x);
    pairs.sqrt(p, 2, 0);
    demand(holds(r, 6, p, 2), () => `the root of ${x} lies outside`);
  }
}

function choice(interval: Analysis['interval'], r: Intervals, a: Sample, b: Sample): void {
  interval.set(r, 6, 5, 6);
  interval.set(r, 7, -2, -1);
  interval.select(r, 2, 0, 1, 6, 7);
  for (const x of a.points)
    for (const y of b.points) {
      const [lo, hi] = x < y ? [5, 6] : [-2, -1];
      demand(r.lo[2]! <= lo && hi <= r.hi[2]!, () => `the choice of ${x} < ${y} lies outside`);
    }
}

/** Sine, cosine and angle of a point against double-double arithmetic, also where sines all but vanish. */
export function functionsOfAngles({ interval }: Analysis): void {
  const random = new Random(82);
  const r = new interval.Intervals(4);
  const p = new pairs.Pairs(5);
  for (let round = 0; round < 4000; round++) {
    const x = round < 128 ? ((round - 64) * Math.PI) / 2 : 180 * random.next() - 90;
    const a = ends(x, x + (round % 2 === 0 ? 0 : 8 * random.next() ** 3), random);
    interval.set(r, 0, a.lo, a.hi);
    interval.sin(r, 1, 0);
    interval.cos(r, 2, 0);
    const crests = Array.from({ length: 8 }, (_, k) => (Math.ceil((2 * a.lo) / Math.PI) + k) * (Math.PI / 2));
    for (const point of [...a.points, ...crests.filter((crest) => crest >= a.lo && crest <= a.hi)]) {
      pairs.set(p, 0, point);
      functions.sinCos(p, 1, 2, 0);
      demand(holds(r, 1, p, 1), () => `the sine of ${point} lies outside`);
      demand(holds(r, 2, p, 2), () => `the cosine of ${point} lies outside`);
    }
    const [y, z] = [anySign(random), anySign(random)];
    interval.set(r, 0, y.lo, y.hi);
    interval.set(r, 1, z.lo, z.hi);
    interval.atan2(r, 2, 0, 1);
    for (const v of y.points)
      for (const h of z.points) {
        if (v === 0 && h === 0) continue;
        pairs.set(p, 0, v);
        pairs.set(p, 1, h);
        functions.atan2(p, 2, 0, 1);
        demand(holds(r, 2, p, 2), () => `the angle of (${h}, ${v}) lies outside`);
      }
  }
}

/** Kepler's equation: E and E - M for intervals of M and e. */
export function keplerEquation({ interval }: Analysis): void {
  const random = new Random(83);
  const r = new interval.Intervals(4);
  const p = new pairs.Pairs(6);
  for (let round = 0; round < 3000; round++) {
    const M = sample(random, -7, 7);
    const near = round % 2 === 0 ? ends(M.lo, M.lo + 0.01 * random.next(), random) : M;
    const e = sample(random, 0, 0.95);
    interval.set(r, 0, near.lo, near.hi);
    interval.set(r, 1, e.lo, e.hi);
    interval.keplerE(r, 2, 0, 1);
    interval.keplerOffset(r, 3, 0, 1);
    for (const m of near.points)
      for (const ecc of e.points) {
        pairs.set(p, 0, m);
        functions.sinCos(p, 1, 2, 0);
        pairs.set(p, 3, ecc);
        functions.keplerOffset(p, 4, 1, 2, 3);
        demand(holds(r, 3, p, 4), () => `E - M at M = ${m}, e = ${ecc} lies outside`);
        pairs.add(p, 5, 0, 4);
        demand(holds(r, 2, p, 5), () => `E at M = ${m}, e = ${ecc} lies outside`);
      }
  }
}
