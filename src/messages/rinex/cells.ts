import { rinexFault } from './fault.ts';
import type { RecordLines } from './record-lines.ts';

/** Width of a number, D19.12. */
const WIDTH = 19;

const BLANK = ' '.repeat(WIDTH);

const NUMBER = /^ *[-+]?(?:\d+\.?\d*|\.\d+)(?:[EeDd][-+]?\d+)? *$/;

/**
 * The numbers of one record, found by line and column.
 * Source: RINEX 2.11, Table A4; RINEX 3.05, Table A6: a prefix, then four numbers of 19 columns a line.
 */
export class RecordCells {
  readonly #file: string;
  readonly #record: RecordLines;
  /** Columns before the first number of an orbit line. */
  readonly #prefix: number;

  constructor(file: string, record: RecordLines) {
    this.#file = file;
    this.#record = record;
    this.#prefix = record.generation === 2 ? 3 : 4;
  }

  /** The satellite and the epoch: what stands before the first number of the first line. */
  get epoch(): string {
    return (this.#record.lines[0] ?? '').slice(0, this.#prefix + WIDTH);
  }

  /**
   * The number in a slot.
   *
   * @returns the number, or undefined where the slot is blank
   * @throws InputError with code rinex.number
   */
  optional(name: string, line: number, column: number): number | undefined {
    const text = this.#text(line, column);
    if (text === BLANK || text.trim() === '') return undefined;
    const value = NUMBER.test(text) ? toNumber(text) : Number.NaN;
    if (!Number.isFinite(value))
      throw this.fault('number', line, column, `${name} is no number: "${text.trim()}"`);
    if (text.length < WIDTH)
      throw this.fault('number', line, column, `the line ends within ${name}: "${text.trim()}"`);
    return value;
  }

  /**
   * The number in a slot that must not be blank.
   *
   * @throws InputError with code rinex.number or rinex.blank
   */
  required(name: string, line: number, column: number): number {
    const value = this.optional(name, line, column);
    if (value === undefined) throw this.fault('blank', line, column, `${name} is blank`);
    return value;
  }

  /** A finding about one slot; column 0 of line 0 is the satellite and the epoch. */
  fault(code: string, line: number, column: number, what: string): Error {
    const start = this.#start(line, column) + 1;
    const place = { file: this.#file, line: this.#record.first + line, column: start };
    const columns = `columns ${start} to ${this.#start(line, column + 1)}`;
    return rinexFault(
      code,
      place,
      what,
      `It stands in ${columns}; the record starts at line ${this.#record.first}.`,
    );
  }

  #text(line: number, column: number): string {
    return (this.#record.lines[line] ?? '').slice(this.#start(line, column), this.#start(line, column + 1));
  }

  #start(line: number, column: number): number {
    return line === 0 && column === 0 ? 0 : this.#prefix + column * WIDTH;
  }
}

/** Number does not know the D of Fortran's exponents. */
function toNumber(text: string): number {
  const value = Number(text);
  return Number.isNaN(value) ? Number(text.replace(/[Dd]/, 'e')) : value;
}
