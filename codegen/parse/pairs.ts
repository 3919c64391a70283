import type { Kernel } from '../kernel/kernel.ts';
import type { ParsedInput, ParsedKernel } from './parsed.ts';

/** The lines of one side, in the groups and the order in which a file has them. */
export interface Groups {
  readonly elements: readonly InputLines[];
  /** Assignments of setup. */
  readonly setup: readonly number[];
  readonly time: InputLines;
  /** Assignments of position. */
  readonly tick: readonly number[];
}

/** The line of an input, and the line of its rounding when that is checked in its place. */
export interface InputLines {
  readonly field: string;
  readonly input: number;
  readonly rounded: number | undefined;
}

/** The lines of a file in groups. */
export function groupsOfFile({ lines, elements, time }: ParsedKernel): Groups {
  const read = new Set([...elements, time].flatMap(({ input, rounded }: ParsedInput) => [input, rounded]));
  const assigned = (stage: string) =>
    [...lines.keys()].filter((line) => lines[line]!.stage === stage && !read.has(line));
  return { elements, setup: assigned('setup'), time, tick: assigned('tick') };
}

/** The lines of a kernel in groups: in a float32 stage the rounding of an input stands before its check. */
export function groupsOfKernel({ lines, elements, choices }: Kernel): Groups {
  const inputLines = (field: string, stage: 'setup' | 'tick'): InputLines => {
    const input = lines.findIndex(
      (line) => line.operation === 'input' && line.stage === stage && line.name === field,
    );
    const rounded = lines.findIndex((line) => line.operation === 'round' && line.args[0] === input);
    return { field, input, rounded: rounded < 0 || choices[stage] === 'f64' ? undefined : rounded };
  };
  const inputs = elements.map((field) => inputLines(field, 'setup'));
  const time = inputLines('t', 'tick');
  const read = new Set([...inputs, time].map(({ rounded }) => rounded));
  const assigned = (stage: string) =>
    [...lines.keys()].filter(
      (line) => lines[line]!.stage === stage && lines[line]!.operation !== 'input' && !read.has(line),
    );
  return { elements: inputs, setup: assigned('setup'), time, tick: assigned('tick') };
}

/** By line of the file: the line of the kernel that stands at the same place. */
export function pairLines(file: Groups, kernel: Groups): ReadonlyMap<number, number> {
  const pairs = new Map<number, number>();
  const pair = (line: number | undefined, other: number | undefined): void => {
    if (line !== undefined && other !== undefined) pairs.set(line, other);
  };
  const inputs = (line: InputLines, other: InputLines | undefined): void => {
    pair(line.input, other?.input);
    pair(line.rounded, other?.rounded);
  };
  for (const [index, input] of file.elements.entries()) inputs(input, kernel.elements[index]);
  inputs(file.time, kernel.time);
  for (const stage of ['setup', 'tick'] as const)
    for (const [index, line] of file[stage].entries()) pair(line, kernel[stage][index]);
  return pairs;
}
