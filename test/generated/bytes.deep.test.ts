import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { variantFiles } from '../../codegen/certificate/files.ts';
import { readBudget } from '../../codegen/choose/budget.ts';
import { choose } from '../../codegen/choose/choose.ts';
import { taskOf } from '../../codegen/choose/task.ts';
import { folders } from './folders.ts';

describe.each(folders())('generated/$name', ({ path }) => {
  test('generating from its budget gives the committed bytes', async () => {
    const budget = readBudget(`${path}/budget.json`);
    const task = taskOf(budget, `${path}/budget.json`);
    const trials = await choose(task, budget, () => {});
    const last = trials.at(-1)!;
    for (const [name, text] of await variantFiles(task, budget, last)) {
      expect(text, `mend with: npm run bound-orbit generate ${path}/budget.json`).toBe(
        readFileSync(`${path}/${name}`, 'utf8'),
      );
    }
  });
});
