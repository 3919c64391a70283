import { ts } from 'ts-morph';
import { type CountContext, countExpression } from './expressions.ts';
import type { OwnFunction } from './functions.ts';
import { hasModifier } from './functions.ts';
import { none, type Operations, sum } from './operations.ts';
import { countBinding, countStatement } from './statements.ts';
import type { Unit } from './unit.ts';

/** The counted cost of one function. */
export interface Count {
  /** Operations on the worst path; null where a loop or a recursion, here or in what is called, has no bound. */
  readonly operations: Operations | null;
  /**
   * False where something runs that the counted kinds do not hold: an allocation, a call out of the file, another
   * operator. The counts are a lower bound then, and each such place is a finding.
   */
  readonly complete: boolean;
}

/**
 * Counts the operations of every function on its worst path.
 *
 * The worst path is the one of the largest total; of equal totals that of more loads and stores; then that of more
 * roundings; then a loop that runs out before one left early; then the first in the text. `&&`, `||` and `!` count
 * nothing themselves, and both operands run; an `if` counts its test and the worse branch; an early return ends a
 * path; a loop with a literal bound multiplies; a called function of the file adds its own worst path. A minus before
 * a literal is part of the literal.
 */
export function countFunctions(unit: Unit): Map<OwnFunction, Count> {
  const counts = new Map<OwnFunction, Count>();
  const running = new Set<OwnFunction>();
  const count = (fn: OwnFunction): Count => {
    const known = counts.get(fn);
    if (known !== undefined) return known;
    if (running.has(fn)) return { operations: null, complete: true };
    let complete = true;
    let bounded = true;
    running.add(fn);
    const operations = countOwn(fn, {
      unit,
      callee: (called) => {
        const inner = count(called);
        if (!inner.complete) complete = false;
        if (inner.operations === null) bounded = false;
        return inner.operations ?? none;
      },
      uncounted: () => {
        complete = false;
      },
      unbounded: () => {
        bounded = false;
      },
    });
    running.delete(fn);
    const result = { operations: bounded ? operations : null, complete };
    counts.set(fn, result);
    return result;
  };
  for (const fn of unit.functions.values()) count(fn);
  return counts;
}

function countOwn({ node }: OwnFunction, context: CountContext): Operations {
  const isDeferred =
    hasModifier(node, ts.SyntaxKind.AsyncKeyword) ||
    ('asteriskToken' in node && node.asteriskToken !== undefined);
  if (isDeferred) context.uncounted();
  const parameters = node.parameters.flatMap(({ name, initializer, dotDotDotToken }) => {
    if (dotDotDotToken !== undefined) context.uncounted();
    const value = initializer === undefined ? none : countExpression(context, initializer);
    return [value, countBinding(context, name)];
  });
  const body = node.body!;
  return sum(
    ...parameters,
    ts.isBlock(body) ? countStatement(context, body) : countExpression(context, body),
  );
}
