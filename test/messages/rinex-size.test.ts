import { execFile } from 'node:child_process';
import { closeSync, openSync, readFileSync, writeSync } from 'node:fs';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';
import { header3 } from './rinex-text.ts';
import { temporaryFile } from './temporary-file.ts';

const MEGABYTE = 1e6;
const SIZE = 100 * MEGABYTE;

/** Reads a file in a process whose heap is too small for it, and tells how that went. */
const script = `
  const { readRinexNavigation } = await import('./src/messages/rinex/read.ts');
  const start = process.cpuUsage();
  let records = 0;
  let end = '';
  try {
    for await (const _ of readRinexNavigation(process.argv[1])) records++;
  } catch (error) {
    end = error.findings[0].code;
  }
  const { user, system } = process.cpuUsage(start);
  const seconds = (user + system) / 1e6;
  console.log(JSON.stringify({ records, end, seconds, peak: process.resourceUsage().maxRSS * 1024 }));
`;

async function readInSmallHeap(
  path: string,
): Promise<{ records: number; end: string; seconds: number; peak: number }> {
  const flags = ['--max-old-space-size=32', '--import', 'tsx', '--input-type=module', '--eval', script, path];
  const { stdout } = await promisify(execFile)(process.execPath, flags);
  return JSON.parse(stdout);
}

/** A file that starts with some text and goes on with copies of more text up to 100 MB. */
function largeFile(start: string, body: string): { path: string; copies: number } {
  const path = temporaryFile('');
  const file = openSync(path, 'w');
  writeSync(file, start, null, 'latin1');
  const copies = Math.ceil(SIZE / body.length);
  const together = Math.ceil(MEGABYTE / body.length);
  for (let done = 0; done < copies; done += together) {
    writeSync(file, body.repeat(Math.min(together, copies - done)), null, 'latin1');
  }
  closeSync(file);
  return { path, copies };
}

describe('files of 100 MB', () => {
  it('are read with bounded memory', async () => {
    const text = readFileSync('test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx', 'latin1');
    const split = text.indexOf('\n', text.indexOf('END OF HEADER')) + 1;
    const { path, copies } = largeFile(text.slice(0, split), text.slice(split));
    const { records, end, peak, seconds } = await readInSmallHeap(path);
    expect({ records, end }).toEqual({ records: copies * 156, end: '' });
    expect(peak).toBeLessThan(200 * MEGABYTE); // an idle process has about 90 MB
    expect(seconds).toBeLessThan(20); // of processor time; about 4 s on one core of a server
  });

  it.each([
    ['one line', `${header3.join('\n')}\n`, 'G', 'file.long-line'],
    ['bytes of no text', `${header3.join('\n')}\n`, '\x00\x01\x02\x03', 'file.binary'],
    ['a header that goes on', `${header3[0]}\n`, `${''.padEnd(60)}COMMENT\n`, 'rinex.header'],
  ])('are refused with bounded memory: %s', async (_, start, body, code) => {
    const { end, peak } = await readInSmallHeap(largeFile(start, body).path);
    expect(end).toBe(code);
    expect(peak).toBeLessThan(200 * MEGABYTE);
  });
});
