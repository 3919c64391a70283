import type { Finding } from '../../src/finding.ts';
import type { Kernel, Line } from '../kernel/kernel.ts';
import { type Groups, groupsOfFile, groupsOfKernel, type InputLines, pairLines } from './pairs.ts';
import type { Mark, ParsedArgument, ParsedInput, ParsedKernel } from './parsed.ts';

/** Most differences that are told one by one. */
const MOST_TOLD = 10;

/** Stable codes of differences between a file and a kernel. */
type DifferenceCode =
  | 'parse.other-element'
  | 'parse.other-range'
  | 'parse.other-operation'
  | 'parse.other-format'
  | 'parse.other-argument'
  | 'parse.other-constant'
  | 'parse.other-count'
  | 'parse.other-state'
  | 'parse.other-guard'
  | 'parse.other-output'
  | 'parse.more-differences';

/**
 * Compares what a file says with a kernel: every operation, argument, constant (bit for bit), format, range, word of
 * the state, guard and output, in order. Names of values are free.
 *
 * @param parsed what the file says
 * @param kernel what it should say
 * @param file the file, for messages
 * @returns the first differences in the order of the file, and how many more there are; empty when there is none
 */
export function compareKernel(parsed: ParsedKernel, kernel: Kernel, file: string): readonly Finding[] {
  const all = [...new Comparison(parsed, kernel, file).findings].sort(
    (a, b) => (a.place.line ?? 0) - (b.place.line ?? 0),
  );
  if (all.length <= MOST_TOLD) return all;
  const more = all.length - MOST_TOLD;
  const { line, column } = all[MOST_TOLD]!.place as Mark;
  return [
    ...all.slice(0, MOST_TOLD),
    difference('parse.more-differences', file, { line, column }, `${more} more differences from here on`),
  ];
}

class Comparison {
  readonly findings: Finding[] = [];
  private readonly parsed: ParsedKernel;
  private readonly kernel: Kernel;
  private readonly file: string;
  private readonly groups: { readonly file: Groups; readonly kernel: Groups };
  private readonly pairs: ReadonlyMap<number, number>;
  /** Names of the file by line of the kernel. */
  private readonly names: ReadonlyMap<number, string>;

  constructor(parsed: ParsedKernel, kernel: Kernel, file: string) {
    this.parsed = parsed;
    this.kernel = kernel;
    this.file = file;
    this.groups = { file: groupsOfFile(parsed), kernel: groupsOfKernel(kernel) };
    this.pairs = pairLines(this.groups.file, this.groups.kernel);
    this.names = new Map([...this.pairs].map(([line, other]) => [other, parsed.lines[line]!.name]));
    this.elements();
    this.assignments('setup');
    this.state();
    this.input(parsed.time, this.groups.kernel.time);
    this.assignments('tick');
    this.outputs();
  }

  private elements(): void {
    const { parsed, groups } = this;
    for (const [index, input] of parsed.elements.entries()) {
      const due = groups.kernel.elements[index];
      if (due !== undefined) this.input(input, due);
    }
    this.count('parse.other-element', 'elements', parsed.elements, groups.kernel.elements, parsed.ends.setup);
  }

  private input(input: ParsedInput, due: InputLines): void {
    if (input.field !== due.field) {
      this.tell('parse.other-element', input, `element ${input.field}`, `element ${due.field}`);
      return;
    }
    const value = (rounded: number | undefined) =>
      rounded === undefined ? input.field : `fround(${input.field})`;
    const { min, max } = this.kernel.domain[due.field]!;
    const bounds = due.rounded === undefined ? [min, max] : [Math.fround(min), Math.fround(max)];
    const [have, want] = [
      `${value(input.rounded)} in [${text(input.min)}, ${text(input.max)}]`,
      `${value(due.rounded)} in [${bounds.map(text).join(', ')}]`,
    ];
    if (have !== want) this.tell('parse.other-range', input, have, want);
  }

  private assignments(stage: 'setup' | 'tick'): void {
    const { file, kernel } = this.groups;
    for (const [index, line] of file[stage].entries()) {
      const due = kernel[stage][index];
      if (due !== undefined) this.line(line, this.kernel.lines[due]!);
    }
    const marks = file[stage].map((line) => this.parsed.lines[line]!);
    this.count('parse.other-count', `lines of ${stage}`, marks, kernel[stage], this.parsed.ends[stage]);
  }

  private line(number: number, due: Line): void {
    const line = this.parsed.lines[number]!;
    const code = this.lineCode(number, due);
    if (code === undefined) return;
    const have = describe(
      line,
      line.args.map((arg) => this.argumentText(arg)),
    );
    this.tell(
      code,
      line,
      have,
      describe(
        due,
        due.args.map((arg) => this.dueText(arg)),
      ),
    );
  }

  /** The first thing in which a line differs. */
  private lineCode(number: number, due: Line): DifferenceCode | undefined {
    const line = this.parsed.lines[number]!;
    if (line.operation !== due.operation) return 'parse.other-operation';
    const wrong = line.args.findIndex((arg, index) => !this.isSame(arg, due.args[index]!));
    if (wrong >= 0) {
      const bothNumbers =
        'literal' in line.args[wrong]! && this.kernel.lines[due.args[wrong]!]!.operation === 'constant';
      return bothNumbers ? 'parse.other-constant' : 'parse.other-argument';
    }
    return line.format === due.format ? undefined : 'parse.other-format';
  }

  private state(): void {
    const { parsed, kernel } = this;
    for (const [slot, word] of parsed.state.entries()) {
      const due = kernel.state[slot];
      if (due !== undefined && this.pairs.get(word.value) !== due)
        this.tell(
          'parse.other-state',
          word,
          `${parsed.lines[word.value]!.name} in slot ${slot}`,
          `${this.dueText(due)} there`,
        );
    }
    this.count('parse.other-state', 'words of the state', parsed.state, kernel.state, parsed.ends.setup);
    if (parsed.guard !== kernel.guard)
      this.tell('parse.other-guard', parsed.time, guardText(parsed.guard), guardText(kernel.guard));
  }

  private outputs(): void {
    const { parsed, kernel } = this;
    for (const [index, { value, ...mark }] of parsed.outputs.entries()) {
      const due = kernel.outputs[index]?.line;
      if (due !== undefined && !this.isSame(value, due))
        this.tell(
          'parse.other-output',
          mark,
          `${this.argumentText(value)} as output ${index}`,
          `${this.dueText(due)} there`,
        );
    }
    this.count('parse.other-output', 'outputs', parsed.outputs, kernel.outputs, parsed.ends.tick);
  }

  /** Whether an argument is the line of the kernel, or its constant to the bit. */
  private isSame(arg: ParsedArgument, due: number): boolean {
    const line = this.kernel.lines[due]!;
    if (line.operation === 'constant') return 'literal' in arg && Object.is(arg.literal, line.value);
    return 'line' in arg && this.pairs.get(arg.line) === due;
  }

  private count(
    code: DifferenceCode,
    what: string,
    have: readonly Mark[],
    want: readonly unknown[],
    end: Mark,
  ): void {
    if (have.length !== want.length)
      this.tell(code, have[want.length] ?? end, `${have.length} ${what}`, `${want.length}`);
  }

  private argumentText(arg: ParsedArgument): string {
    return 'line' in arg ? this.parsed.lines[arg.line]!.name : text(arg.literal);
  }

  /** A line of the kernel in the words of the file, where it has one for it. */
  private dueText(number: number): string {
    const line = this.kernel.lines[number]!;
    return line.operation === 'constant' ? text(line.value) : (this.names.get(number) ?? line.name);
  }

  private tell(code: DifferenceCode, mark: Mark, have: string, want: string): void {
    this.findings.push(difference(code, this.file, mark, `the file has ${have}, the kernel has ${want}`));
  }
}

function describe(
  { operation, format }: Pick<Line, 'operation' | 'format'>,
  args: readonly string[],
): string {
  return `${format} ${operation}(${args.join(', ')})`;
}

function guardText(slot: number): string {
  return slot < 0 ? 'no guard' : `its guard in slot ${slot}`;
}

function text(value: number): string {
  return Object.is(value, -0) ? '-0' : String(value);
}

function difference(code: DifferenceCode, file: string, { line, column }: Mark, what: string): Finding {
  return {
    code,
    place: { file, line, column },
    what,
    why: 'The proof speaks of the kernel that the model gives, so the file must be that kernel line by line.',
    remedy: 'Generate the file again, or find out who changed it.',
  };
}
