import { describe, expect, test } from 'vitest';
import { Pairs, set as setPair } from '../../codegen/numbers/double-double.ts';
import { kepler, keplerOffset, sinCos } from '../../codegen/numbers/double-double-functions.ts';
import * as interval from '../../codegen/numbers/interval.ts';
import { offsetGuess } from '../../codegen/numbers/kepler-guess.ts';
import { exact, keplerTruth, seeded } from './judge.ts';

const r = new interval.Intervals(4);
const pairs = new Pairs(6);
const random = seeded(8);
const between = (lo: number, hi: number): number => Math.min(hi, lo + (hi - lo) * random());

/** With pairs as judge, which are good to 1e-26 up to the last of these. */
const ECCENTRICITIES = [0, 1e-9, 0.01, 0.03, 0.3, 0.7, 0.95, 0.9999];

/** Solves M, e in pairs: E in register 2, E - M in register 3. */
function solve(M: number, e: number): void {
  setPair(pairs, 0, M);
  setPair(pairs, 1, e);
  kepler(pairs, 2, 0, 1);
  sinCos(pairs, 4, 5, 0);
  keplerOffset(pairs, 3, 4, 5, 1);
}

function holds(i: number, register: number): boolean {
  const hi = pairs.hi[register]!;
  const lo = pairs.lo[register]!;
  return r.lo[i]! - hi <= lo + 1e-26 && r.hi[i]! - hi >= lo - 1e-26;
}

/** A mean anomaly: anywhere to 98 rad, or next to a multiple of pi/2. */
function anomaly(): number {
  if (random() < 0.5) return between(-98, 98);
  return (Math.round(between(-60, 60)) * Math.PI) / 2 + (random() - 0.5) * 2 ** -Math.floor(50 * random());
}

test('E and the offset hold the solutions of points: 3,000 boxes', () => {
  for (let i = 0; i < 3000; i++) {
    const M = anomaly();
    const width = [0, 2 ** -Math.floor(50 * random()), random(), 4 * random()][i % 4]!;
    const e = ECCENTRICITIES[i % ECCENTRICITIES.length]!;
    const eHigh = i % 3 === 0 ? e : between(e, Math.min(0.9999, e + 0.1));
    interval.set(r, 0, M, M + width);
    interval.set(r, 1, e, eHigh);
    interval.keplerE(r, 2, 0, 1);
    interval.keplerOffset(r, 3, 0, 1);
    for (const m of [r.lo[0]!, r.hi[0]!, between(r.lo[0]!, r.hi[0]!)]) {
      for (const ecc of [e, eHigh, between(e, eHigh)]) {
        solve(m, ecc);
        if (!holds(2, 2)) throw new Error(`E for M [${M}, +${width}], e [${e}, ${eHigh}] at ${m}, ${ecc}`);
        if (!holds(3, 3))
          throw new Error(`E - M for M [${M}, +${width}], e [${e}, ${eHigh}] at ${m}, ${ecc}`);
      }
    }
  }
});

test('points against decimals', () => {
  for (let i = 0; i < 60; i++) {
    const M = anomaly();
    const e = ECCENTRICITIES[i % ECCENTRICITIES.length]!;
    interval.set(r, 0, M, M);
    interval.set(r, 1, e, e);
    interval.keplerE(r, 2, 0, 1);
    interval.keplerOffset(r, 3, 0, 1);
    const truth = keplerTruth(exact(M), exact(e), (r.lo[2]! + r.hi[2]!) / 2);
    expect(exact(r.lo[2]!).lessThanOrEqualTo(truth)).toBe(true);
    expect(exact(r.hi[2]!).greaterThanOrEqualTo(truth)).toBe(true);
    expect(exact(r.lo[3]!).lessThanOrEqualTo(truth.minus(exact(M)))).toBe(true);
    expect(exact(r.hi[3]!).greaterThanOrEqualTo(truth.minus(exact(M)))).toBe(true);
  }
});

describe('tightness', () => {
  /** Width of E for the point (M, e), and of the offset, in units of 2^-53 max(|E|, 1) / (1 - e cos E). */
  function widths(M: number, e: number): [E: number, offset: number] {
    interval.set(r, 0, M, M);
    interval.set(r, 1, e, e);
    interval.keplerE(r, 2, 0, 1);
    interval.keplerOffset(r, 3, 0, 1);
    const E = r.lo[2]!;
    const unit = (2 ** -53 * Math.max(1, Math.abs(E))) / (1 - e * Math.cos(E));
    return [(r.hi[2]! - r.lo[2]!) / unit, (r.hi[3]! - r.lo[3]!) / unit];
  }

  test.each(ECCENTRICITIES)('a point is a few units wide, e = %d', (e) => {
    for (let i = 0; i < 1000; i++) {
      const [E, offset] = widths(i % 2 === 0 ? between(-7, 7) : anomaly(), e);
      expect(E).toBeLessThan(25);
      expect(offset).toBeLessThan(25);
    }
  });

  test('an interval of M loses nothing but rounding, in E and in the offset', () => {
    for (let i = 0; i < 1000; i++) {
      const M = between(-7, 7);
      const width = 0.5 * random();
      const e = [0.01, 0.3, 0.9][i % 3]!;
      interval.set(r, 0, M, M + width);
      interval.set(r, 1, e, e);
      interval.keplerE(r, 2, 0, 1);
      interval.keplerOffset(r, 3, 0, 1);
      solve(M, e);
      const [E1, D1] = [pairs.hi[2]!, pairs.hi[3]!];
      solve(M + width, e);
      const [E2, D2] = [pairs.hi[2]!, pairs.hi[3]!];
      expect(Math.abs(r.lo[2]! - E1)).toBeLessThan(1e-13);
      expect(Math.abs(r.hi[2]! - E2)).toBeLessThan(1e-13);
      // the offset's ends: those of the interval, or +-e where E passes an odd multiple of pi/2
      const crest = Math.floor(E2 / (2 * Math.PI) - 0.25) >= E1 / (2 * Math.PI) - 0.25;
      const trough = Math.floor(E2 / (2 * Math.PI) + 0.25) >= E1 / (2 * Math.PI) + 0.25;
      expect(Math.abs(r.hi[3]! - (crest ? e : Math.max(D1, D2)))).toBeLessThan(1e-13);
      expect(Math.abs(r.lo[3]! - (trough ? -e : Math.min(D1, D2)))).toBeLessThan(1e-13);
    }
  });

  test('an interval of e: the ends belong to the ends of e', () => {
    interval.set(r, 0, 1, 1.5);
    interval.set(r, 1, 0.1, 0.2);
    interval.keplerE(r, 2, 0, 1);
    solve(1, 0.1);
    expect(r.lo[2]).toBeCloseTo(pairs.hi[2]!, 14);
    solve(1.5, 0.2);
    expect(r.hi[2]).toBeCloseTo(pairs.hi[2]!, 14);
    interval.set(r, 0, -1.5, -1);
    interval.keplerE(r, 2, 0, 1);
    expect(r.lo[2]).toBeCloseTo(-pairs.hi[2]!, 14);
  });
});

test('beyond the proven sine E lies within e of M; without |e| < 1 nowhere in particular', () => {
  interval.set(r, 1, 0.1, 0.2);
  for (const M of [99.5, 1e3, -1e9]) {
    interval.set(r, 0, M, M);
    interval.keplerE(r, 2, 0, 1);
    expect(r.lo[2]! - (M - 0.2)).toBeCloseTo(0, 5);
    expect(r.hi[2]! - (M + 0.2)).toBeCloseTo(0, 5);
    interval.keplerOffset(r, 2, 0, 1);
    expect(r.lo[2]).toBeGreaterThanOrEqual(-0.2000001);
    expect(r.hi[2]).toBeLessThanOrEqual(0.2000001);
  }
  interval.set(r, 0, 1, 1);
  for (const [lo, hi] of [
    [0.5, 1],
    [-1, 0],
    [0.5, Infinity],
  ] as const) {
    for (const operate of [interval.keplerE, interval.keplerOffset]) {
      interval.set(r, 1, lo, hi);
      operate(r, 2, 0, 1);
      expect([r.lo[2], r.hi[2]]).toEqual([-Infinity, Infinity]);
    }
  }
});

test('e that reaches a little or far below zero, as rounding outward makes it', () => {
  for (const [lo, hi] of [
    [-(2 ** -1074), 0.01],
    [-0.3, 0.2],
    [-0.9, -0.8],
    [-0.9, 0.1],
  ] as const) {
    for (let i = 0; i < 2000; i++) {
      // any E and e make their own M, which float64 gives to 1e-14
      const E = between(-90, 90);
      const e = i % 2 === 0 ? between(lo, hi) : lo;
      const M = E - e * Math.sin(E);
      interval.set(r, 0, M - 1e-13, M + 1e-13 + (i % 4 === 0 ? random() : 0));
      interval.set(r, 1, lo, hi);
      interval.keplerE(r, 2, 0, 1);
      interval.keplerOffset(r, 3, 0, 1);
      const held = r.lo[2]! <= E && r.hi[2]! >= E && r.lo[3]! <= E - M + 1e-12 && r.hi[3]! >= E - M - 1e-12;
      if (!held) throw new Error(`E ${E}, e ${e}: [${r.lo[2]}, ${r.hi[2]}], [${r.lo[3]}, ${r.hi[3]}]`);
      if (r.hi[2]! - r.lo[2]! > 4) throw new Error(`wide: [${r.lo[2]}, ${r.hi[2]}]`);
    }
  }
});

test('the target may be an operand', () => {
  interval.set(r, 0, 1, 1.5);
  interval.set(r, 1, 0.1, 0.2);
  interval.keplerOffset(r, 2, 0, 1);
  const expected = [r.lo[2], r.hi[2]];
  interval.keplerOffset(r, 1, 0, 1);
  expect([r.lo[1], r.hi[1]]).toEqual(expected);
});

test('the guess is a float64 solution, also for e next to 1 and M next to 0', () => {
  for (let i = 0; i < 10_000; i++) {
    const e = i % 2 === 0 ? random() : 1 - 2 ** -Math.floor(1 + 52 * random());
    const M = between(-Math.PI, Math.PI) * 2 ** -Math.floor(40 * random());
    const D = offsetGuess(Math.sin(M), Math.cos(M), e);
    expect(Math.abs(D - e * Math.sin(M + D))).toBeLessThan(1e-15); // M + D is itself rounded by up to 4.4e-16
  }
});
