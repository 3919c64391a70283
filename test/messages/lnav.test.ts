import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import {
  type BitRun,
  fieldRange,
  grid,
  type MessageField,
  modelUnit,
  validRange,
} from '../../src/messages/field.ts';
import { LNAV, type LnavSymbol } from '../../src/messages/lnav.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { readRinexNavigation } from '../../src/messages/rinex/read.ts';
import { GPS_PI } from '../../src/systems/gps.ts';

const SYMBOLS = Object.keys(LNAV) as LnavSymbol[];
const FILES = [
  'test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx',
  'test/vectors/glob200a.15n',
  'test/vectors/receiver-2025-04-25.nav',
];

/** Values of a record by symbol, those that RINEX gives as values. */
function valuesOf(record: NavigationRecord): Partial<Record<LnavSymbol, number>> {
  const { toeMinusToc, ...elements } = record.elements;
  return { ...elements, health: record.health, IODE: record.iode, IODC: record.iodc };
}

async function* allRecords(): AsyncGenerator<NavigationRecord> {
  for (const file of FILES) yield* readRinexNavigation(file);
}

describe('the GPS LNAV field table', () => {
  // IS-GPS-200, Tables 20-I and 20-III, as quoted in textbooks: [bits, signed, power of two of a step]
  it.each([
    ['TGD', 8, true, -31],
    ['toc', 16, false, 4],
    ['af2', 8, true, -55],
    ['af1', 16, true, -43],
    ['af0', 22, true, -31],
    ['Crs', 16, true, -5],
    ['deltaN', 16, true, -43],
    ['M0', 32, true, -31],
    ['Cuc', 16, true, -29],
    ['e', 32, false, -33],
    ['Cus', 16, true, -29],
    ['sqrtA', 32, false, -19],
    ['toe', 16, false, 4],
    ['Cic', 16, true, -29],
    ['Omega0', 32, true, -31],
    ['Cis', 16, true, -29],
    ['i0', 32, true, -31],
    ['Crc', 16, true, -5],
    ['omega', 32, true, -31],
    ['OmegaDot', 24, true, -43],
    ['IDOT', 14, true, -43],
  ] as const)('%s has %i bits, signed %s, step 2^%i', (symbol, bits, signed, exponent) => {
    expect(LNAV[symbol]).toMatchObject({ bits, signed, scale: 2 ** exponent });
  });

  // Tsui, Fundamentals of Global Positioning System Receivers, Table 5.10: locations in subframe 3
  it.each([
    ['Cic', [[61, 76]]],
    [
      'Omega0',
      [
        [77, 84],
        [91, 114],
      ],
    ],
    ['Cis', [[121, 136]]],
    [
      'i0',
      [
        [137, 144],
        [151, 174],
      ],
    ],
    ['Crc', [[181, 196]]],
    [
      'omega',
      [
        [197, 204],
        [211, 234],
      ],
    ],
    ['OmegaDot', [[241, 264]]],
    ['IDOT', [[279, 292]]],
  ] as const)('%s stands at %j of subframe 3', (symbol, runs) => {
    const place = runs.map(([first, last]) => ({ subframe: 3, firstBit: first, bits: last - first + 1 }));
    expect(LNAV[symbol].place).toEqual(place);
  });

  it('gives every field as many bits in the message as it has', () => {
    for (const symbol of SYMBOLS) {
      expect(
        LNAV[symbol].place.reduce((sum, run) => sum + run.bits, 0),
        symbol,
      ).toBe(LNAV[symbol].bits);
    }
  });

  it('lets no two fields share a bit and none touch a preamble, a handover word or parity', () => {
    const owners = new Map<string, string>();
    for (const symbol of SYMBOLS) {
      for (const run of [...LNAV[symbol].place, ...(LNAV[symbol].copy ?? [])]) {
        for (let bit = run.firstBit; bit < run.firstBit + run.bits; bit++) {
          expect(bit, symbol).toBeGreaterThan(60);
          expect((bit - 1) % 30, symbol).toBeLessThan(24);
          const key = `${run.subframe}:${bit}`;
          expect(owners.get(key), `${symbol} at ${key}`).toBeUndefined();
          owners.set(key, symbol);
        }
      }
    }
  });

  it('gives no RINEX slot to two fields', () => {
    const slots = SYMBOLS.flatMap((symbol) => LNAV[symbol].rinex ?? []).map(
      ({ line, column }) => `${line}:${column}`,
    );
    expect(new Set(slots).size).toBe(slots.length);
    expect(slots).toHaveLength(29); // 8 lines of 4, less transmission time and two spares
  });

  it('states ranges, steps and units in the units of the model', () => {
    expect(fieldRange(LNAV.e)).toEqual({ min: 0, max: 0.5 - 2 ** -33 });
    expect(fieldRange(LNAV.Crs)).toEqual({ min: -1024, max: 1024 - 2 ** -5 });
    expect(fieldRange(LNAV.M0).min).toBe(-GPS_PI);
    expect(grid(LNAV.IDOT)).toBe(2 ** -43 * GPS_PI);
    expect(validRange(LNAV.sqrtA)).toEqual({ min: 2530, max: 8192 - 2 ** -19 });
    expect(validRange(LNAV.toe)).toEqual({ min: 0, max: 604784 });
    expect(validRange(LNAV.OmegaDot)).toEqual({ min: -6.33e-7 * GPS_PI, max: 0 });
    expect(validRange(LNAV.Crs)).toEqual(fieldRange(LNAV.Crs));
    expect(modelUnit(LNAV.OmegaDot)).toBe('rad/s');
    expect(modelUnit(LNAV.sqrtA)).toBe('m^(1/2)');
  });
});

describe('values of real navigation files', () => {
  it('lie on the grid of their field, to the digits printed', async () => {
    let count = 0;
    for await (const record of allRecords()) {
      for (const [symbol, value] of Object.entries(valuesOf(record)) as [LnavSymbol, number][]) {
        const step = grid(LNAV[symbol]);
        const printed = Math.abs(value) * 5.1e-12; // half a unit of the twelfth digit
        expect(printed, `${symbol}: the digits tell steps apart`).toBeLessThan(step / 10);
        const off = Math.abs(value - Math.round(value / step) * step);
        expect(off, `${symbol} of ${record.satellite} at line ${record.line}`).toBeLessThanOrEqual(printed);
        count++;
      }
    }
    expect(count).toBeGreaterThan(8000);
  });

  it('lie in the range that their field carries, and in the valid one', async () => {
    for await (const record of allRecords()) {
      for (const [symbol, value] of Object.entries(valuesOf(record)) as [LnavSymbol, number][]) {
        for (const { min, max } of [fieldRange(LNAV[symbol]), validRange(LNAV[symbol])]) {
          expect(value, symbol).toBeGreaterThanOrEqual(min);
          expect(value, symbol).toBeLessThanOrEqual(max);
        }
      }
    }
  });
});

describe('words off the air', () => {
  /** Ten words by satellite and subframe. */
  const words = new Map(
    readFileSync('test/vectors/receiver-2025-04-25.lnav-words.txt', 'latin1')
      .split('\n')
      .filter((line) => line.startsWith('G'))
      .map((line) => line.split(' '))
      .map(([satellite, subframe, ...hex]) => [
        `${satellite} ${subframe}`,
        hex.map((word) => Number.parseInt(word, 16)),
      ]),
  );

  function bitsAt(satellite: string, runs: readonly BitRun[]): number {
    let value = 0;
    for (const { subframe, firstBit, bits } of runs) {
      for (let bit = firstBit - 1; bit < firstBit - 1 + bits; bit++) {
        const word = words.get(`${satellite} ${subframe}`)?.[Math.floor(bit / 30)] ?? Number.NaN;
        value = value * 2 + ((word >>> (29 - (bit % 30))) & 1);
      }
    }
    return value;
  }

  function decode(satellite: string, field: MessageField): number {
    const raw = bitsAt(satellite, field.place);
    return (field.signed && raw >= 2 ** (field.bits - 1) ? raw - 2 ** field.bits : raw) * grid(field);
  }

  it('decode by the table to the RINEX record of the same transmission', async () => {
    let count = 0;
    for await (const record of readRinexNavigation('test/vectors/receiver-2025-04-25.nav')) {
      count++;
      for (const [symbol, value] of Object.entries(valuesOf(record)) as [LnavSymbol, number][]) {
        const off = Math.abs(decode(record.satellite, LNAV[symbol]) - value);
        expect(off, `${symbol} of ${record.satellite}`).toBeLessThanOrEqual(Math.abs(value) * 5.1e-12);
      }
      expect(decode(record.satellite, LNAV.WN)).toBe(record.toe.week % 1024);
      expect(decode(record.satellite, LNAV.toc)).toBe(record.toc.seconds);
      expect(decode(record.satellite, LNAV.codesOnL2)).toBe(1);
      expect(decode(record.satellite, LNAV.L2P)).toBe(0);
      expect(decode(record.satellite, LNAV.URA)).toBe(0); // the file's 2.0 m, IS-GPS-200 20.3.3.3.1.3
      expect(decode(record.satellite, LNAV.fitInterval)).toBe(0); // 4 h in the file
      expect(bitsAt(record.satellite, LNAV.IODE.copy ?? [])).toBe(record.iode);
      expect(decode(record.satellite, LNAV.AODO)).toBeLessThanOrEqual(27900);
    }
    expect(count).toBe(4);
  });
});
