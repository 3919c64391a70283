import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readLines } from '../../src/messages/text-lines.ts';
import { temporaryFile } from './temporary-file.ts';

async function linesOf(path: string): Promise<string[]> {
  const lines: string[] = [];
  for await (const batch of readLines(path)) lines.push(...batch);
  return lines;
}

describe('readLines', () => {
  it('joins lines and line ends that lie across chunks', async () => {
    const lines = Array.from({ length: 20000 }, (_, k) => 'x'.repeat(k % 97)); // about 1 MB
    for (const end of ['\n', '\r\n'])
      expect(await linesOf(temporaryFile(`${lines.join(end)}${end}`))).toEqual(lines);
  });

  it('tells the line of a fault beyond the first chunk', async () => {
    const start = `${'x'.repeat(79)}\n`.repeat(9999);
    await expect(linesOf(temporaryFile(`${start}\x00`))).rejects.toThrow(/:10000: file\.binary/);
    await expect(linesOf(temporaryFile(start + 'x'.repeat(513)))).rejects.toThrow(/:10000: file\.long-line/);
    expect(await linesOf(temporaryFile(start + 'x'.repeat(512)))).toHaveLength(10000);
  });

  it('gives back any lines of text', async () => {
    const character = fc.constantFrom(...' aZ09-.\té\x7f');
    const line = fc.string({ unit: character, maxLength: 100 });
    await fc.assert(
      fc.asyncProperty(fc.array(line, { minLength: 1, maxLength: 20 }), async (lines) => {
        expect(await linesOf(temporaryFile(`${lines.join('\n')}\n`))).toEqual(lines);
      }),
    );
  });
});
