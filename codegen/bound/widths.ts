import type { Box, Proof } from './proof.ts';

/** Places at which boxes are grown: the worst of `SAMPLES` small boxes. */
const PLACES = 6;
const SAMPLES = 60;

/** A box starts with this share of every range and grows until its bound is this much above that of the start. */
const START = 2 ** -9;
const GROWTH = 1.2;

/**
 * What a unit of width of each variable costs. Small boxes are grown, always in the variable that raises the bound
 * least, until the bound is a fifth higher: the widths that they then have are worth the same, so the cost of a variable is
 * one over its width. A variable that reaches its whole range everywhere costs nothing: it is never split.
 *
 * @param proof bounds over boxes
 * @param root the whole domain
 */
export function widthCosts(proof: Proof, root: Box): Float64Array {
  const count = root.lo.length;
  const random = generator();
  const places = Array.from({ length: SAMPLES }, () => {
    const shares = Float64Array.from({ length: count }, random);
    return { shares, bound: proof.bound(boxAt(root, shares, startWidths(proof))) };
  });
  places.sort((a, b) => b.bound - a.bound);
  const costs = new Float64Array(count);
  for (const { shares } of places.slice(0, PLACES)) {
    const widths = grow(proof, root, shares);
    for (let k = 0; k < count; k++) if (widths[k]! < 1) costs[k]! += 1 / (PLACES * widths[k]!);
  }
  return costs.map((cost, k) => {
    const range = root.hi[k]! - root.lo[k]!;
    return range > 0 ? cost / range : 0;
  });
}

/** The widths of a box grown at a place, as shares of the ranges. */
function grow(proof: Proof, root: Box, shares: Float64Array): Float64Array {
  const count = shares.length;
  const widths = startWidths(proof);
  const limit = proof.bound(boxAt(root, shares, widths)) * GROWTH;
  const wider = (k: number) => {
    const tried = widths.slice();
    tried[k] = Math.min(1, 2 * tried[k]!);
    return proof.bound(boxAt(root, shares, tried));
  };
  const after = Float64Array.from(widths, (_, k) => wider(k));
  for (;;) {
    let best = -1;
    for (let k = 0; k < count; k++) if (widths[k]! < 1 && (best < 0 || after[k]! < after[best]!)) best = k;
    if (best < 0) return widths;
    const now = wider(best);
    const second = after.reduce(
      (least, value, k) => (k !== best && widths[k]! < 1 ? Math.min(least, value) : least),
      Infinity,
    );
    after[best] = now;
    if (now > second) continue; // the bound has grown since this one was looked at: another is cheaper
    if (!(now <= limit)) return widths;
    widths[best] = Math.min(1, 2 * widths[best]!);
    after[best] = wider(best);
  }
}

/** Widths to begin with: small, but whole for variables that angles of turns replace. */
function startWidths(proof: Proof): Float64Array {
  return Float64Array.from(proof.replaced, (replaced) => (replaced ? 1 : START));
}

/** The box around a place that has the given widths, inside the domain. */
function boxAt(root: Box, shares: Float64Array, widths: Float64Array): Box {
  const low = (k: number) => Math.min(Math.max(0, shares[k]! - widths[k]! / 2), 1 - widths[k]!);
  const range = (k: number) => root.hi[k]! - root.lo[k]!;
  return {
    lo: root.lo.map((lo, k) => lo + low(k) * range(k)),
    hi: root.lo.map((lo, k) => Math.min(root.hi[k]!, lo + (low(k) + widths[k]!) * range(k))),
  };
}

/** Numbers in [0, 1), the same every time. */
function generator(): () => number {
  let state = 12345;
  return () => {
    state = (Math.imul(state, 1103515245) + 12345) & 0x7fffffff;
    return state / 0x80000000;
  };
}
