import type { Backward } from './backward.ts';
import type { Forward } from './forward.ts';
import { freeTurns } from './free-turns.ts';
import { sphereMaximum } from './norm.ts';
import { rotationRounding } from './rotation-rounding.ts';
import type { Entry } from './tape.ts';

/** Rounding of all sums below, relative. */
const SLACK = 1 + 2 ** -36;

/** Turns whose angle is known less well than this take the worst angle in closed form. */
const WIDE_ANGLE = 0.4;

/**
 * The error vector of a tape's outputs over one box, as a sum of local errors times adjoints. The norm of its worst
 * case is bounded through its support function: |error| = max over directions w of sum |w . adjoint| local error.
 */
export class ErrorVector {
  private readonly forward: Forward;
  private readonly backward: Backward;
  private readonly count: number;
  /** Midpoint vectors of the terms, scaled by their local errors; three numbers a term. */
  private readonly terms: Float64Array;
  /** Entry of the tape that each term belongs to. */
  readonly owners: Int32Array;
  private size = 0;
  /** Terms of turns at unknown angles: radial and tangential vectors, six numbers a term. */
  private readonly pairs: Float64Array;
  private readonly pairOwners: Int32Array;
  private pairSize = 0;
  /** Sum of the radii of all terms, by output. */
  private readonly rest = new Float64Array(3);
  /** Error of the rotation's own lines: the same in all directions. */
  private ball = 0;
  /** By entry: another entry of the same line, whose adjoint counts with this one; -1 for none, -2 for such another. */
  private readonly twins: Int32Array;
  /** Turns about the third axis: nothing else depends on their angle, which may be any. */
  private readonly free: readonly boolean[];

  constructor(forward: Forward, backward: Backward) {
    this.forward = forward;
    this.backward = backward;
    this.count = backward.count;
    const n = forward.tape.entries.length;
    this.terms = new Float64Array(6 * n);
    this.owners = new Int32Array(2 * n);
    this.pairs = new Float64Array(6 * n);
    this.pairOwners = new Int32Array(n);
    this.twins = twinsOf(forward.tape.entries);
    this.free = freeTurns(forward.tape);
  }

  /** Collects the terms after a forward and a backward run. */
  collect(): void {
    this.size = 0;
    this.pairSize = 0;
    this.rest.fill(0);
    const { entries } = this.forward.tape;
    for (let k = 0; k < entries.length; k++) {
      const kind = entries[k]!.kind;
      if (
        kind === 'turn' ||
        kind === 'product' ||
        kind === 'rounded-turn' ||
        kind === 'pair' ||
        kind === 'anomaly'
      )
        this.collectTurn(k);
      else if (this.forward.local[k]! !== 0 && this.twins[k] !== -2)
        this.collectReal(k, this.forward.local[k]!);
    }
    this.ball = this.rotationError();
  }

  private collectReal(k: number, local: number): void {
    const { mid, rad } = this.backward;
    const { count } = this;
    const at = 3 * this.size;
    const twin = this.twins[k]!;
    for (let i = 0; i < count; i++) {
      const other = twin < 0 ? -1 : twin * count + i;
      this.terms[at + i] = (mid[k * count + i]! + (other < 0 ? 0 : mid[other]!)) * local;
      this.rest[i]! += (rad[k * count + i]! + (other < 0 ? 0 : rad[other]!)) * local;
    }
    this.owners[this.size++] = k;
  }

  /**
   * An error a of the cosine moves the turn by a cos along the radius and by -a sin along the circle; one of the sine
   * by a sin and a cos.
   */
  private collectTurn(k: number): void {
    const { local, localSine, localBoth, angle, value, sine, deviation } = this.forward;
    const [a, b] = [local[k]!, localSine[k]!];
    if (a === 0 && b === 0) return;
    const grow = 1 + 4 * deviation[k]!;
    if (this.free[k] || angle.hi[k]! - angle.lo[k]! > WIDE_ANGLE)
      return this.collectPair(k, localBoth[k]! * grow);
    this.collectComponent(k, a * grow, value.lo[k]!, value.hi[k]!, -sine.hi[k]!, -sine.lo[k]!);
    this.collectComponent(k, b * grow, sine.lo[k]!, sine.hi[k]!, value.lo[k]!, value.hi[k]!);
  }

  private collectComponent(k: number, local: number, rl: number, rh: number, tl: number, th: number): void {
    const { mid, rad, midT, radT } = this.backward;
    const { count } = this;
    const [r, t] = [(rl + rh) / 2, (tl + th) / 2];
    const [dr, dt] = [(rh - rl) / 2, (th - tl) / 2];
    const at = 3 * this.size;
    for (let i = 0; i < count; i++) {
      const j = k * count + i;
      this.terms[at + i] = (mid[j]! * r + midT[j]! * t) * local;
      const spread =
        Math.abs(mid[j]!) * dr +
        rad[j]! * (Math.abs(r) + dr) +
        Math.abs(midT[j]!) * dt +
        radT[j]! * (Math.abs(t) + dt);
      this.rest[i]! += spread * local;
    }
    this.owners[this.size++] = k;
  }

  /** Over all angles, |A cos - B sin| a + |A sin + B cos| b is at most sqrt(A^2 + B^2) sqrt(a^2 + b^2). */
  private collectPair(k: number, local: number): void {
    const { mid, rad, midT, radT } = this.backward;
    const { count } = this;
    const at = 6 * this.pairSize;
    for (let i = 0; i < count; i++) {
      const j = k * count + i;
      this.pairs[at + i] = mid[j]! * local;
      this.pairs[at + 3 + i] = midT[j]! * local;
      this.rest[i]! += Math.hypot(rad[j]!, radT[j]!) * local;
    }
    this.pairOwners[this.pairSize++] = k;
  }

  /** The lines that rotate X + i Y: two products and a sum for each output, in the frame of the turn. */
  private rotationError(): number {
    const { node } = this.forward.tape;
    if (node === null) return 0;
    const { value, deviation } = this.forward;
    const range = (k: number) => ({ lo: value.lo[k]!, hi: value.hi[k]! });
    return rotationRounding(range(node.X), range(node.Y), deviation[node.turn]!, node.format);
  }

  /** Support function: the largest error in a direction, for a direction of the length 1. */
  support(w: readonly number[]): number {
    let sum = this.ball;
    const [w0, w1 = 0, w2 = 0] = w as [number, number?, number?];
    const { terms, pairs } = this;
    for (let k = 0, at = 0; k < this.size; k++, at += 3)
      sum += Math.abs(w0 * terms[at]! + w1 * terms[at + 1]! + w2 * terms[at + 2]!);
    for (let k = 0, at = 0; k < this.pairSize; k++, at += 6) {
      const p = w0 * pairs[at]! + w1 * pairs[at + 1]! + w2 * pairs[at + 2]!;
      const q = w0 * pairs[at + 3]! + w1 * pairs[at + 4]! + w2 * pairs[at + 5]!;
      sum += Math.sqrt(p * p + q * q);
    }
    const { rest } = this;
    return (sum + Math.abs(w0) * rest[0]! + Math.abs(w1) * rest[1]! + Math.abs(w2) * rest[2]!) * SLACK;
  }

  /** Share of each entry of the tape in the bound for one direction; the rest (radii, rotation) comes last. */
  shares(w: readonly number[]): Float64Array {
    const { terms, pairs, owners, pairOwners } = this;
    const [w0, w1 = 0, w2 = 0] = w as [number, number?, number?];
    const n = this.forward.tape.entries.length;
    const parts = new Float64Array(n + 1);
    for (let k = 0, at = 0; k < this.size; k++, at += 3) {
      parts[owners[k]!]! += Math.abs(w0 * terms[at]! + w1 * terms[at + 1]! + w2 * terms[at + 2]!);
    }
    for (let k = 0, at = 0; k < this.pairSize; k++, at += 6) {
      const p = w0 * pairs[at]! + w1 * pairs[at + 1]! + w2 * pairs[at + 2]!;
      const q = w0 * pairs[at + 3]! + w1 * pairs[at + 4]! + w2 * pairs[at + 5]!;
      parts[pairOwners[k]!]! += Math.sqrt(p * p + q * q);
    }
    const { rest } = this;
    parts[n] = this.ball + Math.abs(w0) * rest[0]! + Math.abs(w1) * rest[1]! + Math.abs(w2) * rest[2]!;
    const whole = parts.reduce((a, b) => a + b, 0);
    return parts.map((part) => part / whole);
  }

  /** A direction in which the error can be largest. */
  worstDirection(): readonly number[] {
    return this.count === 1 ? [1] : sphereMaximum((direction) => this.support(direction)).direction;
  }

  /** Bound on the length of the error vector. */
  norm(): number {
    if (this.count === 1) return this.support([1]);
    return sphereMaximum((direction) => this.support(direction)).bound * this.frameGrowth() * SLACK;
  }

  /** Bounds on the parts of the error along the three axes. */
  axes(): readonly [number, number, number] {
    const grow = this.frameGrowth() * SLACK;
    return [this.support([1, 0, 0]) * grow, this.support([0, 1, 0]) * grow, this.support([0, 0, 1]) * grow];
  }

  /** How much a turn off the unit circle can lengthen what it rotates. */
  private frameGrowth(): number {
    const { node, orbit } = this.forward.tape;
    const { deviation } = this.forward;
    const off =
      (node === null ? 0 : deviation[node.turn]!) +
      (orbit === null ? 0 : deviation[orbit.u]! + deviation[orbit.i]!);
    return 1 + 4 * off;
  }
}

/** Entries of one line: its error is one, however many entries it has. */
function twinsOf(entries: readonly Entry[]): Int32Array {
  const twins = new Int32Array(entries.length).fill(-1);
  const first = new Map<number, number>();
  for (const [k, entry] of entries.entries()) {
    if (entry.line < 0 || !('format' in entry) || entry.kind === 'product' || entry.kind === 'offset')
      continue;
    const known = first.get(entry.line);
    if (known === undefined) first.set(entry.line, k);
    else if (twins[known] === -1) {
      twins[known] = k;
      twins[k] = -2;
    }
  }
  return twins;
}
