import { describe, expect, test } from 'vitest';
import { certify } from '../../codegen/bound/certify.ts';
import { Proof } from '../../codegen/bound/proof.ts';
import { describeVariant } from '../../codegen/choose/variant.ts';
import { importKernel, type KernelModule } from '../../codegen/observe/module.ts';
import { screenOf } from '../../codegen/observe/screen.ts';
import type { Subject } from './lines.ts';
import { type SmallModel, smallSubject } from './small-models.ts';

const ORBIT = 'const E = eccentricAnomaly(t, 0.3);';

/** Float32 kernels of t alone, on ranges that hold 2^24 float32 numbers or more. */
const MODELS: readonly (SmallModel & { readonly tight: boolean })[] = [
  {
    name: 'circle',
    body: '',
    returns: '{ x: Math.cos(t), y: Math.sin(t) }',
    ranges: { t: [0.5, 3.2] },
    tight: true,
  },
  {
    name: 'turns',
    body: '',
    returns: '{ x: Math.cos(t), y: Math.sin(t) }',
    ranges: { t: [4, 50] },
    tight: true,
  },
  {
    name: 'clock',
    body: '',
    returns: '1.5 + t * (0.75 + t * (-0.3 + t * 0.11))',
    ranges: { t: [1, 4] },
    tight: true,
  },
  { name: 'root', body: '', returns: 'Math.sqrt(t) / (t - 0.3)', ranges: { t: [1, 4] }, tight: true },
  { name: 'radius', body: ORBIT, returns: '7 * (1 - 0.3 * Math.cos(E))', ranges: { t: [1, 4] }, tight: true },
  { name: 'offset', body: '', returns: 'eccentricAnomaly(t, 0.2) - t', ranges: { t: [1, 4] }, tight: true },
];

/** A certified error is at most so many times the largest error there is. */
const TIGHT = 1.5;

describe.each(MODELS)('every float32 number of $name', (model) => {
  test('no error is above the certified one, and it is no mere ceiling', async () => {
    const { lowered, task } = smallSubject(model, { setup: 'f32', tick: 'f32' });
    const { group, bound } = certify(lowered, { boxes: 20_000 })[0]!;
    const subject = { name: model.name, task, lowered };
    const module = await importKernel(describeVariant(task, lowered).code);
    const { worst, at, count } = sweep(subject, module);
    expect(count).toBeGreaterThanOrEqual(2 ** 24);
    expect(worst).toBeLessThanOrEqual(bound);
    const here = new Proof(lowered, group).boundAt({ t: at });
    expect(worst).toBeLessThanOrEqual(here);
    expect(here).toBeLessThanOrEqual(TIGHT * worst);
    if (model.tight) expect(bound).toBeLessThanOrEqual(TIGHT * worst);
  });
});

/**
 * Runs a kernel on all float32 numbers of the range of t, and for each of them looks at the float64 numbers that round
 * to it: at it and at both ends. The exact value comes from float64 arithmetic, which is 2^29 times finer.
 */
function sweep(
  { task, lowered }: Subject,
  module: KernelModule,
): { worst: number; at: number; count: number } {
  const { min, max } = task.domain['t']!;
  const [exact, out] = [new Float64Array(3), new Float64Array(3)];
  const size = lowered.kernel.outputs.length;
  const screen = screenOf(task.formula);
  const state = new Float64Array(module.stateWords);
  const point = { t: 0 };
  let [worst, at, count] = [0, 0, 0];
  const compare = (t: number): void => {
    point.t = t;
    screen(point, exact);
    let sum = 0;
    for (let k = 0; k < size; k++) sum += (out[k]! - exact[k]!) ** 2;
    if (!(sum <= worst)) [worst, at] = [sum, t];
  };
  for (let t = Math.fround(min), before = previous(t); t <= Math.fround(max); count++) {
    const after = next(t);
    if (module.position(t, state, out) !== 0) throw new RangeError(`the kernel refuses ${t}`);
    compare(t);
    compare(t + (after - t) * JUST_BELOW_HALF);
    compare(t + (before - t) * JUST_BELOW_HALF);
    [before, t] = [t, after];
  }
  return { worst: Math.sqrt(worst), at, count };
}

/** What is nearer to a float32 number than half the way to the next rounds to it. */
const JUST_BELOW_HALF = 0.5 - 2 ** -20;

const number = new Float32Array(1);
const bits = new Uint32Array(number.buffer);

/** The float32 number after one that is above zero. */
function next(x: number): number {
  number[0] = x;
  bits[0] = bits[0]! + 1;
  return number[0];
}

function previous(x: number): number {
  number[0] = x;
  bits[0] = bits[0]! - 1;
  return number[0];
}
