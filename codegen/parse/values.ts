import { isRounded } from '../kernel/kernel.ts';
import type { Assignment, Filled } from './forms.ts';
import type { Lines, Taken } from './lines.ts';
import { literalOf } from './literal.ts';
import type { ParsedArgument, ParsedLine } from './parsed.ts';
import type { Token } from './tokens.ts';

/** Names of the module and of its parameters: no value may hide them. */
const TAKEN: ReadonlySet<string> = new Set([
  'elements',
  'state',
  'out',
  'setup',
  'position',
  'fround',
  'stateWords',
  'Math',
]);

/** The values of a file, and by which names the function at hand knows them. */
export class Values {
  readonly list: ParsedLine[] = [];
  private names = new Map<string, number>();
  private readonly lines: Lines;
  private readonly hasFround: boolean;

  /**
   * @param lines the file
   * @param hasFround whether the file defines `fround`
   */
  constructor(lines: Lines, hasFround: boolean) {
    this.lines = lines;
    this.hasFround = hasFround;
  }

  /** Forgets all names: a function knows nothing of those of another. */
  enter(): void {
    this.names = new Map();
  }

  /** Gives a value a name in the function at hand. */
  define(name: Token, value: number): void {
    if (TAKEN.has(name.text) || this.names.has(name.text))
      this.lines.refuse('parse.name', name, `the name ${name.text} stands for something else already`);
    this.names.set(name.text, value);
  }

  /** The value that a name stands for. */
  named(name: Token): number {
    return (
      this.names.get(name.text) ??
      this.lines.refuse('parse.undefined-name', name, `nothing above defines ${name.text}`)
    );
  }

  /** A value by its name, or a number. */
  argument(token: Token): ParsedArgument {
    return token.kind === 'number' ? { literal: literalOf(this.lines, token) } : { line: this.named(token) };
  }

  /** Adds an input. */
  input(name: Token, stage: ParsedLine['stage']): number {
    return this.add(name, { operation: 'input', args: [], format: 'f64', stage });
  }

  /** Adds the value of an assignment. */
  assign({ operation, rounded }: Assignment, stage: ParsedLine['stage'], taken: Taken): number {
    const [name, ...rest] = taken.filled as [Token, ...Filled];
    const args = rest.map((token) => this.argument(token));
    if (rounded && !this.hasFround)
      this.lines.refuse('parse.undefined-name', taken, 'nothing at the top of the file defines fround');
    if (!isRounded(operation)) {
      const format = operation === 'round' || this.staysFloat32(args) ? 'f32' : 'f64';
      return this.add(name, { operation, args, format, stage });
    }
    const wide = rounded ? rest.find((_, index) => !this.isFloat32(args[index]!)) : undefined;
    if (wide !== undefined)
      this.lines.refuse(
        'parse.float32',
        wide,
        `${wide.text} is no float32 number in an operation of float32`,
      );
    return this.add(name, { operation, args, format: rounded ? 'f32' : 'f64', stage });
  }

  private add(name: Token, value: Omit<ParsedLine, 'name' | 'line' | 'column'>): number {
    this.define(name, this.list.length);
    const { text, line, column } = name;
    return this.list.push({ name: text, ...value, line, column }) - 1;
  }

  /** Whether an exact operation takes float32 numbers alone: then it gives one. Numbers alone settle no format. */
  private staysFloat32(args: readonly ParsedArgument[]): boolean {
    return args.every((arg) => this.isFloat32(arg)) && args.some((arg) => 'line' in arg);
  }

  private isFloat32(arg: ParsedArgument): boolean {
    return 'line' in arg ? this.list[arg.line]!.format === 'f32' : Math.fround(arg.literal) === arg.literal;
  }
}
