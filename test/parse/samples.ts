import type { Format } from '../../codegen/kernel/choices.ts';
import type { Kernel, Line, Operation } from '../../codegen/kernel/kernel.ts';
import type { Domain } from '../../src/models/description.ts';

/** A file and the kernel that it holds, both written by hand: every form occurs, the values mean little. */
export interface Sample {
  readonly text: string;
  readonly kernel: Kernel;
}

const range = (min: number, max: number) => ({ min, max, from: 'made up' });

const DOMAIN: Domain = {
  sqrtA: range(5150, 5160),
  e: range(0, 0.03),
  M0: range(-3.1415926536, 3.1415926536),
  t: range(-7200, 7200),
};

/**
 * A kernel from its lines, written as `stage format name operation arguments...`; numbers among the arguments become
 * constants of the line's format.
 */
function kernelOf(
  formats: readonly [setup: Format, tick: Format],
  rows: readonly string[],
  state: readonly string[],
  outputs: readonly string[],
): Kernel {
  const lines: Line[] = [];
  const node: Line['node'] = { operation: 'constant', args: [], stage: 'constant', value: 0, name: '' };
  const numberOf = (word: string, format: Format): number => {
    const value = Number(word);
    if (Number.isNaN(value)) return lines.findIndex((line) => line.name === word);
    const shared = { name: '', operation: 'constant', args: [], stage: 'constant', node } as const;
    return lines.push({ ...shared, format, value }) - 1;
  };
  for (const row of rows) {
    const [stage, format, name, operation, ...words] = row.split(' ') as [
      'setup' | 'tick',
      Format,
      string,
      Operation,
    ];
    const args = words.map((word) => numberOf(word, format));
    lines.push({ name, operation, args, format, stage, value: 0, node });
  }
  const [setup, tick] = formats;
  return {
    model: 'sample',
    choices: { setup, tick, starter: 'secant', corrector: 'newton', cap: 1 },
    domain: DOMAIN,
    elements: lines
      .filter((line) => line.operation === 'input' && line.stage === 'setup')
      .map(({ name }) => name),
    lines,
    state: state.map((name) => numberOf(name, setup)),
    guard: 0,
    outputs: outputs.map((name, index) => ({
      group: 'position',
      name: 'xyz'[index]!,
      unit: 'm',
      line: numberOf(name, tick),
    })),
  };
}

/** Float64 throughout. */
export const float64: Sample = {
  kernel: kernelOf(
    ['f64', 'f64'],
    [
      'setup f64 sqrtA input',
      'setup f64 A mul sqrtA sqrtA',
      'setup f64 v1 mul A A',
      'setup f64 v2 div 398600500000000 v1',
      'setup f64 n sqrt v2',
      'setup f64 e input',
      'setup f64 M0 input',
      'setup f64 v3 add M0 0.25',
      'setup f64 v4 floor v3',
      'setup f64 v5 neg v4',
      'setup f64 v6 select v4 0.75 v5 M0',
      'tick f64 t input',
      'tick f64 v7 mul n t',
      'tick f64 M add v6 v7',
      'tick f64 v8 mul M M',
      'tick f64 v9 mul v8 0.041666666666666664',
      'tick f64 v10 add -0.5 v9',
      'tick f64 cosM mul v8 v10',
      'tick f64 sinM sub M cosM',
      'tick f64 v11 mul e sinM',
      'tick f64 v12 mul e cosM',
      'tick f64 v13 abs v12',
      'tick f64 x sub v11 v13',
      'tick f64 y mul A x',
    ],
    ['n', 'v6', 'e', 'A'],
    ['y', 'x', 'v12'],
  ),
  text: `/** Words of the state array. */
export const stateWords = 4;

/** Prepares: state[0] = 0; is no statement here. */
export function setup(elements, state) {
  state[0] = 0;
  const sqrtA = elements.sqrtA;
  if (!(sqrtA >= 5150 && sqrtA <= 5160)) return sqrtA - sqrtA === 0 ? 1 : 3;
  const e = elements.e;
  if (!(e >= 0 && e <= 0.03)) return e - e === 0 ? 1 : 3;
  const M0 = elements.M0;
  if (!(M0 >= -3.1415926536 && M0 <= 3.1415926536)) return M0 - M0 === 0 ? 1 : 3;
  const A = sqrtA * sqrtA;
  const v1 = A * A;
  const v2 = 398600500000000 / v1;
  const n = Math.sqrt(v2);
  const v3 = M0 + 0.25;
  const v4 = Math.floor(v3);
  const v5 = -v4;
  const v6 = v4 < 0.75 ? v5 : M0;
  state[0] = n;
  state[1] = v6;
  state[2] = e;
  state[3] = A;
  return 0;
}

/** Predicts. */
export function position(t, state, out) {
  if (!(t >= -7200 && t <= 7200)) return t - t === 0 ? 2 : 3;
  const n = state[0];
  const v6 = state[1];
  const e = state[2];
  const A = state[3];
  if (!(n > 0)) return 1;
  const v7 = n * t;
  const M = v6 + v7;
  const v8 = M * M;
  const v9 = v8 * 0.041666666666666664;
  const v10 = -0.5 + v9;
  const cosM = v8 * v10;
  const sinM = M - cosM;
  const v11 = e * sinM;
  const v12 = e * cosM;
  const v13 = Math.abs(v12);
  const x = v11 - v13;
  const y = A * x;
  out[0] = y;
  out[1] = x;
  out[2] = v12;
  return 0;
}
`,
};

/** Float32 throughout; the range of e is the rounded one. */
export const float32: Sample = {
  kernel: kernelOf(
    ['f32', 'f32'],
    [
      'setup f64 e input',
      'setup f32 e32 round e',
      'setup f64 M0 input',
      'setup f32 M032 round M0',
      'setup f32 v1 mul M032 0.6366197466850281',
      'setup f32 v2 floor v1',
      'setup f32 n sqrt v2',
      'tick f64 t input',
      'tick f32 t32 round t',
      'tick f32 v3 mul n t32',
      'tick f32 v4 sub v3 e32',
      'tick f32 v5 neg v4',
      'tick f32 x div v5 v3',
    ],
    ['n', 'e32'],
    ['x'],
  ),
  text: `const fround = Math.fround;

/** Words of the state array. */
export const stateWords = 2;

export function setup(elements, state) {
  state[0] = 0;
  const e = elements.e;
  const e32 = fround(e);
  if (!(e32 >= 0 && e32 <= 0.029999999329447746)) return fround(e32 - e32) === 0 ? 1 : 3;
  const M0 = elements.M0;
  const M032 = fround(M0);
  if (!(M032 >= -3.1415927410125732 && M032 <= 3.1415927410125732)) return fround(M032 - M032) === 0 ? 1 : 3;
  const v1 = fround(M032 * 0.6366197466850281);
  const v2 = Math.floor(v1);
  const n = fround(Math.sqrt(v2));
  state[0] = n;
  state[1] = e32;
  return 0;
}

export function position(t, state, out) {
  const t32 = fround(t);
  if (!(t32 >= -7200 && t32 <= 7200)) return fround(t32 - t32) === 0 ? 2 : 3;
  const n = state[0];
  const e32 = state[1];
  if (!(n > 0)) return 1;
  const v3 = fround(n * t32);
  const v4 = fround(v3 - e32);
  const v5 = -v4;
  const x = fround(v5 / v3);
  out[0] = x;
  return 0;
}
`,
};

/** Setup in float64, position in float32; one output is a number. */
export const mixed: Sample = {
  kernel: kernelOf(
    ['f64', 'f32'],
    [
      'setup f64 e input',
      'setup f64 M0 input',
      'setup f32 e32 round e',
      'setup f64 n add M0 4',
      'setup f32 n32 round n',
      'tick f64 t input',
      'tick f32 t32 round t',
      'tick f32 v1 mul n32 t32',
      'tick f32 v2 add v1 e32',
    ],
    ['n32', 'e32'],
    ['v2', '0.5'],
  ),
  text: `const fround = Math.fround;

/** Words of the state array. */
export const stateWords = 2;

export function setup(elements, state) {
  state[0] = 0;
  const e = elements.e;
  if (!(e >= 0 && e <= 0.03)) return e - e === 0 ? 1 : 3;
  const M0 = elements.M0;
  if (!(M0 >= -3.1415926536 && M0 <= 3.1415926536)) return M0 - M0 === 0 ? 1 : 3;
  const e32 = fround(e);
  const n = M0 + 4;
  const n32 = fround(n);
  state[0] = n32;
  state[1] = e32;
  return 0;
}

export function position(t, state, out) {
  const t32 = fround(t);
  if (!(t32 >= -7200 && t32 <= 7200)) return fround(t32 - t32) === 0 ? 2 : 3;
  const n32 = state[0];
  const e32 = state[1];
  if (!(n32 > 0)) return 1;
  const v1 = fround(n32 * t32);
  const v2 = fround(v1 + e32);
  out[0] = v2;
  out[1] = 0.5;
  return 0;
}
`,
};
