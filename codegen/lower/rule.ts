import { Evaluator } from '../formula/evaluate.ts';
import { Graph } from '../formula/graph.ts';
import type { Node, Stage } from '../formula/node.ts';

/** What a true anomaly is made of: cos = (cos E - e) / (1 - e cos E), sin = root sin E / (1 - e cos E). */
export interface Anomaly<T> {
  /** The turn of the eccentric anomaly. */
  readonly E: T;
  readonly e: Node;
  /** sqrt(1 - e^2). */
  readonly root: Node;
}

/** An angle carried as its cosine and sine. */
export interface Turn {
  readonly cos: Node;
  readonly sin: Node;
  /** The two turns that it was made of by the rule for sums of angles. */
  readonly parts?: readonly [Turn, Turn];
  /** For a true anomaly: what it is made of. */
  readonly anomaly?: Anomaly<Turn>;
}

/**
 * What an approximating rule puts in the place of a node, and how far the two can differ in exact arithmetic
 * over the domain.
 */
export interface Replacement {
  readonly node: Node;
  /** Proven bound on |replacement - original|, in the unit of the node; Infinity where none can be proven. */
  readonly error: number;
  /** Largest angle that a sine or cosine is used for, rad. */
  readonly radius?: number;
}

/** The law of an exact rule: both sides as expressions of free numbers. */
export interface Law {
  /** The free numbers: their ranges and the stage of the nodes that stand for them. */
  readonly free: readonly { readonly min: number; readonly max: number; readonly stage?: Stage }[];
  /** The expressions that the rule replaces. */
  original(graph: Graph, free: readonly Node[]): readonly Node[];
  /** What the rule is applied to in order to replace them. */
  given(graph: Graph, free: readonly Node[]): readonly Node[];
}

/** An exact rule: it builds expressions that are equal to others by a law. */
export interface ExactRule {
  readonly name: string;
  readonly law: Law;
  apply(graph: Graph, given: readonly Node[]): readonly Node[];
}

/** Points at which a law is tried, and what double-double arithmetic may leave between its sides. */
const TRIED = 40;
const NOTHING = 1e-27;

/**
 * Makes an exact rule. Its law is tried at once, in double-double arithmetic at points all over its ranges: a rule that
 * changes anything cannot be made.
 *
 * @throws RangeError if the law does not hold
 */
export function exactRule(rule: ExactRule): ExactRule {
  const graph = new Graph();
  const free = rule.law.free.map(({ stage = 'tick' }, k) => graph.input(`free ${k}`, stage));
  const original = rule.law.original(graph, free);
  const replaced = rule.apply(graph, rule.law.given(graph, free));
  if (original.length !== replaced.length)
    throw new RangeError(
      `the rule ${rule.name} replaces ${original.length} expressions by ${replaced.length}`,
    );
  const evaluator = new Evaluator([...original, ...replaced]);
  for (let k = 1; k <= TRIED; k++) {
    // the fractional parts of multiples of square roots of primes lie evenly
    const point = rule.law.free.map(
      ({ min, max }, j) => min + (max - min) * ((k * Math.sqrt([2, 3, 5, 7, 11, 13][j % 6]!)) % 1),
    );
    evaluator.run(Object.fromEntries(point.map((value, j) => [`free ${j}`, value])));
    for (const [j, node] of original.entries()) {
      const [a, b] = [evaluator.value(node), evaluator.value(replaced[j]!)];
      const gap = Math.abs(a.hi - b.hi + (a.lo - b.lo));
      if (!(gap <= NOTHING * (1 + Math.abs(a.hi))))
        throw new RangeError(`the rule ${rule.name} changes a value by ${gap} at ${point.join(', ')}`);
    }
  }
  return rule;
}
