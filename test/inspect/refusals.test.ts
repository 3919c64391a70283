import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inspectFile, inspectSource } from '../../codegen/inspect/inspection.ts';
import { type Finding, InputError } from '../../src/finding.ts';

let folder = '';
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'inspect-'));
});
afterAll(() => rmSync(folder, { recursive: true }));

function refusalOf(run: () => unknown): readonly Finding[] {
  try {
    run();
  } catch (error) {
    if (error instanceof InputError) return error.findings;
    throw error;
  }
  return [];
}

describe('files that cannot be inspected', () => {
  it.each([
    ['binary.js', Buffer.from([0x61, 0, 0x62]), 'inspect.binary-file'],
    ['latin1.js', Buffer.from([0x2f, 0x2f, 0xe9]), 'inspect.binary-file'],
    ['huge.js', Buffer.alloc(4 * 1024 * 1024 + 1, ' '), 'inspect.huge-file'],
    ['data.json', Buffer.from('{}'), 'inspect.language'],
    ['broken.ts', Buffer.from('const a = ;'), 'inspect.syntax'],
  ])('%s', (name, content, code) => {
    const path = join(folder, name);
    writeFileSync(path, content);
    expect(refusalOf(() => inspectFile(path))).toMatchObject([{ code, place: { file: path } }]);
  });

  it('a missing file, and a folder', () => {
    expect(refusalOf(() => inspectFile(join(folder, 'none.js')))).toMatchObject([
      { code: 'inspect.missing-file' },
    ]);
    expect(refusalOf(() => inspectFile(folder))).toMatchObject([{ code: 'inspect.unreadable-file' }]);
  });

  it('takes files up to the limit, with a byte order mark, and empty ones', () => {
    for (const [name, content] of [
      ['large.js', Buffer.alloc(4 * 1024 * 1024, ' ')],
      ['mark.js', Buffer.from('\ufeffexport const f = () => [];')],
      ['empty.ts', Buffer.alloc(0)],
    ] as const) {
      writeFileSync(join(folder, name), content);
      expect(refusalOf(() => inspectFile(join(folder, name)))).toEqual([]);
    }
    expect(inspectFile(join(folder, 'mark.js')).findings).toMatchObject([{ place: { line: 1, column: 24 } }]);
  });
});

describe('texts that cannot be inspected', () => {
  it('names every syntax error with its place', () => {
    const found = refusalOf(() => inspectSource('two.ts', 'const a = 1;\n  let = ;\nconst b = );'));
    expect(found.length).toBeGreaterThan(1);
    expect(found.every(({ code }) => code === 'inspect.syntax')).toBe(true);
    expect(found.map(({ place }) => place.line)).toEqual(expect.arrayContaining([2, 3]));
  });

  it('refuses types in JavaScript', () => {
    const found = refusalOf(() => inspectSource('typed.js', 'export const f = (x: number) => x;'));
    expect(found).toMatchObject([
      { code: 'inspect.syntax', place: { file: 'typed.js', line: 1, column: 22 } },
    ]);
  });

  it.each([
    ['parentheses', `export const a = ${'('.repeat(50_000)}1${')'.repeat(50_000)};`],
    ['a sum', `export const f = (a) => ${'a + '.repeat(50_000)}a;`],
  ])('refuses nesting without end: %s', (_, text) => {
    expect(refusalOf(() => inspectSource('deep.js', text))).toMatchObject([{ code: 'inspect.nesting' }]);
  });

  it('refuses a float32 function that the text does not have', () => {
    const run = () => inspectSource('k.js', 'export function f() {}', { float32: ['f', 'g'] });
    expect(refusalOf(run)).toMatchObject([{ code: 'inspect.unknown-function', place: { file: 'k.js' } }]);
  });

  it.each([
    ['const a = b; const b = a; function f() { a(); return a[b]; }'],
    ['const { a } = a; function f() { a(); }'],
    ['const { a } = b, { b } = a; function f() { a(); }'],
    ['const a = a; function f() { for (let i = a; i < a; i += a) a; }'],
  ])('ends with names that refer to themselves: %s', (text) => {
    expect(inspectSource('circle.js', text).functions).toHaveLength(1);
  });
});
