import { Graph } from '../../../codegen/formula/graph.ts';
import type { Format } from '../../../codegen/kernel/choices.ts';
import type { Kernel, Line, Operation } from '../../../codegen/kernel/kernel.ts';

/** Operations of hand-made lines: a name of an input, a constant, or an operation on earlier lines. */
export type Written = string | number | readonly [Operation, ...(readonly number[])];

const NODE = new Graph().constant(0);

/** A kernel of hand-made lines. */
export function kernelOf(format: Format, written: readonly Written[]): Kernel {
  const lines: Line[] = written.map((entry, k) => {
    const common = { name: `l${k}`, format, stage: 'tick' as const, node: NODE };
    if (typeof entry === 'string')
      return { ...common, name: entry, operation: 'input', args: [], value: 0, format: 'f64' as const };
    if (typeof entry === 'number') return { ...common, operation: 'constant', args: [], value: entry };
    const [operation, ...args] = entry;
    return { ...common, operation, args, value: 0 };
  });
  return {
    model: 'hand-made',
    choices: { setup: format, tick: format, starter: 'secondOrder', corrector: 'newton', cap: 1 },
    domain: {},
    elements: [],
    lines,
    state: [],
    guard: -1,
    outputs: [],
  };
}
