import type { Kernel } from '../kernel/kernel.ts';
import { Backward } from './backward.ts';
import { Forward } from './forward.ts';
import type { Entry, RealKind } from './tape.ts';

/**
 * Rounding analysis of a few lines of a kernel, from given lines to given results: every line an entry with its own
 * rounding. What the lines compute exactly is compared with the block's function elsewhere.
 */
export class LineTape {
  readonly forward: Forward;
  private readonly backward: Backward;
  private readonly entryOf = new Map<number, number>();
  private readonly outputs: readonly number[];
  private readonly lo: Float64Array;
  private readonly hi: Float64Array;

  /**
   * @param kernel the kernel
   * @param from lines that are inputs, in the order of the spans of `run`
   * @param to lines whose rounding errors are wanted
   */
  constructor(kernel: Kernel, from: readonly number[], to: readonly number[]) {
    const entries: Entry[] = [];
    const visit = (line: number): number => {
      const known = this.entryOf.get(line);
      if (known !== undefined) return known;
      const { operation, args, format, value } = kernel.lines[line]!;
      const place = from.indexOf(line);
      let entry: Entry;
      if (place >= 0) entry = { kind: 'input', name: String(place), line };
      else if (operation === 'constant') entry = { kind: 'constant', value, error: 0, line };
      else if (operation === 'input') throw new Error(`line ${line} is an input outside the block`);
      else entry = { kind: operation as RealKind, args: args.map(visit), format, line };
      this.entryOf.set(line, entries.push(entry) - 1);
      return entries.length - 1;
    };
    this.outputs = to.map(visit);
    for (const line of from) visit(line);
    this.forward = new Forward(
      { entries, outputs: this.outputs, node: null, orbit: null },
      from.map((_, k) => String(k)),
      [],
    );
    this.backward = new Backward(this.forward);
    this.lo = new Float64Array(from.length);
    this.hi = new Float64Array(from.length);
  }

  /** Ranges for inputs that lie in the given spans (lower and upper ends, in the order of `from`). */
  ranges(lo: readonly number[], hi: readonly number[]): void {
    this.lo.set(lo);
    this.hi.set(hi);
    this.forward.run(this.lo, this.hi);
  }

  /** The range of a line after `ranges`. */
  rangeOf(line: number): readonly [number, number] {
    const k = this.entryOf.get(line)!;
    return [this.forward.value.lo[k]!, this.forward.value.hi[k]!];
  }

  /** Rounding errors of the results over the spans: bounds on |computed - what the same lines give exactly|. */
  errors(lo: readonly number[], hi: readonly number[]): readonly number[] {
    this.ranges(lo, hi);
    this.backward.run();
    const { mid, rad, count } = this.backward;
    const { local } = this.forward;
    return this.outputs.map((_, i) => {
      let sum = 0;
      for (let k = 0; k < local.length; k++)
        if (local[k]! !== 0) sum += local[k]! * (Math.abs(mid[k * count + i]!) + rad[k * count + i]!);
      return sum * (1 + 2 ** -40);
    });
  }
}
