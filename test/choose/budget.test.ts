import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { readBudget } from '../../codegen/choose/budget.ts';
import { taskOf } from '../../codegen/choose/task.ts';

const main = fileURLToPath(new URL('../../codegen/command/main.ts', import.meta.url));
const GOOD = { model: 'gps-lnav', domain: 'flown', error: { position_m: 1 } };
let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'budget-'));
});
afterAll(() => rmSync(folder, { recursive: true }));

function write(content: string): string {
  const file = join(folder, 'budget.json');
  writeFileSync(file, content);
  return file;
}

function take(content: unknown): void {
  const file = write(typeof content === 'string' ? content : JSON.stringify(content));
  taskOf(readBudget(file), file);
}

describe('a budget that cannot be used is refused with its fault', () => {
  test.each([
    ['empty', '', /budget\.empty/],
    ['truncated', '{"model": "gps', /budget\.syntax/],
    ['no record', '[]', /budget\.value/],
    ['an unknown key', { ...GOOD, speed: 1 }, /budget\.value: speed/],
    ['a model that is no text', { ...GOOD, model: 1 }, /budget\.value: model/],
    ['no limit of any error', { ...GOOD, error: {} }, /budget\.value: error: must limit/],
    ['an error of zero', { ...GOOD, error: { position_m: 0 } }, /error\.position_m: must be above zero/],
    ['an error that is no number', { ...GOOD, error: { position_m: null } }, /error\.position_m/],
    ['an unknown error key', { ...GOOD, error: { position_km: 1 } }, /error\.position_km/],
    ['no arithmetic', { ...GOOD, arithmetic: [] }, /arithmetic: must allow/],
    ['an unknown arithmetic', { ...GOOD, arithmetic: ['f16'] }, /arithmetic\.0/],
    ['an unknown model', { ...GOOD, model: 'moon' }, /budget\.unknown-model: there is no model "moon"/],
    ['an unknown domain', { ...GOOD, domain: 'all' }, /budget\.unknown-domain/],
    [
      'an output that the model lacks',
      { model: 'earth-orbit', domain: 'near-circular', error: { clock_s: 1 } },
      /budget\.unknown-output/,
    ],
  ])('%s', (_, content, message) => {
    expect(() => take(content)).toThrow(message);
  });

  test('a file that is not there', () => {
    expect(() => readBudget(join(folder, 'none.json'))).toThrow(/budget\.missing/);
  });
});

describe('the generate command', () => {
  const run = (...args: readonly string[]) =>
    spawnSync(process.execPath, ['--import', 'tsx', main, 'generate', ...args], { encoding: 'utf8' });

  test('an impossible budget leaves with 1, names the limits that bind and writes nothing', () => {
    const file = write(JSON.stringify({ ...GOOD, error: { position_m: 1e-12 }, tick_operations: 300 }));
    const { status, stdout, stderr } = run(file);
    expect(status).toBe(1);
    expect(stdout).toMatch(/position_m 1\.\d+e-7 > 1e-12/);
    expect(stdout).toMatch(/tick_operations \d+ > 300/);
    expect(stderr).toMatch(
      /budget\.no-fit.*\n {4}Nearest is f64, cap \d; it would fit with position_m at 1\.\d+e-7/,
    );
    expect(readdirSync(folder)).toEqual(['budget.json']);
  }, 120_000);

  test('a bad budget leaves with 2 and writes nothing', () => {
    const { status, stderr, stdout } = run(write('{}'));
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr).toMatch(/budget\.value/);
    expect(readdirSync(folder)).toEqual(['budget.json']);
  });

  test('no file and an unknown option are wrong use', () => {
    expect(run().status).toBe(2);
    expect(run('--fast', 'x').stderr).toMatch(/command\.usage/);
  });

  test('help starts with an example', () => {
    const { status, stdout } = run('--help');
    expect(status).toBe(0);
    expect(stdout).toMatch(/^bound-orbit generate /);
  });
});
