import type { Domain } from '../../src/models/description.ts';
import type { Random } from '../numbers/random.ts';
import { clamp } from './points.ts';

/** A point as the values of the inputs, and the size of the error there. */
export interface Candidate {
  readonly values: Float64Array;
  readonly size: number;
}

/** The smallest step, as a power of two of a range: rounding errors change with the last bits of the inputs. */
const FINEST = 40;

/** How often a point takes values from another, or a fresh value of one input. */
const CROSSED = 0.15;
const FRESH = 0.1;

/** Share of the values that are taken from the other point. */
const TAKEN = 0.3;

/** Raises the errors of some points: each by steps of its own, and by values that it takes from the others. */
export class Evolution {
  private readonly ranges: readonly { readonly min: number; readonly max: number }[];
  private readonly random: Random;
  private readonly measure: (values: Float64Array) => number;

  /**
   * @param names inputs in the order of values
   * @param domain their ranges
   * @param measure size of the error at a point
   * @param random numbers
   */
  constructor(
    names: readonly string[],
    domain: Domain,
    measure: (values: Float64Array) => number,
    random: Random,
  ) {
    this.ranges = names.map((name) => domain[name]!);
    this.measure = measure;
    this.random = random;
  }

  /** The points after a number of steps in all, largest error first. */
  run(start: readonly Candidate[], steps: number, tick: () => void): readonly Candidate[] {
    const pool = [...start];
    for (let step = 0; step < steps; step++, tick()) {
      const place = step % pool.length;
      const values = this.changed(pool[place]!.values, pool);
      const size = this.measure(values);
      if (size >= pool[place]!.size) pool[place] = { values, size };
    }
    return pool.sort((a, b) => b.size - a.size);
  }

  private changed(from: Float64Array, pool: readonly Candidate[]): Float64Array {
    const { random } = this;
    const values = from.slice();
    const u = random.next();
    if (u < CROSSED) {
      const other = pool[random.below(pool.length)]!.values;
      for (let k = 0; k < values.length; k++) if (random.next() < TAKEN) values[k] = other[k]!;
    } else if (u < CROSSED + FRESH) {
      const k = random.below(values.length);
      const { min, max } = this.ranges[k]!;
      values[k] = clamp(min + (max - min) * random.next(), min, max);
    } else {
      const share = 2 ** (-1 - FINEST * random.next());
      for (let count = 1 + random.below(4); count > 0; count--) {
        const k = random.below(values.length);
        const { min, max } = this.ranges[k]!;
        values[k] = clamp(values[k]! + (max - min) * share * random.normal(), min, max);
      }
    }
    return values;
  }
}

/** Keeps the `count` candidates with the largest errors in a list, largest first. */
export function keep(list: Candidate[], candidate: Candidate, count: number): void {
  if (list.length === count && candidate.size <= list.at(-1)!.size) return;
  const place = list.findIndex((other) => other.size < candidate.size);
  list.splice(place < 0 ? list.length : place, 0, candidate);
  list.length = Math.min(list.length, count);
}
