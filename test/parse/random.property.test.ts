import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { emitCode } from '../../codegen/emit/code.ts';
import type { Kernel } from '../../codegen/kernel/kernel.ts';
import { compareKernel } from '../../codegen/parse/compare.ts';
import { parseKernel } from '../../codegen/parse/parse.ts';
import { toKernel } from '../../codegen/parse/to-kernel.ts';
import { findingsOf } from './findings.ts';
import { changed, randomKernel } from './random-kernel.ts';

function emit(kernel: Kernel): string {
  return emitCode(kernel, {
    title: 'Random lines',
    source: 'none',
    formulaDigest: '',
    domainName: 'random',
    units: {},
    errors: [],
    notes: new Map(),
  });
}

describe('random kernels', () => {
  test('parse back to the same lines', () => {
    fc.assert(
      fc.property(randomKernel, (kernel) => {
        const parsed = parseKernel('kernel.js', emit(kernel));
        expect(compareKernel(parsed, kernel, 'kernel.js')).toEqual([]);
        expect(toKernel(parsed, kernel)).toEqual(kernel);
      }),
      { numRuns: 150, seed: 5 },
    );
  });

  test('one change is found', () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(randomKernel, fc.nat(), fc.nat(), (kernel, first, second) => {
        let [now, next] = [first, second];
        const draw = (limit: number): number => {
          [now, next] = [next, now];
          return now % limit;
        };
        const [what, other] = changed(kernel, draw);
        seen.add(what);
        const findings = findingsOf(emit(other), kernel);
        expect(findings, what).not.toEqual([]);
        const read = () => toKernel(parseKernel('kernel.js', emit(other)), kernel);
        if (findings.every(({ code }) => code === 'parse.other-constant')) expect(read()).not.toEqual(kernel);
        else expect(read).toThrow();
      }),
      { numRuns: 200, seed: 6 },
    );
    expect([...seen].sort()).toEqual([
      'constant',
      'guard',
      'operation',
      'output',
      'range',
      'state',
      'swapped',
    ]);
  });
});
