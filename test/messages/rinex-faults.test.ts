import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Finding, InputError } from '../../src/finding.ts';
import { readRinexNavigation } from '../../src/messages/rinex/read.ts';
import { type Changes, header2, header3, header4, record2, record3 } from './rinex-text.ts';
import { temporaryFile } from './temporary-file.ts';

/** The finding that reading ends with, and the number of records before it. */
async function faultOf(path: string): Promise<{ finding: Finding | undefined; records: number }> {
  let records = 0;
  try {
    for await (const _ of readRinexNavigation(path)) records++;
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { finding: error.findings[0], records };
  }
  return { finding: undefined, records };
}

async function fault(...lines: readonly string[]): Promise<Finding | undefined> {
  return (await faultOf(temporaryFile(`${lines.join('\n')}\n`))).finding;
}

const fault3 = (changes: Changes) => fault(...header3, ...record3(changes));

describe('files that are not what they should be', () => {
  it.each([
    ['empty', '', 'file.empty', undefined],
    ['no RINEX', 'a shopping list\n', 'rinex.not-navigation', 1],
    [
      'an observation file',
      header3[0]!.replace('NAVIGATION DATA ', 'OBSERVATION DATA'),
      'rinex.not-navigation',
      1,
    ],
    ['an unknown version', header3[0]!.replace('3.05', '9.99'), 'rinex.version', 1],
    ['no version', header3[0]!.replace('3.05', '    '), 'rinex.version', 1],
    ['a header without an end', `${header3[0]}\n`, 'rinex.header', 1],
    ['a header that runs into the records', [header3[0], ...record3()].join('\n'), 'rinex.header', 2],
    ['a compressed file', '\x1f\x8b\x08\x00\x00', 'file.binary', 1],
    ['binary content in a line', [...header3, 'G01 \x00'].join('\n'), 'file.binary', 3],
    ['a line without an end', `${header3.join('\n')}\n${'G'.repeat(10000)}`, 'file.long-line', 3],
  ])('%s', async (_, content, code, line) => {
    const { finding, records } = await faultOf(temporaryFile(content));
    expect(finding).toMatchObject({ code });
    expect(finding?.place.line).toBe(line);
    expect(records).toBe(0);
  });

  it('no file at all', async () => {
    expect((await faultOf('/no/such/file')).finding).toMatchObject({ code: 'file.unreadable' });
    expect((await faultOf('/')).finding).toMatchObject({ code: 'file.unreadable' });
  });
});

describe('records that are not whole', () => {
  it('finds a file that was cut after any line', async () => {
    const file = readFileSync(
      'test/vectors/BRD400DLR_S_20220010000_01D_GN-LNAV-CNAV.trim.rnx',
      'latin1',
    ).split('\n');
    const lines = file.slice(0, 150); // 13 LNAV records, then CNAV
    for (let kept = 1; kept < lines.length; kept++) {
      const { finding, records } = await faultOf(temporaryFile(`${lines.slice(0, kept).join('\n')}\n`));
      const inFrame = (kept - 9) % 9; // lines after the header that belong to the last frame
      if (kept < 9) expect(finding, `${kept}`).toMatchObject({ code: 'rinex.header', place: { line: kept } });
      else if (kept > 126 || inFrame === 0) expect(finding, `${kept}`).toBeUndefined();
      else expect(finding, `${kept}`).toMatchObject({ code: 'rinex.short-record', place: { line: kept } });
      expect(records).toBe(Math.min(13, Math.max(0, Math.floor((kept - 9) / 9))));
    }
  });

  it.each([
    ['2', [...header2, ...record2()]],
    ['3', [...header3, ...record3()]],
  ])('finds a cut of generation %s at any line', async (_, lines) => {
    for (let kept = 3; kept < 10; kept++) {
      expect(await fault(...lines.slice(0, kept))).toMatchObject({
        code: 'rinex.short-record',
        place: { line: kept },
      });
    }
    expect(await fault(...lines)).toBeUndefined();
  });

  it('finds a cut within a number, which would read as another number', async () => {
    const text = [...header3, ...record3()].join('\n');
    for (const cut of [1, 5, 17]) {
      const { finding } = await faultOf(temporaryFile(text.slice(0, -cut)));
      expect(finding).toMatchObject({ code: 'rinex.number', place: { line: 10, column: 24 } });
    }
  });

  it('finds a missing line in the middle', async () => {
    const lines = [...header3, ...record3().toSpliced(4, 1), ...record3()];
    expect(await fault(...lines)).toMatchObject({ code: 'rinex.short-record', place: { line: 10 } });
  });

  it('finds a line too many', async () => {
    const extra = record3()[1]!;
    expect(await fault(...header3, ...record3(), extra)).toMatchObject({
      code: 'rinex.structure',
      place: { line: 11 },
    });
    const frame = [...header4, '> EPH G01 LNAV', ...record3(), extra];
    expect(await fault(...frame)).toMatchObject({ code: 'rinex.structure', place: { line: 12 } });
  });

  it('finds lines of no known system and frames without a name', async () => {
    expect(await fault(...header3, 'X01 2022')).toMatchObject({
      code: 'rinex.structure',
      place: { line: 3 },
    });
    expect(await fault(...header4, '> what')).toMatchObject({ code: 'rinex.structure', place: { line: 3 } });
    expect(await fault(...header4, ...record3())).toMatchObject({
      code: 'rinex.structure',
      place: { line: 3 },
    });
  });

  it('finds a blank line where numbers must stand', async () => {
    const lines = [...header3, ...record3().with(3, '')];
    expect(await fault(...lines)).toMatchObject({ code: 'rinex.blank', place: { line: 6 } });
  });

  it('finds a tab', async () => {
    const lines = record3().with(2, record3()[2]!.replace('    ', '\t'));
    expect(await fault(...header3, ...lines)).toMatchObject({
      code: 'rinex.short-record',
      place: { line: 5 },
    });
    const later = record3().with(2, record3()[2]!.replace(/ $|(?<=e-06) /, '\t'));
    expect(await fault(...header3, ...later)).toMatchObject({
      code: 'rinex.tab',
      place: { line: 5, column: 24 },
    });
  });
});

describe('numbers that cannot be', () => {
  it.each([
    ['text', { '1:1': 'hello' }, 'rinex.number', 4, 24],
    ['NaN', { '1:1': 'NaN' }, 'rinex.number', 4, 24],
    ['Inf', { '2:3': '-Inf' }, 'rinex.number', 5, 62],
    ['Infinity', { '2:3': 'Infinity' }, 'rinex.number', 5, 62],
    ['too large a number', { '2:3': '1e999' }, 'rinex.number', 5, 62],
    ['hexadecimal', { '1:1': '0x10' }, 'rinex.number', 4, 24],
    ['two numbers', { '1:1': '1.0 2.0' }, 'rinex.number', 4, 24],
    ['stars', { '0:1': '*'.repeat(19) }, 'rinex.number', 3, 24],
    ['a blank element', { '4:2': '' }, 'rinex.blank', 7, 43],
    ['a blank health', { '6:1': '' }, 'rinex.blank', 9, 24],
    ['e = 1', { '2:1': 1 }, 'rinex.range', 5, 24],
    ['e above 1', { '2:1': 1.5 }, 'rinex.range', 5, 24],
    ['e below 0', { '2:1': -0.01 }, 'rinex.range', 5, 24],
    ['sqrtA = 0', { '2:3': 0 }, 'rinex.range', 5, 62],
    ['sqrtA below 0', { '2:3': -5153.7 }, 'rinex.range', 5, 62],
    ['toe after the week', { '3:0': 604800 }, 'rinex.range', 6, 5],
    ['toe before the week', { '3:0': -16 }, 'rinex.range', 6, 5],
    ['half an IODE', { '1:0': 39.5 }, 'rinex.range', 4, 5],
    ['a negative health', { '6:1': -1 }, 'rinex.range', 9, 24],
    ['a week of another year', { '5:2': 2138 }, 'rinex.week', 8, 43],
  ])('%s', async (_, cells, code, line, column) => {
    expect(await fault3({ cells })).toMatchObject({ code, place: { line, column } });
  });

  it.each([
    'G01 2022 02 30 00 00 00',
    'G01 2022 13 01 00 00 00',
    'G01 2022 01 01 24 00 00',
    'G01 2022 01 01 00 60 00',
    'G01 2022 01 01 00 00 60',
    'G01 22 01 01 00 00 00  ',
    'G01 2022-01-01 00:00:00',
  ])('the epoch %s', async (start) => {
    expect(await fault3({ start })).toMatchObject({ code: 'rinex.epoch', place: { line: 3, column: 1 } });
  });

  it('the epoch of generation 2', async () => {
    const start = ' 1 22  2 30  0  0  0.0';
    expect(await fault(...header2, ...record2({ start }))).toMatchObject({
      code: 'rinex.epoch',
      place: { line: 3 },
    });
  });

  it('names field, file and line in its message', async () => {
    const path = temporaryFile([...header3, ...record3({ cells: { '2:3': 'x' } })].join('\n'), 'station.rnx');
    const { finding } = await faultOf(path);
    expect(finding?.what).toContain('sqrtA');
    expect(finding?.place.file).toBe(path);
    expect(finding?.why).toContain('line 3');
  });

  it('reports after the good records before it', async () => {
    const lines = [...header3, ...record3(), ...record3({ cells: { '2:3': 'x' } })];
    expect(await faultOf(temporaryFile(lines.join('\n')))).toMatchObject({
      records: 1,
      finding: { place: { line: 13 } },
    });
  });
});

describe('any damage', () => {
  it('ends in a finding with a line or in records of finite numbers', async () => {
    const text = [...header3, ...record3(), ...record3(), ...record3()].join('\n');
    const place = fc.integer({ min: 0, max: text.length - 1 });
    const byte = fc.constantFrom(...' \t\r\n\x00-+.0159eEDG>R');
    const damage = fc.array(fc.tuple(place, byte), { minLength: 1, maxLength: 4 });
    await fc.assert(
      fc.asyncProperty(damage, async (changes) => {
        const bytes = [...text];
        for (const [at, to] of changes) bytes[at] = to;
        const path = temporaryFile(bytes.join(''));
        try {
          for await (const { elements } of readRinexNavigation(path)) {
            expect(Object.values(elements).every(Number.isFinite)).toBe(true);
            expect(elements.e >= 0 && elements.e < 1 && elements.sqrtA > 0).toBe(true);
          }
        } catch (error) {
          if (!(error instanceof InputError)) throw error;
          expect(error.findings[0]?.place.line).toBeGreaterThan(0);
        }
      }),
      { numRuns: 400 },
    );
  });
});
