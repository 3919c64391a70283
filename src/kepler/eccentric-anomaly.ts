import { sineDefect } from './sine-defect.ts';

/** 2 pi as a sum of three numbers; the first two have 33 bits at most, so that up to 2^20 turns of them are exact. */
const TWO_PI: readonly [number, number, number] = [
  6.2831853069365025, 2.430840201437384e-10, 1.1650928224373424e-19,
];

/**
 * Eccentric anomaly from Kepler's equation M = E - e sin E, iterated to convergence.
 *
 * Newton's iteration runs down from an upper bound of the root. On [0, pi] the equation is convex, so the
 * iterates fall monotonically and the loop ends when rounding stops the fall. The equation is evaluated as
 * (1 - e) sin E + (E - sin E) - M, whose first two terms never cancel: the result is good to a few units in
 * the last place also near e = 1 and M = 0.
 *
 * @param M mean anomaly, rad, any finite value; the digits of its turns are kept up to 2^20 turns
 * @param e eccentricity, 0 <= e < 1
 * @returns eccentric anomaly, rad, in the same turn as M
 * @throws RangeError if M is not finite or e is outside [0, 1)
 */
export function eccentricAnomaly(M: number, e: number): number {
  if (!Number.isFinite(M)) throw new RangeError(`mean anomaly must be finite, not ${M}`);
  if (!(e >= 0 && e < 1)) throw new RangeError(`eccentricity must lie in [0, 1), not ${e}`);
  const turns = Math.round(M / (2 * Math.PI));
  if (turns === 0) return M < 0 ? -solveHalfTurn(-M, e) : solveHalfTurn(M, e);
  const m = M - turns * TWO_PI[0] - turns * TWO_PI[1] - turns * TWO_PI[2];
  const E = m < 0 ? -solveHalfTurn(-m, e) : solveHalfTurn(m, e);
  return M + e * Math.sin(E);
}

/** Solves for E in [0, pi] given M in [0, pi]. */
function solveHalfTurn(M: number, e: number): number {
  let E = upperBound(M, e);
  for (;;) {
    const sinHalf = Math.sin(E / 2);
    const slope = 1 - e + 2 * e * sinHalf * sinHalf; // 1 - e cos E
    const next = E - ((1 - e) * Math.sin(E) + sineDefect(E) - M) / slope;
    if (!(next < E)) return E;
    E = next;
  }
}

/**
 * The least of three upper bounds of the root: E - e sin E >= E - e, >= (1 - e) E, and >= E^3 / pi^2
 * (on [0, pi] the quotient (E - sin E) / E^3 falls to its least value 1 / pi^2 at pi).
 */
function upperBound(M: number, e: number): number {
  return Math.min(M + e, M / (1 - e), Math.cbrt(Math.PI * Math.PI * M) * (1 + 1e-15), Math.PI * (1 + 1e-15));
}
