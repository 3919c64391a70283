import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import type { Finding } from '../../src/finding.ts';
import { readSeeded } from './seeded.ts';

const cases = readSeeded('cases');

function placeAndCode({ place, code }: Finding): string {
  return `${place.line}:${place.column} ${code}`;
}

describe.each(cases)('$file', ({ file, text, expected }) => {
  const float32 = file.startsWith('float32') ? ['kernel'] : [];
  const found = inspectSource(file, text, { float32 }).findings.map(placeAndCode);

  it.each(expected)('reports %s', (fault) => {
    expect(found).toContain(fault);
  });

  it('reports nothing else', () => {
    expect(found.filter((finding) => !expected.includes(finding))).toEqual([]);
  });
});

describe('source that the settings of this project refuse', () => {
  it.each([
    ['an element', 'view.tsx', 'export const once = <i />;\nexport const view = (n) => <b>{n}</b>;', '2:28'],
    ['an empty element', 'view.jsx', 'export const once = <i />;\nexport const view = () => <b />;', '2:27'],
    ['an enum', 'kind.ts', 'enum A { B }\nfunction f() {\n  enum C { D }\n  return C.D === A.B;\n}', '3:3'],
  ])('%s is an object', (_, file, text, place) => {
    expect(inspectSource(file, text).findings.map(placeAndCode)).toEqual([`${place} inspect.object-literal`]);
  });
});

describe('messages', () => {
  it('tell direct recursion from mutual', () => {
    const text = 'function a() { a(); }\nfunction b() { c(); }\nfunction c() { b(); }';
    expect(inspectSource('circle.js', text).findings.map(({ what }) => what)).toEqual([
      'a calls itself',
      'b calls c, which leads back to it',
      'c calls b, which leads back to it',
    ]);
  });
});

describe('case files', () => {
  it('seed at least one fault each, but for the clean ones', () => {
    const unseeded = cases.filter(({ expected }) => expected.length === 0).map(({ file }) => file);
    expect(unseeded.every((file) => file.startsWith('clean-'))).toBe(true);
  });

  it('seed every rule', () => {
    const folder = fileURLToPath(new URL('../../codegen/inspect/', import.meta.url));
    const rules = readdirSync(folder).flatMap((file) =>
      [...readFileSync(`${folder}${file}`, 'utf8').matchAll(/: Rule = \{\s*code: '(.*)'/g)].map(
        (match) => match[1],
      ),
    );
    const seeded = new Set(cases.flatMap(({ expected }) => expected.map((fault) => fault.split(' ')[1])));
    expect(rules.length).toBeGreaterThan(30);
    expect([...seeded].sort()).toEqual(rules.sort());
  });
});
