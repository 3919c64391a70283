import { down, Intervals, mul, put, up } from './interval-arithmetic.ts';
import { sin } from './interval-functions.ts';
import { offsetGuess } from './kepler-guess.ts';
import { above, below, cosine, PROVEN_RANGE, sine } from './proven-sine.ts';

/** Attempts at a tight bound, each at twice the distance of the one before. */
const ATTEMPTS = 8;

/**
 * r[d] = the eccentric anomalies E that solve E - e sin E = M for M in r[m] and e in r[e].
 *
 * The left side rises with E for |e| < 1, and so E rises with M. A bound for the whole box is an E where the
 * sign of E - e sin E - M is proven, by outward rounding, for all e at once and M at its end. The point to be
 * proven comes from a float64 solution that is trusted in nothing. Where no such point is found (e next to 1,
 * |M| near 100 rad or above, negative e), E lies within max |e| of M.
 *
 * The whole line unless r[e] lies inside (-1, 1).
 */
export function keplerE(r: Intervals, d: number, m: number, e: number): void {
  const eLo = r.lo[e]!;
  const eHi = r.hi[e]!;
  if (eLo > -1 && eHi < 1) put(r, d, lowest(r.lo[m]!, eLo, eHi), -lowest(-r.hi[m]!, eLo, eHi));
  else put(r, d, -Infinity, Infinity);
}

/** Scratch: the sine of E, and e. */
const scratch = new Intervals(2);

/**
 * r[d] = the offsets D = E - M = e sin E for M in r[m] and e in r[e]. E rises with M, so that nothing is lost
 * on the way through it but its rounding. The whole line unless r[e] lies inside (-1, 1).
 */
export function keplerOffset(r: Intervals, d: number, m: number, e: number): void {
  const eLo = r.lo[e]!;
  const eHi = r.hi[e]!;
  keplerE(r, d, m, e);
  put(scratch, 0, r.lo[d]!, r.hi[d]!);
  sin(scratch, 0, 0);
  put(scratch, 1, eLo, eHi);
  mul(scratch, 0, 0, 1);
  if (eLo > -1 && eHi < 1) put(r, d, scratch.lo[0]!, scratch.hi[0]!);
}

/** A lower bound of E for this M and all e in [eLo, eHi]. */
function lowest(M: number, eLo: number, eHi: number): number {
  const surely = down(M - Math.max(-eLo, eHi));
  if (!(Math.abs(M) <= PROVEN_RANGE - 1)) return surely;
  const s = sine(M);
  const e = Math.max(0, s > 0 ? eLo : eHi);
  const guess = M + offsetGuess(s, cosine(M), e);
  const slope = 1 - e * cosine(guess);
  let distance = (1.25 * Math.max(0, excess(guess, M, eLo, eHi))) / slope;
  for (let attempt = 0; attempt < ATTEMPTS; attempt++) {
    const E = down(guess - distance);
    if (!(E > surely)) break;
    if (excess(E, M, eLo, eHi) <= 0) return E;
    distance *= 2;
  }
  return surely;
}

/** An upper bound of E - e sin E - M over all e in [eLo, eHi], |E| <= PROVEN_RANGE. */
function excess(E: number, M: number, eLo: number, eHi: number): number {
  const value = sine(E);
  const least = below(value);
  const most = above(value);
  const product = Math.min(eLo * least, eLo * most, eHi * least, eHi * most);
  return up(up(E - M) - down(product));
}
