import * as interval from '../numbers/interval.ts';
import { exactUpTo, gridOf, halfUnit, LEAST, leadingPower } from './rounding.ts';
import type { Entry } from './tape.ts';

/** Room for the rounding of the analysis in sums of error bounds. */
export const SLACK: number = 1 + 2 ** -40;

/** An entry that one line computes from other real numbers. */
type RealEntry = Extract<Entry, { readonly args: readonly number[]; readonly kind: string }>;

/** Ranges, local errors and running errors of real entries, by the operations of a kernel. */
export class RealRanges {
  /** Ranges of real entries; of turns: the range of the cosine. */
  readonly value: interval.Intervals;
  /** Local error of real entries; of turns: of the cosine. */
  readonly local: Float64Array;
  /** Bound on |computed - exact| of real entries; of turns: of the angle. Running error analysis: crude, but always there. */
  readonly error: Float64Array;

  /** @param n number of entries */
  constructor(n: number) {
    this.value = new interval.Intervals(n);
    this.local = new Float64Array(n);
    this.error = new Float64Array(n);
  }

  /** Widens a range by the entry's own error and keeps both errors. */
  protected finish(k: number, local: number, carried: number): void {
    this.local[k] = local;
    this.error[k] = (carried + local) * SLACK;
    if (local > 0) {
      this.value.lo[k] = interval.down(this.value.lo[k]! - local);
      this.value.hi[k] = interval.up(this.value.hi[k]! + local);
    }
  }

  protected magnitude(k: number): number {
    return Math.max(-this.value.lo[k]!, this.value.hi[k]!);
  }

  protected real(k: number, entry: RealEntry): void {
    const r = this.value;
    const [a, b = a, x = a, y = a] = entry.args as [number, number?, number?, number?];
    const E = this.error;
    switch (entry.kind) {
      case 'add':
      case 'sub': {
        if (entry.kind === 'add') interval.add(r, k, a, b);
        else interval.sub(r, k, a, b);
        const local = this.sumError(k, entry, a, b);
        if (local === 0)
          this.keepPoint(k, a, b, entry.kind === 'add' ? r.lo[a]! + r.lo[b]! : r.lo[a]! - r.lo[b]!);
        return this.finish(k, local, E[a]! + E[b]!);
      }
      case 'mul': {
        const carried = this.magnitude(a) * E[b]! + this.magnitude(b) * E[a]!;
        if (a === b) interval.sqr(r, k, a);
        else interval.mul(r, k, a, b);
        const local = this.productError(k, entry, a, b);
        if (local === 0) this.keepPoint(k, a, b, r.lo[a]! * r.lo[b]!);
        return this.finish(k, local, carried);
      }
      case 'div': {
        interval.div(r, k, a, b);
        const least = Math.max(r.lo[b]!, -r.hi[b]!);
        const carried = least > 0 ? (E[a]! + this.magnitude(k) * E[b]!) / least : Infinity;
        return this.finish(k, this.roundingOf(k, entry.format), carried);
      }
      case 'sqrt': {
        const least = Math.sqrt(Math.max(0, r.lo[a]!));
        interval.sqrt(r, k, a);
        return this.finish(k, this.roundingOf(k, entry.format), least > 0 ? E[a]! / least : Infinity);
      }
      case 'round': {
        interval.set(r, k, r.lo[a]!, r.hi[a]!);
        const point = r.lo[a]! === r.hi[a]! && E[a]! === 0;
        const exact = point && Math.fround(r.lo[a]!) === r.lo[a]!;
        return this.finish(k, exact ? 0 : halfUnit(this.magnitude(k), 'f32'), E[a]!);
      }
      case 'neg':
        interval.neg(r, k, a);
        return this.finish(k, 0, E[a]!);
      case 'abs':
        interval.abs(r, k, a);
        return this.finish(k, 0, E[a]!);
      case 'floor':
        interval.floor(r, k, a);
        return this.finish(k, 0, r.lo[k]! === r.hi[k]! ? 0 : Infinity);
      case 'select': {
        interval.select(r, k, a, b, x, y);
        const decided = r.hi[a]! < r.lo[b]! ? x : r.lo[a]! >= r.hi[b]! ? y : -1;
        return this.finish(k, 0, decided < 0 ? Infinity : E[decided]!);
      }
      default:
        throw new Error(`no range for ${entry.kind}`);
    }
  }

  /** Two known numbers whose result is exact give a known number. */
  private keepPoint(k: number, a: number, b: number, result: number): void {
    if (this.point(a) !== undefined && this.point(b) !== undefined)
      interval.set(this.value, k, result, result);
  }

  private roundingOf(k: number, format: 'f64' | 'f32' | 'exact'): number {
    return format === 'exact' ? 0 : halfUnit(this.magnitude(k), format);
  }

  /**
   * Rounding of a sum. It is never larger than either operand, since the other one is a candidate; and it is zero when
   * both operands are multiples of a unit of which the format holds all multiples up to the result.
   */
  private sumError(
    k: number,
    entry: { readonly format: 'f64' | 'f32' | 'exact' },
    a: number,
    b: number,
  ): number {
    const { format } = entry;
    if (format === 'exact') return 0;
    const unit = Math.min(this.grid(a, format), this.grid(b, format));
    if (unit > 0 && this.magnitude(k) <= exactUpTo(unit, format)) return 0;
    return Math.min(halfUnit(this.magnitude(k), format), this.magnitude(a), this.magnitude(b));
  }

  private grid(k: number, format: 'f64' | 'f32'): number {
    return gridOf(this.value.lo[k]!, this.value.hi[k]!, format);
  }

  /** Rounding of a product: none for two known factors whose bits fit, only by underflow for a power of two. */
  private productError(
    k: number,
    entry: { readonly format: 'f64' | 'f32' | 'exact' },
    a: number,
    b: number,
  ): number {
    const { format } = entry;
    if (format === 'exact') return 0;
    const [pointA, pointB] = [this.point(a), this.point(b)];
    if (pointA === 0 || pointB === 0) return 0;
    if (pointA !== undefined && pointB !== undefined) {
      const unit = this.grid(a, format) * this.grid(b, format);
      if (this.magnitude(k) <= exactUpTo(unit, format)) return 0;
    }
    return isPower(pointA) || isPower(pointB) ? LEAST[format] : halfUnit(this.magnitude(k), format);
  }

  /** The value of an entry that is one number without error. */
  private point(k: number): number | undefined {
    return this.value.lo[k]! === this.value.hi[k]! ? this.value.lo[k]! : undefined;
  }
}

function isPower(x: number | undefined): boolean {
  return x !== undefined && leadingPower(x) === Math.abs(x);
}
