import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { inspect } from '../../codegen/command/inspect.ts';

const kernel = `export function position(t, state, out) {
  out[0] = t * state[0];
  return 0;
}
`;

let folder = '';
let clean = '';
let faulty = '';
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'inspect-'));
  clean = join(folder, 'clean.js');
  faulty = join(folder, 'faulty.js');
  writeFileSync(clean, kernel);
  writeFileSync(faulty, kernel.replace('t * ', '[t][0] % '));
});
afterAll(() => rmSync(folder, { recursive: true }));
afterEach(() => vi.restoreAllMocks());

async function run(...args: string[]): Promise<{ code: number; out: string }> {
  let out = '';
  vi.spyOn(process.stdout, 'write').mockImplementation((text) => {
    out += text;
    return true;
  });
  const code = await inspect.run(args);
  return { code, out };
}

describe('bound-orbit inspect', () => {
  it('prints counts and leaves with 0 where there is no finding', async () => {
    const { code, out } = await run(clean);
    expect(code).toBe(0);
    expect(out.split('\n').map((line) => line.split(/ {2,}/))).toEqual([
      [`${clean}: 0 findings`],
      [
        'function',
        'line',
        ...'add sub mul div neg sqrt abs floor compare select round load store total'.split(' '),
      ],
      ['position', '1', ...'0 0 1 0 0 0 0 0 0 0 0 1 1 1'.split(' ')],
      [''],
    ]);
  });

  it('prints findings with their place and leaves with 1', async () => {
    const { code, out } = await run(clean, faulty);
    expect(code).toBe(1);
    expect(out).toContain(`${faulty}:2:12: inspect.array-literal: `);
    expect(out).toContain(`${faulty}:2:19: inspect.outside-operator: `);
    expect(out).toContain('at least 0');
  });

  it('prints JSON', async () => {
    const { code, out } = await run(clean, faulty, '--json');
    expect(code).toBe(1);
    expect(JSON.parse(out)).toMatchObject({
      files: [
        {
          file: clean,
          findings: [],
          functions: [{ name: 'position', exported: true, line: 1, complete: true }],
        },
        { file: faulty, findings: [{ code: 'inspect.array-literal' }, { code: 'inspect.outside-operator' }] },
      ],
    });
  });

  it('holds named functions to float32', async () => {
    const { code, out } = await run(clean, '--float32', 'position');
    expect(code).toBe(1);
    expect(out).toContain(`${clean}:2:14: inspect.float32-unrounded: `);
  });

  it.each([
    [[], 'command.usage'],
    [['--float32'], 'command.usage'],
    [['--float32', 'a,,b', 'x.js'], 'command.usage'],
    [['--quick', 'x.js'], 'command.usage'],
  ])('refuses the words %j', async (args, code) => {
    await expect(run(...args)).rejects.toMatchObject({ findings: [{ code }] });
  });

  it('names every file that it cannot inspect, and prints nothing', async () => {
    let out = '';
    vi.spyOn(process.stdout, 'write').mockImplementation((text) => {
      out += text;
      return true;
    });
    await expect(inspect.run([clean, join(folder, 'none.js'), folder])).rejects.toMatchObject({
      findings: [{ code: 'inspect.missing-file' }, { code: 'inspect.unreadable-file' }],
    });
    expect(out).toBe('');
  });

  it('helps with an example first', () => {
    expect(inspect.help).toMatch(/^bound-orbit inspect .*\n\n/);
    expect(inspect.help.endsWith('\n')).toBe(true);
  });
});
