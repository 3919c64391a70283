import { describe, expect, test } from 'vitest';
import { parseKernel } from '../../codegen/parse/parse.ts';
import { type Edit, expectFinding } from './edits.ts';
import { findingsOf } from './findings.ts';
import { float32, float64, mixed } from './samples.ts';

const STATEMENTS: readonly Edit[] = [
  ['a second operation', 'v8 * v10;', 'v8 * v10 * 1;', 'parse.form', '* 1;'],
  ['parentheses', 'v8 * v10', '(v8 * v10)', 'parse.form', '(v8'],
  ['a second statement on a line', 'v8 * v10;', 'v8 * v10; out[0] = t;', 'parse.form', 'out[0] = t'],
  ['two bindings', 'v8 * v10;', 'v8 * v10, extra = t;', 'parse.form', ', extra'],
  ['a statement over two lines', 'cosM = v8', 'cosM =\n    v8', 'parse.form', '\n    v8'],
  ['a line without its end', 'v8 * v10;', 'v8 * v10', 'parse.form', '\n  const sinM'],
  ['a return cut from its value', 'v12;\n  return 0;', 'v12;\n  return\n    0;', 'parse.form', '\n    0;'],
  ['a comment that cuts a return', 'v12;\n  return 0;', 'v12;\n  return /*\n*/ 0;', 'parse.form', ' /*\n*/'],
  ['an empty statement', 'v8 * v10;', 'v8 * v10;;', 'parse.form', ';\n  const sinM'],
  ['a remainder', 'v8 * v10', 'v8 % v10', 'parse.form', '% v10'],
  ['a power', 'M * M', 'M ** 2', 'parse.form', '** 2'],
  ['another comparison', '< 0.75', '<= 0.75', 'parse.form', '<= 0.75'],
  ['a line of a number', 'v8 * v10', '1', 'parse.form', ';\n  const sinM'],
  ['a line of a negative number', 'v8 * v10', '-1', 'parse.form', ';\n  const sinM'],
  ['a copy', 'v8 * v10', 'v10', 'parse.form', ';\n  const sinM'],
  ['a sign before a value of a sum', '-0.5 + v9', '-v8 + v9', 'parse.form', '+ v9'],
  ['a decrement', 'M - cosM', 'M--cosM', 'parse.form', '--cosM'],
  ['a branch', '  const cosM', '  if (t > 0) return 0;\n  const cosM', 'parse.form', 'if (t > 0'],
  ['a loop', '  const cosM', '  for (;;) break;\n  const cosM', 'parse.form', 'for (;;)'],
  ['a block', '  const cosM', '  {\n  const cosM', 'parse.form', '{\n  const cosM'],
  ['an exception', '  const cosM', '  throw t;\n  const cosM', 'parse.form', 'throw t'],
  ['a directive', '  state[0] = 0', "  'use math';\n  state[0] = 0;\n", 'parse.form', "'use math'"],
  [
    'a conflict of versions',
    '  const cosM',
    '=======\n>>>>>>> other\n  const cosM',
    'parse.form',
    'const cosM',
  ],
  [
    'a conflict that hides lines',
    '  const v13 = ',
    '=======\n  const v13 = t;\n>>>>>>> b\n  const v13 = ',
    'parse.form',
    'const v13 = Math',
  ],
  ['text', 'M * M', "M * 'M'", 'parse.form', "'M'"],
  ['a template', 'M * M', 'M * `2`', 'parse.form', '`2`'],
  ['a regular expression', 'M * M', '/M*M/', 'parse.form', '/M*M/'],
];

const NAMES: readonly Edit[] = [
  ['const turned let', 'const cosM', 'let cosM', 'parse.form', 'let cosM'],
  ['const turned var', 'const v1 ', 'var v1 ', 'parse.form', 'var v1'],
  ['a name given again', '  const cosM', '  n = t * t;\n  const cosM', 'parse.form', 'n = t * t'],
  ['a name declared twice', 'const v9', 'const v8', 'parse.name', 'v8 = v8'],
  ['a parameter hidden', 'const cosM', 'const t', 'parse.name', 't = v8'],
  ['the outputs hidden', 'const cosM', 'const out', 'parse.name', 'out = v8'],
  ['the state hidden', 'const v1 ', 'const state ', 'parse.name', 'state = A'],
  ['Math hidden', 'const v1 ', 'const Math ', 'parse.name', 'Math = A'],
  ['fround hidden', 'const v1 ', 'const fround ', 'parse.name', 'fround = A'],
  ['a function hidden', 'const v1 ', 'const setup ', 'parse.name', 'setup = A'],
  ['a name loaded twice', 'const v6 = state', 'const n = state', 'parse.name', 'n = state[1]'],
  [
    'an element read twice',
    'const e = elements.e',
    'const sqrtA = elements.sqrtA',
    'parse.name',
    'sqrtA = elements.sqrtA;\n  if (!(e ',
  ],
  ['use before definition', 'M0 + 0.25', 'v5 + 0.25', 'parse.undefined-name', 'v5 + 0.25'],
  ['use in its own definition', 'M0 + 0.25', 'v3 + 0.25', 'parse.undefined-name', 'v3 + 0.25'],
  ['a line dropped', '  const v9 = v8 * 0.041666666666666664;\n', '', 'parse.undefined-name', 'v9;'],
  ['a value that was not loaded', 'e * sinM', 'M0 * sinM', 'parse.undefined-name', 'M0 * sinM'],
  ['not-a-number', 'e * sinM', 'NaN * sinM', 'parse.undefined-name', 'NaN'],
  ['the array itself', 'e * sinM', 'state * sinM', 'parse.undefined-name', 'state * sinM'],
  ['a store of a name unknown', 'state[2] = e', 'state[2] = f', 'parse.undefined-name', 'f;'],
  ['an output of a name unknown', 'out[1] = x', 'out[1] = M0', 'parse.undefined-name', 'M0;\n  out[2]'],
  ['an escape', 'const v1 ', 'const v\\u0031 ', 'parse.form', 'v\\u0031'],
  ['a word of the language', 'const v1 ', 'const yield ', 'parse.form', 'yield'],
  ['a word that modules keep', 'const v1 ', 'const await ', 'parse.form', 'await'],
];

const CALLS: readonly Edit[] = [
  ["the engine's sine", 'Math.sqrt', 'Math.sin', 'parse.form', 'sin(v2'],
  ['a computed call', 'Math.sqrt', "Math['sqrt']", 'parse.form', "['sqrt']"],
  ['an optional call', 'Math.sqrt', 'Math.sqrt?.', 'parse.form', '?.(v2'],
  ['a second argument', 'sqrt(v2)', 'sqrt(v2, A)', 'parse.form', ', A)'],
  ['a call in a call', 'sqrt(v2)', 'sqrt(Math.abs(v2))', 'parse.form', '.abs(v2'],
  ['a call of the file', 'Math.sqrt(v2)', 'setup(v2)', 'parse.form', '(v2)'],
  ['a rounding in a file of float64', 'v8 * v10', 'fround(v8 * v10)', 'parse.undefined-name', 'const cosM'],
];

const FRAME: readonly Edit[] = [
  ['an import', 'export const', "import './other.js';\nexport const", 'parse.form', 'import'],
  ['a side effect at the top', 'export const', 'globalThis.x = 1;\nexport const', 'parse.form', 'globalThis'],
  [
    'a side effect between',
    '\n/** Predicts',
    '\nMath.sqrt = Math.abs;\n/** Predicts',
    'parse.form',
    'Math.sqrt =',
  ],
  [
    'a side effect on a line with an end',
    '}\n\n/** Predicts',
    '} state;\n\n/** Predicts',
    'parse.form',
    'state;\n\n/',
  ],
  [
    'a side effect at the end',
    'v12;\n  return 0;\n}',
    'v12;\n  return 0;\n}\nsetup();',
    'parse.form',
    'setup();',
  ],
  [
    'another export',
    'v12;\n  return 0;\n}',
    'v12;\n  return 0;\n}\nexport default 1;',
    'parse.form',
    'export default',
  ],
  [
    'code behind the return',
    'v12;\n  return 0;',
    'v12;\n  return 0;\n  out[0] = 1;',
    'parse.form',
    'out[0] = 1',
  ],
  [
    'a rounding that nothing uses',
    'export const',
    'const fround = Math.fround;\nexport const',
    'parse.form',
    'const fround',
  ],
  ['state words that change', 'export const', 'export let', 'parse.form', 'let stateWords'],
  ['state words that are wrong', 'Words = 4', 'Words = 5', 'parse.state-words', '5;\n\n/**'],
  [
    'a function that is not exported',
    'export function setup',
    'function setup',
    'parse.form',
    'function setup',
  ],
  ['an asynchronous function', 'export function setup', 'export async function setup', 'parse.form', 'async'],
  ['a generator', 'function setup', 'function* setup', 'parse.form', '* setup'],
  ['parameters exchanged', '(t, state, out)', '(t, out, state)', 'parse.form', 'out, state'],
  ['a default value', '(t, state', '(t = 0, state', 'parse.form', '= 0, state'],
  ['a parameter more', '(elements, state', '(elements, state, more', 'parse.form', ', more'],
  ['an end too early', 'v12;\n  return 0;\n}\n', 'v12;\n  return 0;', 'parse.form', ''],
  ['a comment without end', 'v12;\n  return 0;\n}\n', 'v12;\n  return 0;\n}\n/* more', 'parse.form', ''],
  ['markup of another language', 'v8 * v10', 'v8 <!-- v10', 'parse.form', '!-- v10'],
];

const CHECKS: readonly Edit[] = [
  ['one end unchecked', 'e >= 0 && e', 'e', 'parse.check', '<= 0.03'],
  ['ends joined by or', 'e >= 0 &&', 'e >= 0 ||', 'parse.check', '||'],
  ['an open end', 'e >= 0', 'e > 0', 'parse.check', '> 0 && e'],
  ['another element', 'e >= 0', 'M0 >= 0', 'parse.check', 'M0 >= 0'],
  [
    'the finiteness of another',
    'return e - e',
    'return e - sqrtA',
    'parse.check',
    'sqrtA === 0 ? 1 : 3;\n  const M0',
  ],
  ['an infinite end', 'e <= 0.03', 'e <= Infinity', 'parse.check', 'Infinity'],
  [
    'a check that is gone',
    '  if (!(e >= 0 && e <= 0.03)) return e - e === 0 ? 1 : 3;\n',
    '',
    'parse.check',
    'const M0',
  ],
  [
    'the check of time gone',
    '  if (!(t >= -7200 && t <= 7200)) return t - t === 0 ? 2 : 3;\n',
    '',
    'parse.check',
    'const n = state',
  ],
  ['a branch more', 'e - e === 0 ? 1 : 3;', 'e - e === 0 ? 1 : 3; else return 0;', 'parse.check', 'else'],
  ['a status of an element', 'e - e === 0 ? 1', 'e - e === 0 ? 2', 'parse.status', '2 : 3;\n  const M0'],
  ['a status of time', 't - t === 0 ? 2', 't - t === 0 ? 0', 'parse.status', '0 : 3;\n  const n'],
  ['a status of no number', 'e - e === 0 ? 1 : 3', 'e - e === 0 ? 1 : 1', 'parse.status', '1;\n  const M0'],
  ['a status of the end', 'v12;\n  return 0;', 'v12;\n  return 1;', 'parse.status', '1;\n}\n'],
  ['a status of setup', 'A;\n  return 0;', 'A;\n  return 3;', 'parse.status', '3;\n}\n'],
];

const ARRAYS: readonly Edit[] = [
  [
    'slots of two stores exchanged',
    'state[1] = v6;\n  state[2] = e',
    'state[2] = v6;\n  state[1] = e',
    'parse.index',
    '2] = v6',
  ],
  ['a slot stored twice', 'state[2] = e', 'state[1] = e', 'parse.index', '1] = e'],
  [
    'slots of two loads exchanged',
    'v6 = state[1];\n  const e = state[2]',
    'v6 = state[2];\n  const e = state[1]',
    'parse.index',
    '2];\n  const e',
  ],
  ['a slot that is not there', 'A = state[3]', 'A = state[4]', 'parse.index', '4];'],
  ['a load missing', '  const A = state[3];\n', '', 'parse.index', 'if (!(n >'],
  ['a load too many', 'A = state[3];', 'A = state[3];\n  const B = state[4];', 'parse.guard', 'const B'],
  ['a load late', '  const cosM', '  const B = state[0];\n  const cosM', 'parse.form', '[0];\n  const cosM'],
  ['a store missing', '  state[3] = A;\n', '', 'parse.guard', 'const A = state'],
  ['a store from position', '  out[0]', '  state[0] = t;\n  out[0]', 'parse.form', 'state[0] = t'],
  ['a computed index', 'out[0]', 'out[n]', 'parse.form', 'n] = y'],
  ['an index that is not due', 'out[2]', 'out[7]', 'parse.index', '7] ='],
  ['an index below zero', 'out[0]', 'out[-1]', 'parse.index', '-1] ='],
  ['an index below zero by its sign alone', 'out[0]', 'out[-0]', 'parse.index', '-0] ='],
  ['a broken index', 'out[1]', 'out[1.5]', 'parse.index', '1.5] ='],
  ['a number in the state', 'state[2] = e', 'state[2] = 0.01', 'parse.form', '0.01'],
  ['a store that adds', 'out[0] =', 'out[0] +=', 'parse.form', '+='],
  ['a store of an operation', 'out[0] = y', 'out[0] = A * x', 'parse.form', '* x;\n  out[1'],
];

const GUARD: readonly Edit[] = [
  ['not cleared', '  state[0] = 0;\n  const', '  const', 'parse.guard', 'n > 0'],
  ['not checked', '  if (!(n > 0)) return 1;\n', '', 'parse.guard', 'const v7'],
  ['another word checked', '!(n > 0)', '!(A > 0)', 'parse.guard', 'A > 0'],
  ['another word cleared', '  state[0] = 0;\n  const', '  state[3] = 0;\n  const', 'parse.guard', 'n > 0'],
  [
    'a word cleared that is not there',
    '  state[0] = 0;\n  const',
    '  state[4] = 0;\n  const',
    'parse.guard',
    'state[4]',
  ],
  [
    'set to something else',
    '  state[0] = 0;\n  const',
    '  state[0] = 1;\n  const',
    'parse.form',
    '1;\n  const sqrtA',
  ],
  ['zero passes', '!(n > 0)', '!(n >= 0)', 'parse.guard', '>= 0)) return 1'],
  ['a wrong status', 'return 1;', 'return 0;', 'parse.status', '0;\n  const v7'],
  [
    'checked late',
    '  if (!(n > 0)) return 1;\n  const v7 = n * t;\n',
    '  const v7 = n * t;\n  if (!(n > 0)) return 1;\n',
    'parse.guard',
    'const v7',
  ],
];

const NUMBERS: readonly Edit[] = [
  ['hexadecimal', '5160)', '0x1428)', 'parse.literal', '0x1428'],
  ['octal', '5160)', '05160)', 'parse.check', '05160'],
  ['a separator', '5160)', '5_160)', 'parse.literal', '5_160'],
  ['a big integer', '5160)', '5160n)', 'parse.check', '5160n'],
  ['too large', '5160)', '1e309)', 'parse.literal', '1e309'],
  [
    'more digits than engines must read',
    '0.041666666666666664',
    '0.0416666666666666643541',
    'parse.literal',
    '0.0416666666666666643541',
  ],
  ['a name right behind', '5160)', '5160px)', 'parse.check', '5160px'],
];

const FLOAT32: readonly Edit[] = [
  ['a rounding dropped', 'fround(n * t32)', 'n * t32', 'parse.float32', 'v3 - e32'],
  ['a time that is not rounded', 'fround(n * t32)', 'fround(n * t)', 'parse.float32', 't);\n  const v4'],
  ['a number that is not float32', '0.6366197466850281', '0.6366197723675814', 'parse.float32', '0.6366'],
  ['a rounding of an exact operation', 'Math.floor(v1)', 'fround(Math.floor(v1))', 'parse.form', 'floor(v1'],
  ['a rounding of a negation', '= -v4', '= fround(-v4)', 'parse.form', '-v4'],
  [
    'rounding past the name of the module',
    'fround(v5 / v3)',
    'Math.fround(v5 / v3)',
    'parse.form',
    'fround(v5',
  ],
  ['another function under the name', 'Math.fround;', 'Math.trunc;', 'parse.form', 'trunc'],
  [
    'the name of rounding not defined',
    'const fround = Math.fround;\n',
    '',
    'parse.undefined-name',
    'const e32 = fround',
  ],
  ['an unrounded value checked', 'if (!(e32 >= 0', 'if (!(e >= 0', 'parse.check', 'e >= 0'],
  ['an unrounded difference', 'fround(e32 - e32)', 'e32 - e32', 'parse.check', 'e32 - e32'],
  ['another input rounded', 'M032 = fround(M0)', 'M032 = fround(e)', 'parse.check', 'e);\n  if (!(M032'],
];

const MIXED: readonly Edit[] = [
  ['a word that is not rounded', 'state[0] = n32', 'state[0] = n', 'parse.float32', 'n32 * t32'],
  ['a rounding in setup', 'n = M0 + 4', 'n = fround(M0 + 4)', 'parse.float32', 'M0 + 4'],
];

describe.each([
  ['statements', float64, STATEMENTS],
  ['names', float64, NAMES],
  ['calls', float64, CALLS],
  ['frame', float64, FRAME],
  ['checks', float64, CHECKS],
  ['arrays', float64, ARRAYS],
  ['guard', float64, GUARD],
  ['numbers', float64, NUMBERS],
  ['float32', float32, FLOAT32],
  ['mixed', mixed, MIXED],
] as const)('%s: what is not understood is refused where it stands', (_, sample, edits) => {
  test.each(edits)('%s', (...edit) => {
    expectFinding(sample, edit);
  });
});

test.each(['', '\n', '// nothing\n', '\u0000', '((((((((((('.repeat(5_000), 'let x = `${`'])(
  'a text that is no kernel is refused (%#)',
  (text) => {
    expect(() => parseKernel('kernel.js', text)).toThrow(/^kernel\.js:\d+:\d+: parse\.form: /);
  },
);

test('a guard on a second word of the same value is refused: setup leaves that one as it was', () => {
  const text = float64.text.replace('state[3] = A', 'state[3] = n').replace('!(n > 0)', '!(A > 0)');
  expect(findingsOf(text, float64.kernel)).toMatchObject([{ code: 'parse.guard', place: { line: 35 } }]);
});

test('a message tells what is due', () => {
  const [sine] = findingsOf(float64.text.replace('Math.sqrt', 'Math.sin'), float64.kernel);
  expect(sine!.what).toBe('"sin" stands where sqrt or abs or floor is due');
  const [early] = findingsOf(float64.text.slice(0, -2), float64.kernel);
  expect(early!.what).toBe('nothing stands where } is due');
});
