import { describe, expect, test } from 'vitest';
import { Evaluator } from '../../codegen/formula/evaluate.ts';
import { Graph, inOrder } from '../../codegen/formula/graph.ts';
import type { Formula, Node } from '../../codegen/formula/node.ts';
import { Ranges } from '../../codegen/formula/ranges.ts';
import type { Choices } from '../../codegen/kernel/choices.ts';
import { AngleRules } from '../../codegen/lower/angles.ts';
import { approximate } from '../../codegen/lower/approximate.ts';
import { hoistProducts } from '../../codegen/lower/hoist.ts';
import { lower } from '../../codegen/lower/lower.ts';
import { transplant } from '../../codegen/lower/transplant.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { Points } from '../../codegen/observe/points.ts';
import { readModel } from '../../codegen/read/model.ts';
import type { Domain } from '../../src/models/description.ts';
import { earthOrbit } from '../../src/systems/earth-orbit.ts';
import { gpsLnav } from '../../src/systems/gps-lnav.ts';

const F64: Choices = { setup: 'f64', tick: 'f64', starter: 'secondOrder', corrector: 'newton', cap: 2 };

const CASES = [
  ['broadcast', readModel(gpsLnav, ['position', 'clock']), gpsLnav.domains['flown']!],
  ['two-body', readModel(earthOrbit, ['position']), earthOrbit.domains['near-circular']!],
] as const;

/** Largest relative difference of the outputs of two formulas over random points. */
function difference(a: Formula, b: Formula, domain: Domain, count: number): number {
  const [left, right] = [a, b].map(({ outputs }) => new Evaluator(outputs.map((output) => output.node))) as [
    Evaluator,
    Evaluator,
  ];
  const points = new Points(
    domain,
    a.inputs.map((input) => input.name),
    new Random(21),
  );
  let largest = 0;
  for (let k = 0; k < count; k++) {
    const point = points.draw();
    left.run(point);
    right.run(point);
    for (const [index, { node }] of a.outputs.entries()) {
      const x = left.value(node);
      const y = right.value(b.outputs[index]!.node);
      largest = Math.max(largest, Math.abs(x.hi - y.hi + (x.lo - y.lo)) / Math.max(1e-9, Math.abs(x.hi)));
    }
  }
  return largest;
}

describe('exact rules change nothing in exact arithmetic', () => {
  test.each(CASES)('%s: angles and products', (_, formula, domain) => {
    const graph = new Graph();
    const source = transplant(formula, graph);
    const angles = new AngleRules(graph, new Ranges(domain)).formula(source);
    expect(difference(formula, angles, domain, 500)).toBeLessThan(1e-19);
    expect(difference(angles, hoistProducts(graph, angles).formula, domain, 500)).toBeLessThan(1e-24);
  });

  test.each(CASES)(
    '%s: no atan2 and no anomaly is left, and sines stand of plain sums',
    (_, formula, domain) => {
      const nodes = inOrder(lower(formula, domain, F64).exact.outputs.map((output) => output.node));
      expect(nodes.filter((node) => node.operation === 'atan2' || node.operation === 'kepler')).toEqual([]);
      for (const node of nodes.filter((node) => node.operation === 'sin')) {
        expect(holdsTurn(node.args[0]!), 'a sum of numbers and of turns').toBe(false);
      }
    },
  );

  test('the root in atan2 goes only when the identity of the true anomaly holds', () => {
    const graph = new Graph();
    const rules = () =>
      new AngleRules(
        graph,
        new Ranges({
          M: { min: 0, max: 1, from: '' },
          e: { min: 0, max: 0.5, from: '' },
          g: { min: 0, max: 0.5, from: '' },
        }),
      );
    const [M, e, g] = ['M', 'e', 'g'].map((name) => graph.input(name, 'setup')) as [Node, Node, Node];
    const E = graph.make('kepler', M, e);
    const root = (x: Node) =>
      graph.make('sqrt', graph.make('sub', graph.constant(1), graph.make('mul', x, x)));
    const nu = (x: Node, y: Node, anomaly: Node) =>
      graph.make(
        'atan2',
        graph.make('mul', root(x), graph.make('sin', anomaly)),
        graph.make('sub', graph.make('cos', anomaly), y),
      );
    const roots = (node: Node) =>
      inOrder([rules().rewrite(graph.make('sin', node))]).filter((inner) => inner.operation === 'sqrt')
        .length;
    expect(roots(nu(e, e, E))).toBe(1);
    expect(roots(nu(e, g, E))).toBe(2);
    expect(roots(nu(g, e, E))).toBe(2);
  });
});

/** Whether a node is a sum with an offset or another angle known as a turn among its terms. */
function holdsTurn(angle: Node): boolean {
  if (angle.operation !== 'add' && angle.operation !== 'sub') return false;
  return angle.args.some((term) => term.operation === 'offset' || holdsTurn(term));
}

describe('approximating rules keep to their stated error', () => {
  test.each(CASES)('%s: every replaced sine and cosine', (_, formula, domain) => {
    for (const choices of [F64, { ...F64, tick: 'f32' as const }]) {
      const graph = new Graph();
      const ranges = new Ranges(domain);
      const { formula: exact } = hoistProducts(
        graph,
        new AngleRules(graph, ranges).formula(transplant(formula, graph)),
      );
      const { replacements } = approximate(graph, exact, ranges, choices);
      const pairs = [...replacements].filter(
        ([node]) =>
          !inOrder(node.args).some((inner) => replacements.has(inner) || inner.operation === 'offset'),
      );
      expect(pairs.length).toBeGreaterThan(4);
      const evaluator = new Evaluator(pairs.flatMap(([node, { node: made }]) => [node, made]));
      const points = new Points(
        domain,
        formula.inputs.map((input) => input.name),
        new Random(22),
      );
      for (let k = 0; k < 1000; k++) {
        evaluator.run(points.draw());
        for (const [node, { node: made, error }] of pairs) {
          const [x, y] = [evaluator.value(node), evaluator.value(made)];
          expect(Math.abs(x.hi - y.hi + (x.lo - y.lo))).toBeLessThanOrEqual(error * (1 + 1e-9) + 1e-28);
        }
      }
    }
  });
});

describe('the stage split', () => {
  test.each(CASES)(
    '%s: nothing that depends on elements alone is computed in the tick',
    (_, formula, domain) => {
      const { kernel } = lower(formula, domain, F64);
      for (const line of kernel.lines.filter((line) => line.stage === 'tick' && line.args.length > 0)) {
        const early = line.args.every((arg) => kernel.lines[arg]!.stage !== 'tick');
        expect(early, line.name).toBe(false);
      }
    },
  );

  test.each(CASES)(
    '%s: the state holds just the values of setup that the tick reads',
    (_, formula, domain) => {
      const { kernel } = lower(formula, domain, F64);
      const read = new Set(kernel.lines.filter((line) => line.stage === 'tick').flatMap((line) => line.args));
      for (const line of kernel.state) expect(read.has(line)).toBe(true);
      expect(new Set(kernel.state).size).toBe(kernel.state.length);
    },
  );
});
