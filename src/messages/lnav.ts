import type { BitRun, BroadcastUnit, MessageField, RinexSlot } from './field.ts';

/** Fields of GPS LNAV subframes 1 to 3, named as IS-GPS-200 does where it gives a symbol. */
export type LnavSymbol =
  | 'WN'
  | 'codesOnL2'
  | 'URA'
  | 'health'
  | 'IODC'
  | 'L2P'
  | 'TGD'
  | 'toc'
  | 'af2'
  | 'af1'
  | 'af0'
  | 'IODE'
  | 'Crs'
  | 'deltaN'
  | 'M0'
  | 'Cuc'
  | 'e'
  | 'Cus'
  | 'sqrtA'
  | 'toe'
  | 'fitInterval'
  | 'AODO'
  | 'Cic'
  | 'Omega0'
  | 'Cis'
  | 'i0'
  | 'Crc'
  | 'omega'
  | 'OmegaDot'
  | 'IDOT';

/** Valid times of week, s. */
const TIMES: readonly [number, number] = [0, 604784];

/**
 * The GPS LNAV field table.
 *
 * Sources: bits, scales, units and valid ranges, IS-GPS-200, Tables 20-I (clock) and 20-III (ephemeris) and
 * 20.3.3.3.1; places, Figure 20-1, sheets 1 to 3; RINEX slots, RINEX 2.11 Table A4, RINEX 3.05 Table A6 and
 * the same eight lines in RINEX 4.00. All written from memory; test/messages/lnav.test.ts decodes words off
 * the air with it and compares the values with the RINEX record of the same transmission.
 */
export const LNAV: Readonly<Record<LnavSymbol, MessageField>> = {
  // Subframe 1: clock and health
  WN: unsigned('week modulo 1024', 10, 1, 'week', at(1, 61, 10), slot(5, 2)),
  codesOnL2: unsigned('code on the L2 channel', 2, 1, '1', at(1, 71, 2), optional(5, 1)),
  URA: unsigned('index of the user range accuracy', 4, 1, '1', at(1, 73, 4), optional(6, 0, 'metres')),
  health: unsigned('health of the satellite, 0 good', 6, 1, '1', at(1, 77, 6), slot(6, 1)),
  IODC: unsigned('issue of data, clock', 10, 1, '1', [...at(1, 83, 2), ...at(1, 211, 8)], slot(6, 3)),
  L2P: unsigned('1 where P code on L2 carries no data', 1, 1, '1', at(1, 91, 1), optional(5, 3)),
  TGD: signed('group delay differential', 8, 2 ** -31, 's', at(1, 197, 8), slot(6, 2)),
  toc: { ...unsigned('time of clock', 16, 2 ** 4, 's', at(1, 219, 16), slot(0, 0, 'date')), valid: TIMES },
  af2: signed('clock drift rate', 8, 2 ** -55, 's/s^2', at(1, 241, 8), slot(0, 3)),
  af1: signed('clock drift', 16, 2 ** -43, 's/s', at(1, 249, 16), slot(0, 2)),
  af0: signed('clock bias', 22, 2 ** -31, 's', at(1, 271, 22), slot(0, 1)),

  // Subframe 2: ephemeris, first half
  IODE: { ...unsigned('issue of data, orbit', 8, 1, '1', at(2, 61, 8), slot(1, 0)), copy: at(3, 271, 8) },
  Crs: signed('sine term of the radius', 16, 2 ** -5, 'm', at(2, 69, 16), slot(1, 1)),
  deltaN: signed('correction of the mean motion', 16, 2 ** -43, 'semicircle/s', at(2, 91, 16), slot(1, 2)),
  M0: signed('mean anomaly at toe', 32, 2 ** -31, 'semicircle', twoWords(2, 107), slot(1, 3)),
  Cuc: signed('cosine term of the latitude argument', 16, 2 ** -29, 'rad', at(2, 151, 16), slot(2, 0)),
  e: { ...unsigned('eccentricity', 32, 2 ** -33, '1', twoWords(2, 167), slot(2, 1)), valid: [0, 0.03] },
  Cus: signed('sine term of the latitude argument', 16, 2 ** -29, 'rad', at(2, 211, 16), slot(2, 2)),
  sqrtA: {
    ...unsigned('square root of the semi-major axis', 32, 2 ** -19, 'm^(1/2)', twoWords(2, 227), slot(2, 3)),
    valid: [2530, 8192],
  },
  toe: { ...unsigned('time of ephemeris', 16, 2 ** 4, 's', at(2, 271, 16), slot(3, 0)), valid: TIMES },
  fitInterval: unsigned(
    '1: fitted over more than 4 hours',
    1,
    1,
    '1',
    at(2, 287, 1),
    optional(7, 1, 'hours'),
  ),
  AODO: unsigned('age of data offset', 5, 900, 's', at(2, 288, 5)),

  // Subframe 3: ephemeris, second half
  Cic: signed('cosine term of the inclination', 16, 2 ** -29, 'rad', at(3, 61, 16), slot(3, 1)),
  Omega0: signed('node at the weekly epoch', 32, 2 ** -31, 'semicircle', twoWords(3, 77), slot(3, 2)),
  Cis: signed('sine term of the inclination', 16, 2 ** -29, 'rad', at(3, 121, 16), slot(3, 3)),
  i0: signed('inclination at toe', 32, 2 ** -31, 'semicircle', twoWords(3, 137), slot(4, 0)),
  Crc: signed('cosine term of the radius', 16, 2 ** -5, 'm', at(3, 181, 16), slot(4, 1)),
  omega: signed('argument of perigee', 32, 2 ** -31, 'semicircle', twoWords(3, 197), slot(4, 2)),
  OmegaDot: {
    ...signed('rate of right ascension', 24, 2 ** -43, 'semicircle/s', at(3, 241, 24), slot(4, 3)),
    valid: [-6.33e-7, 0],
  },
  IDOT: signed('rate of the inclination', 14, 2 ** -43, 'semicircle/s', at(3, 279, 14), slot(5, 0)),
};

function at(subframe: number, firstBit: number, bits: number): readonly BitRun[] {
  return [{ subframe, firstBit, bits }];
}

/** 32 bits: the last 8 data bits of a word, then, past 6 bits of parity, the 24 of the next. */
function twoWords(subframe: number, firstBit: number): readonly BitRun[] {
  return [...at(subframe, firstBit, 8), ...at(subframe, firstBit + 14, 24)];
}

function slot(line: number, column: number, holds: RinexSlot['holds'] = 'value'): RinexSlot {
  return { line, column, holds, blank: 'fault' };
}

function optional(line: number, column: number, holds: RinexSlot['holds'] = 'value'): RinexSlot {
  return { line, column, holds, blank: 'absent' };
}

function signed(
  meaning: string,
  bits: number,
  scale: number,
  unit: BroadcastUnit,
  place: readonly BitRun[],
  rinex?: RinexSlot,
): MessageField {
  return { meaning, unit, bits, signed: true, scale, place, ...(rinex && { rinex }) };
}

function unsigned(
  meaning: string,
  bits: number,
  scale: number,
  unit: BroadcastUnit,
  place: readonly BitRun[],
  rinex?: RinexSlot,
): MessageField {
  return { meaning, unit, bits, signed: false, scale, place, ...(rinex && { rinex }) };
}
