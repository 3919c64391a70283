import { FROUND, STATE_WORDS } from './forms.ts';
import { Functions } from './functions.ts';
import { Lines } from './lines.ts';
import { literalOf } from './literal.ts';
import type { ParsedKernel } from './parsed.ts';
import { Values } from './values.ts';

/**
 * Parses the file of a kernel. Nothing is passed over but comments: every line has one of the forms of forms.ts, and
 * every name, number, place and status is accounted for.
 *
 * @param fileName the file, for messages
 * @param text its text
 * @throws InputError at the first thing that is not understood
 */
export function parseKernel(fileName: string, text: string): ParsedKernel {
  const lines = new Lines(fileName, text);
  const fround = lines.take(FROUND);
  const words = lines.demand(STATE_WORDS, 'parse.form', fround === undefined ? [FROUND] : []).filled[0]!;
  const values = new Values(lines, fround !== undefined);
  const functions = new Functions(lines, values);
  const setup = functions.setup();
  const position = functions.position(setup);
  lines.end();
  if (literalOf(lines, words) !== setup.state.length)
    lines.refuse(
      'parse.state-words',
      words,
      `stateWords is ${words.text}, setup fills ${setup.state.length} slots`,
    );
  if (fround !== undefined && values.list.every((line) => line.format === 'f64'))
    lines.refuse('parse.form', fround, 'fround stands where nothing is rounded to float32');
  return {
    lines: values.list,
    elements: setup.elements,
    time: position.time,
    state: setup.state,
    guard: setup.guard,
    outputs: position.outputs,
    ends: { setup: setup.end, tick: position.end },
  };
}
