import type { Box, Proof } from './proof.ts';
import { widthCosts } from './widths.ts';

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

/** Boxes that are kept for the observed side. */
const KEPT = 64;

/**
 * Best-first subdivision: the box with the largest bound is halved in the variable whose width costs most there, until
 * the effort is used up.
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
  const root = proof.root();
  const weights = widthCosts(proof, root);
  const heap = new Heap();
  const rank = (limit: number, box: Box): Ranked => ({
    bound: Math.min(limit, proof.bound(box)),
    axes: proof.axes(),
    box,
  });
  heap.push(rank(Infinity, root));
  let boxes = 1;
  while (boxes < effort.boxes) {
    const top = heap.top()!;
    const variable = costliest(top.box, weights);
    if (variable < 0) break;
    heap.pop();
    for (const half of halves(top.box, variable)) heap.push(rank(top.bound, half));
    boxes += 2;
    if (boxes % 512 < 2) progress(boxes / effort.boxes);
  }
  return { bound: heap.top()!.bound, boxes, worst: heap.largest(KEPT), axes: heap.axes() };
}

/** The variable whose width in a box costs most; -1 when none can be divided. */
function costliest(box: Box, costs: Float64Array): number {
  let best = -1;
  let most = 0;
  for (let k = 0; k < costs.length; k++) {
    const cost = costs[k]! * (box.hi[k]! - box.lo[k]!) * stretch(box.lo[k]!, box.hi[k]!);
    const cut = middle(box.lo[k]!, box.hi[k]!);
    if (cost > most && cut > box.lo[k]! && cut < box.hi[k]!) {
      most = cost;
      best = k;
    }
  }
  return best;
}

/** Errors go by powers of a variable that is always positive: a range of many times its lower end costs more than its width says. */
function stretch(lo: number, hi: number): number {
  return lo > 0 ? (hi / lo) ** 4 : 1;
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
