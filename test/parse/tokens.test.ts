import { describe, expect, test } from 'vitest';
import { tokensOf } from '../../codegen/parse/tokens.ts';
import { findingsOf } from './findings.ts';
import { float32, float64, mixed, type Sample } from './samples.ts';

const SAMPLES: readonly (readonly [string, Sample])[] = [
  ['float64', float64],
  ['float32', float32],
  ['mixed', mixed],
];

/** Where every token of a text starts and ends. */
function spansOf(text: string): readonly (readonly [start: number, end: number])[] {
  const starts = [0, ...[...text.matchAll(/\n/g)].map((match) => match.index + 1)];
  return tokensOf(text).map((token) => {
    const start = starts[token.line - 1]! + token.column - 1;
    return [start, start + token.text.length];
  });
}

/** What a text says, whatever its white space, comments and forms of numbers. */
function meaning(text: string): string {
  return tokensOf(text)
    .map((token) => (token.kind === 'number' ? Number(token.text) : token.text))
    .join(' ');
}

describe.each(SAMPLES)('%s: nothing of a file is passed over', (_, { text, kernel }) => {
  const spans = spansOf(text);

  /** Changed texts in which nothing is found, but for those that say the same. */
  const passed = (changes: readonly string[]) =>
    changes.filter(
      (changed) => findingsOf(changed, kernel).length === 0 && meaning(changed) !== meaning(text),
    );

  test('every token is missed', () => {
    expect(passed(spans.map(([start, end]) => text.slice(0, start) + text.slice(end)))).toEqual([]);
  });

  test('no token can stand twice', () => {
    expect(passed(spans.map(([start, end]) => `${text.slice(0, end)} ${text.slice(start)}`))).toEqual([]);
  });

  test.each(['0', ';', 't'])('no token can be %s in place of itself', (other) => {
    expect(
      passed(spans.map(([start, end]) => `${text.slice(0, start)} ${other} ${text.slice(end)}`)),
    ).toEqual([]);
  });

  test('every character is missed', () => {
    const places = spans.flatMap(([start, end]) => Array.from({ length: end - start }, (_, k) => start + k));
    expect(passed(places.map((at) => text.slice(0, at) + text.slice(at + 1)))).toEqual([]);
  });
});

// ECMA-262, Lexical Grammar: what is white space, a line end, a comment and a punctuator.
test.each([
  ['a>=b>c', ['a', '>=', 'b', '>', 'c']],
  ['a---b', ['a', '--', '-', 'b']],
  ['a===b==c=d', ['a', '===', 'b', '==', 'c', '=', 'd']],
  ['a/*/b*/c//d', ['a', 'c']],
  ['a\u2028//b\u2029c\u00a0\ufeffd\r\ne\rf', ['a', 'c', 'd', 'e', 'f']],
  ['.5e+3.x', ['.5e+3', '.', 'x']],
  ['a?.b?.5', ['a', '?.', 'b', '?', '.5']],
])('%j has the tokens of the language', (text, expected) => {
  expect(tokensOf(text).map((token) => token.text)).toEqual(expected);
});

test('places count every line end of the language once', () => {
  const places = tokensOf('a\r\n b\rc\u2028 d\n\n  e /*\n*/ f').map(({ text, line, column }) => [
    text,
    line,
    column,
  ]);
  expect(places).toEqual([
    ['a', 1, 1],
    ['b', 2, 2],
    ['c', 3, 1],
    ['d', 4, 2],
    ['e', 6, 3],
    ['f', 7, 4],
  ]);
});
