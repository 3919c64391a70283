import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { toIso } from '../../src/time/calendar.ts';
import { readRecords } from './records.ts';
import { header2, header3, header4, record2, record3 } from './rinex-text.ts';
import { temporaryFile } from './temporary-file.ts';

const GN = 'test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx';
const DLR = 'test/vectors/BRD400DLR_S_20220010000_01D_GN-LNAV-CNAV.trim.rnx';

const readLines = (...lines: readonly string[]) => readRecords(temporaryFile(`${lines.join('\n')}\n`));

describe('real files', () => {
  it('RINEX 3.05: BRDC00IGS of 2022-01-01', async () => {
    const records = await readRecords(GN);
    expect(records).toHaveLength(156);
    expect(new Set(records.map((record) => record.satellite)).size).toBe(12);
    expect(records[0]).toEqual({
      satellite: 'G01',
      message: 'LNAV',
      toc: { week: 2190, seconds: 518400 },
      toe: { week: 2190, seconds: 518400 },
      elements: {
        sqrtA: 5153.674995422,
        e: 0.01121813920327,
        i0: 0.9864187694897,
        Omega0: -1.036611240093,
        omega: 0.8840876015687,
        M0: -0.6242942382352,
        deltaN: 3.988380417768e-9,
        IDOT: -3.778728827795e-10,
        OmegaDot: -8.133553080847e-9,
        Cuc: -7.36303627491e-6,
        Cus: 4.695728421211e-6,
        Crc: 299.75,
        Crs: -141.125,
        Cic: -3.166496753693e-8,
        Cis: 1.955777406693e-7,
        toe: 518400,
        af0: 4.691267386079e-4,
        af1: -1.00044417195e-11,
        af2: 0,
        TGD: 5.122274160385e-9,
        toeMinusToc: 0,
      },
      health: 0,
      iode: 39,
      iodc: 39,
      uraMetres: 2,
      fitIntervalHours: 4,
      transmissionTime: { week: 2190, seconds: 517189 },
      line: 245,
    });
  });

  it('RINEX 4.00: LNAV frames of BRD400DLR among CNAV frames', async () => {
    const text = readFileSync(DLR, 'latin1').split('\n');
    const records = await readRecords(DLR);
    expect(records).toHaveLength(
      text.filter((line) => line.startsWith('> EPH G') && line.includes('LNAV')).length,
    );
    for (const { line, satellite } of records) expect(text[line - 2]).toBe(`> EPH ${satellite} LNAV`);
    const twins = records.filter((record) => record.satellite === 'G07' && record.toe.seconds === 568800);
    expect(twins.map((record) => record.elements.sqrtA)).toEqual([5153.701753616, 5154.133394241]);
  });

  it('RINEX 2.11 with D exponents: glob200a of 2015-07-19, up to toe 0 of the next week', async () => {
    const records = await readRecords('test/vectors/glob200a.15n');
    expect(records).toHaveLength(209);
    expect(new Set(records.map((record) => record.satellite)).size).toBe(16);
    expect(records[0]?.elements.af0).toBe(-0.216410961002e-3);
    expect(toIso(records[0]!.toc)).toBe('2015-07-19T02:00:00');
    for (const record of records) expect(toIso(record.toe)).toMatch(/^2015-07-(19|20)/);
  });

  it('RINEX 3.04: the four GPS records of a receiver log, among Galileo ones', async () => {
    const records = await readRecords('test/vectors/receiver-2025-04-25.nav');
    expect(records.map((record) => record.satellite)).toEqual(['G12', 'G11', 'G06', 'G24']);
    expect(records[1]).toMatchObject({
      iode: 215,
      iodc: 727,
      transmissionTime: { week: 2363, seconds: 455886 },
    });
  });
});

describe('forms of one record', () => {
  it('gives the same record from generations 2, 3 and 4', async () => {
    const [expected] = await readLines(...header3, ...record3());
    const { line, ...content } = expected!;
    expect(line).toBe(3);
    expect(await readLines(...header2, ...record2())).toEqual([expected]);
    expect(await readLines(...header4, '> EPH G01 LNAV', ...record3())).toEqual([{ ...content, line: 4 }]);
  });

  it('reads E, e, D and d exponents alike', async () => {
    const [expected] = await readLines(...header3, ...record3());
    for (const letter of ['E', 'D', 'd']) {
      const lines = record3().map((line) => line.replaceAll(/(?<=\d)e(?=[-+])/g, letter));
      expect(await readLines(...header3, ...lines)).toEqual([expected]);
    }
  });

  it('reads CR LF, and a last line without an end', async () => {
    const expected = await readLines(...header3, ...record3());
    expect(await readRecords(temporaryFile([...header3, ...record3(), ''].join('\r\n')))).toEqual(expected);
    expect(await readRecords(temporaryFile([...header3, ...record3()].join('\n')))).toEqual(expected);
  });

  it('reads on past blank lines between records', async () => {
    expect(await readLines(...header3, '', ...record3(), '', ' ', ...record3(), '')).toHaveLength(2);
  });

  it('leaves out what is blank or unknown in the optional tail', async () => {
    const blank = { '5:1': '', '5:3': '', '6:0': '', '7:0': '', '7:1': '' };
    const [record] = await readLines(...header3, ...record3({ cells: blank }));
    expect(record).not.toHaveProperty('uraMetres');
    expect(record).not.toHaveProperty('fitIntervalHours');
    expect(record).not.toHaveProperty('transmissionTime');
    const unknown = { '7:0': 0.9999e9, '7:1': 0 };
    const [other] = await readLines(...header3, ...record3({ cells: unknown }));
    expect(other).not.toHaveProperty('fitIntervalHours');
    expect(other).not.toHaveProperty('transmissionTime');
  });

  // RINEX 2.11, 6.5: 80 to 99 stand for 1980 to 1999, 00 to 79 for 2000 to 2079
  it.each([
    ['80', 1980],
    ['99', 1999],
    ['00', 2000],
    ['79', 2079],
  ])('takes the two-digit year %s as %i', async (digits, year) => {
    const start = ` 1 ${digits}  7 15  0  0  0.0`;
    const week = Math.floor((Date.UTC(year, 6, 15) - Date.UTC(1980, 0, 6)) / 604800e3);
    const day = new Date(Date.UTC(year, 6, 15)).getUTCDay();
    const [record] = await readLines(
      ...header2,
      ...record2({ start, cells: { '3:0': day * 86400, '5:2': week } }),
    );
    expect(toIso(record!.toc)).toBe(`${year}-07-15T00:00:00`);
  });
});

describe('weeks', () => {
  const saturday = 'G01 2022 01 01 23 59 44'; // week 2190, 604784 s
  const sunday = 'G01 2022 01 02 00 00 00'; // week 2191, 0 s

  it.each([
    { name: 'toe 0 of the next week', start: saturday, toe: 0, week: 2191, expected: [2191, 16] },
    { name: 'the week of transmission', start: saturday, toe: 0, week: 2190, expected: [2191, 16] },
    { name: 'toe in the week before toc', start: sunday, toe: 604784, week: 2190, expected: [2190, -16] },
    { name: 'the week of toc', start: sunday, toe: 604784, week: 2191, expected: [2190, -16] },
    { name: 'a truncated week', start: sunday, toe: 0, week: 2191 % 1024, expected: [2191, 0] },
  ])('takes $name', async ({ start, toe, week, expected }) => {
    const [record] = await readLines(...header3, ...record3({ start, cells: { '3:0': toe, '5:2': week } }));
    expect([record?.toe.week, record?.elements.toeMinusToc]).toEqual(expected);
    expect(record?.toe.seconds).toBe(toe);
  });

  it.each([
    ['2019 04 06 23 59 44', 0, 2048], // into the second rollover
    ['1999 08 22 00 00 00', 604784, 1023], // out of the first
  ])('crosses a rollover of the ten-bit week at %s', async (epoch, toe, week) => {
    const [record] = await readLines(
      ...header3,
      ...record3({ start: `G01 ${epoch}`, cells: { '3:0': toe, '5:2': week } }),
    );
    expect(record?.toe).toEqual({ week, seconds: toe });
    expect(Math.abs(record!.elements.toeMinusToc)).toBe(16);
  });

  it('finds a transmission time in the week before, however it is counted', async () => {
    for (const sent of [597600, -7200]) {
      const cells = { '3:0': 0, '5:2': 2191, '7:0': sent };
      const [record] = await readLines(...header3, ...record3({ start: sunday, cells }));
      expect(record?.transmissionTime).toEqual({ week: 2190, seconds: 597600 });
    }
  });
});

describe('what is no GPS LNAV', () => {
  const line4 = (first: string) => [
    first,
    ...Array<string>(3).fill(`    ${' 1.000000000000e+00'.repeat(4)}`),
  ];

  it('passes over records of other systems by their first column', async () => {
    const glonass = line4('R01 2022 01 01 00 15 00 1.000000000000e-05 0.000000000000e+00 0.000000000000e+00');
    const sbas = line4('S20 2022 01 01 00 15 00 1.000000000000e-05 0.000000000000e+00 0.000000000000e+00');
    const records = await readLines(...header3, ...glonass, ...record3(), ...sbas, ...record3(), ...glonass);
    expect(records.map((record) => record.line)).toEqual([7, 19]);
  });

  it('passes over other frames of generation 4, whatever stands in them', async () => {
    const frames = [
      '> STO G01 LNAV',
      '    2022 01 01 00 00 00 GPUT',
      '> ION G07 LNAV',
      '    2022 01 01 00 00 00 1.000000000000e-08 1.000000000000e-08 1.000000000000e-08',
      '> EOP J02 CNVX',
      '    2022 01 01 00 00 00 1.000000000000e-08',
      '> EPH R05 FDMA',
      'R05 2022 01 01 00 15 00 1.000000000000e-05 0.000000000000e+00 0.000000000000e+00',
      '> EPH J02 LNAV',
      ...record3({ start: 'J02 2022 01 01 00 00 00' }),
    ];
    const records = await readLines(...header4, ...frames, '> EPH G01 LNAV', ...record3(), ...frames);
    expect(records.map((record) => record.line)).toEqual([header4.length + frames.length + 2]);
  });

  it('gives no records for files of other systems of generation 2', async () => {
    for (const type of ['G: GLONASS NAV DATA', 'H: GEO NAV MSG DATA']) {
      const first =
        header2[0]!.replace('N: GPS NAV DATA', type.padEnd(15)).slice(0, 40).padEnd(60) +
        'RINEX VERSION / TYPE';
      expect(await readLines(first, header2[1]!, ...line4(' 1 22  1  1  0 15  0.0'))).toEqual([]);
    }
  });

  it('gives no records for a header alone', async () => {
    expect(await readLines(...header3)).toEqual([]);
  });
});

describe('numbers', () => {
  it('come back as they were written', async () => {
    const digits = fc.integer({ min: -999999999999, max: 999999999999 });
    const value = fc.tuple(digits, fc.integer({ min: -40, max: 40 })).map(([m, x]) => Number(`${m}e${x}`));
    await fc.assert(
      fc.asyncProperty(value, async (Crs) => {
        const [record] = await readLines(...header3, ...record3({ cells: { '1:1': Crs } }));
        expect(record?.elements.Crs === Crs).toBe(true); // not toBe: no format has -0
      }),
      { numRuns: 30 },
    );
  });
});
