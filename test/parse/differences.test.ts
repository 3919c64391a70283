import { describe, expect, test } from 'vitest';
import { type Edit, expectFinding } from './edits.ts';
import { findingsOf } from './findings.ts';
import { float32, float64, mixed } from './samples.ts';

const FLOAT64: readonly Edit[] = [
  [
    'a coefficient by an ulp',
    '0.041666666666666664',
    '0.04166666666666667',
    'parse.other-constant',
    'v9 = v8',
  ],
  ['the sign of a coefficient', '-0.5 + v9', '0.5 + v9', 'parse.other-constant', 'v10 ='],
  ['a gravitational constant', '398600500000000', '398600441800000', 'parse.other-constant', 'v2 = 3'],
  ['the bound of a select', '< 0.75', '< 0.5', 'parse.other-constant', 'v6 = v4'],
  ['operands swapped', 'M - cosM', 'cosM - M', 'parse.other-argument', 'sinM = cosM'],
  ['branches of a select swapped', '? v5 : M0', '? M0 : v5', 'parse.other-argument', 'v6 = v4'],
  ['a number in the place of a value', 'e * sinM', '0.02 * sinM', 'parse.other-argument', 'v11 = 0'],
  ['a value in the place of a number', 'M0 + 0.25', 'M0 + e', 'parse.other-argument', 'v3 = M0'],
  ['a later value in the place of another', 'n * t', 'A * t', 'parse.other-argument', 'v7 = A'],
  ['a sum turned difference', 'v6 + v7', 'v6 - v7', 'parse.other-operation', 'M = v6'],
  ['a product turned quotient', 'M * M', 'M / M', 'parse.other-operation', 'v8 = M'],
  ['a root turned magnitude', 'Math.sqrt', 'Math.abs', 'parse.other-operation', 'n = Math'],
  ['a negation turned product', '= -v4', '= -1 * v4', 'parse.other-operation', 'v5 = -1'],
  ['a line added', '  const cosM', '  const extra = t * t;\n  const cosM', 'parse.other-argument', 'extra ='],
  ['a line added at the end', '  out[0]', '  const extra = t * t;\n  out[0]', 'parse.other-count', 'extra ='],
  [
    'a line dropped that nothing needs',
    '  const y = A * x;\n  out[0] = y',
    '  out[0] = A',
    'parse.other-output',
    'out[0]',
  ],
  [
    'independent lines reordered',
    'v11 = e * sinM;\n  const v12 = e * cosM',
    'v12 = e * cosM;\n  const v11 = e * sinM',
    'parse.other-argument',
    'v12 = e',
  ],
  ['a range wider by an ulp', 'e <= 0.03', 'e <= 0.030000000000000002', 'parse.other-range', 'if (!(e >= 0'],
  ['a range wider by the least number', 'e >= 0', 'e >= -5e-324', 'parse.other-range', 'if (!(e >= -'],
  ['another sign of zero', 'e >= 0', 'e >= -0', 'parse.other-range', 'if (!(e >= -'],
  ['a longer span of time', 't <= 7200', 't <= 7201', 'parse.other-range', 'if (!(t >='],
  ['an element read as another', 'elements.M0', 'elements.M1', 'parse.other-element', 'if (!(M0 >='],
  [
    'an element too many',
    '  const A = sqrtA',
    '  const i = elements.i;\n  if (!(i >= 0 && i <= 3)) return i - i === 0 ? 1 : 3;\n  const A = sqrtA',
    'parse.other-element',
    'if (!(i >=',
  ],
  [
    'values of two stores exchanged',
    'state[1] = v6;\n  state[2] = e',
    'state[1] = e;\n  state[2] = v6',
    'parse.other-state',
    'state[1] = e',
  ],
  ['an output of another value', 'out[1] = x', 'out[1] = t', 'parse.other-output', 'out[1]'],
  ['an output of a number', 'out[1] = x', 'out[1] = 0', 'parse.other-output', 'out[1]'],
  [
    'two outputs exchanged',
    'out[0] = y;\n  out[1] = x',
    'out[0] = x;\n  out[1] = y',
    'parse.other-output',
    'out[0]',
  ],
  ['an output missing', '  out[2] = v12;\n  return', '  return /**/', 'parse.other-output', 'return /**/'],
  [
    'an output too many',
    '  out[2] = v12;\n',
    '  out[2] = v12;\n  out[3] = t;\n',
    'parse.other-output',
    'out[3]',
  ],
];

const FLOAT32: readonly Edit[] = [
  [
    'a coefficient by a float32 ulp',
    '0.6366197466850281',
    '0.6366196870803833',
    'parse.other-constant',
    'v1 = ',
  ],
  [
    'a range wider by a float32 ulp',
    '0.029999999329447746',
    '0.030000001192092896',
    'parse.other-range',
    'if (!(e32',
  ],
  ['the rounding at the end dropped', 'fround(v5 / v3)', 'v5 / v3', 'parse.other-format', 'x = v5'],
  ['a word that is not rounded', 'state[1] = e32', 'state[1] = e', 'parse.float32', 'e32);\n  const v5'],
];

describe.each([
  ['float64', float64, FLOAT64],
  ['float32', float32, FLOAT32],
] as const)('%s: a difference is found where it stands', (_, sample, edits) => {
  test.each(edits)('%s', (...edit) => {
    expectFinding(sample, edit);
  });
});

test.each([
  ['float64', float64],
  ['float32', float32],
  ['mixed', mixed],
])('%s: the sample is its kernel', (_, { text, kernel }) => {
  expect(findingsOf(text, kernel)).toEqual([]);
});

test('zero with another sign is another constant', () => {
  const { kernel } = float64;
  const lines = kernel.lines.map((line) => (line.value === 0.25 ? { ...line, value: 0 } : line));
  const found = (number: string) =>
    findingsOf(float64.text.replace('0.25', number), { ...kernel, lines }).map(({ code }) => code);
  expect(found('0')).toEqual([]);
  expect(found('-0')).toEqual(['parse.other-constant']);
});

test('an element that is missing is a difference', () => {
  const text = float64.text
    .replace(/ {2}const M0 = elements.*\n.*\n/, '')
    .replace(/ {2}const v3 = .*\n/, '  const M0 = e + 0.25;\n  const v3 = M0 + 0.25;\n');
  expect(findingsOf(text, float64.kernel).map(({ code }) => code)).toContain('parse.other-element');
});

test('a guard that was taken out whole is a difference', () => {
  const text = float64.text.replace('  state[0] = 0;\n', '').replace('  if (!(n > 0)) return 1;\n', '');
  expect(findingsOf(text, float64.kernel)).toMatchObject([{ code: 'parse.other-guard' }]);
});

test('a guard on another word is a difference', () => {
  const text = float64.text.replace('  state[0] = 0;\n', '  state[3] = 0;\n').replace('!(n > 0)', '!(A > 0)');
  expect(findingsOf(text, float64.kernel)).toMatchObject([{ code: 'parse.other-guard' }]);
});

test('an input that is checked before its rounding is a difference', () => {
  const text = float32.text
    .replace(
      '  const e32 = fround(e);\n  if (!(e32 >= 0 && e32 <= 0.029999999329447746)) return fround(e32 - e32)',
      '  if (!(e >= 0 && e <= 0.03)) return e - e',
    )
    .replace('  const v1', '  const e32 = fround(e);\n  const v1');
  expect(findingsOf(text, float32.kernel)[0]).toMatchObject({
    code: 'parse.other-range',
    place: { line: 9 },
  });
});

describe('a change that is none is accepted', () => {
  test.each([
    ['a number in exponent form', '0.041666666666666664', '4.1666666666666664E-2'],
    ['a number with zeros at its ends', '0.041666666666666664', '.04166666666666666400'],
    ['a number with more digits than it needs', '0.041666666666666664', '0.0416666666666666644'],
    ['white space', '-0.5 + v9', '- 0.5+\tv9'],
    ['a comment inside a line', 'M - cosM', 'M /* less */ - cosM /* done */'],
    ['a comment over lines', '  const cosM', '  /* the\n cosine */ const cosM'],
    ['an empty line', '  const cosM', '\n\n  const cosM'],
    ['an index in another form', 'out[1]', 'out[1.0]'],
  ])('%s', (_, from, to) => {
    expect(float64.text).toContain(from);
    expect(findingsOf(float64.text.replace(from, to), float64.kernel)).toEqual([]);
  });

  test.each(['cosM', 'v8', 'sqrtA', 'A', 'e', 'n'])('the name %s changed throughout', (name) => {
    const text = float64.text.replace(new RegExp(`(?<!\\.)\\b${name}\\b`, 'g'), 'renamed$');
    expect(text).not.toBe(float64.text);
    expect(findingsOf(text, float64.kernel)).toEqual([]);
  });

  test('a word of the state with another name in position', () => {
    const [setup, position] = float64.text.split('/** Predicts') as [string, string];
    const text = `${setup}/** Predicts${position.replace(/\be\b/g, 'v1')}`;
    expect(findingsOf(text, float64.kernel)).toEqual([]);
  });
});

describe('messages', () => {
  const told = (from: string | RegExp, to: string) =>
    findingsOf(float64.text.replaceAll(from, to), float64.kernel).map(({ what }) => what);

  test('name both sides', () => {
    expect(told('M - cosM', 'cosM - M')).toEqual([
      'the file has f64 sub(cosM, M), the kernel has f64 sub(M, cosM)',
    ]);
    expect(told('out[1] = x', 'out[1] = y')).toEqual(['the file has y as output 1, the kernel has x there']);
  });

  test('speak of the kernel in the names of the file', () => {
    expect(
      findingsOf(float64.text.replaceAll('sinM', 'abc').replace('e * abc', 'e + abc'), float64.kernel)[0]!
        .what,
    ).toBe('the file has f64 add(e, abc), the kernel has f64 mul(e, abc)');
  });

  test('stop at ten differences and count the others', () => {
    const text = float64.text.replace(/(?<=^ {2}const \w+ = [\w.-]+) [-+*/] (?=[\w.-]+;)/gm, (sign) =>
      sign === ' + ' ? ' - ' : ' + ',
    );
    const findings = findingsOf(text, float64.kernel);
    expect(findings.slice(0, 10).map(({ code }) => code)).toEqual(Array(10).fill('parse.other-operation'));
    expect(findings.slice(10)).toMatchObject([
      { code: 'parse.more-differences', what: '5 more differences from here on' },
    ]);
    const places = findings.map(({ place }) => place.line!);
    expect(places).toEqual([...new Set(places)].sort((a, b) => a - b));
  });
});
