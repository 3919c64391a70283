import type { Box, Proof } from '../../../codegen/bound/proof.ts';
import { Evaluator } from '../../../codegen/formula/evaluate.ts';
import type { Node } from '../../../codegen/formula/node.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import { dot, orbitAxes, type Vector } from '../../../codegen/observe/axes.ts';
import { type Point, Points } from '../../../codegen/observe/points.ts';
import type { Analysis } from '../faulty.ts';
import { runLines, type Subject, subject } from '../lines.ts';
import { smallSubject } from '../small-models.ts';
import { Adversary } from './adversary.ts';
import { uncovered } from './coverage.ts';
import { demand, Shares } from './demand.ts';

/** A kernel that the proof is tried on as a whole, and how near adverse roundings come to its bounds. */
interface Whole {
  readonly subject: Subject;
  readonly group: string;
  readonly reach: number;
}

const FLOAT32 = { setup: 'f32', tick: 'f32' } as const;

let made: readonly Whole[] | undefined;

function wholes(): readonly Whole[] {
  made ??= [
    {
      // no chain of rotations on its own: two radii
      subject: smallSubject(
        {
          name: 'ellipse',
          body: `
            const X = a * Math.cos(u + t);
            const y = b * Math.sin(u + t);`,
          returns: `{
            x: X * Math.cos(N) - y * Math.cos(i) * Math.sin(N),
            y: X * Math.sin(N) + y * Math.cos(i) * Math.cos(N),
            z: y * Math.sin(i) }`,
          ranges: { a: [3, 4], b: [1, 2], u: [-3.1, 3.1], i: [0.2, 1.3], N: [-Math.PI, Math.PI], t: [-1, 1] },
        },
        FLOAT32,
      ),
      group: 'position',
      reach: 0.9,
    },
    {
      subject: smallSubject(
        {
          name: 'quotient',
          body: 'const v = (a * t + b) * 0.3;',
          returns: 'Math.sqrt(v) / (v - a / b) + v * v * 0.5 + t',
          ranges: { a: [1, 2], b: [11, 13], t: [-2, 3] },
        },
        FLOAT32,
      ),
      group: 'value',
      reach: 0.95,
    },
    { subject: subject('earth-orbit', 'near-circular', { tick: 'f32' }), group: 'position', reach: 0.93 },
    { subject: subject('gps-lnav', 'flown', { ...FLOAT32, cap: 1 }), group: 'position', reach: 0.95 },
    { subject: subject('gps-lnav', 'flown', { tick: 'f32', cap: 1 }), group: 'position', reach: 0.85 },
  ];
  return made;
}

/** The whole proof of every kernel; one check a kernel. */
export const WHOLES: readonly ((analysis: Analysis) => void)[] = [0, 1, 2, 3, 4].map((k) => (analysis) => {
  const whole = wholes()[k]!;
  const proof = new analysis.Proof(
    whole.subject.lowered,
    whole.group,
    new analysis.KernelBlocks(whole.subject.lowered),
  );
  adverse(analysis, whole, proof);
});

function adverse(analysis: Analysis, { subject: own, group, reach }: Whole, proof: Proof): void {
  const { lowered, task, name } = own;
  const missing = uncovered(lowered.kernel, proof.tape, group);
  demand(missing.length === 0, () => `${name}: lines without a part in the proof: ${missing.join(', ')}`);
  const names = task.formula.inputs.map((input) => input.name);
  demand(holdsDomain(own, proof), () => `${name}: the root box does not hold the domain`);
  const adversary = new Adversary(own, group);
  const ranges = new RangeCheck(own, proof);
  const random = new Random(111);
  const points = new Points(task.domain, names, random);
  const certified = analysis.subdivide(proof, { boxes: 400 });
  const shares = new Shares();
  const lines = analysis.lineRanges(lowered.kernel, new Map());
  for (let k = 0; k < 60; k++) {
    const point = points.draw();
    const run = adversary.worst(point);
    const what = () => `${name} at ${JSON.stringify(point)}`;
    const bound = proof.boundAt(point);
    shares.add(run.size, bound, what);
    ranges.check(point, run.values, proof, what);
    const axes = proof.axes();
    if (axes !== null) partsWithin(own, point, run.error as Vector, axes, what);
    const box = around(proof, point, random);
    const wide = proof.bound(box);
    ranges.check(point, run.values, proof, what);
    demand(bound <= wide * (1 + 1e-12), () => `${what()}: a box gives ${wide}, a point of it ${bound}`);
    demand(bound <= certified.bound * (1 + 1e-12), () => `${what()}: ${bound} is above ${certified.bound}`);
    demand(run.size <= wide, () => `${what()}: the error ${run.size} is above the bound ${wide} of a box`);
    const values = runLines(lowered.kernel, point);
    for (const [line, { lo, hi }] of lines.entries())
      demand(lo <= values[line]! && values[line]! <= hi, () => `${what()}: line ${line} leaves its range`);
  }
  shares.reach(reach, name);
}

/** What a certificate says of a kernel: its bound, points, and the ranges of its lines. */
export function certification(analysis: Analysis): void {
  for (const { subject: own, group } of wholes().slice(0, 2)) {
    const { lowered, task } = own;
    const found = analysis.certify(lowered, { boxes: 300 })[0]!;
    const adversary = new Adversary(own, group);
    const names = task.formula.inputs.map((input) => input.name);
    const points = new Points(task.domain, names, new Random(112));
    demand(found.limit <= found.bound, () => `${own.name}: a point gives ${found.limit}, all ${found.bound}`);
    for (const point of found.points)
      for (const name of names) {
        const { min, max } = task.domain[name]!;
        demand(min <= point[name]! && point[name]! <= max, () => `${own.name}: ${name} outside its range`);
      }
    const proof = new analysis.Proof(lowered, group);
    const kept = found.points.map((point) => proof.boundAt(point));
    demand(
      Math.max(...kept) === found.limit,
      () => `${own.name}: the points kept give ${kept}, the limit is ${found.limit}`,
    );
    for (let k = 0; k < 60; k++) {
      const { values, size } = adversary.worst(points.draw());
      demand(size <= found.bound, () => `${own.name}: an error of ${size} is above ${found.bound}`);
      for (const [line, { lo, hi }] of found.ranges)
        demand(
          lo <= values[line]! && values[line]! <= hi,
          () => `${own.name}: line ${line} is ${values[line]}, outside ${lo}, ${hi}`,
        );
    }
  }
}

/** Every input that a kernel accepts lies in the root box: of float32, what rounds to a number of the range. */
function holdsDomain({ lowered, task }: Subject, proof: Proof): boolean {
  const { lo, hi } = proof.root();
  const { choices } = lowered.kernel;
  return proof.variables.every((name, k) => {
    if (!proof.inputs.includes(name)) return lo[k]! <= -Math.PI && hi[k]! >= Math.PI;
    const { min, max } = task.domain[name]!;
    if (choices[name === 't' ? 'tick' : 'setup'] === 'f64') return lo[k]! <= min && max <= hi[k]!;
    const [least, most] = [Math.fround(min), Math.fround(max)];
    const half = (x: number) => 2 ** (Math.floor(Math.log2(Math.abs(x))) - 24) * 0.499;
    return lo[k]! <= least - half(least) && most + half(most) <= hi[k]!;
  });
}

/** A small box about a point; angles of turns keep the whole circle. */
function around(proof: Proof, point: Point, random: Random): Box {
  const box = proof.root();
  const share = 10 ** (-1 - 3 * random.next());
  for (const [k, name] of proof.inputs.entries()) {
    const half = (box.hi[k]! - box.lo[k]!) * share;
    box.lo[k] = Math.max(box.lo[k]!, point[name]! - half * random.next());
    box.hi[k] = Math.min(box.hi[k]!, point[name]! + half * random.next());
  }
  return box;
}

/** The parts of an error along the radius, the motion and across are within their bounds. */
function partsWithin(
  { task }: Subject,
  point: Point,
  error: Vector,
  bounds: readonly [number, number, number],
  what: () => string,
): void {
  const evaluator = new Evaluator(task.formula.outputs.map((output) => output.node));
  const at = (t: number): Vector => {
    evaluator.run({ ...point, t });
    return task.formula.outputs.map((output) => evaluator.value(output.node).hi) as unknown as Vector;
  };
  const t = point['t']!;
  const [before, here, after] = [at(t - 0.5), at(t), at(t + 0.5)];
  const velocity = here.map((_, k) => after[k]! - before[k]!) as unknown as Vector;
  const { radial, along, cross } = orbitAxes(here, velocity, task.model.frameRate);
  const size = Math.hypot(...error);
  for (const [k, axis] of [radial, along, cross].entries())
    demand(
      Math.abs(dot(error, axis)) <= bounds[k]! + 1e-6 * size,
      () => `${what()}: the part ${dot(error, axis)} is above ${bounds[k]}`,
    );
}

/** Ranges and running errors of a proof's entries against the values of lines, computed and exact. */
class RangeCheck {
  private readonly evaluator: Evaluator;
  private readonly nodes = new Map<number, Node>();

  constructor({ lowered }: Subject, proof: Proof) {
    const used = new Set(
      proof.tape.entries.flatMap((entry) =>
        'sinLine' in entry ? [entry.line, entry.sinLine] : [entry.line],
      ),
    );
    for (const [node, line] of lowered.lineOf) if (used.has(line)) this.nodes.set(line, node);
    this.evaluator = new Evaluator([...this.nodes.values()]);
  }

  /** After the proof was evaluated over a box that holds the point. */
  check(point: Point, values: Float64Array, proof: Proof, what: () => string): void {
    this.evaluator.run(point);
    const { value, sine, error, deviation, angle } = proof.forward;
    for (const [k, entry] of proof.tape.entries.entries()) {
      if (entry.kind === 'leaf' || entry.kind === 'anomaly' || entry.kind === 'pair') continue;
      const node = this.nodes.get(entry.line);
      if (node === undefined) continue;
      const isTurn = 'sinLine' in entry;
      const exact = this.evaluator.value(node).hi;
      const found = values[entry.line]!;
      // angles about the third axis may be any: their ranges are the whole circle
      for (const x of [exact, found])
        demand(
          value.lo[k]! <= x && x <= value.hi[k]!,
          () => `${what()}: ${entry.kind} ${entry.line} is ${x}, outside ${value.lo[k]}, ${value.hi[k]}`,
        );
      const room = isTurn ? error[k]! + deviation[k]! : error[k]!;
      demand(
        Math.abs(found - exact) <= room * (1 + 1e-9) + 1e-14 * Math.abs(exact),
        () => `${what()}: ${entry.kind} ${entry.line} is off by ${found - exact}, above ${room}`,
      );
      if (!isTurn || entry.sinLine < 0) continue;
      demand(
        sine.lo[k]! <= values[entry.sinLine]! && values[entry.sinLine]! <= sine.hi[k]!,
        () => `${what()}: the sine of turn ${entry.line} leaves its range`,
      );
      const sinNode = this.nodes.get(entry.sinLine);
      if (sinNode === undefined) continue;
      const turns = Math.atan2(this.evaluator.value(sinNode).hi, exact);
      const [lo, hi] = [angle.lo[k]!, angle.hi[k]!];
      const whole = Math.ceil((lo - 1e-12 - turns) / (2 * Math.PI)) * 2 * Math.PI;
      demand(
        turns + whole <= hi + 1e-12,
        () => `${what()}: the angle ${turns} of turn ${entry.line} is outside ${lo}, ${hi}`,
      );
    }
  }
}
