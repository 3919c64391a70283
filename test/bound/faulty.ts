import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { build, type Rolldown } from 'vite';
import type * as parts from './analysis.ts';

/** The error proof, part by part. */
export type Analysis = typeof parts;

/** A fault: one piece of text of one file of the analysis put in place of another. */
export interface Fault {
  readonly name: string;
  /** File of codegen. */
  readonly file: string;
  readonly find: string;
  readonly replace: string;
}

const ENTRY = fileURLToPath(new URL('analysis.ts', import.meta.url));

/** The place of a file of codegen. */
function pathOf(file: string): string {
  return fileURLToPath(new URL(`../../codegen/${file}`, import.meta.url));
}

/** The text of a file with a fault in it. */
export function withFault({ name, file, find, replace }: Fault): string {
  const pieces = readFileSync(pathOf(file), 'utf8').split(find);
  if (pieces.length !== 2 || find === replace)
    throw new Error(`${name}: the text to replace occurs ${pieces.length - 1} times in ${file}`);
  return pieces.join(replace);
}

/** The analysis with a fault in it; without one a copy of it, made the same way. */
export async function faultyAnalysis(fault?: Fault): Promise<Analysis> {
  const [path, text] = fault === undefined ? ['', ''] : [pathOf(fault.file), withFault(fault)];
  let placed = path === '';
  const result = (await build({
    configFile: false,
    logLevel: 'error',
    plugins: [
      {
        name: 'fault',
        enforce: 'pre',
        load(id) {
          if (id !== path) return undefined;
          placed = true;
          return text;
        },
      },
    ],
    build: {
      ssr: ENTRY,
      write: false,
      minify: false,
      rolldownOptions: { output: { format: 'es', codeSplitting: false } },
    },
  })) as Rolldown.RolldownOutput;
  if (!placed) throw new Error(`${path} is no part of the analysis`);
  const url = `data:text/javascript;base64,${Buffer.from(result.output[0].code).toString('base64')}`;
  return (await import(/* @vite-ignore */ url)) as Analysis;
}
