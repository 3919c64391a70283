import { beforeAll, describe, expect, it } from 'vitest';
import { groupBy } from '../../src/messages/group-by.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { type ComparedPoint, compareEpoch, summarize } from '../../src/orbits/compare.ts';
import { readSp3, type Sp3Epoch } from '../../src/orbits/sp3.ts';
import { findSuspects } from '../../src/orbits/suspects.ts';
import { toIso } from '../../src/time/calendar.ts';
import { readRecords } from '../messages/records.ts';

function compare(records: readonly NavigationRecord[], epochs: readonly Sp3Epoch[]): ComparedPoint[] {
  const bySatellite = groupBy(records, (record) => record.satellite);
  return epochs.flatMap((epoch) => compareEpoch(bySatellite, epoch));
}

async function readEpochs(path: string): Promise<Sp3Epoch[]> {
  const epochs: Sp3Epoch[] = [];
  for await (const epoch of readSp3(path)) epochs.push(epoch);
  return epochs;
}

let igs: readonly NavigationRecord[];
let dlr: readonly NavigationRecord[];
let code: readonly Sp3Epoch[];

beforeAll(async () => {
  igs = await readRecords('test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx');
  dlr = await readRecords('test/vectors/BRD400DLR_S_20220010000_01D_GN-LNAV-CNAV.trim.rnx');
  code = await readEpochs('test/vectors/COD0MGXFIN_20220010000_01D_ORB-GPS.trim15M.SP3');
});

describe('broadcast minus precise, against the figures of an independent evaluator', () => {
  it('BRDC00IGS against CODE: 12 satellites, 1124 points, 1.72 m RMS, 3.41 m at most', () => {
    const comparison = summarize(compare(igs, code))!;
    expect(comparison).toMatchObject({ satellites: 12, points: 1124 });
    expect(comparison.rms).toBeCloseTo(1.72, 2);
    expect(comparison.worst.error.total).toBeCloseTo(3.41, 2);
    expect(comparison).not.toHaveProperty('velocityRms');
  });

  it('glob200a against NGA: 16 satellites, 1472 points, 1.63 m RMS, 5.19 m at most, 0.26 mm/s', async () => {
    const records = await readRecords('test/vectors/glob200a.15n');
    const epochs = await readEpochs('test/vectors/nga_2015_200.trim15M.sp3');
    const comparison = summarize(compare(records, epochs))!;
    expect(comparison).toMatchObject({ satellites: 16, points: 1472 });
    expect(comparison.rms).toBeCloseTo(1.63, 2);
    expect(comparison.worst.error.total).toBeCloseTo(5.19, 2);
    expect(comparison.velocityRms! * 1e3).toBeCloseTo(0.26, 2);
  });

  it('has a mean radial offset of -0.6 to -1.8 m from the antenna, more than to the sides', () => {
    const points = compare(igs, code);
    const mean = (axis: 'radial' | 'along' | 'cross') =>
      points.reduce((sum, point) => sum + point.error[axis], 0) / points.length;
    expect(mean('radial')).toBeLessThan(-0.6);
    expect(mean('radial')).toBeGreaterThan(-1.8);
    expect(Math.abs(mean('along'))).toBeLessThan(0.6);
    expect(Math.abs(mean('cross'))).toBeLessThan(0.6);
  });

  it('adds up: squares of the three axes are the square of the whole', () => {
    const { rms, radialRms, alongRms, crossRms } = summarize(compare(igs, code))!;
    expect(Math.hypot(radialRms, alongRms, crossRms)).toBeCloseTo(rms, 9);
  });

  it('is nothing where nothing is in common', () => {
    expect(summarize(compare([], code))).toBeUndefined();
    expect(
      compare(
        igs.map((record) => ({ ...record, health: 1 })),
        code,
      ),
    ).toEqual([]);
  });
});

describe('findSuspects', () => {
  it('finds none in sound files', () => {
    const search = findSuspects(compare(igs, code));
    expect(search.suspects).toEqual([]);
    expect(search.others?.points).toBe(1124);
    expect(search.limit).toBeGreaterThan(4);
  });

  it('finds the corrupted record of G07 in BRD400DLR, and what the group is without it', () => {
    const points = compare(dlr, code);
    expect(summarize(points)!.rms).toBeGreaterThan(100);
    const { suspects, others } = findSuspects(points);
    expect(
      suspects.map(({ record }) => `${record.satellite} ${toIso(record.toe)} ${record.iode} ${record.line}`),
    ).toEqual(['G07 2022-01-01T14:00:00 60 824']);
    expect(suspects[0]?.comparison.worst.error.total).toBeGreaterThan(5000);
    expect(others?.rms).toBeCloseTo(1.72, 1);
    expect(others?.worst.error.total).toBeLessThan(4);
  });

  // Errors that a single wrong bit makes
  it.each([
    ['M0', 2 ** -22 * Math.PI],
    ['i0', 2 ** -22 * Math.PI],
    ['OmegaDot', 2 ** -31 * Math.PI],
    ['Crs', 16],
    ['e', 2 ** -20],
  ] as const)('finds a record whose %s is wrong by one bit', (symbol, by) => {
    const bad = igs[70]!;
    const elements = { ...bad.elements, [symbol]: bad.elements[symbol] + by };
    const records = igs.map((record) => (record === bad ? { ...bad, elements } : record));
    const { suspects } = findSuspects(compare(records, code));
    expect(suspects.map(({ record }) => record.line)).toEqual([bad.line]);
  });

  it('does not guess from fewer than five records', () => {
    const few = dlr.filter(
      (record) => record.satellite === 'G07' && record.toe.seconds > 561600 && record.toe.seconds < 576000,
    );
    expect(few.length).toBeLessThan(5);
    const { limit, suspects, others } = findSuspects(compare(few, code));
    expect({ limit, suspects }).toEqual({ limit: undefined, suspects: [] });
    expect(others?.rms).toBeGreaterThan(1000);
  });

  it('takes no spread below the resolution of the file', () => {
    const points = compare(igs, code).map((point) => ({ ...point, error: { ...point.error, total: 1 } }));
    const [first, ...rest] = points;
    const search = findSuspects([{ ...first!, error: { ...first!.error, total: 1.01 } }, ...rest]);
    expect(search.suspects).toEqual([]);
    expect(search.limit).toBeCloseTo(1 + 15 * 1.4826 * 1e-3, 9);
  });
});
