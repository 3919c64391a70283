import * as interval from '../numbers/interval.ts';
import { inOrder } from './graph.ts';
import type { Node } from './node.ts';
import type { Bounds } from './ranges.ts';

/** A node to compute, with the first registers of itself and of its arguments. */
interface Step {
  readonly node: Node;
  readonly at: number;
  readonly args: readonly number[];
}

/**
 * Ranges of nodes and of their derivatives by some variables, over boxes: forward differentiation in interval
 * arithmetic. Leaves are given with their own derivatives.
 */
export class IntervalGradient {
  private readonly place: ReadonlyMap<Node, number>;
  private readonly steps: readonly Step[];
  private readonly registers: interval.Intervals;
  /** Registers of a node, one after the other: its range, then its derivatives. */
  private readonly width: number;
  private readonly work: number;

  /**
   * @param roots nodes that are asked for
   * @param leaves nodes that are given
   * @param variables number of variables
   */
  constructor(roots: readonly Node[], leaves: readonly Node[], variables: number) {
    const nodes = inOrder(roots, leaves);
    this.width = 1 + variables;
    this.place = new Map(nodes.map((node, k) => [node, k * this.width]));
    this.steps = nodes
      .filter((node) => !leaves.includes(node))
      .map((node) => ({
        node,
        at: this.place.get(node)!,
        args: node.args.map((arg) => this.place.get(arg)!),
      }));
    this.work = nodes.length * this.width;
    this.registers = new interval.Intervals(this.work + 4);
  }

  /** Gives a leaf its range and its derivatives. */
  give(leaf: Node, range: Bounds, derivatives: readonly Bounds[]): void {
    const at = this.place.get(leaf);
    if (at === undefined) return; // no root depends on it
    for (const [j, { lo, hi }] of [range, ...derivatives].entries())
      interval.set(this.registers, at + j, lo, hi);
  }

  /** Computes all nodes from the leaves. */
  run(): void {
    for (const step of this.steps) this.evaluate(step);
  }

  /** The range of a root. */
  range(root: Node): Bounds {
    return this.read(this.place.get(root)!);
  }

  /** The range of the derivative of a root by a variable. */
  derivative(root: Node, variable: number): Bounds {
    return this.read(this.place.get(root)! + 1 + variable);
  }

  private read(register: number): Bounds {
    return { lo: this.registers.lo[register]!, hi: this.registers.hi[register]! };
  }

  private evaluate({ node, at, args }: Step): void {
    const r = this.registers;
    const { work } = this;
    const [a = 0, b = 0, x = 0, y = 0] = args;
    const factor = work + 2;
    switch (node.operation) {
      case 'constant':
        interval.set(r, at, node.value, node.value);
        return this.each((j) => interval.set(r, at + j, 0, 0));
      case 'add':
      case 'sub':
        return this.each((j) => interval[node.operation as 'add' | 'sub'](r, at + j, a + j, b + j), true);
      case 'neg':
        return this.each((j) => interval.neg(r, at + j, a + j), true);
      case 'mul':
        if (a === b) interval.sqr(r, at, a);
        else interval.mul(r, at, a, b);
        return this.each((j) => {
          interval.mul(r, work, a, b + j);
          interval.mul(r, work + 1, b, a + j);
          interval.add(r, at + j, work, work + 1);
        });
      case 'div': // (a / b)' = (a' - (a / b) b') / b
        interval.div(r, at, a, b);
        return this.each((j) => {
          interval.mul(r, work, at, b + j);
          interval.sub(r, work, a + j, work);
          interval.div(r, at + j, work, b);
        });
      case 'sqrt': // a' / (2 sqrt a)
        interval.sqrt(r, at, a);
        interval.add(r, factor, at, at);
        return this.each((j) => interval.div(r, at + j, a + j, factor));
      case 'sin':
        interval.sin(r, at, a);
        interval.cos(r, factor, a);
        return this.each((j) => interval.mul(r, at + j, a + j, factor));
      case 'cos':
        interval.cos(r, at, a);
        interval.sin(r, factor, a);
        interval.neg(r, factor, factor);
        return this.each((j) => interval.mul(r, at + j, a + j, factor));
      case 'abs':
        interval.set(r, factor, r.lo[a]! > 0 ? 1 : -1, r.hi[a]! < 0 ? -1 : 1);
        interval.abs(r, at, a);
        return this.each((j) => interval.mul(r, at + j, a + j, factor));
      case 'select':
        interval.select(r, at, a, b, x, y);
        return this.each((j) => {
          if (r.hi[a]! < r.lo[b]!) interval.hull(r, at + j, x + j, x + j);
          else if (r.lo[a]! >= r.hi[b]!) interval.hull(r, at + j, y + j, y + j);
          else interval.put(r, at + j, -Infinity, Infinity); // there may be a step between the branches
        });
      default:
        throw new RangeError(`no derivative of ${node.operation}`);
    }
  }

  private each(act: (j: number) => void, range = false): void {
    for (let j = range ? 0 : 1; j < this.width; j++) act(j);
  }
}
