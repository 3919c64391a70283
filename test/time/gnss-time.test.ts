import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addSeconds,
  gnssTime,
  nearestTime,
  resolveWeek,
  secondsBetween,
  WEEK,
  wrapHalfWeek,
} from '../../src/time/gnss-time.ts';

const seconds = fc.double({ min: 0, max: WEEK, maxExcluded: true, noNaN: true });
const time = fc.record({ week: fc.integer({ min: 0, max: 5000 }), seconds });

describe('gnssTime', () => {
  it('carries seconds into weeks', () => {
    expect(gnssTime(2190, WEEK)).toEqual({ week: 2191, seconds: 0 });
    expect(gnssTime(2190, -1)).toEqual({ week: 2189, seconds: WEEK - 1 });
    expect(gnssTime(2190, 3 * WEEK + 5)).toEqual({ week: 2193, seconds: 5 });
  });

  it('never gives a second outside the week', () => {
    expect(gnssTime(1, -1e-20)).toEqual({ week: 1, seconds: 0 });
    fc.assert(
      fc.property(fc.double({ min: -1e8, max: 1e8, noNaN: true }), (s) => {
        const { seconds } = gnssTime(1000, s);
        return seconds >= 0 && seconds < WEEK;
      }),
    );
  });
});

describe('secondsBetween', () => {
  it('crosses the rollovers of the ten-bit week', () => {
    expect(secondsBetween({ week: 1023, seconds: WEEK - 1 }, { week: 1024, seconds: 1 })).toBe(2);
    expect(secondsBetween({ week: 2047, seconds: WEEK - 1 }, { week: 2048, seconds: 1 })).toBe(2);
  });

  it('undoes addSeconds for whole seconds, exactly', () => {
    const whole = fc.record({ week: fc.nat(5000), seconds: fc.nat(WEEK - 1) });
    fc.assert(
      fc.property(
        whole,
        fc.integer({ min: -1e9, max: 1e9 }),
        (t, s) => secondsBetween(t, addSeconds(t, s)) === s,
      ),
    );
  });
});

describe('wrapHalfWeek', () => {
  // IS-GPS-200, Table 20-IV, footnote on tk
  it('follows the rule of the standard', () => {
    expect(wrapHalfWeek(302400)).toBe(302400);
    expect(wrapHalfWeek(302401)).toBe(302401 - 604800);
    expect(wrapHalfWeek(-302400)).toBe(-302400);
    expect(wrapHalfWeek(-302401)).toBe(-302401 + 604800);
    expect(wrapHalfWeek(0 - 597600)).toBe(7200);
  });

  it('stays within half a week and changes by whole weeks', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), (s) => {
        const wrapped = wrapHalfWeek(s);
        return Math.abs(wrapped) <= WEEK / 2 && (s - wrapped) % WEEK === 0;
      }),
    );
  });
});

describe('resolveWeek', () => {
  it('finds the cycle nearest to the reference', () => {
    expect(resolveWeek(1023, { week: 1024, seconds: 0 })).toBe(1023);
    expect(resolveWeek(0, { week: 1023, seconds: 0 })).toBe(1024);
    expect(resolveWeek(0, { week: 2047, seconds: 0 })).toBe(2048);
    expect(resolveWeek(1023, { week: 2048, seconds: 0 })).toBe(2047);
    expect(resolveWeek(142, { week: 2100, seconds: 0 })).toBe(2190); // header of the CODE orbit of 2022-01-01
  });

  it('finds any week from its ten bits', () => {
    fc.assert(
      fc.property(fc.nat(8191), fc.integer({ min: -511, max: 511 }), (week, away) => {
        return resolveWeek(week % 1024, { week: week + away, seconds: 0 }) === week;
      }),
    );
  });

  it('takes another cycle', () => {
    expect(resolveWeek(1, { week: 8190, seconds: 0 }, 8192)).toBe(8193);
  });
});

describe('nearestTime', () => {
  it('goes to the neighbouring week where that is nearer', () => {
    expect(nearestTime(0, { week: 2190, seconds: 597600 })).toEqual({ week: 2191, seconds: 0 });
    expect(nearestTime(597600, { week: 2191, seconds: 0 })).toEqual({ week: 2190, seconds: 597600 });
    expect(nearestTime(7200, { week: 2190, seconds: 7184 })).toEqual({ week: 2190, seconds: 7200 });
  });

  it('keeps the second of the week as it is and stays within half a week', () => {
    fc.assert(
      fc.property(seconds, time, (s, reference) => {
        const found = nearestTime(s, reference);
        return found.seconds === s && Math.abs(secondsBetween(reference, found)) <= WEEK / 2;
      }),
    );
  });
});
