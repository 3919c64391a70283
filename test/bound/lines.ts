import { taskOf } from '../../codegen/choose/task.ts';
import type { Task } from '../../codegen/choose/variant.ts';
import type { Choices } from '../../codegen/kernel/choices.ts';
import { isRounded, type Kernel } from '../../codegen/kernel/kernel.ts';
import { lineValue } from '../../codegen/kernel/line-value.ts';
import { type Lowered, lower } from '../../codegen/lower/lower.ts';

/** A model, domain and choices that the tests of the proof run on. */
export interface Subject {
  readonly name: string;
  readonly task: Task;
  readonly lowered: Lowered;
}

/** Float64 throughout and two corrections, unless a test says otherwise. */
export function choicesOf(choices: Partial<Choices>): Choices {
  return {
    setup: 'f64',
    tick: 'f64',
    starter: 'secondOrder',
    corrector: 'newton',
    cap: 2,
    ...choices,
  };
}

/** Lowers a model for a test. */
export function subject(model: string, domain: string, choices: Partial<Choices>): Subject {
  const all = choicesOf(choices);
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
  const input = (name: string) => inputs[name] ?? 0;
  for (const [k, line] of kernel.lines.entries()) {
    const plain = given.get(k) ?? lineValue(line, values, input);
    const rounding = line.operation === 'round' || (line.format === 'f32' && isRounded(line.operation));
    const rounded = rounding ? Math.fround(plain) : plain;
    values[k] = rounded + (changes.get(k) ?? 0);
  }
  return values;
}
