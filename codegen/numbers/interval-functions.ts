import { down, type Intervals, put } from './interval-arithmetic.ts';
import { above, below, cosine, PROVEN_RANGE, sine } from './proven-sine.ts';

/** The least float64 number above pi; its neighbour Math.PI is the greatest below. */
export const PI_UP: number = Math.PI + 2 ** -51;

const ONE_OVER_TWO_PI = 0.15915494309189535;

/**
 * Turns within which an endpoint counts as an extremum. It covers the rounding of the turn count (16 turns,
 * three roundings: below 2^-47) and costs at most (2 pi 2^-40)^2 / 2 = 2e-23.
 */
const NEAR = 2 ** -40;

/** r[d] = sin r[a]; [-1, 1] if r[a] leaves the range of the proven sine, 100 rad. */
export function sin(r: Intervals, d: number, a: number): void {
  const lo = r.lo[a]!;
  const hi = r.hi[a]!;
  if (lo >= -PROVEN_RANGE && hi <= PROVEN_RANGE) wave(r, d, lo, hi, sine(lo), sine(hi), 0.25);
  else put(r, d, -1, 1);
}

/** r[d] = cos r[a]; [-1, 1] if r[a] leaves the range of the proven cosine, 100 rad. */
export function cos(r: Intervals, d: number, a: number): void {
  const lo = r.lo[a]!;
  const hi = r.hi[a]!;
  if (lo >= -PROVEN_RANGE && hi <= PROVEN_RANGE) wave(r, d, lo, hi, cosine(lo), cosine(hi), 0);
  else put(r, d, -1, 1);
}

/**
 * r[d] = the range of a wave of period 2 pi on [lo, hi]: between its values there, and 1 if a crest (at
 * `crest` turns and whole turns from it) lies between, and -1 if a trough does, half a turn off.
 */
function wave(
  r: Intervals,
  d: number,
  lo: number,
  hi: number,
  atLo: number,
  atHi: number,
  crest: number,
): void {
  const first = lo * ONE_OVER_TWO_PI - crest - NEAR;
  const last = hi * ONE_OVER_TWO_PI - crest + NEAR;
  const least = Math.min(atLo, atHi);
  const most = Math.max(atLo, atHi);
  put(
    r,
    d,
    Math.floor(last + 0.5) >= first + 0.5 ? -1 : Math.max(-1, below(least)),
    Math.floor(last) >= first ? 1 : Math.min(1, above(most)),
  );
}

/**
 * r[d] = the angles, in [-pi, pi], of the points (x, y) of the box r[x], r[y] of real numbers (zero has no
 * sign: the negative x axis is at pi). All of [-pi, pi] if the box holds the origin or both sides of the
 * negative x axis.
 *
 * Elsewhere the angle is monotone along each edge, so that two corners hold the extrema.
 */
export function atan2(r: Intervals, d: number, y: number, x: number): void {
  const yl = r.lo[y]!;
  const yh = r.hi[y]!;
  const xl = r.lo[x]!;
  const xh = r.hi[x]!;
  if (xl > 0) put(r, d, angleDown(yl, yl >= 0 ? xh : xl), angleUp(yh, yh >= 0 ? xl : xh));
  else if (yl > 0) put(r, d, angleDown(xh > 0 ? yl : yh, xh), angleUp(yl, xl));
  else if (yh < 0) put(r, d, angleDown(yh, xl), angleUp(xh > 0 ? yh : yl, xh));
  else if (yl === 0 && xh < 0) put(r, d, angleDown(yh, xh), PI_UP);
  else put(r, d, -PI_UP, PI_UP);
}

/** A lower bound of the angle of the point (x, y), not the origin; for y = 0, x < 0 of pi. */
function angleDown(y: number, x: number): number {
  const guess = Math.atan2(y + 0, x); // + 0 turns -0 into 0
  return Math.max(y >= 0 ? 0 : -PI_UP, down(guess - angleError(y, x, guess)));
}

/** An upper bound of the angle of the point (x, y), not the origin. */
function angleUp(y: number, x: number): number {
  return -angleDown(-y, x);
}

/**
 * A bound of |angle of (x, y) - guess|: the difference has the tangent (y cos g - x sin g) / (x cos g + y sin
 * g), and |atan q| <= |q|. The guess is trusted in nothing: without bounds, if it lies in the wrong half
 * plane (the tangent would miss whole turns) or more than a right angle off.
 *
 * Each product carries 3.5 u (2.5 u from the proven sine), a sum 1 u of the magnitudes: 2^-50 = 8 u covers
 * them and the sum that adds the cover; the quotient's own roundings fit in 2^-48. 2^-1060 covers underflow
 * of the products; the range of lengths keeps all else from under- and overflow.
 */
function angleError(y: number, x: number, guess: number): number {
  const length = Math.max(Math.abs(x), Math.abs(y));
  const plausible = y >= 0 ? guess >= 0 && guess <= 3.2 : guess <= 0 && guess >= -3.2;
  if (!plausible || !(length >= 2 ** -400 && length <= 2 ** 400)) return Infinity;
  const s = sine(guess);
  const c = cosine(guess);
  const yc = y * c;
  const xs = x * s;
  const xc = x * c;
  const ys = y * s;
  const across = Math.abs(yc - xs) + ((Math.abs(yc) + Math.abs(xs)) * 2 ** -50 + 2 ** -1060);
  const along = xc + ys - (Math.abs(xc) + Math.abs(ys)) * 2 ** -50;
  return along > 0 ? (across / along) * (1 + 2 ** -48) : Infinity;
}
