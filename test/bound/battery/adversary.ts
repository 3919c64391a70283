import { Evaluator } from '../../../codegen/formula/evaluate.ts';
import type { Node } from '../../../codegen/formula/node.ts';
import type { Line } from '../../../codegen/kernel/kernel.ts';
import { lineValue } from '../../../codegen/kernel/line-value.ts';
import type { Point } from '../../../codegen/observe/points.ts';
import { RoundingModel } from '../../../codegen/observe/rounding-model.ts';
import { runLines, type Subject } from '../lines.ts';

/** Directions of the first try, before the error's own. */
const AXES = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
] as const;

/** Tries from each axis: each goes along the error of the one before. */
const TRIES = 3;

/** A run of a kernel whose float32 lines err as they like, within what one rounding to nearest may do. */
export interface AdverseRun {
  /** Values of all lines. */
  readonly values: Float64Array;
  /** Computed minus exact, of the outputs of one group. */
  readonly error: readonly number[];
  /** Length of the error. */
  readonly size: number;
}

/**
 * The arithmetic that does most harm: every float32 line is computed in float64 and then moved by as much as a rounding
 * to nearest could move it, all lines to the same side as the outputs see it. A proof that takes a line for one rounding
 * holds for this run too, and leaves it little room. Lines that round nothing at a point (products of few bits,
 * differences of near numbers) stay as they are.
 */
export class Adversary {
  private readonly subject: Subject;
  private readonly names: readonly string[];
  private readonly outputs: readonly number[];
  private readonly model: RoundingModel;
  private readonly evaluator: Evaluator;
  private readonly nodes: readonly Node[];

  constructor(subject: Subject, group: string) {
    const { lowered, task } = subject;
    this.subject = subject;
    this.names = task.formula.inputs.map((input) => input.name);
    this.outputs = lowered.kernel.outputs
      .filter((output) => output.group === group)
      .map((output) => output.line);
    this.model = new RoundingModel(lowered.kernel, this.names, this.outputs);
    this.nodes = task.formula.outputs.filter((output) => output.group === group).map((output) => output.node);
    this.evaluator = new Evaluator(this.nodes);
  }

  /** The run with the largest error that was found at a point. */
  worst(point: Point): AdverseRun {
    const { kernel } = this.subject.lowered;
    const plain = runLines(kernel, point);
    const input = (name: string) => point[name]!;
    const inexact = kernel.lines.map(
      (line, k) => line.format === 'f32' && plain[k] !== lineValue(line, plain, input),
    );
    this.evaluator.run(point);
    const exact = this.nodes.map((node) => this.evaluator.value(node).hi);
    let worst: AdverseRun = { values: plain, error: [], size: -1 };
    for (const axis of AXES.slice(0, this.outputs.length)) {
      let direction: readonly number[] = axis.slice(0, this.outputs.length);
      for (let k = 0; k < TRIES; k++) {
        const run = this.along(point, direction, inexact, exact);
        if (run.size > worst.size) worst = run;
        direction = run.error.map((part) => part / run.size);
      }
    }
    return worst;
  }

  /** The run whose lines all err to the same side along a direction. */
  private along(
    point: Point,
    direction: readonly number[],
    inexact: readonly boolean[],
    exact: readonly number[],
  ): AdverseRun {
    const { lines } = this.subject.lowered.kernel;
    const side = new Float64Array(lines.length);
    const at = Float64Array.from(this.names, (name) => point[name]!);
    for (const { line, weight } of this.model.parts(at, direction))
      if (inexact[line]) side[line] = Math.sign(weight);
    const values = new Float64Array(lines.length);
    for (const [k, line] of lines.entries()) {
      const value = lineValue(line, values, (name) => point[name]!);
      values[k] = value + side[k]! * reach(line, value, side[k]!, values);
    }
    const error = this.outputs.map((output, i) => values[output]! - exact[i]!);
    return { values, error, size: Math.hypot(...error) };
  }
}

/** How far a rounding to nearest in float32 may move a result: no further than any number of the format that is there. */
function reach({ operation, args, value }: Line, result: number, side: number, values: Float64Array): number {
  if (side === 0 || value !== 0) return 0;
  const size = Math.abs(result);
  const power = 2 ** Math.floor(Math.log2(size));
  const half = Math.max(power * 2 ** -24, 2 ** -150);
  const toPower = size - power > 0 ? size - power : half;
  const near = Math.min(half, toPower);
  if (operation !== 'add' && operation !== 'sub') return near;
  return Math.min(near, Math.abs(values[args[0]!]!), Math.abs(values[args[1]!]!));
}
