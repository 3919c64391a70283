import type { GroupProof } from '../bound/certify.ts';
import { lineRanges } from '../bound/line-ranges.ts';
import type { Kernel } from '../kernel/kernel.ts';
import type { Remarks } from './variant.ts';

/** An error that is proven and one that was seen. */
export interface ErrorPair {
  readonly certified: number;
  readonly observed: number;
}

/** Shares below this are not told. */
const LEAST_SHARE = 0.0005;

/**
 * What the file of a kernel says of its errors: a sentence an output, and the range and share of every line.
 *
 * @param kernel the kernel
 * @param errors errors by the key of their output
 * @param proofs what was proven of it
 */
export function remarksOf(
  kernel: Kernel,
  errors: Readonly<Record<string, ErrorPair>>,
  proofs: readonly GroupProof[],
): Remarks {
  return {
    errors: Object.entries(errors).map(([key, entry]) => errorSentence(key, entry)),
    notes: notesOf(kernel, proofs),
  };
}

/** One sentence on the error of an output: figures are rounded up. */
function errorSentence(key: string, { certified, observed }: ErrorPair): string {
  const figure = (x: number) => outward(x, 1, 3).toPrecision(3);
  return `Error ${key}: at most ${figure(certified)} (certified over the domain), ${figure(observed)} observed.`;
}

function notesOf(kernel: Kernel, proofs: readonly GroupProof[]): ReadonlyMap<number, string> {
  const known = new Map(proofs.flatMap(({ ranges }) => [...ranges]));
  const ranges = lineRanges(kernel, known);
  const notes = new Map<number, string>();
  for (const [k, line] of kernel.lines.entries()) {
    if (line.operation === 'input' || line.operation === 'constant') continue;
    const { lo, hi } = ranges[k]!;
    const range =
      Number.isFinite(lo) && Number.isFinite(hi) ? [`[${outward(lo, -1, 4)}, ${outward(hi, 1, 4)}]`] : [];
    const shares = proofs.flatMap(({ group, shares: list }) => {
      const share = list.get(k) ?? 0;
      if (share < LEAST_SHARE) return [];
      return [`${(100 * share).toFixed(1)} %${proofs.length > 1 ? ` of ${group}` : ''}`];
    });
    const parts = [...range, ...shares];
    if (parts.length > 0) notes.set(k, parts.join(', '));
  }
  return notes;
}

/** The number of so many digits next to a number on one side, or the number itself. */
function outward(x: number, side: -1 | 1, digits: number): number {
  if (x === 0) return 0;
  const unit = 10 ** (Math.floor(Math.log10(Math.abs(x))) + 1 - digits);
  let steps = side * Math.floor((side * x) / unit);
  const found = () => Number((steps * unit).toPrecision(digits));
  while (side * (found() - x) < 0) steps += side;
  return found();
}
