import { describe, expect, test } from 'vitest';
import { Random } from '../../codegen/numbers/random.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { Points } from '../../codegen/observe/points.ts';
import { compareKernel } from '../../codegen/parse/compare.ts';
import { parseKernel } from '../../codegen/parse/parse.ts';
import type { ParsedArgument, ParsedKernel } from '../../codegen/parse/parsed.ts';
import { toKernel } from '../../codegen/parse/to-kernel.ts';
import { committedKernels } from './kernels.ts';

const OPERATIONS: Readonly<Record<string, (...args: number[]) => number>> = {
  add: (a, b) => a! + b!,
  sub: (a, b) => a! - b!,
  mul: (a, b) => a! * b!,
  div: (a, b) => a! / b!,
  neg: (a) => -a!,
  sqrt: (a) => Math.sqrt(a!),
  abs: (a) => Math.abs(a!),
  floor: (a) => Math.floor(a!),
  select: (a, b, c, d) => (a! < b! ? c! : d!),
  round: (a) => a!,
};

/** Computes the outputs from what was understood of a file. */
function run(parsed: ParsedKernel, point: Readonly<Record<string, number>>): readonly number[] {
  const fields = new Map([...parsed.elements, parsed.time].map(({ input, field }) => [input, field]));
  const values: number[] = [];
  const valueOfArgument = (arg: ParsedArgument) => ('line' in arg ? values[arg.line]! : arg.literal);
  for (const [number, { operation, args, format }] of parsed.lines.entries()) {
    const value =
      operation === 'input'
        ? point[fields.get(number)!]!
        : OPERATIONS[operation]!(...args.map(valueOfArgument));
    values.push(format === 'f32' ? Math.fround(value) : value);
  }
  return parsed.outputs.map(({ value }) => valueOfArgument(value));
}

describe.each(committedKernels())('$name', ({ text, kernel }) => {
  const parsed = parseKernel('kernel.js', text);

  test('is the kernel of its model', () => {
    expect(compareKernel(parsed, kernel, 'kernel.js')).toEqual([]);
    expect(toKernel(parsed, kernel)).toEqual(kernel);
  });

  // ECMA-262 says what the text computes; the engine that runs this test carries it out.
  test('what was understood computes what the engine computes, to the bit', async () => {
    const module = await importKernel(text);
    const names = [...kernel.elements, 't'];
    const points = new Points(kernel.domain, names, new Random(71));
    const state = new Float64Array(parsed.state.length);
    const out = new Float64Array(parsed.outputs.length);
    for (let k = 0; k < 200; k++) {
      const point = points.draw();
      expect(module.setup(point, state)).toBe(0);
      expect(module.position(point['t']!, state, out)).toBe(0);
      expect(run(parsed, point)).toEqual([...out]);
    }
  });

  test('every line stands where it is said to stand', () => {
    const lines = text.split('\n');
    for (const { name, line, column } of parsed.lines.filter((entry) => entry.name !== 't'))
      expect(lines[line - 1]!.slice(column - 1)).toMatch(new RegExp(`^${name}\\b`));
  });

  test('comments change nothing, line ends neither', () => {
    const commented = text
      .split('\n')
      .map((line) =>
        line.startsWith(' *') || line.startsWith('/*') ? line : `${line} // in [-1e3, 2), share 3 %`,
      )
      .join('\n');
    expect(parseKernel('kernel.js', commented)).toEqual(parsed);
    expect(parseKernel('kernel.js', text.replaceAll('\n', '\r\n'))).toEqual(parsed);
    expect(
      parseKernel(
        'kernel.js',
        text.replace(/\/\*\*[\s\S]*?\*\//g, (all) => all.replace(/.*/g, '')),
      ),
    ).toEqual(parsed);
  });
});
