import type { Bounds } from '../formula/ranges.ts';

/** Bound on the error of a solver over a cell, and the part of it that the lines of the last step round, rad. */
export interface CellError {
  readonly error: number;
  readonly rounding: number;
}

/** Errors of a solver, by mean anomaly and eccentricity. */
export interface ErrorsByCell {
  /** Largest error for intervals of M (any turn, rad) and e, rad. */
  offset(M: Bounds, e: Bounds): number;
}

/** Cells of the mean anomaly in the table of errors. */
const CELLS_OF_M = 192;

/** Cells of the eccentricity: at least `least`, and so many for every factor of e that 1 - e falls by. */
const CELLS_OF_E = { least: 8, perFactor: 8 } as const;

/** A cell is divided where its width, and not the rounding of lines, makes most of its error. */
const DIVIDE = { depth: 5, above: 1.25, worth: 0.8 } as const;

/** Room at the edges of cells, rad and 1. */
const EDGE = 1e-9;

/**
 * Errors of a capped solver by cells of the mean anomaly and the eccentricity.
 *
 * @param e range of the eccentricity
 * @param cellError bound over a cell
 */
export function errorsByCell(e: Bounds, cellError: (M: Bounds, e: Bounds) => CellError): ErrorsByCell {
  const M = anomalyEdges(e.hi);
  const edges = eccentricityEdges(e);
  const rows = edges.length - 1;
  const table = new Float64Array(CELLS_OF_M * rows);
  for (let i = 0; i < CELLS_OF_M; i++) {
    for (let j = 0; j < rows; j++) {
      const cell = { lo: Math.max(0, edges[j]! - EDGE), hi: Math.min(edges[j + 1]! + EDGE, e.hi) };
      table[i * rows + j] = divided(cellError, { lo: M[i]! - EDGE, hi: M[i + 1]! + EDGE }, cell, 0);
    }
  }
  return {
    offset: (span, range) => {
      if (!(range.hi <= e.hi) || !(span.hi >= span.lo)) return Infinity;
      const [from, to] = [place(edges, range.lo), place(edges, range.hi)];
      const most = (lo: number, hi: number): number => {
        let largest = 0;
        for (let i = place(M, lo), last = place(M, hi); i <= last; i++)
          for (let j = from; j <= to; j++) largest = Math.max(largest, table[i * rows + j]!);
        return largest;
      };
      if (span.hi - span.lo >= 2 * Math.PI) return most(-Math.PI, Math.PI);
      const turns = Math.round((span.lo + span.hi) / (4 * Math.PI)) * 2 * Math.PI;
      const [lo, hi] = [span.lo - turns - EDGE / 2, span.hi - turns + EDGE / 2];
      if (lo < -Math.PI) return Math.max(most(-Math.PI, hi), most(lo + 2 * Math.PI, Math.PI));
      if (hi > Math.PI) return Math.max(most(lo, Math.PI), most(-Math.PI, hi - 2 * Math.PI));
      return most(lo, hi);
    },
  };
}

/** Edges of cells from -pi to pi, closer together towards 0 the more eccentric the orbits are. */
function anomalyEdges(e: number): Float64Array {
  const half = CELLS_OF_M / 2;
  const bend = e / (1 - e);
  const edge = (x: number) => (Math.PI * (x + bend * x * x)) / (1 + bend);
  return Float64Array.from({ length: CELLS_OF_M + 1 }, (_, i) =>
    i < half ? -edge(1 - i / half) : edge(i / half - 1),
  );
}

/** Edges of cells over a range of the eccentricity: equal steps of log(1 - e). */
function eccentricityEdges(e: Bounds): Float64Array {
  const fall = Math.log((1 - e.lo) / (1 - e.hi));
  const cells = Math.max(CELLS_OF_E.least, Math.ceil(fall * CELLS_OF_E.perFactor));
  const edges = Float64Array.from(
    { length: cells + 1 },
    (_, j) => 1 - (1 - e.lo) * Math.exp((-fall * j) / cells),
  );
  edges[0] = e.lo;
  edges[cells] = e.hi;
  return edges;
}

/** The cell that a number lies in; the first or last for one beyond the edges. */
function place(edges: Float64Array, x: number): number {
  let [low, high] = [0, edges.length - 2];
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (edges[middle]! <= x) low = middle;
    else high = middle - 1;
  }
  return low;
}

/** Error over a cell: the largest of its quarters' where that is worth it. */
function divided(
  cellError: (M: Bounds, e: Bounds) => CellError,
  M: Bounds,
  e: Bounds,
  depth: number,
  before = Infinity,
): number {
  const { error, rounding } = cellError(M, e);
  const settled = error <= rounding * DIVIDE.above || (error < Infinity && error > before * DIVIDE.worth);
  if (depth === DIVIDE.depth || settled) return error;
  const [middleM, middleE] = [(M.lo + M.hi) / 2, (e.lo + e.hi) / 2];
  let most = 0;
  for (const m of [
    { lo: M.lo, hi: middleM },
    { lo: middleM, hi: M.hi },
  ]) {
    for (const part of [
      { lo: e.lo, hi: middleE },
      { lo: middleE, hi: e.hi },
    ])
      most = Math.max(most, divided(cellError, m, part, depth + 1, error));
  }
  return Math.min(error, most);
}
