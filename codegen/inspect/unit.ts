import { ts } from 'ts-morph';
import { exportedNodes } from './exports.ts';
import { findFunctions, type OwnFunction } from './functions.ts';
import type { ParsedSource } from './source.ts';
import { bare, isAssignment, isFunctionNode, isUpdate } from './syntax.ts';

/** One write to a variable after its declaration. */
export interface Write {
  readonly target: ts.Identifier;
  /** What is written, for a plain `=`; null where the value comes from an operator, a pattern or a loop. */
  readonly value: ts.Expression | null;
}

/** A file under inspection: its functions and what its names stand for. */
export interface Unit extends ParsedSource {
  /** The functions by node, in order of their text. */
  readonly functions: ReadonlyMap<ts.Node, OwnFunction>;
  /** Every write to a variable, by symbol; declarations are not writes. */
  readonly writes: ReadonlyMap<ts.Symbol, readonly Write[]>;
}

/** Gathers what all rules ask about a file. */
export function makeUnit(parsed: ParsedSource): Unit {
  const functions = findFunctions(parsed.source, exportedNodes(parsed));
  return { ...parsed, functions, writes: findWrites(parsed) };
}

/** The symbol of a variable, or undefined for a name that the file does not declare (a global). */
export function symbolOf(parsed: ParsedSource, name: ts.Identifier): ts.Symbol | undefined {
  const symbol = ts.isShorthandPropertyAssignment(name.parent)
    ? parsed.checker.getShorthandAssignmentValueSymbol(name.parent)
    : parsed.checker.getSymbolAtLocation(name);
  return symbol?.declarations === undefined || symbol.declarations.length === 0 ? undefined : symbol;
}

/** The declaration of a variable that is declared once and never written again, else undefined. */
export function steadyDeclaration(unit: Unit, name: ts.Identifier): ts.Declaration | undefined {
  const symbol = symbolOf(unit, name);
  if (symbol === undefined || unit.writes.has(symbol)) return undefined;
  const declarations = symbol.declarations!.filter(
    (node) => !ts.isFunctionLike(node) || isFunctionNode(node),
  );
  return declarations.length === 1 ? declarations[0] : undefined;
}

/** The initial value of a variable that never gets another one, else undefined. */
export function steadyValue(unit: Unit, name: ts.Identifier): ts.Expression | undefined {
  const declaration = steadyDeclaration(unit, name);
  return declaration !== undefined &&
    ts.isVariableDeclaration(declaration) &&
    ts.isIdentifier(declaration.name)
    ? declaration.initializer
    : undefined;
}

/** Follows names of steady variables to the expression that they stand for. */
export function dereference(unit: Unit, expression: ts.Expression): ts.Expression {
  let current = bare(expression);
  const seen = new Set<ts.Node>();
  while (ts.isIdentifier(current) && !seen.has(current)) {
    seen.add(current);
    const value = steadyValue(unit, current);
    if (value === undefined) return current;
    current = bare(value);
  }
  return current;
}

/** The value of a numeric literal, negated or named by a steady variable; undefined for anything else. */
export function numericConstant(unit: Unit, expression: ts.Expression): number | undefined {
  const node = dereference(unit, expression);
  if (ts.isNumericLiteral(node)) return Number(node.text);
  if (ts.isPrefixUnaryExpression(node) && node.operator === ts.SyntaxKind.MinusToken) {
    const operand = bare(node.operand);
    return ts.isNumericLiteral(operand) ? -Number(operand.text) : undefined;
  }
  return undefined;
}

/**
 * The dotted path from a global that an expression stands for, such as `Math.fround`, through aliases
 * (`const fround = Math.fround`, `const { fround } = Math`); undefined where it is not one.
 */
export function globalPath(unit: Unit, expression: ts.Expression): string | undefined {
  return pathOf(unit, expression, new Set());
}

/** @param seen the patterns on the way here, so that one that refers to itself ends the search */
function pathOf(unit: Unit, expression: ts.Expression, seen: Set<ts.Node>): string | undefined {
  const node = dereference(unit, expression);
  if (ts.isIdentifier(node)) {
    if (symbolOf(unit, node) === undefined) return node.text;
    const declaration = steadyDeclaration(unit, node);
    return declaration !== undefined && ts.isBindingElement(declaration)
      ? bindingPath(unit, declaration, seen)
      : undefined;
  }
  if (ts.isPropertyAccessExpression(node))
    return joinPath(pathOf(unit, node.expression, seen), node.name.text);
  if (ts.isElementAccessExpression(node) && ts.isStringLiteralLike(node.argumentExpression)) {
    return joinPath(pathOf(unit, node.expression, seen), node.argumentExpression.text);
  }
  return undefined;
}

function bindingPath(unit: Unit, element: ts.BindingElement, seen: Set<ts.Node>): string | undefined {
  const declaration = element.parent.parent;
  if (!ts.isVariableDeclaration(declaration) || declaration.initializer === undefined) return undefined;
  const key = element.propertyName ?? element.name;
  if (!ts.isObjectBindingPattern(element.parent) || !ts.isIdentifier(key)) return undefined;
  if (element.initializer !== undefined || element.dotDotDotToken !== undefined) return undefined;
  if (seen.has(element)) return undefined;
  return joinPath(pathOf(unit, declaration.initializer, seen.add(element)), key.text);
}

function joinPath(base: string | undefined, name: string): string | undefined {
  return base === undefined ? undefined : `${base}.${name}`;
}

/** The function of this file that an expression stands for, if it can be no other. */
export function ownFunction(unit: Unit, expression: ts.Expression): OwnFunction | undefined {
  const node = dereference(unit, expression);
  const declared = ts.isIdentifier(node) ? steadyDeclaration(unit, node) : node;
  return declared === undefined ? undefined : unit.functions.get(declared);
}

function findWrites(parsed: ParsedSource): Map<ts.Symbol, Write[]> {
  const writes = new Map<ts.Symbol, Write[]>();
  const add = (target: ts.Node, value: ts.Expression | null): void => {
    if (!ts.isExpression(target)) return;
    const node = bare(target);
    if (ts.isIdentifier(node)) {
      const symbol = symbolOf(parsed, node);
      if (symbol === undefined) return;
      const known = writes.get(symbol);
      if (known === undefined) writes.set(symbol, [{ target: node, value }]);
      else known.push({ target: node, value });
    } else if (ts.isArrayLiteralExpression(node)) {
      for (const element of node.elements) add(patternTarget(element), null);
    } else if (ts.isObjectLiteralExpression(node)) {
      for (const property of node.properties) add(patternTarget(property), null);
    }
  };
  const visit = (node: ts.Node): void => {
    if (isAssignment(node)) {
      add(node.left, node.operatorToken.kind === ts.SyntaxKind.EqualsToken ? node.right : null);
    } else if (isUpdate(node)) add(node.operand, null);
    else if (ts.isForInStatement(node) || ts.isForOfStatement(node)) add(node.initializer, null);
    ts.forEachChild(node, visit);
  };
  visit(parsed.source);
  return writes;
}

/** The target that one part of an assignment pattern writes to. */
function patternTarget(node: ts.Node): ts.Node {
  if (ts.isShorthandPropertyAssignment(node)) return node.name;
  if (ts.isPropertyAssignment(node)) return patternTarget(node.initializer);
  if (ts.isSpreadElement(node) || ts.isSpreadAssignment(node)) return node.expression;
  if (isAssignment(node)) return node.left;
  return node;
}
