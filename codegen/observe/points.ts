import type { Domain } from '../../src/models/description.ts';
import type { Random } from '../numbers/random.ts';

/** Values of all inputs, by name. */
export type Point = Readonly<Record<string, number>>;

/** Draws points of a domain: inside, on faces and near corners. */
export class Points {
  private readonly names: readonly string[];
  private readonly domain: Domain;
  private readonly random: Random;

  constructor(domain: Domain, names: readonly string[], random: Random) {
    this.names = names;
    this.domain = domain;
    this.random = random;
  }

  /** A point; about one coordinate in six lies on an end of its range. */
  draw(): Point {
    const point: Record<string, number> = {};
    for (const name of this.names) {
      const { min, max } = this.domain[name]!;
      const u = this.random.next();
      point[name] =
        u < 1 / 12 ? min : u > 11 / 12 ? max : clamp(min + (max - min) * this.random.next(), min, max);
    }
    return point;
  }
}

/** The nearest number of a range. */
export function clamp(x: number, min: number, max: number): number {
  return Math.min(Math.max(x, min), max);
}
