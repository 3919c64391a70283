import { taskOf } from '../../codegen/choose/task.ts';
import type { Task } from '../../codegen/choose/variant.ts';
import type { Choices } from '../../codegen/kernel/choices.ts';
import { isRounded, type Kernel, type Line } from '../../codegen/kernel/kernel.ts';
import { type Lowered, lower } from '../../codegen/lower/lower.ts';

/** A model, domain and choices that the tests of the proof run on. */
export interface Subject {
  readonly name: string;
  readonly task: Task;
  readonly lowered: Lowered;
}

/** Lowers a model for a test. */
export function subject(model: string, domain: string, choices: Partial<Choices>): Subject {
  const all: Choices = {
    setup: 'f64',
    tick: 'f64',
    starter: 'secondOrder',
    corrector: 'newton',
    cap: 2,
    ...choices,
  };
  const task = taskOf({ model, domain, error: { position_m: 1 } }, 'budget');
  return { name: `${model} ${all.setup}/${all.tick}`, task, lowered: lower(task.formula, task.domain, all) };
}

/**
 * Values of all lines of a kernel, computed as the engine would.
 *
 * @param kernel the kernel
 * @param inputs values of the inputs, by name
 * @param changes added to the value of a line after it is computed
 * @param given values of lines that are not computed
 */
export function runLines(
  kernel: Kernel,
  inputs: Readonly<Record<string, number>>,
  changes: ReadonlyMap<number, number> = new Map(),
  given: ReadonlyMap<number, number> = new Map(),
): Float64Array {
  const values = new Float64Array(kernel.lines.length);
  for (const [k, line] of kernel.lines.entries()) {
    const plain = given.get(k) ?? lineValue(line, inputs, values);
    const rounded = line.format === 'f32' && isRounded(line.operation) ? Math.fround(plain) : plain;
    values[k] = rounded + (changes.get(k) ?? 0);
  }
  return values;
}

function lineValue(line: Line, inputs: Readonly<Record<string, number>>, values: Float64Array): number {
  const [a = 0, b = 0, x = 0, y = 0] = line.args.map((arg) => values[arg]!);
  switch (line.operation) {
    case 'input':
      return inputs[line.name] ?? 0;
    case 'constant':
      return line.value;
    case 'add':
      return a + b;
    case 'sub':
      return a - b;
    case 'mul':
      return a * b;
    case 'div':
      return a / b;
    case 'neg':
      return -a;
    case 'select':
      return a < b ? x : y;
    case 'round':
      return Math.fround(a);
    case 'sqrt':
    case 'abs':
    case 'floor':
      return Math[line.operation](a);
  }
}
