import fc from 'fast-check';
import type { Choices, Format } from '../../codegen/kernel/choices.ts';
import { isRounded, type Kernel, type Line, type Operation } from '../../codegen/kernel/kernel.ts';

/** Arguments of each operation. */
const ARGUMENTS: Readonly<Partial<Record<Operation, number>>> = {
  add: 2,
  sub: 2,
  mul: 2,
  div: 2,
  neg: 1,
  sqrt: 1,
  abs: 1,
  floor: 1,
  select: 4,
};

const OPERATIONS = Object.keys(ARGUMENTS) as Operation[];
const FORMATS: readonly (readonly [Format, Format])[] = [
  ['f64', 'f64'],
  ['f64', 'f32'],
  ['f32', 'f32'],
];
const node: Line['node'] = { operation: 'constant', args: [], stage: 'constant', value: 0, name: '' };

/** Draws numbers from 0 up to, not including, a limit. */
type Draw = (limit: number) => number;

/** Numbers that stay finite when they are rounded to float32. */
const finite = fc.double({ noNaN: true, min: -3e38, max: 3e38 });

/** Kernels of random lines that lowering could give; their values mean nothing. */
export const randomKernel: fc.Arbitrary<Kernel> = fc
  .record({
    formats: fc.constantFrom(...FORMATS),
    numbers: fc.array(finite, { minLength: 1, maxLength: 5 }),
    ranges: fc.array(fc.tuple(finite, finite), { minLength: 2, maxLength: 5 }),
    sizes: fc.tuple(fc.nat(15), fc.nat(25), fc.nat(3)),
    picks: fc.infiniteStream(fc.nat()),
  })
  .map(({ formats, numbers, ranges, sizes, picks }) => {
    const draw: Draw = (limit) => (picks.next().value as number) % limit;
    return new Maker(formats, numbers, ranges, draw).kernel(...sizes);
  });

class Maker {
  private readonly lines: Line[] = [];
  private readonly choices: Choices;
  private readonly numbers: readonly number[];
  private readonly ranges: readonly (readonly [number, number])[];
  private readonly draw: Draw;

  constructor(
    [setup, tick]: readonly [Format, Format],
    numbers: readonly number[],
    ranges: readonly (readonly [number, number])[],
    draw: Draw,
  ) {
    this.choices = { setup, tick, starter: 'secant', corrector: 'newton', cap: 1 };
    this.numbers = numbers;
    this.ranges = ranges;
    this.draw = draw;
  }

  kernel(setupLines: number, tickLines: number, outputCount: number): Kernel {
    const { choices, lines } = this;
    for (const format of ['f64', 'f32'] as const)
      if (format === choices.setup || format === choices.tick)
        for (const number of this.numbers)
          this.push('constant', [], format, 'constant', '', format === 'f32' ? Math.fround(number) : number);
    const elements = this.ranges.slice(1).map((_, index) => `x${index}`);
    for (const name of elements) this.input(name, 'setup');
    for (let k = 0; k < setupLines; k++) this.random('setup');
    if (choices.setup !== choices.tick)
      for (const [line, { stage, format }] of [...lines.entries()])
        if (stage === 'setup' && format === 'f64' && this.draw(2) === 0)
          this.push('round', [line], 'f32', 'setup');
    this.input('t', 'tick');
    for (let k = 0; k < tickLines; k++) this.random('tick');
    const outputs = Array.from({ length: outputCount + 1 }, (_, index) => ({
      group: 'position',
      name: `y${index}`,
      unit: 'm',
      line: this.argument('tick', true),
    }));
    const read = [
      ...lines.filter((line) => line.stage === 'tick').flatMap((line) => line.args),
      ...outputs.map((output) => output.line),
    ];
    const state = [...new Set(read.filter((line) => lines[line]!.stage === 'setup'))];
    const domain = Object.fromEntries(
      [...elements, 't'].map((name, index) => {
        const [min, max] = this.ranges[index]!;
        return [name, { min, max, from: '' }];
      }),
    );
    const guard = this.draw(state.length + 1) - 1;
    return { model: 'random', choices, domain, elements, lines, state, guard, outputs };
  }

  private input(name: string, stage: 'setup' | 'tick'): void {
    const input = this.push('input', [], 'f64', stage, name);
    if (this.choices[stage] === 'f32') this.push('round', [input], 'f32', stage, `${name}32`);
  }

  private random(stage: 'setup' | 'tick'): void {
    const operation = OPERATIONS[this.draw(OPERATIONS.length)]!;
    // A line takes at least one line: of constants alone lowering makes a constant.
    const args = Array.from({ length: ARGUMENTS[operation]! }, (_, index) => this.argument(stage, index > 0));
    this.push(operation, args, this.choices[stage], stage);
  }

  /** A line of the stage's arithmetic that the stage can read. */
  private argument(stage: 'setup' | 'tick', orConstant: boolean): number {
    const format = this.choices[stage];
    const good = [...this.lines.keys()].filter((number) => {
      const line = this.lines[number]!;
      if (line.format !== format) return false;
      return line.operation === 'constant' ? orConstant : stage === 'tick' || line.stage === 'setup';
    });
    return good[this.draw(good.length)]!;
  }

  private push(
    operation: Operation,
    args: readonly number[],
    format: Format,
    stage: Line['stage'],
    name = `v${this.lines.length}`,
    value = 0,
  ): number {
    return this.lines.push({ name, operation, args, format, stage, value, node }) - 1;
  }
}

/** A kernel with one thing changed in a way that a file shows, and what was changed. */
export function changed(kernel: Kernel, draw: Draw): readonly [what: string, kernel: Kernel] {
  const { lines, state, outputs, domain, elements } = kernel;
  const pick = <T>(list: readonly T[]): T => list[draw(list.length)]!;
  const withLine = (number: number, line: Partial<Line>): Kernel => ({
    ...kernel,
    lines: lines.map((old, index) => (index === number ? { ...old, ...line } : old)),
  });
  const computed = [...lines.keys()].filter((line) => isRounded(lines[line]!.operation));
  const numbers = [...lines.keys()].filter(
    (line) =>
      lines[line]!.operation === 'constant' &&
      (lines.some(({ args }) => args.includes(line)) || outputs.some((output) => output.line === line)),
  );
  const changes: (readonly [string, Kernel])[] = [];
  if (computed.length > 0) {
    const number = pick(computed);
    const { operation, args } = lines[number]!;
    if (operation !== 'sqrt') {
      const others = (['add', 'sub', 'mul', 'div'] as const).filter((other) => other !== operation);
      changes.push(['operation', withLine(number, { operation: pick(others) })]);
      if (args[0] !== args[1]) changes.push(['swapped', withLine(number, { args: [args[1]!, args[0]!] })]);
    }
  }
  if (numbers.length > 0) {
    const number = pick(numbers);
    const { value, format } = lines[number]!;
    changes.push(['constant', withLine(number, { value: neighbour(value, format) })]);
  }
  if (state.length > 1) changes.push(['state', { ...kernel, state: [...state.slice(1), state[0]!] }]);
  if (state.length > 0)
    changes.push(['guard', { ...kernel, guard: kernel.guard < 0 ? draw(state.length) : kernel.guard - 1 }]);
  changes.push(['output', { ...kernel, outputs: [...outputs, outputs[0]!] }]);
  const name = pick([...elements, 't']);
  const range = domain[name]!;
  const format = kernel.choices[name === 't' ? 'tick' : 'setup'];
  const max = format === 'f32' ? neighbour(Math.fround(range.max), format) : neighbour(range.max, format);
  changes.push(['range', { ...kernel, domain: { ...domain, [name]: { ...range, max } } }]);
  return pick(changes);
}

/** The next number of a format towards zero, or away from it at zero. */
export function neighbour(value: number, format: Format): number {
  if (value === 0) return format === 'f32' ? 2 ** -149 : Number.MIN_VALUE;
  const [numbers, bits] =
    format === 'f32' ? [new Float32Array([value]), Uint32Array] : [new Float64Array([value]), BigUint64Array];
  const view = new bits(numbers.buffer);
  if (view instanceof BigUint64Array) view[0] = view[0]! - 1n;
  else view[0] = view[0]! - 1;
  return numbers[0]!;
}
