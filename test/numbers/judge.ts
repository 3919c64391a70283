import { Decimal } from 'decimal.js';
import type { Pairs } from '../../codegen/numbers/double-double.ts';

/** The judge of these tests: decimal.js with 60 digits. */
export const Judge: typeof Decimal = Decimal.clone({ precision: 60, defaults: true });
export type Judged = Decimal;

/** The unit roundoff of float64, 2^-53. */
export const U: number = 2 ** -53;

/**
 * A float64 number as a decimal, to 100 digits: decimal.js itself would take the shortest text that reads
 * back.
 */
export function exact(x: number): Judged {
  return new Judge(x.toPrecision(100));
}

/** Register i of a register file, in 60 digits. */
export function pairValue(r: Pairs, i: number): Judged {
  return exact(r.hi[i]!).plus(exact(r.lo[i]!));
}

/** |got - true| / |true|, 0 if both are zero. */
export function relativeError(got: Judged, truth: Judged): number {
  if (got.equals(truth)) return 0;
  return got.minus(truth).div(truth).abs().toNumber();
}

/** pi, 60 digits. */
export const PI: Judged = Judge.acos(-1);

/** The eccentric anomaly by Newton's iteration in decimals, from a rough start below 1e-6 off. */
export function keplerTruth(M: Judged, e: Judged, start: number): Judged {
  let E = exact(start);
  for (let step = new Judge(1); step.abs().greaterThan('1e-50'); ) {
    step = E.minus(e.times(E.sin())).minus(M).div(e.times(E.cos()).negated().plus(1));
    E = E.minus(step);
  }
  return E;
}

/** A seeded generator of numbers in [0, 1): a 32-bit linear congruence, its state mixed on output. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    let x = state ^ (state >>> 16);
    x = Math.imul(x, 0x7feb352d);
    x ^= x >>> 15;
    x = Math.imul(x, 0x846ca68b);
    x ^= x >>> 16;
    return (x >>> 0) / 2 ** 32 + (state & 0x1fffff) / 2 ** 53;
  };
}
