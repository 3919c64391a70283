import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Position } from '../../src/models/position.ts';
import { type ClassicalElements, position } from '../../src/models/two-body.ts';
import { GPS } from '../../src/systems/gps.ts';

const DEGREE = Math.PI / 180;
const length = ({ x, y, z }: Position) => Math.hypot(x, y, z);
const period = (a: number, mu: number) => 2 * Math.PI * Math.sqrt((a * a * a) / mu);

const orbit = fc.record({
  a: fc.double({ min: 6.6e6, max: 4.3e7, noNaN: true }),
  e: fc.double({ min: 0, max: 0.9, noNaN: true }),
  i: fc.double({ min: 0, max: Math.PI, noNaN: true }),
  Omega: fc.double({ min: -Math.PI, max: Math.PI, noNaN: true }),
  omega: fc.double({ min: -Math.PI, max: Math.PI, noNaN: true }),
  M0: fc.constant(0),
});

describe('position', () => {
  it('Vallado, Fundamentals of Astrodynamics and Applications, Example 2-6', () => {
    const e = 0.83285;
    const nu = 92.335 * DEGREE;
    const E = 2 * Math.atan(Math.sqrt((1 - e) / (1 + e)) * Math.tan(nu / 2));
    const elements = {
      a: 11067.79e3 / (1 - e * e),
      e,
      i: 87.87 * DEGREE,
      Omega: 227.89 * DEGREE,
      omega: 53.38 * DEGREE,
      M0: E - e * Math.sin(E),
    };
    const { x, y, z } = position(elements, { mu: 3.986004418e14 }, 0);
    // The book works with unrounded inputs: its figures lie within 0.03 km of those of the printed inputs.
    expect(Math.abs(x / 1e3 - 6525.344)).toBeLessThan(0.03);
    expect(Math.abs(y / 1e3 - 6861.535)).toBeLessThan(0.03);
    expect(Math.abs(z / 1e3 - 6449.125)).toBeLessThan(0.03);
    // The printed inputs, recomputed with 40 digits.
    expect(Math.abs(x / 1e3 - 6525.368121)).toBeLessThan(1e-6);
    expect(Math.abs(y / 1e3 - 6861.531835)).toBeLessThan(1e-6);
    expect(Math.abs(z / 1e3 - 6449.118614)).toBeLessThan(1e-6);
  });

  it('closes after one period', () => {
    fc.assert(
      fc.property(orbit, (elements) => {
        const start = position(elements, GPS, 0);
        const end = position(elements, GPS, period(elements.a, GPS.mu));
        expect(length({ x: end.x - start.x, y: end.y - start.y, z: end.z - start.z })).toBeLessThan(1e-5);
      }),
    );
  });
});

describe('facts of the trade (common practice, no source)', () => {
  /** Position at a given eccentric anomaly, through its mean anomaly. */
  const at = (elements: ClassicalElements, E: number) =>
    position({ ...elements, M0: E - elements.e * Math.sin(E) }, GPS, 0);

  it('the distance from the focus to the end of the minor axis is a', () => {
    fc.assert(
      fc.property(orbit, (elements) => {
        expect(length(at(elements, Math.PI / 2)) / elements.a).toBeCloseTo(1, 12);
      }),
    );
  });

  it('e = sqrt(1 - (b / a)^2), with a and b measured on the orbit', () => {
    fc.assert(
      fc.property(orbit, (elements) => {
        const [perigee, apogee] = [at(elements, 0), at(elements, Math.PI)];
        const [right, left] = [at(elements, Math.PI / 2), at(elements, -Math.PI / 2)];
        const a = length({ x: perigee.x - apogee.x, y: perigee.y - apogee.y, z: perigee.z - apogee.z }) / 2;
        const b = length({ x: right.x - left.x, y: right.y - left.y, z: right.z - left.z }) / 2;
        expect(1 - (b / a) ** 2).toBeCloseTo(elements.e ** 2, 12);
      }),
    );
  });

  it('perigee and apogee lie at a (1 - e) and a (1 + e)', () => {
    fc.assert(
      fc.property(orbit, (elements) => {
        expect(length(at(elements, 0)) / (elements.a * (1 - elements.e))).toBeCloseTo(1, 12);
        expect(length(at(elements, Math.PI)) / (elements.a * (1 + elements.e))).toBeCloseTo(1, 12);
      }),
    );
  });

  it('the mean anomaly is the elapsed fraction of the period: the area swept grows with it', () => {
    const elements = { a: 2e7, e: 0.6, i: 0, Omega: 0, omega: 0, M0: 0 };
    const T = period(elements.a, GPS.mu);
    const ellipse = Math.PI * elements.a ** 2 * Math.sqrt(1 - elements.e ** 2);
    const steps = 20000;
    let area = 0;
    let last = position(elements, GPS, 0);
    for (let k = 1; k <= steps; k++) {
      const next = position(elements, GPS, (k / steps) * T);
      area += (last.x * next.y - last.y * next.x) / 2; // triangle from the focus
      last = next;
      if (k % 2500 === 0) expect(area / ellipse).toBeCloseTo(k / steps, 6);
    }
  });
});
