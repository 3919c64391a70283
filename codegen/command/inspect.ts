import { type Finding, formatFinding, InputError } from '../../src/finding.ts';
import type { Inspection } from '../inspect/inspection.ts';
import { formatCounts } from '../inspect/table.ts';
import { parseArguments, usageError } from './arguments.ts';
import type { Command } from './command.ts';

const help = `bound-orbit inspect kernel.js --float32 position

Reads TypeScript or JavaScript files and reports, in every function, what keeps its time or its memory from being
fixed: allocations, recursion, loops without a literal bound, exceptions, calls that lead out of the file, engine
functions, names that engines take for one another. Then it counts the operations of each function on its worst path.

  bound-orbit inspect FILE... [--float32 NAME,NAME] [--json]

  --float32 NAME,NAME  functions that must be float32 arithmetic: each operation directly inside Math.fround
  --json               {"files": [{"file", "findings", "functions"}]}

Total counts arithmetic, comparisons and selections; round (Math.fround), load and store stand apart. "no bound" is a
function without worst case; "at least" one that also does what is not counted. Exit codes: 0 no finding,
1 findings, 2 wrong use or input.
`;

/** An inspection and the file it is of. */
interface InspectedFile extends Inspection {
  readonly file: string;
}

/** `bound-orbit inspect`: static analysis of any TypeScript or JavaScript file. */
export const inspect: Command = {
  help,
  async run(args) {
    const { values, positionals } = parseArguments('inspect', args, {
      float32: { type: 'string' },
      json: { type: 'boolean' },
    });
    if (positionals.length === 0) throw usageError('inspect', 'no file is given');
    const files = await inspectAll(positionals, readNames(values.float32));
    process.stdout.write(
      values.json ? `${JSON.stringify({ files }, null, 2)}\n` : files.map(formatFile).join('\n'),
    );
    return files.some(({ findings }) => findings.length > 0) ? 1 : 0;
  },
};

function readNames(list: string | undefined): string[] {
  if (list === undefined) return [];
  const names = list.split(',').map((name) => name.trim());
  if (names.includes(''))
    throw usageError('inspect', `--float32 "${list}" is not a list of names between commas`);
  return names;
}

/** Inspects every file; those that cannot be inspected are all named in one InputError. */
async function inspectAll(paths: readonly string[], float32: readonly string[]): Promise<InspectedFile[]> {
  const { inspectFile } = await import('../inspect/inspection.ts');
  const files: InspectedFile[] = [];
  const refused: Finding[] = [];
  for (const file of paths) {
    try {
      files.push({ file, ...inspectFile(file, { float32 }) });
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      refused.push(...error.findings);
    }
  }
  if (refused.length > 0) throw new InputError(...refused);
  return files;
}

function formatFile({ file, findings, functions }: InspectedFile): string {
  const lines = [...findings.map(formatFinding), `${file}: ${countOf(findings.length, 'finding')}`];
  return `${[...lines, ...formatCounts(functions)].join('\n')}\n`;
}

function countOf(count: number, noun: string): string {
  return count === 1 ? `1 ${noun}` : `${count} ${noun}s`;
}
