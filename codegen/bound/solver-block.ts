import { inOrder } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Lowered } from '../lower/lower.ts';
import * as interval from '../numbers/interval.ts';
import { Backward } from './backward.ts';
import { type Blocks, Builder } from './build.ts';
import { Forward } from './forward.ts';
import type { SineErrors, SolverErrors, Span, Tape } from './tape.ts';
import type { Turn } from './turns.ts';

/** Cells of the mean anomaly and of the eccentricity in the table of errors. */
const CELLS = { M: 192, e: 8 } as const;

const CELL = (2 * Math.PI) / CELLS.M;

/** Room for rounding in sums of bounds. */
const SLACK = 1 + 2 ** -36;

/**
 * Distance from the unit circle that the turn of the mean anomaly may have in a kernel; the tape that uses the table
 * checks that it has not more.
 */
export const TURN_ROOM: Readonly<Record<'f64' | 'f32', number>> = { f64: 2 ** -48, f32: 2 ** -18 };

/**
 * Proves how far the lines of a capped solver end from the exact solution of D = e sin(M + D), over cells of the mean
 * anomaly and the eccentricity.
 *
 * Starter: |D0 - D| <= |f(D0)| / min f', the residual in mean-value form over the cell. Newton's correction: the new
 * error is at most e max|sin E| / (2 min f') times the square of the old one (Taylor), plus the rounding and truncation
 * of the step's own lines.
 *
 * @param lowered the kernel
 * @param offset the node of Kepler's equation
 * @param e range of the eccentricity
 * @param blocks local errors of the sines inside the solver
 */
export function solverErrors(lowered: Lowered, offset: Node, e: Span, blocks: Blocks): SolverErrors {
  const solver = new Solver(lowered, offset, blocks);
  const table = new Float64Array(CELLS.M * CELLS.e);
  const width = (e.hi - e.lo) / CELLS.e;
  for (let i = 0; i < CELLS.M; i++) {
    const M = { lo: i * CELL - Math.PI - 1e-9, hi: (i + 1) * CELL - Math.PI + 1e-9 };
    for (let j = 0; j < CELLS.e; j++) {
      const cell = { lo: Math.max(0, e.lo + j * width - 1e-12), hi: e.lo + (j + 1) * width + 1e-12 };
      table[i * CELLS.e + j] = solver.error(M, cell);
    }
  }
  return {
    offset: (M, range) => {
      const first = Math.floor((M.lo + Math.PI) / CELL - 1e-9);
      const last = Math.min(Math.floor((M.hi + Math.PI) / CELL + 1e-9), first + CELLS.M - 1);
      const from = Math.max(0, Math.floor((range.lo - e.lo) / width - 1e-9));
      const to = Math.min(CELLS.e - 1, Math.floor((range.hi - e.lo) / width + 1e-9));
      if (!(range.hi <= e.hi + 1e-12) || !(last >= first)) return Infinity;
      let most = 0;
      for (let i = first; i <= last; i++) {
        const row = (((i % CELLS.M) + CELLS.M) % CELLS.M) * CELLS.e;
        for (let j = from; j <= to; j++) most = Math.max(most, table[row + j]!);
      }
      return most;
    },
  };
}

/** Names of the inputs of the analyses of one cell. */
const NAMES = ['M', 'e', 'D'];

class Solver {
  private readonly lowered: Lowered;
  private readonly blocks: Blocks;
  private readonly turn: Turn;
  private readonly room: number;
  private readonly e: Node;
  private readonly residual: Analysis;
  private readonly start: Analysis;
  private readonly steps: readonly Analysis[];
  private readonly work = new interval.Intervals(6);

  constructor(lowered: Lowered, offset: Node, blocks: Blocks) {
    const { graph } = lowered;
    const [sinM, cosM, e] = offset.args as [Node, Node, Node];
    const list = lowered.iterates.get(offset)!;
    this.lowered = lowered;
    this.blocks = blocks;
    this.e = e;
    this.room = TURN_ROOM[lowered.kernel.choices.tick];
    this.turn = { cos: cosM, sin: sinM, angle: graph.input('mean anomaly', 'tick') };
    const D = list[0]!;
    const sine = graph.make(
      'add',
      graph.make('mul', sinM, graph.make('cos', D)),
      graph.make('mul', cosM, graph.make('sin', D)),
    );
    this.residual = this.analysis(graph.make('sub', D, graph.make('mul', e, sine)), undefined, false);
    this.start = this.analysis(D, undefined, true);
    this.steps = list.slice(1).map((node, k) => this.analysis(node, list[k]!, true));
  }

  /** Bound on |computed D - exact D| over a cell. */
  error(M: Span, e: Span): number {
    const w = this.work;
    interval.set(w, 0, M.lo, M.hi);
    interval.set(w, 1, e.lo, e.hi);
    interval.keplerOffset(w, 2, 0, 1);
    const off = (e.hi * this.room) / (1 - e.hi * (1 + this.room));
    const exact = { lo: w.lo[2]! - off * SLACK, hi: w.hi[2]! + off * SLACK };
    const residual = this.residual.meanValue(M, e);
    let distance =
      residual / this.derivatives(M, e, exact, residual / (1 - e.hi)).slope +
      this.start.rounding(M, e, exact);
    for (const step of this.steps) {
      const { slope, curvature } = this.derivatives(M, e, exact, distance);
      const around = { lo: exact.lo - distance, hi: exact.hi + distance };
      distance = ((curvature / (2 * slope)) * distance * distance + step.rounding(M, e, around)) * SLACK;
    }
    return distance * SLACK;
  }

  /** The least f' = 1 - e cos E and the largest |f''| = e |sin E| within a distance of the exact solution. */
  private derivatives(M: Span, e: Span, exact: Span, distance: number): { slope: number; curvature: number } {
    const w = this.work;
    const steepest = 1 - e.hi * (1 + 2 * this.room);
    if (!(distance < 8)) return { slope: steepest, curvature: e.hi * (1 + 2 * this.room) };
    interval.set(w, 3, interval.down(M.lo + exact.lo - distance), interval.up(M.hi + exact.hi + distance));
    interval.cos(w, 4, 3);
    interval.sin(w, 5, 3);
    const most = w.hi[4]! + 2 * this.room;
    const slope = 1 - Math.max(e.hi * most, e.lo * most);
    return { slope: slope / SLACK, curvature: e.hi * (Math.max(-w.lo[5]!, w.hi[5]!) + 2 * this.room) };
  }

  private analysis(node: Node, previous: Node | undefined, rounded: boolean): Analysis {
    const stops = new Map<Node, string>([
      [this.turn.angle!, 'M'],
      [this.e, 'e'],
    ]);
    if (previous !== undefined) stops.set(previous, 'D');
    const flat: SineErrors = { periodic: true, cos: () => this.room, sin: () => this.room };
    const given = new Map([[this.turn, flat]]);
    const builder = new Builder(this.lowered, rounded ? this.blocks : null, inOrder([node]), stops, given);
    return new Analysis(builder.tape([builder.real(node, 'tick')]));
  }
}

/** One scalar of the solver over cells. */
class Analysis {
  private readonly forward: Forward;
  private readonly backward: Backward;
  private readonly inputs: ReadonlyMap<string, number>;
  private readonly lo = new Float64Array(NAMES.length);
  private readonly hi = new Float64Array(NAMES.length);

  constructor(tape: Tape) {
    this.forward = new Forward(tape, NAMES, []);
    this.backward = new Backward(this.forward);
    this.inputs = new Map(
      tape.entries.flatMap((entry, k) => (entry.kind === 'input' ? [[entry.name, k] as const] : [])),
    );
  }

  /** Sum of the local errors of the lines, through their adjoints; the turn of the mean anomaly is taken as it is. */
  rounding(M: Span, e: Span, D: Span): number {
    this.run(M, e, D);
    this.backward.run();
    const { local, localSine, tape } = this.forward;
    const { mid, rad, midT, radT } = this.backward;
    let sum = 0;
    for (const [k, entry] of tape.entries.entries()) {
      if (entry.kind === 'turn') {
        if (entry.angle === this.inputs.get('M')) continue;
        const size = Math.abs(mid[k]!) + rad[k]! + Math.abs(midT[k]!) + radT[k]!;
        sum += size * (local[k]! + localSine[k]!) * 1.001;
      } else if (local[k]! > 0) {
        sum += local[k]! * (Math.abs(mid[k]!) + rad[k]!);
      }
    }
    return sum * SLACK;
  }

  /** Largest magnitude over a cell: the value in its middle and the slopes times the way to its edges. */
  meanValue(M: Span, e: Span): number {
    const middle = (span: Span) => ({ lo: (span.lo + span.hi) / 2, hi: (span.lo + span.hi) / 2 });
    const D = { lo: 0, hi: 0 };
    this.run(middle(M), middle(e), D);
    const output = this.forward.tape.outputs[0]!;
    const value = Math.max(-this.forward.value.lo[output]!, this.forward.value.hi[output]!);
    this.run(M, e, D);
    this.backward.run();
    const slope = (name: string) => {
      const k = this.inputs.get(name);
      return k === undefined ? 0 : Math.abs(this.backward.mid[k]!) + this.backward.rad[k]!;
    };
    const way = (span: Span) => ((span.hi - span.lo) / 2) * SLACK;
    return (value + slope('M') * way(M) + slope('e') * way(e)) * SLACK;
  }

  private run(M: Span, e: Span, D: Span): void {
    this.lo.set([M.lo, e.lo, D.lo]);
    this.hi.set([M.hi, e.hi, D.hi]);
    this.forward.run(this.lo, this.hi);
  }
}
