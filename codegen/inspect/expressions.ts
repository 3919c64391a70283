import { ts } from 'ts-morph';
import { isBigArithmetic } from './allocations.ts';
import { calleeOf } from './callees.ts';
import type { OwnFunction } from './functions.ts';
import { fromCounts, none, type OperationKind, type Operations, sum, worse } from './operations.ts';
import { isConcatenation } from './strings.ts';
import { bare, isAssignment, isErased, isFunctionNode, isUpdate, isWrapper } from './syntax.ts';
import type { Unit } from './unit.ts';

/** What counting one function needs from around it. */
export interface CountContext {
  readonly unit: Unit;
  /** Counts of a called function; none for one whose count has no bound. */
  callee(fn: OwnFunction): Operations;
  /** Notes something whose cost the counted kinds do not hold, so that the counts are a lower bound. */
  uncounted(): void;
  /** Notes a loop or a recursion without bound. */
  unbounded(): void;
}

const binaryKinds: ReadonlyMap<ts.SyntaxKind, OperationKind> = new Map([
  [ts.SyntaxKind.PlusToken, 'add'],
  [ts.SyntaxKind.MinusToken, 'sub'],
  [ts.SyntaxKind.AsteriskToken, 'mul'],
  [ts.SyntaxKind.SlashToken, 'div'],
  [ts.SyntaxKind.PlusEqualsToken, 'add'],
  [ts.SyntaxKind.MinusEqualsToken, 'sub'],
  [ts.SyntaxKind.AsteriskEqualsToken, 'mul'],
  [ts.SyntaxKind.SlashEqualsToken, 'div'],
  [ts.SyntaxKind.LessThanToken, 'compare'],
  [ts.SyntaxKind.LessThanEqualsToken, 'compare'],
  [ts.SyntaxKind.GreaterThanToken, 'compare'],
  [ts.SyntaxKind.GreaterThanEqualsToken, 'compare'],
  [ts.SyntaxKind.EqualsEqualsEqualsToken, 'compare'],
  [ts.SyntaxKind.ExclamationEqualsEqualsToken, 'compare'],
  [ts.SyntaxKind.EqualsEqualsToken, 'compare'],
  [ts.SyntaxKind.ExclamationEqualsToken, 'compare'],
] as const);

/** Operators that count nothing themselves: the worst path takes both operands. */
const freeOperators: ReadonlySet<ts.SyntaxKind> = new Set([
  ts.SyntaxKind.AmpersandAmpersandToken,
  ts.SyntaxKind.BarBarToken,
  ts.SyntaxKind.QuestionQuestionToken,
  ts.SyntaxKind.CommaToken,
  ts.SyntaxKind.EqualsToken,
  ts.SyntaxKind.AmpersandAmpersandEqualsToken,
  ts.SyntaxKind.BarBarEqualsToken,
  ts.SyntaxKind.QuestionQuestionEqualsToken,
]);

/** Expressions that cost nothing: literals, names, `this`. */
function isFree(node: ts.Node): boolean {
  return (
    ts.isNumericLiteral(node) ||
    ts.isStringLiteralLike(node) ||
    ts.isIdentifier(node) ||
    ts.isPrivateIdentifier(node) ||
    node.kind === ts.SyntaxKind.ThisKeyword ||
    node.kind === ts.SyntaxKind.TrueKeyword ||
    node.kind === ts.SyntaxKind.FalseKeyword ||
    node.kind === ts.SyntaxKind.NullKeyword
  );
}

/** The operations of an expression on its worst path. */
export function countExpression(context: CountContext, node: ts.Node): Operations {
  const count = (part: ts.Node): Operations => countExpression(context, part);
  if (isFree(node)) return none;
  if (isWrapper(node) || ts.isVoidExpression(node)) return count(node.expression);
  if (isUpdate(node)) return countUpdate(context, node);
  if (ts.isPrefixUnaryExpression(node)) return countPrefix(context, node);
  if (ts.isBinaryExpression(node)) return countBinary(context, node);
  if (ts.isConditionalExpression(node)) {
    return sum(one('select'), count(node.condition), worse(count(node.whenTrue), count(node.whenFalse)));
  }
  if (ts.isPropertyAccessExpression(node)) return sum(one('load'), count(node.expression));
  if (ts.isElementAccessExpression(node)) {
    return sum(one('load'), count(node.expression), count(node.argumentExpression));
  }
  if (ts.isCallExpression(node)) return countCall(context, node);
  context.uncounted();
  return countParts(context, node);
}

function one(kind: OperationKind): Operations {
  return fromCounts({ [kind]: 1 });
}

/** The operations of all parts of a node whose own cost is not counted; what is created there does not run. */
function countParts(context: CountContext, node: ts.Node): Operations {
  if (isFunctionNode(node) || ts.isClassLike(node)) return none;
  const parts: Operations[] = [];
  ts.forEachChild(node, (part) => {
    if (!isErased(part) && !ts.isToken(part)) parts.push(countExpression(context, part));
  });
  return sum(...parts);
}

function countPrefix(context: CountContext, node: ts.PrefixUnaryExpression): Operations {
  const operand = countExpression(context, node.operand);
  if (node.operator === ts.SyntaxKind.ExclamationToken) return operand;
  if (node.operator === ts.SyntaxKind.MinusToken) {
    return ts.isNumericLiteral(bare(node.operand)) ? none : sum(one('neg'), operand);
  }
  context.uncounted();
  return operand;
}

function countUpdate(
  context: CountContext,
  node: ts.PrefixUnaryExpression | ts.PostfixUnaryExpression,
): Operations {
  const kind = node.operator === ts.SyntaxKind.PlusPlusToken ? 'add' : 'sub';
  return sum(one(kind), countTarget(context, node.operand, true));
}

function countBinary(context: CountContext, node: ts.BinaryExpression): Operations {
  const operator = node.operatorToken.kind;
  const isBoxed = isConcatenation(context.unit, node) || isBigArithmetic(context.unit, node);
  const kind = isBoxed ? undefined : binaryKinds.get(operator);
  if (kind === undefined && !freeOperators.has(operator)) context.uncounted();
  const left = isAssignment(node)
    ? countTarget(context, node.left, operator !== ts.SyntaxKind.EqualsToken)
    : countExpression(context, node.left);
  return sum(kind === undefined ? none : one(kind), left, countExpression(context, node.right));
}

/** The operations of writing to a target, and of reading it first where the operator does so. */
function countTarget(context: CountContext, target: ts.Expression, isRead: boolean): Operations {
  const node = bare(target);
  if (ts.isIdentifier(node)) return none;
  if (ts.isArrayLiteralExpression(node) || ts.isObjectLiteralExpression(node)) {
    context.uncounted();
    return countParts(context, node);
  }
  const access = countExpression(context, node);
  return isRead ? sum(access, one('store')) : sum(access, one('store'), fromCounts({ load: -1 }));
}

function countCall(context: CountContext, call: ts.CallExpression): Operations {
  const operands = sum(...call.arguments.map((argument) => countExpression(context, argument)));
  const callee = calleeOf(context.unit, call);
  if (callee.kind === 'operation') return sum(one(callee.operation), operands);
  if (callee.kind === 'own') return sum(context.callee(callee.fn), operands);
  context.uncounted();
  return sum(countExpression(context, call.expression), operands);
}
