import { describe, expect, test } from 'vitest';
import { readModel } from '../../codegen/read/model.ts';
import { InputError } from '../../src/finding.ts';
import type { ModelDescription } from '../../src/models/description.ts';

const model: ModelDescription = {
  name: 'tried',
  title: 'A model for tests',
  source: 'none',
  file: new URL('../../src/models/tried.ts', import.meta.url),
  outputs: { clock: { function: 'clock', unit: 's' } },
  units: { a: 's', b: 's' },
  constants: { k: 2 },
  frameRate: 0,
  domains: {},
};

/** A model file around one function; the body starts in line 3. */
function fileOf(body: string, extra = ''): string {
  return `export function clock(elements: any, earth: any, t: number): number {\n  const { a, b } = elements;\n  ${body}\n}\n${extra}\n`;
}

/** What reading a text refuses. */
function refusal(text: string): {
  code: string;
  line: number | undefined;
  column: number | undefined;
  what: string;
} {
  try {
    readModel(model, ['clock'], text);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const { code, place, what } = error.findings[0]!;
    return { code, line: place.line, column: place.column, what };
  }
  throw new Error('nothing was refused');
}

/** Body, code, line and column of the refusal. */
const REFUSED: readonly (readonly [
  name: string,
  body: string,
  code: string,
  line: number,
  column: number,
])[] = [
  ['let', 'let x = a;\n  return x;', 'read.mutable-binding', 3, 3],
  ['var', 'var x = a;\n  return x;', 'read.mutable-binding', 3, 3],
  ['for loop', 'for (;;) {}\n  return a;', 'read.loop', 3, 3],
  ['while loop', 'const x = a;\n  while (x) {}\n  return a;', 'read.loop', 4, 3],
  ['for-of loop', 'for (const x of b) {}\n  return a;', 'read.loop', 3, 3],
  ['if', 'if (a < b) return a;\n  return b;', 'read.branch-statement', 3, 3],
  ['switch', 'switch (a) {}\n  return b;', 'read.branch-statement', 3, 3],
  ['assignment', 'const x = a;\n  x = b;\n  return x;', 'read.assignment', 4, 3],
  ['increment', 'const x = a++;\n  return x;', 'read.assignment', 3, 13],
  ['decrement before', 'return --t;', 'read.assignment', 3, 10],
  ['compound assignment in an expression', 'const x = (t += 1);\n  return x;', 'read.assignment', 3, 14],
  ['remainder', 'return a % b;', 'read.operator', 3, 12],
  ['power', 'return a ** 2;', 'read.operator', 3, 12],
  ['bit operation', 'return a | 0;', 'read.operator', 3, 12],
  ['not', 'return !a;', 'read.operator', 3, 10],
  ['comparison as a number', 'return a < b;', 'read.comparison', 3, 12],
  ['equality', 'return a === b ? 1 : 2;', 'read.comparison', 3, 10],
  ['logic', 'return a < b && b < t ? 1 : 2;', 'read.comparison', 3, 10],
  ['string', "const x = 'a';\n  return a;", 'read.literal', 3, 13],
  ['boolean', 'const x = true;\n  return a;', 'read.literal', 3, 13],
  ['template', 'const x = `a${t}`;\n  return a;', 'read.literal', 3, 13],
  ['big integer', 'return 1n;', 'read.literal', 3, 10],
  ['number beyond float64', 'return 1e999;', 'read.literal', 3, 10],
  ['array', 'const x = [a, b];\n  return a;', 'read.array', 3, 13],
  ['array taken apart', 'const [x] = elements;\n  return a;', 'read.array', 3, 9],
  ['computed field', 'return elements[0];', 'read.property', 3, 10],
  ['optional chaining', 'return elements?.a;', 'read.property', 3, 10],
  ['unknown field', 'return elements.c;', 'read.unknown-field', 3, 10],
  ['field of a number', 'return a.b;', 'read.unknown-field', 3, 10],
  ['unknown name', 'return c;', 'read.unknown-name', 3, 10],
  ['Infinity', 'return Infinity;', 'read.unknown-name', 3, 10],
  ['arrow function', 'const f = () => a;\n  return a;', 'read.function-value', 3, 13],
  ['inner function', 'function f() { return 1; }\n  return a;', 'read.function-value', 3, 3],
  ['Math.pow', 'return Math.pow(a, b);', 'read.unknown-call', 3, 10],
  ['Math.random', 'return Math.random();', 'read.unknown-call', 3, 10],
  ['Math.E', 'return Math.E;', 'read.unknown-call', 3, 10],
  ['method call', 'return elements.a.toFixed(2);', 'read.unknown-call', 3, 10],
  ['unknown function', 'return f(a);', 'read.unknown-call', 3, 10],
  ['too few arguments', 'return Math.atan2(a);', 'read.arguments', 3, 10],
  ['spread', 'return Math.sqrt(...b);', 'read.arguments', 3, 20],
  ['type assertion', 'return a as number;', 'read.type-conversion', 3, 10],
  ['non-null assertion', 'return a!;', 'read.type-conversion', 3, 10],
  ['record as a number', 'return Math.sqrt(elements);', 'read.not-a-number', 3, 20],
  ['rest of a record', 'const { ...x } = elements;\n  return a;', 'read.record', 3, 11],
  ['default of a field', 'const { x = 1 } = elements;\n  return a;', 'read.record', 3, 11],
  ['spread in a record', 'const x = { ...elements };\n  return a;', 'read.record', 3, 15],
  ['throw', 'throw a;\n  return b;', 'read.statement', 3, 3],
  ['no return', 'const x = a;', 'read.return', 3, 3],
  ['early return', 'return a;\n  return b;', 'read.return', 3, 3],
];

describe('reading refuses what lies outside the numeric subset', () => {
  test.each(REFUSED)('%s', (_, body, code, line, column) => {
    const found = refusal(fileOf(body));
    expect({ code: found.code, line: found.line, column: found.column }).toEqual({ code, line, column });
    expect(found.what).not.toBe('');
  });

  test.each([
    ['recursion', 'return f(a);', 'function f(x: number): number { return f(x); }', 'read.recursion', 5],
    [
      'mutual recursion',
      'return f(a);',
      'function f(x: number): number { return g(x); }\nfunction g(x: number): number { return f(x); }',
      'read.recursion',
      6,
    ],
    [
      'default parameter',
      'return f(a);',
      'function f(x: number = 1): number { return x; }',
      'read.function-form',
      5,
    ],
    [
      'rest parameter',
      'return f(a);',
      'function f(...x: number[]): number { return 1; }',
      'read.function-form',
      5,
    ],
    ['async function', 'return f(a);', 'async function f(x: number) { return x; }', 'read.function-form', 5],
    ['generator', 'return f(a);', 'function* f(x: number) { return x; }', 'read.function-form', 5],
    ['mutable module binding', 'return k;', 'let k = 1;', 'read.mutable-binding', 3],
  ])('%s', (_, body, extra, code, line) => {
    expect(refusal(fileOf(body, extra))).toMatchObject({ code, line });
  });

  test('an import that leads nowhere', () => {
    expect(refusal(`import { f } from './nowhere.ts';\n${fileOf('return f(a);')}`)).toMatchObject({
      code: 'read.import',
      line: 1,
    });
  });

  test('a function that the description names and the file lacks', () => {
    expect(refusal('export const clock = 1;\n').code).toBe('read.missing-function');
  });

  test('another signature', () => {
    expect(refusal('export function clock(t: number): number { return t; }\n').code).toBe('read.signature');
  });

  test('a syntax error', () => {
    expect(refusal('export function clock( {')).toMatchObject({ code: 'read.syntax', line: 1 });
  });
});

describe('reading accepts', () => {
  test.each([
    [
      'conditional expressions with all four comparisons',
      'return (a < b ? 1 : a <= b ? 2 : a > b ? 3 : a >= b ? 4 : 5) * t;',
    ],
    ['constants of the module', 'return k * t;', 'const k = 1.5e-3;'],
    [
      'functions of the file',
      'return f(a, b) * earth.k;',
      'function f(x: number, y: number): number { const z = x * y; return z; }',
    ],
    ['Math.PI and grouping', 'return (((Math.PI))) * (a + b);'],
    ['renamed fields', 'const { a: x } = elements;\n  return x - b;'],
    ['numbers with separators', 'return 1_000.5 * t;'],
  ])('%s', (_, body, extra = '') => {
    expect(readModel(model, ['clock'], fileOf(body, extra)).outputs).toHaveLength(1);
  });
});
