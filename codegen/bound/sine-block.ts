import { InputError } from '../../src/finding.ts';
import { halfPi } from '../approximate/half-pi.ts';
import type { Kernel } from '../kernel/kernel.ts';
import * as dyadic from '../numbers/dyadic.ts';
import { boundCosineBins, boundSineBins } from '../numbers/rational.ts';
import { LineTape } from './line-tape.ts';
import { asNumbers, polynomialOf } from './polynomial.ts';
import type { SineErrors } from './tape.ts';

/** Cells of a table of errors, over the circle or over the range of a small angle. */
const CELLS = 256;

/** Room for the rounding of cell edges: rad on the circle, a share of a cell elsewhere. */
const EDGE = 1e-12;

/** Angles next to a change of the quotient are looked at in pieces down to this width, rad. */
const DECIDED = 1e-4;

/** Parts of the range of a polynomial, for its truncation. */
const PARTS = 48;

/** Largest remainder for which the truncation of a polynomial behind a reduction is known, rad. */
const REDUCED = 0.8;

/** The lines of a sine and cosine: the angle that they read, and their results (-1 where one is not computed). */
export interface SineLines {
  readonly angle: number;
  readonly cos: number;
  readonly sin: number;
}

/**
 * Proves the local errors of the lines that compute a sine and cosine: rounding by analysis of the lines, truncation in
 * exact arithmetic on the coefficients that stand in the lines. Nothing that the lowering said of them is used.
 *
 * @param kernel the kernel
 * @param lines where the block begins and ends
 * @param radius the block is used for angles up to this size, rad
 * @returns errors by angle; angles beyond the radius have none that is finite
 */
export function sineErrors(kernel: Kernel, lines: SineLines, radius: number): SineErrors {
  const results = [lines.cos, lines.sin].filter((line) => line >= 0);
  const floor = firstFloor(kernel, results, lines.angle);
  return floor < 0 ? plainErrors(kernel, lines, radius) : reducedErrors(kernel, lines, floor, radius);
}

/** Errors of polynomials of the angle itself, by cells of [-radius, radius]. */
function plainErrors(kernel: Kernel, lines: SineLines, radius: number): SineErrors {
  const width = (2 * radius) / CELLS;
  const analyse = plainCells(kernel, lines, radius * (1 + EDGE));
  const cells = Array.from({ length: CELLS }, (_, cell) => {
    const lo = Math.max(-radius, cell * width - radius - width * EDGE);
    return analyse(lo, Math.min(radius, (cell + 1) * width - radius + width * EDGE));
  });
  const look = (size: (cell: Cell) => number) => {
    const sizes = Float64Array.from(cells, size);
    return (lo: number, hi: number) => {
      if (!(lo >= -radius && hi <= radius)) return Infinity;
      const first = Math.max(0, Math.floor((lo + radius) / width - 1e-9));
      const last = Math.min(CELLS - 1, Math.floor((hi + radius) / width + 1e-9));
      let most = 0;
      for (let cell = first; cell <= last; cell++) most = Math.max(most, sizes[cell]!);
      return most;
    };
  };
  return { periodic: false, cos: look(cosine), sin: look(sine), both: look(length) };
}

/** Errors of lines that reduce the angle, by cells of the circle; every turn that the radius allows counts. */
function reducedErrors(kernel: Kernel, lines: SineLines, floor: number, radius: number): SineErrors {
  const width = (2 * Math.PI) / CELLS;
  const analyse = reducedCells(kernel, lines, floor);
  const cells: Cell[] = Array.from({ length: CELLS }, () => [Infinity, Infinity]);
  const seen = new Uint8Array(CELLS);
  const outermost = Math.ceil(radius / width + 1e-6);
  for (let cell = -outermost; cell < outermost; cell++) {
    const [cos, sin] = analyse(cell * width - EDGE, (cell + 1) * width + EDGE);
    const place = ((cell % CELLS) + CELLS) % CELLS;
    const [oldCos, oldSin] = seen[place] === 1 ? cells[place]! : [0, 0];
    cells[place] = [Math.max(cos, oldCos), Math.max(sin, oldSin)];
    seen[place] = 1;
  }
  const look = (size: (cell: Cell) => number) => {
    const sizes = Float64Array.from(cells, size);
    const whole = Math.max(...sizes);
    return (lo: number, hi: number) => {
      if (!(hi - lo < 2 * Math.PI)) return whole;
      const last = Math.floor(hi / width + 1e-9);
      let most = 0;
      for (let cell = Math.floor(lo / width - 1e-9); cell <= last; cell++)
        most = Math.max(most, sizes[((cell % CELLS) + CELLS) % CELLS]!);
      return most;
    };
  };
  return { periodic: true, cos: look(cosine), sin: look(sine), both: look(length) };
}

/** Errors of the cosine and of the sine over a cell. */
type Cell = readonly [cos: number, sin: number];

const cosine = ([cos]: Cell): number => cos;
const sine = ([, sin]: Cell): number => sin;
const length = ([cos, sin]: Cell): number => Math.sqrt(cos * cos + sin * sin) * (1 + 2 ** -50);

type Analyse = (lo: number, hi: number) => Cell;

/** Lines that are polynomials of the angle itself. */
function plainCells(kernel: Kernel, lines: SineLines, radius: number): Analyse {
  const results = [lines.cos, lines.sin].filter((line) => line >= 0);
  const tape = new LineTape(kernel, [lines.angle], results);
  const truncation = truncationOf(kernel, lines, lines.angle, new Map(), 0, radius);
  return (lo, hi) => {
    const rounding = tape.errors([lo], [hi]);
    const of = (line: number) => rounding[results.indexOf(line)] ?? 0;
    const [cos, sin] = truncation(lo, hi);
    return [of(lines.cos) + cos, of(lines.sin) + sin];
  };
}

/** Lines that reduce the angle first: x = q pi / 2 + r with q a whole number that a floor gives. */
function reducedCells(kernel: Kernel, lines: SineLines, floor: number): Analyse {
  const results = [lines.cos, lines.sin].filter((line) => line >= 0);
  const quotient = new LineTape(kernel, [lines.angle], [floor]);
  const remainder = remainderLine(kernel, results, lines.angle, floor);
  const slope = linear(kernel, remainder, lines.angle, floor)!;
  const tape = new LineTape(kernel, [lines.angle, floor], [...results, remainder]);
  const truncations = new Map<number, (lo: number, hi: number) => readonly [number, number]>();
  const analyse: Analyse = (lo, hi) => {
    quotient.ranges([lo], [hi]);
    const [first, last] = quotient.rangeOf(floor);
    if (first < last && hi - lo > DECIDED) {
      const middle = (lo + hi) / 2;
      const [below, above] = [analyse(lo, middle), analyse(middle, hi)];
      return [Math.max(below[0], above[0]), Math.max(below[1], above[1])];
    }
    let worst: [number, number] = [0, 0];
    for (let q = first; q <= last; q++) {
      const rounding = tape.errors([lo, q], [hi, q]);
      const [from, to] = tape.rangeOf(remainder);
      const gap = reductionGap(slope, q);
      const truncation =
        truncations.get(q) ?? truncationOf(kernel, lines, remainder, new Map([[floor, q]]), q, REDUCED);
      truncations.set(q, truncation);
      const [cos, sin] = truncation(from - gap, to + gap);
      const of = (line: number) => rounding[results.indexOf(line)] ?? 0;
      worst = [Math.max(worst[0], of(lines.cos) + cos + gap), Math.max(worst[1], of(lines.sin) + sin + gap)];
    }
    return worst;
  };
  return analyse;
}

/**
 * Truncation of the polynomials in a variable r against cos(q pi / 2 + r) and sin(q pi / 2 + r), by intervals of r.
 */
function truncationOf(
  kernel: Kernel,
  lines: SineLines,
  variable: number,
  known: ReadonlyMap<number, number>,
  q: number,
  radius: number,
): (lo: number, hi: number) => readonly [cos: number, sin: number] {
  const quarter = ((q % 4) + 4) % 4;
  // sin(x) = sin r, cos r, -sin r, -cos r and cos(x) = cos r, -sin r, -cos r, sin r
  const column = (line: number, turned: number): Float64Array => {
    if (line < 0) return new Float64Array(PARTS);
    const odd = turned % 2 === 0;
    const sign = turned < 2 ? 1 : -1;
    const coefficients = parityCoefficients(kernel, line, variable, known, odd ? 1 : 0).map((c) => sign * c);
    return truncationParts(odd, coefficients, radius);
  };
  const sin = column(lines.sin, quarter);
  const cos = column(lines.cos, (quarter + 1) % 4);
  const part = radius / PARTS;
  return (lo, hi) => {
    const outer = Math.max(-lo, hi);
    const inner = lo > 0 ? lo : hi < 0 ? -hi : 0;
    if (!(outer <= radius)) return [Infinity, Infinity];
    const [first, last] = [
      Math.max(0, Math.floor(inner / part - 1e-9)),
      Math.min(PARTS - 1, Math.floor(outer / part + 1e-9)),
    ];
    let most: [number, number] = [0, 0];
    for (let k = first; k <= last; k++) most = [Math.max(most[0], cos[k]!), Math.max(most[1], sin[k]!)];
    return most;
  };
}

const parts = new Map<string, Float64Array>();

/** Truncation of an odd or even polynomial in equal parts of its range; the same polynomials come again and again. */
function truncationParts(odd: boolean, coefficients: readonly number[], radius: number): Float64Array {
  const key = `${odd} ${radius} ${coefficients.join(' ')}`;
  const made = parts.get(key) ?? (odd ? boundSineBins : boundCosineBins)(coefficients, radius, PARTS);
  parts.set(key, made);
  return made;
}

/** Coefficients of a polynomial that is odd (parity 1) or even (parity 0), in the form that the truncation takes. */
function parityCoefficients(
  kernel: Kernel,
  line: number,
  variable: number,
  known: ReadonlyMap<number, number>,
  parity: 0 | 1,
): readonly number[] {
  const polynomial = polynomialOf(kernel, line, variable, known);
  const numbers = polynomial && asNumbers(polynomial);
  if (numbers === undefined || numbers.some((c, k) => k % 2 !== parity && c !== 0)) {
    throw unproven(kernel, line, 'is no polynomial of the parity that a sine or cosine has');
  }
  return numbers.filter((_, k) => k % 2 === parity);
}

/** The floor that only the angle reaches, or -1. */
function firstFloor(kernel: Kernel, results: readonly number[], angle: number): number {
  const floors = [...below(kernel, results, [angle])].filter(
    (line) => kernel.lines[line]!.operation === 'floor',
  );
  return Math.min(...floors, Infinity) === Infinity ? -1 : Math.min(...floors);
}

/** The last line that is the angle minus a multiple of q: what the polynomials take. */
function remainderLine(kernel: Kernel, results: readonly number[], angle: number, floor: number): number {
  const candidates = [...below(kernel, results, [angle, floor])].filter(
    (line) => linear(kernel, line, angle, floor) !== undefined,
  );
  const last = Math.max(...candidates, -1);
  if (last < 0) throw unproven(kernel, results[0]!, 'has a floor but no remainder of the angle');
  return last;
}

/** |r - (x - q pi / 2)| in exact arithmetic, for a remainder r = x + slope q. */
function reductionGap(slope: dyadic.Dyadic, q: number): number {
  const difference = dyadic.add(slope, halfPi());
  const size = difference.mantissa < 0n ? dyadic.neg(difference) : difference;
  return Math.abs(q) * (dyadic.toDoubleUp(size) + 2 ** -230) * (1 + 2 ** -50);
}

/** The factor P of a line that is x + P q, or undefined. */
function linear(kernel: Kernel, line: number, angle: number, floor: number): dyadic.Dyadic | undefined {
  const { operation } = kernel.lines[line]!;
  if (operation !== 'sub' && operation !== 'add') return undefined;
  const at = (q: number) => polynomialOf(kernel, line, angle, new Map([[floor, q]]));
  const [zero, one, two] = [at(0), at(1), at(2)];
  if (zero?.length !== 2 || one?.length !== 2 || two?.length !== 2) return undefined;
  const unit = dyadic.fromDouble(1);
  const isOne = [zero, one, two].every((form) => dyadic.compare(form[1]!, unit) === 0);
  const straight = dyadic.compare(two[0]!, dyadic.add(one[0]!, one[0]!)) === 0 && zero[0]!.mantissa === 0n;
  return isOne && straight ? one[0]! : undefined;
}

/** Lines on which the results depend, down to the given ones and without them. */
function below(kernel: Kernel, results: readonly number[], stops: readonly number[]): ReadonlySet<number> {
  const seen = new Set<number>();
  const visit = (line: number): void => {
    if (seen.has(line) || stops.includes(line)) return;
    seen.add(line);
    kernel.lines[line]!.args.forEach(visit);
  };
  results.forEach(visit);
  return seen;
}

function unproven(kernel: Kernel, line: number, what: string): InputError {
  return new InputError({
    code: 'bound.block',
    place: { file: 'kernel' },
    what: `the line ${kernel.lines[line]!.name} ${what}`,
    why: 'The error of a sine or cosine is proven from its own lines.',
    remedy: 'Generate the kernel again; if that does not help, report the model and the choices.',
  });
}
