import { ts } from 'ts-morph';
import type { Mark } from './parsed.ts';

/**
 * What a token can stand for. `name` can name a value of a module, `word` is kept by the language, `other` is all
 * that no emitted file holds, faulty tokens too.
 */
export type TokenKind = 'name' | 'word' | 'number' | 'sign' | 'other';

/** One token of ECMAScript; white space and comments are none. */
export interface Token extends Mark {
  readonly text: string;
  readonly kind: TokenKind;
}

/**
 * Splits a text into tokens. Regular expressions and templates are not told from divisions and signs: no emitted line
 * has a place for either, so the first token of one already fits nowhere.
 */
export function tokensOf(text: string): readonly Token[] {
  let faulty = false;
  const scanner = ts.createScanner(ts.ScriptTarget.ESNext, true, ts.LanguageVariant.Standard, text, () => {
    faulty = true;
  });
  const tokens: Token[] = [];
  const markAt = marker(text);
  for (let kind = scanner.scan(); kind !== ts.SyntaxKind.EndOfFileToken; kind = scanner.scan()) {
    if (kind === ts.SyntaxKind.GreaterThanToken) kind = scanner.reScanGreaterToken();
    const token = scanner.getTokenText();
    tokens.push({
      text: token,
      kind: faulty ? 'other' : kindOf(kind, token),
      ...markAt(scanner.getTokenStart()),
    });
    faulty = false;
  }
  if (faulty) tokens.push({ text: 'the end of the file', kind: 'other', ...markAt(text.length) });
  return tokens;
}

/** Words that only strict code and modules keep, beside those that the scanner knows. */
const KEPT: ReadonlySet<string> = new Set(['arguments', 'await', 'eval']);

function kindOf(kind: ts.SyntaxKind, text: string): TokenKind {
  if (kind === ts.SyntaxKind.NumericLiteral) return 'number';
  if (kind >= ts.SyntaxKind.FirstPunctuation && kind <= ts.SyntaxKind.LastPunctuation) return 'sign';
  // A word with an escape has another text than the name it stands for.
  if (kind < ts.SyntaxKind.Identifier || text.includes('\\')) return 'other';
  const kept = kind > ts.SyntaxKind.Identifier && kind <= ts.SyntaxKind.LastFutureReservedWord;
  return kept || KEPT.has(text) ? 'word' : 'name';
}

/** Gives line and column of offsets that are asked for in ascending order. */
function marker(text: string): (offset: number) => Mark {
  let [line, lineStart, seen] = [1, 0, 0];
  return (offset) => {
    for (const match of text.slice(seen, offset).matchAll(/\r\n|[\n\r\u2028\u2029]/g)) {
      line++;
      lineStart = seen + match.index + match[0].length;
    }
    seen = offset;
    return { line, column: offset - lineStart + 1 };
  };
}
