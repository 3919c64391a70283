import { cosine, sine } from './proven-sine.ts';

/**
 * A float64 solution of D = e (s cos D + c sin D): Kepler's equation for D = E - M, s = sin M, c = cos M. It
 * is a guess for the proven and the double-double solvers, which trust nothing of it.
 *
 * For s >= 0 the equation is convex between the root and its upper bounds e and e s / (1 - e c) (the tangent
 * at D = 0 lies above the sine), so Newton's iterates fall from there and the loop ends when rounding stops
 * the fall. Negative s follows by symmetry.
 *
 * @param s sine of M
 * @param c cosine of M
 * @param e eccentricity, 0 <= e < 1
 * @returns D, rad, good to a few units in the last place, times 1 / (1 - e cos E)
 */
export function offsetGuess(s: number, c: number, e: number): number {
  return s < 0 ? -descend(-s, c, e) : descend(s, c, e);
}

function descend(s: number, c: number, e: number): number {
  const reach = e * Math.sqrt(s * s + c * c);
  const slopeAtZero = 1 - e * c;
  let D = slopeAtZero > 0 ? Math.min(reach, (e * s) / slopeAtZero) : reach;
  for (;;) {
    const sinD = sine(D);
    const cosD = cosine(D);
    const next = D - (D - e * (s * cosD + c * sinD)) / (1 - e * (c * cosD - s * sinD));
    if (!(next < D)) return D;
    D = next;
  }
}
