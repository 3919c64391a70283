import { expect, test } from 'vitest';
import { certify } from '../../codegen/bound/certify.ts';
import { taskOf } from '../../codegen/choose/task.ts';
import { judgeOf, makeVariant } from '../../codegen/choose/variant.ts';
import type { Choices } from '../../codegen/kernel/choices.ts';
import { FULL_EFFORT, observe } from '../../codegen/observe/observe.ts';

/** Kernels over wide ranges of the eccentricity: the caps reach float64, and the bound stays near what is observed. */
const CASES = [
  { model: 'gps-lnav', domain: 'flown', e: 0.3, cap: 3, ratio: 1.7 },
  { model: 'earth-orbit', domain: 'near-circular', e: 0.1, cap: 3, ratio: 3 },
  { model: 'earth-orbit', domain: 'eccentric', e: 0.7, cap: 4, ratio: 3 },
  { model: 'earth-orbit', domain: 'highly-eccentric', e: 0.9, cap: 5, ratio: 3 },
];

test.each(CASES)('$model, e up to $e, float64: certified/observed <= $ratio', async (item) => {
  const named = taskOf({ model: item.model, domain: item.domain, error: { position_m: 1 } }, 'budget');
  const task = { ...named, domain: { ...named.domain, e: { ...named.domain['e']!, max: item.e } } };
  const choices: Choices = {
    setup: 'f64',
    tick: 'f64',
    starter: 'secant',
    corrector: 'newton',
    cap: item.cap,
  };
  const variant = makeVariant(task, choices);
  const [proof] = certify(variant.lowered);
  const names = task.formula.inputs.map((input) => input.name);
  const judge = await judgeOf(task, variant);
  const [seen] = observe(judge, variant.kernel, task.domain, names, FULL_EFFORT);
  expect(seen!.size).toBeLessThanOrEqual(proof!.bound);
  expect(proof!.bound).toBeLessThanOrEqual(item.ratio * seen!.size);
  process.stdout.write(
    `${item.model} e <= ${item.e}: certified ${proof!.bound.toExponential(2)} m, observed ${seen!.size.toExponential(2)} m, limit ${proof!.limit.toExponential(2)} m\n`,
  );
});
