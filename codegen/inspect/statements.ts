import { ts } from 'ts-morph';
import { type CountContext, countExpression } from './expressions.ts';
import { countLoop } from './loops.ts';
import { fromCounts, none, type Operations, sum, times, worse } from './operations.ts';
import { isErased, isUsing } from './syntax.ts';

/**
 * The worst counts of a statement by the way it is left: '' is falling through to the next statement, 'return' ends
 * the function, and 'break', 'continue' stand alone or with a label after them. A way that no path takes is missing.
 */
type Exits = ReadonlyMap<string, Operations>;

const through = '';

/** The operations of a function's body or of any statement on its worst path, whichever way it is left. */
export function countStatement(context: CountContext, node: ts.Statement): Operations {
  return [...exitsOf(context, node, []).values()].reduce(worse, none);
}

/** The loads and the default values of a destructured name; none for a plain one. */
export function countBinding(context: CountContext, name: ts.BindingName): Operations {
  if (ts.isIdentifier(name)) return none;
  const parts: Operations[] = [];
  for (const element of name.elements) {
    if (!ts.isBindingElement(element)) continue;
    if (element.dotDotDotToken !== undefined) context.uncounted();
    parts.push(fromCounts({ load: 1 }), countBinding(context, element.name));
    if (element.initializer !== undefined) parts.push(countExpression(context, element.initializer));
  }
  if (ts.isArrayBindingPattern(name)) context.uncounted();
  return sum(...parts);
}

/** @param labels labels that stand before the statement */
function exitsOf(context: CountContext, node: ts.Statement, labels: readonly string[]): Exits {
  const expression = (part: ts.Expression | undefined): Operations =>
    part === undefined ? none : countExpression(context, part);
  if (ts.isBlock(node)) return sequence(context, node.statements);
  if (ts.isExpressionStatement(node)) return leave(through, expression(node.expression));
  if (ts.isVariableStatement(node)) return leave(through, countDeclarations(context, node.declarationList));
  if (ts.isReturnStatement(node)) return leave('return', expression(node.expression));
  if (ts.isIfStatement(node)) {
    const otherwise =
      node.elseStatement === undefined ? leave(through, none) : exitsOf(context, node.elseStatement, []);
    return after(expression(node.expression), either(exitsOf(context, node.thenStatement, []), otherwise));
  }
  if (ts.isForStatement(node)) return forExits(context, node, labels);
  if (ts.isIterationStatement(node, false)) {
    context.unbounded();
    return leave(through, none);
  }
  if (ts.isBreakStatement(node)) return leave(jump('break', node.label), none);
  if (ts.isContinueStatement(node)) return leave(jump('continue', node.label), none);
  if (ts.isLabeledStatement(node)) {
    const label = node.label.text;
    return absorb(exitsOf(context, node.statement, [...labels, label]), `break ${label}`);
  }
  if (ts.isSwitchStatement(node)) return switchExits(context, node);
  if (ts.isEmptyStatement(node) || ts.isDebuggerStatement(node) || isErased(node))
    return leave(through, none);
  context.uncounted();
  if (ts.isThrowStatement(node)) return leave('return', expression(node.expression));
  if (ts.isTryStatement(node)) return tryExits(context, node);
  if (ts.isWithStatement(node))
    return after(expression(node.expression), exitsOf(context, node.statement, []));
  return leave(through, none);
}

function leave(way: string, operations: Operations): Exits {
  return new Map([[way, operations]]);
}

function jump(kind: 'break' | 'continue', label: ts.Identifier | undefined): string {
  return label === undefined ? kind : `${kind} ${label.text}`;
}

/** The worse of two alternatives, for each way. */
function either(first: Exits, second: Exits): Exits {
  const exits = new Map(first);
  for (const [way, operations] of second) {
    const other = exits.get(way);
    exits.set(way, other === undefined ? operations : worse(other, operations));
  }
  return exits;
}

/** What runs after `before`. */
function after(before: Operations, exits: Exits): Exits {
  return new Map([...exits].map(([way, operations]) => [way, sum(before, operations)]));
}

/** A jump whose target is the end of the statement: it falls through from there. */
function absorb(exits: Exits, way: string): Exits {
  const operations = exits.get(way);
  const others = new Map([...exits].filter(([other]) => other !== way));
  return operations === undefined ? others : either(others, leave(through, operations));
}

/** `then` after every path of `first` that falls through. */
function follow(first: Exits, then: () => Exits): Exits {
  const before = first.get(through);
  if (before === undefined) return first;
  const others = new Map([...first].filter(([way]) => way !== through));
  return either(others, after(before, then()));
}

function sequence(context: CountContext, statements: readonly ts.Statement[]): Exits {
  let exits: Exits = leave(through, none);
  for (const statement of statements) exits = follow(exits, () => exitsOf(context, statement, []));
  return exits;
}

function countDeclarations(context: CountContext, list: ts.VariableDeclarationList): Operations {
  if (isUsing(list)) context.uncounted();
  return sum(
    ...list.declarations.flatMap(({ name, initializer }) => [
      initializer === undefined ? none : countExpression(context, initializer),
      countBinding(context, name),
    ]),
  );
}

/**
 * A counted loop: the test runs once more than the body when no round ends early; a round that is left by break
 * or return is the last one in the worst case.
 */
function forExits(context: CountContext, node: ts.ForStatement, labels: readonly string[]): Exits {
  const loop = countLoop(context.unit, node);
  if (typeof loop === 'string') {
    context.unbounded();
    return leave(through, none);
  }
  const initializer = node.initializer!;
  const start = ts.isVariableDeclarationList(initializer)
    ? countDeclarations(context, initializer)
    : countExpression(context, initializer);
  const test = countExpression(context, node.condition!);
  const step = countExpression(context, node.incrementor!);
  let body = exitsOf(context, node.statement, []);
  for (const way of ['continue', ...labels.map((label) => `continue ${label}`)]) body = absorb(body, way);
  const round = body.get(through);
  const full = round === undefined ? none : sum(test, round, step);
  if (loop.rounds === 0) return leave(through, sum(start, test));
  const before = round === undefined ? sum(start, test) : sum(start, times(full, loop.rounds - 1), test);
  const early = after(before, new Map([...body].filter(([way]) => way !== through)));
  const whole = round === undefined ? new Map() : leave(through, sum(start, times(full, loop.rounds), test));
  return either(whole, absorb(early, 'break'));
}

/** A switch compares with one case after the other, then runs on from the one that fits. */
function switchExits(context: CountContext, node: ts.SwitchStatement): Exits {
  const clauses = node.caseBlock.clauses;
  const discriminant = countExpression(context, node.expression);
  const tests = clauses.map((clause) =>
    ts.isCaseClause(clause)
      ? sum(countExpression(context, clause.expression), fromCounts({ compare: 1 }))
      : none,
  );
  const allTests = sum(...tests);
  const hasDefault = clauses.some(ts.isDefaultClause);
  let exits: Exits = hasDefault ? new Map() : leave(through, allTests);
  clauses.forEach((clause, index) => {
    const before = ts.isDefaultClause(clause) ? allTests : sum(...tests.slice(0, index + 1));
    const statements = clauses.slice(index).flatMap((later) => later.statements);
    exits = either(exits, after(before, sequence(context, statements)));
  });
  return after(discriminant, absorb(exits, 'break'));
}

/** A try statement is a finding of its own; the worst path runs the block and then the catch clause. */
function tryExits(context: CountContext, node: ts.TryStatement): Exits {
  const block = exitsOf(context, node.tryBlock, []);
  const caught = node.catchClause === undefined ? new Map() : exitsOf(context, node.catchClause.block, []);
  const spent = [...block.values()].reduce(worse, none);
  const exits = either(block, after(spent, caught));
  if (node.finallyBlock === undefined) return exits;
  const last = exitsOf(context, node.finallyBlock, []);
  const added = last.get(through) ?? none;
  return either(after(added, exits), after([...exits.values()].reduce(worse, none), last));
}
