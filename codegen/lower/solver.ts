import { errorsByCell } from '../approximate/kepler-cells.ts';
import { KeplerConvergence } from '../approximate/kepler-convergence.ts';
import { Evaluator } from '../formula/evaluate.ts';
import { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Bounds } from '../formula/ranges.ts';
import type { Choices } from '../kernel/choices.ts';
import { applyFunction } from '../read/function.ts';

const STARTERS = new URL('../../src/kepler/starters.ts', import.meta.url);
const CORRECTORS = new URL('../../src/kepler/correctors.ts', import.meta.url);

/** Points of the mean anomaly (a half turn, denser towards 0) and of the eccentricity at which iterates are looked at. */
const GRID = { M: 160, e: 8 } as const;

/**
 * The iterates of a capped solver for D = e sin(M + D): the starter and `cap` corrections.
 *
 * @param graph graph of the arguments
 * @param offset the node that stands for the exact D
 * @param choices starter, corrector and cap
 */
export function iterates(graph: Graph, offset: Node, choices: Choices): readonly Node[] {
  const [sinM, cosM, e] = offset.args as [Node, Node, Node];
  const list = [applyFunction(graph, STARTERS, choices.starter, [sinM, cosM, e])];
  for (let step = 0; step < choices.cap; step++) {
    list.push(applyFunction(graph, CORRECTORS, choices.corrector, [list.at(-1)!, sinM, cosM, e]));
  }
  return list;
}

const proven = new Map<string, number>();

/**
 * Proven bound on the error of a capped solver in exact arithmetic, over all mean anomalies, rad.
 *
 * @param choices starter, corrector and cap
 * @param e range of the eccentricity
 */
export function solverError(choices: Pick<Choices, 'starter' | 'corrector' | 'cap'>, e: Bounds): number {
  const { starter, corrector, cap } = choices;
  const key = `${starter} ${corrector} ${cap} ${e.lo} ${e.hi}`;
  const known = proven.get(key);
  if (known !== undefined) return known;
  const graph = new Graph();
  const [sinM, cosM, eNode] = ['sinM', 'cosM', 'e'].map((name) => graph.input(name, 'tick')) as [
    Node,
    Node,
    Node,
  ];
  const guess = applyFunction(graph, STARTERS, starter, [sinM, cosM, eNode]);
  const convergence = new KeplerConvergence({ graph, sinM, cosM, e: eNode, guess }, corrector);
  const table = errorsByCell(e, (M, cell) => {
    const { error } = convergence.error(M, cell, cap);
    return { error, rounding: error < Infinity ? error : 0 }; // a bound that is finite is taken as it is
  });
  const error = table.offset({ lo: -Math.PI, hi: Math.PI }, e);
  proven.set(key, error);
  return error;
}

/**
 * How large the iterates get, from a grid of mean anomalies and eccentricities with a margin: a hint for the length of
 * polynomials. The proof of the kernel takes nothing from it; an angle beyond the hint has no error that it accepts.
 *
 * @param offset the node that stands for the exact D
 * @param list its iterates
 * @param e range of the eccentricity
 */
export function iterateSizes(offset: Node, list: readonly Node[], e: Bounds): readonly number[] {
  const [sinM, cosM, eNode] = offset.args as [Node, Node, Node];
  const evaluator = new Evaluator(list, [sinM, cosM, eNode]);
  const sizes = list.map(() => 0);
  for (let i = 0; i <= GRID.M; i++) {
    const M = Math.PI * (i / GRID.M) ** 2;
    for (let j = 0; j <= GRID.e; j++) {
      evaluator.runFrom([Math.sin(M), Math.cos(M), e.lo + ((e.hi - e.lo) * j) / GRID.e]);
      for (const [k, node] of list.entries())
        sizes[k] = Math.max(sizes[k]!, Math.abs(evaluator.value(node).hi));
    }
  }
  return sizes.map((size) => size * 1.02 + 1e-9);
}
