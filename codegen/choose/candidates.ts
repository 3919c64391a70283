import type { Domain } from '../../src/models/description.ts';
import type { Choices, Format, Starter } from '../kernel/choices.ts';
import type { Arithmetic, Budget } from './budget.ts';

/** Largest eccentricity for which the second-order starter is offered. */
const SECOND_ORDER_LIMIT = 0.1;

/** Most corrections that are offered. */
const MOST_STEPS = 6;

const FORMATS: Readonly<Record<Arithmetic, readonly [setup: Format, tick: Format]>> = {
  f64: ['f64', 'f64'],
  'f64-setup-f32-tick': ['f64', 'f32'],
  f32: ['f32', 'f32'],
};

/** All variants that a budget allows over a domain. */
export function candidates(budget: Budget, domain: Domain): readonly Choices[] {
  const starter: Starter = (domain['e']?.max ?? 0) <= SECOND_ORDER_LIMIT ? 'secondOrder' : 'secant';
  const allowed = budget.arithmetic ?? (Object.keys(FORMATS) as Arithmetic[]);
  return allowed.flatMap((name) => {
    const [setup, tick] = FORMATS[name];
    return Array.from(
      { length: MOST_STEPS },
      (_, k): Choices => ({ setup, tick, starter, corrector: 'newton', cap: k + 1 }),
    );
  });
}
