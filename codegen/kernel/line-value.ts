import type { Line } from './kernel.ts';

/**
 * What a line gives in float64, before any rounding to float32.
 *
 * @param line the line
 * @param values values of the lines before it
 * @param input value of an input by name
 */
export function lineValue(
  line: Line,
  values: Readonly<Float64Array>,
  input: (name: string) => number,
): number {
  const { operation, args } = line;
  const a = values[args[0]!]!;
  const b = values[args[1]!]!;
  switch (operation) {
    case 'input':
      return input(line.name);
    case 'constant':
      return line.value;
    case 'add':
      return a + b;
    case 'sub':
      return a - b;
    case 'mul':
      return a * b;
    case 'div':
      return a / b;
    case 'neg':
      return -a;
    case 'round':
      return a;
    case 'select':
      return values[args[a < b ? 2 : 3]!]!;
    case 'sqrt':
    case 'abs':
    case 'floor':
      return Math[operation](a);
  }
}
