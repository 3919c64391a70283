import { describe, expect, test } from 'vitest';
import { Evaluator } from '../../codegen/formula/evaluate.ts';
import { Graph } from '../../codegen/formula/graph.ts';
import { iterates, solverError } from '../../codegen/lower/solver.ts';

const STARTERS = ['firstOrder', 'secondOrder', 'thirdOrder', 'danby', 'secant'] as const;
const CORRECTORS = ['newton', 'halley', 'quartic'] as const;
const CAP = 3;

/** What double-double arithmetic leaves of the difference of two iterates that agree. */
const NOTHING = 1e-30;

/** Largest |iterate - exact| on a grid, after 0 to CAP corrections, rad. */
function worst(starter: (typeof STARTERS)[number], corrector: (typeof CORRECTORS)[number], e: number) {
  const graph = new Graph();
  const leaves = ['sin M', 'cos M', 'e'].map((name) => graph.input(name, 'tick'));
  const offset = graph.make('offset', ...leaves);
  const list = iterates(graph, offset, { setup: 'f64', tick: 'f64', starter, corrector, cap: CAP });
  const evaluator = new Evaluator([...list, offset], leaves);
  const sizes = list.map(() => 0);
  for (let i = 0; i <= 100; i++) {
    const M = Math.PI * (2 * (i / 100) ** 2 - 1) * (i % 2 === 0 ? 1 : -1);
    for (let j = 0; j <= 6; j++) {
      evaluator.runFrom([Math.sin(M), Math.cos(M), e * (1 - (1 - j / 6) ** 2)]);
      const exact = evaluator.value(offset);
      for (const [k, node] of list.entries()) {
        const { hi, lo } = evaluator.value(node);
        sizes[k] = Math.max(sizes[k]!, Math.abs(hi - exact.hi + (lo - exact.lo)));
      }
    }
  }
  return sizes;
}

describe.each([0.03, 0.3])('solvers for e up to %d', (e) => {
  test.each(STARTERS.flatMap((starter) => CORRECTORS.map((corrector) => [starter, corrector] as const)))(
    '%s and %s: no iterate is further off than the proven bound, and none of it is idle',
    (starter, corrector) => {
      const sizes = worst(starter, corrector, e);
      for (const [cap, size] of sizes.entries()) {
        const bound = solverError({ starter, corrector, cap }, { lo: 0, hi: e });
        expect(size, `${cap} corrections`).toBeLessThanOrEqual(bound + NOTHING);
        expect(bound).toBeLessThan(1);
      }
    },
  );
});

// common practice, no source: orders of convergence
test('each correction raises the error to its power', () => {
  for (const [corrector, order] of [
    ['newton', 2],
    ['halley', 3],
    ['quartic', 4],
  ] as const) {
    const bound = (cap: number) =>
      solverError({ starter: 'secondOrder', corrector, cap }, { lo: 0, hi: 0.03 });
    expect(Math.log(bound(2)) / Math.log(bound(1))).toBeGreaterThan(order * 0.95);
  }
});
