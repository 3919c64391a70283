import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { variantFiles } from '../../codegen/certificate/files.ts';
import { recheck } from '../../codegen/certificate/recheck.ts';
import { readBudget } from '../../codegen/choose/budget.ts';
import { choose } from '../../codegen/choose/choose.ts';
import { taskOf } from '../../codegen/choose/task.ts';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import { COUNTED } from '../../codegen/kernel/operations.ts';
import { folders } from './folders.ts';

describe.each(folders())('generated/$name', ({ path, certificate }) => {
  const code = readFileSync(`${path}/kernel.js`, 'utf8');
  const { setup, tick } = certificate.choices;
  const float32 = [...(setup === 'f32' ? ['setup'] : []), ...(tick === 'f32' ? ['position'] : [])];
  const inspection = inspectSource('kernel.js', code, { float32 });

  test('generating from its budget gives the committed bytes', async () => {
    const budget = readBudget(`${path}/budget.json`);
    const task = taskOf(budget, `${path}/budget.json`);
    const trials = await choose(task, budget, () => {});
    const last = trials.at(-1)!;
    for (const [name, text] of await variantFiles(task, budget, last.variant, last.observed)) {
      expect(text, `mend with: npm run bound-orbit generate ${path}/budget.json`).toBe(
        readFileSync(`${path}/${name}`, 'utf8'),
      );
    }
  });

  test('recheck finds nothing', async () => {
    expect(await recheck(path)).toEqual([]);
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
