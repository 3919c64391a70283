import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { Evaluator } from '../../codegen/formula/evaluate.ts';
import { Graph } from '../../codegen/formula/graph.ts';
import type { Formula, Node } from '../../codegen/formula/node.ts';
import { parseFormula, printFormula } from '../../codegen/formula/text.ts';
import { readModel } from '../../codegen/read/model.ts';
import { InputError } from '../../src/finding.ts';
import { MODELS } from '../../src/systems/catalogue.ts';

/** Formulas of random operations on two inputs and random numbers. */
const formulas = fc
  .array(
    fc.tuple(
      fc.constantFrom('add', 'sub', 'mul', 'neg', 'sin', 'cos', 'abs', 'select'),
      fc.nat(),
      fc.nat(),
      fc.nat(),
      fc.nat(),
    ),
    { minLength: 1, maxLength: 30 },
  )
  .chain((steps) =>
    fc
      .double({ noNaN: true, noDefaultInfinity: true, min: -10, max: 10 })
      .map((value) => build(steps, value)),
  );

function build(
  steps: readonly (readonly [string, number, number, number, number])[],
  value: number,
): Formula {
  const graph = new Graph();
  const nodes: Node[] = [graph.input('a', 'setup'), graph.input('t', 'tick'), graph.constant(value)];
  for (const [operation, ...picks] of steps) {
    const [w, x, y, z] = picks.map((pick) => nodes[pick % nodes.length]!) as [Node, Node, Node, Node];
    if (operation === 'select') nodes.push(graph.make('select', w, x, y, z));
    else if (operation === 'add' || operation === 'sub' || operation === 'mul')
      nodes.push(graph.make(operation, w, x));
    else nodes.push(graph.make(operation as 'neg', w));
  }
  return {
    name: 'random',
    inputs: [
      { name: 'a', stage: 'setup', unit: 'm' },
      { name: 't', stage: 'tick', unit: 's' },
    ],
    outputs: [{ group: 'g', name: 'g', unit: 'm', node: nodes.at(-1)! }],
    labels: new Map(),
  };
}

describe('formula text', () => {
  test.each(Object.values(MODELS))('$name prints and parses back to the same text', (model) => {
    const text = printFormula(readModel(model, Object.keys(model.outputs)));
    expect(printFormula(parseFormula(text))).toBe(text);
  });

  test('random formulas parse back to the same text and value', () => {
    fc.assert(
      fc.property(formulas, (formula) => {
        const text = printFormula(formula);
        const back = parseFormula(text);
        expect(printFormula(back)).toBe(text);
        const values = [formula, back].map(({ outputs }) => {
          const evaluator = new Evaluator([outputs[0]!.node]);
          evaluator.run({ a: 0.75, t: -1.25 });
          return evaluator.value(outputs[0]!.node);
        });
        expect(values[1]).toEqual(values[0]);
      }),
      { numRuns: 300 },
    );
  });

  test.each([
    ['an unknown operation', 'formula f\ninput a setup m\nx = pow a a\n', 3],
    ['a name that is not defined', 'formula f\nx = add a 1\n', 2],
    ['too few arguments', 'formula f\ninput a setup m\nx = add a\n', 3],
    ['a second definition', 'formula f\ninput a setup m\nx = add a 1\nx = add a 2\n', 4],
    ['a bad stage', 'formula f\ninput a never m\n', 2],
    ['no name of the formula', 'input a setup m\n', 1],
    ['an input defined with no arguments', 'formula f\nx = input\n', 2],
  ])('parsing refuses %s', (_, text, line) => {
    expect(() => parseFormula(text, 'f.txt')).toThrow(InputError);
    expect(() => parseFormula(text, 'f.txt')).toThrow(new RegExp(`f\\.txt:${line}: formula\\.syntax`));
  });
});

describe('the graph', () => {
  test('shares equal expressions and sorts the arguments of sums and products', () => {
    const graph = new Graph();
    const [a, b] = [graph.input('a', 'setup'), graph.input('t', 'tick')];
    expect(graph.make('mul', a, b)).toBe(graph.make('mul', b, a));
    expect(graph.make('sub', a, b)).not.toBe(graph.make('sub', b, a));
    expect(graph.make('add', a, b).stage).toBe('tick');
    expect(graph.make('add', a, a).stage).toBe('setup');
  });

  test('simplifies exact identities and nothing else', () => {
    const graph = new Graph();
    const a = graph.input('a', 'setup');
    const [zero, one] = [graph.constant(0), graph.constant(1)];
    expect(graph.make('add', a, zero)).toBe(a);
    expect(graph.make('mul', one, a)).toBe(a);
    expect(graph.make('mul', a, zero)).toBe(zero);
    expect(graph.make('neg', graph.make('neg', a))).toBe(a);
    expect(graph.make('add', a, graph.make('neg', a)).operation).toBe('sub');
    expect(graph.make('div', a, a).operation).toBe('div');
    expect(graph.constant(-0)).toBe(zero);
  });
});
