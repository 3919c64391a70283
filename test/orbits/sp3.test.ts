import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type Finding, InputError } from '../../src/finding.ts';
import { readSp3, type Sp3Epoch } from '../../src/orbits/sp3.ts';
import { temporaryFile } from '../messages/temporary-file.ts';

const COD = 'test/vectors/COD0MGXFIN_20220010000_01D_ORB-GPS.trim15M.SP3';
const NGA = 'test/vectors/nga_2015_200.trim15M.sp3';

async function read(path: string): Promise<Sp3Epoch[]> {
  const epochs: Sp3Epoch[] = [];
  for await (const epoch of readSp3(path)) epochs.push(epoch);
  return epochs;
}

async function fault(...lines: readonly string[]): Promise<Finding | undefined> {
  try {
    await read(temporaryFile(lines.join('\n')));
  } catch (error) {
    if (error instanceof InputError) return error.findings[0];
    throw error;
  }
  return undefined;
}

const HEADER = [
  '#cP2022  1  1  0  0  0.00000000       1 ORBIT IGS14 FIT TEST',
  '%c G  cc GPS ccc cccc cccc cccc cccc ccccc',
];
const EPOCH = '*  2022  1  1  0  0  0.00000000';
const G01 = 'PG01  13882.271938 -21710.006216   5357.125462    469.127768';
const V01 = 'VG01 -16658.679468  -1539.361524 -25226.490071      0.005752';
const whole = (...lines: readonly string[]) => [...HEADER, EPOCH, ...lines, 'EOF'];
const readText = async (...lines: readonly string[]) => read(temporaryFile(lines.join('\n')));

describe('real files', () => {
  it('SP3-d: CODE final orbits', async () => {
    const epochs = await read(COD);
    expect(epochs).toHaveLength(97);
    expect(epochs.every((epoch) => epoch.states.length === 12)).toBe(true);
    expect(epochs[0]).toMatchObject({ time: { week: 2190, seconds: 518400 }, line: 29 });
    expect(epochs[96]?.time).toEqual({ week: 2191, seconds: 0 });
    const state = epochs[0]?.states[0];
    expect(state?.satellite).toBe('G01');
    expect(state?.position.x).toBeCloseTo(13882271.938, 6);
    expect(state?.position.y).toBeCloseTo(-21710006.216, 6);
    expect(state?.position.z).toBeCloseTo(5357125.462, 6);
    expect(state?.clock).toBeCloseTo(469.127768e-6, 15);
    expect(state).not.toHaveProperty('velocity');
  });

  it('SP3-a with velocities in dm/s: NGA precise orbits', async () => {
    const epochs = await read(NGA);
    expect(epochs).toHaveLength(96);
    const state = epochs[0]?.states[0];
    expect(state?.satellite).toBe('G01');
    expect(state?.velocity?.x).toBeCloseTo(-1665.8679468, 9);
    expect(
      epochs.every(({ states }) => states.length === 16 && states.every((one) => one.velocity !== undefined)),
    ).toBe(true);
  });

  it('agree with themselves: the velocities are the slopes of the positions', async () => {
    const epochs = await read(NGA);
    const speeds = epochs.flatMap(({ states }) =>
      states.map(({ velocity }) => Math.hypot(velocity!.x, velocity!.y, velocity!.z)),
    );
    const [first, second, third] = epochs.slice(0, 3).map(({ states }) => states[0]!);
    const slope = (third!.position.z - first!.position.z) / 1800;
    expect(Math.abs(slope - second!.velocity!.z)).toBeLessThan(20); // curvature over half an hour
    expect(Math.min(...speeds)).toBeGreaterThan(2000);
    expect(Math.max(...speeds)).toBeLessThan(4000);
  });
});

describe('values marked as bad or absent', () => {
  it('leaves out a satellite without a position', async () => {
    const none = 'PG02      0.000000      0.000000      0.000000 999999.999999';
    const [epoch] = await readText(...whole(none, G01));
    expect(epoch?.states.map((state) => state.satellite)).toEqual(['G01']);
  });

  it('keeps a satellite that crosses a coordinate plane', async () => {
    const [epoch] = await readText(...whole('PG02  13882.271938 -21710.006216      0.000000    469.127768'));
    expect(epoch?.states).toHaveLength(1);
  });

  it.each(['999999.999999', ' 999999.00000', ''])('leaves out the clock %s', async (clock) => {
    const [epoch] = await readText(...whole(G01.slice(0, 46) + clock.padStart(clock === '' ? 0 : 14)));
    expect(epoch?.states).toHaveLength(1);
    expect(epoch?.states[0]).not.toHaveProperty('clock');
  });

  it('leaves out a velocity of zeros, and one of a satellite left out', async () => {
    const still = 'VG01      0.000000      0.000000      0.000000 999999.999999';
    const [epoch] = await readText(...whole(G01, still));
    expect(epoch?.states[0]).not.toHaveProperty('velocity');
    const none = 'PG01      0.000000      0.000000      0.000000 999999.999999';
    const [other] = await readText(...whole(`PG03${G01.slice(4)}`, none, V01));
    expect(other?.states).toHaveLength(1);
    expect(other?.states[0]).not.toHaveProperty('velocity');
  });

  it('passes over correlation lines and comments', async () => {
    const [epoch] = await readText(
      ...whole(G01, 'EP  55  55  55     222  1234567 -1234567', V01, 'EV  22  22  22     111', '/* note'),
    );
    expect(epoch?.states[0]?.velocity?.x).toBeCloseTo(-1665.8679468, 9);
  });
});

describe('faults', () => {
  it.each([
    ['no SP3 file', ['hello'], 'sp3.header', 1],
    ['an unknown version', [HEADER[0]!.replace('#c', '#z'), ...whole(G01).slice(1)], 'sp3.version', 1],
    [
      'another time system',
      [HEADER[0]!, HEADER[1]!.replace('GPS', 'UTC'), EPOCH, G01, 'EOF'],
      'sp3.time-system',
      2,
    ],
    ['no time system', [HEADER[0]!, EPOCH, G01, 'EOF'], 'sp3.header', 2],
    ['no end', whole(G01).slice(0, -1), 'sp3.cut', 4],
    ['an impossible date', whole(G01).with(2, '*  2022  2 30  0  0  0.00000000'), 'sp3.epoch', 3],
    ['a damaged epoch', whole(G01).with(2, '*  2022  1'), 'sp3.epoch', 3],
    ['a position before any epoch', [...HEADER, G01, 'EOF'], 'sp3.structure', 3],
    ['a velocity of another satellite', whole(G01, V01.replace('G01', 'G02')), 'sp3.structure', 5],
    ['a line of another format', whole('Q'), 'sp3.structure', 4],
    ['a satellite without a number', whole(G01.replace('G01', 'Gxx')), 'sp3.satellite', 4],
    ['a position without a number', whole(G01.replace('13882.271938', '     NaN     ')), 'sp3.number', 4],
    ['a line cut within a number', [...whole(G01).slice(0, 3), G01.slice(0, 40)], 'sp3.number', 4],
  ])('%s', async (_, lines, code, line) => {
    expect(await fault(...lines)).toMatchObject({ code, place: { line } });
  });

  it('finds a cut after any line', async () => {
    const lines = readFileSync(COD, 'latin1').split('\n').slice(0, 60);
    for (let kept = 1; kept < lines.length; kept++) {
      expect(await fault(...lines.slice(0, kept)), `${kept}`).toMatchObject({
        code: 'sp3.cut',
        place: { line: kept },
      });
    }
  });
});
