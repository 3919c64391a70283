/** The kinds of counted operations. */
export const operationKinds = [
  'add',
  'sub',
  'mul',
  'div',
  'neg',
  'sqrt',
  'abs',
  'floor',
  'compare',
  'select',
  'round',
  'load',
  'store',
] as const;

/**
 * A kind of counted operation: `compare` is < <= > >= === !==, `select` a conditional expression, `round`
 * Math.fround, `load` the read and `store` the write of an element or property.
 */
export type OperationKind = (typeof operationKinds)[number];

/** How often each kind of operation runs. `total` counts arithmetic: all kinds but round, load and store. */
export type Operations = Readonly<Record<OperationKind | 'total', number>>;

const apart: ReadonlySet<string> = new Set(['round', 'load', 'store'] satisfies OperationKind[]);

/** No operation. */
export const none: Operations = fromCounts({});

/** Counts with their total. */
export function fromCounts(counts: Readonly<Partial<Record<OperationKind, number>>>): Operations {
  const entries = operationKinds.map((kind) => [kind, counts[kind] ?? 0] as const);
  const total = entries.reduce((sum, [kind, count]) => (apart.has(kind) ? sum : sum + count), 0);
  return { ...(Object.fromEntries(entries) as Record<OperationKind, number>), total };
}

/** The operations of parts that all run. */
export function sum(...parts: readonly Operations[]): Operations {
  return combine((key) => parts.reduce((total, part) => total + part[key], 0));
}

/** The operations of a part that runs several times. */
export function times(part: Operations, rounds: number): Operations {
  return combine((key) => part[key] * rounds);
}

function combine(count: (key: OperationKind | 'total') => number): Operations {
  return fromCounts(Object.fromEntries(operationKinds.map((kind) => [kind, count(kind)])));
}

/**
 * The worse of two paths: the one of larger total; of equal totals that of more loads and stores; then that of
 * more roundings; then the first.
 */
export function worse(first: Operations, second: Operations): Operations {
  const difference =
    second.total - first.total ||
    second.load + second.store - (first.load + first.store) ||
    second.round - first.round;
  return difference > 0 ? second : first;
}
