import { ts } from 'ts-morph';
import { type FunctionNode, isFunctionNode, wrapped } from './syntax.ts';

/** A function of the inspected file. */
export interface OwnFunction {
  readonly node: FunctionNode;
  /** Its name, after those of the functions and the class around it: `make.position`, `Filter.step`. */
  readonly name: string;
  readonly exported: boolean;
  /** The function that creates it each time that one runs; null where it exists once, from loading on. */
  readonly outer: OwnFunction | null;
}

/**
 * All functions of a file in order of their text. An unnamed function that is called on the spot at module level
 * runs once, while the file loads: it counts as module-level code and is not among them.
 *
 * @param exported the nodes that `exportedNodes` found
 */
export function findFunctions(
  source: ts.SourceFile,
  exported: ReadonlySet<ts.Node>,
): Map<FunctionNode, OwnFunction> {
  const functions = new Map<FunctionNode, OwnFunction>();
  const visit = (node: ts.Node, outer: OwnFunction | null): void => {
    let inner = outer;
    if (isFunctionNode(node) && !(outer === null && runsAtLoad(node))) {
      inner = { node, name: fullName(node, outer), exported: exported.has(node), outer };
      functions.set(node, inner);
    }
    ts.forEachChild(node, (child) => visit(child, inner));
  };
  visit(source, null);
  return functions;
}

function runsAtLoad(node: FunctionNode): boolean {
  if (!(ts.isArrowFunction(node) || (ts.isFunctionExpression(node) && node.name === undefined))) return false;
  if (node.asteriskToken !== undefined || hasModifier(node, ts.SyntaxKind.AsyncKeyword)) return false;
  const outer = wrapped(node);
  return ts.isCallExpression(outer.parent) && outer.parent.expression === outer;
}

/** True where a declaration carries a modifier, such as `async`. */
export function hasModifier(node: FunctionNode, kind: ts.ModifierSyntaxKind): boolean {
  return node.modifiers?.some((modifier) => modifier.kind === kind) ?? false;
}

function fullName(node: FunctionNode, outer: OwnFunction | null): string {
  const name = simpleName(node);
  const owner = ts.isClassLike(node.parent) ? `${node.parent.name?.text ?? '(class)'}.${name}` : name;
  return outer === null ? owner : `${outer.name}.${owner}`;
}

function simpleName(node: FunctionNode): string {
  if (ts.isConstructorDeclaration(node)) return 'constructor';
  if (node.name !== undefined) return node.name.getText();
  const parent = wrapped(node).parent;
  if (
    ts.isVariableDeclaration(parent) ||
    ts.isPropertyAssignment(parent) ||
    ts.isPropertyDeclaration(parent)
  ) {
    return parent.name.getText();
  }
  if (ts.isBinaryExpression(parent)) {
    if (ts.isIdentifier(parent.left)) return parent.left.text;
    if (ts.isPropertyAccessExpression(parent.left)) return parent.left.name.text;
  }
  return ts.isExportAssignment(parent) || isDefaultExport(node) ? 'default' : '(unnamed)';
}

function isDefaultExport(node: FunctionNode): boolean {
  return hasModifier(node, ts.SyntaxKind.DefaultKeyword);
}
