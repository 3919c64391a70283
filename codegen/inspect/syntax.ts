import { ts } from 'ts-morph';

/** A function of any form that carries a body. */
export type FunctionNode =
  | ts.FunctionDeclaration
  | ts.FunctionExpression
  | ts.ArrowFunction
  | ts.MethodDeclaration
  | ts.ConstructorDeclaration
  | ts.AccessorDeclaration;

/** True for a function with a body; overloads, signatures and ambient declarations have none. */
export function isFunctionNode(node: ts.Node): node is FunctionNode {
  return (
    (ts.isFunctionDeclaration(node) ||
      ts.isFunctionExpression(node) ||
      ts.isArrowFunction(node) ||
      ts.isMethodDeclaration(node) ||
      ts.isConstructorDeclaration(node) ||
      ts.isAccessor(node)) &&
    node.body !== undefined
  );
}

/** True for what exists at compile time only and never runs. */
export function isErased(node: ts.Node): boolean {
  return ts.isTypeNode(node) || ts.isInterfaceDeclaration(node) || ts.isTypeAliasDeclaration(node);
}

/**
 * Visits what runs when a function is called: its parameters and body. A nested function is visited, for it is
 * created there, but not entered.
 */
export function walkOwn(fn: FunctionNode, visit: (node: ts.Node) => void): void {
  const step = (node: ts.Node): void => {
    if (isErased(node)) return;
    visit(node);
    if (!isFunctionNode(node)) ts.forEachChild(node, step);
  };
  for (const parameter of fn.parameters) step(parameter);
  if (fn.body !== undefined) step(fn.body);
}

/** The expression inside parentheses, `as`, `satisfies`, `!` and `<T>`. */
export function bare(node: ts.Expression): ts.Expression {
  let inner = node;
  while (isWrapper(inner)) inner = inner.expression;
  return inner;
}

/** The outermost node that only wraps this one: the counterpart of `bare`. */
export function wrapped(node: ts.Node): ts.Node {
  let outer = node;
  while (isWrapper(outer.parent)) outer = outer.parent;
  return outer;
}

type Wrapper =
  | ts.ParenthesizedExpression
  | ts.AsExpression
  | ts.SatisfiesExpression
  | ts.NonNullExpression
  | ts.TypeAssertion;

/** True for a node that changes neither the value nor the cost of what it holds. */
export function isWrapper(node: ts.Node): node is Wrapper {
  return (
    ts.isParenthesizedExpression(node) ||
    ts.isAsExpression(node) ||
    ts.isSatisfiesExpression(node) ||
    ts.isNonNullExpression(node) ||
    ts.isTypeAssertionExpression(node)
  );
}

/** The token a finding points at: an operator, a method's name in a chain, else the start of the node. */
export function anchor(node: ts.Node): ts.Node {
  if (ts.isBinaryExpression(node)) return node.operatorToken;
  if (ts.isCallExpression(node) && ts.isPropertyAccessExpression(node.expression))
    return node.expression.name;
  return node;
}

/** True for an identifier that stands for a value, not for the name of a declaration, property or label. */
export function isReference(node: ts.Node): node is ts.Identifier {
  if (!ts.isIdentifier(node)) return false;
  if (ts.isShorthandPropertyAssignment(node.parent)) return true;
  const parent = node.parent as { name?: unknown; propertyName?: unknown; label?: unknown };
  return parent.name !== node && parent.propertyName !== node && parent.label !== node;
}

/** True for `a = b`, `a += b` and their like. */
export function isAssignment(node: ts.Node): node is ts.AssignmentExpression<ts.AssignmentOperatorToken> {
  return (
    ts.isBinaryExpression(node) &&
    node.operatorToken.kind >= ts.SyntaxKind.FirstAssignment &&
    node.operatorToken.kind <= ts.SyntaxKind.LastAssignment
  );
}

/** True for `using` and `await using` declarations, which call a method of the value when their block ends. */
export function isUsing(node: ts.Node): boolean {
  return ts.isVariableDeclarationList(node) && (node.flags & ts.NodeFlags.Using) !== 0;
}

/** True for `++` and `--`, before or after their operand. */
export function isUpdate(node: ts.Node): node is ts.PrefixUnaryExpression | ts.PostfixUnaryExpression {
  return (
    ts.isPostfixUnaryExpression(node) ||
    (ts.isPrefixUnaryExpression(node) &&
      (node.operator === ts.SyntaxKind.PlusPlusToken || node.operator === ts.SyntaxKind.MinusMinusToken))
  );
}

/**
 * True for an array or object literal that stands as the target of an assignment, where nothing is created:
 * `[a, b] = pair`, `({ x } = point)`, `for ([a] of pairs)` and what is nested in them.
 */
export function isTarget(node: ts.Node): boolean {
  const outer = wrapped(node);
  const parent = outer.parent;
  if (isAssignment(parent)) return parent.left === outer;
  if (ts.isForOfStatement(parent) || ts.isForInStatement(parent)) return parent.initializer === outer;
  if (ts.isPropertyAssignment(parent)) return parent.initializer === outer && isTarget(parent.parent);
  if (ts.isSpreadElement(parent) || ts.isSpreadAssignment(parent)) return isTarget(parent.parent);
  return ts.isArrayLiteralExpression(parent) && isTarget(parent);
}

/** At most `limit` characters of a node's text, on one line, for a message. */
export function excerpt(node: ts.Node, limit = 40): string {
  const text = node.getText().replace(/\s+/g, ' ');
  return text.length <= limit ? text : `${text.slice(0, limit - 3)}...`;
}
