import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { position } from '../../src/models/broadcast.ts';
import { differenceVelocity, distanceBetween, orbitError } from '../../src/orbits/orbit-error.ts';
import { GPS } from '../../src/systems/gps.ts';

/** Remondi 2004 (see test/models/broadcast.test.ts). */
const REMONDI = {
  sqrtA: 5153.79589081,
  e: 0.00223578442819,
  i0: 0.96168506138,
  Omega0: 1.64046615454,
  omega: 2.0637403777,
  M0: 1.05827953357,
  deltaN: 4.65376527657e-9,
  IDOT: 3.42514267094e-10,
  OmegaDot: -8.56928551657e-9,
  Cuc: 4.57651913166e-6,
  Cus: 1.77137553692e-6,
  Crc: 344.96875,
  Crs: 88.6875,
  Cic: 6.51925802231e-8,
  Cis: -8.56816768646e-8,
  toe: 93600,
};

describe('differenceVelocity', () => {
  it('gives the velocity of Remondi 2004', () => {
    const { x, y, z } = differenceVelocity((t) => position(REMONDI, GPS, t), -7200);
    // The printed figures 266.2803795674, -2424.7683468482, -1529.7620784616 use the corrected argument of
    // latitude in the harmonic rates, up to 5.2e-7 m/s from the exact derivative of the position:
    expect(Math.abs(x - 266.2803793563557)).toBeLessThan(3e-7);
    expect(Math.abs(y - -2424.768347363315)).toBeLessThan(3e-7);
    expect(Math.abs(z - -1529.762078124118)).toBeLessThan(3e-7);
  });
});

describe('orbitError', () => {
  const reference = { x: 2.6e7, y: 0, z: 0 };
  const still = { x: 0, y: 0, z: 0 };

  it('takes a circular equatorial orbit apart by its axes', () => {
    const velocity = { x: 0, y: 3000, z: 0 };
    const error = orbitError({ x: 2.6e7 + 1, y: 2, z: 3 }, reference, velocity, 0);
    expect(error.radial).toBeCloseTo(1, 9);
    expect(error.along).toBeCloseTo(2, 9);
    expect(error.cross).toBeCloseTo(3, 9);
    expect(error.total).toBeCloseTo(Math.sqrt(14), 9);
  });

  it('adds the rotation of the Earth: a satellite at rest over the ground goes east', () => {
    expect(orbitError({ x: 2.6e7, y: 5, z: 0 }, reference, still, GPS.OmegaEDot).along).toBeCloseTo(5, 9);
  });

  it('takes the plane of the inertial velocity, on every meridian', () => {
    // 1895.9 m/s north over the ground; the Earth's rotation adds as much to the east: 45 degrees.
    const velocity = { x: 0, y: 0, z: 2.6e7 * GPS.OmegaEDot };
    for (const longitude of [0, 1, 2, 3, -1, -2]) {
      const east = { x: -Math.sin(longitude), y: Math.cos(longitude) };
      const place = { x: 2.6e7 * Math.cos(longitude), y: 2.6e7 * Math.sin(longitude), z: 0 };
      const position = { x: place.x + east.x, y: place.y + east.y, z: 1 };
      const error = orbitError(position, place, velocity, GPS.OmegaEDot);
      expect(error.along).toBeCloseTo(Math.SQRT2, 7);
      expect(error.cross).toBeCloseTo(0, 7);
      expect(error.radial).toBeCloseTo(0, 7);
    }
  });

  it('keeps the length of the difference', () => {
    const number = fc.double({ min: -1e3, max: 1e3, noNaN: true });
    fc.assert(
      fc.property(number, number, number, number, (x, y, z, speed) => {
        const place = { x: 1.2e7, y: -1.5e7, z: 1.8e7 };
        const position = { x: place.x + x, y: place.y + y, z: place.z + z };
        const error = orbitError(position, place, { x: 2500, y: speed, z: -900 }, GPS.OmegaEDot);
        expect(Math.hypot(error.radial, error.along, error.cross)).toBeCloseTo(error.total, 6);
        expect(error.total).toBeCloseTo(distanceBetween(position, place), 9);
      }),
    );
  });
});
