import { InputError } from '../../src/finding.ts';
import type { Mark } from './parsed.ts';

/** Stable codes of everything that parsing can refuse. */
export type RefusalCode =
  | 'parse.form'
  | 'parse.name'
  | 'parse.undefined-name'
  | 'parse.literal'
  | 'parse.float32'
  | 'parse.check'
  | 'parse.status'
  | 'parse.guard'
  | 'parse.index'
  | 'parse.state-words';

const WHY: Readonly<Record<RefusalCode, string>> = {
  'parse.form': 'The proof speaks only of a file whose every line has one of the forms that are emitted.',
  'parse.name': 'A name must stand for one value in its whole function.',
  'parse.undefined-name': 'A line can use only what stands above it in the same function.',
  'parse.literal': 'A number must mean the same bits on every engine.',
  'parse.float32': 'An operation rounded to float32 is one float32 operation only on float32 numbers.',
  'parse.check': 'The proof holds inside the ranges, so every input must be checked before it is used.',
  'parse.status': 'A caller tells good values from void ones by the status alone.',
  'parse.guard': 'A state that setup did not fill must be found before it is used.',
  'parse.index':
    'Arrays are written and read in order, each place once, so that no value is lost or written over.',
  'parse.state-words': 'A caller makes the state array as long as the file says.',
};

/** The error for a place in a kernel's file. */
export function refuse(code: RefusalCode, file: string, { line, column }: Mark, what: string): never {
  throw new InputError({
    code,
    place: { file, line, column },
    what,
    why: WHY[code],
    remedy: 'Generate the file again, or find out who changed it.',
  });
}
