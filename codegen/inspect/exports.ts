import { ts } from 'ts-morph';
import type { ParsedSource } from './source.ts';
import { isAssignment, isWrapper } from './syntax.ts';

/** Targets of an assignment by which a CommonJS module exports. */
const commonTarget = /^(module\.)?exports(\.\w+)?$/;

/** The nodes that a file exports, functions among them, as an ES module or by `exports` and `module.exports`. */
export function exportedNodes(parsed: ParsedSource): ReadonlySet<ts.Node> {
  const nodes = new Set<ts.Node>();
  const addSymbol = (symbol: ts.Symbol | undefined): void => {
    if (symbol === undefined) return;
    const isAlias = (symbol.flags & ts.SymbolFlags.Alias) !== 0;
    const target = isAlias ? parsed.checker.getAliasedSymbol(symbol) : symbol;
    for (const declaration of target.declarations ?? []) add(declaration);
  };
  const add = (node: ts.Node | undefined): void => {
    if (node === undefined || nodes.has(node)) return;
    nodes.add(node);
    if (isWrapper(node) || ts.isExportAssignment(node)) add(node.expression);
    else if (ts.isClassLike(node)) node.members.forEach(add);
    else if (ts.isObjectLiteralExpression(node)) node.properties.forEach(add);
    else if (ts.isVariableDeclaration(node) || ts.isPropertyAssignment(node)) add(node.initializer);
    else if (ts.isPropertyDeclaration(node)) add(node.initializer);
    else if (ts.isIdentifier(node)) addSymbol(parsed.checker.getSymbolAtLocation(node));
    else if (ts.isShorthandPropertyAssignment(node)) {
      addSymbol(parsed.checker.getShorthandAssignmentValueSymbol(node));
    }
  };
  const module = parsed.checker.getSymbolAtLocation(parsed.source);
  if (module === undefined) commonExports(parsed.source).forEach(add);
  else parsed.checker.getExportsOfModule(module).forEach(addSymbol);
  return nodes;
}

/** The values that a CommonJS module assigns to its exports, in the statements of the module itself. */
function commonExports(source: ts.SourceFile): ts.Node[] {
  return source.statements.flatMap((statement) => {
    if (!ts.isExpressionStatement(statement) || !isAssignment(statement.expression)) return [];
    const { left, right } = statement.expression;
    return commonTarget.test(left.getText()) ? [right] : [];
  });
}
