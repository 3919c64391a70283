import type { Domain } from '../../src/models/description.ts';
import { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import { Ranges } from '../formula/ranges.ts';
import type { Choices } from '../kernel/choices.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { AngleRules } from './angles.ts';
import { approximate } from './approximate.ts';
import { hoistProducts } from './hoist.ts';
import type { Replacement, Turn } from './rule.ts';
import { schedule } from './schedule.ts';
import { transplant } from './transplant.ts';

/** A kernel and how it came about. */
export interface Lowered {
  readonly kernel: Kernel;
  /** The graph of the exact formula. */
  readonly graph: Graph;
  /** The formula after the exact rules: equal to the model in exact arithmetic. */
  readonly exact: Formula;
  /** Pairs of nodes of `exact` that are a cosine and a sine of one angle; their parts are as the rules made them. */
  readonly pairs: readonly Turn[];
  /** By node of the exact formula: what an approximating rule put in its place. */
  readonly replacements: ReadonlyMap<Node, Replacement>;
  /** By node of Kepler's equation: the iterates of its capped solver, as nodes of the exact formula. */
  readonly iterates: ReadonlyMap<Node, readonly Node[]>;
  /** By node of the exact formula: the line that computes it. Constants have none. */
  readonly lineOf: ReadonlyMap<Node, number>;
}

/**
 * Lowers a formula to a kernel.
 *
 * @param formula the model's formula
 * @param domain ranges of its inputs
 * @param choices arithmetic and solver
 */
export function lower(formula: Formula, domain: Domain, choices: Choices): Lowered {
  const graph = new Graph();
  const ranges = new Ranges(domain);
  const rules = new AngleRules(graph, ranges);
  const { formula: exact, moved } = hoistProducts(graph, rules.formula(transplant(formula, graph)));
  const approximated = approximate(graph, exact, ranges, choices);
  const { kernel, lineOf } = schedule(approximated.formula, ranges, choices, domain);
  return {
    kernel,
    graph,
    exact,
    pairs: rules.pairs().flatMap((turn) => {
      const [cos, sin] = [moved.get(turn.cos), moved.get(turn.sin)];
      return cos === undefined || sin === undefined ? [] : [{ ...turn, cos, sin }];
    }),
    replacements: approximated.replacements,
    iterates: approximated.iterates,
    lineOf: compose(approximated.plain, lineOf),
  };
}

function compose(
  first: ReadonlyMap<Node, Node>,
  second: ReadonlyMap<Node, number>,
): ReadonlyMap<Node, number> {
  const result = new Map<Node, number>();
  for (const [node, between] of first) {
    const line = second.get(between);
    if (line !== undefined) result.set(node, line);
  }
  return result;
}
