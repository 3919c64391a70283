import type { Domain } from '../../src/models/description.ts';
import type { Lowered } from '../lower/lower.ts';
import { Backward } from './backward.ts';
import { KernelBlocks } from './blocks.ts';
import { Builder } from './build.ts';
import { ErrorVector } from './error-vector.ts';
import { Forward } from './forward.ts';
import { TURN_ROOM } from './solver-block.ts';
import type { Tape } from './tape.ts';

/** Angles whose range is wider than this count as wide, rad. */
const WIDE = 0.3;

/** A box: ranges of the variables of a proof. */
export interface Box {
  readonly lo: Float64Array;
  readonly hi: Float64Array;
}

/** The proof of one output group of a kernel: bounds of the error over boxes. */
export class Proof {
  readonly tape: Tape;
  /** Names of the variables: inputs, then angles of turns by the line of their cosine. */
  readonly variables: readonly string[];
  readonly forward: Forward;
  readonly vector: ErrorVector;
  /** Variables whose part the angle of a turn has taken over: they stay at their whole range. */
  readonly replaced: readonly boolean[];
  private readonly domain: Box;
  /** Names of the inputs alone. */
  readonly inputs: readonly string[];
  private readonly backward: Backward;

  /**
   * @param lowered the kernel with its exact formula
   * @param group output group
   * @param blocks local errors of its blocks, shared between groups
   */
  constructor(lowered: Lowered, group: string, blocks: KernelBlocks = new KernelBlocks(lowered)) {
    this.tape = Builder.ofGroup(lowered, blocks, group);
    const names = inputNames(this.tape);
    const whole = new Forward(this.tape, names, []);
    const { lo, hi } = rootBox(lowered, names, 0);
    whole.run(lo, hi);
    const cuts = cutTurns(this.tape, whole);
    this.inputs = names;
    this.variables = [
      ...names,
      ...cuts.map(
        (entry) => `angle of ${lowered.kernel.lines[this.tape.entries[entry]!.line]?.name ?? entry}`,
      ),
    ];
    const replaced = new Set(cuts.flatMap((cut) => replacedInput(this.tape, cut)));
    this.replaced = this.variables.map((name) => replaced.has(name));
    this.forward = new Forward(this.tape, names, cuts);
    this.backward = new Backward(this.forward);
    this.vector = new ErrorVector(this.forward, this.backward);
    this.domain = rootBox(lowered, names, cuts.length);
  }

  /** The whole domain: every input in its range and every angle in the full circle. */
  root(): Box {
    return { lo: this.domain.lo.slice(), hi: this.domain.hi.slice() };
  }

  /** Bound on the length of the error vector over a box; Infinity when nothing can be said. */
  bound(box: Box): number {
    this.evaluate(box);
    const norm = this.vector.norm();
    return Number.isNaN(norm) || !this.roomHolds() ? Infinity : norm;
  }

  /** Bounds on the radial, along-track and cross-track parts of the error over the last box; null without an orbit. */
  axes(): readonly [number, number, number] | null {
    return this.tape.orbit === null ? null : this.vector.axes();
  }

  /** The same at one point, given as values of the inputs by name. */
  boundAt(point: Readonly<Record<string, number>>): number {
    const box = this.root();
    for (const [k, name] of this.inputs.entries()) box.lo[k] = box.hi[k] = point[name]!;
    return this.bound(box);
  }

  /** How far a unit of error in a line moves the outputs, by line, over the last box: for lines with one entry alone. */
  lineAdjoints(): ReadonlyMap<number, number> {
    const { entries } = this.tape;
    const { count, mid } = this.backward;
    const result = new Map<number, number>();
    for (const [k, entry] of entries.entries()) {
      if (entry.line < 0 || !('args' in entry) || !('format' in entry) || entry.kind === 'product') continue;
      if (entries.filter((other) => other.line === entry.line).length > 1) continue;
      result.set(entry.line, Math.hypot(...mid.subarray(k * count, (k + 1) * count)));
    }
    return result;
  }

  /** Collects the terms of the error vector over a box. */
  evaluate(box: Box): void {
    this.forward.run(box.lo, box.hi);
    this.backward.run();
    this.vector.collect();
  }

  /** Whether the turn of every mean anomaly is as near to the unit circle as the table of its solver supposed. */
  private roomHolds(): boolean {
    return this.tape.entries.every((entry) => {
      if (entry.kind !== 'offset' || entry.errors === null) return true;
      return this.forward.deviation[entry.turn]! <= TURN_ROOM[entry.format];
    });
  }
}

function inputNames(tape: Tape): readonly string[] {
  return tape.entries.flatMap((entry) => (entry.kind === 'input' ? [entry.name] : []));
}

/**
 * Turns whose angle becomes a variable of the boxes: those that turn by several wide angles at once, such as a mean
 * anomaly at a time, and whose components something else than products of turns reads. What comes after such a turn
 * depends on its angle alone. An angle that one input gives is split by that input, and E - M by M and e.
 */
function cutTurns(tape: Tape, forward: Forward): readonly number[] {
  const read = new Set<number>();
  for (const entry of tape.entries) {
    if (entry.kind === 'cosine' || entry.kind === 'sine' || entry.kind === 'offset') read.add(entry.turn);
  }
  if (tape.orbit !== null) read.add(tape.orbit.u);
  const cuts: number[] = [];
  const wide = (k: number): number => {
    const entry = tape.entries[k]!;
    if (entry.kind === 'product' && !cuts.includes(k)) return wide(entry.args[0]) + wide(entry.args[1]);
    if (entry.kind === 'rounded-turn') return wide(entry.turn);
    if (entry.kind === 'turn' && tape.entries[entry.angle]!.kind === 'offset') return 0;
    return forward.angle.hi[k]! - forward.angle.lo[k]! > WIDE ? 1 : 0;
  };
  for (const k of [...read].sort((a, b) => a - b)) {
    const entry = tape.entries[k]!;
    const several =
      entry.kind === 'turn' ? wide(k) === 1 && !isInput(tape, forward, entry.angle) : wide(k) > 1;
    if (several) cuts.push(k);
  }
  return cuts;
}

/** Whether an entry is an input, or the rounding of one that stays within a turn: splitting the input splits it. */
function isInput(tape: Tape, forward: Forward, k: number): boolean {
  const entry = tape.entries[k]!;
  if (entry.kind === 'input') return true;
  const within = forward.value.hi[k]! - forward.value.lo[k]! <= 2 * Math.PI;
  return entry.kind === 'round' && within && tape.entries[entry.args[0]!]!.kind === 'input';
}

/** The input whose angle goes into a turn as it is: given the turn's own angle and the other inputs, it says no more. */
function replacedInput(tape: Tape, k: number): readonly string[] {
  const entry = tape.entries[k]!;
  switch (entry.kind) {
    case 'input':
      return [entry.name];
    case 'product':
      return entry.args.flatMap((arg) => replacedInput(tape, arg)).slice(0, 1);
    case 'rounded-turn':
      return replacedInput(tape, entry.turn);
    case 'turn':
      return entry.errors?.periodic ? replacedInput(tape, entry.angle) : [];
    case 'add':
    case 'round':
      return entry.args.flatMap((arg) => replacedInput(tape, arg)).slice(0, 1);
    default:
      return [];
  }
}

function rootBox(lowered: Lowered, names: readonly string[], cuts: number): Box {
  const { domain, choices } = lowered.kernel;
  const ranges = names.map((name) =>
    widened(domain, name, choices[name === 't' ? 'tick' : 'setup'] === 'f32'),
  );
  return {
    lo: Float64Array.from([...ranges.map(([lo]) => lo), ...Array(cuts).fill(-Math.PI - 1e-9)]),
    hi: Float64Array.from([...ranges.map(([, hi]) => hi), ...Array(cuts).fill(Math.PI + 1e-9)]),
  };
}

/** A float32 stage checks the rounded value against the rounded range: what passes lies in the range or half a unit beside it. */
function widened(domain: Domain, name: string, float32: boolean): readonly [number, number] {
  const { min, max } = domain[name]!;
  if (!float32) return [min, max];
  const room = (x: number) => Math.abs(Math.fround(x)) * 2 ** -24 + 2 ** -149;
  return [Math.fround(min) - room(min), Math.fround(max) + room(max)];
}
