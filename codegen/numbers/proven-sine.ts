/**
 * Sine and cosine in float64 whose error is proven here, from + - * alone: nothing is taken from the engine.
 *
 * Claim, with u = 2^-53: |sine(x) - sin x| <= 2.5 u |sin x| and |cosine(x) - cos x| <= 2.5 u |cos x| for
 * |x| <= 100.
 *
 * Reduction. k is the integer nearest to x * 2 / pi; the product is off by less than 2^-46, so that
 * |x - k pi/2| < pi/4 + 2^-45 and |k| <= 64. For k = 0 the reduced angle is x itself. Else |x| > 1/2:
 *   r1 = x - k C1 is exact: x and k C1 (C1 has 46 bits) are multiples of 2^-53, and |r1| < 1.
 *   k C2 is exact: C2 is below 2^-47 and a multiple of 2^-91.
 *   r + t = r1 - k C2 exactly, |t| <= u |r|: fast two-sum, which needs |r1| >= |k C2|, or else the difference
 *   is a multiple of 2^-91 below 2^-39 and so exact itself, with t = 0.
 *   tail = t - k C3, where |k C3| < 2^-86; C3 is off by less than 2^-147 (times k, 2^-141), rounding adds
 *   u 2^-85 + u^2 |r|.
 * No float64 number with 1/2 < |x| <= 100 is nearer than 2^-61 to a multiple of pi/2 (a test goes through all
 * 64 multiples), so r + tail is off by less than 2^-20 u |r|, and |tail| <= u |r| + 2^-86.
 *
 * Sine of r + tail = r + (r z p(z) + tail), z = r^2 <= 0.6169, p the Taylor polynomial; in units of u |r|:
 *   truncation 0.001 (z^9 / 19!); r z p is at most 0.103 |r| and carries 5 roundings'
 *   worth (z and its product with r 2, p 2, product 1): 0.52; the sum with tail 0.11; tail (1 - cos r)
 *   left out 0.31. Together 0.94, and 1.05 in units of u |sin r| as |r| <= 1.1108 |sin r|; the last sum
 *   adds 1: 2.05 < 2.5.
 * Cosine of r + tail = w + (((1 - w) - h) + (z^2 q(z) - r tail)), h = z/2, w = 1 - h rounded; in units of u:
 *   z in h 0.25; truncation 0.001 (z^10 / 20!); z^2 q is at most 0.016 and carries 6 roundings' worth: 0.1;
 *   sums 0.03; tail (r - sin r) left out 0.07; the last sum 0.5. Together 0.96 and, as cos r >= 0.7071,
 *   1.36 |cos r| < 2.5.
 * Underflow of z touches only terms below u^2 |r|. Seen: 1.31 u over millions of angles.
 */

/** Up to here, in rad, the claim holds. */
export const PROVEN_RANGE = 100;

const TWO_OVER_PI = 0.6366197723675814;

/** pi/2 in three parts: 46 bits, a multiple of 2^-91, the rest rounded. */
const C1 = 1.5707963267948912;
const C2 = 5.3903028581582326e-15;
const C3 = -1.1351118607522202e-28;

/** The Taylor coefficients that the sine multiplies by z^k and r z: sin r = r + r z (S[0] + S[1] z + ...). */
export const SINE_COEFFICIENTS: readonly number[] = taylor(3, 8);
/**
 * The Taylor coefficients that the cosine multiplies by z^k and z^2: cos r = 1 - z/2 + z^2 (C[0] + C[1] z +
 * ...).
 */
export const COSINE_COEFFICIENTS: readonly number[] = taylor(4, 8);

/**
 * 1/n!, -1/(n+2)!, ...: `count` of them, the first negative if n = 3, each rounded once (18! < 2^53 is
 * exact).
 */
function taylor(n: number, count: number): number[] {
  const coefficients: number[] = [];
  let factorial = n === 3 ? -6 : 24;
  for (let k = 0; k < count; k++) {
    coefficients.push(1 / factorial);
    factorial *= -(n + 2 * k + 1) * (n + 2 * k + 2);
  }
  return coefficients;
}

const [S0, S1, S2, S3, S4, S5, S6, S7] = SINE_COEFFICIENTS as Eight;
const [Q0, Q1, Q2, Q3, Q4, Q5, Q6, Q7] = COSINE_COEFFICIENTS as Eight;
type Eight = readonly [number, number, number, number, number, number, number, number];

/** sin x for |x| <= PROVEN_RANGE, relative error at most 2.5 u. Beyond, the result is of no worth. */
export function sine(x: number): number {
  return ofQuarter(x, 0);
}

/** cos x for |x| <= PROVEN_RANGE, relative error at most 2.5 u. Beyond, the result is of no worth. */
export function cosine(x: number): number {
  return ofQuarter(x, 1);
}

const MARGIN = 2 ** -51;
const LEAST = 2 ** -1074;

/**
 * A lower bound of the exact sine or cosine for which `sine` or `cosine` gave `value`: taking away 4 u
 * |value| leaves at least 2.9 u of it after rounding.
 */
export function below(value: number): number {
  return value - (Math.abs(value) * MARGIN + LEAST);
}

/** An upper bound of the exact sine or cosine for which `sine` or `cosine` gave `value`. */
export function above(value: number): number {
  return value + (Math.abs(value) * MARGIN + LEAST);
}

/** sin(x + quarters pi/2). */
function ofQuarter(x: number, quarters: number): number {
  const k = Math.round(x * TWO_OVER_PI);
  const r1 = x - k * C1;
  const w = k * C2;
  const r = r1 - w;
  const tail = r1 - r - w - k * C3;
  const quarter = (k + quarters) & 3;
  const value = (quarter & 1) === 0 ? sineKernel(r, tail) : cosineKernel(r, tail);
  return (quarter & 2) === 0 ? value : -value;
}

function sineKernel(r: number, tail: number): number {
  const z = r * r;
  const p = S0 + z * (S1 + z * (S2 + z * (S3 + z * (S4 + z * (S5 + z * (S6 + z * S7))))));
  return r + (r * z * p + tail);
}

function cosineKernel(r: number, tail: number): number {
  const z = r * r;
  const q = Q0 + z * (Q1 + z * (Q2 + z * (Q3 + z * (Q4 + z * (Q5 + z * (Q6 + z * Q7))))));
  const h = 0.5 * z;
  const w = 1 - h;
  return w + (1 - w - h + (z * z * q - r * tail));
}
