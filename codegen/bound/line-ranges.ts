import type { Kernel, Line } from '../kernel/kernel.ts';
import * as interval from '../numbers/interval.ts';
import { halfUnit } from './rounding.ts';
import type { Span } from './tape.ts';

/** Operations that round nothing. */
const EXACT: readonly string[] = ['input', 'constant', 'floor', 'neg', 'abs', 'select'];

/**
 * Ranges of the values that the lines of a kernel compute over the whole domain: interval arithmetic line by line, each
 * result rounded outward by the line's own rounding, cut to what a proof knows of it.
 *
 * @param kernel the kernel
 * @param known ranges of some lines
 */
export function lineRanges(kernel: Kernel, known: ReadonlyMap<number, Span>): readonly Span[] {
  const { lines } = kernel;
  const r = new interval.Intervals(lines.length + 1);
  for (const [k, line] of lines.entries()) {
    evaluate(r, k, line, kernel);
    const size = Math.max(-r.lo[k]!, r.hi[k]!);
    const span = known.get(k);
    const room = EXACT.includes(line.operation) ? 0 : halfUnit(size, line.format);
    const [least, most] =
      room === 0 ? [r.lo[k]!, r.hi[k]!] : [interval.down(r.lo[k]! - room), interval.up(r.hi[k]! + room)];
    interval.put(r, k, Math.max(least, span?.lo ?? -Infinity), Math.min(most, span?.hi ?? Infinity));
  }
  return lines.map((_, k) => ({ lo: r.lo[k]!, hi: r.hi[k]! }));
}

function evaluate(
  r: interval.Intervals,
  k: number,
  { operation, args, value, name }: Line,
  { domain }: Kernel,
): void {
  const [a = 0, b = 0, x = 0, y = 0] = args;
  switch (operation) {
    case 'input': {
      const { min, max } = domain[name]!;
      return interval.set(r, k, min, max);
    }
    case 'constant':
      return interval.set(r, k, value, value);
    case 'round':
      return interval.set(r, k, r.lo[a]!, r.hi[a]!);
    case 'mul':
      return a === b ? interval.sqr(r, k, a) : interval.mul(r, k, a, b);
    case 'add':
    case 'sub':
    case 'div':
      return interval[operation](r, k, a, b);
    case 'select':
      return interval.select(r, k, a, b, x, y);
    default:
      return interval[operation](r, k, a);
  }
}
