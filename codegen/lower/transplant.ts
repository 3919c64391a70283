import { type Graph, inOrder } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';

/** The same formula with its nodes made by another graph, so that a lowering leaves its source untouched. */
export function transplant(formula: Formula, graph: Graph): Formula {
  const moved = new Map<Node, Node>();
  for (const node of inOrder(formula.outputs.map((output) => output.node))) {
    moved.set(node, move(node, graph, moved));
  }
  return {
    ...formula,
    outputs: formula.outputs.map((output) => ({ ...output, node: moved.get(output.node)! })),
    labels: new Map(
      [...formula.labels]
        .filter(([node]) => moved.has(node))
        .map(([node, label]) => [moved.get(node)!, label]),
    ),
  };
}

function move(node: Node, graph: Graph, moved: ReadonlyMap<Node, Node>): Node {
  if (node.operation === 'input') return graph.input(node.name, node.stage);
  if (node.operation === 'constant') return graph.constant(node.value);
  return graph.make(node.operation, ...node.args.map((arg) => moved.get(arg)!));
}
