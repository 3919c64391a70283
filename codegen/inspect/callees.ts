import { ts } from 'ts-morph';
import type { OwnFunction } from './functions.ts';
import { bare, excerpt } from './syntax.ts';
import { globalPath, ownFunction, type Unit } from './unit.ts';

/**
 * What a call reaches:
 * - `operation`: a Math function that is one machine operation; `round` is Math.fround
 * - `own`: a function of the same file
 * - `engine`: a Math function whose accuracy is the engine's choice
 * - `eval`, `string`, `boxed`, `regex`, `allocating`: language functions that make code, a string, a boxed value,
 *   a regular expression, another object
 * - `outside`: anything else
 */
export type Callee =
  | { readonly kind: 'operation'; readonly operation: 'sqrt' | 'abs' | 'floor' | 'round' }
  | { readonly kind: 'own'; readonly fn: OwnFunction }
  | {
      readonly kind: 'engine' | 'eval' | 'string' | 'boxed' | 'regex' | 'allocating' | 'outside';
      readonly name: string;
    };

const operations = {
  'Math.sqrt': 'sqrt',
  'Math.abs': 'abs',
  'Math.floor': 'floor',
  'Math.fround': 'round',
} as const;

/**
 * Math functions whose results ECMA-262 (section Function Properties of the Math Object) leaves
 * implementation-approximated. It says so of Math.sqrt too; sqrt stays out of this list because IEEE 754 fixes its
 * result, every engine uses the machine's, and measured results agree.
 */
const engineFunctions: ReadonlySet<string> = new Set(
  [
    ...[
      'sin',
      'cos',
      'tan',
      'asin',
      'acos',
      'atan',
      'atan2',
      'sinh',
      'cosh',
      'tanh',
      'asinh',
      'acosh',
      'atanh',
    ],
    ...['exp', 'expm1', 'log', 'log1p', 'log2', 'log10', 'pow', 'cbrt', 'hypot'],
  ].map((name) => `Math.${name}`),
);

const globals: ReadonlyMap<string, 'eval' | 'string' | 'boxed' | 'regex' | 'allocating'> = new Map([
  ['eval', 'eval'],
  ['Function', 'eval'],
  ['String', 'string'],
  ['Symbol', 'boxed'],
  ['BigInt', 'boxed'],
  ['Object', 'boxed'],
  ['RegExp', 'regex'],
  ['Array', 'allocating'],
  ['Date', 'string'],
  ['Error', 'allocating'],
  ['RangeError', 'allocating'],
  ['TypeError', 'allocating'],
  ['structuredClone', 'allocating'],
] as const);

const namespaces: ReadonlyMap<string, 'string' | 'boxed' | 'allocating'> = new Map([
  ['JSON', 'allocating'],
  ['Object', 'allocating'],
  ['Array', 'allocating'],
  ['Promise', 'allocating'],
  ['Reflect', 'allocating'],
  ['String', 'string'],
  ['Symbol', 'boxed'],
  ['BigInt', 'boxed'],
] as const);

const stringMethods: ReadonlySet<string> = new Set([
  ...[
    'charAt',
    'substring',
    'substr',
    'trim',
    'trimStart',
    'trimEnd',
    'toUpperCase',
    'toLowerCase',
    'padStart',
  ],
  ...[
    'padEnd',
    'repeat',
    'replace',
    'replaceAll',
    'split',
    'normalize',
    'join',
    'toString',
    'toLocaleString',
  ],
  ...['toFixed', 'toPrecision', 'toExponential', 'toISOString'],
]);

const allocatingMethods: ReadonlySet<string> = new Set([
  ...[
    'map',
    'filter',
    'flat',
    'flatMap',
    'slice',
    'splice',
    'concat',
    'push',
    'unshift',
    'sort',
    'from',
    'of',
  ],
  ...['toSorted', 'toReversed', 'toSpliced', 'with', 'subarray', 'keys', 'values', 'entries', 'bind'],
  ...['match', 'matchAll', 'exec'],
]);

/** What a call of a file reaches, as far as the file alone tells. */
export function calleeOf(unit: Unit, call: ts.CallExpression): Callee {
  const fn = ownFunction(unit, call.expression);
  if (fn !== undefined) return { kind: 'own', fn };
  const path = globalPath(unit, call.expression);
  const name = path ?? excerpt(call.expression);
  if (path !== undefined && Object.hasOwn(operations, path)) {
    return { kind: 'operation', operation: operations[path as keyof typeof operations] };
  }
  if (path !== undefined && engineFunctions.has(path)) return { kind: 'engine', name };
  const known = path === undefined ? undefined : (globals.get(path) ?? namespaces.get(namespaceOf(path)));
  if (known !== undefined) return { kind: known, name };
  return { kind: methodKind(call.expression), name };
}

function namespaceOf(path: string): string {
  return path.slice(0, Math.max(0, path.lastIndexOf('.')));
}

function methodKind(expression: ts.Expression): 'string' | 'allocating' | 'outside' {
  const node = bare(expression);
  if (!ts.isPropertyAccessExpression(node)) return 'outside';
  if (stringMethods.has(node.name.text)) return 'string';
  return allocatingMethods.has(node.name.text) ? 'allocating' : 'outside';
}

/** True for a call of Math.fround, by its name or through an alias. */
export function isRounding(unit: Unit, node: ts.Node): node is ts.CallExpression {
  if (!ts.isCallExpression(node)) return false;
  const callee = calleeOf(unit, node);
  return callee.kind === 'operation' && callee.operation === 'round';
}
