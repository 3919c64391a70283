import { type GnssTime, gnssTime } from './gnss-time.ts';

/** A date and time of day of the Gregorian calendar, on a scale without leap seconds. */
export interface CalendarTime {
  readonly year: number;
  /** 1 to 12. */
  readonly month: number;
  /** 1 to the length of the month. */
  readonly day: number;
  /** 0 to 23. */
  readonly hour: number;
  /** 0 to 59. */
  readonly minute: number;
  /** 0 <= second < 60. */
  readonly second: number;
}

const DAY_MS = 86_400_000;
const DAY = 86_400;

/** 1980-01-06, where GPS week 0 begins, in days since 1970-01-01. Source: IS-GPS-200, 3.3.4. */
const EPOCH_DAY = Date.UTC(1980, 0, 6) / DAY_MS;

const NANOSECONDS = 1e9;

/**
 * The instant of a calendar date.
 *
 * @returns the instant, or undefined where the calendar has no such date or the day no such time
 */
export function fromCalendar(calendar: CalendarTime): GnssTime | undefined {
  const { year, month, day, hour, minute, second } = calendar;
  if (!isWithin(year, 1, 9999) || !isWithin(month, 1, 12) || !isWithin(day, 1, daysInMonth(year, month))) {
    return undefined;
  }
  if (!isWithin(hour, 0, 23) || !isWithin(minute, 0, 59) || !(second >= 0 && second < 60)) return undefined;
  const days = midnight(year, month, day) / DAY_MS - EPOCH_DAY;
  const week = Math.floor(days / 7);
  return gnssTime(week, (days - 7 * week) * DAY + hour * 3600 + minute * 60 + second);
}

/**
 * The calendar date of an instant, its second rounded to a nanosecond.
 * For weeks of the years 1 to 9999.
 */
export function toCalendar(time: GnssTime): CalendarTime {
  const { week, seconds } = gnssTime(time.week, Math.round(time.seconds * NANOSECONDS) / NANOSECONDS);
  const whole = Math.floor(seconds);
  const day = Math.floor(whole / DAY);
  const date = new Date((EPOCH_DAY + week * 7 + day) * DAY_MS);
  return {
    year: date.getUTCFullYear(),
    month: date.getUTCMonth() + 1,
    day: date.getUTCDate(),
    hour: Math.floor((whole % DAY) / 3600),
    minute: Math.floor((whole % 3600) / 60),
    second: (whole % 60) + Math.round((seconds - whole) * NANOSECONDS) / NANOSECONDS,
  };
}

/**
 * The instant as ISO 8601 text without a zone, such as 2022-01-01T06:00:00, with a fraction only where
 * needed.
 */
export function toIso(time: GnssTime): string {
  const { year, month, day, hour, minute, second } = toCalendar(time);
  const [whole, fraction] = second.toFixed(9).split('.') as [string, string];
  const tail = fraction.replace(/0+$/, '');
  const date = `${String(year).padStart(4, '0')}-${two(month)}-${two(day)}`;
  return `${date}T${two(hour)}:${two(minute)}:${whole.padStart(2, '0')}${tail === '' ? '' : `.${tail}`}`;
}

const ISO = /^(\d{4})-(\d{2})-(\d{2})(?:[T ](\d{2}):(\d{2})(?::(\d{2}(?:\.\d+)?))?)?$/;

/**
 * Reads what `toIso` writes; the seconds or the whole time of day may be left out.
 *
 * @returns the instant, or undefined where the text has another form or names no date. A zone is another
 *   form: UTC differs from system time by leap seconds, which this does not know.
 */
export function fromIso(text: string): GnssTime | undefined {
  const match = ISO.exec(text);
  if (match === null) return undefined;
  const [year, month, day, hour, minute, second] = match.slice(1).map((part) => Number(part ?? 0));
  return fromCalendar({
    year: year ?? 0,
    month: month ?? 0,
    day: day ?? 0,
    hour: hour ?? 0,
    minute: minute ?? 0,
    second: second ?? 0,
  });
}

/**
 * Milliseconds since 1970 of a midnight; setUTCFullYear does not take years below 100 for 19xx as Date.UTC
 * does.
 */
function midnight(year: number, month: number, day: number): number {
  return new Date(0).setUTCFullYear(year, month - 1, day);
}

function daysInMonth(year: number, month: number): number {
  return new Date(midnight(year, month + 1, 0)).getUTCDate();
}

function isWithin(value: number, low: number, high: number): boolean {
  return Number.isInteger(value) && value >= low && value <= high;
}

function two(value: number): string {
  return String(value).padStart(2, '0');
}
