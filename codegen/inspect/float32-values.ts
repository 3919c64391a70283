import { ts } from 'ts-morph';
import { calleeOf, isRounding } from './callees.ts';
import { countLoop } from './loops.ts';
import { bare } from './syntax.ts';
import { globalPath, symbolOf, type Unit } from './unit.ts';

/** The parts whose float32 form makes an exact operation's result float32; undefined for other expressions. */
export function exactParts(unit: Unit, node: ts.Expression): readonly ts.Expression[] | undefined {
  if (ts.isConditionalExpression(node)) return [node.whenTrue, node.whenFalse];
  if (ts.isPrefixUnaryExpression(node) && node.operator === ts.SyntaxKind.MinusToken) return [node.operand];
  if (ts.isBinaryExpression(node) && node.operatorToken.kind === ts.SyntaxKind.EqualsToken)
    return [node.right];
  if (!ts.isCallExpression(node)) return undefined;
  const callee = calleeOf(unit, node);
  const isExact = callee.kind === 'operation' && (callee.operation === 'abs' || callee.operation === 'floor');
  return isExact ? node.arguments : undefined;
}

/** True for an expression whose value is surely a float32 number, given which variables hold only such. */
export function isFloat32(unit: Unit, variables: ReadonlySet<ts.Symbol>, expression: ts.Expression): boolean {
  const node = bare(expression);
  const exact = exactParts(unit, node);
  if (exact !== undefined) return exact.every((part) => isFloat32(unit, variables, part));
  if (ts.isNumericLiteral(node)) return Math.fround(Number(node.text)) === Number(node.text);
  if (ts.isBinaryExpression(node)) return isSelfDifference(unit, node);
  if (ts.isElementAccessExpression(node)) return isFloat32Array(unit, node.expression);
  if (ts.isIdentifier(node)) {
    const symbol = symbolOf(unit, node);
    return symbol === undefined ? node.text === 'Infinity' || node.text === 'NaN' : variables.has(symbol);
  }
  return isRounding(unit, node);
}

/** The variables of a file that never hold anything but float32 numbers: the largest set that agrees with itself. */
export function float32Variables(unit: Unit): Set<ts.Symbol> {
  const sources = new Map<ts.Symbol, (ts.Expression | null)[]>();
  const visit = (node: ts.Node): void => {
    if (ts.isVariableDeclaration(node) && ts.isIdentifier(node.name))
      addSources(unit, sources, node, node.name);
    ts.forEachChild(node, visit);
  };
  visit(unit.source);
  const known = [...sources].filter(([, values]) => values.length > 0); // not one that is only declared
  const variables = new Set(known.map(([symbol]) => symbol));
  for (let size = -1; size !== variables.size; ) {
    size = variables.size;
    for (const [symbol, values] of sources) {
      if (values.some((value) => value === null || !isFloat32(unit, variables, value)))
        variables.delete(symbol);
    }
  }
  return variables;
}

function addSources(
  unit: Unit,
  sources: Map<ts.Symbol, (ts.Expression | null)[]>,
  declaration: ts.VariableDeclaration,
  name: ts.Identifier,
): void {
  const symbol = symbolOf(unit, name);
  if (symbol === undefined) return;
  const loop = declaration.parent.parent;
  const values = sources.get(symbol) ?? [];
  sources.set(symbol, values);
  if (ts.isForInStatement(loop) || ts.isForOfStatement(loop) || ts.isCatchClause(declaration.parent))
    values.push(null);
  if (declaration.initializer !== undefined) values.push(declaration.initializer);
  for (const write of unit.writes.get(symbol) ?? []) {
    if (!isSmallStep(unit, write.target)) values.push(write.value);
  }
}

/** True where a write is the step of a counted loop whose index stays within 2^24. */
function isSmallStep(unit: Unit, target: ts.Identifier): boolean {
  const node = ts.findAncestor(target, ts.isForStatement);
  const isStep =
    node !== undefined && ts.findAncestor(target, (one) => one === node.incrementor) !== undefined;
  const loop = isStep ? countLoop(unit, node) : '';
  if (typeof loop === 'string' || loop.index !== symbolOf(unit, target)) return false;
  return Math.max(Math.abs(loop.start), Math.abs(loop.start + loop.rounds * loop.step)) <= 2 ** 24;
}

/** True for a variable that is declared as a Float32Array, by type, by JSDoc or by what it is constructed as. */
function isFloat32Array(unit: Unit, expression: ts.Expression): boolean {
  const node = bare(expression);
  const symbol = ts.isIdentifier(node) ? symbolOf(unit, node) : undefined;
  const declaration = symbol?.declarations?.[0];
  if (declaration === undefined || !(ts.isParameter(declaration) || ts.isVariableDeclaration(declaration)))
    return false;
  const type = declaration.type ?? ts.getJSDocType(declaration);
  if (type !== undefined) return ts.isTypeReferenceNode(type) && type.typeName.getText() === 'Float32Array';
  const value = declaration.initializer === undefined ? undefined : bare(declaration.initializer);
  return (
    value !== undefined &&
    ts.isNewExpression(value) &&
    globalPath(unit, value.expression) === 'Float32Array' &&
    !unit.writes.has(symbol!)
  );
}

/** True for `x - x` of one variable, which is exactly 0, or NaN for what is not finite. */
export function isSelfDifference(unit: Unit, node: ts.BinaryExpression): boolean {
  if (node.operatorToken.kind !== ts.SyntaxKind.MinusToken) return false;
  const left = bare(node.left);
  const right = bare(node.right);
  return ts.isIdentifier(left) && ts.isIdentifier(right) && symbolOf(unit, left) === symbolOf(unit, right);
}
