import { describe, expect, test } from 'vitest';
import * as pairs from '../../codegen/numbers/double-double.ts';
import { exact, Judge, type Judged, pairValue, relativeError, seeded, U } from './judge.ts';

const r = new pairs.Pairs(8);
const random = seeded(1);
const SAMPLES = 1500;

/** A random pair in register i: magnitude 2^-40 to 2^40, low word up to half a unit of the high one. */
function fill(i: number): void {
  const hi = (random() < 0.5 ? -1 : 1) * (1 + random()) * 2 ** Math.round(80 * random() - 40);
  normalise(i, hi, hi * U * (2 * random() - 1));
}

function normalise(i: number, hi: number, lo: number): void {
  const sum = hi + lo;
  pairs.set(r, i, sum, lo - (sum - hi));
}

/** Two operands; every other time the second nearly cancels the first. */
function fillTwo(sample: number): void {
  fill(0);
  fill(1);
  if (sample % 2 === 1) normalise(1, -r.hi[0]! * (1 + 2 ** -Math.round(60 * random())), r.lo[0]! * random());
}

/** The largest relative error over the samples, in units of u^2. */
function worst(operate: () => void, truth: (x: Judged, y: Judged) => Judged): number {
  let most = 0;
  for (let sample = 0; sample < SAMPLES; sample++) {
    fillTwo(sample);
    operate();
    if (r.hi[2]! + r.lo[2]! !== r.hi[2]) throw new Error(`not normalised: ${r.hi[2]} + ${r.lo[2]}`);
    most = Math.max(most, relativeError(pairValue(r, 2), truth(pairValue(r, 0), pairValue(r, 1))));
  }
  return most / (U * U);
}

// Bounds: Joldes, Muller, Popescu 2017, and Lefevre et al. 2023 for the root; from memory.
describe('relative errors stay below the published bounds, in units of u^2', () => {
  test('add 3', () => {
    expect(
      worst(
        () => pairs.add(r, 2, 0, 1),
        (x, y) => x.plus(y),
      ),
    ).toBeLessThan(3.0001);
  });
  test('sub 3', () => {
    const least = worst(
      () => {
        pairs.neg(r, 1, 1);
        pairs.sub(r, 2, 0, 1);
      },
      (x, y) => x.minus(y),
    );
    expect(least).toBeLessThan(3.0001);
  });
  test('mul 7', () => {
    expect(
      worst(
        () => pairs.mul(r, 2, 0, 1),
        (x, y) => x.times(y),
      ),
    ).toBeLessThan(7);
  });
  test('div 15', () => {
    expect(
      worst(
        () => pairs.div(r, 2, 0, 1),
        (x, y) => x.div(y),
      ),
    ).toBeLessThan(15.0001);
  });
  test('sqrt 25/8', () => {
    const root = worst(
      () => {
        pairs.abs(r, 0, 0);
        pairs.sqrt(r, 2, 0);
      },
      (x) => x.sqrt(),
    );
    expect(root).toBeLessThan(3.126);
  });
});

describe('exact operations', () => {
  test('product of two float64 numbers', () => {
    for (let sample = 0; sample < SAMPLES; sample++) {
      const x = random() - 0.5;
      const y = (random() - 0.5) * 1e10;
      pairs.product(r, 2, x, y);
      expect(pairValue(r, 2).equals(exact(x).times(exact(y)))).toBe(true);
    }
  });

  test('products whose halves need all their bits', () => {
    const hard: number[] = [];
    for (let k = 1; k <= 52; k++)
      hard.push(1 + 2 ** -k, 2 - 2 ** -k, 1 + 2 ** -k + 2 ** -52, 2 - 2 ** -k - 2 ** -52);
    for (const x of hard) {
      for (const y of hard) {
        pairs.product(r, 2, x, -y);
        // exact in integers: both factors are multiples of 2^-52
        const truth = -BigInt(x * 2 ** 52) * BigInt(y * 2 ** 52);
        if (BigInt(r.hi[2]! * 2 ** 104) + BigInt(r.lo[2]! * 2 ** 104) !== truth) throw new Error(`${x} ${y}`);
      }
    }
  });

  test('neg, abs, floor and compare', () => {
    for (let sample = 0; sample < SAMPLES; sample++) {
      fillTwo(sample);
      const x = pairValue(r, 0);
      pairs.neg(r, 2, 0);
      expect(pairValue(r, 2).equals(x.negated())).toBe(true);
      pairs.abs(r, 2, 0);
      expect(pairValue(r, 2).equals(x.abs())).toBe(true);
      pairs.floor(r, 2, 0);
      expect(pairValue(r, 2).equals(x.floor())).toBe(true);
      expect(pairs.compare(r, 0, 1)).toBe(x.comparedTo(pairValue(r, 1)));
    }
  });

  test('floor next to an integer, and of integers beyond 2^53', () => {
    const cases: readonly [hi: number, lo: number, floor: string][] = [
      [5, -1e-20, '4'],
      [5, 1e-20, '5'],
      [-5, -1e-20, '-6'],
      [-0.25, 0, '-1'],
      [2 ** 60, -0.5, '1152921504606846975'],
      [2 ** 60, 3.5, '1152921504606846979'],
      [1, -(2 ** -60), '0'],
    ];
    for (const [hi, lo, floor] of cases) {
      pairs.set(r, 0, hi, lo);
      pairs.floor(r, 2, 0);
      expect(pairValue(r, 2).equals(new Judge(floor))).toBe(true);
    }
  });

  test('compare looks at low words and does not hide NaN', () => {
    pairs.set(r, 0, 1, 1e-20);
    pairs.set(r, 1, 1, 2e-20);
    expect(pairs.compare(r, 0, 1)).toBe(-1);
    expect(pairs.compare(r, 1, 0)).toBe(1);
    expect(pairs.compare(r, 1, 1)).toBe(0);
    pairs.set(r, 1, Number.NaN);
    expect(pairs.compare(r, 0, 1)).toBeNaN();
  });

  test('sqrt of zero is zero', () => {
    pairs.set(r, 0, 0);
    pairs.sqrt(r, 2, 0);
    expect([r.hi[2], r.lo[2]]).toEqual([0, 0]);
  });
});

test('the target may be an operand', () => {
  for (const operate of [pairs.add, pairs.sub, pairs.mul, pairs.div]) {
    for (const [d, a, b] of [
      [0, 0, 1],
      [1, 0, 1],
      [0, 0, 0],
    ] as const) {
      fillTwo(0);
      operate(r, 2, a, b);
      operate(r, d, a, b);
      expect([r.hi[d], r.lo[d]]).toEqual([r.hi[2], r.lo[2]]);
    }
  }
  for (const operate of [pairs.neg, pairs.abs, pairs.floor, pairs.sqrt]) {
    pairs.set(r, 0, 12.75, 1e-18);
    operate(r, 2, 0);
    operate(r, 0, 0);
    expect([r.hi[0], r.lo[0]]).toEqual([r.hi[2], r.lo[2]]);
  }
});
