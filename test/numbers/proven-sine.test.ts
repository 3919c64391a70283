import { describe, expect, test } from 'vitest';
import { Pairs, set } from '../../codegen/numbers/double-double.ts';
import { sinCos } from '../../codegen/numbers/double-double-functions.ts';
import {
  above,
  below,
  COSINE_COEFFICIENTS,
  cosine,
  PROVEN_RANGE,
  SINE_COEFFICIENTS,
  sine,
} from '../../codegen/numbers/proven-sine.ts';
import { boundCosineBins, boundSineBins } from '../../codegen/numbers/rational.ts';
import { exact, Judge, PI, relativeError, seeded, U } from './judge.ts';

/** What the doc comment proves, and what it says was seen. */
const PROVEN = 2.5 * U;
const SEEN = 1.4 * U;

const r = new Pairs(3);
const random = seeded(3);

/** The larger relative error of sine and cosine at x, judged by pairs (good to 1e-31). */
function error(x: number): number {
  set(r, 0, x);
  sinCos(r, 1, 2, 0);
  const s = Math.abs((sine(x) - r.hi[1]! - r.lo[1]!) / r.hi[1]!);
  const c = Math.abs((cosine(x) - r.hi[2]! - r.lo[2]!) / r.hi[2]!);
  return Math.max(s, c);
}

/** The float64 numbers around k pi/2, `reach` to each side. */
function* neighbours(k: number, reach: number): Generator<number> {
  const nearest = PI.times(k).div(2).toNumber();
  const ulp = 2 ** (Math.floor(Math.log2(Math.abs(nearest))) - 52);
  for (let i = -reach; i <= reach; i++) yield nearest + i * ulp;
}

describe('error against pairs', () => {
  test('a million random angles: uniform to 100 rad, and of all magnitudes', () => {
    let most = 0;
    for (let i = 0; i < 1_000_000; i++) {
      const x = (2 * random() - 1) * PROVEN_RANGE * (i % 4 === 0 ? 2 ** -Math.floor(60 * random()) : 1);
      most = Math.max(most, error(x));
    }
    expect(most).toBeLessThan(SEEN);
    expect(most).toBeGreaterThan(U); // so the judge sees errors at all
  });

  test('hundreds of float64 neighbours of each multiple of pi/4 and pi/2, and growing distances', () => {
    let most = 0;
    for (let k = -63; k <= 63; k++) {
      for (const half of [k, k + 0.5]) {
        if (half === 0) continue;
        for (const x of neighbours(half, 200)) most = Math.max(most, error(x));
        for (let d = 2 ** -50; d < 0.1; d *= 1.7) most = Math.max(most, error((half * Math.PI) / 2 + d));
      }
    }
    expect(most).toBeLessThan(SEEN);
  });

  test('zero, the least and the last numbers', () => {
    expect(sine(0)).toBe(0);
    expect(cosine(0)).toBe(1);
    for (const x of [2 ** -1074, -(2 ** -1060), 2 ** -1022, 1e-200, 1e-160]) {
      expect(sine(x)).toBe(x);
      expect(cosine(x)).toBe(1);
    }
    for (const x of [100, -100, 99.99999999999999]) expect(error(x)).toBeLessThan(PROVEN);
  });
});

test('error against decimals, where no pair is involved', () => {
  for (let i = 0; i < 500; i++) {
    const x = i % 2 === 0 ? (2 * random() - 1) * PROVEN_RANGE : [...neighbours((i % 127) - 63 || 1, 0)][0]!;
    const angle = new Judge(exact(x));
    expect(relativeError(exact(sine(x)), angle.sin())).toBeLessThan(SEEN);
    expect(relativeError(exact(cosine(x)), angle.cos())).toBeLessThan(SEEN);
  }
});

describe('premises of the proof', () => {
  test('no float64 number up to 100 rad is nearer than 2^-61 to a multiple of pi/2', () => {
    for (let k = 1; k <= 64; k++) {
      for (const x of neighbours(k, 1)) {
        const distance = exact(x).minus(PI.times(k).div(2)).abs();
        expect(distance.greaterThan(2 ** -61)).toBe(true);
      }
    }
  });

  test('coefficients are rounded reciprocals of factorials', () => {
    for (const [coefficients, first] of [
      [SINE_COEFFICIENTS, 3],
      [COSINE_COEFFICIENTS, 4],
    ] as const) {
      for (const [k, c] of coefficients.entries()) {
        const n = first + 2 * k;
        const sign = n % 4 === 3 || n % 4 === 2 ? -1 : 1;
        const factorial = Array.from({ length: n }, (_, i) => i + 1).reduce(
          (p, i) => p.times(i),
          new Judge(1),
        );
        expect(c).toBe(new Judge(sign).div(factorial).toNumber());
      }
    }
  });

  test('rounded coefficients and truncation cost what the proof says, by exact arithmetic', () => {
    const radius = Math.PI / 4 + 2 ** -45;
    const bins = 64;
    const sineBounds = boundSineBins([1, ...SINE_COEFFICIENTS], radius, bins);
    const cosineBounds = boundCosineBins([1, -0.5, ...COSINE_COEFFICIENTS], radius, bins);
    // coefficient 0.75 u of r z p <= 0.103 r; of z^2 q <= 0.016, and truncation 0.001
    for (let j = 1; j < bins; j++) expect(sineBounds[j]).toBeLessThan(((0.08 * j) / bins) * radius * U);
    for (const bound of cosineBounds) expect(bound).toBeLessThan(0.017 * U);
  });
});

test('below and above enclose, and lie within 5 u', () => {
  for (let i = 0; i < 200; i++) {
    const x = (2 * random() - 1) * PROVEN_RANGE;
    const truth = new Judge(exact(x)).sin();
    const value = sine(x);
    expect(exact(below(value)).lessThanOrEqualTo(truth)).toBe(true);
    expect(exact(above(value)).greaterThanOrEqualTo(truth)).toBe(true);
    expect(Math.abs(value - below(value))).toBeLessThanOrEqual(5 * U * Math.abs(value));
    expect(Math.abs(above(value) - value)).toBeLessThanOrEqual(5 * U * Math.abs(value));
  }
  expect(below(0)).toBe(-(2 ** -1074));
});
