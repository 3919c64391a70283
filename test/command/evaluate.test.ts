import { execFile } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { evaluate as command } from '../../codegen/command/evaluate.ts';
import { InputError } from '../../src/finding.ts';
import { header3, record3 } from '../messages/rinex-text.ts';
import { temporaryFile } from '../messages/temporary-file.ts';

const GN = 'test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx';
const DLR = 'test/vectors/BRD400DLR_S_20220010000_01D_GN-LNAV-CNAV.trim.rnx';
const COD = 'test/vectors/COD0MGXFIN_20220010000_01D_ORB-GPS.trim15M.SP3';

interface Outcome {
  readonly code: number;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs `bound-orbit evaluate` as a user does. */
function evaluate(...args: readonly string[]): Promise<Outcome> {
  const words = ['--import', 'tsx', 'codegen/command/main.ts', 'evaluate', ...args];
  return new Promise((resolve) => {
    execFile(process.execPath, words, { maxBuffer: 1e8 }, (error, stdout, stderr) => {
      resolve({ code: typeof error?.code === 'number' ? error.code : 0, stdout, stderr });
    });
  });
}

const fileOf = (...lines: readonly string[]) => temporaryFile(`${lines.join('\n')}\n`, 'station.rnx');
const unhealthy = record3({ start: 'G02 2022 01 01 00 00 00', cells: { '6:1': 63 } });

describe('evaluate', () => {
  it('prints each healthy record at its own toe and names unhealthy satellites on stderr', async () => {
    const { code, stdout, stderr } = await evaluate(fileOf(...header3, ...record3(), ...unhealthy));
    expect(code).toBe(0);
    const lines = stdout.trimEnd().split('\n');
    expect(lines).toHaveLength(2);
    expect(lines[0]).toMatch(/^GPS time +sat +IODE +line +tk s +x m +y m +z m +clock s$/);
    // First epoch of G01 in the CODE orbit: 13882271.938 -21710006.216 5357125.462 m, 469.127768 microseconds
    expect(lines[1]).toMatch(
      /^2022-01-01T00:00:00 +G01 +39 +3 +0\.000 +1388227\d\.\d{4} +-2171000\d\.\d{4} +535712\d\.\d{4} +0\.000469\d+$/,
    );
    expect(stderr).toBe('G02 is unhealthy in 1 of 1 records, not used (health 63 at line 11)\n');
  });

  it('uses the nearest record at given times, and tells where there is none', async () => {
    const { code, stdout, stderr } = await evaluate(
      GN,
      '--at',
      '2022-01-01T03:30:00.5',
      '--at',
      '2022-01-02T02:00',
      '--json',
    );
    expect(code).toBe(0);
    const { positions } = JSON.parse(stdout);
    expect(positions).toHaveLength(12);
    for (const { tk_s } of positions) expect([-1799.5, -1783.5, -1767.5]).toContain(tk_s); // toes off by 16 s
    expect(positions[0]).toMatchObject({
      time: '2022-01-01T03:30:00.5',
      satellite: 'G01',
      iode: 71,
      tk_s: -1799.5,
    });
    const gaps = stderr.match(/has no healthy record within its fit interval at 1 of the times/g);
    expect(gaps).toHaveLength(12);
  });

  it('steps from the first toe to the last', async () => {
    const { code, stdout } = await evaluate(GN, '--every', '3600', '--satellite', 'G01', '--json');
    expect(code).toBe(0);
    const times = JSON.parse(stdout).positions.map((row: { time: string }) => row.time);
    expect(times).toHaveLength(23);
    expect([times[0], times[1], times[22]]).toEqual([
      '2022-01-01T00:00:00',
      '2022-01-01T01:00:00',
      '2022-01-01T22:00:00',
    ]);
  });

  it('reports records that contradict each other', async () => {
    const { code, stderr } = await evaluate(DLR, '--satellite', 'G07');
    expect(code).toBe(1);
    expect(stderr).toContain(`${DLR}:815: evaluate.contradiction: G07 toe 2022-01-01T14:00:00 IODE 60`);
    expect(stderr).toContain('line 824: sqrtA');
  });
});

describe('evaluate --against', () => {
  it('gives one group in JSON with its figures', async () => {
    const { code, stdout, stderr } = await evaluate(GN, '--against', COD, '--json');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const { groups } = JSON.parse(stdout);
    expect(groups).toHaveLength(1);
    expect(groups[0]).toMatchObject({
      system: 'GPS',
      message: 'LNAV',
      satellites: 12,
      points: 1124,
      suspects: [],
      contradictions: [],
    });
    expect(groups[0].rms_m).toBeCloseTo(1.72, 2);
    expect(groups[0].max_m).toBeCloseTo(3.41, 2);
    const { radial_rms_m, along_rms_m, cross_rms_m } = groups[0];
    expect(Math.hypot(radial_rms_m, along_rms_m, cross_rms_m)).toBeCloseTo(groups[0].rms_m, 9);
    expect(groups[0].worst.error_m).toBe(groups[0].max_m);
    expect(groups[0].rms_without_suspects_m).toBe(groups[0].rms_m);
  });

  it('shows a corrupted record in the figures, names it and leaves with 1', async () => {
    const { code, stdout, stderr } = await evaluate(DLR, '--against', COD, '--json');
    expect(code).toBe(1);
    const [group] = JSON.parse(stdout).groups;
    expect(group.max_m).toBeGreaterThan(5000);
    expect(group.rms_without_suspects_m).toBeCloseTo(1.72, 2);
    expect(group.suspects).toHaveLength(1);
    expect(group.suspects[0]).toMatchObject({
      satellite: 'G07',
      toe: '2022-01-01T14:00:00',
      iode: 60,
      line: 824,
    });
    expect(group.contradictions[0]).toMatchObject({ satellite: 'G07', lines: [815, 824], fields: ['sqrtA'] });
    expect(stderr).toContain(
      `${DLR}:824: evaluate.suspect: G07 toe 2022-01-01T14:00:00 IODE 60 is off by up to 56`,
    );
    expect(stderr).toContain(`${DLR}:815: evaluate.contradiction`);
  });

  it('says in its table that all points count', async () => {
    const { code, stdout } = await evaluate(DLR, '--against', COD);
    expect(code).toBe(1);
    expect(stdout).toMatch(/^ +GPS +LNAV +12 +1124 +408\.\d+ +56\d\d\.\d+ /m);
    expect(stdout).toContain('all points as computed');
    expect(stdout).toMatch(/Suspect records: 1, .*Without them: RMS 1\.72\d m, max 3\.4\d\d m\./);
  });
});

describe('wrong use and wrong input leave with 2 and say where', () => {
  it.each([
    { args: [], message: 'command line: command.usage: no navigation file is named' },
    { args: [GN, GN], message: 'one file too many' },
    { args: [GN, '--at', 'noon'], message: '"noon" is no GPS time' },
    { args: [GN, '--every', '0'], message: '--every takes seconds above 0' },
    { args: [GN, '--satellite', '7'], message: '"7" is no satellite' },
    {
      args: [GN, '--against', COD, '--every', '60'],
      message: '--against takes its epochs from the precise orbit',
    },
    {
      args: [GN, '--satellite', 'G99'],
      message: `${GN}: evaluate.no-records: the file holds no GPS LNAV record of G99`,
    },
    { args: [GN, '--at', '2030-01-01'], message: `${GN}: evaluate.nothing-to-show` },
    {
      args: [GN, '--against', 'test/vectors/nga_2015_200.trim15M.sp3'],
      message: 'evaluate.nothing-in-common',
    },
    { args: [COD], message: `${COD}:1: rinex.not-navigation` },
    { args: [GN, '--against', GN], message: `${GN}:1: sp3.header` },
  ])('$message', async ({ args, message }) => {
    await expect(command.run(args)).rejects.toThrow(InputError);
    await expect(command.run(args)).rejects.toThrow(message);
  });

  it('no file named', async () => {
    const { code, stdout, stderr } = await evaluate();
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toContain('command line: command.usage: no navigation file is named');
  });

  it('a damaged file, with the line', async () => {
    const path = fileOf(...header3, ...record3(), ...record3().slice(0, 5));
    const { code, stdout, stderr } = await evaluate(path, '--json');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toContain(
      `${path}:15: rinex.short-record: the file ends after 5 of the 8 lines of a record`,
    );
  });
});

describe('help', () => {
  it('starts with an example and names every option', async () => {
    const { code, stdout } = await evaluate('--help');
    expect(code).toBe(0);
    expect(stdout).toMatch(/^bound-orbit evaluate station\.rnx --at /);
    for (const option of ['--at', '--every', '--satellite', '--against', '--json'])
      expect(stdout).toContain(`  ${option}`);
  });
});
