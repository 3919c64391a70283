import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { bare, isAssignment, isFunctionNode, isUpdate, walkOwn } from './syntax.ts';
import { numericConstant, symbolOf, type Unit } from './unit.ts';

export const unboundedLoop: Rule = {
  code: 'inspect.unbounded-loop',
  why: 'The number of rounds cannot be read from the source, so the loop has no worst-case time.',
  remedy: 'Count with `for (let i = 0; i < 8; i++)`, literal start, bound and step; leave early with break.',
};

/** A loop whose number of rounds the source fixes. */
export interface CountedLoop {
  readonly index: ts.Symbol;
  /** Value of the index in the first round. */
  readonly start: number;
  /** Step of the index from round to round. */
  readonly step: number;
  /** Rounds when none ends early. */
  readonly rounds: number;
}

/** Loops without a literal bound. */
export function loopFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  walkOwn(fn.node, (node) => {
    if (!ts.isIterationStatement(node, false)) return;
    const loop = ts.isForStatement(node) ? countLoop(unit, node) : 'only a for loop can have a literal bound';
    if (typeof loop === 'string')
      faults.push({ rule: unboundedLoop, at: node, what: `a loop without bound: ${loop}` });
  });
  return faults;
}

/**
 * Reads the number of rounds of a `for` loop. Start, bound and step must be integers within 32 bits, given as
 * literals or as names of steady variables that hold one; the body must not write the index.
 *
 * @returns the loop, or the reason why it has no bound, as a clause
 */
export function countLoop(unit: Unit, node: ts.ForStatement): CountedLoop | string {
  const first = readStart(unit, node.initializer);
  if (first === undefined) return 'its start is not one index with a literal integer';
  const { index, start } = first;
  const limit = readLimit(unit, node.condition, index);
  if (limit === undefined) return 'its test is not the index against a literal integer';
  const step = readStep(unit, node.incrementor, index);
  if (step === undefined) return 'its step is not a literal integer';
  if (isIndexWritten(unit, node, index)) return `its index ${index.name} is also written elsewhere`;
  const span = limit.up ? limit.bound - start : start - limit.bound;
  const stride = limit.up ? step : -step;
  if (stride <= 0) return 'its step leads away from its bound';
  const rounds = limit.inclusive ? Math.floor(span / stride) + 1 : Math.ceil(span / stride);
  return { index, start, step, rounds: Math.max(0, rounds) };
}

function readStart(
  unit: Unit,
  initializer: ts.ForInitializer | undefined,
): { index: ts.Symbol; start: number } | undefined {
  if (initializer === undefined) return undefined;
  let name: ts.Node | undefined;
  let value: ts.Expression | undefined;
  if (ts.isVariableDeclarationList(initializer)) {
    if (initializer.declarations.length !== 1) return undefined;
    name = initializer.declarations[0]?.name;
    value = initializer.declarations[0]?.initializer;
  } else if (isAssignment(initializer) && initializer.operatorToken.kind === ts.SyntaxKind.EqualsToken) {
    name = initializer.left;
    value = initializer.right;
  }
  if (name === undefined || !ts.isIdentifier(name) || value === undefined) return undefined;
  const index = symbolOf(unit, name);
  const start = integerConstant(unit, value);
  return index === undefined || start === undefined ? undefined : { index, start };
}

function readLimit(
  unit: Unit,
  condition: ts.Expression | undefined,
  index: ts.Symbol,
): { bound: number; up: boolean; inclusive: boolean } | undefined {
  const test = condition === undefined ? undefined : bare(condition);
  if (test === undefined || !ts.isBinaryExpression(test)) return undefined;
  const indexIsLeft = isName(unit, test.left, index);
  if (!indexIsLeft && !isName(unit, test.right, index)) return undefined;
  const bound = integerConstant(unit, indexIsLeft ? test.right : test.left);
  if (bound === undefined) return undefined;
  switch (test.operatorToken.kind) {
    case ts.SyntaxKind.LessThanToken:
      return { bound, up: indexIsLeft, inclusive: false };
    case ts.SyntaxKind.LessThanEqualsToken:
      return { bound, up: indexIsLeft, inclusive: true };
    case ts.SyntaxKind.GreaterThanToken:
      return { bound, up: !indexIsLeft, inclusive: false };
    case ts.SyntaxKind.GreaterThanEqualsToken:
      return { bound, up: !indexIsLeft, inclusive: true };
    default:
      return undefined;
  }
}

function readStep(unit: Unit, incrementor: ts.Expression | undefined, index: ts.Symbol): number | undefined {
  const node = incrementor === undefined ? undefined : bare(incrementor);
  if (node === undefined) return undefined;
  if (isUpdate(node)) {
    if (!isName(unit, node.operand, index)) return undefined;
    return node.operator === ts.SyntaxKind.PlusPlusToken ? 1 : -1;
  }
  if (!isAssignment(node) || !isName(unit, node.left, index)) return undefined;
  if (node.operatorToken.kind === ts.SyntaxKind.PlusEqualsToken) return integerConstant(unit, node.right);
  if (node.operatorToken.kind === ts.SyntaxKind.MinusEqualsToken)
    return negated(integerConstant(unit, node.right));
  const sum = bare(node.right);
  if (node.operatorToken.kind !== ts.SyntaxKind.EqualsToken || !ts.isBinaryExpression(sum)) return undefined;
  if (!isName(unit, sum.left, index)) return undefined;
  if (sum.operatorToken.kind === ts.SyntaxKind.PlusToken) return integerConstant(unit, sum.right);
  if (sum.operatorToken.kind === ts.SyntaxKind.MinusToken) return negated(integerConstant(unit, sum.right));
  return undefined;
}

/** True where the index is written in the loop's body or test, or by another function that can see it. */
function isIndexWritten(unit: Unit, loop: ts.ForStatement, index: ts.Symbol): boolean {
  return (unit.writes.get(index) ?? []).some(({ target }) => {
    let node: ts.Node = target;
    while (node.parent !== loop) {
      if (isFunctionNode(node) || ts.isSourceFile(node.parent)) return isForeign(target, loop);
      node = node.parent;
    }
    return node !== loop.initializer && node !== loop.incrementor;
  });
}

/** True where a write stands in another function than the loop. */
function isForeign(target: ts.Node, loop: ts.Node): boolean {
  return ts.findAncestor(target, isFunctionNode) !== ts.findAncestor(loop, isFunctionNode);
}

function isName(unit: Unit, expression: ts.Expression, symbol: ts.Symbol): boolean {
  const node = bare(expression);
  return ts.isIdentifier(node) && symbolOf(unit, node) === symbol;
}

function integerConstant(unit: Unit, expression: ts.Expression): number | undefined {
  const value = numericConstant(unit, expression);
  return value !== undefined && value === (value | 0) ? value : undefined;
}

function negated(value: number | undefined): number | undefined {
  return value === undefined ? undefined : -value;
}
