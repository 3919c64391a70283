import type { Dyadic } from '../numbers/dyadic.ts';

/** pi / 2 as an integer over 2^-240, from the published digits of pi. */
const HALF_PI_BITS = 240n;
const HALF_PI: bigint = (() => {
  const digits = 314159265358979323846264338327950288419716939937510582097494459230781640628620899862n;
  return (digits << HALF_PI_BITS) / (2n * 10n ** 83n);
})();

/** pi / 2 rounded down to a multiple of 2^-240. */
export function halfPi(): Dyadic {
  return { mantissa: HALF_PI, exponent: -Number(HALF_PI_BITS) };
}

/** pi / 2 as a sum of numbers that have few bits each, and what the sum leaves out. */
export interface SplitHalfPi {
  readonly parts: readonly number[];
  /** Bound on |pi / 2 - sum of the parts|. */
  readonly rest: number;
}

/**
 * Splits pi / 2 after Cody and Waite: a whole number of up to `53 - bits` (or `24 - bits`) bits times a part is exact.
 *
 * @param bits bits of each part but the last
 * @param lastBits bits of the last part
 * @param count number of parts
 */
export function splitHalfPi(bits: number, lastBits: number, count: number): SplitHalfPi {
  const parts: number[] = [];
  let rest = HALF_PI;
  for (let k = 0; k < count; k++) {
    const width = BigInt(rest.toString(2).length - (k === count - 1 ? lastBits : bits));
    const head = (rest >> width) << width;
    parts.push(Number(head) / 2 ** Number(HALF_PI_BITS));
    rest -= head;
  }
  return { parts, rest: (Number(rest) * 1.000001) / 2 ** Number(HALF_PI_BITS) };
}
