import { describe, expect, test } from 'vitest';
import { Proof } from '../../codegen/bound/proof.ts';
import { subdivide } from '../../codegen/bound/search.ts';
import { describeVariant, judgeOf } from '../../codegen/choose/variant.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { Points } from '../../codegen/observe/points.ts';
import { uncovered } from './battery/coverage.ts';
import { runLines, subject } from './lines.ts';

const SUBJECTS = [
  subject('gps-lnav', 'flown', {}),
  subject('gps-lnav', 'flown', { tick: 'f32', cap: 1 }),
  subject('gps-lnav', 'flown', { setup: 'f32', tick: 'f32', cap: 1 }),
  subject('earth-orbit', 'near-circular', {}),
];

describe.each(SUBJECTS)('$name', ({ lowered, task }) => {
  const names = task.formula.inputs.map((input) => input.name);
  const proof = new Proof(lowered, 'position');

  test('error <= bound at the point <= bound over the domain, at random points and ends of ranges', async () => {
    const certified = subdivide(proof, { boxes: 3000 }).bound;
    const judge = await judgeOf(task, describeVariant(task, lowered));
    const points = new Points(task.domain, names, new Random(61));
    let nearest = 0;
    for (let k = 0; k < 3000; k++) {
      const point = points.draw();
      const error = judge.errors(point).get('position')!.size;
      const bound = proof.boundAt(point);
      expect(error).toBeLessThanOrEqual(bound);
      expect(bound).toBeLessThanOrEqual(certified);
      nearest = Math.max(nearest, error / bound);
    }
    expect(nearest).toBeGreaterThan(0.2); // roundings of many lines seldom add up
  });

  test('every line that rounds on the way to the outputs has its part in the proof', () => {
    expect(uncovered(lowered.kernel, proof.tape, 'position')).toEqual([]);
  });

  test('a box bounds its halves, and more boxes never loosen the bound', () => {
    const bounds = [1, 100, 1000].map((boxes) => subdivide(proof, { boxes }).bound);
    expect(bounds[1]!).toBeLessThanOrEqual(bounds[0]!);
    expect(bounds[2]!).toBeLessThanOrEqual(bounds[1]!);
    expect(subdivide(proof, { boxes: 1000 }).bound).toBe(bounds[2]);
  });
});

describe('adjoints are the derivatives by single lines', () => {
  test.each([SUBJECTS[0]!, SUBJECTS[3]!])(
    '$name: an error put into one line moves the outputs as its adjoint says',
    ({ lowered, task }) => {
      const { kernel } = lowered;
      const proof = new Proof(lowered, 'position');
      const points = new Points(
        task.domain,
        task.formula.inputs.map((input) => input.name),
        new Random(62),
      );
      const outputs = kernel.outputs.map((output) => output.line);
      let checked = 0;
      for (let round = 0; round < 6; round++) {
        const point = points.draw();
        proof.boundAt(point);
        const plain = runLines(kernel, point);
        for (const [line, adjoint] of proof.lineAdjoints()) {
          const size = Math.max(Math.abs(plain[line]!), 1e-6) * 1e-6;
          const moved = runLines(kernel, point, new Map([[line, size]]));
          const change = Math.hypot(...outputs.map((output) => moved[output]! - plain[output]!)) / size;
          expect(Math.abs(change - adjoint), kernel.lines[line]!.name).toBeLessThanOrEqual(
            1e-3 * Math.max(change, adjoint) + 1e-6 / size,
          );
          checked++;
        }
      }
      expect(checked).toBeGreaterThan(60);
    },
  );
});
