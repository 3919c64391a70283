import type { Entry, NodeFrame, SineErrors, Tape } from '../../../codegen/bound/tape.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import type { Analysis } from '../faulty.ts';
import { demand, Shares } from './demand.ts';

function normOf(
  { Forward, Backward, ErrorVector }: Analysis,
  tape: Tape,
  names: readonly string[],
  lo: readonly number[],
  hi: readonly number[],
): number {
  const forward = new Forward(tape, names, []);
  const backward = new Backward(forward);
  const vector = new ErrorVector(forward, backward);
  forward.run(Float64Array.from(lo), Float64Array.from(hi));
  backward.run();
  vector.collect();
  return vector.norm();
}

function direction(random: Random): readonly [number, number, number] {
  const v = [random.normal(), random.normal(), random.normal()] as const;
  return [v[0] / Math.hypot(...v), v[1] / Math.hypot(...v), v[2] / Math.hypot(...v)];
}

/** The largest value over directions: of single vectors, and of sums of some. */
export function largestDirection({ sphereMaximum }: Analysis): void {
  const random = new Random(91);
  for (let round = 0; round < 300; round++) {
    const v = direction(random);
    const one = sphereMaximum((w) => Math.abs(w[0] * v[0] + w[1] * v[1] + w[2] * v[2]));
    demand(one.bound >= 1 && one.bound <= 1.004, () => `the length 1 of a vector is bounded by ${one.bound}`);
    const vectors = Array.from({ length: 4 }, () => direction(random));
    const sum = (w: readonly number[]) =>
      vectors.reduce((total, u) => total + Math.abs(w[0]! * u[0] + w[1]! * u[1] + w[2]! * u[2]), 0);
    // the largest sum belongs to the signed sum of the vectors that is longest
    const longest = Math.max(
      ...Array.from({ length: 8 }, (_, signs) => {
        const side = (k: number) => (k > 0 && ((signs >> (k - 1)) & 1) === 1 ? -1 : 1);
        return Math.hypot(...[0, 1, 2].map((i) => vectors.reduce((t, u, k) => t + side(k) * u[i]!, 0)));
      }),
    );
    const { bound } = sphereMaximum(sum);
    demand(bound >= longest * (1 - 1e-12), () => `the length ${longest} is bounded by ${bound}`);
    demand(bound <= longest * 1.004, () => `the length ${longest} is bounded by no less than ${bound}`);
  }
}

const line = { line: -1, sinLine: -1 } as const;
const X: Entry = { kind: 'input', name: 'x', line: -1 };
const Y: Entry = { kind: 'input', name: 'y', line: -1 };

/** Entries that one line computes err together: their adjoints are added with their signs. */
export function sharedLines(analysis: Analysis): void {
  const square = (format: 'f32'): Entry => ({ kind: 'mul', args: [0, 0], format, line: 5 });
  for (const kind of ['add', 'sub'] as const) {
    const combined: Entry = { kind, args: [1, 2], format: 'exact', line: -1 };
    const tape: Tape = {
      entries: [X, square('f32'), square('f32'), combined],
      outputs: [3],
      node: null,
      orbit: null,
    };
    const norm = normOf(analysis, tape, ['x'], [1.3], [1.3]);
    const half = 2 ** -24;
    const error = kind === 'add' ? 2 * half : 0;
    demand(
      norm >= error && norm <= error + half * 1e-6,
      () => `the ${kind} of one line's value and itself is off by ${error}, the bound is ${norm}`,
    );
  }
}

/** Errors of the cosine and sine of a turn at known and at unknown angles, in one output and in two. */
export function errorsOfTurns(analysis: Analysis): void {
  const random = new Random(92);
  for (const [cos, sin] of [
    [1e-6, 0],
    [0, 1e-6],
    [1e-6, 2e-6],
  ] as const) {
    const length = Math.hypot(cos, sin);
    const errors: SineErrors = { periodic: true, cos: () => cos, sin: () => sin, both: () => length };
    for (const two of [false, true]) {
      const entries: Entry[] = [
        X,
        Y,
        { kind: 'turn', angle: 0, errors, ...line },
        { kind: 'cosine', turn: 2, line: -1 },
        { kind: 'sine', turn: 2, line: -1 },
        { kind: 'mul', args: [1, 4], format: 'exact', line: -1 },
        { kind: 'add', args: [3, 5], format: 'exact', line: -1 },
      ];
      const tape: Tape = { entries, outputs: two ? [3, 5, 6] : [6], node: null, orbit: null };
      for (let round = 0; round < 30; round++) {
        const [x, y, width] = [6 * random.next() - 3, 4 * random.next() - 2, [0, 0.05, 7][round % 3]!];
        const norm = normOf(analysis, tape, ['x', 'y'], [x, y], [x + width, y]);
        // the output (c, y s, c + y s) or c + y s is linear in what the cosine and sine err by
        const both = (side: 1 | -1) =>
          two ? Math.hypot(cos, y * sin, cos + side * y * sin) : Math.abs(cos + side * y * sin);
        const worst = Math.max(both(1), both(-1));
        demand(norm >= worst * (1 - 1e-9), () => `a turn's error ${worst} at y = ${y} is bounded by ${norm}`);
        const most = width === 0 ? 1.01 : width < 1 ? 1.3 : 4;
        demand(
          norm <= worst * most + 4 * length * width,
          () => `a turn's error ${worst} is bounded by ${norm}`,
        );
      }
    }
  }
}

/** The rotation of two numbers to the outputs rounds: two products and a sum each, at the worst angle. */
export function rotations(analysis: Analysis): void {
  const random = new Random(93);
  const round = Math.fround;
  for (const [x, y] of [
    [1.9, 0.01],
    [1.3, 1.3],
    [-0.7, 1.95],
    [0.6, -0.55],
  ] as const) {
    const spans = [
      [x, x * (1 + 1e-3 * Math.sign(x))],
      [y, y * 1.001],
    ].map(([a, b]) => [Math.min(a!, b!), Math.max(a!, b!)]) as [number, number][];
    const [first, second] = spans as [[number, number], [number, number]];
    const own = analysis.rotationRounding(
      { lo: first[0], hi: first[1] },
      { lo: second[0], hi: second[1] },
      1e-7,
      'f32',
    );
    const node: NodeFrame = { X: 0, Y: 1, turn: 3, format: 'f32' };
    const still: Tape = {
      entries: [
        X,
        Y,
        { kind: 'input', name: 'angle', line: -1 },
        { kind: 'turn', angle: 2, errors: null, ...line },
      ],
      outputs: [0, 1, 0],
      node,
      orbit: null,
    };
    const [lo, hi] = [0, 1].map((k) => [first[k]!, second[k]!, 0]) as [number[], number[]];
    const whole = normOf(analysis, still, ['x', 'y', 'angle'], lo, [hi[0]!, hi[1]!, 6]);
    const shares = new Shares();
    for (let n = 0; n < 60_000; n++) {
      const [p, q] = spans.map(([a, b]) => round(a + (b - a) * random.next())) as [number, number];
      const angle = 2 * Math.PI * random.next();
      const [c, s] = [round(Math.cos(angle)), round(Math.sin(angle))];
      const error = Math.hypot(
        round(round(p * c) - round(q * s)) - (p * c - q * s),
        round(round(p * s) + round(q * c)) - (p * s + q * c),
      );
      shares.add(error, own, () => `the rotation of ${p}, ${q} by ${angle}`);
      demand(
        error <= whole,
        () => `the rotation of ${p}, ${q} by ${angle} errs by ${error}, in all ${whole}`,
      );
    }
    shares.reach(0.72, `rotations of ${x}, ${y}`);
  }
}

/** The product of two turns rounds: every angle of the product, of every pair of factors. */
export function products({ ProductRounding }: Analysis): void {
  const random = new Random(94);
  const round = Math.fround;
  const table = new ProductRounding('f32');
  const [cos, sin, both] = [new Shares(), new Shares(), new Shares()];
  for (let n = 0; n < 200_000; n++) {
    const [a, b] = [7 * random.next() - 3.5, 7 * random.next() - 3.5];
    const [c, s, C, S] = [Math.cos(a), Math.sin(a), Math.cos(b), Math.sin(b)].map(round) as [
      number,
      number,
      number,
      number,
    ];
    const errors = [
      Math.abs(round(round(c * C) - round(s * S)) - (c * C - s * S)),
      Math.abs(round(round(s * C) + round(c * S)) - (s * C + c * S)),
    ] as const;
    const bounds = table.errors(a + b - 1e-7, a + b + 1e-7 + (n % 4 === 0 ? 0.2 : 0), 2 ** -22);
    cos.add(errors[0], bounds.cos, () => `the cosine of ${a} + ${b}`);
    sin.add(errors[1], bounds.sin, () => `the sine of ${a} + ${b}`);
    both.add(Math.hypot(...errors), bounds.both, () => `the turn ${a} + ${b}`);
  }
  for (const shares of [cos, sin, both]) shares.reach(0.9, 'products of turns');
}
