import { REDUCED_RADIUS, type Reduction, reduce } from '../approximate/reduction.ts';
import { cosinePolynomial, type Polynomial, sinePolynomial } from '../approximate/sine.ts';
import type { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import type { Ranges } from '../formula/ranges.ts';
import type { Choices, Format } from '../kernel/choices.ts';
import type { Replacement } from './rule.ts';
import { iterateSizes, iterates, solverError } from './solver.ts';

/** Angles up to this size take a polynomial as they are; larger ones are reduced to a quarter turn. */
const LARGEST_PLAIN_RADIUS = 1.2;

/** Room for rounding in the argument of a polynomial, relative. */
const PADDING = 1 + 2 ** -16;

/** A formula of plain arithmetic, and what stands in it for sines, cosines and Kepler's equation. */
export interface Approximated {
  readonly formula: Formula;
  /** By node of the exact formula (its arguments exact too): what replaced it. */
  readonly replacements: ReadonlyMap<Node, Replacement>;
  /** By node of the exact formula: the node of the plain formula that stands for it. */
  readonly plain: ReadonlyMap<Node, Node>;
  /** Iterates of each capped solver, by the node of Kepler's equation: nodes of the exact formula. */
  readonly iterates: ReadonlyMap<Node, readonly Node[]>;
}

/**
 * Approximating rules: sines and cosines by polynomials, Kepler's equation by a capped solver. What is left is
 * + - * / and sqrt, abs, floor and select.
 *
 * @param graph graph of the formula
 * @param formula formula whose angles are already apart (AngleRules)
 * @param ranges ranges of its nodes
 * @param choices arithmetic and solver
 */
export function approximate(graph: Graph, formula: Formula, ranges: Ranges, choices: Choices): Approximated {
  const pass = new Pass(graph, ranges, choices);
  const outputs = formula.outputs.map((output) => ({ ...output, node: pass.visit(output.node) }));
  const labels = new Map<Node, string>();
  for (const [node, label] of formula.labels) {
    const kept = pass.done.get(node);
    if (kept !== undefined && kept.args.length > 0 && !labels.has(kept)) labels.set(kept, label);
  }
  return {
    formula: { ...formula, outputs, labels },
    replacements: pass.replacements,
    plain: pass.done,
    iterates: pass.iterates,
  };
}

class Pass {
  readonly done = new Map<Node, Node>();
  readonly replacements = new Map<Node, Replacement>();
  readonly iterates = new Map<Node, readonly Node[]>();
  private readonly reductions = new Map<Node, Reduction>();
  private readonly graph: Graph;
  private readonly ranges: Ranges;
  private readonly choices: Choices;

  constructor(graph: Graph, ranges: Ranges, choices: Choices) {
    this.graph = graph;
    this.ranges = ranges;
    this.choices = choices;
  }

  visit(node: Node): Node {
    const known = this.done.get(node);
    if (known !== undefined) return known;
    const made = this.visitNew(node);
    this.done.set(node, made);
    return made;
  }

  private visitNew(node: Node): Node {
    if (node.args.length === 0 || node.stage === 'constant') return node;
    const args = node.args.map((arg) => this.visit(arg));
    switch (node.operation) {
      case 'sin':
      case 'cos':
        return this.turn(node, args[0]!);
      case 'offset':
        return this.offset(node);
      default:
        return this.graph.make(node.operation, ...args);
    }
  }

  private turn(node: Node, x: Node): Node {
    const radius = this.ranges.magnitude(node.args[0]!) * PADDING;
    const format = this.choices[x.stage === 'tick' ? 'tick' : 'setup'];
    const { node: made, error } =
      radius <= LARGEST_PLAIN_RADIUS
        ? this.plain(node, x, radius, format)
        : this.reduced(node, x, radius, format);
    this.replacements.set(node, { node: made, error, radius });
    return made;
  }

  private plain(node: Node, x: Node, radius: number, format: Format): Polynomial {
    return node.operation === 'sin'
      ? sinePolynomial(this.graph, x, radius, format)
      : cosinePolynomial(this.graph, x, radius, format);
  }

  private reduced(node: Node, x: Node, radius: number, format: Format): Polynomial {
    const reduction = this.reductions.get(x) ?? reduce(this.graph, x, radius, format);
    this.reductions.set(x, reduction);
    this.ranges.assert(reduction.remainder, { lo: -REDUCED_RADIUS, hi: REDUCED_RADIUS });
    const sin = sinePolynomial(this.graph, reduction.remainder, REDUCED_RADIUS, format);
    const cos = cosinePolynomial(this.graph, reduction.remainder, REDUCED_RADIUS, format);
    const made =
      node.operation === 'sin' ? reduction.sin(sin.node, cos.node) : reduction.cos(sin.node, cos.node);
    return { node: made, error: Math.max(sin.error, cos.error) + reduction.error };
  }

  private offset(node: Node): Node {
    const list = iterates(this.graph, node, this.choices);
    this.iterates.set(node, list);
    const e = this.ranges.of(node.args[2]!);
    const sizes = iterateSizes(node, list, e);
    for (const [k, iterate] of list.entries()) this.ranges.assert(iterate, { lo: -sizes[k]!, hi: sizes[k]! });
    const made = this.visit(list.at(-1)!);
    const { choices } = this;
    this.replacements.set(node, {
      node: made,
      get error() {
        return solverError(choices, e); // takes a while: proven when it is asked for
      },
    });
    return made;
  }
}
