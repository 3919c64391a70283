import { operationText } from '../formula/operation-text.ts';
import { BITS } from '../kernel/choices.ts';
import { isRounded, type Kernel, type Line, type Operation } from '../kernel/kernel.ts';
import { lineValue } from '../kernel/line-value.ts';

/**
 * The error of some outputs of a kernel as a sum over its lines: what each line rounds, times how far that moves the
 * outputs. A guide for the search of large errors; the errors that are reported come from elsewhere.
 */
export class RoundingModel {
  readonly kernel: Kernel;
  /** Lines that round. */
  readonly rounded: readonly number[];
  private readonly inputs: readonly string[];
  private readonly outputs: readonly number[];
  private readonly values: Float64Array;
  /** Adjoints: line k, output i at k * outputs + i. */
  private readonly adjoints: Float64Array;

  /**
   * @param kernel the kernel
   * @param inputs names of its inputs, in the order of points
   * @param outputs lines of the outputs
   */
  constructor(kernel: Kernel, inputs: readonly string[], outputs: readonly number[]) {
    this.kernel = kernel;
    this.inputs = inputs;
    this.outputs = outputs;
    this.rounded = kernel.lines.flatMap((line, k) => (rounds(line.operation) ? [k] : []));
    this.values = new Float64Array(kernel.lines.length);
    this.adjoints = new Float64Array(kernel.lines.length * outputs.length);
  }

  /** The largest sums that the lines can reach at a point, along some directions. */
  reach(point: Float64Array, directions: readonly (readonly number[])[]): readonly number[] {
    this.run(point);
    const sums = new Float64Array(directions.length);
    for (const k of this.rounded) {
      const largest = this.largest(k);
      for (let d = 0; d < sums.length; d++) sums[d]! += Math.abs(this.weight(k, directions[d]!)) * largest;
    }
    return [...sums];
  }

  /** What each line can add to a sum at a point, along a direction. */
  parts(
    point: Float64Array,
    direction: readonly number[],
  ): readonly { readonly line: number; readonly weight: number; readonly largest: number }[] {
    this.run(point);
    return this.rounded.map((line) => {
      const weight = this.weight(line, direction);
      return { line, weight, largest: Math.abs(weight) * this.largest(line) };
    });
  }

  /** Values and adjoints of all lines at a point, in float64. */
  private run(point: Float64Array): void {
    const { lines } = this.kernel;
    const { values, adjoints } = this;
    const count = this.outputs.length;
    const input = (name: string) => point[this.inputs.indexOf(name)]!;
    for (let k = 0; k < lines.length; k++) values[k] = lineValue(lines[k]!, values, input);
    adjoints.fill(0);
    for (const [i, output] of this.outputs.entries()) adjoints[output * count + i]! += 1;
    for (let k = lines.length - 1; k >= 0; k--) this.pass(k, lines[k]!);
  }

  /** After `run`: how far a unit of error in a line moves the outputs along a direction. */
  private weight(line: number, direction: readonly number[]): number {
    const count = direction.length;
    let sum = 0;
    for (let i = 0; i < count; i++) sum += this.adjoints[line * count + i]! * direction[i]!;
    return sum;
  }

  /** After `run`: the largest error that a line can have at its value. */
  private largest(k: number): number {
    const { operation, format, args } = this.kernel.lines[k]!;
    const size = Math.abs(this.values[k]!);
    if (size === 0) return 0;
    const half = 2 ** (Math.floor(Math.log2(size)) - BITS[format]);
    if (operation !== 'add' && operation !== 'sub') return half;
    // a sum is no further off than either operand
    return Math.min(half, Math.abs(this.values[args[0]!]!), Math.abs(this.values[args[1]!]!));
  }

  /** Inputs on which each line depends, as sets of their places. */
  dependences(): readonly ReadonlySet<number>[] {
    const sets: Set<number>[] = [];
    for (const line of this.kernel.lines) {
      const set = new Set(line.args.flatMap((arg) => [...sets[arg]!]));
      if (line.operation === 'input') set.add(this.inputs.indexOf(line.name));
      sets.push(set);
    }
    return sets;
  }

  /**
   * The sum of what some lines round, times their weights, as a function of the point: the lines run in the kernel's
   * arithmetic, and what each rounds is found exactly by error-free transformations (Knuth, Dekker).
   */
  score(lines: readonly number[], weights: readonly number[]): (point: Float64Array) => number {
    const needed = new Set<number>();
    const need = (k: number): void => {
      if (needed.has(k)) return;
      needed.add(k);
      this.kernel.lines[k]!.args.forEach(need);
    };
    lines.forEach(need);
    const text = [...needed]
      .sort((a, b) => a - b)
      .map((k) => `const v${k} = ${this.expression(this.kernel.lines[k]!)};`);
    const terms = lines.map((k, j) => `sum += ${weights[j]} * (${this.error(k)});`);
    return new Function(
      'addError',
      'mulError',
      `return (x) => { ${text.join('\n')} let sum = 0; ${terms.join('\n')} return sum; };`,
    )(addError, mulError) as (point: Float64Array) => number;
  }

  private expression(line: Line): string {
    const { operation, format } = line;
    const plain = this.unrounded(line);
    return format === 'f32' && rounds(operation) ? `Math.fround(${plain})` : plain;
  }

  private unrounded({ operation, args, value, name }: Line): string {
    const names = args.map((arg) => `v${arg}`);
    switch (operation) {
      case 'input':
        return `x[${this.inputs.indexOf(name)}]`;
      case 'constant':
        return String(value);
      case 'round':
        return names[0]!;
      default:
        return operationText(operation, names);
    }
  }

  /** Computed minus exact, of one line. */
  private error(k: number): string {
    const { operation, args, format } = this.kernel.lines[k]!;
    const [a, b = ''] = args.map((arg) => `v${arg}`) as [string, string?];
    if (format === 'f32' && operation !== 'div' && operation !== 'sqrt')
      return `v${k} - (${this.unrounded(this.kernel.lines[k]!)})`;
    switch (operation) {
      case 'add':
        return `addError(${a}, ${b}, v${k})`;
      case 'sub':
        return `addError(${a}, -${b}, v${k})`;
      case 'mul':
        return `mulError(${a}, ${b}, v${k})`;
      case 'div': // q b - a, over b
        return `(v${k} * ${b} - ${a} - mulError(v${k}, ${b}, v${k} * ${b})) / ${b}`;
      case 'sqrt': // s s - a, over 2 s
        return `(v${k} * v${k} - ${a} - mulError(v${k}, v${k}, v${k} * v${k})) / (2 * v${k} || 1)`;
      default:
        return '0';
    }
  }

  private pass(k: number, { operation, args }: Line): void {
    const { values } = this;
    const [a = 0, b = 0] = args;
    const [x, y] = [values[a]!, values[b]!];
    switch (operation) {
      case 'add':
        this.move(k, a, 1);
        return this.move(k, b, 1);
      case 'sub':
        this.move(k, a, 1);
        return this.move(k, b, -1);
      case 'mul':
        this.move(k, a, y);
        return this.move(k, b, x);
      case 'div':
        this.move(k, a, 1 / y);
        return this.move(k, b, -values[k]! / y);
      case 'neg':
        return this.move(k, a, -1);
      case 'round':
        return this.move(k, a, 1);
      case 'sqrt':
        return this.move(k, a, 0.5 / values[k]!);
      case 'abs':
        return this.move(k, a, x < 0 ? -1 : 1);
      case 'select':
        return this.move(k, x < y ? args[2]! : args[3]!, 1);
      default:
        return;
    }
  }

  private move(from: number, to: number, slope: number): void {
    const { adjoints } = this;
    const count = this.outputs.length;
    for (let i = 0; i < count; i++) adjoints[to * count + i]! += adjoints[from * count + i]! * slope;
  }
}

/** Whether a line of an operation has an error of its own. */
function rounds(operation: Operation): boolean {
  return operation === 'round' || isRounded(operation);
}

/** s - (a + b), exactly, for s the float64 sum. Source: Knuth, The Art of Computer Programming, volume 2, section 4.2.2. */
function addError(a: number, b: number, s: number): number {
  const t = s - a;
  return -(a - (s - t) + (b - t));
}

/** p - a b, exactly, for p the float64 product. Source: Dekker, Numerische Mathematik 18 (1971). */
function mulError(a: number, b: number, p: number): number {
  const c = 134217729 * a;
  const d = 134217729 * b;
  const ah = c - (c - a);
  const bh = d - (d - b);
  const al = a - ah;
  const bl = b - bh;
  return p - ah * bh - ah * bl - al * bh - al * bl;
}
