import type { Domain } from '../../src/models/description.ts';
import { Random } from '../numbers/random.ts';
import type { Proof } from './proof.ts';

type Point = Readonly<Record<string, number>>;

/** Points drawn over the domain, and steps of the climbs from the best of them. */
const DRAWN = 2000;
const CLIMBS = 8;
const STEPS = 250;

/**
 * Looks for the largest bound at a single point. No subdivision can bring a certified bound below it, so it says how
 * much of a bound is owed to the width of boxes.
 *
 * @param proof bounds at points
 * @param domain ranges of the inputs
 */
export function largestPointwise(proof: Proof, domain: Domain): { bound: number; points: readonly Point[] } {
  const names = Object.keys(domain);
  const random = new Random(54321);
  const clamp = (name: string, x: number) => Math.min(Math.max(x, domain[name]!.min), domain[name]!.max);
  const draw = (): Point =>
    Object.fromEntries(
      names.map((name) => {
        const { min, max } = domain[name]!;
        return [name, clamp(name, min + (max - min) * (random.next() * 1.3 - 0.15))];
      }),
    );
  const drawn = Array.from({ length: DRAWN }, () => {
    const point = draw();
    return { point, bound: proof.boundAt(point) };
  });
  drawn.sort((a, b) => b.bound - a.bound);
  const tops = drawn.slice(0, CLIMBS).map((start) => {
    let best = start;
    for (let step = 0; step < STEPS; step++) {
      const point: Record<string, number> = { ...best.point };
      const share = 0.3 * 10 ** ((-3 * step) / STEPS);
      for (let k = 0; k < 3; k++) {
        const name = names[random.below(names.length)]!;
        point[name] = clamp(
          name,
          point[name]! + (domain[name]!.max - domain[name]!.min) * share * (2 * random.next() - 1),
        );
      }
      const bound = proof.boundAt(point);
      if (bound > best.bound) best = { point, bound };
    }
    return best;
  });
  tops.sort((a, b) => b.bound - a.bound);
  return { bound: tops[0]!.bound, points: tops.map(({ point }) => point) };
}
