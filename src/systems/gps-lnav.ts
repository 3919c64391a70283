import type { Domain, ModelDescription } from '../models/description.ts';
import { GPS, GPS_PI } from './gps.ts';

const SEMICIRCLE = GPS_PI;
const field = (min: number, max: number): { min: number; max: number; from: string } => ({
  min,
  max,
  from: 'all that the field can carry, IS-GPS-200 Tables 20-I and 20-III',
});
const full = { min: -Math.PI, max: Math.PI, from: 'the full circle, rounded to float64' };

const flown: Domain = {
  sqrtA: { min: 5150, max: 5160, from: 'the constellation as it flies: A = 26,560 km and its spread' },
  e: { min: 0, max: 0.03, from: 'the constellation as it flies; IS-GPS-200 20.3.3.4.3 allows up to 0.03' },
  i0: { min: 0.9, max: 1.02, from: 'the constellation as it flies: 55 degrees and its spread' },
  Omega0: full,
  omega: full,
  M0: full,
  deltaN: field(-(2 ** -28) * SEMICIRCLE, 2 ** -28 * SEMICIRCLE),
  IDOT: field(-(2 ** -30) * SEMICIRCLE, 2 ** -30 * SEMICIRCLE),
  OmegaDot: { min: -1e-8, max: -6e-9, from: 'the constellation as it flies' },
  Cuc: field(-(2 ** -14), 2 ** -14),
  Cus: field(-(2 ** -14), 2 ** -14),
  Crc: field(-1024, 1024),
  Crs: field(-1024, 1024),
  Cic: field(-(2 ** -14), 2 ** -14),
  Cis: field(-(2 ** -14), 2 ** -14),
  toe: field(0, 604784),
  af0: field(-(2 ** -10), 2 ** -10),
  af1: field(-(2 ** -28), 2 ** -28),
  af2: field(-(2 ** -48), 2 ** -48),
  TGD: field(-(2 ** -24), 2 ** -24),
  toeMinusToc: { min: -7200, max: 7200, from: 'the clock is referred to the ephemeris epoch or one upload beside it' },
  t: { min: -7200, max: 7200, from: 'the curve fit interval of four hours and its middle, IS-GPS-200 20.3.4.4' },
};

/** The GPS legacy navigation message: broadcast ephemeris and clock. */
export const gpsLnav: ModelDescription = {
  name: 'gps-lnav',
  title: 'GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock',
  source: 'IS-GPS-200, Table 20-IV and 20.3.3.3.3',
  file: new URL('../models/broadcast.ts', import.meta.url),
  outputs: {
    position: { function: 'position', unit: 'm' },
    clock: { function: 'clock', unit: 's' },
  },
  units: {
    sqrtA: 'm^(1/2)', e: '1', i0: 'rad', Omega0: 'rad', omega: 'rad', M0: 'rad', deltaN: 'rad/s', IDOT: 'rad/s', OmegaDot: 'rad/s',
    Cuc: 'rad', Cus: 'rad', Crc: 'm', Crs: 'm', Cic: 'rad', Cis: 'rad', toe: 's', af0: 's', af1: 's/s', af2: 's/s^2', TGD: 's', toeMinusToc: 's',
  },
  constants: { ...GPS },
  frameRate: GPS.OmegaEDot,
  domains: { flown },
};
