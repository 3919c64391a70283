import { rinexFault } from './fault.ts';

/** What the rest of the file looks like. */
export interface RinexLayout {
  /** 2: two-digit years and no system letter; 3: system letter; 4: frames that start with ">". */
  readonly generation: 2 | 3 | 4;
  /** False for files of generation 2 that hold another system. */
  readonly holdsGps: boolean;
}

/** Published versions whose GPS navigation record this reads. */
const VERSIONS: Readonly<Record<string, RinexLayout['generation']>> = {
  '2': 2,
  '2.00': 2,
  '2.01': 2,
  '2.10': 2,
  '2.11': 2,
  '3.00': 3,
  '3.01': 3,
  '3.02': 3,
  '3.03': 3,
  '3.04': 3,
  '3.05': 3,
  '4.00': 4,
  '4.01': 4,
  '4.02': 4,
};

const LABEL_COLUMN = 60;

/**
 * Reads the header line by line.
 * Source: RINEX 2.11, Tables A3 and A10; RINEX 3.05, Table A5; RINEX 4.00 keeps the first line (from memory).
 */
export class HeaderReader {
  readonly #file: string;
  #layout: RinexLayout | undefined;

  constructor(file: string) {
    this.#file = file;
  }

  /**
   * Takes the next line.
   *
   * @returns the layout once the header is complete, undefined before
   * @throws InputError with code rinex.not-navigation, rinex.version or rinex.header
   */
  push(line: string, number: number): RinexLayout | undefined {
    if (this.#layout === undefined) {
      this.#layout = firstLine(line, { file: this.#file, line: number });
      return undefined;
    }
    const label = line.slice(LABEL_COLUMN).trim();
    if (label === 'END OF HEADER') return this.#layout;
    if (!/^[A-Z]/.test(label) && line.trim() !== '') {
      throw rinexFault(
        'header',
        { file: this.#file, line: number, column: LABEL_COLUMN + 1 },
        'the header line has no label in columns 61 to 80',
        'The header runs until a line labelled END OF HEADER, and each of its lines has a label.',
      );
    }
    return undefined;
  }

  /** The finding for a file that ends within the header. */
  unfinished(lastLine: number): Error {
    return rinexFault(
      'header',
      { file: this.#file, line: lastLine },
      'the file ends before END OF HEADER',
      'Without its end the header cannot be told from the records.',
    );
  }
}

function firstLine(line: string, place: { file: string; line: number }): RinexLayout {
  if (line.slice(LABEL_COLUMN).trim() !== 'RINEX VERSION / TYPE') {
    throw rinexFault(
      'not-navigation',
      place,
      'the first line is not labelled RINEX VERSION / TYPE',
      'Every RINEX file starts with that line.',
    );
  }
  const version = line.slice(0, 20).trim(); // F9.2, then blanks; some writers set it further right
  const generation = Object.hasOwn(VERSIONS, version) ? VERSIONS[version] : undefined;
  if (generation === undefined) {
    throw rinexFault(
      'version',
      place,
      `version "${version}" is not known`,
      `The known versions are ${Object.keys(VERSIONS).sort().join(', ')}.`,
    );
  }
  const type = line.charAt(20);
  const types = generation === 2 ? 'NGH' : 'N';
  if (type === ' ' || !types.includes(type)) {
    throw rinexFault(
      'not-navigation',
      { ...place, column: 21 },
      `file type "${type}" is not navigation data`,
      `Navigation data of version ${version} has type ${[...types].join(', ')}.`,
    );
  }
  return { generation, holdsGps: type === 'N' };
}
