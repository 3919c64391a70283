import type { Domain } from '../../src/models/description.ts';
import type { Random } from '../numbers/random.ts';
import { type Candidate, keep } from './evolve.ts';
import { clamp } from './points.ts';
import type { RoundingModel } from './rounding-model.ts';

/** How hard to align the roundings of lines. */
export interface AlignmentEffort {
  /** Places at which roundings are aligned: those with the largest possible sum. */
  readonly places: number;
  /** Points drawn for every group of inputs. */
  readonly draws: number;
}

/** Points drawn for places, and steps from each of the best. */
const DRAWN = 4000;
const STEPS = 400;

/** Points that are carried from one group of inputs to the next. */
const CARRIED = 24;

/** Inputs are moved within this share of their range about a place: adjoints stay what they are. */
const NEAR = 2 ** -8;

/** Lines whose share is below this part of an even share are left out. */
const NEGLIGIBLE = 1e-3;

/** A place and the direction in which the lines there can move the outputs furthest. */
interface Place {
  readonly point: Float64Array;
  readonly size: number;
  readonly direction: readonly number[];
}

/**
 * Looks for points at which the roundings of lines add up. A place is chosen where the sum of the largest possible
 * errors is large. Then inputs are fixed in turn, those first on which most lines depend: of many values beside the place
 * those are kept with which the lines that depend on nothing else round the same way. What comes later cannot undo it.
 */
export class Alignment {
  private readonly model: RoundingModel;
  private readonly ranges: readonly { readonly min: number; readonly max: number }[];
  private readonly random: Random;
  private readonly directions: readonly (readonly number[])[];

  /**
   * @param model error of the outputs by lines
   * @param names inputs in the order of points
   * @param domain their ranges
   * @param outputs number of outputs
   * @param random numbers
   */
  constructor(
    model: RoundingModel,
    names: readonly string[],
    domain: Domain,
    outputs: number,
    random: Random,
  ) {
    this.model = model;
    this.ranges = names.map((name) => domain[name]!);
    this.random = random;
    this.directions = directionsOf(outputs);
  }

  /** Points with large sums of roundings, from all places. */
  points(effort: AlignmentEffort, tick: () => void): readonly Float64Array[] {
    return this.places(effort.places).flatMap((place) => this.align(place, effort.draws, tick));
  }

  private places(count: number): readonly Place[] {
    const drawn = Array.from({ length: DRAWN }, () =>
      this.placeAt(Float64Array.from(this.ranges, (_, k) => this.anywhere(k))),
    );
    drawn.sort((a, b) => b.size - a.size);
    return drawn.slice(0, count).map((start) => {
      let best = start;
      for (let step = 0; step < STEPS; step++) {
        const share = 0.3 * 10 ** ((-3 * step) / STEPS);
        const point = best.point.slice();
        for (let k = 0; k < 3; k++) this.move(point, this.random.below(point.length), share);
        const place = this.placeAt(point);
        if (place.size > best.size) best = place;
      }
      return best;
    });
  }

  private placeAt(point: Float64Array): Place {
    const sizes = this.model.reach(point, this.directions);
    const size = Math.max(...sizes);
    return { point, size, direction: this.directions[sizes.indexOf(size)]! };
  }

  private align({ point, direction }: Place, draws: number, tick: () => void): readonly Float64Array[] {
    const { model } = this;
    const parts = model.parts(point, direction);
    const whole = parts.reduce((sum, { largest }) => sum + largest, 0);
    const counting = parts.filter(({ largest }) => largest > (whole * NEGLIGIBLE) / parts.length);
    const weights = new Map(counting.map(({ line, weight }) => [line, weight]));
    let carried: readonly Candidate[] = [{ values: point, size: 0 }];
    for (const { inputs, lines } of this.groups([...weights.keys()])) {
      const score = model.score(
        lines,
        lines.map((k) => weights.get(k)!),
      );
      const kept: Candidate[] = [];
      for (let k = 0; k < draws; k++, tick()) {
        const moved = carried[k % carried.length]!.values.slice();
        for (const input of inputs) this.move(moved, input, NEAR);
        keep(kept, { values: moved, size: score(moved) }, CARRIED);
      }
      carried = kept;
    }
    return carried.map((entry) => entry.values);
  }

  /** Inputs in the order in which they are fixed, and the lines that depend on no others by then. */
  private groups(
    counting: readonly number[],
  ): readonly { readonly inputs: readonly number[]; readonly lines: readonly number[] }[] {
    const sets = this.model.dependences();
    const reach = this.ranges.map((_, input) => counting.filter((k) => sets[k]!.has(input)).length);
    const order = reach.map((_, input) => input).filter((input) => reach[input]! > 0);
    order.sort((a, b) => reach[b]! - reach[a]!);
    const fixed = new Set<number>();
    const groups: { inputs: number[]; lines: number[] }[] = [];
    let inputs: number[] = [];
    let known = 0;
    for (const input of order) {
      fixed.add(input);
      inputs.push(input);
      const lines = counting.filter(
        (k) => sets[k]!.size > 0 && [...sets[k]!].every((other) => fixed.has(other)),
      );
      if (lines.length === known) continue;
      groups.push({ inputs, lines });
      inputs = [];
      known = lines.length;
    }
    return groups;
  }

  private anywhere(k: number): number {
    const { min, max } = this.ranges[k]!;
    return clamp(min + (max - min) * (this.random.next() * 1.2 - 0.1), min, max);
  }

  private move(point: Float64Array, k: number, share: number): void {
    const { min, max } = this.ranges[k]!;
    point[k] = clamp(point[k]! + (max - min) * share * (2 * this.random.next() - 1), min, max);
  }
}

/** Directions in which errors are added up: of three outputs the axes and diagonals of a cube. */
function directionsOf(outputs: number): readonly (readonly number[])[] {
  if (outputs !== 3) return Array.from({ length: outputs }, (_, k) => unit(outputs, k));
  const steps = [-1, 0, 1];
  return steps
    .flatMap((x) => steps.flatMap((y) => steps.map((z) => [x, y, z] as const)))
    .filter(([x, y, z]) => 9 * x + 3 * y + z > 0) // one of each pair of opposites
    .map((direction) => direction.map((part) => part / Math.hypot(...direction)));
}

function unit(length: number, place: number): readonly number[] {
  return Array.from({ length }, (_, k) => (k === place ? 1 : 0));
}
