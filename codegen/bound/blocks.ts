import type { Node } from '../formula/node.ts';
import { Ranges } from '../formula/ranges.ts';
import type { Lowered } from '../lower/lower.ts';
import { type Blocks, roundLineOf } from './build.ts';
import { sineErrors } from './sine-block.ts';
import { solverErrors } from './solver-block.ts';
import type { SineErrors, SolverErrors } from './tape.ts';
import type { Turn } from './turns.ts';

/** An eccentricity may have been rounded to float32. */
const ROUNDED = 1 + 2 ** -22;

/** Local errors of the blocks of a lowered kernel, proven when first asked for. */
export class KernelBlocks implements Blocks {
  private readonly lowered: Lowered;
  private readonly sines = new Map<Node, SineErrors>();
  private readonly solvers = new Map<Node, SolverErrors>();

  constructor(lowered: Lowered) {
    this.lowered = lowered;
  }

  sine(turn: Turn): SineErrors {
    const known = this.sines.get(turn.cos);
    if (known !== undefined) return known;
    const { kernel, lineOf, replacements } = this.lowered;
    const angle = this.lineOfAngle(turn);
    const lines = { angle, cos: lineOf.get(turn.cos) ?? -1, sin: lineOf.get(turn.sin) ?? -1 };
    const radius = (replacements.get(turn.cos) ?? replacements.get(turn.sin))!.radius!;
    const made = sineErrors(kernel, lines, radius);
    this.sines.set(turn.cos, made);
    return made;
  }

  solver(offset: Node): SolverErrors {
    const known = this.solvers.get(offset);
    if (known !== undefined) return known;
    const { lo, hi } = new Ranges(this.lowered.kernel.domain).of(offset.args[2]!);
    const made = solverErrors(this.lowered, offset, { lo: lo / ROUNDED, hi: hi * ROUNDED }, this);
    this.solvers.set(offset, made);
    return made;
  }

  /** The line that the block reads as its angle: rounded to the block's format where the angle is not. */
  private lineOfAngle(turn: Turn): number {
    const { kernel, lineOf } = this.lowered;
    const line = lineOf.get(turn.angle!)!;
    const format = kernel.choices[turn.cos.stage === 'tick' ? 'tick' : 'setup'];
    return kernel.lines[line]!.format === format ? line : roundLineOf(kernel, line);
  }
}
