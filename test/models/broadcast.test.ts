import { describe, expect, it } from 'vitest';
import { readRinexNavigation } from '../../src/messages/rinex/read.ts';
import {
  type BroadcastElements,
  type ClockParameters,
  clock,
  position,
  relativisticTerm,
} from '../../src/models/broadcast.ts';
import { position as twoBody } from '../../src/models/two-body.ts';
import { GPS, SPEED_OF_LIGHT } from '../../src/systems/gps.ts';

/**
 * Remondi, Computing satellite velocity using the broadcast ephemeris, GPS Solutions 8(3), 2004, with the
 * program bc_velo.c: satellite 20 at 86400 s of week 1124.
 */
const REMONDI: BroadcastElements & ClockParameters = {
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
  af0: -8.57324339449e-5,
  af1: -2.72848410532e-12,
  af2: 0,
  TGD: 0,
  toeMinusToc: 0,
};

describe('Remondi 2004', () => {
  const t = 86400 - REMONDI.toe;

  it('position', () => {
    const { x, y, z } = position(REMONDI, GPS, t);
    expect(Math.abs(x - -12611434.197822187)).toBeLessThan(1e-7);
    expect(Math.abs(y - -13413103.977970412)).toBeLessThan(1e-7);
    expect(Math.abs(z - 19062913.07357877)).toBeLessThan(1e-7);
  });

  it('relativistic term, printed in metres', () => {
    // The program computes F from mu and c; the standard gives ten digits of it, a relative 9e-11 away.
    const earth = { ...GPS, F: (-2 * Math.sqrt(GPS.mu)) / SPEED_OF_LIGHT ** 2 };
    const printed = -0.012570413426601913;
    expect(Math.abs(relativisticTerm(REMONDI, earth, t) * SPEED_OF_LIGHT - printed)).toBeLessThan(1e-16);
    expect(Math.abs(relativisticTerm(REMONDI, GPS, t) * SPEED_OF_LIGHT - printed)).toBeLessThan(2e-12);
  });

  it('clock polynomial, printed in metres', () => {
    const polynomial = clock(REMONDI, GPS, t) - relativisticTerm(REMONDI, GPS, t);
    expect(Math.abs(polynomial * SPEED_OF_LIGHT - -25696.047654177062)).toBeLessThan(1e-11);
  });
});

describe('clock', () => {
  it('subtracts the group delay and refers the polynomial to toc', () => {
    const elements = { ...REMONDI, e: 0, af0: 1e-4, af1: 1e-9, af2: 1e-15, TGD: 3e-9, toeMinusToc: 16 };
    expect(clock(elements, GPS, 100)).toBeCloseTo(1e-4 + 1e-9 * 116 + 1e-15 * 116 ** 2 - 3e-9, 20);
  });

  it('has the relativistic constant F = -2 sqrt(mu) / c^2 (IS-GPS-200, 20.3.3.3.3.1)', () => {
    expect(GPS.F).toBeCloseTo((-2 * Math.sqrt(GPS.mu)) / SPEED_OF_LIGHT ** 2, 18);
  });
});

describe('position', () => {
  it('without corrections and in a frame that turns with the Earth is the two-body orbit', () => {
    const none = { deltaN: 0, IDOT: 0, Cuc: 0, Cus: 0, Crc: 0, Crs: 0, Cic: 0, Cis: 0, toe: 0 };
    const elements = { ...REMONDI, ...none, OmegaDot: GPS.OmegaEDot, e: 0.3 };
    const classical = {
      a: elements.sqrtA ** 2,
      e: elements.e,
      i: elements.i0,
      Omega: elements.Omega0,
      omega: elements.omega,
      M0: elements.M0,
    };
    for (let t = -7200; t <= 7200; t += 600) {
      const [one, other] = [position(elements, GPS, t), twoBody(classical, GPS, t)];
      expect(Math.hypot(one.x - other.x, one.y - other.y, one.z - other.z)).toBeLessThan(1e-7);
    }
  });
});

describe('GPS orbits (common practice, no source: half a sidereal day)', () => {
  const halfTurn = Math.PI / GPS.OmegaEDot;

  it('A = 26561765.4502 m gives half a rotation of the Earth by the constants of IS-GPS-200', () => {
    expect(2 * Math.PI * Math.sqrt(26561765.4502 ** 3 / GPS.mu)).toBeCloseTo(halfTurn, 6);
  });

  it('holds for the records of a day to 0.03 %', async () => {
    for await (const { elements } of readRinexNavigation(
      'test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx',
    )) {
      const period = (2 * Math.PI) / (Math.sqrt(GPS.mu / elements.sqrtA ** 6) + elements.deltaN);
      expect(Math.abs(period / halfTurn - 1)).toBeLessThan(3e-4);
    }
  });
});
