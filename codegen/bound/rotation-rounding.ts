import type { Format } from '../kernel/choices.ts';
import { halfUnit } from './rounding.ts';
import type { Span } from './tape.ts';

/** Cells of the angle over half a turn. */
const CELLS = 96;

/** Half the width of a cell. */
const HALF = (Math.PI / CELLS / 2) * 1.001;

/** How far a function of the angle that is a sine wave of height 1 goes from its tangent over half a cell, with room for rounding. */
const BEND = (HALF * HALF) / 2 + 2 ** -48;

/** Cosine and sine in the middle of each cell. */
const MIDDLE = { cos: new Float64Array(CELLS), sin: new Float64Array(CELLS) };
for (let k = 0; k < CELLS; k++) {
  MIDDLE.cos[k] = Math.cos(((k + 0.5) * Math.PI) / CELLS);
  MIDDLE.sin[k] = Math.sin(((k + 0.5) * Math.PI) / CELLS);
}

/**
 * Length of the rounding error of X cos a - Y sin a and X sin a + Y cos a, two products and a sum each, whatever the
 * angle: not all of these numbers can be large at once.
 *
 * @param X range of the first number
 * @param Y range of the second number
 * @param off distance of (cos a, sin a) from the unit circle
 * @param format arithmetic of the lines
 */
export function rotationRounding(X: Span, Y: Span, off: number, format: Format): number {
  const [x, y] = [(X.lo + X.hi) / 2, (Y.lo + Y.hi) / 2];
  const [dx, dy] = [(X.hi - X.lo) / 2, (Y.hi - Y.lo) / 2];
  const [mx, my] = [Math.abs(x) + dx, Math.abs(y) + dy];
  if (!(mx < Infinity && my < Infinity)) return Infinity;
  const reach = Math.sqrt(mx * mx + my * my) * (BEND + 2 * off);
  let most = 0;
  for (let k = 0; k < CELLS; k++) {
    const c = MIDDLE.cos[k]!;
    const s = MIDDLE.sin[k]!;
    const [cm, sm] = [Math.abs(c), Math.abs(s)];
    const ch = cm + sm * HALF + BEND + off;
    const sh = sm + cm * HALF + BEND + off;
    const p = Math.abs(x * c - y * s) + ch * dx + sh * dy; // each is the slope of the other
    const q = Math.abs(x * s + y * c) + sh * dx + ch * dy;
    const first = component(mx * ch, my * sh, p + q * HALF + reach, format);
    const second = component(mx * sh, my * ch, q + p * HALF + reach, format);
    most = Math.max(most, first * first + second * second);
  }
  return Math.sqrt(most) * (1 + 2 ** -50);
}

/** Two products and their sum, of which the exact one has at most the given magnitude. */
function component(a: number, b: number, whole: number, format: Format): number {
  const products = halfUnit(a, format) + halfUnit(b, format);
  return products + halfUnit(whole + products, format);
}
