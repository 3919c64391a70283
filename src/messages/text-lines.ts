import { createReadStream } from 'node:fs';
import { InputError } from '../finding.ts';

/** The longest line that is taken for text. The formats read here have lines of 80 columns. */
const LONGEST_LINE = 512;

const CHUNK_BYTES = 1 << 18;

/** Anything but tab, line feed, carriage return and printing characters of any one-byte code. */
const NOT_TEXT = /[^\t\n\r\x20-\xff]/;

/**
 * Lines of a text file, in batches, without their line ends (LF or CR LF).
 *
 * Memory is bounded by one chunk and one line, whatever the size of the file: a longer line or a character
 * that no text has ends the reading. Bytes are taken as characters one by one, so that columns are columns of
 * bytes.
 *
 * @param path file to read
 * @throws InputError with code file.unreadable, file.empty, file.binary or file.long-line
 */
export async function* readLines(path: string): AsyncGenerator<readonly string[]> {
  const stream = createReadStream(path, { encoding: 'latin1', highWaterMark: CHUNK_BYTES });
  let count = 0;
  let rest = '';
  try {
    for await (const chunk of stream as AsyncIterable<string>) {
      if (NOT_TEXT.test(chunk)) throw binary(path, rest + chunk, count);
      const lines = (rest + chunk).split('\n');
      rest = lines.pop() ?? '';
      yield checked(lines, path, count);
      count += lines.length;
      checked([rest], path, count);
    }
  } catch (error) {
    throw error instanceof InputError ? error : unreadable(path, error);
  } finally {
    stream.destroy();
  }
  if (count === 0 && rest === '') throw empty(path);
  if (rest !== '') yield checked([rest], path, count);
}

/** The lines without carriage returns at their ends, none too long. */
function checked(lines: readonly string[], path: string, before: number): readonly string[] {
  return lines.map((line, index) => {
    if (line.length > LONGEST_LINE) throw longLine(path, before + index + 1);
    return line.endsWith('\r') ? line.slice(0, -1) : line;
  });
}

function unreadable(path: string, error: unknown): InputError {
  return new InputError({
    code: 'file.unreadable',
    place: { file: path },
    what: `the file cannot be read: ${error instanceof Error ? error.message : String(error)}`,
    why: 'The system refused it.',
    remedy: 'Check the name and the permissions.',
  });
}

function empty(path: string): InputError {
  return new InputError({
    code: 'file.empty',
    place: { file: path },
    what: 'the file is empty',
    why: 'Its writer or its transfer ended before the first byte.',
    remedy: 'Fetch or write the file again.',
  });
}

function binary(path: string, text: string, before: number): InputError {
  const column = text.search(NOT_TEXT);
  return new InputError({
    code: 'file.binary',
    place: { file: path, line: before + text.slice(0, column).split('\n').length },
    what: `byte ${text.charCodeAt(column)} has no place in a text file`,
    why: 'The file is binary or compressed.',
    remedy: 'Unpack it first if it is compressed.',
  });
}

function longLine(path: string, line: number): InputError {
  return new InputError({
    code: 'file.long-line',
    place: { file: path, line },
    what: `the line is longer than ${LONGEST_LINE} characters`,
    why: 'Files of this kind have lines of 80 columns.',
    remedy: 'Check that the file is what its name says and that its line ends were not lost.',
  });
}
