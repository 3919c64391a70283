import type { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';

/** A formula after the rule, and where its nodes went. */
export interface Hoisted {
  readonly formula: Formula;
  readonly moved: ReadonlyMap<Node, Node>;
}

/**
 * Exact rule for products: (a b) c = (a c) b. The factors of a product of the tick that setup knows are
 * multiplied there.
 */
export function hoistProducts(graph: Graph, formula: Formula): Hoisted {
  const done = new Map<Node, Node>();
  const hoist = (node: Node): Node => {
    const known = done.get(node);
    if (known !== undefined) return known;
    const made = hoistNew(node);
    done.set(node, made);
    return made;
  };
  const hoistNew = (node: Node): Node => {
    if (node.args.length === 0) return node;
    const args = node.args.map(hoist);
    if (node.operation !== 'mul' || node.stage !== 'tick') return graph.make(node.operation, ...args);
    const factors = args.flatMap(factorsOf);
    const early = factors.filter((factor) => factor.stage !== 'tick');
    if (early.length < 2) return graph.make('mul', ...args);
    const product = (list: readonly Node[]) => list.reduce((a, b) => graph.make('mul', a, b));
    return graph.make('mul', product(early), product(factors.filter((factor) => factor.stage === 'tick')));
  };
  const outputs = formula.outputs.map((output) => ({ ...output, node: hoist(output.node) }));
  const labels = new Map<Node, string>();
  for (const [node, label] of formula.labels) {
    const kept = done.get(node);
    if (kept !== undefined && !labels.has(kept)) labels.set(kept, label);
  }
  return { formula: { ...formula, outputs, labels }, moved: done };
}

/** The factors of a product of the tick; other nodes are their own factor. */
function factorsOf(node: Node): readonly Node[] {
  return node.operation === 'mul' && node.stage === 'tick' ? node.args.flatMap(factorsOf) : [node];
}
