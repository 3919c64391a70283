import { expect } from 'vitest';
import type { Finding } from '../../src/finding.ts';
import { findingsOf } from './findings.ts';
import type { Sample } from './samples.ts';

/**
 * A change of a sample's text: what it is, text that stands there once, what comes in its place, the code of the first
 * finding, and text that stands once in the changed file, right at the place of the finding; '' is its end.
 */
export type Edit = readonly [what: string, from: string, to: string, code: string, at: string];

/** Makes a change and expects the first finding by code, line and column. */
export function expectFinding(sample: Sample, [, from, to, code, at]: Edit): Finding {
  expect(sample.text.split(from), `"${from}" stands once`).toHaveLength(2);
  const text = sample.text.replace(from, () => to);
  const before = text.slice(0, at === '' ? text.length : text.indexOf(at)).split('\n');
  if (at !== '') expect(text.split(at), `"${at}" stands once`).toHaveLength(2);
  const [first] = findingsOf(text, sample.kernel);
  const place = { file: 'kernel.js', line: before.length, column: before.at(-1)!.length + 1 };
  expect(first).toMatchObject({ code, place });
  return first!;
}
