import { type Graph, inOrder } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import { regroupedProduct } from './exact-rules.ts';

/** A formula after the rule, and where its nodes went. */
export interface Hoisted {
  readonly formula: Formula;
  readonly moved: ReadonlyMap<Node, Node>;
}

/**
 * Regroups products: the factors of a product of the tick that setup knows are multiplied there. A product that several
 * nodes read stays as it is: taking it apart would compute it several times, and the formula would lose its shape.
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
  const uses = countUses(formula);
  const factorsOf = (node: Node): readonly Node[] =>
    node.operation === 'mul' && node.stage === 'tick' && uses.get(node) === 1
      ? node.args.flatMap(factorsOf)
      : [node];
  const hoistNew = (node: Node): Node => {
    if (node.args.length === 0) return node;
    if (node.operation !== 'mul' || node.stage !== 'tick')
      return graph.make(node.operation, ...node.args.map(hoist));
    const factors = node.args.flatMap(factorsOf).map(hoist);
    if (factors.filter((factor) => factor.stage !== 'tick').length < 2)
      return graph.make('mul', ...node.args.map(hoist));
    return regroupedProduct.apply(graph, factors)[0]!;
  };
  const outputs = formula.outputs.map((output) => ({ ...output, node: hoist(output.node) }));
  const labels = new Map<Node, string>();
  for (const [node, label] of formula.labels) {
    const kept = done.get(node);
    if (kept !== undefined && !labels.has(kept)) labels.set(kept, label);
  }
  return { formula: { ...formula, outputs, labels }, moved: done };
}

/** How many nodes and outputs of a formula read each node. */
function countUses(formula: Formula): ReadonlyMap<Node, number> {
  const roots = formula.outputs.map((output) => output.node);
  const uses = new Map<Node, number>();
  for (const node of [...roots, ...inOrder(roots).flatMap((user) => user.args)])
    uses.set(node, (uses.get(node) ?? 0) + 1);
  return uses;
}
