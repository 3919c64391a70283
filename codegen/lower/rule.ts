import type { Node } from '../formula/node.ts';

/** An angle carried as its cosine and sine. */
export interface Turn {
  readonly cos: Node;
  readonly sin: Node;
}

/**
 * What an approximating rule puts in the place of a node, and how far the two can differ in exact arithmetic
 * over the domain. Exact rules return plain nodes: their error is zero by the law that stands above them.
 */
export interface Replacement {
  readonly node: Node;
  /** Bound on |replacement - original|, in the unit of the node. */
  readonly error: number;
}
