import { readLines } from '../messages/text-lines.ts';
import type { Position } from '../models/position.ts';
import type { GnssTime } from '../time/gnss-time.ts';
import {
  readClock,
  readEpoch,
  readTimeSystem,
  readVector,
  readVersion,
  satelliteOf,
  sp3Fault,
} from './sp3-lines.ts';

/** A precise orbit's state of one satellite. What the file marks as bad or absent is left out. */
export interface Sp3State {
  /** System letter and two digits, such as G07. */
  readonly satellite: string;
  /** Position of the centre of mass in the file's Earth-fixed frame, m. */
  readonly position: Position;
  /** Velocity in the same frame, m/s. */
  readonly velocity?: Position;
  /** Clock offset, s. */
  readonly clock?: number;
}

/** One epoch of a precise orbit. */
export interface Sp3Epoch {
  readonly time: GnssTime;
  readonly states: readonly Sp3State[];
  /** Line of the file where the epoch starts, from 1. */
  readonly line: number;
}

const METRES_PER_KM = 1e3;
const METRES_PER_DM = 0.1;

/**
 * Epochs of an SP3 file of version a, c or d in GPS time, in the order of the file. The file is read in
 * chunks, so memory does not grow with its size.
 * Source: Hilla, The Extended Standard Product 3 Orbit Format (SP3-c), 2010, and SP3-d, 2016.
 *
 * @param path file to read
 * @throws InputError at the first fault, with its line; codes start with sp3. or file.
 */
export async function* readSp3(path: string): AsyncGenerator<Sp3Epoch> {
  const assembler = new EpochAssembler(path);
  for await (const lines of readLines(path)) {
    for (const line of lines) {
      const epoch = assembler.push(line);
      if (epoch !== undefined) yield epoch;
    }
  }
  assembler.end();
}

/** Collects the states of an epoch until the next epoch or the end. */
class EpochAssembler {
  readonly #file: string;
  #number = 0;
  #version = '';
  #time: GnssTime | undefined;
  #line = 0;
  #states: Sp3State[] = [];
  #last = '';
  #isTimeSystemKnown = false;
  #isDone = false;

  constructor(file: string) {
    this.#file = file;
  }

  /** Takes the next line; returns the epoch that the line ends, if it ends one. */
  push(line: string): Sp3Epoch | undefined {
    this.#number++;
    const place = { file: this.#file, line: this.#number };
    if (this.#isDone) return undefined;
    if (this.#number === 1) {
      this.#version = readVersion(line, place);
    } else if (line.startsWith('EOF')) {
      this.#isDone = true;
      return this.#finish();
    } else if (line.startsWith('*')) {
      if (!this.#isTimeSystemKnown) throw sp3Fault('header', place, 'epochs begin before the %c line');
      const epoch = this.#finish();
      this.#time = readEpoch(line, place);
      this.#line = this.#number;
      return epoch;
    } else if (line.startsWith('P')) {
      this.#position(line, place);
    } else if (line.startsWith('V')) {
      this.#velocity(line, place);
    } else if (line.startsWith('%c')) {
      if (!this.#isTimeSystemKnown) readTimeSystem(line, this.#version, place);
      this.#isTimeSystemKnown = true;
    } else if (!/^(?:##|\+|%|\/\*|E[PV])/.test(line)) {
      throw sp3Fault('structure', place, `no line of this format starts with "${line.slice(0, 2)}"`);
    }
    return undefined;
  }

  /** Says that the file ended. */
  end(): void {
    if (this.#isDone) return;
    throw sp3Fault('cut', { file: this.#file, line: this.#number }, 'the file ends without the line EOF');
  }

  #position(line: string, place: { file: string; line: number }): void {
    if (this.#time === undefined)
      throw sp3Fault('structure', place, 'a position stands before the first epoch');
    const position = readVector(line, METRES_PER_KM, place);
    this.#last = satelliteOf(line, place);
    if (position === undefined) return;
    const clock = readClock(line, place);
    this.#states.push({ satellite: this.#last, position, ...(clock !== undefined && { clock }) });
  }

  #velocity(line: string, place: { file: string; line: number }): void {
    if (satelliteOf(line, place) !== this.#last) {
      throw sp3Fault('structure', place, 'a velocity does not follow the position of its satellite');
    }
    const velocity = readVector(line, METRES_PER_DM, place);
    const state = this.#states.at(-1);
    if (velocity === undefined || state?.satellite !== this.#last) return;
    this.#states[this.#states.length - 1] = { ...state, velocity };
  }

  #finish(): Sp3Epoch | undefined {
    if (this.#time === undefined) return undefined;
    const epoch = { time: this.#time, states: this.#states, line: this.#line };
    this.#states = [];
    this.#last = '';
    return epoch;
  }
}
