import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

const root = fileURLToPath(new URL('..', import.meta.url));

/** Rooms of codegen from left to right; rooms of one row know nothing of each other. */
const ROWS: readonly (readonly string[])[] = [
  ['numbers', 'files'],
  ['formula'],
  ['read', 'kernel'],
  ['approximate'],
  ['lower'],
  ['emit', 'cost', 'observe', 'inspect', 'parse', 'bound'],
  ['choose'],
  ['certificate'],
  ['command'],
];

function filesOf(folder: string): readonly string[] {
  return readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts'))
    .map((name) => join(folder, name));
}

/** Relative imports of a file as paths from the root. */
function importsOf(file: string): readonly string[] {
  const text = readFileSync(join(root, file), 'utf8');
  return [...text.matchAll(/(?:from|import)\s*\(?\s*'(\.[^']+)'/g)].map((match) =>
    relative(root, resolve(root, dirname(file), match[1]!)),
  );
}

describe('rooms', () => {
  test('every room of codegen has its place', () => {
    const rooms = new Set(filesOf('codegen').map((file) => file.split('/')[1]));
    expect([...rooms].sort()).toEqual(ROWS.flat().sort());
  });

  test('inside codegen a room imports only rooms left of it', () => {
    const place = (room: string) => ROWS.findIndex((row) => row.includes(room));
    const wrong = filesOf('codegen').flatMap((file) => {
      const room = file.split('/')[1]!;
      return importsOf(file)
        .filter((target) => target.startsWith('codegen/'))
        .filter((target) => target.split('/')[1] !== room && place(target.split('/')[1]!) >= place(room))
        .map((target) => `${file} -> ${target}`);
    });
    expect(wrong).toEqual([]);
  });

  test('src knows nothing of codegen, bench and test; codegen nothing of bench and test', () => {
    const wrong = [...filesOf('src'), ...filesOf('codegen')].flatMap((file) =>
      importsOf(file)
        .filter(
          (target) =>
            /^(bench|test)\//.test(target) || (file.startsWith('src') && target.startsWith('codegen')),
        )
        .map((target) => `${file} -> ${target}`),
    );
    expect(wrong).toEqual([]);
  });

  test('inspection is independent of the generator', () => {
    expect(
      filesOf('codegen/inspect')
        .flatMap(importsOf)
        .filter((target) => /^codegen\/(?!inspect\/)/.test(target)),
    ).toEqual([]);
  });

  test('no file is crowded', () => {
    const long = [...filesOf('src'), ...filesOf('codegen')].filter(
      (file) => readFileSync(join(root, file), 'utf8').split('\n').length > 400,
    );
    expect(long).toEqual([]);
  });
});
