import { isRounded, type Kernel } from '../kernel/kernel.ts';
import { ARITHMETIC, COUNTED, type Counted, type Operations } from '../kernel/operations.ts';

/** Operations of one run of setup and of one tick, on the path that ends with status 0. */
export interface Cost {
  readonly setup: Operations;
  readonly tick: Operations;
}

/**
 * Counts a kernel's operations from its lines and from the checks that emission adds: two comparisons for each
 * element and for t, one for the guard word of the state.
 */
export function countOperations(kernel: Kernel): Cost {
  const setup = empty();
  const tick = empty();
  for (const line of kernel.lines) {
    if (line.stage === 'constant') continue;
    const counts = line.stage === 'setup' ? setup : tick;
    if (line.operation === 'input') {
      if (line.stage === 'setup') counts.load++;
      continue;
    }
    counts[line.operation === 'select' ? 'select' : (line.operation as Counted)]++;
    if (line.operation === 'select') counts.compare++;
    if (line.format === 'f32' && isRounded(line.operation)) counts.round++;
  }
  setup.compare += 2 * kernel.elements.length;
  setup.store += kernel.state.length + (kernel.guard < 0 ? 0 : 1);
  tick.compare += 2 + (kernel.guard < 0 ? 0 : 1);
  tick.load += kernel.state.length;
  tick.store += kernel.outputs.length;
  return { setup: total(setup), tick: total(tick) };
}

function empty(): Record<Counted, number> {
  return Object.fromEntries(COUNTED.map((kind) => [kind, 0])) as Record<Counted, number>;
}

function total(counts: Record<Counted, number>): Operations {
  return { ...counts, total: ARITHMETIC.reduce((sum, kind) => sum + counts[kind], 0) };
}
