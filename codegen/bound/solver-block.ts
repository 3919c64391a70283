import { inOrder } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Lowered } from '../lower/lower.ts';
import * as interval from '../numbers/interval.ts';
import { Backward } from './backward.ts';
import { type Blocks, Builder } from './build.ts';
import { Forward } from './forward.ts';
import { type CellError, solverTable } from './solver-table.ts';
import type { SineErrors, SolverErrors, Span, Tape } from './tape.ts';
import type { Turn } from './turns.ts';

/** Room for rounding in sums of bounds. */
const SLACK = 1 + 2 ** -36;

/** Room for rounding in products that may be zero. */
const TINY = 2 ** -60;

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
  return solverTable(e, (M, cell) => solver.error(M, cell));
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
  error(M: Span, e: Span): CellError {
    const w = this.work;
    interval.set(w, 0, M.lo, M.hi);
    interval.set(w, 1, e.lo, e.hi);
    interval.keplerOffset(w, 2, 0, 1);
    const off = (e.hi * this.room) / (1 - e.hi * (1 + this.room));
    const exact = { lo: w.lo[2]! - off * SLACK, hi: w.hi[2]! + off * SLACK };
    const start = this.startingError(M, e, exact);
    let rounding = this.start.rounding(M, e, exact);
    let error = { lo: start.lo - rounding, hi: start.hi + rounding };
    for (const step of this.steps) {
      const at = { lo: exact.lo + error.lo, hi: exact.hi + error.hi };
      rounding = step.rounding(M, e, at);
      error = this.newton(M, e, exact, error, rounding);
    }
    const most = Math.max(-error.lo, error.hi) * SLACK;
    return Number.isNaN(most) ? { error: Infinity, rounding: 0 } : { error: most, rounding };
  }

  /** Error of the exact starter: its residual over the least slope on the way to the root, or the ranges' distance. */
  private startingError(M: Span, e: Span, exact: Span): Span {
    const residual = this.residual.range(M, e);
    const size = Math.max(-residual.lo, residual.hi);
    const far = size / (1 - e.hi * (1 + 2 * this.room));
    const way = size / this.slope(M, e, { lo: exact.lo - far, hi: exact.hi + far }).lo;
    const start = this.start.range(M, e);
    return {
      lo: Math.max(-way, interval.down(start.lo - exact.hi)) * SLACK,
      hi: Math.min(way, interval.up(start.hi - exact.lo)) * SLACK,
    };
  }

  /**
   * Error after Newton's step from D with an error in a range: f''(between) / (2 f'(D)) times the square, by Taylor's
   * theorem, plus what the lines of the step round.
   */
  private newton(M: Span, e: Span, exact: Span, error: Span, rounding: number): Span {
    const slope = this.slope(M, e, { lo: exact.lo + error.lo, hi: exact.hi + error.hi });
    const between = { lo: exact.lo + Math.min(0, error.lo), hi: exact.hi + Math.max(0, error.hi) };
    const curvature = this.curvature(M, e, between);
    const square = Math.max(error.lo * error.lo, error.hi * error.hi) * SLACK;
    const most = (size: number) => ((Math.max(0, size) * square) / (2 * slope.lo)) * SLACK + rounding;
    return { lo: -most(-curvature.lo), hi: most(curvature.hi) };
  }

  /** Range of f' = 1 - e cos(M + D); with a turn off the unit circle. */
  private slope(M: Span, e: Span, D: Span): Span {
    const steepest = 1 - e.hi * (1 + 2 * this.room);
    if (!(D.hi - D.lo < 8)) return { lo: steepest, hi: 2 };
    const w = this.work;
    this.sum(M, D);
    interval.cos(w, 4, 3);
    const [least, most] = [w.lo[4]! - 2 * this.room, w.hi[4]! + 2 * this.room];
    return {
      lo: Math.max(steepest, 1 - Math.max(e.hi * most, e.lo * most)) / SLACK,
      hi: (1 - Math.min(e.hi * least, e.lo * least)) * SLACK,
    };
  }

  /** Range of f'' = e sin(M + D); with a turn off the unit circle. */
  private curvature(M: Span, e: Span, D: Span): Span {
    const steepest = e.hi * (1 + 2 * this.room);
    if (!(D.hi - D.lo < 8)) return { lo: -steepest, hi: steepest };
    const w = this.work;
    this.sum(M, D);
    interval.sin(w, 5, 3);
    const [least, most] = [w.lo[5]! - 2 * this.room, w.hi[5]! + 2 * this.room];
    return {
      lo: Math.min(e.hi * least, e.lo * least) - TINY,
      hi: Math.max(e.hi * most, e.lo * most) + TINY,
    };
  }

  private sum(M: Span, D: Span): void {
    interval.set(this.work, 3, interval.down(M.lo + D.lo), interval.up(M.hi + D.hi));
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
      } else if (local[k]! !== 0) {
        sum += local[k]! * (Math.abs(mid[k]!) + rad[k]!);
      }
    }
    return sum * SLACK;
  }

  /** Range over a cell: the value in its middle, and the slopes times the way to its edges; or the plain range. */
  range(M: Span, e: Span): Span {
    const middle = (span: Span) => ({ lo: (span.lo + span.hi) / 2, hi: (span.lo + span.hi) / 2 });
    const D = { lo: 0, hi: 0 };
    const { value, tape } = this.forward;
    const output = tape.outputs[0]!;
    this.run(middle(M), middle(e), D);
    const [lo, hi] = [value.lo[output]!, value.hi[output]!];
    this.run(M, e, D);
    this.backward.run();
    const slope = (name: string) => {
      const k = this.inputs.get(name);
      return k === undefined ? 0 : Math.abs(this.backward.mid[k]!) + this.backward.rad[k]!;
    };
    const way = (span: Span) => ((span.hi - span.lo) / 2) * SLACK;
    const room = (slope('M') * way(M) + slope('e') * way(e)) * SLACK;
    return {
      lo: Math.max(interval.down(lo - room), value.lo[output]!),
      hi: Math.min(interval.up(hi + room), value.hi[output]!),
    };
  }

  private run(M: Span, e: Span, D: Span): void {
    this.lo.set([M.lo, e.lo, D.lo]);
    this.hi.set([M.hi, e.hi, D.hi]);
    this.forward.run(this.lo, this.hi);
  }
}
