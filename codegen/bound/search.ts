import type { Box, Proof } from './proof.ts';
import { WidthCosts } from './widths.ts';

/** How long a proof goes on: the bound holds whenever it stops, more boxes only tighten it. */
export interface ProofEffort {
  /** Boxes evaluated. */
  readonly boxes: number;
}

/** What a subdivision found. */
export interface Certified {
  /** Bound on the error over the whole domain. */
  readonly bound: number;
  /** Boxes evaluated. */
  readonly boxes: number;
  /** The boxes with the largest bounds, largest first. */
  readonly worst: readonly Box[];
  /** Bounds on the parts of the error along the three axes of an orbit, over the whole domain; null without such axes. */
  readonly axes: readonly [number, number, number] | null;
}

/** Costs of widths are measured at each of the first generations of halving, and from then on once in so many. */
const LASTING = 8;

/** A bound that is this near to that of a small box is not worth more boxes. */
const CLOSE = 1.001;

/** Boxes that are kept for the observed side. */
const KEPT = 64;

/**
 * Best-first subdivision: the box with the largest bound is halved in the variable whose width costs most there, until
 * the effort is used up or nothing is left to gain.
 *
 * @param proof bounds over boxes
 * @param effort how many boxes
 * @param progress told the share done
 */
export function subdivide(
  proof: Proof,
  effort: ProofEffort,
  progress: (share: number) => void = () => {},
): Certified {
  const widths = new WidthCosts(proof);
  const heap = new Heap();
  let halved = 0;
  const push = (limit: number, box: Box, costs: Float64Array, generation: number): void => {
    halved++;
    heap.push({ bound: Math.min(limit, proof.bound(box)), axes: proof.axes(), box, costs, generation });
  };
  const root = proof.root();
  push(Infinity, root, new Float64Array(root.lo.length), 0);
  while (halved + widths.evaluations < effort.boxes) {
    const { box, bound, generation, costs: known } = heap.top()!;
    if (bound <= widths.largest * CLOSE) break;
    const costs = generation < LASTING || generation % LASTING === 0 ? widths.of(box) : known;
    const variable = costliest(box, costs);
    if (variable < 0) break;
    heap.pop();
    for (const half of halves(box, variable)) push(bound, half, costs, generation + 1);
    progress((halved + widths.evaluations) / effort.boxes);
  }
  const boxes = halved + widths.evaluations;
  return { bound: heap.top()!.bound, boxes, worst: heap.largest(KEPT), axes: heap.axes() };
}

/** The variable whose width in a box costs most; -1 when none can be divided. */
function costliest(box: Box, costs: Float64Array): number {
  let best = -1;
  let most = -1;
  for (let k = 0; k < costs.length; k++) {
    const cost = costs[k]! * (box.hi[k]! - box.lo[k]!);
    const cut = middle(box.lo[k]!, box.hi[k]!);
    if (cost > most && cut > box.lo[k]! && cut < box.hi[k]!) {
      most = cost;
      best = k;
    }
  }
  return best;
}

function halves(box: Box, variable: number): readonly [Box, Box] {
  const cut = middle(box.lo[variable]!, box.hi[variable]!);
  const [left, right] = [
    { lo: box.lo, hi: box.hi.slice() },
    { lo: box.lo.slice(), hi: box.hi },
  ];
  left.hi[variable] = cut;
  right.lo[variable] = cut;
  return [left, right];
}

function middle(lo: number, hi: number): number {
  return lo + (hi - lo) / 2;
}

interface Ranked {
  readonly bound: number;
  readonly axes: readonly [number, number, number] | null;
  readonly box: Box;
  /** What a unit of width of each variable costs about here. */
  readonly costs: Float64Array;
  /** How many times the domain has been halved to make the box. */
  readonly generation: number;
}

/** Boxes by their bound, the largest on top. */
class Heap {
  private readonly items: Ranked[] = [];

  top(): Ranked | undefined {
    return this.items[0];
  }

  push(item: Ranked): void {
    const { items } = this;
    let at = items.push(item) - 1;
    while (at > 0) {
      const parent = (at - 1) >> 1;
      if (items[parent]!.bound >= items[at]!.bound) break;
      this.swap(at, parent);
      at = parent;
    }
  }

  pop(): void {
    const { items } = this;
    const last = items.pop()!;
    if (items.length === 0) return;
    items[0] = last;
    for (let at = 0; ; ) {
      const [left, right] = [2 * at + 1, 2 * at + 2];
      let largest = at;
      if (left < items.length && items[left]!.bound > items[largest]!.bound) largest = left;
      if (right < items.length && items[right]!.bound > items[largest]!.bound) largest = right;
      if (largest === at) return;
      this.swap(at, largest);
      at = largest;
    }
  }

  /** The boxes with the largest bounds. */
  largest(count: number): readonly Box[] {
    return [...this.items]
      .sort((a, b) => b.bound - a.bound)
      .slice(0, count)
      .map(({ box }) => box);
  }

  /** The largest bound along each axis over all boxes. */
  axes(): readonly [number, number, number] | null {
    const most: [number, number, number] = [0, 0, 0];
    for (const { axes } of this.items) {
      if (axes === null) return null;
      for (const k of [0, 1, 2] as const) most[k] = Math.max(most[k], axes[k]);
    }
    return most;
  }

  private swap(a: number, b: number): void {
    const { items } = this;
    [items[a], items[b]] = [items[b]!, items[a]!];
  }
}
