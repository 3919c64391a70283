import type { Graph } from '../formula/graph.ts';
import { IntervalGradient } from '../formula/interval-gradient.ts';
import type { Node } from '../formula/node.ts';
import type { Bounds } from '../formula/ranges.ts';
import type { Corrector } from '../kernel/choices.ts';
import * as interval from '../numbers/interval.ts';
import type { CellError } from './kepler-cells.ts';

/** Room for rounding in products and sums of bounds. */
const SLACK = 1 + 2 ** -36;
const TINY = 2 ** -60;

/** Starter of a solver for Kepler's equation in the form D = e sin(M + D). */
export interface StarterNodes {
  readonly graph: Graph;
  readonly sinM: Node;
  readonly cosM: Node;
  readonly e: Node;
  /** First guess of D, of the three nodes above. */
  readonly guess: Node;
}

/**
 * How near the iterates of a solver come to the exact D = e sin(M + D) in exact arithmetic, over cells of the mean anomaly
 * and the eccentricity. Errors are intervals of (iterate - exact), rad.
 */
export class KeplerConvergence {
  private readonly starter: StarterNodes;
  private readonly residual: Node;
  private readonly gradient: IntervalGradient;
  private readonly corrector: Corrector;
  private readonly room: number;
  private readonly work: interval.Intervals = new interval.Intervals(6);

  /**
   * @param starter the starter
   * @param corrector what improves a guess
   * @param room the point (cosM, sinM) lies within this distance of the unit circle
   */
  constructor(starter: StarterNodes, corrector: Corrector, room = 0) {
    const { graph, sinM, cosM, e, guess } = starter;
    const sine = graph.make(
      'add',
      graph.make('mul', sinM, graph.make('cos', guess)),
      graph.make('mul', cosM, graph.make('sin', guess)),
    );
    this.starter = starter;
    this.corrector = corrector;
    this.room = room;
    this.residual = graph.make('sub', guess, graph.make('mul', e, sine));
    this.gradient = new IntervalGradient([this.residual, guess], [sinM, cosM, e], 2);
  }

  /**
   * Bound on the error of a solver over a cell, rad; Infinity where none is found.
   *
   * @param M mean anomaly
   * @param e eccentricity
   * @param cap number of corrections
   * @param rounding error that the lines of the starter (0) or a correction (1 to cap) add, for D in a range
   */
  error(
    M: Bounds,
    e: Bounds,
    cap: number,
    rounding: (iterate: number, D: Bounds) => number = () => 0,
  ): CellError {
    const exact = this.exact(M, e);
    const grown = ({ lo, hi }: Bounds, by: number): Bounds => ({ lo: lo - by, hi: hi + by });
    let added = rounding(0, exact);
    let error = grown(this.start(M, e, exact), added);
    for (let k = 1; k <= cap; k++) {
      added = rounding(k, { lo: exact.lo + error.lo, hi: exact.hi + error.hi });
      error = grown(this.step(M, e, exact, error), added);
    }
    const most = Math.max(-error.lo, error.hi) * SLACK;
    return Number.isNaN(most) ? { error: Infinity, rounding: 0 } : { error: most, rounding: added };
  }

  /** Range of the exact D over a cell. */
  exact(M: Bounds, e: Bounds): Bounds {
    const w = this.work;
    interval.set(w, 0, M.lo, M.hi);
    interval.set(w, 1, e.lo, e.hi);
    interval.keplerOffset(w, 2, 0, 1);
    const off = (e.hi * this.room) / (1 - e.hi * (1 + this.room));
    return { lo: w.lo[2]! - off * SLACK, hi: w.hi[2]! + off * SLACK };
  }

  /** Error of the starter: its residual over the least slope on the way to the root, or the distance of the ranges. */
  start(M: Bounds, e: Bounds, exact: Bounds): Bounds {
    const [residual, guess] = this.meanValues(M, e);
    const size = Math.max(-residual.lo, residual.hi);
    const far = size / (1 - e.hi * (1 + 2 * this.room));
    const way = size / this.slope(M, e, { lo: exact.lo - far, hi: exact.hi + far }).lo;
    return {
      lo: outward(Math.max(-way, interval.down(guess.lo - exact.hi)), -1),
      hi: outward(Math.min(way, interval.up(guess.hi - exact.lo)), 1),
    };
  }

  /**
   * Error after a correction of an iterate D = exact + x, by Taylor's theorem about D, with f = D - e sin(M + D):
   *
   *     Newton   x' = x - f / f'               = f''(p) x^2 / (2 f')
   *     Halley   x' = x - f / Q                = (f'' f''(p) x^3 / (4 f') - f'''(q) x^3 / 6) / Q,   Q = f' - f f'' / (2 f')
   *     quartic  x' = x - f / R                = (x h (f'' / 2 - f''' (x + y) / 6) + f''''(p) x^4 / 24) / R,
   *              y = x - h Halley's step, R = f' - y f'' / 2 + y^2 f''' / 6
   *
   * with p and q between D and the exact value.
   */
  step(M: Bounds, e: Bounds, exact: Bounds, error: Bounds): Bounds {
    const at = { lo: exact.lo + error.lo, hi: exact.hi + error.hi };
    const between = { lo: exact.lo + Math.min(0, error.lo), hi: exact.hi + Math.max(0, error.hi) };
    const slope = this.slope(M, e, at).lo;
    const x = Math.max(-error.lo, error.hi) * SLACK;
    const second = this.eSine(M, e, between);
    if (this.corrector === 'newton') {
      const most = (size: number) => ((Math.max(0, size) * x * x) / (2 * slope)) * SLACK;
      return { lo: -most(-second.lo), hi: most(second.hi) };
    }
    const bend = Math.max(-second.lo, second.hi);
    const third = largest(this.eCosine(M, e, between));
    const Q = (slope - (bend / 2) * (x + (bend * x * x) / (2 * slope)) * SLACK) / SLACK; // |f / f'| <= x + f'' x^2 / (2 f')
    const halley = Q > 0 ? (((bend * bend) / (4 * slope) + third / 6) * x * x * x * SLACK) / Q : Infinity;
    if (this.corrector === 'halley') return { lo: -halley, hi: halley };
    const y = x + halley;
    const R = (slope - ((y * bend) / 2 + (y * y * third) / 6) * SLACK) / SLACK;
    const most =
      R > 0
        ? ((x * halley * (bend / 2 + (third * (x + y)) / 6) + (bend * x ** 4) / 24) * SLACK) / R
        : Infinity;
    return { lo: -most, hi: most };
  }

  /** Range of f' = 1 - e cos(M + D); with a turn off the unit circle. */
  private slope(M: Bounds, e: Bounds, D: Bounds): Bounds {
    const { lo, hi } = this.eCosine(M, e, D);
    return { lo: Math.max(1 - e.hi * (1 + 2 * this.room), 1 - hi) / SLACK, hi: (1 - lo) * SLACK };
  }

  private eCosine(M: Bounds, e: Bounds, D: Bounds): Bounds {
    this.sum(M, D);
    interval.cos(this.work, 4, 3);
    return this.scaled(e, 4);
  }

  private eSine(M: Bounds, e: Bounds, D: Bounds): Bounds {
    this.sum(M, D);
    interval.sin(this.work, 4, 3);
    return this.scaled(e, 4);
  }

  private sum(M: Bounds, D: Bounds): void {
    const wide = !(D.hi - D.lo < 8);
    interval.set(this.work, 3, wide ? -4 : interval.down(M.lo + D.lo), wide ? 4 : interval.up(M.hi + D.hi));
  }

  /** e times a sine or cosine that may leave [-1, 1] with its turn. */
  private scaled(e: Bounds, register: number): Bounds {
    const least = this.work.lo[register]! - 2 * this.room;
    const most = this.work.hi[register]! + 2 * this.room;
    return {
      lo: Math.min(e.hi * least, e.lo * least) - TINY,
      hi: Math.max(e.hi * most, e.lo * most) + TINY,
    };
  }

  /** Ranges of the residual and of the guess: the value in the middle and the slopes times the way to the edges. */
  private meanValues(M: Bounds, e: Bounds): readonly [Bounds, Bounds] {
    const nodes = [this.residual, this.starter.guess] as const;
    this.run(middle(M), middle(e));
    const [residual, guess] = nodes.map((node) => this.gradient.range(node)) as [Bounds, Bounds];
    this.run(M, e);
    const ways = [M, e].map(({ lo, hi }) => ((hi - lo) / 2) * SLACK);
    const around = (node: Node, { lo, hi }: Bounds): Bounds => {
      const whole = this.gradient.range(node);
      const room =
        ways.reduce((sum, way, k) => sum + largest(this.gradient.derivative(node, k)) * way, 0) * SLACK;
      return {
        lo: Math.max(interval.down(lo - room), whole.lo),
        hi: Math.min(interval.up(hi + room), whole.hi),
      };
    };
    return [around(nodes[0], residual), around(nodes[1], guess)];
  }

  private run(M: Bounds, e: Bounds): void {
    const { work: w, room, gradient } = this;
    interval.set(w, 0, M.lo, M.hi);
    interval.sin(w, 1, 0);
    interval.cos(w, 2, 0);
    const [lowS, highS, lowC, highC] = [w.lo[1]!, w.hi[1]!, w.lo[2]!, w.hi[2]!];
    const grown = (lo: number, hi: number): Bounds =>
      room === 0 ? { lo, hi } : { lo: interval.down(lo - room), hi: interval.up(hi + room) };
    const none = { lo: 0, hi: 0 };
    gradient.give(this.starter.sinM, grown(lowS, highS), [{ lo: lowC, hi: highC }, none]);
    gradient.give(this.starter.cosM, grown(lowC, highC), [{ lo: -highS, hi: -lowS }, none]);
    gradient.give(this.starter.e, e, [none, { lo: 1, hi: 1 }]);
    gradient.run();
  }
}

function middle({ lo, hi }: Bounds): Bounds {
  return { lo: (lo + hi) / 2, hi: (lo + hi) / 2 };
}

/** A number moved down or up by the room for rounding. */
function outward(x: number, side: -1 | 1): number {
  return x + side * Math.abs(x) * (SLACK - 1);
}

function largest({ lo, hi }: Bounds): number {
  return Math.max(-lo, hi);
}
