import type { Domain } from '../../src/models/description.ts';
import { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import { Ranges } from '../formula/ranges.ts';
import type { Choices } from '../kernel/choices.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { AngleRules } from './angles.ts';
import { approximate } from './approximate.ts';
import { hoistProducts } from './hoist.ts';
import type { Replacement } from './rule.ts';
import { schedule } from './schedule.ts';
import { transplant } from './transplant.ts';

/** A kernel and how it came about. */
export interface Lowered {
  readonly kernel: Kernel;
  /** The formula after the exact rules: equal to the model in exact arithmetic. */
  readonly exact: Formula;
  /** What approximating rules put in the place of nodes of `exact`. */
  readonly replacements: ReadonlyMap<Node, Replacement>;
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
  const angles = new AngleRules(graph, ranges).formula(transplant(formula, graph));
  const exact = hoistProducts(graph, angles);
  const { formula: plain, replacements } = approximate(graph, exact, ranges, choices);
  return { kernel: schedule(plain, ranges, choices, domain), exact, replacements };
}
