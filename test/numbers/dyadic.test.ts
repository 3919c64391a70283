import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import * as dyadic from '../../codegen/numbers/dyadic.ts';

/** Wide enough for every float64 number and the products used here: nothing is rounded. */
const Wide = Decimal.clone({ precision: 4000, defaults: true, toExpNeg: -9e15, toExpPos: 9e15 });
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
const moderate = fc.double({ noNaN: true, min: -1e6, max: 1e6 });
const RUNS = { numRuns: 200, seed: 4 };

function decimal(x: dyadic.Dyadic): Decimal {
  return new Wide(x.mantissa.toString()).times(new Wide(2).pow(x.exponent));
}

/** The float64 after x, through its bits. */
function next(x: number): number {
  const floats = new Float64Array([x]);
  const bits = new BigInt64Array(floats.buffer);
  if (x === 0) return 2 ** -1074;
  bits[0]! += x > 0 ? 1n : -1n;
  return floats[0]!;
}

/** The sign of x - n / d, decided in integers. */
function side(x: number, n: bigint, d: bigint): number {
  if (!Number.isFinite(x)) return Math.sign(x);
  const { mantissa, exponent } = dyadic.fromDouble(x);
  const difference = (mantissa << BigInt(Math.max(exponent, 0))) * d - (n << BigInt(Math.max(-exponent, 0)));
  return difference === 0n ? 0 : difference < 0n ? -1 : 1;
}

describe('float64 to exact number', () => {
  test('against decimal digits of the number itself', () => {
    // toPrecision(100) is exact for these magnitudes
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: 1e-3, max: 1e9 }), (x) => {
        expect(decimal(dyadic.fromDouble(x)).equals(new Wide(x.toPrecision(100)))).toBe(true);
        expect(decimal(dyadic.fromDouble(-x)).equals(new Wide(x.toPrecision(100)).negated())).toBe(true);
      }),
      RUNS,
    );
  });

  test('and back, rounded either way, over all magnitudes', () => {
    fc.assert(
      fc.property(finite, (x) => {
        expect(dyadic.toDoubleDown(dyadic.fromDouble(x))).toBe(x + 0);
        expect(dyadic.toDoubleUp(dyadic.fromDouble(x))).toBe(x + 0);
      }),
      { ...RUNS, numRuns: 2000 },
    );
    for (let k = -1074; k <= 1023; k++) {
      expect(dyadic.toDoubleDown({ mantissa: 1n, exponent: k })).toBe(2 ** k);
      expect(dyadic.compare(dyadic.fromDouble(2 ** k), { mantissa: 1n, exponent: k })).toBe(0);
    }
  });

  test('what is not finite has no exact value', () => {
    for (const x of [Number.NaN, Infinity, -Infinity]) expect(() => dyadic.fromDouble(x)).toThrow(RangeError);
  });
});

test('add, sub, mul, neg and compare are exact', () => {
  fc.assert(
    fc.property(finite, finite, (a, b) => {
      const [x, y] = [dyadic.fromDouble(a), dyadic.fromDouble(b)];
      const [p, q] = [decimal(x), decimal(y)];
      expect(decimal(dyadic.add(x, y)).equals(p.plus(q))).toBe(true);
      expect(decimal(dyadic.sub(x, y)).equals(p.minus(q))).toBe(true);
      expect(decimal(dyadic.mul(x, y)).equals(p.times(q))).toBe(true);
      expect(decimal(dyadic.neg(x)).equals(p.negated())).toBe(true);
      expect(dyadic.compare(x, y)).toBe(p.comparedTo(q));
      expect(dyadic.compare(x, x)).toBe(0);
    }),
    RUNS,
  );
});

test('a polynomial is evaluated exactly', () => {
  fc.assert(
    fc.property(fc.array(moderate, { maxLength: 6 }), fc.double({ noNaN: true, min: -8, max: 8 }), (c, x) => {
      const at = decimal(dyadic.fromDouble(x));
      const truth = c.reduce(
        (sum, value, k) => sum.plus(decimal(dyadic.fromDouble(value)).times(k === 0 ? 1 : at.pow(k))),
        new Wide(0),
      );
      // tiny values of x make digits beyond any width: compare what they leave
      const got = decimal(dyadic.evaluate(c.map(dyadic.fromDouble), dyadic.fromDouble(x)));
      expect(got.minus(truth).abs().lessThanOrEqualTo(truth.abs().times('1e-3900'))).toBe(true);
    }),
    { ...RUNS, numRuns: 100 },
  );
});

describe('directed rounding of quotients', () => {
  const natural = fc.bigInt({ min: 1n, max: 1n << 200n });

  test('the result is the nearest float64 on its side', () => {
    fc.assert(
      fc.property(
        natural,
        natural,
        fc.integer({ min: -1200, max: 1200 }),
        fc.boolean(),
        (n, d, shift, negative) => {
          const over = (negative ? -n : n) << BigInt(Math.max(shift, 0));
          const under = d << BigInt(Math.max(-shift, 0));
          const down = dyadic.quotientDown(over, under);
          const up = dyadic.quotientUp(over, under);
          expect(side(down, over, under)).toBeLessThanOrEqual(0);
          expect(side(up, over, under)).toBeGreaterThanOrEqual(0);
          if (down === up) expect(side(up, over, under)).toBe(0);
          else expect(next(down)).toBe(up);
        },
      ),
      { ...RUNS, numRuns: 2000 },
    );
  });

  test('subnormal, overflowing and zero quotients', () => {
    expect(dyadic.quotientDown(1n, 1n << 2000n)).toBe(0);
    expect(dyadic.quotientUp(1n, 1n << 2000n)).toBe(2 ** -1074);
    expect(dyadic.quotientDown(-1n, 1n << 2000n)).toBe(-(2 ** -1074));
    expect(dyadic.quotientDown(1n << 1024n, 1n)).toBe(Number.MAX_VALUE);
    expect(dyadic.quotientUp(1n << 1024n, 1n)).toBe(Infinity);
    expect(dyadic.quotientDown(-(1n << 1024n), 1n)).toBe(-Infinity);
    expect(dyadic.quotientUp((1n << 1024n) - 1n, 1n)).toBe(Infinity);
    expect(dyadic.quotientDown((1n << 1024n) - 1n, 1n)).toBe(Number.MAX_VALUE);
    expect(dyadic.quotientUp(0n, 7n)).toBe(0);
    expect(dyadic.quotientDown(1n, 3n)).toBe(1 / 3); // 1/3 rounds down to float64
    expect(dyadic.quotientUp(1n, 3n)).toBe(next(1 / 3));
    expect(dyadic.quotientDown(7n, 2n)).toBe(3.5);
    expect(dyadic.quotientUp(7n, 2n)).toBe(3.5);
  });
});
