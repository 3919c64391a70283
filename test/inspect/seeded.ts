import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/** A file with faults put in on purpose, each marked in the line below by a caret and the codes expected there. */
export interface Seeded {
  readonly file: string;
  readonly text: string;
  /** Expected findings as `line:column code`. */
  readonly expected: readonly string[];
}

const marker = /^\s*\/\/\s*\^ (inspect\.\S+(?: inspect\.\S+)*)$/;

/** All case files of a folder beside this file, in order of their names. */
export function readSeeded(folder: string): Seeded[] {
  const directory = fileURLToPath(new URL(`${folder}/`, import.meta.url));
  return readdirSync(directory)
    .sort()
    .map((file) => {
      const text = readFileSync(`${directory}${file}`, 'utf8');
      return { file, text, expected: readMarkers(text) };
    });
}

function readMarkers(text: string): string[] {
  let line = 0;
  return text.split('\n').flatMap((content, index) => {
    const codes = marker.exec(content)?.[1]?.split(' ');
    if (codes === undefined) {
      line = index + 1;
      return [];
    }
    return codes.map((code) => `${line}:${content.indexOf('^') + 1} ${code}`);
  });
}
