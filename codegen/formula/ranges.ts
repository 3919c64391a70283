import type { Domain } from '../../src/models/description.ts';
import * as interval from '../numbers/interval.ts';
import type { Node } from './node.ts';

/** A closed range of real numbers. */
export interface Bounds {
  readonly lo: number;
  readonly hi: number;
}

/** Ranges of nodes over a domain, proven by interval arithmetic and by facts that rules assert. */
export class Ranges {
  private readonly domain: Domain;
  private readonly registers: interval.Intervals;
  private readonly slots = new Map<Node, number>();
  private readonly capacity: number;

  /**
   * @param domain ranges of the inputs
   * @param capacity most nodes that the analysis can hold
   */
  constructor(domain: Domain, capacity = 16384) {
    this.domain = domain;
    this.capacity = capacity;
    this.registers = new interval.Intervals(capacity);
  }

  /** The range of a node. */
  of(node: Node): Bounds {
    const slot = this.slot(node);
    return { lo: this.registers.lo[slot]!, hi: this.registers.hi[slot]! };
  }

  /** The largest magnitude of a node. */
  magnitude(node: Node): number {
    const { lo, hi } = this.of(node);
    return Math.max(-lo, hi);
  }

  /** Fixes the range of a node by a fact that intervals cannot see; must come before the node's users are asked. */
  assert(node: Node, bounds: Bounds): void {
    const slot = this.slots.get(node) ?? this.allot(node);
    this.registers.lo[slot] = bounds.lo;
    this.registers.hi[slot] = bounds.hi;
  }

  private allot(node: Node): number {
    const slot = this.slots.size;
    if (slot >= this.capacity) throw new RangeError(`an analysis holds at most ${this.capacity} nodes`);
    this.slots.set(node, slot);
    return slot;
  }

  private slot(node: Node): number {
    const known = this.slots.get(node);
    if (known !== undefined) return known;
    const args = node.args.map((arg) => this.slot(arg));
    const slot = this.allot(node);
    this.evaluate(node, slot, args);
    return slot;
  }

  private evaluate(node: Node, slot: number, args: readonly number[]): void {
    const r = this.registers;
    const [a, b, c, d] = args as [number, number, number, number];
    switch (node.operation) {
      case 'input': {
        const range = this.domain[node.name];
        if (range === undefined) throw new RangeError(`the domain has no range for ${node.name}`);
        return interval.set(r, slot, range.min, range.max);
      }
      case 'constant':
        return interval.set(r, slot, node.value, node.value);
      case 'offset': // |E - M| = |e sin E| <= e
        return interval.set(r, slot, -r.hi[c]!, r.hi[c]!);
      case 'kepler':
        return interval.keplerE(r, slot, a, b);
      case 'mul':
        return a === b ? interval.sqr(r, slot, a) : interval.mul(r, slot, a, b);
      case 'select':
        return interval.select(r, slot, a, b, c, d);
      case 'atan2':
        return interval.atan2(r, slot, a, b);
      case 'sin':
      case 'cos':
        return interval[node.operation](r, slot, a);
      case 'add':
      case 'sub':
      case 'div':
        return interval[node.operation](r, slot, a, b);
      default:
        return interval[node.operation](r, slot, a);
    }
  }
}
