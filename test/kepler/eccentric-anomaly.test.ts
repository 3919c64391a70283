import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eccentricAnomaly } from '../../src/kepler/eccentric-anomaly.ts';

const DEGREE = Math.PI / 180;

describe('eccentricAnomaly', () => {
  // Meeus, Astronomical Algorithms, chapter 30: tables of E, and the hard case of p. 205
  it.each([
    { e: 0.1, M: 5, E: 5.554589, digits: 5.1e-7 },
    { e: 0.3, M: 5, E: 7.13496, digits: 5.1e-7 },
    { e: 0.4, M: 5, E: 8.313903, digits: 5.1e-7 },
    { e: 0.6, M: 5, E: 12.356653, digits: 5.1e-7 },
    { e: 0.7, M: 5, E: 16.16799, digits: 5.1e-7 },
    { e: 0.9, M: 5, E: 33.344447, digits: 5.1e-7 },
    { e: 0.99, M: 5, E: 45.361023, digits: 5.1e-7 },
    { e: 0.99, M: 33, E: 89.722155, digits: 5.1e-7 },
    { e: 0.99, M: 2, E: 32.361007472, digits: 5.1e-10 },
    { e: 0.999, M: 7, E: 52.270261528, digits: 5.1e-10 },
    { e: 0.99, M: 0.2 / DEGREE, E: 1.066997365282 / DEGREE, digits: 5.1e-13 / DEGREE },
  ])('Meeus: e $e, M $M degrees', ({ e, M, E, digits }) => {
    expect(Math.abs(eccentricAnomaly(M * DEGREE, e) / DEGREE - E)).toBeLessThan(digits);
  });

  it('Vallado, Fundamentals of Astrodynamics and Applications, Example 2-1', () => {
    expect(Math.abs(eccentricAnomaly(235.4 * DEGREE, 0.4) / DEGREE - 220.512074767522)).toBeLessThan(1e-11);
  });

  it('Curtis, Orbital Mechanics for Engineering Students, Examples 3.1 and 3.2', () => {
    const e = 0.37255;
    const E = eccentricAnomaly(3.6029, e);
    const nu = 2 * Math.atan2(Math.sqrt(1 + e) * Math.sin(E / 2), Math.sqrt(1 - e) * Math.cos(E / 2));
    expect(Math.abs(E - 3.4794)).toBeLessThan(5e-5);
    expect(Math.abs(nu / DEGREE - 193.2)).toBeLessThan(0.05);
  });

  it('leaves a residual of a few units in the last place for a million random inputs', () => {
    let state = 1;
    const random = (): number => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0; // linear congruential, Numerical Recipes
      return state / 2 ** 32;
    };
    let worst = 0;
    for (let k = 0; k < 1e6; k++) {
      const M = (2 * random() - 1) * Math.PI;
      const e = k % 2 === 0 ? random() : 1 - 10 ** (-12 * random());
      const E = eccentricAnomaly(M, e);
      worst = Math.max(worst, Math.abs(E - M - e * Math.sin(E)));
    }
    // One unit in the last place of E, 2^-51, times the slope of at most 2, and 2^-52 for rounding here.
    expect(worst).toBeLessThan(5 * 2 ** -52);
  });

  it('is good to a few units in the last place near M = 0 and e = 1, against 50 digits', () => {
    const D = Decimal.clone({ precision: 60 });
    const exact = (value: number) => new D(value.toPrecision(100)); // a plain number would lose its last bits
    let worst = 0;
    for (let j = 0; j <= 20; j++) {
      for (let k = 0; k <= 12; k++) {
        const M = 10 ** (-1.5 * j);
        const e = 1 - 10 ** -k;
        const E = exact(eccentricAnomaly(M, e));
        const residual = E.minus(E.sin().times(exact(e))).minus(exact(M));
        const slope = new D(1).minus(E.cos().times(exact(e)));
        worst = Math.max(worst, residual.div(slope).div(E).abs().toNumber());
      }
    }
    expect(worst).toBeLessThan(4 * 2 ** -53);
  });

  it('takes whole turns off without loss, where e near 1 would magnify it, against 60 digits', () => {
    const D = Decimal.clone({ precision: 60 });
    const exact = (value: number) => new D(value.toPrecision(100));
    for (const turns of [1, 2, 3, -4, 10, 20, 100, 1000, -100000]) {
      for (const past of [0, 1e-6, 0.01, 1, -2]) {
        const M = turns * 2 * Math.PI + past;
        const E = eccentricAnomaly(M, 0.999);
        const residual = exact(E)
          .minus(exact(E).sin().times(exact(0.999)))
          .minus(exact(M))
          .abs()
          .toNumber();
        const slope = 1 - 0.999 * Math.cos(E);
        // One unit in the last place of E; to reduce M, 2 pi is held to 2^-105, and rounding the rest costs 2^-52.
        expect(residual, `${turns} turns and ${past}`).toBeLessThan(
          slope * Math.abs(E) * 2 ** -52 + 2 ** -51,
        );
      }
    }
  });

  it('is odd in M, grows with M and keeps the turn', () => {
    const M = fc.double({ min: 0, max: 3, noNaN: true });
    const e = fc.double({ min: 0, max: 0.999999, noNaN: true });
    fc.assert(
      fc.property(M, e, (m, ecc) => {
        expect(eccentricAnomaly(-m, ecc)).toBe(-eccentricAnomaly(m, ecc));
        expect(eccentricAnomaly(m + 0.1, ecc)).toBeGreaterThan(eccentricAnomaly(m, ecc));
        const turned = eccentricAnomaly(m + 2000 * Math.PI, ecc) - 2000 * Math.PI;
        expect(Math.abs(turned - ecc * Math.sin(turned) - m)).toBeLessThan(1e-11);
      }),
    );
  });

  it('is M on a circle', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (M) => eccentricAnomaly(M, 0) === M),
    );
  });

  it.each([
    [Number.NaN, 0.1],
    [Number.POSITIVE_INFINITY, 0.1],
    [1, 1],
    [1, -0.1],
    [1, Number.NaN],
  ])('refuses M %d, e %d', (M, e) => {
    expect(() => eccentricAnomaly(M, e)).toThrow(RangeError);
  });
});
