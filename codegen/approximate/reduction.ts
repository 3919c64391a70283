import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import { BITS, type Format } from '../kernel/choices.ts';
import { splitHalfPi } from './half-pi.ts';

/** Largest remainder of the reduction: pi / 4 and room for a quotient that rounding puts into the next quarter. */
export const REDUCED_RADIUS = 0.7855;

/** An angle x = q pi / 2 + r with |r| <= REDUCED_RADIUS, and how r gives the sine and cosine of x. */
export interface Reduction {
  readonly remainder: Node;
  /** Bound on |r - (x - q pi / 2)|, rad. */
  readonly error: number;
  /** sin x from sin r and cos r. */
  sin(sinR: Node, cosR: Node): Node;
  /** cos x from sin r and cos r. */
  cos(sinR: Node, cosR: Node): Node;
}

/**
 * Reduction to a quarter turn after Cody and Waite: q = floor(x 2/pi + 1/2) and r = x - q pi / 2, with pi / 2 split
 * so that q times its first parts is exact.
 *
 * @param graph graph of x
 * @param x angle, rad
 * @param radius largest |x|, rad
 * @param format format in which x is carried
 */
export function reduce(graph: Graph, x: Node, radius: number, format: Format): Reduction {
  const c = (value: number) => graph.constant(value);
  const quarters = Math.ceil(radius / (Math.PI / 2)) + 1;
  const bits = BITS[format] - Math.ceil(Math.log2(quarters + 1));
  const { parts, rest } = splitHalfPi(bits, BITS[format], 3);
  const toQuarters = format === 'f32' ? Math.fround(2 / Math.PI) : 2 / Math.PI;
  const q = graph.make('floor', graph.make('add', graph.make('mul', x, c(toQuarters)), c(0.5)));
  const remainder = parts.reduce((r, part) => graph.make('sub', r, graph.make('mul', q, c(part))), x);
  // q = 2 h + odd and h = 2 g + half: (half, odd) are the two last bits of q.
  const h = graph.make('floor', graph.make('mul', q, c(0.5)));
  const g = graph.make('floor', graph.make('mul', h, c(0.5)));
  const odd = graph.make('sub', q, graph.make('add', h, h));
  const half = graph.make('sub', h, graph.make('add', g, g));
  const swap = (even: Node, uneven: Node) => graph.make('select', odd, c(0.5), even, uneven);
  const sinSign = graph.make('sub', c(1), graph.make('add', half, half));
  const cosSign = swap(sinSign, graph.make('neg', sinSign));
  return {
    remainder,
    error: quarters * rest,
    // q mod 4 = 0, 1, 2, 3: sin x = sin r, cos r, -sin r, -cos r
    sin: (sinR, cosR) => graph.make('mul', swap(sinR, cosR), sinSign),
    // q mod 4 = 0, 1, 2, 3: cos x = cos r, -sin r, -cos r, sin r
    cos: (sinR, cosR) => graph.make('mul', swap(cosR, sinR), cosSign),
  };
}
