import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { recheck } from '../../codegen/certificate/recheck.ts';
import { InputError } from '../../src/finding.ts';

const source = fileURLToPath(new URL('../../generated/tide-gauge', import.meta.url));
let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'recheck-'));
  cpSync(source, folder, { recursive: true });
});
afterEach(() => rmSync(folder, { recursive: true }));

function edit(name: string, change: (text: string) => string): void {
  const path = join(folder, name);
  const text = readFileSync(path, 'utf8');
  expect(change(text)).not.toBe(text);
  writeFileSync(path, change(text));
}

describe('recheck names what was changed', () => {
  test('nothing in an untouched folder', async () => {
    const { findings, proofs } = await recheck(folder);
    expect(findings).toEqual([]);
    expect(proofs.map((proof) => proof.group)).toEqual(['position']);
  });

  test('a coefficient changed by one unit in its last place, with its line', async () => {
    edit('kernel.js', (text) => text.replace('0.041666666666666664', '0.04166666666666667'));
    const { findings, proofs } = await recheck(folder);
    const line =
      readFileSync(join(source, 'kernel.js'), 'utf8')
        .split('\n')
        .findIndex((text) => text.includes('0.041666666666666664')) + 1;
    expect(findings[0]).toMatchObject({ code: 'parse.other-constant', place: { line } });
    expect(findings.map((finding) => finding.what).join()).toContain('digest.kernel');
    const stated = JSON.parse(readFileSync(join(source, 'certificate.json'), 'utf8')) as {
      error: { position_m: { certified: number } };
    };
    // the bound is that of the file's own coefficient
    expect(proofs[0]!.bound).not.toBe(stated.error.position_m.certified);
    expect(proofs[0]!.bound).toBeLessThan(2 * stated.error.position_m.certified);
  });

  test('a changed comment, though it computes the same', async () => {
    edit('kernel.js', (text) =>
      text.replace('Not certified for safety of life', 'Certified for safety of life'),
    );
    expect((await recheck(folder)).findings[0]).toMatchObject({ code: 'recheck.code' });
  });

  test('a line that the emitted form does not know', async () => {
    edit('kernel.js', (text) => text.replace('  return 0;', '  Math.random();\n  return 0;'));
    const { findings, proofs } = await recheck(folder);
    expect(findings).toContainEqual(expect.objectContaining({ code: expect.stringMatching(/^parse\./) }));
    expect(proofs).toEqual([]); // of other lines there is nothing to prove
  });

  test('a smaller observed error', async () => {
    edit('certificate.json', (text) => text.replace(/"observed": [^,]+/, '"observed": 1e-9'));
    expect((await recheck(folder)).findings.map((finding) => finding.what).join()).toContain(
      'the observed error of position',
    );
  });

  test('a smaller certified error that reads the same in the doc block', async () => {
    edit('certificate.json', (text) =>
      text.replace(/"certified": ([^,]+)/, (_, value) => `"certified": ${Number(value) * 0.9999}`),
    );
    const { findings } = await recheck(folder);
    expect(findings).toHaveLength(1);
    expect(findings[0]!.what).toMatch(
      /^position: certified is stated as 2\.\d*e-7 and found to be 2\.\d*e-7/,
    );
  });

  test('a smaller certified error, in the doc block too', async () => {
    edit('certificate.json', (text) => text.replace(/"certified": [^,]+/, '"certified": 2.1e-7'));
    edit('kernel.js', (text) => text.replace(/at most [\d.e-]+/, 'at most 2.10e-7'));
    expect((await recheck(folder)).findings).not.toEqual([]);
  });

  test.each([
    ['operations', /"total": \d+/, '"total": 1'],
    ['state', /"words": \d+/, '"words": 2'],
    ['digest.model', /"model": "[0-9a-f]{64}"/, '"model": "0"'],
    ['digest.outputs', /"outputs": "[0-9a-f]+"/, '"outputs": "0"'],
    ['domain.ranges', /"max": 5160/, '"max": 5161'],
  ])('%s', async (name, pattern, text) => {
    edit('certificate.json', (old) => old.replace(pattern, text));
    expect((await recheck(folder)).findings.map((finding) => finding.what).join()).toContain(name);
  });

  test('a worst input that was made harmless', async () => {
    edit('worst.json', (text) => text.replace(/"t": -?[\d.e-]+/, '"t": 0'));
    expect((await recheck(folder)).findings.map((finding) => finding.what).join()).toContain(
      'worst input 0 of position',
    );
  });

  test.each(['kernel.js', 'certificate.json', 'worst.json'])('a missing %s is wrong input', async (name) => {
    rmSync(join(folder, name));
    await expect(recheck(folder)).rejects.toThrow(InputError);
  });

  test('a truncated certificate is wrong input', async () => {
    edit('certificate.json', (text) => text.slice(0, 500));
    await expect(recheck(folder)).rejects.toThrow(/recheck\.syntax/);
  });
});
