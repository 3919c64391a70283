import { afterEach, expect, test, vi } from 'vitest';
import * as interval from '../../codegen/numbers/interval.ts';
import { exact, Judge, type Judged, keplerTruth, seeded } from './judge.ts';

/** How wrong the float64 guesses of this file are: relative errors up to this. */
const wrong = vi.hoisted(() => ({ by: 0, random: Math.random }));

vi.mock(import('../../codegen/numbers/kepler-guess.ts'), async (original) => {
  const { offsetGuess } = await original();
  return { offsetGuess: (s, c, e) => offsetGuess(s, c, e) * (1 + wrong.by * (2 * wrong.random() - 1)) };
});

const r = new interval.Intervals(3);
const random = seeded(9);
wrong.random = seeded(10);
const ERRORS = [1e-15, 1e-14, 1e-12, 1e-6, 1e-2, 0.5];

/** A decimal as the sum of two float64 numbers, 32 digits. */
type Pair = readonly [hi: number, lo: number];

function pairOf(value: Judged): Pair {
  const hi = value.toNumber();
  return [hi, value.minus(exact(hi)).toNumber()];
}

/** Register 2 holds all from `least` to `most`. */
function holds(least: Pair, most: Pair): boolean {
  return r.lo[2]! - least[0] <= least[1] && r.hi[2]! - most[0] >= most[1];
}

afterEach(() => {
  vi.restoreAllMocks();
});

test.each(ERRORS)(
  'atan2 holds the angle whatever the engine answers: error %d, sometimes the other sign',
  (size) => {
    const honest = Math.atan2;
    vi.spyOn(Math, 'atan2').mockImplementation((y, x) => {
      const sign = wrong.random() < 0.05 ? -1 : 1;
      return sign * honest(y, x) * (1 + size * (2 * wrong.random() - 1));
    });
    for (let i = 0; i < 40; i++) {
      const y = (random() - 0.5) * (i % 3 === 0 ? 1e-6 : 1);
      const x = (random() - 0.5) * (i % 3 === 1 ? 1e-6 : 1);
      const truth = pairOf(Judge.atan2(exact(y), exact(x)));
      for (let again = 0; again < 50; again++) {
        interval.set(r, 0, y, y);
        interval.set(r, 1, x, x);
        interval.atan2(r, 2, 0, 1);
        if (!holds(truth, truth)) {
          throw new Error(`${y}, ${x}: [${r.lo[2]}, ${r.hi[2]}]`);
        }
      }
    }
    expect(Math.atan2).toHaveBeenCalled();
  },
);

test.each(ERRORS)('keplerE and keplerOffset hold the solution whatever the guess: error %d', (size) => {
  for (let i = 0; i < 24; i++) {
    const M = 14 * (random() - 0.5);
    const e = [0.03, 0.5, 0.95][i % 3]!;
    wrong.by = 0;
    interval.set(r, 0, M, M);
    interval.set(r, 1, e, e);
    interval.keplerE(r, 2, 0, 1);
    const start = r.lo[2]!;
    const solutions = [0.9 * e, e].map((ecc) => keplerTruth(exact(M), exact(ecc), start));
    const [least, most] = solutions[0]!.lessThan(solutions[1]!) ? solutions : solutions.toReversed();
    const [E1, E2] = [pairOf(least!), pairOf(most!)];
    const [D1, D2] = [pairOf(least!.minus(exact(M))), pairOf(most!.minus(exact(M)))];
    wrong.by = size;
    interval.set(r, 1, 0.9 * e, e);
    for (let again = 0; again < 50; again++) {
      interval.keplerE(r, 2, 0, 1);
      if (!holds(E1, E2)) {
        throw new Error(`E for M ${M}, e ${e}: [${r.lo[2]}, ${r.hi[2]}]`);
      }
      interval.keplerOffset(r, 2, 0, 1);
      if (!holds(D1, D2)) {
        throw new Error(`E - M for M ${M}, e ${e}: [${r.lo[2]}, ${r.hi[2]}]`);
      }
    }
  }
});
