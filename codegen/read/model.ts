import { fileURLToPath } from 'node:url';
import { InputError } from '../../src/finding.ts';
import type { ModelDescription } from '../../src/models/description.ts';
import { Graph } from '../formula/graph.ts';
import type { Formula, Node, Output } from '../formula/node.ts';
import { exportedFunction, Reader } from './reader.ts';
import { finding, refuse } from './refusal.ts';
import { openSource } from './source.ts';
import { isRecord, type RecordValue, record } from './value.ts';

/**
 * Reads a model's TypeScript into a formula. Its functions take (elements, constants, t): fields of the
 * elements are inputs of setup, constants are bound to the system's values, t is the input of every tick.
 *
 * @param model description of the model; the TypeScript is its only statement of the equations
 * @param groups names of the outputs wanted, such as position and clock
 * @param text text of the model's file, when it does not stand on disk
 * @throws InputError with the place, code, reason and remedy of whatever lies outside the numeric subset
 */
export function readModel(model: ModelDescription, groups: readonly string[], text?: string): Formula {
  const graph = new Graph();
  const path = fileURLToPath(model.file);
  const source = openSource(path, text);
  const used = new Map<string, Node>();
  const elements: RecordValue = {
    names: Object.keys(model.units),
    field: (name) => {
      if (!Object.hasOwn(model.units, name)) return undefined;
      const node = graph.input(name, 'setup');
      used.set(name, node);
      return node;
    },
  };
  const constants = record(
    new Map(Object.entries(model.constants).map(([name, value]) => [name, graph.constant(value)])),
  );
  const t = graph.input('t', 'tick');
  const reader = new Reader(graph, ['t', ...Object.keys(model.units)]);
  const outputs: Output[] = [];
  for (const group of groups) {
    const output = model.outputs[group];
    const declaration = output && exportedFunction(source, output.function);
    if (output === undefined || declaration === undefined) {
      const what = output
        ? `there is no exported function "${output.function}"`
        : `the model has no output "${group}"`;
      throw new InputError(finding('read.missing-function', { file: source.getBaseName() }, what));
    }
    const last = declaration.getParameters()[2];
    if (declaration.getParameters().length !== 3 || last?.getTypeNode()?.getText() !== 'number') {
      refuse(
        'read.signature',
        declaration,
        `${output.function} does not take (elements, constants, t: number)`,
      );
    }
    const value = reader.call(declaration, [elements, constants, t], declaration);
    if (isRecord(value)) {
      for (const name of value.names)
        outputs.push({ group, name, unit: output.unit, node: value.field(name)! });
    } else {
      outputs.push({ group, name: group, unit: output.unit, node: value });
    }
  }
  const inputs = Object.keys(model.units).filter((name) => used.has(name));
  return {
    name: model.name,
    inputs: [
      ...inputs.map((name) => ({ name, unit: model.units[name]!, stage: 'setup' as const })),
      { name: 't', unit: 's', stage: 'tick' as const },
    ],
    outputs,
    labels: reader.labels,
  };
}
