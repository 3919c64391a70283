import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { taskOf } from '../../codegen/choose/task.ts';
import { makeVariant } from '../../codegen/choose/variant.ts';
import { Judge } from '../../codegen/observe/judge.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { observe } from '../../codegen/observe/observe.ts';
import { folders } from '../generated/folders.ts';

describe.each(folders())('generated/$name', ({ path, certificate }) => {
  test('another search, with another seed, stays below the certified error', async () => {
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
    const { kernel } = makeVariant(task, certificate.choices);
    const observed = observe(judge, kernel, task.domain, names, {
      points: 100_000,
      places: 8,
      draws: 60_000,
      pool: 48,
      steps: 100_000,
      seed: 77,
    });
    const found = Object.values(limits).map((limit, index) => observed[index]!.size <= limit);
    expect(found).toEqual(found.map(() => true));
  });
});
