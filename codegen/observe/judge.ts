import { Evaluator } from '../formula/evaluate.ts';
import type { Formula, Output } from '../formula/node.ts';
import { dot, orbitAxes, type Vector } from './axes.ts';
import type { KernelModule } from './module.ts';
import type { Point } from './points.ts';
import { type Screen, screenOf } from './screen.ts';

/** Error of one output group at a point: the length of the error vector, in the group's unit, and its parts. */
export interface GroupError {
  readonly size: number;
  /** Radial, along-track and cross-track parts of a position's error; absent for other groups. */
  readonly parts?: Vector;
}

/** An output and its place among the kernel's outputs. */
interface Member extends Output {
  readonly index: number;
}

/** Time step of the difference quotient that gives the direction of flight, s. */
const STEP = 1;

/** Compares an emitted kernel with its formula at single points. */
export class Judge {
  /** Output groups in the order of the kernel's outputs. */
  readonly groups: readonly string[];
  private readonly members: readonly (readonly Member[])[];
  private readonly evaluator: Evaluator;
  private readonly module: KernelModule;
  private readonly state: Float64Array;
  private readonly out: Float64Array;
  private readonly frameRate: number;
  private readonly formula: Formula;
  private screen: Screen | undefined;
  private readonly screened: Float64Array;

  /**
   * @param formula the model's formula
   * @param module the emitted file, imported
   * @param frameRate rotation rate of the frame of positions, rad/s
   */
  constructor(formula: Formula, module: KernelModule, frameRate: number) {
    this.module = module;
    this.frameRate = frameRate;
    this.evaluator = new Evaluator(formula.outputs.map((output) => output.node));
    this.groups = [...new Set(formula.outputs.map((output) => output.group))];
    const members = formula.outputs.map((output, index) => ({ ...output, index }));
    this.members = this.groups.map((group) => members.filter((member) => member.group === group));
    this.state = new Float64Array(module.stateWords);
    this.out = new Float64Array(formula.outputs.length);
    this.formula = formula;
    this.screened = new Float64Array(formula.outputs.length);
  }

  /** Runs the kernel; returns its status. The outputs stay in `outputs`. */
  run(point: Point): number {
    return this.module.setup(point, this.state) || this.module.position(point['t']!, this.state, this.out);
  }

  /** Outputs of the last run. */
  get outputs(): Readonly<Float64Array> {
    return this.out;
  }

  /**
   * Error of every group at a point.
   *
   * @throws RangeError if the kernel refuses a point of its domain
   */
  errors(point: Point): ReadonlyMap<string, GroupError> {
    this.demand(point);
    this.evaluator.run(point);
    return new Map(
      this.groups.map((group, k) => [group, { size: Math.hypot(...this.differences(this.members[k]!)) }]),
    );
  }

  /** Size of the error of every group against the formula in float64: of float32 kernels, to some digits. */
  roughErrors(point: Point): ReadonlyMap<string, number> {
    this.demand(point);
    const { out, screened } = this;
    this.screen ??= screenOf(this.formula);
    this.screen(point, screened);
    return new Map(
      this.groups.map((group, k) => {
        let sum = 0;
        for (const { index } of this.members[k]!) sum += (out[index]! - screened[index]!) ** 2;
        return [group, Math.sqrt(sum)];
      }),
    );
  }

  /** Errors at a point with the parts of a position's error, which cost three evaluations. */
  parts(point: Point): ReadonlyMap<string, GroupError> {
    const errors = new Map(this.errors(point));
    const members = this.members[this.groups.indexOf('position')];
    if (members?.length !== 3) return errors;
    const vector = this.differences(members) as unknown as Vector;
    const [before, here, after] = [-STEP, 0, STEP].map((step) =>
      this.vector(members, { ...point, t: point['t']! + step }),
    ) as [Vector, Vector, Vector];
    const velocity = here.map((_, k) => (after[k]! - before[k]!) / (2 * STEP)) as unknown as Vector;
    const axes = orbitAxes(here, velocity, this.frameRate);
    errors.set('position', {
      size: errors.get('position')!.size,
      parts: [dot(vector, axes.radial), dot(vector, axes.along), dot(vector, axes.cross)],
    });
    return errors;
  }

  /** Runs the kernel, which must not refuse the point. */
  private demand(point: Point): void {
    const status = this.run(point);
    if (status !== 0) throw new RangeError(`the kernel gives status ${status} at ${JSON.stringify(point)}`);
  }

  private differences(members: readonly Member[]): number[] {
    return members.map((member) => this.evaluator.difference(this.out[member.index]!, member.node));
  }

  private vector(members: readonly Member[], point: Point): Vector {
    this.evaluator.run(point);
    return members.map((member) => this.evaluator.value(member.node).hi) as unknown as Vector;
  }
}
