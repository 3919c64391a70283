import { Random } from '../numbers/random.ts';
import type { Box, Proof } from './proof.ts';

/** Width of the small boxes in which the variables are tried one by one, as a share of the box. */
const SMALL = 2 ** -8;

/** Small boxes that are looked at: the one with the largest bound is taken. */
const PLACES = 6;

/** A rise beyond all bounds still has to be compared with others. */
const LARGEST_RISE = 1e9;

/**
 * What a unit of width of each variable costs about a box: how far the bound of a small box rises when that one variable
 * takes its whole range in the box. The small box lies where the bound is large, so that the rise is owed to the width
 * and not to other values of the variable; variables are tried alone, since where all are wide none does any good alone.
 */
export class WidthCosts {
  /** Boxes evaluated so far. */
  evaluations = 0;
  /** Largest bound of a small box so far: no subdivision comes far below it. */
  largest = 0;
  private readonly proof: Proof;
  private readonly random = new Random(12345);

  constructor(proof: Proof) {
    this.proof = proof;
  }

  /** Costs about a box, by variable; zero for those that angles of turns replace. */
  of(box: Box): Float64Array {
    const { small, bound } = this.place(box);
    return box.lo.map((lo, k) => {
      const width = box.hi[k]! - lo;
      if (this.proof.replaced[k] || !(width > 0)) return 0;
      const grown = { lo: small.lo.slice(), hi: small.hi.slice() };
      grown.lo[k] = lo;
      grown.hi[k] = box.hi[k]!;
      return Math.min(this.bound(grown) / bound - 1, LARGEST_RISE) / width;
    });
  }

  /** The small box with the largest bound among some. */
  private place(box: Box): { small: Box; bound: number } {
    const tried = Array.from({ length: PLACES }, () => {
      const small = this.small(box);
      return { small, bound: this.bound(small) };
    });
    const place = tried.reduce((most, other) => (other.bound > most.bound ? other : most));
    this.largest = Math.max(this.largest, place.bound);
    return place;
  }

  private bound(box: Box): number {
    this.evaluations++;
    return this.proof.bound(box);
  }

  /** A small box at random; variables that angles of turns replace keep their range. */
  private small(box: Box): Box {
    const { replaced } = this.proof;
    const lo = box.lo.map((low, k) =>
      replaced[k] ? low : low + (box.hi[k]! - low) * this.random.next() * (1 - SMALL),
    );
    const hi = box.hi.map((high, k) =>
      replaced[k] ? high : Math.min(high, lo[k]! + (high - box.lo[k]!) * SMALL),
    );
    return { lo, hi };
  }
}
