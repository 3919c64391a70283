import * as pairs from '../numbers/double-double.ts';
import * as functions from '../numbers/double-double-functions.ts';
import { inOrder } from './graph.ts';
import type { Node, Operation } from './node.ts';

/** A number as an unevaluated sum of two float64 numbers, good to about 30 digits. */
export interface Pair {
  readonly hi: number;
  readonly lo: number;
}

/** One operation with its registers: d is the target. */
interface Step {
  readonly operation: Operation;
  readonly d: number;
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly e: number;
}

/**
 * Evaluates nodes of a formula in double-double arithmetic: the judge of every kernel. A float64 evaluation
 * would itself be as far from the formula as a float64 kernel.
 */
export class Evaluator {
  private readonly steps: readonly Step[];
  private readonly registers: pairs.Pairs;
  private readonly slots = new Map<Node, number>();
  private readonly inputs: readonly (readonly [name: string, slot: number])[];

  private readonly given: readonly Node[];

  /**
   * @param roots nodes whose values are wanted
   * @param given nodes whose values `runFrom` takes, whatever they are made of
   */
  constructor(roots: readonly Node[], given: readonly Node[] = []) {
    this.given = given;
    const order = inOrder(roots, given);
    this.registers = new pairs.Pairs(order.length);
    for (const [slot, node] of order.entries()) {
      this.slots.set(node, slot);
      if (node.operation === 'constant') pairs.set(this.registers, slot, node.value);
    }
    this.inputs = order
      .filter((node) => node.operation === 'input')
      .map((node) => [node.name, this.slots.get(node)!] as const);
    this.steps = order
      .filter((node) => node.args.length > 0 && !given.includes(node))
      .map((node) => {
        const [a = 0, b = 0, c = 0, e = 0] = node.args.map((arg) => this.slot(arg));
        return { operation: node.operation, d: this.slot(node), a, b, c, e };
      });
  }

  /** Evaluates all nodes for the given inputs. */
  run(values: Readonly<Record<string, number>>): void {
    for (const [name, slot] of this.inputs) {
      const value = values[name];
      if (value === undefined) throw new RangeError(`no value for ${name}`);
      pairs.set(this.registers, slot, value);
    }
    for (const step of this.steps) this.step(step);
  }

  /** Evaluates all nodes for given values of the given nodes. */
  runFrom(values: readonly number[]): void {
    for (const [k, node] of this.given.entries()) pairs.set(this.registers, this.slot(node), values[k]!);
    for (const step of this.steps) this.step(step);
  }

  /** The value of a node in the last run. */
  value(node: Node): Pair {
    const slot = this.slot(node);
    return { hi: this.registers.hi[slot]!, lo: this.registers.lo[slot]! };
  }

  /** A float64 number minus the value of a node in the last run, rounded once at the end. */
  difference(computed: number, node: Node): number {
    const slot = this.slot(node);
    return computed - this.registers.hi[slot]! - this.registers.lo[slot]!;
  }

  private slot(node: Node): number {
    const slot = this.slots.get(node);
    if (slot === undefined) throw new RangeError('the node is not part of this evaluation');
    return slot;
  }

  private step({ operation, d, a, b, c, e }: Step): void {
    const r = this.registers;
    switch (operation) {
      case 'sin':
      case 'cos':
        return functions[operation](r, d, a);
      case 'atan2':
      case 'kepler':
        return functions[operation](r, d, a, b);
      case 'offset':
        return functions.keplerOffset(r, d, a, b, c);
      case 'select':
        return pairs.set(r, d, ...this.pick(pairs.compare(r, a, b) < 0 ? c : e));
      case 'add':
      case 'sub':
      case 'mul':
      case 'div':
        return pairs[operation](r, d, a, b);
      case 'input':
      case 'constant':
        return;
      default:
        return pairs[operation](r, d, a);
    }
  }

  private pick(slot: number): [number, number] {
    return [this.registers.hi[slot]!, this.registers.lo[slot]!];
  }
}
