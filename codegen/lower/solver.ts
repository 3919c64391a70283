import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import { type Bounds, Ranges } from '../formula/ranges.ts';
import type { Choices } from '../kernel/choices.ts';
import { applyFunction } from '../read/function.ts';

const STARTERS = new URL('../../src/kepler/starters.ts', import.meta.url);
const CORRECTORS = new URL('../../src/kepler/correctors.ts', import.meta.url);

/** Cells of the mean anomaly and of the eccentricity over which the ranges of the iterates are taken. */
const CELLS = { M: 96, e: 8 } as const;

/**
 * The iterates of a capped solver for D = e sin(M + D): the starter and `cap` corrections.
 *
 * @param graph graph of the arguments
 * @param offset the node that stands for the exact D
 * @param choices starter, corrector and cap
 */
export function iterates(graph: Graph, offset: Node, choices: Choices): readonly Node[] {
  const [sinM, cosM, e] = offset.args as [Node, Node, Node];
  const list = [applyFunction(graph, STARTERS, choices.starter, [sinM, cosM, e])];
  for (let step = 0; step < choices.cap; step++) {
    list.push(applyFunction(graph, CORRECTORS, choices.corrector, [list.at(-1)!, sinM, cosM, e]));
  }
  return list;
}

/**
 * Ranges of the iterates over every M and the given eccentricities: the hull of interval evaluations over cells,
 * since one interval evaluation of Newton's step over the whole circle would hold a slope of zero.
 *
 * @param offset the node that stands for the exact D
 * @param list its iterates
 * @param e range of the eccentricity
 */
export function iterateRanges(offset: Node, list: readonly Node[], e: Bounds): readonly Bounds[] {
  const [sinM, cosM, eNode] = offset.args as [Node, Node, Node];
  const hull = list.map(() => ({ lo: Infinity, hi: -Infinity }));
  for (let i = 0; i < CELLS.M; i++) {
    const lo = (2 * Math.PI * i) / CELLS.M - Math.PI;
    const M = { lo: lo - 1e-9, hi: lo + (2 * Math.PI) / CELLS.M + 1e-9 };
    for (let j = 0; j < CELLS.e; j++) {
      const width = (e.hi - e.lo) / CELLS.e;
      const cell = new Ranges({}, 512);
      cell.assert(sinM, turnRange(M, Math.sin, Math.PI / 2));
      cell.assert(cosM, turnRange(M, Math.cos, 0));
      cell.assert(eNode, { lo: e.lo + j * width, hi: e.lo + (j + 1) * width });
      for (const [k, node] of list.entries()) {
        const { lo: least, hi: most } = cell.of(node);
        hull[k] = { lo: Math.min(hull[k]!.lo, least), hi: Math.max(hull[k]!.hi, most) };
      }
    }
  }
  return hull;
}

/** Range of a sine or cosine over less than a quarter turn; its extremes lie at `peak` + k pi. */
function turnRange(angle: Bounds, f: (x: number) => number, peak: number): Bounds {
  const k = Math.ceil((angle.lo - peak) / Math.PI);
  const inside = peak + k * Math.PI <= angle.hi ? [k % 2 === 0 ? 1 : -1] : [];
  const values = [f(angle.lo), f(angle.hi), ...inside];
  return { lo: Math.min(...values) - 1e-12, hi: Math.max(...values) + 1e-12 };
}
