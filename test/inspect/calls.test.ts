import { describe, expect, it } from 'vitest';
import { inspectSource } from '../../codegen/inspect/inspection.ts';

/**
 * ECMA-262, section "Function Properties of the Math Object": functions that return an implementation-approximated
 * value, without Math.sqrt (from memory; the list is that of ECMAScript 2024).
 */
const approximated = [
  ...[
    'acos',
    'acosh',
    'asin',
    'asinh',
    'atan',
    'atanh',
    'atan2',
    'cbrt',
    'cos',
    'cosh',
    'exp',
    'expm1',
    'hypot',
  ],
  ...['log', 'log1p', 'log10', 'log2', 'pow', 'sin', 'sinh', 'tan', 'tanh'],
];
const allowed = ['abs', 'floor', 'fround', 'sqrt'];

function codesFor(name: string): string[] {
  const text = `export function f(x) { return Math.${name}(x); }`;
  return inspectSource('call.js', text).findings.map(({ code }) => code);
}

describe('functions of Math', () => {
  it.each(approximated)('Math.%s is an engine function', (name) => {
    expect(codesFor(name)).toEqual(['inspect.engine-function']);
  });

  it.each(allowed)('Math.%s is allowed', (name) => {
    expect(codesFor(name)).toEqual([]);
  });

  const others = Object.getOwnPropertyNames(Math).filter(
    (name) => typeof Reflect.get(Math, name) === 'function' && ![...approximated, ...allowed].includes(name),
  );
  it.each(others)('Math.%s, exact by the language but not counted, leads out of the file', (name) => {
    expect(codesFor(name)).toEqual(['inspect.outside-call']);
  });

  it('knows every function that this engine has', () => {
    expect([...approximated, ...allowed].every((name) => typeof Reflect.get(Math, name) === 'function')).toBe(
      true,
    );
    expect(others).toContain('max');
  });
});
