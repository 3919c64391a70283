import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { taskOf } from '../../codegen/choose/task.ts';
import { Judge } from '../../codegen/observe/judge.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { observe } from '../../codegen/observe/observe.ts';
import { folders } from '../generated/folders.ts';

describe.each(folders())('generated/$name', ({ path, certificate }) => {
  test('a million points and other climbs stay below the certified error', async () => {
    const limits = Object.fromEntries(
      Object.entries(certificate.error).map(([key, entry]) => [key, entry.certified]),
    );
    const task = taskOf(
      { model: certificate.model, domain: certificate.domain.name, error: limits },
      'budget',
    );
    const judge = new Judge(
      task.formula,
      await importKernel(readFileSync(`${path}/kernel.js`, 'utf8')),
      task.model.frameRate,
    );
    const names = task.formula.inputs.map((input) => input.name);
    const observed = observe(judge, task.domain, names, {
      points: 1_000_000,
      starts: 24,
      steps: 3000,
      seed: 77,
    });
    const found = Object.values(limits).map((limit, index) => observed[index]!.size <= limit);
    expect(found).toEqual(found.map(() => true));
  });
});
