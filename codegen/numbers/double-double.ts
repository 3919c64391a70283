/**
 * Double-double arithmetic: a number is the unevaluated sum of two float64 numbers, |lo| <= ulp(hi) / 2.
 *
 * The algorithms are the accurate ones of Joldes, Muller, Popescu, "Tight and rigorous error bounds for
 * basic building blocks of double-word arithmetic", ACM TOMS 44(2), 2017; their numbers and bounds below
 * are cited from memory and checked by sampling. JavaScript has no fused multiply-add, so exact products
 * are Dekker's.
 *
 * With u = 2^-53, u^2 = 1.2e-32, the relative errors are at most: add and sub 3 u^2 + 13 u^3, mul 7 u^2, div
 * 15 u^2 + 56 u^3, sqrt 25/8 u^2; neg, abs and floor are exact.
 *
 * Range: operands, results and quotients are zero or lie in 2^-400 <= |x| <= 2^400. Outside, Dekker's
 * split overflows (from 2^996) or the low word underflows; nothing checks that.
 */

/**
 * A register file: register i is hi[i] + lo[i]. Operations address registers by index and allocate nothing.
 */
export class Pairs {
  readonly hi: Float64Array;
  readonly lo: Float64Array;

  /** @param n number of registers, all zero at first */
  constructor(n: number) {
    this.hi = new Float64Array(n);
    this.lo = new Float64Array(n);
  }
}

/** Dekker's constant 2^27 + 1: splits a float64 into two halves of at most 26 bits. */
const SPLITTER = 134217729;

/** The rounding error of sum = a + b, exactly (Knuth's two-sum). */
function sumError(a: number, b: number, sum: number): number {
  const t = sum - a;
  return a - (sum - t) + (b - t);
}

/** The rounding error of product = a * b, exactly (Dekker's product). */
function productError(a: number, b: number, product: number): number {
  const p = SPLITTER * a;
  const ah = p - (p - a);
  const al = a - ah;
  const q = SPLITTER * b;
  const bh = q - (q - b);
  const bl = b - bh;
  return al * bl - (product - ah * bh - al * bh - ah * bl);
}

/** r[d] = hi + lo. The two need |lo| <= ulp(hi) / 2. */
export function set(r: Pairs, d: number, hi: number, lo = 0): void {
  r.hi[d] = hi;
  r.lo[d] = lo;
}

/** r[d] = r[a] + r[b] (algorithm 6). Like all operations here, d may be a or b. */
export function add(r: Pairs, d: number, a: number, b: number): void {
  addWords(r, d, a, r.hi[b]!, r.lo[b]!);
}

/** r[d] = r[a] - r[b]. */
export function sub(r: Pairs, d: number, a: number, b: number): void {
  addWords(r, d, a, -r.hi[b]!, -r.lo[b]!);
}

/** r[d] = r[a] + (yh + yl), algorithm 6. */
function addWords(r: Pairs, d: number, a: number, yh: number, yl: number): void {
  const xh = r.hi[a]!;
  const xl = r.lo[a]!;
  const sh = xh + yh;
  const sl = sumError(xh, yh, sh);
  const th = xl + yl;
  const tl = sumError(xl, yl, th);
  const c = sl + th;
  const vh = sh + c;
  const vl = c - (vh - sh);
  const w = tl + vl;
  const hi = vh + w;
  r.hi[d] = hi;
  r.lo[d] = w - (hi - vh);
}

/** r[d] = x * y, exactly, of two float64 numbers. */
export function product(r: Pairs, d: number, x: number, y: number): void {
  const hi = x * y;
  r.hi[d] = hi;
  r.lo[d] = productError(x, y, hi);
}

/** r[d] = r[a] * r[b] (algorithm 10). */
export function mul(r: Pairs, d: number, a: number, b: number): void {
  const xh = r.hi[a]!;
  const yh = r.hi[b]!;
  const ch = xh * yh;
  const c = productError(xh, yh, ch) + (xh * r.lo[b]! + r.lo[a]! * yh);
  const hi = ch + c;
  r.hi[d] = hi;
  r.lo[d] = c - (hi - ch);
}

/** r[d] = r[a] / r[b], r[b] not zero (algorithm 17, its product by algorithm 7). */
export function div(r: Pairs, d: number, a: number, b: number): void {
  const xh = r.hi[a]!;
  const yh = r.hi[b]!;
  const th = xh / yh;
  const ch = yh * th;
  const cl = r.lo[b]! * th;
  const sh = ch + cl;
  const sl = cl - (sh - ch) + productError(yh, th, ch);
  const rh = sh + sl;
  const rl = sl - (rh - sh);
  const tl = (xh - rh + (r.lo[a]! - rl)) / yh;
  const hi = th + tl;
  r.hi[d] = hi;
  r.lo[d] = tl - (hi - th);
}

/**
 * r[d] = square root of r[a], r[a] >= 0 (one Newton step from the rounded root; bound from Lefevre, Louvet,
 * Muller, Picot, Rideau, "Accurate calculation of Euclidean norms using double-word arithmetic", 2023).
 */
export function sqrt(r: Pairs, d: number, a: number): void {
  const xh = r.hi[a]!;
  if (xh === 0) {
    set(r, d, xh);
    return;
  }
  const sh = Math.sqrt(xh);
  const square = sh * sh;
  const sl = (xh - square - productError(sh, sh, square) + r.lo[a]!) / (2 * sh);
  const hi = sh + sl;
  r.hi[d] = hi;
  r.lo[d] = sl - (hi - sh);
}

/** r[d] = -r[a]. */
export function neg(r: Pairs, d: number, a: number): void {
  r.hi[d] = -r.hi[a]!;
  r.lo[d] = -r.lo[a]!;
}

/** r[d] = |r[a]|. The sign of a pair is the sign of its high word. */
export function abs(r: Pairs, d: number, a: number): void {
  if (r.hi[a]! < 0) neg(r, d, a);
  else set(r, d, r.hi[a]!, r.lo[a]!);
}

/** r[d] = the largest integer that is not above r[a]. */
export function floor(r: Pairs, d: number, a: number): void {
  const xh = r.hi[a]!;
  const high = Math.floor(xh);
  const low = high === xh ? Math.floor(r.lo[a]!) : 0;
  const hi = high + low;
  r.hi[d] = hi;
  r.lo[d] = low - (hi - high);
}

/**
 * The sign of r[a] - r[b]: -1, 0 or 1; NaN if either is NaN. Both must be normalised, as every result here
 * is.
 */
export function compare(r: Pairs, a: number, b: number): number {
  const high = r.hi[a]! - r.hi[b]!;
  return Math.sign(high === 0 ? r.lo[a]! - r.lo[b]! : high);
}
