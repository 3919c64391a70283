import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Format } from '../kernel/choices.ts';
import { boundCosine, boundSine } from '../numbers/rational.ts';

/** Largest error allowed to a polynomial: an eighth of half a unit in the last place of 1. */
const TARGET: Readonly<Record<Format, number>> = { f64: 2 ** -56, f32: 2 ** -27 };

/** Most terms that a polynomial may have; enough for float64 on two radians. */
const MOST_TERMS = 14;

/** Sine or cosine of x as a polynomial, and the proven error for |x| <= radius. */
export interface Polynomial {
  readonly node: Node;
  readonly error: number;
}

/**
 * sin x = x + x z (c1 + c2 z + ...), z = x^2: Taylor's series with coefficients rounded to the format, as short as
 * the target allows.
 *
 * @param graph graph of x
 * @param x angle, rad
 * @param radius largest |x|
 * @param format format of the coefficients
 */
export function sinePolynomial(graph: Graph, x: Node, radius: number, format: Format): Polynomial {
  const { coefficients, error } = shortest((k) => taylor(2 * k + 1), boundSine, radius, format);
  const [, ...rest] = coefficients;
  if (rest.length === 0) return { node: x, error };
  const z = graph.make('mul', x, x);
  return {
    node: graph.make('add', x, graph.make('mul', graph.make('mul', x, z), horner(graph, rest, z))),
    error,
  };
}

/** cos x = 1 + z (c1 + c2 z + ...), z = x^2, made like the sine. */
export function cosinePolynomial(graph: Graph, x: Node, radius: number, format: Format): Polynomial {
  const { coefficients, error } = shortest((k) => taylor(2 * k), boundCosine, radius, format);
  const [, ...rest] = coefficients;
  if (rest.length === 0) return { node: graph.constant(1), error };
  const z = graph.make('mul', x, x);
  return { node: graph.make('add', graph.constant(1), graph.make('mul', z, horner(graph, rest, z))), error };
}

/** (-1)^(n div 2) / n!, the coefficient of x^n in the sine (odd n) or the cosine (even n). */
function taylor(n: number): number {
  let factorial = 1;
  for (let k = 2; k <= n; k++) factorial *= k;
  return (Math.floor(n / 2) % 2 === 0 ? 1 : -1) / factorial;
}

function shortest(
  coefficient: (k: number) => number,
  bound: (coefficients: readonly number[], radius: number) => number,
  radius: number,
  format: Format,
): { coefficients: readonly number[]; error: number } {
  const coefficients: number[] = [];
  for (let k = 0; k < MOST_TERMS; k++) {
    coefficients.push(format === 'f32' ? Math.fround(coefficient(k)) : coefficient(k));
    const error = bound(coefficients, radius);
    if (error <= TARGET[format]) return { coefficients, error };
  }
  throw new RangeError(`no polynomial of ${MOST_TERMS} terms reaches ${TARGET[format]} on ${radius} rad`);
}

/** c0 + z (c1 + z (c2 + ...)). */
function horner(graph: Graph, coefficients: readonly number[], z: Node): Node {
  return coefficients
    .map((c) => graph.constant(c))
    .reduceRight((sum, c) => graph.make('add', c, graph.make('mul', z, sum)));
}
