import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { recheck } from '../../codegen/certificate/recheck.ts';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import { COUNTED } from '../../codegen/kernel/operations.ts';
import { folders } from './folders.ts';

describe.each(folders())('generated/$name', ({ path, certificate }) => {
  const code = readFileSync(`${path}/kernel.js`, 'utf8');
  const { setup, tick } = certificate.choices;
  const float32 = [...(setup === 'f32' ? ['setup'] : []), ...(tick === 'f32' ? ['position'] : [])];
  const inspection = inspectSource('kernel.js', code, { float32 });

  test('recheck finds nothing', async () => {
    expect((await recheck(path)).findings).toEqual([]);
  });

  test('inspection finds nothing', () => {
    expect(inspection.findings).toEqual([]);
  });

  test.each([
    ['setup', certificate.operations.setup],
    ['position', certificate.operations.tick],
  ] as const)('the inspected counts of %s are those of the kernel', (name, stated) => {
    const { operations } = inspection.functions.find((entry) => entry.name === name)!;
    for (const kind of [...COUNTED, 'total'] as const)
      expect([kind, operations?.[kind]]).toEqual([kind, stated[kind]]);
  });

  test('the text holds no date, host, path or version', () => {
    expect(code).not.toMatch(/20\d\d-\d\d|https?:|\/home|bound-orbit \d/);
  });
});
