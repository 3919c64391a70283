import { InputError } from '../../src/finding.ts';
import { Graph, inOrder } from './graph.ts';
import {
  type Formula,
  type Input,
  type Node,
  OPERATIONS,
  type Operation,
  type Output,
  type Stage,
} from './node.ts';

/**
 * A formula as text, one node a line, arguments before their users:
 *
 *     formula broadcast
 *     input sqrtA setup m^(1/2)
 *     A = mul sqrtA sqrtA
 *     %1 = sub 1 e
 *     output position x m = %1
 *
 * Nodes that the reference names keep that name; the others are numbered. Constants stand where they are used.
 */
export function printFormula(formula: Formula): string {
  const lines = [`formula ${formula.name}`];
  for (const input of formula.inputs) lines.push(`input ${input.name} ${input.stage} ${input.unit}`);
  const names = new Map<Node, string>();
  const refer = (node: Node): string => {
    if (node.operation === 'constant') return String(node.value);
    return node.operation === 'input' ? node.name : names.get(node)!;
  };
  for (const node of inOrder(formula.outputs.map((output) => output.node))) {
    if (node.args.length === 0) continue;
    names.set(node, formula.labels.get(node) ?? `%${names.size + 1}`);
    lines.push(`${refer(node)} = ${node.operation} ${node.args.map(refer).join(' ')}`);
  }
  for (const output of formula.outputs) {
    lines.push(`output ${output.group} ${output.name} ${output.unit} = ${refer(output.node)}`);
  }
  return `${lines.join('\n')}\n`;
}

/**
 * Reads what printFormula wrote.
 *
 * @param text the formula as text
 * @param file name for messages
 * @throws InputError with code formula.syntax and the line
 */
export function parseFormula(text: string, file = 'formula'): Formula {
  const graph = new Graph();
  const inputs: Input[] = [];
  const outputs: Output[] = [];
  const labels = new Map<Node, string>();
  const names = new Map<string, Node>();
  let name: string | undefined;
  const lines = text.split('\n');
  for (const [index, line] of lines.entries()) {
    const refuse = (what: string): never => {
      throw syntaxError(file, index + 1, what);
    };
    const refer = (word: string | undefined): Node => {
      if (word === undefined) return refuse('a name or a number is missing');
      const known = names.get(word);
      if (known !== undefined) return known;
      const value = Number(word);
      return Number.isFinite(value) ? graph.constant(value) : refuse(`"${word}" is not defined above`);
    };
    const words = line.trim().split(/\s+/);
    if (words[0] === '') continue;
    if (words[0] === 'formula') {
      name = words[1] ?? refuse('the formula has no name');
    } else if (words[0] === 'input') {
      const [, inputName = '', stage, unit = ''] = words;
      if (stage !== 'setup' && stage !== 'tick')
        refuse(`"${stage}" is not a stage of an input (setup, tick)`);
      inputs.push({ name: inputName, stage: stage as Stage, unit });
      names.set(inputName, graph.input(inputName, stage as Stage));
    } else if (words[0] === 'output') {
      const [, group = '', outputName = '', unit = '', equals, word] = words;
      if (equals !== '=') refuse('an output reads: output GROUP NAME UNIT = NODE');
      outputs.push({ group, name: outputName, unit, node: refer(word) });
    } else {
      const [target = '', equals, operation = '', ...args] = words;
      if (equals !== '=') refuse('a node reads: NAME = OPERATION ARGUMENTS');
      if (!Object.hasOwn(OPERATIONS, operation)) refuse(`"${operation}" is not an operation`);
      if (OPERATIONS[operation as Operation] !== args.length || args.length === 0) {
        refuse(`${operation} takes ${OPERATIONS[operation as Operation]} arguments, not ${args.length}`);
      }
      if (names.has(target)) refuse(`"${target}" is defined twice`);
      const node = graph.make(operation as Operation, ...args.map(refer));
      names.set(target, node);
      if (!target.startsWith('%')) labels.set(node, target);
    }
  }
  if (name === undefined) throw syntaxError(file, 1, 'the line "formula NAME" is missing');
  return { name, inputs, outputs, labels };
}

function syntaxError(file: string, line: number, what: string): InputError {
  return new InputError({
    code: 'formula.syntax',
    place: { file, line },
    what,
    why: 'The text is not a formula as this tool prints it.',
    remedy: 'Print the formula again, or mend the line.',
  });
}
