import type { Format } from '../../../codegen/kernel/choices.ts';
import type { Operation } from '../../../codegen/kernel/kernel.ts';
import * as pairs from '../../../codegen/numbers/double-double.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import type { Analysis } from '../faulty.ts';
import { demand, Shares } from './demand.ts';
import { kernelOf } from './kernels.ts';

/** One operation on numbers of two spans; a span of one number is a constant of the line. */
interface Case {
  readonly operation: Operation;
  readonly a: readonly [number, number];
  readonly b?: readonly [number, number];
  /** Share of the bound that the largest error must reach; 0 where the result is exact. */
  readonly reach: number;
}

const CASES: readonly Case[] = [
  { operation: 'add', a: [1.1, 1.9], b: [1.1, 1.9], reach: 0.95 },
  { operation: 'add', a: [0.3, 3], b: [0.3, 0.9], reach: 0.9 },
  { operation: 'add', a: [0.01, 0.9], b: [-0.2, 0.09], reach: 0.9 },
  { operation: 'add', a: [1, 1.9], b: [1e-9, 2e-9], reach: 0.9 },
  { operation: 'sub', a: [1.6, 1.9], b: [1, 1.5], reach: 0 },
  { operation: 'sub', a: [0.3, 1.99], b: [0.3, 1.9], reach: 0.9 },
  { operation: 'sub', a: [-3, 3], b: [0.01, 4], reach: 0.9 },
  { operation: 'mul', a: [1, 1.9], b: [1, 1.05], reach: 0.95 },
  { operation: 'mul', a: [-0.7, 0.9], b: [-1.4, 1.5], reach: 0.9 },
  { operation: 'mul', a: [0.5, 0.5], b: [1, 1.9], reach: 0 },
  { operation: 'mul', a: [3, 3], b: [1.4, 2.6], reach: 0.9 },
  { operation: 'mul', a: [3, 3], b: [5, 5], reach: 0 },
  { operation: 'mul', a: [1e-22, 2e-22], b: [1e-19, 2e-19], reach: 0.9 },
  { operation: 'div', a: [1, 2], b: [1.1, 2], reach: 0.95 },
  { operation: 'div', a: [-5, 7], b: [-3, -2], reach: 0.9 },
  { operation: 'sqrt', a: [1.2, 3.8], reach: 0.95 },
  { operation: 'round', a: [1.1, 1.9], reach: 0.95 },
];

/** The rounding of single operations is nearly attained and never exceeded; ranges hold what is computed. */
export function singleLines({ LineTape }: Analysis): void {
  for (const format of ['f32', 'f64'] as const) {
    const random = new Random(84);
    for (const [k, { operation, a, b, reach }] of CASES.entries()) {
      if (format === 'f64' && (operation === 'round' || a[1] < 1e-20)) continue;
      const kernel = kernelOf(format, [
        a[0] === a[1] ? a[0] : 'a',
        b === undefined ? 'b' : b[0] === b[1] ? b[0] : 'b',
        b === undefined ? [operation, 0] : [operation, 0, 1],
      ]);
      const from = [0, 1].filter((line) => kernel.lines[line]!.operation === 'input');
      const spans = [a, b ?? [0, 0]] as const;
      const tape = new LineTape(kernel, from, [2]);
      const [bound] = tape.errors(
        from.map((line) => spans[line]![0]),
        from.map((line) => spans[line]![1]),
      ) as [number];
      const [least, most] = tape.rangeOf(2);
      const shares = new Shares();
      for (let n = 0; n < 4000; n++) {
        const [x, y] = spans.map(([lo, hi]) =>
          inside(lo, hi, operation === 'round' ? 'f64' : format, random),
        );
        const { result, error } = computed(operation, x!, y!, format);
        shares.add(error, bound, () => `case ${k}, ${format} ${operation} of ${x} and ${y}`);
        demand(least <= result && result <= most, () => `case ${k}: ${result} outside its range`);
      }
      shares.reach(reach, `case ${k}, ${format} ${operation}`);
    }
  }
}

/** A number of the format in a span, sometimes an end of it. */
function inside(lo: number, hi: number, format: Format, random: Random): number {
  const x = random.below(20) === 0 ? hi : lo + (hi - lo) * random.next();
  if (format === 'f64') return Math.min(x, hi);
  const near = [Math.fround(x), Math.fround(x * (1 - 2 ** -23)), Math.fround(x * (1 + 2 ** -23))];
  return near.find((y) => lo <= y && y <= hi) ?? lo;
}

const p = new pairs.Pairs(4);

/** What an operation gives in a format, and how far off that is. */
function computed(
  operation: Operation,
  x: number,
  y: number,
  format: Format,
): { readonly result: number; readonly error: number } {
  pairs.set(p, 0, x);
  pairs.set(p, 1, y);
  if (operation === 'sqrt') pairs.sqrt(p, 2, 0);
  else if (operation === 'round') pairs.set(p, 2, x);
  else pairs[operation as 'add' | 'sub' | 'mul' | 'div'](p, 2, 0, 1);
  const plain = p.hi[2]!;
  const result = format === 'f32' ? Math.fround(plain) : plain;
  return { result, error: Math.abs(result - p.hi[2]! - p.lo[2]!) * (1 - 2 ** -40) };
}

/** Errors of lines pass through the lines after them: the bound of a short chain is nearly attained. */
export function chains({ LineTape }: Analysis): void {
  const random = new Random(85);
  // (a b) / (a - b), and a sqrt(a b) - b / a, whose lines all count
  const quotient = kernelOf('f32', ['a', 'b', ['mul', 0, 1], ['sub', 0, 1], ['div', 2, 3]]);
  const mixed = kernelOf('f32', [
    'a',
    'b',
    ['mul', 0, 1],
    ['sqrt', 2],
    ['mul', 0, 3],
    ['div', 1, 0],
    ['sub', 4, 5],
  ]);
  for (const [kernel, exact] of [
    [quotient, (a: number, b: number) => (a * b) / (a - b)],
    [mixed, (a: number, b: number) => a * Math.sqrt(a * b) - b / a],
  ] as const) {
    const result = kernel.lines.length - 1;
    const tape = new LineTape(kernel, [0, 1], [result]);
    const shares = new Shares();
    for (let round = 0; round < 60; round++) {
      const [a, b] = [2.2 + random.next(), 1.1 + 0.3 * random.next()];
      const [da, db] = [2 ** -12 * random.next(), 2 ** -12 * random.next()];
      const [bound] = tape.errors([a, b], [a + da, b + db]) as [number];
      for (let n = 0; n < 200; n++) {
        const x = inside(a, a + da, 'f32', random);
        const y = inside(b, b + db, 'f32', random);
        if (x !== Math.fround(x) || y !== Math.fround(y)) continue;
        const values = [x, y];
        for (const { operation, args } of kernel.lines.slice(2))
          values.push(computed(operation, values[args[0]!]!, values[args[1] ?? 0]!, 'f32').result);
        shares.add(Math.abs(values[result]! - exact(x, y)), bound, () => `the chain at ${x}, ${y}`);
      }
    }
    shares.reach(0.75, 'a chain of lines');
  }
}
