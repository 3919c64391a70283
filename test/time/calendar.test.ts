import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromCalendar, fromIso, toCalendar, toIso } from '../../src/time/calendar.ts';
import { secondsBetween } from '../../src/time/gnss-time.ts';

const midnight = (year: number, month: number, day: number) =>
  fromCalendar({ year, month, day, hour: 0, minute: 0, second: 0 });

describe('fromCalendar', () => {
  it.each([
    { date: [1980, 1, 6], week: 0, seconds: 0, source: 'IS-GPS-200, 3.3.4: the epoch of GPS time' },
    {
      date: [1999, 8, 22],
      week: 1024,
      seconds: 0,
      source: 'the first rollover of the ten-bit week (from memory)',
    },
    { date: [2019, 4, 7], week: 2048, seconds: 0, source: 'the second rollover (from memory)' },
    { date: [2015, 5, 5], week: 1843, seconds: 172800, source: 'header of GFZ orbit product gbm18432' },
    { date: [2015, 7, 19], week: 1854, seconds: 0, source: 'header of NGA orbit product nga_2015_200' },
    {
      date: [2022, 1, 1],
      week: 2190,
      seconds: 518400,
      source: 'header of CODE product COD0MGXFIN_20220010000',
    },
    { date: [2023, 1, 1], week: 2243, seconds: 0, source: 'header of GFZ product GFZ0MGXRAP_20230010000' },
  ] as const)('$source', ({ date: [year, month, day], week, seconds }) => {
    expect(midnight(year, month, day)).toEqual({ week, seconds });
  });

  it('agrees with Remondi 2004: 2001-07-23 02:00 is 93600 s of week 1124', () => {
    const calendar = { year: 2001, month: 7, day: 23, hour: 2, minute: 0, second: 0 };
    expect(fromCalendar(calendar)).toEqual({ week: 1124, seconds: 93600 });
  });

  it('knows leap days', () => {
    expect(midnight(2000, 2, 29)).toBeDefined();
    expect(midnight(2024, 2, 29)).toBeDefined();
    expect(midnight(2023, 2, 29)).toBeUndefined();
    expect(midnight(2100, 2, 29)).toBeUndefined();
    expect(secondsBetween(midnight(2024, 2, 28)!, midnight(2024, 3, 1)!)).toBe(2 * 86400);
    expect(secondsBetween(midnight(2023, 12, 31)!, midnight(2024, 1, 1)!)).toBe(86400);
  });

  it.each([
    { year: 2022, month: 0, day: 1 },
    { year: 2022, month: 13, day: 1 },
    { year: 2022, month: 4, day: 31 },
    { year: 2022, month: 1, day: 0 },
    { year: 2022.5, month: 1, day: 1 },
    { year: 2022, month: 1, day: 1, hour: 24 },
    { year: 2022, month: 1, day: 1, minute: 60 },
    { year: 2022, month: 1, day: 1, second: 60 },
    { year: 2022, month: 1, day: 1, second: -1 },
    { year: 2022, month: 1, day: 1, second: Number.NaN },
  ])('refuses $year-$month-$day $hour:$minute:$second', (date) => {
    expect(fromCalendar({ hour: 0, minute: 0, second: 0, ...date })).toBeUndefined();
  });

  it('is undone by toCalendar', () => {
    fc.assert(
      fc.property(
        fc.date({ min: new Date('1980-01-06'), max: new Date('2100-01-01'), noInvalidDate: true }),
        (date) => {
          const calendar = {
            year: date.getUTCFullYear(),
            month: date.getUTCMonth() + 1,
            day: date.getUTCDate(),
            hour: date.getUTCHours(),
            minute: date.getUTCMinutes(),
            second: date.getUTCSeconds(),
          };
          expect(toCalendar(fromCalendar(calendar)!)).toEqual(calendar);
        },
      ),
    );
  });
});

describe('toIso and fromIso', () => {
  it('writes a fraction only where needed', () => {
    expect(toIso({ week: 2190, seconds: 518400 })).toBe('2022-01-01T00:00:00');
    expect(toIso({ week: 2190, seconds: 518400.25 })).toBe('2022-01-01T00:00:00.25');
  });

  it('carries a rounded second into the next minute, day, week and year', () => {
    expect(toIso({ week: 2190, seconds: 604799.9999999999 })).toBe('2022-01-02T00:00:00');
    expect(toIso({ week: 2190, seconds: 518399.9999999999 })).toBe('2022-01-01T00:00:00');
  });

  it('reads dates with and without a time of day', () => {
    expect(fromIso('2022-01-01')).toEqual({ week: 2190, seconds: 518400 });
    expect(fromIso('2022-01-01T06:30')).toEqual({ week: 2190, seconds: 541800 });
    expect(fromIso('2022-01-01 06:30:00.5')).toEqual({ week: 2190, seconds: 541800.5 });
  });

  it.each([
    '',
    'now',
    '2022-1-1',
    '2022-01-01T06',
    '2022-01-01T06:00:00Z',
    '2022-01-01T06:00:00+01:00',
    '2022-02-30',
  ])('refuses "%s"', (text) => {
    expect(fromIso(text)).toBeUndefined();
  });

  it('undo each other to a nanosecond', () => {
    const time = fc.record({
      week: fc.nat(6000),
      seconds: fc.double({ min: 0, max: 604800, maxExcluded: true, noNaN: true }),
    });
    fc.assert(fc.property(time, (t) => Math.abs(secondsBetween(t, fromIso(toIso(t))!)) <= 1e-9));
  });
});
