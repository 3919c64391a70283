import { describe, expect, test } from 'vitest';
import { Pairs, set } from '../../codegen/numbers/double-double.ts';
import {
  atan2,
  cos,
  HALF_PI,
  kepler,
  keplerOffset,
  sin,
  sinCos,
} from '../../codegen/numbers/double-double-functions.ts';
import { exact, Judge, type Judged, keplerTruth, PI, pairValue, relativeError, seeded, U } from './judge.ts';

const r = new Pairs(8);
const random = seeded(2);
const [A, B, E, SINE, COSINE, D] = [0, 1, 2, 3, 4, 5];

/** The error bound that the functions claim: 8 u^2. */
const CLAIM = 8 * U * U;
/** What it says was seen of sine, cosine and atan2, with a little room. */
const SEEN = 2.6 * U * U;

function setTo(register: number, value: Judged): void {
  const hi = value.toNumber();
  set(r, register, hi, value.minus(exact(hi)).toNumber());
}

test('the parts of pi/2 sum to pi/2 (60 digits: OEIS A000796)', () => {
  const pi = new Judge('3.14159265358979323846264338327950288419716939937510582097494459');
  const sum = HALF_PI.reduce((total, part) => total.plus(exact(part)), new Judge(0));
  expect(sum.times(2).minus(pi).abs().lessThan('1e-58')).toBe(true);
});

describe('sine and cosine', () => {
  /** The larger of the relative errors at the angle in register A. */
  function error(): number {
    sinCos(r, SINE, COSINE, A);
    const angle = new Judge(pairValue(r, A));
    return Math.max(
      relativeError(pairValue(r, SINE), angle.sin()),
      relativeError(pairValue(r, COSINE), angle.cos()),
    );
  }

  test.each([0.7, 10, 100, 1000])('random pairs up to %d rad', (reach) => {
    for (let sample = 0; sample < 150; sample++) {
      const hi = reach * (2 * random() - 1);
      set(r, A, hi, hi * U * (random() - 0.5));
      expect(error()).toBeLessThan(SEEN);
    }
  });

  test('float64 angles next to multiples of pi/2', () => {
    for (let k = -64; k <= 64; k++) {
      if (k === 0) continue;
      const near = PI.times(k).div(2).toNumber();
      for (const angle of [near, near + 1e-9]) {
        set(r, A, angle);
        expect(error()).toBeLessThan(SEEN);
      }
    }
  });

  test('pairs next to multiples of pi/2: a relative error also where the reduction cancels nearly all', () => {
    for (let k = 1; k <= 64; k++) {
      setTo(A, PI.times(k).div(2));
      const angle = pairValue(r, A);
      sinCos(r, SINE, COSINE, A);
      const small = k % 2 === 0 ? SINE : COSINE;
      const truth = PI.times(k).div(2).minus(angle).abs();
      expect(truth.lessThan('1e-30')).toBe(true);
      expect(relativeError(pairValue(r, small).abs(), truth)).toBeLessThan(1e-20);
    }
  });

  test('tiny angles, zero, and the joints of the table', () => {
    set(r, A, 0);
    sinCos(r, SINE, COSINE, A);
    expect([r.hi[SINE], r.lo[SINE], r.hi[COSINE], r.lo[COSINE]]).toEqual([0, 0, 1, 0]);
    for (const angle of [
      1e-300,
      -1e-200,
      1e-20,
      -1e-8,
      1 / 64,
      -1 / 64,
      0.0156249,
      1 / 64 + 1e-16,
      -3 / 64,
      25 / 32,
      0.785398163,
      0.7853982,
    ]) {
      set(r, A, angle);
      expect(error()).toBeLessThan(SEEN);
    }
  });

  test('sin 1 and cos 1 (OEIS A049469, A049470, from memory)', () => {
    set(r, A, 1);
    sinCos(r, SINE, COSINE, A);
    expect(pairValue(r, SINE).toFixed(30)).toBe('0.841470984807896506652502321630');
    expect(pairValue(r, COSINE).toFixed(30)).toBe('0.540302305868139717400936607443');
  });

  test('sin and cos are sinCos; targets may be the angle', () => {
    set(r, A, 2.5, 1e-17);
    sinCos(r, SINE, COSINE, A);
    sin(r, B, A);
    cos(r, D, A);
    expect([r.hi[B], r.lo[B]]).toEqual([r.hi[SINE], r.lo[SINE]]);
    expect([r.hi[D], r.lo[D]]).toEqual([r.hi[COSINE], r.lo[COSINE]]);
    cos(r, A, A);
    expect([r.hi[A], r.lo[A]]).toEqual([r.hi[COSINE], r.lo[COSINE]]);
  });
});

describe('atan2', () => {
  function truth(y: Judged, x: Judged): Judged {
    return Judge.atan2(y, x);
  }

  test('random points of all quadrants, slopes from 1e-20 to 1e20', () => {
    for (let sample = 0; sample < 120; sample++) {
      const y = (2 * random() - 1) * 10 ** (sample % 4 === 0 ? 20 * random() - 10 : 0);
      const x = (2 * random() - 1) * 10 ** (sample % 4 === 0 ? 20 * random() - 10 : 0);
      set(r, A, y, y * U * (random() - 0.5));
      set(r, B, x, x * U * (random() - 0.5));
      atan2(r, D, A, B);
      expect(relativeError(pairValue(r, D), truth(pairValue(r, A), pairValue(r, B)))).toBeLessThan(SEEN);
    }
  });

  test.each([
    [1, 0, 0.5],
    [-1, 0, -0.5],
    [0, 1, 0],
    [0, -1, 1],
    [-0, -1, -1],
    [1, 1, 0.25],
    [-3, -3, -0.75],
  ])('y %d, x %d: %d pi', (y, x, halfTurns) => {
    set(r, A, y);
    set(r, B, x);
    atan2(r, D, A, B);
    expect(pairValue(r, D).minus(PI.times(halfTurns)).abs().toNumber()).toBeLessThan(CLAIM * Math.PI);
  });

  test('the origin gives what Math.atan2 gives', () => {
    for (const y of [0, -0]) {
      for (const x of [0, -0]) {
        set(r, A, y);
        set(r, B, x);
        atan2(r, D, A, B);
        expect(r.hi[D]).toBe(Math.atan2(y, x));
      }
    }
  });
});

describe('Kepler', () => {
  /** Relative error of E at (M, e) over the condition of the equation. */
  function error(M: number, e: number): number {
    set(r, A, M, M * U * (random() - 0.5));
    set(r, E, e, e * U * (random() - 0.5));
    kepler(r, D, A, E);
    const truth = keplerTruth(pairValue(r, A), pairValue(r, E), r.hi[D]!);
    const condition = 1 / (1 - e * Math.cos(r.hi[D]!));
    return relativeError(pairValue(r, D), truth) / condition;
  }

  test.each([0, 0.001, 0.03, 0.3, 0.7, 0.95, 0.9999])('E for e = %d and M of any turn', (e) => {
    for (let sample = 0; sample < 20; sample++) {
      const M = (2 * random() - 1) * (sample % 4 === 0 ? 1000 : 7);
      expect(error(M, e)).toBeLessThan(CLAIM);
    }
  });

  test('e next to 1 and M next to 0, pi and 2 pi', () => {
    for (const e of [0.5, 0.99, 1 - 1e-6, 1 - 2 ** -52]) {
      for (const M of [1e-3, 1e-8, -1e-12, Math.PI, -Math.PI, 3.14, 6.283185307179586, 6.2831]) {
        expect(error(M, e)).toBeLessThan(CLAIM);
      }
    }
  });

  test('the offset is relatively exact, also for small e and M', () => {
    for (let sample = 0; sample < 50; sample++) {
      const M = sample % 2 === 0 ? 7 * random() : 10 ** (-12 * random());
      const e = 0.7 * 10 ** (-6 * random());
      set(r, A, M);
      set(r, E, e);
      sinCos(r, SINE, COSINE, A);
      keplerOffset(r, D, SINE, COSINE, E);
      // M may lie within rounding of 2 pi / 2: judge with the angle of the given sine and cosine
      const given = Judge.atan2(pairValue(r, SINE), pairValue(r, COSINE));
      const truth = keplerTruth(given, exact(e), given.toNumber() + r.hi[D]!).minus(given);
      expect(relativeError(pairValue(r, D), truth)).toBeLessThan(CLAIM / (1 - e));
    }
  });

  test('the offset solves its own equation off the unit circle', () => {
    for (const [s, c, e] of [
      [0.6, 0.8001, 0.01],
      [-0.8, 0.5999, 0.4],
      [1.0001, 0, 0.9],
      [0, -1.0002, 0.5],
      [0, 1, 0.2],
    ] as const) {
      set(r, SINE, s);
      set(r, COSINE, c);
      set(r, E, e);
      keplerOffset(r, D, SINE, COSINE, E);
      const offset = new Judge(pairValue(r, D));
      const right = offset
        .cos()
        .times(exact(s))
        .plus(offset.sin().times(exact(c)))
        .times(exact(e));
      expect(offset.minus(right).abs().toNumber()).toBeLessThan(CLAIM);
    }
  });

  test('worked examples (Meeus, Astronomical Algorithms, chapter 30; from memory)', () => {
    setTo(A, PI.times(5).div(180));
    set(r, E, 0.1);
    kepler(r, D, A, E);
    expect(pairValue(r, D).times(180).div(PI).toFixed(6)).toBe('5.554589');
    set(r, A, 0.2);
    set(r, E, 0.99);
    kepler(r, D, A, E);
    expect(r.hi[D]!.toFixed(9)).toBe('1.066997365');
  });

  test('e outside [0, 1) is refused', () => {
    set(r, A, 1);
    for (const e of [1, -0.1, Number.NaN]) {
      set(r, E, e);
      expect(() => kepler(r, D, A, E)).toThrow(RangeError);
    }
  });
});
