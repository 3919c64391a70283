import { describe, expect, test } from 'vitest';
import { regroupedProduct, sumOfAngles } from '../../codegen/lower/exact-rules.ts';
import { exactRule } from '../../codegen/lower/rule.ts';

describe('an exact rule cannot be made without a law that holds', () => {
  test('a wrong sign', () => {
    expect(() =>
      exactRule({
        ...sumOfAngles,
        name: 'sum with a wrong sign',
        apply: (graph, [cosA, sinA, cosB, sinB]) => [
          graph.make('add', graph.make('mul', cosA!, cosB!), graph.make('mul', sinA!, sinB!)),
          sumOfAngles.apply(graph, [cosA!, sinA!, cosB!, sinB!])[1]!,
        ],
      }),
    ).toThrow(/sum with a wrong sign changes a value by/);
  });

  test('a factor left out', () => {
    expect(() =>
      exactRule({
        ...regroupedProduct,
        apply: (graph, factors) => regroupedProduct.apply(graph, factors.slice(1)),
      }),
    ).toThrow(/changes a value/);
  });

  test('a difference of one unit in the twentieth digit', () => {
    expect(() =>
      exactRule({
        name: 'almost the same',
        law: { free: [{ min: 1, max: 2 }], original: (_, free) => free, given: (_, free) => free },
        apply: (graph, [x]) => [graph.make('add', x!, graph.constant(1e-20))],
      }),
    ).toThrow(/almost the same changes a value by/);
  });

  test('an expression left out', () => {
    expect(() =>
      exactRule({ ...sumOfAngles, apply: (graph, given) => sumOfAngles.apply(graph, given).slice(1) }),
    ).toThrow(/replaces 2 expressions by 1/);
  });
});
