import {
  add,
  asQuotient,
  type Dyadic,
  fromDouble,
  quotientDown,
  quotientUp,
  scaled,
  toDoubleUp,
} from './dyadic.ts';

/**
 * Proven bounds of |p(x) - sin x| and |p(x) - cos x| on 0 <= x <= R, and so by symmetry on |x| <= R, for
 * polynomials p with float64 coefficients. All is exact integer arithmetic; only the final bound is rounded,
 * upward.
 *
 * p minus a long Taylor polynomial is a polynomial with rational coefficients; the rest of the series is at
 * most its first term left out (Lagrange). On a piece of [0, R], centre m and half width h, the polynomial
 * q(t) = p(m + h t) is at most sum |q_k| for |t| <= 1. Pieces are halved until that is within 2^-10 of the
 * largest |q| seen.
 */

/** How far, relatively, a bound may lie above the largest magnitude found. */
const LOOSE = 2 ** -10;

/** Down here, where float64 numbers thin out, bounds are still bounds but no longer tight. */
const UNRESOLVED = 2 ** -1060;

/** A polynomial sum c[k] x^k / d with integer c[k] and d > 0. */
interface Polynomial {
  readonly c: readonly bigint[];
  readonly d: bigint;
}

/**
 * A proven upper bound of |x (c[0] + c[1] x^2 + c[2] x^4 + ...) - sin x| for |x| <= radius, at most 0.3 %
 * above the maximum.
 */
export function boundSine(coefficients: readonly number[], radius: number): number {
  return boundSineBins(coefficients, radius, 1)[0]!;
}

/**
 * A proven upper bound of |c[0] + c[1] x^2 + c[2] x^4 + ... - cos x| for |x| <= radius, at most 0.3 % above
 * the maximum.
 */
export function boundCosine(coefficients: readonly number[], radius: number): number {
  return boundCosineBins(coefficients, radius, 1)[0]!;
}

/** The bound of boundSine for each of n equal parts of [0, radius], from zero upward; for -x as for x. */
export function boundSineBins(coefficients: readonly number[], radius: number, n: number): Float64Array {
  return boundBins(coefficients, 1, radius, n);
}

/** The bound of boundCosine for each of n equal parts of [0, radius], from zero upward; for -x as for x. */
export function boundCosineBins(coefficients: readonly number[], radius: number, n: number): Float64Array {
  return boundBins(coefficients, 0, radius, n);
}

/** Takes ever longer Taylor polynomials until, in every part, what they leave out no longer counts. */
function boundBins(coefficients: readonly number[], parity: 0 | 1, radius: number, n: number): Float64Array {
  if (!(radius > 0 && Number.isInteger(n) && n > 0)) throw new RangeError(`no parts: ${radius} / ${n}`);
  const exact = coefficients.map(fromDouble);
  const [rn, rd] = asQuotient(fromDouble(radius));
  const bounds = new Float64Array(n);
  for (let terms = exact.length + 3, settled = false; !settled; terms += 3) {
    const difference = taylorDifference(exact, parity, terms);
    const next = 2 * terms + parity;
    settled = true;
    for (let j = 0; j < n && settled; j++) {
      const bound = largest(onPiece(difference, rn, rd * BigInt(2 * n), BigInt(2 * j + 1)));
      const rest = quotientUp(
        (rn * BigInt(j + 1)) ** BigInt(next),
        (rd * BigInt(n)) ** BigInt(next) * factorial(next),
      );
      settled = rest <= bound * LOOSE + UNRESOLVED;
      bounds[j] = toDoubleUp(add(fromDouble(bound), fromDouble(rest)));
    }
  }
  return bounds;
}

/** The polynomial sum c[k] x^(2 k + parity), less the first `terms` terms of the sine or cosine. */
function taylorDifference(c: readonly Dyadic[], parity: 0 | 1, terms: number): Polynomial {
  const degree = 2 * (terms - 1) + parity;
  const exponent = Math.min(0, ...c.map((x) => x.exponent));
  const common = factorial(degree);
  const difference = new Array<bigint>(degree + 1).fill(0n);
  for (let k = 0; k < terms; k++) {
    const n = 2 * k + parity;
    const taylor = (common / factorial(n)) << BigInt(-exponent);
    const own = k < c.length ? scaled(c[k]!, exponent) * common : 0n;
    difference[n] = k % 2 === 0 ? own - taylor : own + taylor;
  }
  return { c: difference, d: common << BigInt(-exponent) };
}

/** The polynomial q(t) = p(h (centre + t)), h = hn / hd. */
function onPiece(p: Polynomial, hn: bigint, hd: bigint, centre: bigint): Polynomial {
  const degree = p.c.length - 1;
  const c = p.c.map((x, k) => x * hn ** BigInt(k) * hd ** BigInt(degree - k));
  shift(c, centre);
  return { c, d: p.d * hd ** BigInt(degree) };
}

/** Replaces c(t) by c(t + by): Horner's scheme, again and again. */
function shift(c: bigint[], by: bigint): void {
  for (let i = 0; i < c.length - 1; i++) {
    for (let k = c.length - 2; k >= i; k--) c[k]! += by * c[k + 1]!;
  }
}

/** A piece of a polynomial, on |t| <= 1: a bound of its magnitude, and its magnitude at t = 0. */
interface Piece {
  readonly q: Polynomial;
  readonly bound: number;
  readonly seen: number;
}

/**
 * An upper bound of |q(t)| for |t| <= 1: the piece with the largest bound is halved until that is near
 * enough.
 */
function largest(q: Polynomial): number {
  const pieces = [piece(q)];
  let seen = 0;
  for (;;) {
    const i = pieces.reduce((most, p, k) => (p.bound > pieces[most]!.bound ? k : most), 0);
    const worst = pieces[i]!;
    seen = Math.max(seen, worst.seen);
    if (!(worst.bound > seen * (1 + LOOSE) + UNRESOLVED)) return worst.bound;
    pieces[i] = piece(onPiece(worst.q, 1n, 2n, -1n));
    pieces.push(piece(onPiece(worst.q, 1n, 2n, 1n)));
  }
}

function piece(q: Polynomial): Piece {
  const sum = q.c.reduce((total, x) => total + magnitude(x), 0n);
  return { q, bound: quotientUp(sum, q.d), seen: quotientDown(magnitude(q.c[0]!), q.d) };
}

function magnitude(x: bigint): bigint {
  return x < 0n ? -x : x;
}

function factorial(n: number): bigint {
  return n < 2 ? 1n : BigInt(n) * factorial(n - 1);
}
