import type { Lines } from './lines.ts';
import type { Token } from './tokens.ts';

/** ECMA-262 (RoundMVResult) lets an engine drop significant digits behind this many; zeros at either end are none. */
const MOST_DIGITS = 20;

/** The value of a number: decimal, finite, the same on every engine. */
export function literalOf(lines: Lines, token: Token): number {
  const { text } = token;
  const match = /^-?((?:0|[1-9]\d*)(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/.exec(text);
  if (match === null) return lines.refuse('parse.literal', token, `${text} is no plain decimal number`);
  const digits = match[1]!.replace('.', '').replace(/^0+|0+$/g, '').length;
  if (digits > MOST_DIGITS)
    return lines.refuse('parse.literal', token, `${text} has ${digits} digits, more than ${MOST_DIGITS}`);
  const value = Number(text);
  if (!Number.isFinite(value))
    return lines.refuse('parse.literal', token, `${text} is beyond the float64 numbers`);
  return value;
}
