/**
 * An exact number mantissa x 2^exponent. Every finite float64 number is one; sums and products stay exact.
 */
export interface Dyadic {
  readonly mantissa: bigint;
  readonly exponent: number;
}

const words = new BigUint64Array(1);
const floats = new Float64Array(words.buffer);

/** A float64 number, exactly. @throws RangeError if it is not finite */
export function fromDouble(x: number): Dyadic {
  if (!Number.isFinite(x)) throw new RangeError(`no exact value: ${x}`);
  floats[0] = x;
  const bits = words[0]!;
  const biased = Number((bits >> 52n) & 0x7ffn);
  const fraction = bits & 0xfffffffffffffn;
  const magnitude = biased === 0 ? fraction : fraction | (1n << 52n);
  return { mantissa: bits >> 63n === 0n ? magnitude : -magnitude, exponent: Math.max(biased, 1) - 1075 };
}

/** x + y. */
export function add(x: Dyadic, y: Dyadic): Dyadic {
  const exponent = Math.min(x.exponent, y.exponent);
  return { mantissa: scaled(x, exponent) + scaled(y, exponent), exponent };
}

/** x - y. */
export function sub(x: Dyadic, y: Dyadic): Dyadic {
  return add(x, neg(y));
}

/** x * y. */
export function mul(x: Dyadic, y: Dyadic): Dyadic {
  return { mantissa: x.mantissa * y.mantissa, exponent: x.exponent + y.exponent };
}

/** -x. */
export function neg(x: Dyadic): Dyadic {
  return { mantissa: -x.mantissa, exponent: x.exponent };
}

/** The sign of x - y: -1, 0 or 1. */
export function compare(x: Dyadic, y: Dyadic): number {
  const difference = sub(x, y).mantissa;
  return difference === 0n ? 0 : difference < 0n ? -1 : 1;
}

/** The polynomial c[0] + c[1] x + c[2] x^2 + ... at x. */
export function evaluate(coefficients: readonly Dyadic[], x: Dyadic): Dyadic {
  return coefficients.reduceRight((sum, c) => add(c, mul(x, sum)), { mantissa: 0n, exponent: 0 });
}

/** The largest float64 number at or below x; -Infinity below all finite ones. */
export function toDoubleDown(x: Dyadic): number {
  return quotientDown(...asQuotient(x));
}

/** The smallest float64 number at or above x; Infinity above all finite ones. */
export function toDoubleUp(x: Dyadic): number {
  return quotientUp(...asQuotient(x));
}

/** The largest float64 number at or below n / d, d > 0; -Infinity below all finite ones. */
export function quotientDown(n: bigint, d: bigint): number {
  return n < 0n ? -magnitude(-n, d, true) : magnitude(n, d, false);
}

/** The smallest float64 number at or above n / d, d > 0; Infinity above all finite ones. */
export function quotientUp(n: bigint, d: bigint): number {
  return n < 0n ? -magnitude(-n, d, false) : magnitude(n, d, true);
}

/** n / d, n >= 0, as a whole number of units in the last place, rounded towards infinity or zero. */
function magnitude(n: bigint, d: bigint, upward: boolean): number {
  if (n === 0n) return 0;
  const unit = Math.max(exponentOf(n, d) - 52, -1074);
  if (unit > 971) return upward ? Infinity : Number.MAX_VALUE;
  const over = unit < 0 ? n << BigInt(-unit) : n;
  const under = unit > 0 ? d << BigInt(unit) : d;
  const floor = over / under;
  return Number(upward && floor * under < over ? floor + 1n : floor) * 2 ** unit;
}

/** The k with 2^k <= n / d < 2^(k+1), for n > 0, d > 0. */
function exponentOf(n: bigint, d: bigint): number {
  const k = bitLength(n) - bitLength(d);
  const reached = k < 0 ? n << BigInt(-k) >= d : n >= d << BigInt(k);
  return reached ? k : k - 1;
}

function bitLength(n: bigint): number {
  const digits = n.toString(16);
  return 4 * digits.length - Math.clz32(Number.parseInt(digits[0]!, 16)) + 28;
}

/** x as n / d, d > 0. */
export function asQuotient({ mantissa, exponent }: Dyadic): [n: bigint, d: bigint] {
  return exponent < 0 ? [mantissa, 1n << BigInt(-exponent)] : [mantissa << BigInt(exponent), 1n];
}

/** The mantissa of x for an exponent at or below its own. */
export function scaled(x: Dyadic, exponent: number): bigint {
  return x.mantissa << BigInt(x.exponent - exponent);
}
