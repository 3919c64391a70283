import { InputError } from '../../src/finding.ts';
import type { Kernel, Line } from '../kernel/kernel.ts';
import { compareKernel } from './compare.ts';
import { groupsOfFile, groupsOfKernel, pairLines } from './pairs.ts';
import type { ParsedArgument, ParsedKernel } from './parsed.ts';

/**
 * The kernel that a file says: operations, arguments, constants, formats, state, guard and outputs are those of the
 * file; numbers, names and nodes of the lines, and all that no file says, are those of the kernel that it equals.
 *
 * @param parsed what the file says
 * @param kernel a kernel from which it differs in no more than constants
 * @throws InputError when there is another difference: ask compareKernel first
 */
export function toKernel(parsed: ParsedKernel, kernel: Kernel): Kernel {
  const differences = compareKernel(parsed, kernel, 'kernel.js');
  if (differences.some(({ code }) => code !== 'parse.other-constant')) throw new InputError(...differences);
  const pairs = pairLines(groupsOfFile(parsed), groupsOfKernel(kernel));
  const lines: Line[] = [...kernel.lines];
  /** The line of an argument; a number of the file becomes the value of the constant that stands for it. */
  const lineOf = (arg: ParsedArgument, constant: number): number => {
    if ('line' in arg) return pairs.get(arg.line)!;
    if (Object.is(lines[constant]!.value, arg.literal)) return constant;
    return lines.push({ ...lines[constant]!, value: arg.literal }) - 1; // other readers keep the constant as it is
  };
  for (const [number, paired] of pairs) {
    const { operation, args, format, stage } = parsed.lines[number]!;
    const known = kernel.lines[paired]!;
    const placed = args.map((arg, index) => lineOf(arg, known.args[index]!));
    lines[paired] = { ...known, operation, args: placed, format, stage };
  }
  const outputs = kernel.outputs.map((output, index) => ({
    ...output,
    line: lineOf(parsed.outputs[index]!.value, output.line),
  }));
  return {
    ...kernel,
    elements: parsed.elements.map((element) => element.field),
    lines,
    state: parsed.state.map((word) => pairs.get(word.value)!),
    guard: parsed.guard,
    outputs,
  };
}
