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
  return `Error ${key}: at most ${ceilTo3(certified)} (certified over the domain), ${ceilTo3(observed)} observed.`;
}

function notesOf(kernel: Kernel, proofs: readonly GroupProof[]): ReadonlyMap<number, string> {
  const known = new Map(proofs.flatMap(({ ranges }) => [...ranges]));
  const ranges = lineRanges(kernel, known);
  const notes = new Map<number, string>();
  for (const [k, line] of kernel.lines.entries()) {
    if (line.operation === 'input' || line.operation === 'constant') continue;
    const { lo, hi } = ranges[k]!;
    const range =
      Number.isFinite(lo) && Number.isFinite(hi) ? [`[${outward(lo, -1)}, ${outward(hi, 1)}]`] : [];
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

/** A number in four digits, rounded away from what lies on the other side. */
function outward(x: number, side: -1 | 1): string {
  if (x === 0) return '0';
  const unit = 10 ** (Math.floor(Math.log10(Math.abs(x))) - 3);
  let steps = side * Math.floor((side * x) / unit);
  const text = () => String(Number((steps * unit).toPrecision(4)));
  while (side * (Number(text()) - x) < 0) steps += side;
  return text();
}

/** Three digits, rounded up. */
function ceilTo3(x: number): string {
  const short = Number(x.toPrecision(3));
  const unit = 10 ** (Math.floor(Math.log10(x)) - 2);
  return (short >= x ? short : short + unit).toPrecision(3);
}
