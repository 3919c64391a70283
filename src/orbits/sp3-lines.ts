import { InputError } from '../finding.ts';
import type { Position } from '../models/position.ts';
import { fromCalendar } from '../time/calendar.ts';
import type { GnssTime } from '../time/gnss-time.ts';

/** A line of a file. */
interface LinePlace {
  readonly file: string;
  readonly line: number;
}

const NUMBER = /^ *-?(?:\d+\.?\d*|\.\d+) *$/;
const EPOCH = /^\* {2}(\d{4}) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]{1,2}\d?\.\d+) *$/;

/** Six nines before the point mark a clock as bad or absent. */
const BAD_CLOCK = 999999;

const SECONDS_PER_MICROSECOND = 1e-6;

/** A fault of an SP3 file, with the reason and the remedy that all of them share. */
export function sp3Fault(rule: string, place: LinePlace, what: string): InputError {
  return new InputError({
    code: `sp3.${rule}`,
    place,
    what,
    why: 'The SP3 format has fixed lines and columns.',
    remedy: 'Mend the file at this place or fetch it again.',
  });
}

/** Version letter of the first line, a, c or d. */
export function readVersion(line: string, place: LinePlace): string {
  const match = /^#([a-z])[PV]\d{4}/.exec(line);
  if (match?.[1] === undefined) throw sp3Fault('header', place, 'the first line is not that of an SP3 file');
  if (!'acd'.includes(match[1]))
    throw sp3Fault('version', place, `version ${match[1]} is not known; a, c and d are`);
  return match[1];
}

/** Checks the time system of the first %c line. Version a has none and is in GPS time. */
export function readTimeSystem(line: string, version: string, place: LinePlace): void {
  const system = line.slice(9, 12);
  if (system === 'GPS' || version === 'a') return;
  throw sp3Fault('time-system', place, `the time system is "${system}"; only GPS is read`);
}

/** Time of an epoch line. */
export function readEpoch(line: string, place: LinePlace): GnssTime {
  const match = EPOCH.exec(line);
  if (match === null) throw sp3Fault('epoch', place, 'the line holds no epoch');
  const [year, month, day, hour, minute, second] = match.slice(1).map(Number) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const time = fromCalendar({ year, month, day, hour, minute, second });
  if (time === undefined) throw sp3Fault('epoch', place, 'no calendar has this epoch');
  return time;
}

/** Satellite of a P or V line; without a system letter it is GPS. */
export function satelliteOf(line: string, place: LinePlace): string {
  const match = /^([A-Z ])([ \d]\d)$/.exec(line.slice(1, 4));
  if (match?.[2] === undefined) throw sp3Fault('satellite', place, `"${line.slice(1, 4)}" is no satellite`);
  return `${match[1] === ' ' ? 'G' : match[1]}${match[2].replace(' ', '0')}`;
}

/**
 * The three components of a P or V line.
 *
 * @param factor from the file's unit to the SI unit
 * @returns undefined where all three are zero, which marks them as bad or absent
 */
export function readVector(line: string, factor: number, place: LinePlace): Position | undefined {
  const x = readNumber(line, 4, place);
  const y = readNumber(line, 18, place);
  const z = readNumber(line, 32, place);
  return x === 0 && y === 0 && z === 0 ? undefined : { x: x * factor, y: y * factor, z: z * factor };
}

/** Clock offset of a P line, s; undefined where bad or absent. */
export function readClock(line: string, place: LinePlace): number | undefined {
  if (line.slice(46, 60).trim() === '') return undefined;
  const microseconds = readNumber(line, 46, place);
  return Math.abs(microseconds) >= BAD_CLOCK ? undefined : microseconds * SECONDS_PER_MICROSECOND;
}

function readNumber(line: string, start: number, place: LinePlace): number {
  const text = line.slice(start, start + 14);
  const value = NUMBER.test(text) && text.length === 14 ? Number(text) : Number.NaN;
  if (Number.isFinite(value)) return value;
  throw new InputError({
    code: 'sp3.number',
    place: { ...place, column: start + 1 },
    what: `"${text.trim()}" is no number of 14 columns`,
    why: 'Positions, velocities and clocks stand in columns of fixed width.',
    remedy: 'Mend the file at this place or fetch it again.',
  });
}
