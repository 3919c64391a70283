import { describe, expect, test } from 'vitest';
import { Pairs, set as setPair } from '../../codegen/numbers/double-double.ts';
import { atan2 as pairAtan2, sinCos } from '../../codegen/numbers/double-double-functions.ts';
import * as interval from '../../codegen/numbers/interval.ts';
import { exact, Judge, PI, seeded } from './judge.ts';

const r = new interval.Intervals(4);
const pairs = new Pairs(4);
const random = seeded(6);
const between = (lo: number, hi: number): number => Math.min(hi, lo + (hi - lo) * random());

/** Points of [lo, hi]: the ends, the middle and two random ones. */
function* points(lo: number, hi: number): Generator<number> {
  yield lo;
  yield hi;
  yield lo + (hi - lo) / 2;
  yield between(lo, hi);
  yield between(lo, hi);
}

/** Register i holds the value of a pair, which is good to 1e-30 of itself. */
function holds(i: number, register: number): boolean {
  const hi = pairs.hi[register]!;
  const lo = pairs.lo[register]!;
  const slack = Math.abs(hi) * 1e-30;
  return r.lo[i]! - hi <= lo + slack && r.hi[i]! - hi >= lo - slack;
}

/** An interval whose ends lie anywhere, or near (down to the last bit) multiples of pi/4; narrow or wide. */
function trickyInterval(): [lo: number, hi: number] {
  const base = random() < 0.5 ? between(-95, 95) : (Math.round(between(-120, 120)) * Math.PI) / 4;
  const start = base + (random() < 0.5 ? (random() - 0.5) * 2 ** -Math.floor(50 * random()) : 0);
  const width = [0, 2 ** -Math.floor(50 * random()), random(), 7 * random()][Math.floor(4 * random())]!;
  return random() < 0.5 ? [start, start + width] : [start - width, start];
}

describe('sine and cosine', () => {
  test('hold the values of points: 40,000 intervals, many with ends next to extrema', () => {
    for (let i = 0; i < 40_000; i++) {
      const [lo, hi] = trickyInterval();
      interval.set(r, 0, lo, hi);
      interval.sin(r, 1, 0);
      interval.cos(r, 2, 0);
      for (const x of points(lo, hi)) {
        setPair(pairs, 0, x);
        sinCos(pairs, 1, 2, 0);
        if (!holds(1, 1) || !holds(2, 2)) throw new Error(`[${lo}, ${hi}] at ${x}`);
      }
    }
  });

  test('are tight: ends within 2^-50 of themselves from the true range, in decimals', () => {
    for (let i = 0; i < 200; i++) {
      const [lo, hi] = trickyInterval();
      interval.set(r, 0, lo, hi);
      interval.sin(r, 1, 0);
      interval.cos(r, 2, 0);
      for (const [register, crest] of [
        [1, 0.25],
        [2, 0],
      ] as const) {
        // extrema in decimals: crest + n/2 turns
        const first = exact(lo).div(PI.times(2)).minus(crest).times(2).ceil();
        const last = exact(hi).div(PI.times(2)).minus(crest).times(2).floor();
        const value = (x: number): number => {
          const angle = new Judge(exact(x));
          return (register === 1 ? angle.sin() : angle.cos()).toNumber();
        };
        const ends = [value(lo), value(hi)];
        const extrema = last.minus(first).toNumber();
        const even = first.modulo(2).isZero();
        if (extrema >= 0) ends.push(even ? 1 : -1);
        if (extrema >= 1) ends.push(even ? -1 : 1);
        const [least, most] = [Math.min(...ends), Math.max(...ends)];
        expect(r.lo[register]).toBeGreaterThanOrEqual(least - Math.abs(least) * 2 ** -50);
        expect(r.hi[register]).toBeLessThanOrEqual(most + Math.abs(most) * 2 ** -50);
        expect(r.lo[register]).toBeGreaterThanOrEqual(-1);
        expect(r.hi[register]).toBeLessThanOrEqual(1);
      }
    }
  });

  test('are [-1, 1] over a turn and beyond 100 rad; an end may be the angle', () => {
    for (const [lo, hi] of [
      [0, 6.3],
      [-1, 101],
      [-1e6, -1e6],
      [-Infinity, 0],
      [-Infinity, Infinity],
    ] as const) {
      for (const operate of [interval.sin, interval.cos]) {
        interval.set(r, 0, lo, hi);
        operate(r, 0, 0);
        expect([r.lo[0], r.hi[0]]).toEqual([-1, 1]);
      }
    }
    interval.set(r, 0, 100, 100);
    interval.sin(r, 0, 0);
    expect(r.hi[0]! - r.lo[0]!).toBeLessThan(1e-15);
  });
});

describe('atan2', () => {
  /** A coordinate interval: either sign, touching zero, tiny or huge. */
  function side(): [lo: number, hi: number] {
    const scale = random() < 0.2 ? 10 ** between(-100, 100) : 1;
    const a = scale * (random() - 0.5);
    const pick = Math.floor(5 * random());
    if (pick === 0) return [a, a];
    if (pick === 1) return a < 0 ? [a, 0] : [0, a];
    const b = pick === 2 ? a * (1 + random() * 1e-12) : scale * (random() - 0.5);
    return [Math.min(a, b), Math.max(a, b)];
  }

  test('holds the angles of points: 20,000 boxes', () => {
    for (let i = 0; i < 20_000; i++) {
      const [yl, yh] = side();
      const [xl, xh] = side();
      interval.set(r, 0, yl, yh);
      interval.set(r, 1, xl, xh);
      interval.atan2(r, 2, 0, 1);
      for (const y of points(yl, yh)) {
        for (const x of [xl, xh, between(xl, xh)]) {
          if (x === 0 && y === 0) continue;
          setPair(pairs, 0, y + 0); // zero has no sign
          setPair(pairs, 1, x);
          pairAtan2(pairs, 2, 0, 1);
          if (!holds(2, 2))
            throw new Error(`[${yl}, ${yh}] [${xl}, ${xh}] at ${y}, ${x}: ${r.lo[2]}, ${r.hi[2]}`);
        }
      }
    }
  });

  test('is tight: ends within 2^-48 of themselves from the angles of corners', () => {
    for (let i = 0; i < 20_000; i++) {
      const [yl, yh] = side();
      const [xl, xh] = side();
      const aroundOrigin = yl <= 0 && yh >= 0 && xl <= 0 && xh >= 0;
      const acrossCut = yl < 0 && yh >= 0 && xl < 0;
      interval.set(r, 0, yl, yh);
      interval.set(r, 1, xl, xh);
      interval.atan2(r, 2, 0, 1);
      if (aroundOrigin || acrossCut) {
        if (r.lo[2] !== -interval.PI_UP || r.hi[2] !== interval.PI_UP)
          throw new Error(`[${yl}, ${yh}] [${xl}, ${xh}]`);
        continue;
      }
      const corners = [yl, yh].flatMap((y) => [xl, xh].map((x) => Math.atan2(y + 0, x)));
      const [least, most] = [Math.min(...corners), Math.max(...corners)];
      const loose =
        r.lo[2]! < least - Math.abs(least) * 2 ** -48 || r.hi[2]! > most + Math.abs(most) * 2 ** -48;
      if (loose) throw new Error(`[${yl}, ${yh}] [${xl}, ${xh}]: ${r.lo[2]}, ${r.hi[2]}`);
    }
  });

  test('points against decimals', () => {
    for (let i = 0; i < 80; i++) {
      const y = (random() - 0.5) * 10 ** between(-5, 5);
      const x = random() - 0.5;
      interval.set(r, 0, y, y);
      interval.set(r, 1, x, x);
      interval.atan2(r, 2, 0, 1);
      const truth = Judge.atan2(exact(y), exact(x));
      expect(exact(r.lo[2]!).lessThanOrEqualTo(truth)).toBe(true);
      expect(exact(r.hi[2]!).greaterThanOrEqualTo(truth)).toBe(true);
    }
  });

  test('axes, the cut, and lengths out of range', () => {
    const angle = (yl: number, yh: number, xl: number, xh: number): [number, number] => {
      interval.set(r, 0, yl, yh);
      interval.set(r, 1, xl, xh);
      interval.atan2(r, 1, 0, 1);
      return [r.lo[1]!, r.hi[1]!];
    };
    expect(angle(0, 0, 1, 2)).toEqual([0, expect.closeTo(0, 300)]);
    const [lo, hi] = angle(0, 0, -2, -1);
    expect(lo).toBeLessThan(Math.PI);
    expect(lo).toBeGreaterThan(Math.PI - 4e-15);
    expect(hi).toBe(interval.PI_UP);
    expect(angle(-0, 1, -2, -1)[1]).toBe(interval.PI_UP);
    expect(angle(-1e-300, 0, -2, -1)).toEqual([-interval.PI_UP, interval.PI_UP]);
    expect(angle(1, 1, 1e200, 1e200)).toEqual([0, interval.PI_UP]);
    expect(angle(-1e-200, -1e-200, 0, 0)[1]).toBeLessThanOrEqual(0);
    const [half] = angle(1, 2, 1, Infinity);
    expect(half).toBe(0);
  });

  test('PI_UP is the float64 number above pi', () => {
    expect(exact(interval.PI_UP).greaterThan(PI)).toBe(true);
    expect(exact(Math.PI).lessThan(PI)).toBe(true);
    expect(interval.PI_UP - Math.PI).toBe(2 ** -51);
  });
});
