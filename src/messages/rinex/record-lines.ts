import { rinexFault } from './fault.ts';
import type { RinexLayout } from './header.ts';

/** The lines of one GPS LNAV record. */
export interface RecordLines {
  readonly generation: RinexLayout['generation'];
  readonly lines: readonly string[];
  /** Line of the file where the first of them stands. */
  readonly first: number;
}

/** Epoch line and seven broadcast orbit lines. */
const LINES = 8;

const STARTS = { 2: /^[ \d]\d /, 3: /^[GRSECJI][ \d]\d / } as const;
const FRAME = /^> [A-Z]{3} ([GRSECJI])\d\d +([A-Z0-9]+)/;

/** What the line under the cursor belongs to. */
type State = 'between' | 'record' | 'other';

/**
 * Cuts the lines after the header into GPS LNAV records and passes over what is not one.
 *
 * Generations 2 and 3: a record starts with a satellite, and its other lines start with blanks. Generation 4:
 * a frame starts with ">", system, satellite and message type, and runs to the next such line.
 * Source: RINEX 2.11, 3.05 and 4.00, navigation data records (from memory).
 */
export class RecordCutter {
  readonly #file: string;
  readonly #layout: RinexLayout;
  readonly #indent: string;
  #state: State = 'between';
  #lines: string[] = [];
  #first = 0;

  constructor(file: string, layout: RinexLayout) {
    this.#file = file;
    this.#layout = layout;
    this.#indent = layout.generation === 2 ? '   ' : '    ';
  }

  /**
   * Takes the next line.
   *
   * @returns the record that the line completes, if it completes one
   * @throws InputError with code rinex.structure, rinex.short-record or rinex.tab
   */
  push(line: string, number: number): RecordLines | undefined {
    if (!this.#layout.holdsGps) return undefined;
    if (this.#state === 'record') return this.#within(line, number);
    if (line.trim() === '') return undefined;
    if (this.#layout.generation === 4) this.#startFrame(line, number);
    else this.#startRecord(line, number, STARTS[this.#layout.generation]);
    return undefined;
  }

  /** Says that the file ended. */
  end(lastLine: number): void {
    if (this.#state === 'record') throw this.#short(lastLine, 'the file ends');
  }

  #startFrame(line: string, number: number): void {
    if (line.startsWith('>')) {
      const frame = FRAME.exec(line);
      if (frame === null) throw this.#structure(number, 'the line starting with ">" names no frame');
      const wanted = line.startsWith('> EPH') && frame[1] === 'G' && frame[2] === 'LNAV';
      this.#state = wanted ? 'record' : 'other';
    } else if (this.#state === 'between') {
      throw this.#structure(number, 'a line outside of any frame');
    }
  }

  #startRecord(line: string, number: number, start: RegExp): void {
    if (start.test(line)) {
      const wanted = this.#layout.generation === 2 || line.startsWith('G');
      this.#state = wanted ? 'record' : 'other';
      if (wanted) this.#within(line, number);
    } else if (this.#state === 'between' || !line.startsWith(this.#indent)) {
      throw this.#structure(number, 'the line neither starts a record nor continues one');
    }
  }

  #within(line: string, number: number): RecordLines | undefined {
    const isFirst = this.#lines.length === 0;
    if (isFirst) this.#first = number;
    const belongs = isFirst ? /^[G \d]/.test(line) : line.startsWith(this.#indent) || line.trim() === '';
    if (!belongs) throw this.#short(number, 'another line comes');
    if (line.includes('\t')) throw this.#tab(line, number);
    this.#lines.push(line);
    if (this.#lines.length < LINES) return undefined;
    const record = { generation: this.#layout.generation, lines: this.#lines, first: this.#first };
    this.#lines = [];
    this.#state = 'between';
    return record;
  }

  #short(line: number, event: string): Error {
    return rinexFault(
      'short-record',
      { file: this.#file, line },
      `${event} after ${this.#lines.length} of the ${LINES} lines of a record`,
      this.#lines.length === 0 ? 'The frame has no record.' : `The record starts at line ${this.#first}.`,
    );
  }

  #structure(line: number, what: string): Error {
    const expected =
      this.#layout.generation === 4
        ? 'Frames start as "> EPH G01 LNAV" and hold the lines up to the next ">".'
        : `Records start with a satellite and go on with lines that start with ${this.#indent.length} blanks.`;
    return rinexFault('structure', { file: this.#file, line }, what, expected);
  }

  #tab(line: string, number: number): Error {
    const place = { file: this.#file, line: number, column: line.indexOf('\t') + 1 };
    return rinexFault(
      'tab',
      place,
      'the line holds a tab',
      'Fields stand in fixed columns, which a tab shifts.',
    );
  }
}
