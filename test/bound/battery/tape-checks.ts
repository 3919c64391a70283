import type { Backward } from '../../../codegen/bound/backward.ts';
import type { Entry, NodeFrame, OrbitFrame, Tape } from '../../../codegen/bound/tape.ts';
import * as pairs from '../../../codegen/numbers/double-double.ts';
import { keplerOffset } from '../../../codegen/numbers/double-double-functions.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import type { Analysis } from '../faulty.ts';
import { demand } from './demand.ts';

type Bare = Entry extends infer Kind ? (Kind extends Entry ? Omit<Kind, 'line' | 'sinLine'> : never) : never;

/** A tape of hand-made entries without lines. */
function tapeOf(
  entries: readonly Bare[],
  outputs: readonly number[],
  node: NodeFrame | null = null,
  orbit: OrbitFrame | null = null,
): Tape {
  return {
    entries: entries.map((entry) => ({ line: -1, sinLine: -1, ...entry }) as Entry),
    outputs,
    node,
    orbit,
  };
}

const input = (name: string): Bare => ({ kind: 'input', name });
const exact = (
  kind: 'add' | 'sub' | 'mul' | 'div' | 'sqrt' | 'neg' | 'abs' | 'select',
  ...args: number[]
): Bare => ({
  kind,
  args,
  format: 'exact',
});
const turn = (angle: number): Bare => ({ kind: 'turn', angle, errors: null });

/** Relative errors of a turn: along the radius and along the circle. */
type Errors = readonly [rho: number, tau: number];

/** A turn at an angle, moved by its errors. */
function turned(angle: number, [rho, tau]: Errors = [0, 0]): readonly [cos: number, sin: number] {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return [c * (1 + rho) - s * tau, s * (1 + rho) + c * tau];
}

/** A tape beside the same outputs as a function of its inputs and of errors of one of its turns. */
interface Case {
  readonly name: string;
  readonly tape: Tape;
  readonly names: readonly string[];
  readonly ranges: readonly (readonly [number, number])[];
  /** Entry of the turn whose errors count, or -1. */
  readonly turn: number;
  readonly value: (inputs: readonly number[], errors: Errors) => readonly number[];
}

const scratch = new pairs.Pairs(4);

function offsetOf(cos: number, sin: number, e: number): number {
  for (const [k, value] of [sin, cos, e].entries()) pairs.set(scratch, k, value);
  keplerOffset(scratch, 3, 0, 1, 2);
  return scratch.hi[3]!;
}

const CASES: readonly Case[] = [
  {
    name: 'plain arithmetic',
    names: ['a', 'b', 'c'],
    ranges: [
      [1.1, 2.9],
      [-2.8, -1.2],
      [0.4, 3],
    ],
    turn: -1,
    tape: tapeOf(
      [
        input('a'),
        input('b'),
        input('c'),
        exact('mul', 0, 1), // 3: a b
        exact('div', 3, 2), // 4: a b / c
        exact('sqrt', 0), // 5
        exact('sub', 4, 5), // 6
        exact('abs', 1), // 7
        exact('mul', 7, 7), // 8: b^2
        exact('add', 6, 8), // 9
        exact('neg', 9), // 10
        exact('select', 1, 0, 10, 2), // 11
        exact('mul', 11, 0), // 12
        exact('div', 0, 2), // 13
      ],
      [12, 13],
    ),
    value: ([a, b, c]) => [-((a! * b!) / c! - Math.sqrt(a!) + b! * b!) * a!, a! / c!],
  },
  {
    name: "Kepler's equation",
    names: ['M', 'e'],
    ranges: [
      [-3, 3],
      [0.05, 0.7],
    ],
    turn: 2,
    tape: tapeOf(
      [input('M'), input('e'), turn(0), { kind: 'offset', turn: 2, e: 1, format: 'f64', errors: null }],
      [3],
    ),
    value: ([M, e], errors) => [offsetOf(...turned(M!, errors), e!)],
  },
  {
    name: 'a product of turns and its components',
    names: ['a', 'b'],
    ranges: [
      [-3, 3],
      [-3, 3],
    ],
    turn: 2,
    tape: tapeOf(
      [
        input('a'),
        input('b'),
        turn(0),
        turn(1),
        { kind: 'product', args: [2, 3], format: 'exact', errors: null },
        { kind: 'cosine', turn: 4 },
        { kind: 'sine', turn: 4 },
      ],
      [5, 6],
    ),
    value: ([a, b], errors) => {
      const [c, s] = turned(a!, errors);
      const [C, S] = turned(b!);
      return [c * C - s * S, s * C + c * S];
    },
  },
  {
    name: 'a pair of numbers as a turn',
    names: ['a'],
    ranges: [[-1.4, 3.5]],
    turn: 1,
    tape: tapeOf(
      [
        input('a'),
        turn(0),
        { kind: 'cosine', turn: 1 },
        { kind: 'sine', turn: 1 },
        { kind: 'pair', args: [2, 3] },
        { kind: 'cosine', turn: 4 },
        { kind: 'sine', turn: 4 },
      ],
      [5, 6],
    ),
    value: ([a], errors) => turned(a!, errors),
  },
  {
    name: 'true anomaly',
    names: ['E', 'e', 'q'],
    ranges: [
      [-3, 3],
      [0.05, 0.6],
      [0, 0],
    ],
    turn: 3,
    tape: tapeOf(
      [
        input('E'),
        input('e'),
        input('q'),
        turn(0),
        { kind: 'leaf', of: 3, component: 'value' },
        { kind: 'leaf', of: 3, component: 'sine' },
        { kind: 'anomaly', turn: 3, e: 1, root: 2, lines: [4, 5] },
        { kind: 'cosine', turn: 6 },
        { kind: 'sine', turn: 6 },
      ],
      [7, 8],
    ),
    value: ([E, e, q], errors) => {
      const [c, s] = turned(E!, errors);
      const slope = 1 - e! * c;
      return [(c - e!) / slope, (q! * s) / slope];
    },
  },
];

/** Step of difference quotients, and what they may be off by. */
const STEP = 1e-5;
const NEAR = 1e-7;

/** Adjoints at points are the derivatives, and those of boxes hold them. */
export function adjoints({ Forward, Backward }: Analysis): void {
  const random = new Random(86);
  for (const { name, tape, names, ranges, turn: k, value } of CASES) {
    const forward = new Forward(tape, names, []);
    const backward = new Backward(forward);
    const at = tape.entries.flatMap((entry, index) => (entry.kind === 'input' ? [index] : []));
    for (let round = 0; round < 40; round++) {
      const middle = ranges.map(([lo, hi]) => lo + (hi - lo) * random.next());
      if (name === 'true anomaly') middle[2] = Math.sqrt(1 - middle[1]! ** 2);
      const slopes: {
        readonly found: readonly number[];
        readonly entry: number;
        readonly radial: boolean;
      }[] = [];
      for (const [n, entry] of at.entries()) {
        const moved = (by: number) =>
          value(
            middle.map((x, i) => (i === n ? x + by : x)),
            [0, 0],
          );
        slopes.push({ found: quotient(moved), entry, radial: true });
      }
      if (k >= 0) {
        slopes.push({ found: quotient((by) => value(middle, [by, 0])), entry: k, radial: true });
        slopes.push({ found: quotient((by) => value(middle, [0, by])), entry: k, radial: false });
      }
      for (const width of [0, 0.003, 0.05]) {
        const half = name === 'true anomaly' ? [width, width, 0] : middle.map(() => width);
        forward.run(
          Float64Array.from(middle, (x, i) => x - half[i]!),
          Float64Array.from(middle, (x, i) => x + half[i]!),
        );
        backward.run();
        for (const { found, entry, radial } of slopes)
          compare(backward, entry, radial, found, width === 0, `${name}, entry ${entry}, width ${width}`);
      }
    }
  }
}

function quotient(moved: (by: number) => readonly number[]): readonly number[] {
  const [before, after] = [moved(-STEP), moved(STEP)];
  return after.map((y, i) => (y - before[i]!) / (2 * STEP));
}

/** Demands that an adjoint holds a derivative; at a point that it is no more. */
function compare(
  backward: Backward,
  entry: number,
  radial: boolean,
  found: readonly number[],
  point: boolean,
  what: string,
): void {
  const { count } = backward;
  const [mid, rad] = radial ? [backward.mid, backward.rad] : [backward.midT, backward.radT];
  for (const [i, slope] of found.entries()) {
    const [m, r] = [mid[entry * count + i]!, rad[entry * count + i]!];
    const room = NEAR * (1 + Math.abs(slope));
    demand(
      Math.abs(slope - m) <= r + room,
      () => `${what}: the derivative ${slope} is outside the adjoint ${m} +- ${r}`,
    );
    demand(!point || r <= room, () => `${what}: the adjoint at a point has the width ${r}`);
  }
}

/** Entries of a chain of rotations: r, angles of u, i and the node, their turns, and the products. */
const CHAIN: readonly Bare[] = [
  input('r'),
  input('u'),
  input('i'),
  input('node'),
  turn(1),
  turn(2),
  turn(3),
  { kind: 'cosine', turn: 4 },
  { kind: 'sine', turn: 4 },
  { kind: 'cosine', turn: 5 },
  { kind: 'sine', turn: 5 },
  exact('mul', 0, 7), // 11: X = r cos u
  exact('mul', 0, 8), // 12: y = r sin u
  exact('mul', 12, 9), // 13: Y = y cos i
  exact('mul', 12, 10), // 14: Z = y sin i
];

/** Where the chain comes out, with errors of its parts by entry: absolute, or relative to turns. */
function place(at: readonly number[], entry: number, [rho, tau]: Errors): readonly [number, number, number] {
  const of = (k: number): Errors => (k === entry ? [rho, tau] : [0, 0]);
  const [r, u, i, node] = at as [number, number, number, number];
  const [[c, s], [C, S], [cn, sn]] = [turned(u, of(4)), turned(i, of(5)), turned(node, of(6))];
  const radius = r + of(0)[0];
  const X = radius * c + of(11)[0];
  const y = radius * s + of(12)[0];
  const Y = y * C + of(13)[0];
  return [X * cn - Y * sn, X * sn + Y * cn, y * S + of(14)[0]];
}

/** Adjoints of a chain of rotations: in the frame of the node, and on the axes of the orbit. */
export function frames({ Forward, Backward }: Analysis): void {
  const random = new Random(87);
  const node = { X: 11, Y: 13, turn: 6, format: 'f32' } as const;
  const orbit = { r: 0, u: 4, i: 5, y: 12, Z: 14 };
  for (const chain of [null, orbit]) {
    const forward = new Forward(tapeOf(CHAIN, [11, 13, 14], node, chain), ['r', 'u', 'i', 'node'], []);
    const backward = new Backward(forward);
    for (let round = 0; round < 60; round++) {
      const at = [1 + random.next(), ...[0, 0, 0].map(() => 6 * random.next() - 3)];
      const [, u, i, O] = at as [number, number, number, number];
      const axes = chain === null ? frameOf(0, 0, O) : frameOf(u, i, O);
      forward.run(Float64Array.from(at), Float64Array.from(at));
      backward.run();
      const entries = [0, 4, 5, 6, 11, 12, 13, 14].filter((k) => chain !== null || ![11, 13, 14].includes(k));
      for (const entry of entries) {
        for (const radial of [true, false]) {
          if (!radial && ![4, 5, 6].includes(entry)) continue;
          const moved = quotient((by) => place(at, entry, radial ? [by, 0] : [0, by]));
          const found = axes.map((axis) => axis.reduce((sum, part, k) => sum + part * moved[k]!, 0));
          const what = `${chain === null ? 'node' : 'orbit'} frame, entry ${entry}, ${radial ? 'radial' : 'tangential'}`;
          compare(backward, entry, radial, found, true, what);
        }
      }
    }
  }
}

/** Axes along the radius, along the motion and across it; for u = i = 0 those of the frame of the node. */
function frameOf(u: number, i: number, O: number): readonly (readonly number[])[] {
  const [c, s, C, S] = [Math.cos(u), Math.sin(u), Math.cos(i), Math.sin(i)];
  const [cn, sn] = [Math.cos(O), Math.sin(O)];
  return [
    [c, C * s, S * s],
    [-s, C * c, S * c],
    [0, -S, C],
  ].map(([x, y, z]) => [x! * cn - y! * sn, x! * sn + y! * cn, z!]);
}
