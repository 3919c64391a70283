import type { Domain } from '../../src/models/description.ts';
import { Evaluator } from '../formula/evaluate.ts';
import type { Formula, Node, Stage } from '../formula/node.ts';
import type { Ranges } from '../formula/ranges.ts';
import type { Choices, Format } from '../kernel/choices.ts';
import type { Kernel, Line, Operation } from '../kernel/kernel.ts';
import { nameLines } from './names.ts';

/** A kernel and the line that computes each node, before any rounding to another format. */
export interface Scheduled {
  readonly kernel: Kernel;
  readonly lineOf: ReadonlyMap<Node, number>;
}

/**
 * Turns a formula of plain arithmetic into a kernel: every node one line of its stage's arithmetic, arguments
 * before users, setup before tick; the state holds the values of setup that the tick reads.
 *
 * @param formula formula of + - * / sqrt abs floor select
 * @param ranges ranges of its nodes, to find the guard word of the state
 * @param choices arithmetic of the stages
 * @param domain checked ranges of the elements and of t
 */
export function schedule(formula: Formula, ranges: Ranges, choices: Choices, domain: Domain): Scheduled {
  const scheduler = new Scheduler(choices);
  const outputs = formula.outputs.map(({ group, name, unit, node }) => ({
    group,
    name,
    unit,
    line: scheduler.tickLine(node),
  }));
  const { lines, order } = byStage(scheduler.lines);
  const at = (line: number) => order[line]!;
  const moved = nameLines(
    formula,
    lines.map((line) => ({ ...line, args: line.args.map(at) })),
  );
  const placed = outputs.map((output) => ({ ...output, line: at(output.line) }));
  const state = stateOf(
    moved,
    placed.map((output) => output.line),
  );
  const kernel: Kernel = {
    model: formula.name,
    choices,
    domain,
    elements: formula.inputs.filter((input) => input.stage === 'setup').map((input) => input.name),
    lines: moved,
    state,
    guard: state.findIndex((line) => ranges.of(moved[line]!.node).lo > 0),
    outputs: placed,
  };
  return { kernel, lineOf: new Map([...scheduler.lineOf].map(([node, line]) => [node, at(line)])) };
}

/** Setup values that the tick reads, in the order of first use. */
function stateOf(lines: readonly Line[], outputs: readonly number[]): readonly number[] {
  const read = [...lines.filter((line) => line.stage === 'tick').flatMap((line) => line.args), ...outputs];
  return [...new Set(read.filter((line) => lines[line]!.stage === 'setup'))];
}

/** Lines with constants first, then setup, then tick, and the new number of every line. */
function byStage(lines: readonly Line[]): { lines: readonly Line[]; order: readonly number[] } {
  const rank: Readonly<Record<Stage, number>> = { constant: 0, setup: 1, tick: 2 };
  const sorted = lines
    .map((line, index) => ({ line, index }))
    .sort((a, b) => rank[a.line.stage] - rank[b.line.stage] || a.index - b.index);
  const order: number[] = [];
  for (const [place, { index }] of sorted.entries()) order[index] = place;
  return { lines: sorted.map(({ line }) => line), order };
}

class Scheduler {
  readonly lines: Line[] = [];
  readonly lineOf = new Map<Node, number>();
  private readonly rounded = new Map<number, number>();
  private readonly constants = new Map<string, number>();
  private readonly choices: Choices;

  constructor(choices: Choices) {
    this.choices = choices;
  }

  /** The line of a node as the tick reads it: rounded when the tick is float32 and setup is not. */
  tickLine(node: Node): number {
    return this.argument(node, 'tick');
  }

  private argument(node: Node, stage: 'setup' | 'tick'): number {
    const format = this.choices[stage];
    if (node.stage === 'constant') return this.constant(node, format);
    const line = this.line(node);
    return this.lines[line]!.format === format ? line : this.round(line);
  }

  private line(node: Node): number {
    const known = this.lineOf.get(node);
    if (known !== undefined) return known;
    const made = this.lineNew(node);
    this.lineOf.set(node, made);
    return made;
  }

  private lineNew(node: Node): number {
    const stage = node.stage === 'tick' ? 'tick' : 'setup';
    if (node.operation === 'input') return this.push('input', [], 'f64', stage, node);
    const args = node.args.map((arg) => this.argument(arg, stage));
    return this.push(node.operation as Operation, args, this.choices[stage], stage, node);
  }

  private round(line: number): number {
    const known = this.rounded.get(line);
    if (known !== undefined) return known;
    const { stage, node } = this.lines[line]!;
    const made = this.push('round', [line], 'f32', stage, node);
    this.rounded.set(line, made);
    return made;
  }

  /** A value that depends on nothing: evaluated beyond float64 and rounded once. */
  private constant(node: Node, format: Format): number {
    const evaluator = new Evaluator([node]);
    evaluator.run({});
    const { hi } = evaluator.value(node);
    const value = format === 'f32' ? Math.fround(hi) : hi;
    const key = `${format} ${value}`;
    const known = this.constants.get(key);
    if (known !== undefined) return known;
    const made = this.push('constant', [], format, 'constant', node, value);
    this.constants.set(key, made);
    return made;
  }

  private push(
    operation: Operation,
    args: readonly number[],
    format: Format,
    stage: Stage,
    node: Node,
    value = 0,
  ): number {
    return this.lines.push({ name: '', operation, args, format, stage, value, node }) - 1;
  }
}
