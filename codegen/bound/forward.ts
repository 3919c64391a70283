import * as interval from '../numbers/interval.ts';
import { freeTurns } from './free-turns.ts';
import { ProductRounding } from './product-rounding.ts';
import { RealRanges, SLACK } from './real-ranges.ts';
import { halfUnit } from './rounding.ts';
import type { Entry, SineErrors, Tape } from './tape.ts';

/** More than half a turn: an angle that may be any. */
const WHOLE = 3.2;

/**
 * Ranges and local errors of all entries of a tape over one box.
 *
 * A range holds every value that the entry can take between the exact evaluation and the computed one: it is widened by
 * the entry's own error, so what it is made from has been widened before. A turn has a range of angles and a deviation:
 * the computed point lies within that distance of a point of the unit circle at one of the angles.
 */
export class Forward extends RealRanges {
  readonly tape: Tape;
  /** Ranges of the sines of turns. */
  readonly sine: interval.Intervals;
  /** Ranges of the angles of turns. */
  readonly angle: interval.Intervals;
  /** Local error of the sine of turns. */
  readonly localSine: Float64Array;
  /** Length of both local errors of turns at once: no more than that of the two together. */
  readonly localBoth: Float64Array;
  /** Distance of the computed point of a turn from the unit circle at its angle. */
  readonly deviation: Float64Array;
  private readonly work: interval.Intervals;
  private readonly names: ReadonlyMap<string, number>;
  private readonly cutOf: ReadonlyMap<number, number>;
  private readonly refinable: readonly boolean[];
  private readonly free: readonly boolean[];

  /**
   * @param tape the analysis
   * @param variables names of the variables of a box: inputs by name
   * @param cuts entries of turns whose angle is a variable of a box too, after the inputs
   */
  constructor(tape: Tape, variables: readonly string[], cuts: readonly number[]) {
    const n = tape.entries.length;
    super(n);
    this.tape = tape;
    this.sine = new interval.Intervals(n);
    this.angle = new interval.Intervals(n);
    this.localSine = new Float64Array(n);
    this.localBoth = new Float64Array(n);
    this.deviation = new Float64Array(n);
    this.work = new interval.Intervals(8);
    this.names = new Map(variables.map((name, index) => [name, index]));
    this.cutOf = new Map(cuts.map((entry, index) => [entry, variables.length + index]));
    this.free = freeTurns(tape);
    const used = new Set(
      tape.entries.flatMap((entry) => (entry.kind === 'cosine' || entry.kind === 'sine' ? [entry.turn] : [])),
    );
    this.refinable = tape.entries.map(
      (entry, index) => entry.kind === 'turn' && entry.errors?.periodic === true && !used.has(index),
    );
  }

  /**
   * Evaluates all entries over a box.
   *
   * @param lo lower ends of the variables
   * @param hi upper ends
   */
  run(lo: Float64Array, hi: Float64Array): void {
    const { entries } = this.tape;
    for (let k = 0; k < entries.length; k++) this.step(k, entries[k]!, lo, hi);
  }

  private step(k: number, entry: Entry, lo: Float64Array, hi: Float64Array): void {
    switch (entry.kind) {
      case 'input': {
        const variable = this.names.get(entry.name);
        if (variable === undefined) throw new RangeError(`a box has no range for ${entry.name}`);
        interval.set(this.value, k, lo[variable]!, hi[variable]!);
        this.local[k] = 0;
        this.error[k] = 0;
        return;
      }
      case 'constant':
        interval.set(this.value, k, entry.value, entry.value);
        this.finish(k, entry.error, 0);
        return;
      case 'turn':
        this.turn(k, entry, lo, hi);
        return;
      case 'product':
        this.product(k, entry, lo, hi);
        return;
      case 'pair':
        this.pair(k, entry.args[0], entry.args[1]);
        return;
      case 'leaf': {
        const from = entry.component === 'value' ? this.value : this.sine;
        interval.set(this.value, k, from.lo[entry.of]!, from.hi[entry.of]!);
        this.local[k] = 0;
        this.error[k] = (this.error[entry.of]! + this.deviation[entry.of]!) * SLACK;
        return;
      }
      case 'anomaly':
        this.anomaly(k, entry.turn, entry.e, entry.root);
        return;
      case 'rounded-turn':
        this.roundedTurn(k, entry.turn);
        return;
      case 'cosine':
      case 'sine':
        this.component(k, entry);
        return;
      case 'offset':
        this.offset(k, entry);
        return;
      default:
        this.real(k, entry);
    }
  }

  private turn(k: number, entry: Extract<Entry, { kind: 'turn' }>, lo: Float64Array, hi: Float64Array): void {
    const angle = entry.angle;
    this.error[k] = this.error[angle]!;
    this.setAngle(k, this.value.lo[angle]!, this.value.hi[angle]!);
    this.applyCut(k, lo, hi);
    const [from, to] = [this.angle.lo[k]!, this.angle.hi[k]!];
    this.setTurn(k, entry.errors, from, to);
    this.components(k);
  }

  private product(
    k: number,
    entry: Extract<Entry, { kind: 'product' }>,
    lo: Float64Array,
    hi: Float64Array,
  ): void {
    const [a, b] = entry.args;
    this.error[k] = (this.error[a]! + this.error[b]!) * SLACK;
    interval.add(this.angle, k, a, b);
    if (this.free[k]) this.setAngle(k, 0, 0);
    if (this.applyCut(k, lo, hi)) {
      this.refine(a, b, k);
      this.refine(b, a, k);
    }
    const format = entry.format;
    const carried = this.deviation[a]! + this.deviation[b]! + this.deviation[a]! * this.deviation[b]!;
    if (entry.errors !== null) {
      const { reads } = entry.errors;
      const from = (component: 'value' | 'sine') => (component === 'value' ? this.value : this.sine);
      const [cos, sin] = entry.errors.errors(
        reads.map(({ entry: index, component }) => from(component).lo[index]!),
        reads.map(({ entry: index, component }) => from(component).hi[index]!),
      ) as [number, number];
      this.setLocal(k, cos, sin, carried);
    } else if (format === 'exact') this.setLocal(k, 0, 0, carried);
    else {
      const { cos, sin, both } = ProductRounding.of(format).errors(
        this.angle.lo[k]!,
        this.angle.hi[k]!,
        carried + 4 * halfUnit(1, format),
      );
      this.setLocal(
        k,
        Math.min(cos, this.pairError(k, a, b, format, true)),
        Math.min(sin, this.pairError(k, a, b, format, false)),
        carried,
        both,
      );
    }
    this.components(k);
  }

  /** Rounding of cos cos - sin sin (or sin cos + cos sin): two products and their sum. */
  private pairError(k: number, a: number, b: number, format: 'f64' | 'f32', cosine: boolean): number {
    const w = this.work;
    this.copy(0, this.value, a);
    this.copy(1, this.sine, a);
    this.copy(2, this.value, b);
    this.copy(3, this.sine, b);
    interval.mul(w, 4, cosine ? 0 : 1, 2);
    interval.mul(w, 5, cosine ? 1 : 0, 3);
    const first = halfUnit(Math.max(-w.lo[4]!, w.hi[4]!), format);
    const second = halfUnit(Math.max(-w.lo[5]!, w.hi[5]!), format);
    this.setTrig(6, k, cosine);
    const size = Math.max(-w.lo[6]!, w.hi[6]!) + this.deviation[a]! + this.deviation[b]! + first + second;
    return first + second + halfUnit(size, format);
  }

  /**
   * Two numbers that are exactly a cosine and a sine: what they are computed to lies off the circle by their errors. Their
   * ranges, made apart, are cut to what the range of the angle allows.
   */
  private pair(k: number, cos: number, sin: number): void {
    const [a, b] = [this.error[cos]!, this.error[sin]!];
    this.error[k] = (a + b) * SLACK;
    this.local[k] = 0;
    this.localSine[k] = 0;
    this.localBoth[k] = 0;
    this.deviation[k] = Math.sqrt(a * a + b * b) * SLACK;
    this.angleOf(k, cos, sin);
    this.components(k);
    for (const [entry, of] of [
      [cos, this.value],
      [sin, this.sine],
    ] as const) {
      of.lo[k] = Math.max(of.lo[k]!, this.value.lo[entry]!);
      of.hi[k] = Math.min(of.hi[k]!, this.value.hi[entry]!);
      this.value.lo[entry] = of.lo[k]!;
      this.value.hi[entry] = of.hi[k]!;
    }
  }

  /**
   * True anomaly of an eccentric one: the direction of (cos E - e, sqrt(1 - e^2) sin E). What lies off the unit circle by
   * d goes at most (q^2 + e q) d / (1 - e cos E)^2 off it again, and likewise errors of e and of the root q.
   */
  private anomaly(k: number, turn: number, e: number, root: number): void {
    const w = this.work;
    this.copy(0, this.value, turn);
    this.copy(1, this.sine, turn);
    this.copy(3, this.value, e);
    this.copy(4, this.value, root);
    interval.sub(w, 0, 0, 3);
    interval.mul(w, 1, 1, 4);
    this.angleOfWork(k);
    const most = w.hi[3]!;
    const slope = 1 - most;
    const off =
      (this.deviation[turn]! + this.error[e]! + this.error[root]!) *
      (most < 1 ? 2 / (slope * slope) : Infinity);
    this.error[k] = (this.error[turn]! * (most < 1 ? 2 / slope : Infinity) + off) * SLACK;
    this.setLocal(k, 0, 0, off);
    this.components(k);
  }

  /** The range of the angle of a pair; on the left half plane it goes on beyond pi. */
  private angleOf(k: number, cos: number, sin: number): void {
    this.copy(0, this.value, cos);
    this.copy(1, this.value, sin);
    this.angleOfWork(k);
  }

  private angleOfWork(k: number): void {
    const w = this.work;
    const left = w.hi[0]! < 0;
    if (left) {
      interval.neg(w, 0, 0);
      interval.neg(w, 1, 1);
    }
    interval.atan2(w, 2, 1, 0);
    const turn = left ? Math.PI : 0;
    this.setAngle(k, interval.down(w.lo[2]! + turn) - 4e-16, interval.up(w.hi[2]! + turn) + 4e-16);
  }

  private roundedTurn(k: number, of: number): void {
    this.error[k] = this.error[of]!;
    this.setAngle(k, this.angle.lo[of]!, this.angle.hi[of]!);
    const cos = halfUnit(Math.max(-this.value.lo[of]!, this.value.hi[of]!), 'f32');
    const sin = halfUnit(Math.max(-this.sine.lo[of]!, this.sine.hi[of]!), 'f32');
    this.setLocal(k, cos, sin, this.deviation[of]!);
    this.components(k);
  }

  private component(k: number, entry: { readonly kind: 'cosine' | 'sine'; readonly turn: number }): void {
    const from = entry.kind === 'cosine' ? this.value : this.sine;
    interval.set(this.value, k, from.lo[entry.turn]!, from.hi[entry.turn]!);
    this.local[k] = 0;
    this.error[k] = (this.error[entry.turn]! + this.deviation[entry.turn]!) * SLACK;
  }

  /** E - M of a turn that may lie off the unit circle by its deviation d: that moves it by e d / (1 - e (1 + d)) at most. */
  private offset(k: number, entry: Extract<Entry, { kind: 'offset' }>): void {
    const { turn, e } = entry;
    const w = this.work;
    this.copy(0, this.angle, turn);
    this.copy(1, this.value, e);
    const most = Math.min(w.hi[1]!, 1);
    if (w.lo[1]! < 0) interval.set(w, 1, 0, most);
    interval.keplerOffset(w, 2, 0, 1);
    const d = this.deviation[turn]!;
    const slope = 1 - most * (1 + d);
    const off = slope > 0 ? ((most * d) / slope) * SLACK : Infinity;
    interval.put(this.value, k, interval.down(w.lo[2]! - off), interval.up(w.hi[2]! + off));
    const span = { lo: this.angle.lo[turn]!, hi: this.angle.hi[turn]! };
    const local = entry.errors?.offset(span, { lo: w.lo[1]!, hi: most }) ?? 0;
    const carried = slope > 0 ? (most * (this.error[turn]! + d) + this.error[e]!) / slope : Infinity;
    this.finish(k, local, carried);
  }

  private setAngle(k: number, lo: number, hi: number): void {
    if (this.free[k]) interval.put(this.angle, k, -WHOLE, WHOLE);
    else interval.put(this.angle, k, lo, hi);
  }

  /** Takes the box's own range of the angle when it is the narrower one. The box speaks of exact angles: room for their error is added. */
  private applyCut(k: number, lo: Float64Array, hi: Float64Array): boolean {
    const variable = this.cutOf.get(k);
    if (variable === undefined) return false;
    const [from, to] = [lo[variable]!, hi[variable]!];
    const room = this.error[k]! * SLACK;
    if (!(to - from + 2 * room < this.angle.hi[k]! - this.angle.lo[k]!)) return false;
    this.setAngle(k, interval.down(from - room), interval.up(to + room));
    return true;
  }

  /** One factor's angle is the product's minus the other's: takes that when it is narrower and only the product uses the factor. */
  private refine(k: number, other: number, product: number): void {
    const entry = this.tape.entries[k]!;
    const target = entry.kind === 'rounded-turn' ? entry.turn : k;
    if (!this.refinable[target]) return;
    const lo = interval.down(this.angle.lo[product]! - this.angle.hi[other]!);
    const hi = interval.up(this.angle.hi[product]! - this.angle.lo[other]!);
    if (!(hi - lo < this.angle.hi[k]! - this.angle.lo[k]!)) return;
    for (const index of target === k ? [k] : [target, k]) {
      this.setAngle(index, lo, hi);
      const own = this.tape.entries[index]!;
      if (own.kind === 'turn') this.setTurn(index, own.errors, lo, hi);
      if (own.kind === 'rounded-turn') this.roundedTurn(index, own.turn);
      else this.components(index);
    }
  }

  private setTurn(k: number, errors: SineErrors | null, lo: number, hi: number): void {
    this.setLocal(k, errors?.cos(lo, hi) ?? 0, errors?.sin(lo, hi) ?? 0, 0, errors?.both(lo, hi) ?? 0);
  }

  private setLocal(k: number, cos: number, sin: number, carried: number, both = Infinity): void {
    this.local[k] = cos;
    this.localSine[k] = sin;
    this.localBoth[k] = Math.min(both, Math.sqrt(cos * cos + sin * sin) * SLACK);
    this.deviation[k] = (carried + this.localBoth[k]!) * SLACK;
  }

  /** Ranges of cosine and sine: of the angles, widened by the deviation. */
  private components(k: number): void {
    const d = this.deviation[k]!;
    for (const cosine of [true, false]) {
      const target = cosine ? this.value : this.sine;
      this.setTrig(7, k, cosine);
      target.lo[k] = interval.down(this.work.lo[7]! - d);
      target.hi[k] = interval.up(this.work.hi[7]! + d);
    }
  }

  private setTrig(register: number, turn: number, cosine: boolean): void {
    this.copy(register, this.angle, turn);
    if (cosine) interval.cos(this.work, register, register);
    else interval.sin(this.work, register, register);
  }

  private copy(register: number, from: interval.Intervals, index: number): void {
    this.work.lo[register] = from.lo[index]!;
    this.work.hi[register] = from.hi[index]!;
  }
}
