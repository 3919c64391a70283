import type { Format } from '../kernel/choices.ts';

const view = new Float64Array(1);
const words = new Uint32Array(view.buffer);

/** Index of the word that holds sign and exponent. */
const HIGH = new Uint8Array(new Uint32Array([1]).buffer)[0] === 1 ? 1 : 0;

/** The largest power of two at or below |x|; 0 for 0 and numbers below the normal range. */
export function leadingPower(x: number): number {
  view[0] = x;
  words[HIGH] = words[HIGH]! & 0x7ff00000;
  words[1 - HIGH] = 0;
  return view[0];
}

const HALF_UNIT: Readonly<Record<Format, number>> = { f64: 2 ** -53, f32: 2 ** -24 };

/** Half a unit in the last place of the least normal number: no rounding error is larger below it. */
export const LEAST: Readonly<Record<Format, number>> = { f64: 2 ** -1075, f32: 2 ** -150 };

/**
 * Largest error of one rounding to nearest of a result whose magnitude is at most `magnitude`: half a unit in the
 * last place of its binade. Just above a power of two it is less, since that power is a number of the format.
 */
export function halfUnit(magnitude: number, format: Format): number {
  if (!(magnitude < Infinity)) return Infinity;
  const power = leadingPower(magnitude);
  const half = power * HALF_UNIT[format];
  return Math.max(Math.min(half, Math.max(half / 2, magnitude - power)), LEAST[format]);
}

/** Bits of a significand of each format after the leading one. */
const FRACTION: Readonly<Record<Format, number>> = { f64: 52, f32: 23 };

/**
 * The unit of the coarsest grid that holds every number of the format in an interval: for a point the weight of its
 * last bit, for an interval clear of zero the unit in the last place at its end nearest to zero, else 0 (unknown).
 */
export function gridOf(lo: number, hi: number, format: Format): number {
  if (lo === hi) return lo === 0 ? Infinity : lastBit(lo);
  const least = lo > 0 ? lo : hi < 0 ? -hi : 0;
  return leadingPower(least) * 2 ** -FRACTION[format];
}

/** The weight of the last bit of a nonzero float64 number. */
function lastBit(x: number): number {
  let unit = leadingPower(x) * 2 ** -52;
  while (Number.isInteger(x / (2 * unit))) unit *= 2;
  return unit;
}

/** Largest magnitude for which every multiple of a unit is a number of the format. */
export function exactUpTo(unit: number, format: Format): number {
  return unit * 2 ** (FRACTION[format] + 1);
}
