import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import { fromCounts, type OperationKind } from '../../codegen/inspect/operations.ts';

/** One generated line: its text, given the names of its result and of two earlier values, and what it counts. */
interface Line {
  readonly text: (result: string, a: string, b: string) => string;
  readonly counts: Partial<Record<OperationKind, number>>;
}

const lines: readonly Line[] = [
  { text: (x, a, b) => `const ${x} = fround(${a} + ${b});`, counts: { add: 1, round: 1 } },
  { text: (x, a, b) => `const ${x} = fround(${a} - ${b});`, counts: { sub: 1, round: 1 } },
  { text: (x, a, b) => `const ${x} = fround(${a} * ${b});`, counts: { mul: 1, round: 1 } },
  { text: (x, a, b) => `const ${x} = fround(${a} / ${b});`, counts: { div: 1, round: 1 } },
  { text: (x, a) => `const ${x} = fround(Math.sqrt(${a}));`, counts: { sqrt: 1, round: 1 } },
  { text: (x, a) => `const ${x} = fround(${a} * -2.5);`, counts: { mul: 1, round: 1 } },
  { text: (x, a) => `const ${x} = -${a};`, counts: { neg: 1 } },
  { text: (x, a) => `const ${x} = Math.abs(${a});`, counts: { abs: 1 } },
  { text: (x, a) => `const ${x} = Math.floor(${a});`, counts: { floor: 1 } },
  { text: (x, a, b) => `const ${x} = ${a} <= ${b} ? ${b} : ${a};`, counts: { compare: 1, select: 1 } },
  { text: (x) => `const ${x} = state[7];`, counts: { load: 1 } },
  { text: (x, a) => `out[2] = ${a}; const ${x} = ${a};`, counts: { store: 1 } },
];

/** The lines of a kernel's body after its head; line n stands in line n + 8 of the file. */
const body = fc
  .array(fc.tuple(fc.constantFrom(...lines), fc.nat(), fc.nat()), { maxLength: 60 })
  .map((choices) =>
    choices.map(([line, first, second], index) => ({
      // x0 is the head's value; line number `index` makes the next one and reads any before it
      text: `  ${line.text(`x${index + 1}`, `x${first % (index + 1)}`, `x${second % (index + 1)}`)}`,
      counts: line.counts,
    })),
  );

const head = [
  'const fround = Math.fround;',
  '/**',
  ' * @param {number} t',
  ' * @param {Float32Array} state',
  ' * @param {Float32Array} out',
  ' */',
  'export function position(t, state, out) {',
  '  const x0 = fround(t);',
];

function kernel(statements: readonly string[]): string {
  return [...head, ...statements, '  return 0;', '}', ''].join('\n');
}

describe('straight-line kernels', () => {
  it('have no findings and the counts of their lines', () => {
    fc.assert(
      fc.property(body, (made) => {
        const inspected = inspectSource('made.js', kernel(made.map(({ text }) => text)), {
          float32: ['position'],
        });
        const expected: Partial<Record<OperationKind, number>> = { round: 1 };
        for (const { counts } of made) {
          for (const [kind, count] of Object.entries(counts) as [OperationKind, number][]) {
            expected[kind] = (expected[kind] ?? 0) + count;
          }
        }
        expect(inspected.findings).toEqual([]);
        expect(inspected.functions).toMatchObject([{ operations: fromCounts(expected), complete: true }]);
      }),
      { numRuns: 200 },
    );
  });

  const faults: readonly (readonly [statement: string, column: number, code: string])[] = [
    ['const bad = { t };', 15, 'object-literal'],
    ['const bad = fround(t * x0);', 22, 'float32-operand'],
    ['const bad = x0 * x0;', 18, 'float32-unrounded'],
    ['const bad = 0.1;', 15, 'float32-literal'],
    ['while (x0 < 1) out[0] = x0;', 3, 'unbounded-loop'],
    ['const bad = Math.cos(x0);', 20, 'engine-function'],
    ['const bad = x0 == t;', 18, 'loose-equality'],
    ["const bad = 'x' + x0;", 19, 'string-building'],
    ['throw x0;', 3, 'exception'],
    ['const bad = position(t, state, out);', 15, 'recursion'],
    ['for (let x0 = 0; x0 < 2; x0++) out[x0] = 0;', 12, 'shadowed-name'],
  ];

  it('show one fault put into them, where it stands and nothing else', () => {
    fc.assert(
      fc.property(body, fc.nat(), fc.constantFrom(...faults), (made, where, [statement, column, code]) => {
        const place = where % (made.length + 1);
        const statements = made.map(({ text }) => text);
        statements.splice(place, 0, `  ${statement}`);
        const { findings } = inspectSource('made.js', kernel(statements), { float32: ['position'] });
        expect(findings).toMatchObject([
          { code: `inspect.${code}`, place: { line: head.length + place + 1, column } },
        ]);
      }),
      { numRuns: 300 },
    );
  });
});
