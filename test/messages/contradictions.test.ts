import { describe, expect, it } from 'vitest';
import { findContradictions } from '../../src/messages/contradictions.ts';
import { grid } from '../../src/messages/field.ts';
import { LNAV } from '../../src/messages/lnav.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { readRecords, sampleRecord } from './records.ts';

const sample = await sampleRecord();

function changed(elements: Partial<NavigationRecord['elements']>, line: number): NavigationRecord {
  return { ...sample, elements: { ...sample.elements, ...elements }, line };
}

describe('findContradictions', () => {
  it('finds the corrupted twin of G07 in BRD400DLR of 2022-01-01, and nothing else', async () => {
    const records = await readRecords('test/vectors/BRD400DLR_S_20220010000_01D_GN-LNAV-CNAV.trim.rnx');
    const [found, ...others] = findContradictions(records);
    expect(others).toEqual([]);
    expect(found?.fields).toEqual(['sqrtA']);
    expect(found?.variants.map(({ satellite, iode, line }) => ({ satellite, iode, line }))).toEqual([
      { satellite: 'G07', iode: 60, line: 815 },
      { satellite: 'G07', iode: 60, line: 824 },
    ]);
  });

  it('finds nothing in files without such records', async () => {
    expect(findContradictions(await readRecords('test/vectors/glob200a.15n'))).toEqual([]);
    expect(
      findContradictions(await readRecords('test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx')),
    ).toEqual([]);
  });

  it('tells a difference of one step, and no difference in digits cut off', () => {
    const step = grid(LNAV.omega);
    const { omega } = sample.elements;
    expect(findContradictions([sample, changed({ omega: omega + 1e-12 }, 20)])).toEqual([]);
    expect(findContradictions([sample, changed({ omega: omega + step }, 20)])[0]?.fields).toEqual(['omega']);
  });

  it('names each variant once', () => {
    const records = [
      sample,
      changed({ e: 0.02 }, 20),
      sample,
      changed({ e: 0.02 }, 30),
      changed({ Crs: 5 }, 40),
    ];
    const [found] = findContradictions(records);
    expect(found?.variants.map((variant) => variant.line)).toEqual([sample.line, 20, 40]);
    expect(found?.fields).toEqual(['e', 'Crs']);
  });

  it('lets data sets of other satellites, toes and issues differ', () => {
    const other = changed({ e: 0.02 }, 20);
    const others = [
      { ...other, satellite: 'G02' },
      { ...other, iode: 40 },
      { ...other, iodc: 295 },
      { ...other, toe: { week: 2190, seconds: 518416 } },
      { ...other, toe: { week: 2189, seconds: 518400 } },
    ];
    expect(findContradictions([sample, ...others])).toEqual([]);
  });
});
