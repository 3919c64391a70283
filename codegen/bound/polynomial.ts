import type { Kernel } from '../kernel/kernel.ts';
import * as dyadic from '../numbers/dyadic.ts';

/** A polynomial with exact coefficients, from the constant term upward. */
export type Polynomial = readonly dyadic.Dyadic[];

const ZERO = dyadic.fromDouble(0);

/**
 * What a line computes in exact arithmetic, as a polynomial in one line.
 *
 * @param kernel the kernel
 * @param line the result
 * @param variable the line that is the polynomial's variable
 * @param known lines that stand for known numbers
 * @returns undefined when the line is no polynomial in the variable
 */
export function polynomialOf(
  kernel: Kernel,
  line: number,
  variable: number,
  known: ReadonlyMap<number, number>,
): Polynomial | undefined {
  const memo = new Map<number, Polynomial | undefined>();
  const visit = (index: number): Polynomial | undefined => {
    if (!memo.has(index)) memo.set(index, visitNew(index));
    return memo.get(index);
  };
  const visitNew = (index: number): Polynomial | undefined => {
    if (index === variable) return [ZERO, dyadic.fromDouble(1)];
    const number = known.get(index);
    if (number !== undefined) return [dyadic.fromDouble(number)];
    const { operation, args, value } = kernel.lines[index]!;
    if (operation === 'constant') return [dyadic.fromDouble(value)];
    if (operation === 'select') return choose(args);
    const [a, b = []] = args.map(visit);
    if (a === undefined || b === undefined) return undefined;
    switch (operation) {
      case 'add':
        return combine(a, b, dyadic.add);
      case 'sub':
        return combine(a, b, dyadic.sub);
      case 'mul':
        return multiply(a, b);
      case 'neg':
        return a.map(dyadic.neg);
      case 'floor':
        return a.length === 1 ? [dyadic.fromDouble(Math.floor(dyadic.toDoubleDown(a[0]!)))] : undefined;
      default:
        return undefined;
    }
  };
  const choose = (args: readonly number[]): Polynomial | undefined => {
    const [a, b] = [visit(args[0]!), visit(args[1]!)];
    if (a?.length !== 1 || b?.length !== 1) return undefined;
    return visit(dyadic.compare(a[0]!, b[0]!) < 0 ? args[2]! : args[3]!);
  };
  return visit(line);
}

/** The coefficients as float64 numbers; undefined when one of them is none. */
export function asNumbers(polynomial: Polynomial): readonly number[] | undefined {
  const numbers = polynomial.map(dyadic.toDoubleDown);
  return numbers.every((number, k) => number === dyadic.toDoubleUp(polynomial[k]!)) ? numbers : undefined;
}

function combine(
  a: Polynomial,
  b: Polynomial,
  operation: (x: dyadic.Dyadic, y: dyadic.Dyadic) => dyadic.Dyadic,
): Polynomial {
  return Array.from({ length: Math.max(a.length, b.length) }, (_, k) =>
    operation(a[k] ?? ZERO, b[k] ?? ZERO),
  );
}

function multiply(a: Polynomial, b: Polynomial): Polynomial {
  const product: dyadic.Dyadic[] = Array.from({ length: a.length + b.length - 1 }, () => ZERO);
  for (const [i, x] of a.entries())
    for (const [j, y] of b.entries()) product[i + j] = dyadic.add(product[i + j]!, dyadic.mul(x, y));
  return product;
}
