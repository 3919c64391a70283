import { describe, expect, it } from 'vitest';
import { type InspectedFunction, inspectSource } from '../../codegen/inspect/inspection.ts';
import { fromCounts, type OperationKind } from '../../codegen/inspect/operations.ts';

type Counts = Partial<Record<OperationKind, number>>;

function functionsOf(text: string): readonly InspectedFunction[] {
  return inspectSource('counted.ts', text).functions;
}

/** Statements of a function body, and the operations of their worst path, counted by hand. */
const bodies: readonly (readonly [statements: string, counts: Counts])[] = [
  ['return 0;', {}],
  ['return a + b - a * b / a;', { add: 1, sub: 1, mul: 1, div: 1 }],
  ['return -a;', { neg: 1 }],
  ['return -1;', {}],
  ['return -(1);', {}],
  ['return a - -1;', { sub: 1 }],
  ['return Math.sqrt(a) + Math.abs(b) - Math.floor(a);', { sqrt: 1, abs: 1, floor: 1, add: 1, sub: 1 }],
  ['return fround(fround(a) * b);', { round: 2, mul: 1 }],
  ['return a < b ? a : -b;', { compare: 1, select: 1, neg: 1 }],
  ['return a < b ? a * b : -b;', { compare: 1, select: 1, mul: 1 }],
  ['return !(a >= 1 && b <= 2) || a === 3;', { compare: 3 }],
  ['p[0] = p[1];', { load: 1, store: 1 }],
  ['p[0] += p[1];', { load: 2, store: 1, add: 1 }],
  ['p.x = a;', { store: 1 }],
  ['p[0]++;', { load: 1, store: 1, add: 1 }],
  ['const { x, y: { z } } = q; return x + z;', { load: 3, add: 1 }],
  ['return q.x.y;', { load: 2 }],
  ['let c = a; c *= b; c -= 1; return c;', { mul: 1, sub: 1 }],
  ['return (a + b) as number;', { add: 1 }],
  // An early return ends its path: 1 comparison and 2 additions are worse than 1 comparison and 1 product.
  ['if (a < 0) return a + b + a; return a * b;', { compare: 1, add: 2 }],
  ['if (a < 0) return a + b; return a * b / a * b;', { compare: 1, mul: 2, div: 1 }],
  // The branch without code is the better one.
  ['let c = a; if (a < 0) c = -a; return c * c;', { compare: 1, neg: 1, mul: 1 }],
  ['if (a < 0) { return 1; } else { return 2; } return a * b;', { compare: 1 }],
  // Equal totals: more loads and stores decide, then more roundings, then the first.
  ['if (a < 0) return a * b; return a + p[0];', { compare: 1, add: 1, load: 1 }],
  ['if (a < 0) return fround(a * b); return a + b;', { compare: 1, mul: 1, round: 1 }],
  ['if (a < 0) return a * b; return a + b;', { compare: 1, mul: 1 }],
  // Total before loads: two additions outweigh any number of loads.
  ['if (a < 0) return a + b + a; return p[0] + p[1];', { compare: 1, add: 2 }],
  // Four rounds: the test runs five times, the step four times.
  ['for (let i = 0; i < 4; i++) p[i] = a * b;', { compare: 5, add: 4, mul: 4, store: 4 }],
  ['for (let i = 6; i >= 0; i -= 3) p[i] = -a;', { compare: 4, sub: 3, neg: 3, store: 3 }],
  ['for (let i = 0; i <= 7; i += 2) p[i] = -a;', { compare: 5, add: 4, neg: 4, store: 4 }],
  ['for (let i = 3; i > 0; --i) p[i] = -a;', { compare: 4, sub: 3, neg: 3, store: 3 }],
  ['for (let i = 3; 0 < i; i = i - 2) p[i] = -a;', { compare: 3, sub: 2, neg: 2, store: 2 }],
  ['for (let i = 0; 4 >= i; i += 1) p[i] = -a;', { compare: 6, add: 5, neg: 5, store: 5 }],
  ['for (let i = 0; i < 7; ++i) p[i] = -a;', { compare: 8, add: 7, neg: 7, store: 7 }],
  ['for (let i = 0; i < 0; i++) p[i] = a * b;', { compare: 1 }],
  [
    'for (let i = 0; i < 2; i++) for (let j = 0; j < 3; j++) p[j] = a * b;',
    { compare: 11, add: 8, mul: 6, store: 6 },
  ],
  // Leaving in the last round is as bad as can be: 3 rounds of comparisons, 3 tests, 2 steps, then 3 products.
  ['for (let i = 0; i < 3; i++) if (a < b) return a * b * a * b;', { compare: 6, add: 2, mul: 3 }],
  // As bad one way as the other, the loop that runs out is taken.
  ['for (let i = 0; i < 3; i++) if (a < b) return a * b * a;', { compare: 7, add: 3 }],
  [
    'for (let i = 0; i < 3; i++) { if (a < b) continue; p[i] = a * b; }',
    { compare: 7, add: 3, mul: 3, store: 3 },
  ],
  ['for (let i = 0; i < 3; i++) { p[0] = -a; break; }', { compare: 1, neg: 1, store: 1 }],
  [
    'outer: for (let i = 0; i < 2; i++) for (let j = 0; j < 2; j++) { if (a < j) continue outer; p[0] = -a; }',
    // inner, run out: 3 tests + 2 comparisons + 2 steps + 2 negations = 9, worse than the jump out of round two
    { compare: 3 + 2 * 5, add: 2 + 2 * 2, neg: 4, store: 4 },
  ],
  // A switch compares until a case fits, then runs on to the break.
  [
    'switch (a) { case 1: p[0] = a * b; case 2: p[1] = a + b; break; case 3: p[2] = -a; } return 0;',
    { compare: 3, neg: 1, store: 1 },
  ],
  [
    'switch (a) { case 1: p[0] = a * b / a; case 2: p[1] = a + b; break; default: p[2] = a; } return 0;',
    { compare: 1, mul: 1, div: 1, add: 1, store: 2 },
  ],
  ['done: { if (a < 0) break done; p[0] = -a; } p[1] = a;', { compare: 1, neg: 1, store: 2 }],
  // Own functions add their counts; twice is 2 products and 1 sum.
  ['return twice(a) - b;', { mul: 2, add: 1, sub: 1 }],
  ['return twice(twice(a));', { mul: 4, add: 2 }],
  ['for (let i = 0; i < 2; i++) p[i] = twice(a);', { compare: 3, add: 2 + 2, mul: 4, store: 2 }],
];

const frame = (statements: string): string => `
  const { fround } = Math;
  const twice = (x: number): number => 2 * x + 2 * x;
  export function counted(a: number, b: number, p: any, q: any) { ${statements} }
`;

describe('operations on the worst path', () => {
  it.each(bodies)('%s', (statements, counts) => {
    const counted = functionsOf(frame(statements)).find(({ name }) => name === 'counted');
    expect(counted).toMatchObject({ operations: fromCounts(counts), complete: true });
  });

  it('total is arithmetic, comparisons and selections, without round, load and store', () => {
    const one = Object.fromEntries(
      [
        'add',
        'sub',
        'mul',
        'div',
        'neg',
        'sqrt',
        'abs',
        'floor',
        'compare',
        'select',
        'round',
        'load',
        'store',
      ].map((kind) => [kind, 1]),
    );
    expect(fromCounts(one).total).toBe(10);
  });
});

describe('functions without a worst case', () => {
  it.each([
    'while (a > 0) p[0] = a;',
    'for (let i = 0; i < a; i++) p[i] = a;',
    'return counted(a - 1, b, p, q);',
    'return endless(a);',
  ])('%s', (statements) => {
    const text = `${frame(statements)} function endless(x: number) { for (;;) x = x + 1; }`;
    expect(functionsOf(text).find(({ name }) => name === 'counted')?.operations).toBeNull();
  });
});

describe('counts that are a lower bound', () => {
  it.each([
    'return Math.sin(a);',
    'return p.map(a);',
    'return { a };',
    'return a % b;',
    'throw a;',
    'return sine(a);',
    'const [x] = p; return x;',
    'const { x, ...y } = q; return x === y;',
    'return "n" + a;',
    'return 2n * 3n;',
    'using x = p; return x;',
  ])('%s', (statements) => {
    const text = `${frame(statements)} function sine(x: number) { return Math.sin(x); }`;
    expect(functionsOf(text).find(({ name }) => name === 'counted')).toMatchObject({ complete: false });
  });
});

describe('what is only created', () => {
  it.each([
    'return () => a + b;',
    'return p.x === a ? class { m() { return a + b; } } : 0;',
    'p(function () { -a; });',
  ])('does not run: %s', (statements) => {
    const counted = functionsOf(frame(statements)).find(({ name }) => name === 'counted');
    expect(counted).toMatchObject({ complete: false, operations: { add: 0, neg: 0 } });
  });

  it.each(['async function f() {}', 'function* f() {}', 'function f(...x) {}'])(
    'makes a lower bound: %s',
    (text) => {
      expect(functionsOf(text)).toMatchObject([{ complete: false }]);
    },
  );
});

describe('functions', () => {
  const listed = (file: string, text: string): readonly (readonly [string, boolean, number])[] =>
    inspectSource(file, text).functions.map(({ name, exported, line }) => [name, exported, line]);

  it('are named with what is around them, with line and export', () => {
    const text = [
      'export function make(k) {',
      '  const step = (x) => k * x;',
      '  return step;',
      '}',
      'function hidden() {}',
      'const named = function () {};',
      'class Filter {',
      '  constructor() {}',
      '  run() {}',
      '}',
      'export { named as other };',
      'export default () => 1;',
    ].join('\n');
    expect(listed('names.js', text)).toEqual([
      ['make', true, 1],
      ['make.step', false, 2],
      ['hidden', false, 5],
      ['named', true, 6],
      ['Filter.constructor', false, 8],
      ['Filter.run', false, 9],
      ['default', true, 12],
    ]);
  });

  it.each([
    ['exports.first = function () {}; function second() {}'],
    ['module.exports = { first() {} }; function second() {}'],
    ['function first() {} function second() {} module.exports = { first };'],
    ['function first() {} function second() {} module.exports.one = first;'],
  ])('know the exports of a CommonJS file: %s', (text) => {
    expect(listed('common.cjs', text)).toEqual([
      ['first', true, 1],
      ['second', false, 1],
    ]);
  });
});
