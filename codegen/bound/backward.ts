import * as interval from '../numbers/interval.ts';
import type { Forward } from './forward.ts';
import type { Entry, NodeFrame, OrbitFrame } from './tape.ts';

/** Rounding of a product and of a sum into a midpoint, relative; it goes to the radius. */
const ULP = 2 ** -52;

/** Registers of the partial derivatives of Kepler's equation. */
const [E, SIN, COS, ECC, SLOPE, RADIAL, TANGENTIAL] = [0, 1, 2, 3, 4, 5, 6] as const;

/**
 * Adjoints of all entries over one box, in midpoint-radius form: how a small error of an entry moves each output.
 * Every entry has `count` of them, one an output. Turns have two kinds: for an error along the radius and for one
 * along the circle, both relative to the turn itself, so that they pass through products of turns unchanged.
 */
export class Backward {
  readonly count: number;
  /** Adjoints of real entries; of turns: to radial errors. Entry k, output i: index k * count + i. */
  readonly mid: Float64Array;
  readonly rad: Float64Array;
  /** Adjoints of turns to tangential errors. */
  readonly midT: Float64Array;
  readonly radT: Float64Array;
  private readonly forward: Forward;
  private readonly work: interval.Intervals = new interval.Intervals(7);

  constructor(forward: Forward) {
    this.forward = forward;
    this.count = forward.tape.outputs.length;
    const n = forward.tape.entries.length * this.count;
    this.mid = new Float64Array(n);
    this.rad = new Float64Array(n);
    this.midT = new Float64Array(n);
    this.radT = new Float64Array(n);
  }

  /** Computes all adjoints from the ranges of the last forward run. */
  run(): void {
    for (const array of [this.mid, this.rad, this.midT, this.radT]) array.fill(0);
    const { entries, outputs, node, orbit } = this.forward.tape;
    if (node !== null && orbit !== null) this.orbitSeeds(node, orbit);
    else for (const [i, output] of outputs.entries()) this.mid[output * this.count + i]! += 1;
    if (node !== null && orbit === null) this.nodeSeeds(node);
    const skipped = node !== null && orbit !== null ? [node.X, node.Y, orbit.y, orbit.Z] : [];
    for (let k = entries.length - 1; k >= 0; k--) if (!skipped.includes(k)) this.step(k, entries[k]!);
  }

  /** In the rotated frame a turn by rho + i tau moves X + i Y to (X + i Y)(1 + rho + i tau). */
  private nodeSeeds({ X, Y, turn }: NodeFrame): void {
    const { lo, hi } = this.forward.value;
    const at = turn * this.count;
    this.seed(this.mid, this.rad, at, lo[X]!, hi[X]!);
    this.seed(this.mid, this.rad, at + 1, lo[Y]!, hi[Y]!);
    this.seed(this.midT, this.radT, at, -hi[Y]!, -lo[Y]!);
    this.seed(this.midT, this.radT, at + 1, lo[X]!, hi[X]!);
  }

  /**
   * Adjoints on the axes of the orbit (radial, along, across), with c, s of u and C, S of i:
   *
   *     r      (1, 0, 0)                       u   radial (r, 0, 0), tangential (0, r, 0)
   *     X      (c, -s, 0)                      y   (s, c, 0)
   *     Y      (C s, C c, -S)                  Z   (S s, S c, C)
   *     i      radial r s (s, c, 0), tangential r s (0, 0, 1)
   *     node   radial r (c c + s s C C, -s c S S, -s C S), tangential r (0, C, -c S)
   */
  private orbitSeeds(node: NodeFrame, orbit: OrbitFrame): void {
    const { value, sine } = this.forward;
    const w = this.work;
    const [r, c, s, C, S] = [0, 1, 2, 3, 4] as const;
    interval.set(w, r, value.lo[orbit.r]!, value.hi[orbit.r]!);
    interval.set(w, c, value.lo[orbit.u]!, value.hi[orbit.u]!);
    interval.set(w, s, sine.lo[orbit.u]!, sine.hi[orbit.u]!);
    interval.set(w, C, value.lo[orbit.i]!, value.hi[orbit.i]!);
    interval.set(w, S, sine.lo[orbit.i]!, sine.hi[orbit.i]!);
    const { mid, rad, midT, radT } = this;
    const put = (
      entry: number,
      axis: number,
      sign: 1 | -1,
      factors: readonly number[],
      tangential = false,
    ) => {
      interval.set(w, 5, sign, sign);
      for (const factor of factors) interval.mul(w, 5, 5, factor);
      this.seed(
        tangential ? midT : mid,
        tangential ? radT : rad,
        entry * this.count + axis,
        w.lo[5]!,
        w.hi[5]!,
      );
    };
    put(orbit.r, 0, 1, []);
    put(orbit.u, 0, 1, [r]);
    put(orbit.u, 1, 1, [r], true);
    put(node.X, 0, 1, [c]);
    put(node.X, 1, -1, [s]);
    put(orbit.y, 0, 1, [s]);
    put(orbit.y, 1, 1, [c]);
    put(node.Y, 0, 1, [C, s]);
    put(node.Y, 1, 1, [C, c]);
    put(node.Y, 2, -1, [S]);
    put(orbit.Z, 0, 1, [S, s]);
    put(orbit.Z, 1, 1, [S, c]);
    put(orbit.Z, 2, 1, [C]);
    put(orbit.i, 0, 1, [r, s, s]);
    put(orbit.i, 1, 1, [r, s, c]);
    put(orbit.i, 2, 1, [r, s], true);
    put(node.turn, 0, 1, [r, c, c]);
    put(node.turn, 0, 1, [r, s, s, C, C]);
    put(node.turn, 1, -1, [r, s, c, S, S]);
    put(node.turn, 2, -1, [r, s, C, S]);
    put(node.turn, 1, 1, [r, C], true);
    put(node.turn, 2, -1, [r, c, S], true);
  }

  private seed(mid: Float64Array, rad: Float64Array, at: number, lo: number, hi: number): void {
    const middle = (lo + hi) / 2;
    mid[at]! += middle;
    rad[at]! += radius(lo, hi, middle);
  }

  private step(k: number, entry: Entry): void {
    const { lo, hi } = this.forward.value;
    switch (entry.kind) {
      case 'input':
      case 'constant':
      case 'leaf':
        return;
      case 'turn':
        return this.toAngle(k, entry.angle);
      case 'product':
        this.pass(k, entry.args[0]);
        this.pass(k, entry.args[1]);
        return;
      case 'rounded-turn':
        return this.pass(k, entry.turn);
      case 'anomaly':
        this.anomaly(k, entry.turn, entry.e, entry.root);
        return this.toPair(k, entry.lines[0], entry.lines[1]);
      case 'pair':
        return this.toPair(k, entry.args[0], entry.args[1]);
      case 'cosine':
      case 'sine':
        return this.component(k, entry.turn, entry.kind === 'cosine');
      case 'offset':
        return this.offset(k, entry.turn, entry.e);
      default: {
        const [a, b = a, x = a, y = a] = entry.args as [number, number?, number?, number?];
        switch (entry.kind) {
          case 'add':
            this.real(k, a, 1, 1);
            return this.real(k, b, 1, 1);
          case 'sub':
            this.real(k, a, 1, 1);
            return this.real(k, b, -1, -1);
          case 'neg':
            return this.real(k, a, -1, -1);
          case 'round':
            return this.real(k, a, 1, 1);
          case 'mul':
            if (a === b) return this.real(k, a, 2 * lo[a]!, 2 * hi[a]!);
            this.real(k, a, lo[b]!, hi[b]!);
            return this.real(k, b, lo[a]!, hi[a]!);
          case 'div':
            return this.quotient(k, a, b);
          case 'sqrt': {
            const [least, most] = [2 * lo[k]!, 2 * hi[k]!];
            return least > 0
              ? this.real(k, a, (1 - 2 * ULP) / most, (1 + 2 * ULP) / least)
              : this.real(k, a, 0, Infinity);
          }
          case 'abs':
            return this.real(
              k,
              a,
              hi[a]! < 0 ? -1 : lo[a]! >= 0 ? 1 : -1,
              lo[a]! > 0 ? 1 : hi[a]! <= 0 ? -1 : 1,
            );
          case 'select':
            if (hi[a]! < lo[b]!) return this.real(k, x, 1, 1);
            if (lo[a]! >= hi[b]!) return this.real(k, y, 1, 1);
            this.real(k, x, 0, 1);
            return this.real(k, y, 0, 1);
          default:
            return; // floor of a known number: nothing moves it
        }
      }
    }
  }

  /** Adds the adjoint of k times a partial derivative in [lo, hi] to that of a real entry. */
  private real(k: number, a: number, lo: number, hi: number): void {
    this.spread(this.mid, this.rad, k, this.mid, this.rad, a, lo, hi);
  }

  private spread(
    mid: Float64Array,
    rad: Float64Array,
    k: number,
    toMid: Float64Array,
    toRad: Float64Array,
    a: number,
    lo: number,
    hi: number,
  ): void {
    const { count } = this;
    const middle = lo === hi ? lo : (lo + hi) / 2;
    const half = lo === hi ? 0 : radius(lo, hi, middle);
    const size = Math.abs(middle) + half;
    for (let i = 0, from = k * count, to = a * count; i < count; i++, from++, to++) {
      const m = mid[from]!;
      const r = rad[from]!;
      if (m === 0 && r === 0) continue;
      const move = m * middle;
      const sum = toMid[to]! + move;
      toMid[to] = sum;
      toRad[to] = toRad[to]! + (Math.abs(m) * half + r * size + (Math.abs(move) + Math.abs(sum)) * ULP);
    }
  }

  /** q = a / b: dq = da / b - q db / b. */
  private quotient(k: number, a: number, b: number): void {
    const { lo, hi } = this.forward.value;
    const [from, to] = [lo[b]!, hi[b]!];
    if (!(from > 0 || to < 0)) {
      this.real(k, a, -Infinity, Infinity);
      return this.real(k, b, -Infinity, Infinity);
    }
    const [least, most] = [1 / to - Math.abs(1 / to) * ULP, 1 / from + Math.abs(1 / from) * ULP];
    this.real(k, a, least, most);
    const ends = [lo[k]! * least, lo[k]! * most, hi[k]! * least, hi[k]! * most];
    const room = Math.max(...ends.map(Math.abs)) * ULP;
    this.real(k, b, -Math.max(...ends) - room, -Math.min(...ends) + room);
  }

  /** An error of a component: along the radius it counts by the component, along the circle by the other one. */
  private component(k: number, turn: number, cosine: boolean): void {
    const { value, sine } = this.forward;
    const [cl, ch, sl, sh] = [value.lo[turn]!, value.hi[turn]!, sine.lo[turn]!, sine.hi[turn]!];
    const { mid, rad, midT, radT } = this;
    this.spread(mid, rad, k, mid, rad, turn, cosine ? cl : sl, cosine ? ch : sh);
    this.spread(mid, rad, k, midT, radT, turn, cosine ? -sh : cl, cosine ? -sl : ch);
  }

  /** The turn of an angle moves along the circle with the angle; a turn next to the circle leaks a little. */
  private toAngle(k: number, angle: number): void {
    const { mid, rad, midT, radT, count } = this;
    const leak = this.leak(k);
    this.spread(midT, radT, k, mid, rad, angle, 1, 1);
    for (let i = 0, from = k * count, to = angle * count; i < count; i++, from++, to++)
      rad[to]! += this.total(from) * leak;
  }

  /**
   * True anomaly from the eccentric one, with d = 1 - e cos E and q = sqrt(1 - e^2), relative to the turns:
   *
   *     rho' = (q/d)^2 rho + e (sin E / d)^2 de + q (sin E / d)^2 dq
   *     tau' = q/d tau - e q sin E / d^2 rho + q sin E / d^2 de + (cos E - e) sin E / d^2 dq
   */
  private anomaly(k: number, turn: number, e: number, root: number): void {
    const { value, sine, deviation } = this.forward;
    const w = this.work;
    const [C, S, ECC, Q, D, T] = [0, 1, 2, 3, 4, 5] as const;
    const room = 4 * deviation[turn]!;
    interval.put(w, C, value.lo[turn]! - room, value.hi[turn]! + room);
    interval.put(w, S, sine.lo[turn]! - room, sine.hi[turn]! + room);
    interval.set(w, ECC, value.lo[e]!, value.hi[e]!);
    interval.set(w, Q, value.lo[root]!, value.hi[root]!);
    interval.mul(w, T, ECC, C);
    interval.set(w, D, 1, 1);
    interval.sub(w, D, D, T);
    interval.div(w, S, S, D); // sin E / d
    interval.sub(w, C, C, ECC);
    interval.div(w, C, C, D); // (cos E - e) / d
    interval.div(w, D, Q, D); // q / d
    const { mid, rad, midT, radT } = this;
    const pass = (fromT: boolean, to: number, toT: boolean, sign: 1 | -1, factors: readonly number[]) => {
      interval.set(w, T, sign, sign);
      for (const factor of factors) interval.mul(w, T, T, factor);
      this.spread(
        fromT ? midT : mid,
        fromT ? radT : rad,
        k,
        toT ? midT : mid,
        toT ? radT : rad,
        to,
        w.lo[T]!,
        w.hi[T]!,
      );
    };
    pass(false, turn, false, 1, [D, D]);
    pass(true, turn, true, 1, [D]);
    pass(true, turn, false, -1, [ECC, D, S]);
    pass(true, e, false, 1, [D, S]);
    pass(false, e, false, 1, [ECC, S, S]);
    pass(true, root, false, 1, [C, S]);
    pass(false, root, false, 1, [Q, S, S]);
    this.leakTo(k, [turn]);
    const leak = this.leak(k) + this.leak(turn);
    const { count } = this;
    for (let i = 0, from = k * count; i < count; i++, from++) {
      const more = this.total(from) * leak * (w.hi[D]! + 2);
      rad[e * count + i]! += more;
      rad[root * count + i]! += more;
    }
  }

  /** Adds the leak of a turn to the adjoints of turns that it is made of. */
  private leakTo(k: number, turns: readonly number[]): void {
    const { rad, radT, count } = this;
    for (const turn of turns) {
      const leak = this.leak(k) + this.leak(turn);
      for (let i = 0, from = k * count, to = turn * count; i < count; i++, from++, to++) {
        const more = this.total(from) * leak;
        rad[to]! += more;
        radT[to]! += more;
      }
    }
  }

  /** A turn that is a pair of numbers: an error of either moves it along the radius and along the circle. */
  private toPair(k: number, cos: number, sin: number): void {
    const { value, sine } = this.forward;
    const [cl, ch, sl, sh] = [value.lo[k]!, value.hi[k]!, sine.lo[k]!, sine.hi[k]!];
    const { mid, rad, midT, radT, count } = this;
    this.spread(mid, rad, k, mid, rad, cos, cl, ch);
    this.spread(midT, radT, k, mid, rad, cos, -sh, -sl);
    this.spread(mid, rad, k, mid, rad, sin, sl, sh);
    this.spread(midT, radT, k, mid, rad, sin, cl, ch);
    const leak = this.leak(k);
    for (let i = 0, from = k * count; i < count; i++, from++) {
      const more = this.total(from) * leak;
      rad[cos * count + i]! += more;
      rad[sin * count + i]! += more;
    }
  }

  /** A factor of a product of turns, or a turn before its rounding: the same relative errors. */
  private pass(k: number, turn: number): void {
    const { mid, rad, midT, radT } = this;
    this.spread(mid, rad, k, mid, rad, turn, 1, 1);
    this.spread(midT, radT, k, midT, radT, turn, 1, 1);
    this.leakTo(k, [turn]);
  }

  private total(at: number): number {
    return Math.abs(this.mid[at]!) + this.rad[at]! + Math.abs(this.midT[at]!) + this.radT[at]!;
  }

  /** Bound on |exact product of the unit turns / computed turn - 1|. */
  private leak(turn: number): number {
    const d = this.forward.deviation[turn]!;
    return d < 0.25 ? 4 * d : Infinity;
  }

  /** D = e sin(M + D): with s = 1 - e cos E, dD = (e sin E rho + e cos E tau + sin E de) / s. */
  private offset(k: number, turn: number, e: number): void {
    const { angle, value, deviation } = this.forward;
    const w = this.work;
    const room = 2 * deviation[turn]!;
    interval.set(w, E, angle.lo[turn]! + value.lo[k]!, angle.hi[turn]! + value.hi[k]!);
    interval.put(w, E, interval.down(w.lo[E]!), interval.up(w.hi[E]!));
    interval.sin(w, SIN, E);
    interval.cos(w, COS, E);
    for (const register of [SIN, COS]) {
      interval.put(w, register, interval.down(w.lo[register]! - room), interval.up(w.hi[register]! + room));
    }
    interval.set(w, ECC, value.lo[e]!, value.hi[e]!);
    interval.set(w, SLOPE, 1, 1);
    interval.mul(w, TANGENTIAL, ECC, COS);
    interval.sub(w, SLOPE, SLOPE, TANGENTIAL);
    interval.mul(w, RADIAL, ECC, SIN);
    for (const register of [TANGENTIAL, RADIAL, SIN]) interval.div(w, register, register, SLOPE);
    const { mid, rad, midT, radT } = this;
    this.real(k, e, w.lo[SIN]!, w.hi[SIN]!);
    this.spread(mid, rad, k, mid, rad, turn, w.lo[RADIAL]!, w.hi[RADIAL]!);
    this.spread(mid, rad, k, midT, radT, turn, w.lo[TANGENTIAL]!, w.hi[TANGENTIAL]!);
  }
}

function radius(lo: number, hi: number, middle: number): number {
  return Math.max(hi - middle, middle - lo) * (1 + 2 * ULP);
}
