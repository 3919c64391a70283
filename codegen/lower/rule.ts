import type { Node } from '../formula/node.ts';

/** A true anomaly as a turn: cos = (cos E - e) / (1 - e cos E), sin = root sine with sine = sin E / (1 - e cos E). */
export interface Anomaly<T> {
  /** The turn of the eccentric anomaly. */
  readonly E: T;
  readonly e: Node;
  /** sqrt(1 - e^2). */
  readonly root: Node;
  readonly sine: Node;
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
 * over the domain. Exact rules return plain nodes: their error is zero by the law that stands above them.
 */
export interface Replacement {
  readonly node: Node;
  /** Bound on |replacement - original|, in the unit of the node. */
  readonly error: number;
  /** Largest angle that a sine or cosine is used for, rad. */
  readonly radius?: number;
}
