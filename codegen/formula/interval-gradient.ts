import * as interval from '../numbers/interval.ts';
import { inOrder } from './graph.ts';
import type { Node } from './node.ts';
import type { Bounds } from './ranges.ts';

/**
 * Ranges of nodes and of their derivatives by some variables, over boxes: forward differentiation in interval
 * arithmetic. Leaves are given with their own derivatives.
 */
export class IntervalGradient {
  private readonly nodes: readonly Node[];
  private readonly place: ReadonlyMap<Node, number>;
  private readonly leaves: readonly Node[];
  private readonly registers: interval.Intervals;
  /** Registers of a node: its range, then its derivatives. */
  private readonly width: number;
  private readonly work: number;

  /**
   * @param roots nodes that are asked for
   * @param leaves nodes that are given
   * @param variables number of variables
   */
  constructor(roots: readonly Node[], leaves: readonly Node[], variables: number) {
    this.leaves = leaves;
    this.nodes = inOrder(roots, leaves);
    this.place = new Map(this.nodes.map((node, k) => [node, k]));
    this.width = 1 + variables;
    this.work = this.nodes.length * this.width;
    this.registers = new interval.Intervals(this.work + 4);
  }

  /** Gives a leaf its range and its derivatives. */
  give(leaf: Node, range: Bounds, derivatives: readonly Bounds[]): void {
    const k = this.place.get(leaf);
    if (k === undefined) return; // no root depends on it
    for (const [j, { lo, hi }] of [range, ...derivatives].entries())
      interval.set(this.registers, k * this.width + j, lo, hi);
  }

  /** Computes all nodes from the leaves. */
  run(): void {
    for (const [k, node] of this.nodes.entries()) if (!this.leaves.includes(node)) this.evaluate(k, node);
  }

  /** The range of a root. */
  range(root: Node): Bounds {
    return this.read(this.place.get(root)! * this.width);
  }

  /** The range of the derivative of a root by a variable. */
  derivative(root: Node, variable: number): Bounds {
    return this.read(this.place.get(root)! * this.width + 1 + variable);
  }

  private read(register: number): Bounds {
    return { lo: this.registers.lo[register]!, hi: this.registers.hi[register]! };
  }

  private evaluate(k: number, node: Node): void {
    const r = this.registers;
    const { width, work } = this;
    const at = k * width;
    const [a = 0, b = 0, x = 0, y = 0] = node.args.map((arg) => this.place.get(arg)! * width);
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
