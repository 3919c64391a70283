import { describe, expect, test } from 'vitest';
import { boundCosine, boundCosineBins, boundSine, boundSineBins } from '../../codegen/numbers/rational.ts';
import { exact, Judge, type Judged } from './judge.ts';

type Kind = 'sine' | 'cosine';

/** The first n Taylor coefficients, rounded to float64. */
function taylor(kind: Kind, n: number): number[] {
  return Array.from({ length: n }, (_, k) => {
    let factorial = 1;
    for (let i = 2; i <= 2 * k + (kind === 'sine' ? 1 : 0); i++) factorial *= i;
    return (k % 2 === 0 ? 1 : -1) / factorial;
  });
}

/** |p(x) - sin x| or |p(x) - cos x| in decimals. */
function error(kind: Kind, c: readonly number[], x: Judged): number {
  const z = x.times(x);
  const p = c.reduceRight((sum, value) => sum.times(z).plus(exact(value)), new Judge(0));
  return (kind === 'sine' ? p.times(x).minus(x.sin()) : p.minus(x.cos())).abs().toNumber();
}

/** The largest error at `points` + 1 equally spaced places of [from, to]. */
function sampled(kind: Kind, c: readonly number[], from: number, to: number, points: number): number {
  let most = 0;
  for (let i = 0; i <= points; i++) {
    most = Math.max(most, error(kind, c, exact(from + ((to - from) * i) / points)));
  }
  return most;
}

const CASES: readonly [name: string, kind: Kind, c: readonly number[], radius: number][] = [
  ['Taylor sine, 3 terms', 'sine', taylor('sine', 3), Math.PI / 4],
  ['Taylor sine, 9 terms', 'sine', taylor('sine', 9), Math.PI / 4],
  ['Taylor sine, 6 terms, half turn', 'sine', taylor('sine', 6), Math.PI],
  ['Taylor cosine, 4 terms', 'cosine', taylor('cosine', 4), Math.PI / 4],
  ['Taylor cosine, 8 terms, a whole turn', 'cosine', taylor('cosine', 8), 6.3],
  ['x alone on a tiny range', 'sine', [1], 1e-3],
  ['1 alone', 'cosine', [1], 0.5],
  ['nothing', 'sine', [], 2],
  // Abramowitz, Stegun, Handbook of Mathematical Functions, 4.3.96 to 4.3.99, from memory
  ['handbook sine, 3 terms', 'sine', [1, -0.16605, 0.00761], Math.PI / 2],
  [
    'handbook sine, 6 terms',
    'sine',
    [1, -0.1666666664, 0.0083333315, -0.000198409, 0.0000027526, -0.0000000239],
    Math.PI / 2,
  ],
  ['handbook cosine, 3 terms', 'cosine', [1, -0.4967, 0.03705], Math.PI / 2],
  [
    'handbook cosine, 6 terms',
    'cosine',
    [1, -0.4999999963, 0.0416666418, -0.0013888397, 0.0000247609, -0.0000002605],
    Math.PI / 2,
  ],
];

describe('the bound holds at samples and lies within 1 % of the largest', () => {
  test.each(CASES)('%s', (_, kind, c, radius) => {
    const bound = kind === 'sine' ? boundSine(c, radius) : boundCosine(c, radius);
    const most = sampled(kind, c, 0, radius, 200);
    expect(bound).toBeGreaterThanOrEqual(most);
    expect(bound).toBeLessThan(1.01 * most);
  });

  test.each(CASES.filter((_, i) => i % 2 === 0))('each of 16 parts: %s', (_, kind, c, radius) => {
    const bounds = kind === 'sine' ? boundSineBins(c, radius, 16) : boundCosineBins(c, radius, 16);
    expect(bounds).toHaveLength(16);
    for (const [j, bound] of bounds.entries()) {
      const most = sampled(kind, c, (radius * j) / 16, (radius * (j + 1)) / 16, 16);
      expect(bound).toBeGreaterThanOrEqual(most * (1 - 1e-15)); // the sampled ends are rounded
      expect(bound).toBeLessThan(1.01 * most);
    }
  });
});

describe('errors that handbooks state', () => {
  // Muller, Elementary Functions, 1997, table 4.8: minimax cosines on |x| <= 1/32, two digits each
  test.each([
    [[1, -0.49996629], 0.682e-8],
    [[1, -0.49999999942942, 0.04166477827], 0.5e-13],
  ])('Muller: cosine %j', (c, stated) => {
    expect(boundCosine(c, 1 / 32) / stated).toBeCloseTo(1, 2);
  });

  // Abramowitz, Stegun 4.3.96, 4.3.97 (errors of sin x / x) and 4.3.99, one digit each; from memory
  test.each([
    [[1, -0.16605, 0.00761], 2e-4],
    [[1, -0.1666666664, 0.0083333315, -0.000198409, 0.0000027526, -0.0000000239], 2e-9],
  ])('Abramowitz, Stegun: sine %j', (c, stated) => {
    expect(boundSine(c, Math.PI / 2)).toBeLessThan((stated * Math.PI) / 2);
  });

  test('Abramowitz, Stegun: cosine, 6 terms', () => {
    const c = [1, -0.4999999963, 0.0416666418, -0.0013888397, 0.0000247609, -0.0000002605];
    expect(Math.round(boundCosine(c, Math.PI / 2) / 1e-9)).toBe(2);
  });
});

test('a wrong coefficient shows in full', () => {
  const good = taylor('sine', 9);
  const bad = good.map((c, k) => (k === 1 ? c + 1e-9 : c));
  expect(boundSine(bad, 1) / 1e-9).toBeCloseTo(1, 2);
});

test('errors below the least float64 numbers are still bounded', () => {
  for (const radius of [1e-100, 1e-106, 1e-108, 1e-200, 2 ** -1074]) {
    const truth = new Judge(radius).pow(3).div(6);
    const bound = boundSine([1], radius);
    expect(exact(bound).greaterThanOrEqualTo(truth.times(1 - 1e-15))).toBe(true);
    expect(bound).toBeLessThan(1.01 * truth.toNumber() + 2 ** -1058);
  }
});

test('parts without extent are refused', () => {
  expect(() => boundSine([1], 0)).toThrow(RangeError);
  expect(() => boundSine([1], Infinity)).toThrow(RangeError);
  expect(() => boundCosine([Number.NaN], 1)).toThrow(RangeError);
  expect(() => boundSineBins([1], 1, 0)).toThrow(RangeError);
});
