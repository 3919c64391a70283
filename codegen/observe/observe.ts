import type { Domain } from '../../src/models/description.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { Random } from '../numbers/random.ts';
import { Alignment } from './alignment.ts';
import { type Candidate, Evolution, keep } from './evolve.ts';
import type { Judge } from './judge.ts';
import { type Point, Points } from './points.ts';
import { RoundingModel } from './rounding-model.ts';

/** How hard to look for the worst error. The same effort gives the same answer. */
export interface Effort {
  /** Points drawn over the whole domain. */
  readonly points: number;
  /** Places at which the roundings of lines are aligned, and points drawn there for every group of inputs. */
  readonly places: number;
  readonly draws: number;
  /** Points that are raised together: the worst of those seen. */
  readonly pool: number;
  /** Steps by which they are raised, in all. */
  readonly steps: number;
  readonly seed: number;
}

/** The effort behind every observed figure of a certificate. */
export const FULL_EFFORT: Effort = {
  points: 20_000,
  places: 5,
  draws: 40_000,
  pool: 32,
  steps: 60_000,
  seed: 1,
};

/** Errors of float32 kernels are found by the formula in float64, which is so much cheaper: as many more points and steps. */
const SCREENED = 16;

/** The largest error seen in an output group and the input that gives it. */
export interface Observed {
  readonly group: string;
  readonly size: number;
  readonly at: Point;
  /** Largest radial, along-track and cross-track parts at the worst points; null for groups that are no position. */
  readonly parts: readonly [number, number, number] | null;
  /** The worst points, worst first. */
  readonly worst: readonly Worst[];
}

/** An error and the input that gives it. */
export interface Worst {
  readonly size: number;
  readonly point: Point;
}

/** Worst points that are kept. */
const KEPT = 4;

/**
 * Looks for the largest error of a kernel over a domain: points drawn at random, points at which the roundings of its lines
 * add up, and from the worst of them steps of all sizes, from half of each range down to the last bits. What is reported
 * is judged by the formula in double-double arithmetic.
 *
 * @param judge the emitted kernel and its formula
 * @param kernel its lines
 * @param domain ranges of the inputs
 * @param names inputs that the formula uses
 * @param effort how hard to look
 * @param progress told the share done, from 0 to 1
 */
export function observe(
  judge: Judge,
  kernel: Kernel,
  domain: Domain,
  names: readonly string[],
  effort: Effort,
  progress: (share: number) => void = () => {},
): readonly Observed[] {
  const search = new Search(judge, kernel, domain, names, effort, progress);
  return judge.groups.map((group) => search.worst(group));
}

class Search {
  private readonly judge: Judge;
  private readonly kernel: Kernel;
  private readonly domain: Domain;
  private readonly names: readonly string[];
  private readonly effort: Effort;
  private readonly random: Random;
  private readonly more: number;
  /** The point that is measured, by name. */
  private readonly point: Record<string, number> = {};
  private readonly progress: (share: number) => void;
  private readonly work: number;
  private done = 0;

  constructor(
    judge: Judge,
    kernel: Kernel,
    domain: Domain,
    names: readonly string[],
    effort: Effort,
    progress: (share: number) => void,
  ) {
    this.judge = judge;
    this.kernel = kernel;
    this.domain = domain;
    this.names = names;
    this.effort = effort;
    this.random = new Random(effort.seed);
    this.more = kernel.choices.tick === 'f32' ? SCREENED : 1;
    this.progress = progress;
    const { points, places, draws, steps } = effort;
    this.work = judge.groups.length * (this.more * (points + steps) + places * draws * names.length);
  }

  /** The largest error of a group that can be found. */
  worst(group: string): Observed {
    const { judge, domain, names, effort } = this;
    const error = (values: Float64Array) => judge.errors(this.at(values)).get(group)!.size;
    const measure =
      this.more === 1 ? error : (values: Float64Array) => judge.roughErrors(this.at(values)).get(group)!;
    const pool = this.drawn(measure);
    for (const values of this.aligned(group)) keep(pool, { values, size: measure(values) }, effort.pool);
    const evolution = new Evolution(names, domain, measure, this.random);
    const raised = evolution.run(pool, effort.steps * this.more, this.tick);
    const judged = raised
      .map(({ values }): Worst => ({ size: error(values), point: { ...this.at(values) } }))
      .sort((a, b) => b.size - a.size);
    const [top] = judged as [Worst, ...Worst[]];
    return {
      group,
      size: top.size,
      at: top.point,
      parts: largestParts(judge, group, judged),
      worst: judged.slice(0, KEPT),
    };
  }

  private drawn(measure: (values: Float64Array) => number): Candidate[] {
    const { effort } = this;
    const points = new Points(this.domain, this.names, this.random);
    const pool: Candidate[] = [];
    for (let k = 0; k < effort.points * this.more; k++, this.tick()) {
      const point = points.draw();
      const values = Float64Array.from(this.names, (name) => point[name]!);
      keep(pool, { values, size: measure(values) }, effort.pool);
    }
    return pool;
  }

  /** Points at which the roundings of the lines of a group's outputs add up. */
  private aligned(group: string): readonly Float64Array[] {
    const { kernel, names, domain, effort, random } = this;
    if (effort.places === 0) return [];
    const outputs = kernel.outputs.filter((output) => output.group === group).map((output) => output.line);
    const model = new RoundingModel(kernel, names, outputs);
    return new Alignment(model, names, domain, outputs.length, random).points(effort, this.tick);
  }

  private at(values: Float64Array): Point {
    for (const [k, name] of this.names.entries()) this.point[name] = values[k]!;
    return this.point;
  }

  private readonly tick = (): void => {
    this.done++;
    if (this.done % 1000 === 0) this.progress(Math.min(1, this.done / this.work));
  };
}

function largestParts(judge: Judge, group: string, list: readonly Worst[]): Observed['parts'] {
  let largest: [number, number, number] | null = null;
  for (const { point } of list) {
    const parts = judge.parts(point).get(group)!.parts;
    if (parts === undefined) return null;
    const sizes = parts.map(Math.abs) as [number, number, number];
    largest =
      largest === null
        ? sizes
        : (largest.map((part, k) => Math.max(part, sizes[k]!)) as [number, number, number]);
  }
  return largest;
}
