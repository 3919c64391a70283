/**
 * Interval arithmetic with outward rounding: a result holds the exact result for every choice of reals in the
 * operands.
 *
 * Rounding. The engine rounds to nearest; an endpoint is then moved outward by at least one unit in the last
 * place (see `down`). Trusted: + - * / are correctly rounded, as ECMA-262 demands, and so is Math.sqrt, as
 * IEEE 754 demands of a square root.
 *
 * Whole line. An interval is never empty and never holds NaN. What has no bounds (a divisor that holds zero,
 * an endpoint that overflows inward, a root of negative numbers only, an invalid range, infinity times zero)
 * is [-Infinity, Infinity].
 */

/**
 * A register file: register i is [lo[i], hi[i]]. Operations address registers by index and allocate nothing.
 */
export class Intervals {
  readonly lo: Float64Array;
  readonly hi: Float64Array;

  /** @param n number of registers, all [0, 0] at first */
  constructor(n: number) {
    this.lo = new Float64Array(n);
    this.hi = new Float64Array(n);
  }
}

const ULP = 2 ** -52;
const LEAST = 2 ** -1074;

/**
 * A number at or below the float64 before x, and at most three units below: so a lower bound of every real
 * that rounds to x.
 *
 * Proof for finite x. ulp(x), the distance from |x| to the next larger float64, is max(2^(k-52), 2^-1074)
 * with 2^k <= |x| < 2^(k+1). Rounding is monotone and ulp(x) is a float64 number: for normal x, |x| 2^-52 >=
 * ulp(x) stays so when rounded, for subnormal x the added 2^-1074 is ulp(x). So what is taken away is at
 * least ulp(x), and the rounded difference is at or below x - ulp(x), a float64 number (or an overflow to
 * -Infinity) that is at or below x's predecessor. -Infinity stays. Infinity, where the real overflowed, gives
 * NaN, which `put` turns into the whole line.
 */
export function down(x: number): number {
  return x - (Math.abs(x) * ULP + LEAST);
}

/** A number at or above the float64 after x: `down` mirrored. */
export function up(x: number): number {
  return x + (Math.abs(x) * ULP + LEAST);
}

/** r[d] = [lo, hi], or the whole line unless lo <= hi. */
export function put(r: Intervals, d: number, lo: number, hi: number): void {
  if (lo <= hi) {
    r.lo[d] = lo;
    r.hi[d] = hi;
  } else {
    r.lo[d] = -Infinity;
    r.hi[d] = Infinity;
  }
}

/** r[d] = [lo, hi], exactly; the whole line if that holds no real number. */
export function set(r: Intervals, d: number, lo: number, hi: number): void {
  if (lo < Infinity && hi > -Infinity) put(r, d, lo, hi);
  else put(r, d, Number.NaN, Number.NaN);
}

/** r[d] = r[a] + r[b]. Like all operations here, d may be any of the operands. */
export function add(r: Intervals, d: number, a: number, b: number): void {
  put(r, d, down(r.lo[a]! + r.lo[b]!), up(r.hi[a]! + r.hi[b]!));
}

/** r[d] = r[a] - r[b]. */
export function sub(r: Intervals, d: number, a: number, b: number): void {
  put(r, d, down(r.lo[a]! - r.hi[b]!), up(r.hi[a]! - r.lo[b]!));
}

/** r[d] = r[a] * r[b]. */
export function mul(r: Intervals, d: number, a: number, b: number): void {
  const al = r.lo[a]!;
  const ah = r.hi[a]!;
  const bl = r.lo[b]!;
  const bh = r.hi[b]!;
  if (al >= 0) put(r, d, down((bl >= 0 ? al : ah) * bl), up((bh >= 0 ? ah : al) * bh));
  else if (ah <= 0) put(r, d, down((bh >= 0 ? al : ah) * bh), up((bl >= 0 ? ah : al) * bl));
  else if (bl >= 0) put(r, d, down(al * bh), up(ah * bh));
  else if (bh <= 0) put(r, d, down(ah * bl), up(al * bl));
  else put(r, d, down(Math.min(al * bh, ah * bl)), up(Math.max(al * bl, ah * bh)));
}

/** r[d] = the squares of r[a]: tighter than mul, which takes its operands for independent. */
export function sqr(r: Intervals, d: number, a: number): void {
  const lo = r.lo[a]!;
  const hi = r.hi[a]!;
  if (lo > 0) put(r, d, Math.max(0, down(lo * lo)), up(hi * hi));
  else if (hi < 0) put(r, d, Math.max(0, down(hi * hi)), up(lo * lo));
  else put(r, d, 0, Math.max(up(lo * lo), up(hi * hi)));
}

/** r[d] = r[a] / r[b]; the whole line if r[b] holds zero. */
export function div(r: Intervals, d: number, a: number, b: number): void {
  const al = r.lo[a]!;
  const ah = r.hi[a]!;
  const bl = r.lo[b]!;
  const bh = r.hi[b]!;
  if (bl > 0) put(r, d, down(al / (al >= 0 ? bh : bl)), up(ah / (ah >= 0 ? bl : bh)));
  else if (bh < 0) put(r, d, down(ah / (ah >= 0 ? bh : bl)), up(al / (al >= 0 ? bl : bh)));
  else put(r, d, -Infinity, Infinity);
}

/** r[d] = -r[a], exactly. */
export function neg(r: Intervals, d: number, a: number): void {
  const lo = r.lo[a]!;
  r.lo[d] = -r.hi[a]!;
  r.hi[d] = -lo;
}

/** r[d] = |r[a]|, exactly. */
export function abs(r: Intervals, d: number, a: number): void {
  const lo = r.lo[a]!;
  const hi = r.hi[a]!;
  r.lo[d] = Math.max(0, lo, -hi);
  r.hi[d] = Math.max(-lo, hi);
}

/** r[d] = the largest integers not above r[a], exactly. */
export function floor(r: Intervals, d: number, a: number): void {
  r.lo[d] = Math.floor(r.lo[a]!);
  r.hi[d] = Math.floor(r.hi[a]!);
}

/** r[d] = the square roots of the numbers of r[a] that have one; the whole line if none has. */
export function sqrt(r: Intervals, d: number, a: number): void {
  put(r, d, Math.max(0, down(Math.sqrt(Math.max(0, r.lo[a]!)))), up(Math.sqrt(r.hi[a]!)));
}

/** r[d] = the least interval that holds r[a] and r[b]. */
export function hull(r: Intervals, d: number, a: number, b: number): void {
  const lo = Math.min(r.lo[a]!, r.lo[b]!);
  r.hi[d] = Math.max(r.hi[a]!, r.hi[b]!);
  r.lo[d] = lo;
}

/** r[d] = what r[a] and r[b] share; false, and the whole line, if they share nothing. */
export function intersect(r: Intervals, d: number, a: number, b: number): boolean {
  const lo = Math.max(r.lo[a]!, r.lo[b]!);
  const hi = Math.min(r.hi[a]!, r.hi[b]!);
  put(r, d, lo, hi);
  return lo <= hi;
}

/**
 * r[d] = (a < b ? x : y) for every choice: one branch where the comparison is decided, else the hull of both.
 */
export function select(r: Intervals, d: number, a: number, b: number, x: number, y: number): void {
  if (r.hi[a]! < r.lo[b]!) hull(r, d, x, x);
  else if (r.lo[a]! >= r.hi[b]!) hull(r, d, y, y);
  else hull(r, d, x, y);
}
