import { describe, expect, test } from 'vitest';
import { Evaluator } from '../../codegen/formula/evaluate.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { Points } from '../../codegen/observe/points.ts';
import { readModel } from '../../codegen/read/model.ts';
import { type BroadcastElements, type ClockParameters, clock, position } from '../../src/models/broadcast.ts';
import { type ClassicalElements, position as twoBodyPosition } from '../../src/models/two-body.ts';
import { EARTH } from '../../src/systems/earth.ts';
import { earthOrbit } from '../../src/systems/earth-orbit.ts';
import { GPS } from '../../src/systems/gps.ts';
import { gpsLnav } from '../../src/systems/gps-lnav.ts';

describe('the formula of a model is the model', () => {
  test('broadcast: position and clock agree with the TypeScript run in float64', () => {
    const formula = readModel(gpsLnav, ['position', 'clock']);
    const evaluator = new Evaluator(formula.outputs.map((output) => output.node));
    const points = new Points(
      gpsLnav.domains['flown']!,
      formula.inputs.map((input) => input.name),
      new Random(11),
    );
    for (let k = 0; k < 2000; k++) {
      const point = points.draw();
      evaluator.run(point);
      const elements = point as unknown as BroadcastElements & ClockParameters;
      const { x, y, z } = position(elements, GPS, point['t']!);
      const plain = [x, y, z, clock(elements, GPS, point['t']!)];
      for (const [index, { node, unit }] of formula.outputs.entries()) {
        expect(Math.abs(evaluator.difference(plain[index]!, node))).toBeLessThan(unit === 'm' ? 1e-6 : 1e-17);
      }
    }
  });

  test('two-body up to e = 0.9', () => {
    const formula = readModel(earthOrbit, ['position']);
    const evaluator = new Evaluator(formula.outputs.map((output) => output.node));
    const points = new Points(
      earthOrbit.domains['highly-eccentric']!,
      formula.inputs.map((input) => input.name),
      new Random(12),
    );
    for (let k = 0; k < 2000; k++) {
      const point = points.draw();
      evaluator.run(point);
      const { x, y, z } = twoBodyPosition(point as unknown as ClassicalElements, EARTH, point['t']!);
      for (const [index, { node }] of formula.outputs.entries()) {
        expect(Math.abs(evaluator.difference([x, y, z][index]!, node))).toBeLessThan(2e-6);
      }
    }
  });

  test('inputs carry stage and unit; names of the reference stay', () => {
    const formula = readModel(gpsLnav, ['position']);
    expect(formula.inputs.find((input) => input.name === 'sqrtA')).toEqual({
      name: 'sqrtA',
      unit: 'm^(1/2)',
      stage: 'setup',
    });
    expect(formula.inputs.at(-1)).toEqual({ name: 't', unit: 's', stage: 'tick' });
    expect(formula.inputs.map((input) => input.name)).not.toContain('af0');
    for (const label of ['A', 'n0', 'M', 'E', 'nu', 'phi', 'u', 'r', 'Omega'])
      expect([...formula.labels.values()]).toContain(label);
  });

  test("Kepler's equation is one node", () => {
    const formula = readModel(gpsLnav, ['position']);
    const E = [...formula.labels].find(([, label]) => label === 'E')![0];
    expect(E.operation).toBe('kepler');
  });
});
