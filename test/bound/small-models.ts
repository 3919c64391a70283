import type { Task } from '../../codegen/choose/variant.ts';
import type { Choices } from '../../codegen/kernel/choices.ts';
import { lower } from '../../codegen/lower/lower.ts';
import { readModel } from '../../codegen/read/model.ts';
import type { ModelDescription } from '../../src/models/description.ts';
import { choicesOf, type Subject } from './lines.ts';

/** A model small enough that every one of its roundings shows: its text and the ranges of its inputs. */
export interface SmallModel {
  readonly name: string;
  /** Body of the function of (elements, constants, t), in the numeric subset; `eccentricAnomaly` is in scope. */
  readonly body: string;
  /** What it returns: one number or a record of them. */
  readonly returns: string;
  /** Ranges of the elements and of t. */
  readonly ranges: Readonly<Record<string, readonly [min: number, max: number]>>;
}

/** Reads and lowers a small model. Its one output group is `position` for a record and `value` for a number. */
export function smallSubject(small: SmallModel, choices: Partial<Choices>): Subject {
  const all = choicesOf(choices);
  const fields = Object.keys(small.ranges).filter((name) => name !== 't');
  const group = small.returns.startsWith('{') ? 'position' : 'value';
  const domain = Object.fromEntries(
    Object.entries(small.ranges).map(([name, [min, max]]) => [name, { min, max, from: 'made up' }]),
  );
  const model: ModelDescription = {
    name: small.name,
    title: small.name,
    source: 'made up',
    file: new URL(`../../src/models/${small.name}.ts`, import.meta.url),
    outputs: { [group]: { function: 'compute', unit: '1' } },
    units: Object.fromEntries(fields.map((name) => [name, '1'])),
    constants: {},
    frameRate: 0,
    domains: { all: domain },
  };
  const reads = fields.length === 0 ? '' : `const { ${fields.join(', ')} } = elements;`;
  const type = fields.map((name) => `${name}: number`).join('; ');
  const text = `
    import { eccentricAnomaly } from '../kepler/eccentric-anomaly.ts';
    export function compute(elements: { ${type} }, constants: {}, t: number) {
      ${reads}
      ${small.body}
      return ${small.returns};
    }
  `;
  const formula = readModel(model, [group], text);
  const task: Task = { model, formula, domainName: 'all', domain };
  return { name: `${small.name} ${all.setup}/${all.tick}`, task, lowered: lower(formula, domain, all) };
}
