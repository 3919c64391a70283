import { eccentricAnomaly } from '../../src/kepler/eccentric-anomaly.ts';
import { inOrder } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import { operationText } from '../formula/operation-text.ts';
import type { Point } from './points.ts';

/** A formula as a function: writes the outputs at a point. */
export type Screen = (point: Point, out: Float64Array) => void;

/**
 * A formula in plain float64 with the engine's own functions: off by some units in the last place, and far cheaper than
 * double-double arithmetic. Good enough to find large errors of float32 kernels, not to state them.
 *
 * @param formula the model's formula
 */
export function screenOf(formula: Formula): Screen {
  const outputs = formula.outputs.map((output) => output.node);
  const nodes = inOrder(outputs);
  const name = new Map(nodes.map((node, k) => [node, `v${k}`]));
  const lines = nodes.map((node) => `const ${name.get(node)} = ${expression(node, name)};`);
  const writes = outputs.map((node, k) => `out[${k}] = ${name.get(node)};`);
  const text = `return (point, out) => { ${[...lines, ...writes].join('\n')} };`;
  return new Function('kepler', text)(eccentricAnomaly) as Screen;
}

function expression(node: Node, name: ReadonlyMap<Node, string>): string {
  const args = node.args.map((arg) => name.get(arg)!);
  switch (node.operation) {
    case 'input':
      return `point[${JSON.stringify(node.name)}]`;
    case 'constant':
      return String(node.value);
    case 'kepler':
      return `kepler(${args.join(', ')})`;
    default:
      return operationText(node.operation, args);
  }
}
