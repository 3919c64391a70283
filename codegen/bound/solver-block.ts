import { type CellError, errorsByCell } from '../approximate/kepler-cells.ts';
import { KeplerConvergence } from '../approximate/kepler-convergence.ts';
import { inOrder } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Lowered } from '../lower/lower.ts';
import { Backward } from './backward.ts';
import { type Blocks, Builder } from './build.ts';
import { Forward } from './forward.ts';
import type { SineErrors, SolverErrors, Span, Tape } from './tape.ts';
import type { Turn } from './turns.ts';

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
 * In exact arithmetic the iterates come as near as their convergence says; the rounding and truncation of the lines of
 * the starter and of each step are added where they arise.
 *
 * @param lowered the kernel
 * @param offset the node of Kepler's equation
 * @param e range of the eccentricity
 * @param blocks local errors of the sines inside the solver
 */
export function solverErrors(lowered: Lowered, offset: Node, e: Span, blocks: Blocks): SolverErrors {
  const solver = new Solver(lowered, offset, blocks);
  return errorsByCell(e, (M, cell) => solver.error(M, cell));
}

/** Names of the inputs of the analyses of one cell. */
const NAMES = ['M', 'e', 'D'];

class Solver {
  private readonly lowered: Lowered;
  private readonly blocks: Blocks;
  private readonly turn: Turn;
  private readonly room: number;
  private readonly e: Node;
  private readonly convergence: KeplerConvergence;
  /** The starter, then the corrections. */
  private readonly iterates: readonly Analysis[];

  constructor(lowered: Lowered, offset: Node, blocks: Blocks) {
    const { graph } = lowered;
    const [sinM, cosM, e] = offset.args as [Node, Node, Node];
    const list = lowered.iterates.get(offset)!;
    this.lowered = lowered;
    this.blocks = blocks;
    this.e = e;
    this.room = TURN_ROOM[lowered.kernel.choices.tick];
    this.turn = { cos: cosM, sin: sinM, angle: graph.input('mean anomaly', 'tick') };
    const starter = { graph, sinM, cosM, e, guess: list[0]! };
    this.convergence = new KeplerConvergence(starter, lowered.kernel.choices.corrector, this.room);
    this.iterates = list.map((node, k) => this.analysis(node, list[k - 1]));
  }

  /** Bound on |computed D - exact D| over a cell. */
  error(M: Span, e: Span): CellError {
    return this.convergence.error(M, e, this.iterates.length - 1, (k, D) =>
      this.iterates[k]!.rounding(M, e, D),
    );
  }

  private analysis(node: Node, previous: Node | undefined): Analysis {
    const stops = new Map<Node, string>([
      [this.turn.angle!, 'M'],
      [this.e, 'e'],
    ]);
    if (previous !== undefined) stops.set(previous, 'D');
    const flat: SineErrors = {
      periodic: true,
      cos: () => this.room,
      sin: () => this.room,
      both: () => 2 * this.room,
    };
    const given = new Map([[this.turn, flat]]);
    const builder = new Builder(this.lowered, this.blocks, inOrder([node]), stops, given);
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

  private run(M: Span, e: Span, D: Span): void {
    this.lo.set([M.lo, e.lo, D.lo]);
    this.hi.set([M.hi, e.hi, D.hi]);
    this.forward.run(this.lo, this.hi);
  }
}
