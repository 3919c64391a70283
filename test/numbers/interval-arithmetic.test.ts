import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import * as interval from '../../codegen/numbers/interval.ts';
import { exact, type Judged } from './judge.ts';

const r = new interval.Intervals(8);
const LEAST = 2 ** -1074;
const RUNS = { numRuns: 400, seed: 5 };

/** Endpoints: everyday values, zeros, values next to them, and every float64 number. */
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
const endpoint = fc.oneof(
  fc.double({ noNaN: true, min: -10, max: 10 }),
  fc.integer({ min: -3, max: 3 }),
  fc.constantFrom(0, -0, LEAST, -LEAST, 2 ** -1022, 1, -1, 1 + 2 ** -52, Number.MAX_VALUE, -Number.MAX_VALUE),
  finite,
);
/** An interval and a number in it: an end, the middle or between. */
const holding = fc.tuple(endpoint, endpoint, fc.constantFrom(0, 1, 0.5, 0.1, 0.9)).map(([a, b, part]) => {
  const lo = Math.min(a, b);
  const hi = Math.max(a, b);
  const x = part === 0 ? lo : part === 1 ? hi : lo * (1 - part) + hi * part;
  return { lo, hi, x: Math.min(hi, Math.max(lo, x)) };
});
type Holding = { lo: number; hi: number; x: number };

function load(register: number, { lo, hi }: { lo: number; hi: number }): void {
  interval.set(r, register, lo, hi);
}

/** The exact value lies in register i. */
function holds(i: number, value: Judged): boolean {
  const { lo, hi } = { lo: r.lo[i]!, hi: r.hi[i]! };
  return (
    (lo === -Infinity || exact(lo).lessThanOrEqualTo(value)) &&
    (hi === Infinity || exact(hi).greaterThanOrEqualTo(value))
  );
}

function text(i: number): string {
  return `[${r.lo[i]}, ${r.hi[i]}]`;
}

type Binary = (r: interval.Intervals, d: number, a: number, b: number) => void;
type Unary = (r: interval.Intervals, d: number, a: number) => void;

/** Each operation with its truth in decimals; undefined where there is none. */
const BINARY: readonly [
  name: string,
  operate: Binary,
  truth: (x: Judged, y: Judged) => Judged | undefined,
][] = [
  ['add', interval.add, (x, y) => x.plus(y)],
  ['sub', interval.sub, (x, y) => x.minus(y)],
  ['mul', interval.mul, (x, y) => x.times(y)],
  ['div', interval.div, (x, y) => (y.isZero() ? undefined : x.div(y))],
];
const UNARY: readonly [name: string, operate: Unary, truth: (x: Judged) => Judged | undefined][] = [
  ['sqr', interval.sqr, (x) => x.times(x)],
  ['neg', interval.neg, (x) => x.negated()],
  ['abs', interval.abs, (x) => x.abs()],
  ['floor', interval.floor, (x) => x.floor()],
  ['sqrt', interval.sqrt, (x) => (x.isNegative() && !x.isZero() ? undefined : x.sqrt())],
];

describe('results hold the exact result of every point', () => {
  test.each(BINARY)('%s', (_, operate, truth) => {
    fc.assert(
      fc.property(holding, holding, fc.constantFrom(0, 1, 2), (a: Holding, b: Holding, d) => {
        load(0, a);
        load(1, b);
        operate(r, d, 0, 1); // the target may be an operand
        const value = truth(exact(a.x), exact(b.x));
        return value === undefined ? text(d) === '[-Infinity, Infinity]' : holds(d, value);
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  test.each(UNARY)('%s', (_, operate, truth) => {
    fc.assert(
      fc.property(holding, fc.constantFrom(0, 1), (a: Holding, d) => {
        load(0, a);
        operate(r, d, 0);
        const value = truth(exact(a.x));
        return value === undefined || holds(d, value);
      }),
      { ...RUNS, numRuns: 1500 },
    );
  });

  test('hull, intersect and select', () => {
    fc.assert(
      fc.property(holding, holding, holding, holding, (a, b, x, y) => {
        for (const [i, value] of [a, b, x, y].entries()) load(i, value);
        interval.hull(r, 4, 0, 1);
        expect(holds(4, exact(a.x)) && holds(4, exact(b.x))).toBe(true);
        const shared = interval.intersect(r, 4, 0, 1);
        expect(shared).toBe(a.lo <= b.hi && b.lo <= a.hi);
        if (a.x >= b.lo && a.x <= b.hi) expect(holds(4, exact(a.x))).toBe(true);
        interval.select(r, 4, 0, 1, 2, 3);
        expect(holds(4, exact(a.x < b.x ? x.x : y.x))).toBe(true);
      }),
      RUNS,
    );
  });
});

describe('results are tight', () => {
  /** At most `units` of 2^-52 of the value, and of the least number, wider than [lo, hi] at either end. */
  function within(i: number, lo: number, hi: number, units = 2): boolean {
    const slack = (x: number): number => units * (Math.abs(x) * 2 ** -52 + LEAST);
    return r.lo[i]! <= lo && r.lo[i]! >= lo - slack(lo) && r.hi[i]! >= hi && r.hi[i]! <= hi + slack(hi);
  }
  const tame = fc.double({ noNaN: true, min: -1e150, max: 1e150 });
  const span = fc.tuple(tame, tame).map(([a, b]) => ({ lo: Math.min(a, b), hi: Math.max(a, b) }));

  test('arithmetic, against the corners', () => {
    const float: readonly [operate: Binary, corner: (x: number, y: number) => number][] = [
      [interval.add, (x, y) => x + y],
      [interval.sub, (x, y) => x - y],
      [interval.mul, (x, y) => x * y],
      [interval.div, (x, y) => x / y],
    ];
    fc.assert(
      fc.property(span, span, fc.constantFrom(...float), (a, b, [operate, corner]) => {
        load(0, a);
        load(1, b);
        operate(r, 2, 0, 1);
        if (operate === interval.div && b.lo <= 0 && b.hi >= 0) return text(2) === '[-Infinity, Infinity]';
        const corners = [a.lo, a.hi].flatMap((x) => [b.lo, b.hi].map((y) => corner(x, y)));
        if (!corners.every(Number.isFinite)) return true;
        return within(2, Math.min(...corners), Math.max(...corners));
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  test('sqr, sqrt, abs, floor, neg', () => {
    fc.assert(
      fc.property(span, ({ lo, hi }) => {
        load(0, { lo, hi });
        const straddles = lo <= 0 && hi >= 0;
        interval.sqr(r, 1, 0);
        expect(within(1, straddles ? 0 : Math.min(lo * lo, hi * hi), Math.max(lo * lo, hi * hi))).toBe(true);
        expect(r.lo[1]).toBeGreaterThanOrEqual(0);
        interval.abs(r, 1, 0);
        expect([r.lo[1], r.hi[1]]).toEqual([
          straddles ? 0 : Math.min(Math.abs(lo), Math.abs(hi)),
          Math.max(Math.abs(lo), Math.abs(hi)),
        ]);
        interval.floor(r, 1, 0);
        expect([r.lo[1], r.hi[1]]).toEqual([Math.floor(lo), Math.floor(hi)]);
        interval.neg(r, 1, 0);
        expect([r.lo[1], r.hi[1]]).toEqual([-hi, -lo]);
        interval.sqrt(r, 1, 0);
        if (hi < 0) expect(text(1)).toBe('[-Infinity, Infinity]');
        else expect(within(1, Math.sqrt(Math.max(0, lo)), Math.sqrt(hi))).toBe(true);
      }),
      RUNS,
    );
  });

  test('select takes one branch where the comparison is decided', () => {
    load(0, { lo: 1, hi: 2 });
    load(1, { lo: 3, hi: 4 });
    load(2, { lo: 5, hi: 6 });
    load(3, { lo: -2, hi: -1 });
    interval.select(r, 4, 0, 1, 2, 3);
    expect(text(4)).toBe('[5, 6]');
    interval.select(r, 4, 1, 0, 2, 3);
    expect(text(4)).toBe('[-2, -1]');
    interval.select(r, 4, 0, 0, 2, 3);
    expect(text(4)).toBe('[-2, 6]');
    load(1, { lo: 2, hi: 4 }); // a = b = 2 takes the second branch, a = 1 the first
    interval.select(r, 4, 0, 1, 2, 3);
    expect(text(4)).toBe('[-2, 6]');
    interval.select(r, 4, 1, 0, 2, 3); // never a < b
    expect(text(4)).toBe('[-2, -1]');
  });
});

describe('down and up', () => {
  /** The float64 number before x, through its bits. */
  function previous(x: number): number {
    const floats = new Float64Array([x]);
    const bits = new BigInt64Array(floats.buffer);
    if (x === 0) return -LEAST;
    bits[0]! += x > 0 ? -1n : 1n;
    return floats[0]!;
  }

  test('go beyond the neighbour, by at most three', () => {
    const powers = Array.from({ length: 2098 }, (_, k) => 2 ** (k - 1074));
    const check = (x: number): boolean => {
      const moved = interval.down(x);
      const notFar = Math.abs(x) > 1e308 || moved >= previous(previous(previous(x)));
      return moved <= previous(x) && notFar && interval.up(x) === -interval.down(-x);
    };
    for (const power of powers) {
      for (const x of [power, previous(power), -power, -previous(power), -previous(-power)]) {
        if (!check(x)) throw new Error(`${x}`);
      }
    }
    fc.assert(fc.property(finite, check), { ...RUNS, numRuns: 5000 });
  });

  test('infinities', () => {
    expect(interval.down(-Infinity)).toBe(-Infinity);
    expect(interval.up(Infinity)).toBe(Infinity);
    expect(interval.down(-Number.MAX_VALUE)).toBe(-Infinity);
  });
});

describe('what has no bounds is the whole line, never NaN', () => {
  test.each([
    [Number.NaN, 1],
    [1, Number.NaN],
    [2, 1],
    [Infinity, Infinity],
    [-Infinity, -Infinity],
  ])('set [%d, %d]', (lo, hi) => {
    interval.set(r, 0, lo, hi);
    expect(text(0)).toBe('[-Infinity, Infinity]');
  });

  test('intervals with infinite ends, through every operation', () => {
    const any = fc.oneof(endpoint, fc.constantFrom(Infinity, -Infinity));
    const ends = fc.tuple(any, any).map(([a, b]) => ({ lo: Math.min(a, b), hi: Math.max(a, b) }));
    const unary = [...UNARY.map(([, operate]) => operate), interval.sin, interval.cos];
    const { hull, intersect, atan2, keplerE, keplerOffset } = interval;
    const binary = [...BINARY.map(([, operate]) => operate), hull, intersect, atan2, keplerE, keplerOffset];
    fc.assert(
      fc.property(ends, ends, (a, b) => {
        load(0, a);
        load(1, b);
        const bad = (): boolean => !(r.lo[2]! <= r.hi[2]!) || r.lo[2] === Infinity || r.hi[2] === -Infinity;
        for (const operate of unary) {
          operate(r, 2, 0);
          if (bad()) throw new Error(`${operate.name}: ${text(2)}`);
        }
        for (const operate of binary) {
          operate(r, 2, 0, 1);
          if (bad()) throw new Error(`${operate.name}: ${text(2)}`);
        }
      }),
      { ...RUNS, numRuns: 1500 },
    );
  });

  test('division by what holds zero, overflow, disjoint intersection', () => {
    load(0, { lo: 1, hi: 2 });
    for (const [lo, hi] of [
      [0, 1],
      [-1, 0],
      [-1, 1],
      [0, 0],
      [-0, 3],
    ] as const) {
      load(1, { lo, hi });
      interval.div(r, 2, 0, 1);
      expect(text(2)).toBe('[-Infinity, Infinity]');
    }
    load(1, { lo: 1e308, hi: 1.1e308 });
    interval.add(r, 2, 1, 1); // hi beyond the largest number, lo overflows inward
    expect(text(2)).toBe('[-Infinity, Infinity]');
    load(1, { lo: 3, hi: 4 });
    expect(interval.intersect(r, 2, 0, 1)).toBe(false);
    expect(text(2)).toBe('[-Infinity, Infinity]');
  });
});
