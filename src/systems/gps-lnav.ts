import { fieldRange, modelUnit } from '../messages/field.ts';
import { LNAV, type LnavSymbol } from '../messages/lnav.ts';
import type { Domain, ModelDescription, Range } from '../models/description.ts';
import { GPS } from './gps.ts';

/** Elements of the model in the order in which setup reads them; their units stand in the field table. */
const ELEMENTS: readonly LnavSymbol[] = [
  'sqrtA',
  'e',
  'i0',
  'Omega0',
  'omega',
  'M0',
  'deltaN',
  'IDOT',
  'OmegaDot',
  'Cuc',
  'Cus',
  'Crc',
  'Crs',
  'Cic',
  'Cis',
  'toe',
  'af0',
  'af1',
  'af2',
  'TGD',
];

/** The last digit of a RINEX number can lift a value over the end of its field: room of one unit in the eleventh digit. */
const PRINTED = 1 + 1e-11;

/** The full circle. */
const circle: Range = {
  min: -3.1415926536,
  max: 3.1415926536,
  from: 'the full circle, with room for a value printed to eleven digits',
};

/** All that a field can carry. */
function carried(symbol: LnavSymbol): Range {
  const { min, max } = fieldRange(LNAV[symbol]);
  const from =
    'all that the field can carry, IS-GPS-200 Tables 20-I and 20-III, with room for a value printed to eleven digits';
  return { min: min * PRINTED, max: max * PRINTED, from };
}

/** The constellation as it flies: what the fields carry, cut to the orbits that GPS satellites have. */
const flown: Domain = {
  ...Object.fromEntries(ELEMENTS.map((symbol) => [symbol, carried(symbol)])),
  sqrtA: { min: 5150, max: 5160, from: 'the constellation as it flies: A = 26,560 km and its spread' },
  e: {
    min: 0,
    max: 0.03,
    from: 'the constellation as it flies, and the range of the field, IS-GPS-200 Table 20-III',
  },
  i0: { min: 0.9, max: 1.02, from: 'the constellation as it flies: 55 degrees and its spread' },
  OmegaDot: { min: -1e-8, max: -6e-9, from: 'the constellation as it flies' },
  Omega0: circle,
  omega: circle,
  M0: circle,
  toe: { min: 0, max: 604784, from: 'the valid range of the field, IS-GPS-200 Table 20-III' },
  toeMinusToc: {
    min: -7200,
    max: 7200,
    from: 'the clock is referred to the epoch of the ephemeris or to one upload beside it',
  },
  t: { min: -7200, max: 7200, from: 'the curve fit interval of four hours around toe, IS-GPS-200 20.3.4.4' },
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
    ...Object.fromEntries(ELEMENTS.map((symbol) => [symbol, modelUnit(LNAV[symbol])])),
    toeMinusToc: 's',
  },
  constants: { ...GPS },
  frameRate: GPS.OmegaEDot,
  domains: { flown },
};
