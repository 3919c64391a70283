import { describe, expect, test } from 'vitest';
import { Proof } from '../../codegen/bound/proof.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { Points } from '../../codegen/observe/points.ts';
import { Adversary } from './battery/adversary.ts';
import { subject } from './lines.ts';

const FLOAT32 = { setup: 'f32', tick: 'f32' } as const;

/** Float32 kernels with all starters and correctors. */
const SUBJECTS = [
  subject('gps-lnav', 'flown', { tick: 'f32', cap: 1 }),
  subject('gps-lnav', 'flown', { ...FLOAT32, cap: 1, corrector: 'halley' }),
  subject('gps-lnav', 'flown', { ...FLOAT32, cap: 1, corrector: 'quartic', starter: 'firstOrder' }),
  subject('earth-orbit', 'near-circular', FLOAT32),
  subject('earth-orbit', 'near-circular', { tick: 'f32' }),
  subject('earth-orbit', 'near-circular', { ...FLOAT32, cap: 1, corrector: 'halley' }),
  subject('earth-orbit', 'near-circular', {
    tick: 'f32',
    cap: 1,
    corrector: 'quartic',
    starter: 'thirdOrder',
  }),
  subject('earth-orbit', 'near-circular', { tick: 'f32', starter: 'secant' }),
  subject('earth-orbit', 'near-circular', { ...FLOAT32, cap: 3, starter: 'danby' }),
];

describe.each(SUBJECTS)('$name, $lowered.kernel.choices.starter $lowered.kernel.choices.corrector', (own) => {
  test('roundings that all do harm stay within the bound at their point, and come near it', () => {
    const proof = new Proof(own.lowered, 'position');
    const adversary = new Adversary(own, 'position');
    const names = own.task.formula.inputs.map((input) => input.name);
    const points = new Points(own.task.domain, names, new Random(63));
    let nearest = 0;
    for (let k = 0; k < 1500; k++) {
      const point = points.draw();
      const share = adversary.worst(point).size / proof.boundAt(point);
      if (!(share <= nearest)) nearest = share;
    }
    expect(nearest).toBeLessThanOrEqual(1);
    expect(nearest).toBeGreaterThan(0.9);
  });
});
