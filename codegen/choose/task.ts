import { InputError } from '../../src/finding.ts';
import type { Domain } from '../../src/models/description.ts';
import { MODELS } from '../../src/systems/catalogue.ts';
import { readModel } from '../read/model.ts';
import { type Budget, ERROR_KEYS } from './budget.ts';
import type { Task } from './variant.ts';

/**
 * The task that a budget sets: reads the model for the outputs whose errors it limits and takes the named domain.
 *
 * @param budget the budget
 * @param file its file, for messages
 * @throws InputError for an unknown model, domain or output
 */
export function taskOf(budget: Budget, file: string): Task {
  const model = pick(MODELS, budget.model, 'model', file);
  const all = pick(model.domains, budget.domain, 'domain', file);
  const groups = Object.entries(ERROR_KEYS)
    .filter(([key]) => key in budget.error)
    .map(([, group]) => group);
  for (const group of groups) pick(model.outputs, group, 'output', file);
  const formula = readModel(model, groups);
  const domain: Domain = Object.fromEntries(
    formula.inputs.map(({ name }) => [name, pick(all, name, 'range', file)]),
  );
  return { model, formula, domainName: budget.domain, domain };
}

function pick<T>(table: Readonly<Record<string, T>>, name: string, kind: string, file: string): T {
  const entry = Object.hasOwn(table, name) ? table[name] : undefined;
  if (entry !== undefined) return entry;
  throw new InputError({
    code: `budget.unknown-${kind}`,
    place: { file },
    what: `there is no ${kind} "${name}"`,
    why: 'A budget names what the catalogue of models holds.',
    remedy: `Known: ${Object.keys(table).join(', ')}.`,
  });
}
