import type { InspectedFunction } from './inspection.ts';
import { operationKinds } from './operations.ts';

/**
 * The counts of functions as lines of a table: a head, then a function a line; no line where there is no function.
 * The total is "no bound" where there is no worst case, and "at least" where the counts are a lower bound.
 */
export function formatCounts(functions: readonly InspectedFunction[]): string[] {
  if (functions.length === 0) return [];
  const head = ['function', 'line', ...operationKinds, 'total'];
  const rows = functions.map(({ name, line, operations, complete }) => {
    const counts = operationKinds.map((kind) => (operations === null ? '-' : String(operations[kind])));
    const total = operations === null ? 'no bound' : `${complete ? '' : 'at least '}${operations.total}`;
    return [name, String(line), ...counts, total];
  });
  const widths = head.map((title, column) =>
    Math.max(title.length, ...rows.map((row) => row[column]!.length)),
  );
  return [head, ...rows].map((row) =>
    row
      .map((cell, column) => (column === 0 ? cell.padEnd(widths[0]!) : cell.padStart(widths[column]!)))
      .join('  '),
  );
}
