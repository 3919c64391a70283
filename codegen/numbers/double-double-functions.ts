import { add, div, mul, Pairs, product, set, sub } from './double-double.ts';
import { offsetGuess } from './kepler-guess.ts';

/**
 * Elementary functions of pairs; with u = 2^-53, relative errors of sine, cosine and atan2 stay below 8 u^2
 * (1e-31; seen 2.4 u^2) for angles up to 2^20 rad, taken as the exact sum of their words. Checked by
 * sampling, not proven: this is the yardstick for observed errors, never part of a certified bound.
 */

/** pi/2 as the sum of four float64 numbers: off by 3e-66. */
export const HALF_PI: readonly number[] = [
  1.5707963267948966, 6.123233995736766e-17, -1.4973849048591698e-33, 5.562271104316826e-50,
];
const TWO_OVER_PI = 0.6366197723675814;

/** The table holds cosine and sine of j / STEPS, 0 <= j < ROWS, in registers j and ROWS + j. */
const STEPS = 32;
const ROWS = 27;
const table = new Pairs(2 * ROWS);
for (let j = 0; j < ROWS; j++) fillRow(j);

/** Scratch registers of sinCos; the last ones hold -1/3!, 1/5!, -1/7! and -1/2!, 1/4!, -1/6!. */
const t = new Pairs(15);
const [X, STEP, Z, SINE, SINE_T, COSINE_T, LEFT, RIGHT] = [0, 1, 2, 3, 4, 5, 6, 7];
const [S3, S5, S7, C2, C4, C6] = [8, 9, 10, 11, 12, 13];
[-6, 120, -5040, -2, 24, -720].forEach((factorial, i) => {
  set(t, S3 + i, factorial);
  set(t, X, 1);
  div(t, S3 + i, X, S3 + i);
});

/** r[s] = sin r[a], r[c] = cos r[a]; s and c may not be the same, either may be a. */
export function sinCos(r: Pairs, s: number, c: number, a: number): void {
  const k = Math.round(r.hi[a]! * TWO_OVER_PI);
  set(t, X, r.hi[a]!, r.lo[a]!);
  if (k !== 0) {
    for (let part = 0; part < 4; part++) {
      product(t, STEP, k, HALF_PI[part]!);
      sub(t, X, X, STEP);
    }
  }
  const row = Math.round(t.hi[X]! * STEPS);
  set(t, STEP, row / STEPS);
  sub(t, X, X, STEP);
  expand();

  // sin(row + x) = S + (C sin x + S (cos x - 1)), cos(row + x) = C + (C (cos x - 1) - S sin x)
  const j = Math.abs(row);
  const sign = row < 0 ? -1 : 1;
  set(t, STEP, table.hi[j]!, table.lo[j]!);
  set(t, SINE, sign * table.hi[ROWS + j]!, sign * table.lo[ROWS + j]!);
  mul(t, LEFT, STEP, SINE_T);
  mul(t, RIGHT, SINE, COSINE_T);
  add(t, LEFT, LEFT, RIGHT);
  add(t, LEFT, LEFT, SINE);
  mul(t, COSINE_T, STEP, COSINE_T);
  mul(t, SINE_T, SINE, SINE_T);
  sub(t, RIGHT, COSINE_T, SINE_T);
  add(t, RIGHT, RIGHT, STEP);

  const sine = (k & 1) === 0 ? LEFT : RIGHT;
  const cosine = (k & 1) === 0 ? RIGHT : LEFT;
  const sineSign = (k & 2) === 0 ? 1 : -1;
  const cosineSign = ((k + 1) & 2) === 0 ? 1 : -1;
  set(r, s, sineSign * t.hi[sine]!, sineSign * t.lo[sine]!);
  set(r, c, cosineSign * t.hi[cosine]!, cosineSign * t.lo[cosine]!);
}

/**
 * SINE_T = sin x, COSINE_T = cos x - 1 for |x| <= 1/64, by Taylor series up to x^13 and x^12. Terms below
 * 2^-53 of the sum are summed in float64.
 */
function expand(): void {
  mul(t, Z, X, X);
  const z = t.hi[Z]!;
  const sineRest = 1 / 362880 + z * (-1 / 39916800 + z / 6227020800);
  const cosineRest = 1 / 40320 + z * (-1 / 3628800 + z / 479001600);
  series(SINE_T, sineRest, S7, S5, S3);
  mul(t, SINE_T, SINE_T, Z);
  mul(t, SINE_T, SINE_T, X);
  add(t, SINE_T, SINE_T, X);
  series(COSINE_T, cosineRest, C6, C4, C2);
  mul(t, COSINE_T, COSINE_T, Z);
}

/** t[d] = t[first] + z (t[second] + z (t[third] + z rest)). */
function series(d: number, rest: number, third: number, second: number, first: number): void {
  set(t, d, rest);
  mul(t, d, d, Z);
  add(t, d, d, third);
  mul(t, d, d, Z);
  add(t, d, d, second);
  mul(t, d, d, Z);
  add(t, d, d, first);
}

/** Fills one row of the table: Taylor series of cosine and sine in integers, in units of 2^-200. */
function fillRow(j: number): void {
  const sums = [0n, 0n, 0n, 0n];
  let term = 1n << 200n;
  for (let n = 0; n === 0 || term > 0n; n++) {
    sums[n & 3]! += term;
    term = (term * BigInt(j)) / BigInt(STEPS * (n + 1));
  }
  setFixed(j, sums[0]! - sums[2]!);
  setFixed(ROWS + j, sums[1]! - sums[3]!);
}

function setFixed(register: number, value: bigint): void {
  const hi = Number(value);
  set(table, register, hi * 2 ** -200, Number(value - BigInt(hi)) * 2 ** -200);
}

/** Scratch registers of the functions below, which call sinCos on them. */
const w = new Pairs(12);
const [A, B, Y, XX, SIN, COS, ECC, D, SIN_D, COS_D, ONE, MEAN] = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11];

/** r[d] = sin r[a]. */
export function sin(r: Pairs, d: number, a: number): void {
  set(w, A, r.hi[a]!, r.lo[a]!);
  sinCos(w, A, B, A);
  set(r, d, w.hi[A]!, w.lo[A]!);
}

/** r[d] = cos r[a]. */
export function cos(r: Pairs, d: number, a: number): void {
  set(w, A, r.hi[a]!, r.lo[a]!);
  sinCos(w, B, A, A);
  set(r, d, w.hi[A]!, w.lo[A]!);
}

/**
 * r[d] = the angle of the point (r[x], r[y]), in [-pi, pi]; at the origin, which has none, what Math.atan2
 * returns. From its float64 guess g the rest is atan((y cos g - x sin g) / (x cos g + y sin g)), an angle so
 * small that its tangent will do.
 */
export function atan2(r: Pairs, d: number, y: number, x: number): void {
  const guess = Math.atan2(r.hi[y]!, r.hi[x]!);
  if (r.hi[y] === 0 && r.hi[x] === 0) {
    set(r, d, guess);
    return;
  }
  set(w, Y, r.hi[y]!, r.lo[y]!);
  set(w, XX, r.hi[x]!, r.lo[x]!);
  set(w, A, guess);
  sinCos(w, SIN, COS, A);
  mul(w, A, Y, COS);
  mul(w, B, XX, SIN);
  sub(w, A, A, B);
  mul(w, B, XX, COS);
  mul(w, Y, Y, SIN);
  add(w, B, B, Y);
  div(w, A, A, B);
  set(w, B, guess);
  add(w, A, A, B);
  set(r, d, w.hi[A]!, w.lo[A]!);
}

/**
 * r[d] = D, the solution of D = e (s cos D + c sin D): the eccentric less the mean anomaly, s = sin M, c =
 * cos M. Newton's iteration from a float64 guess; it ends once the step is so small that its square is out of
 * sight, or, for e next to 1, once steps shrink no more.
 *
 * The error is below 8 u^2 e / (1 - e cos E), E = M + D (seen 1.8): 1e-31 e for small e, 1e-29 for e = 0.99
 * near M = 0.
 *
 * @throws RangeError unless 0 <= r[e] < 1
 */
export function keplerOffset(r: Pairs, d: number, s: number, c: number, e: number): void {
  const ecc = r.hi[e]!;
  if (!(ecc >= 0 && ecc < 1)) throw new RangeError(`eccentricity must lie in [0, 1), not ${ecc}`);
  set(w, SIN, r.hi[s]!, r.lo[s]!);
  set(w, COS, r.hi[c]!, r.lo[c]!);
  set(w, ECC, ecc, r.lo[e]!);
  set(w, D, offsetGuess(w.hi[SIN]!, w.hi[COS]!, ecc));
  for (let last = Infinity; ; ) {
    sinCos(w, SIN_D, COS_D, D);
    mul(w, A, SIN, COS_D);
    mul(w, B, COS, SIN_D);
    add(w, A, A, B);
    mul(w, A, A, ECC);
    sub(w, A, D, A); // D - e sin E
    mul(w, COS_D, COS, COS_D);
    mul(w, SIN_D, SIN, SIN_D);
    sub(w, B, COS_D, SIN_D);
    mul(w, B, B, ECC);
    set(w, ONE, 1);
    sub(w, B, ONE, B); // 1 - e cos E
    div(w, A, A, B);
    sub(w, D, D, A);
    const step = Math.abs(w.hi[A]!);
    if (!(step > 2 ** -51 * Math.abs(w.hi[D]!) && step < last)) break;
    last = step;
  }
  set(r, d, w.hi[D]!, w.lo[D]!);
}

/**
 * r[d] = the eccentric anomaly E that solves r[m] = E - r[e] sin E, in the turn of r[m]; error as
 * keplerOffset.
 *
 * @throws RangeError unless 0 <= r[e] < 1
 */
export function kepler(r: Pairs, d: number, m: number, e: number): void {
  set(w, MEAN, r.hi[m]!, r.lo[m]!);
  set(w, ECC, r.hi[e]!, r.lo[e]!);
  sinCos(w, SIN, COS, MEAN);
  keplerOffset(w, D, SIN, COS, ECC);
  add(w, D, MEAN, D);
  set(r, d, w.hi[D]!, w.lo[D]!);
}
