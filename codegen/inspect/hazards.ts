import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { bare, excerpt, walkOwn } from './syntax.ts';
import { globalPath, numericConstant, type Unit } from './unit.ts';

export const exception: Rule = {
  code: 'inspect.exception',
  why: 'An exception allocates, and unwinding takes a time that the source does not show.',
  remedy: 'Return a status.',
};

export const withStatement: Rule = {
  code: 'inspect.with',
  why: 'Inside `with` a name may be a property or a variable, decided only while running.',
  remedy: 'Name the object at each use.',
};

export const evaluation: Rule = {
  code: 'inspect.eval',
  why: 'Code made while running cannot be inspected, and embedded engines often lack it.',
  remedy: 'Write the code out.',
};

export const deletion: Rule = {
  code: 'inspect.delete',
  why: 'Deleting a property changes the shape of the object, which slows all later reads of it.',
  remedy: 'Write a number that stands for "none".',
};

export const computedName: Rule = {
  code: 'inspect.computed-name',
  why: 'A property found by a computed name costs a search, and may turn a number into a string first.',
  remedy: 'Use a fixed name, or an array with a numeric index.',
};

export const looseEquality: Rule = {
  code: 'inspect.loose-equality',
  why: 'It converts its operands by rules of its own, which may call methods of objects.',
  remedy: 'Use === or !==.',
};

export const outsideOperator: Rule = {
  code: 'inspect.outside-operator',
  why: 'Its cost is not among the counted kinds and differs between parts.',
  remedy: 'Use + - * /, comparisons, ?: and Math.floor.',
};

/** Statements and operators whose cost or meaning is decided only while running. */
export function hazardFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  const add = (rule: Rule, at: ts.Node, what: string): void => {
    faults.push({ rule, at, what });
  };
  walkOwn(fn.node, (node) => {
    if (ts.isTryStatement(node)) add(exception, node, 'a try statement');
    else if (ts.isThrowStatement(node)) add(exception, node, 'a throw statement');
    else if (ts.isWithStatement(node)) add(withStatement, node, 'a with statement');
    else if (ts.isDeleteExpression(node)) add(deletion, node, `${excerpt(node)} removes a property`);
    else if (ts.isNewExpression(node) && globalPath(unit, node.expression) === 'Function') {
      add(evaluation, node, 'new Function makes code while running');
    } else if (ts.isElementAccessExpression(node)) {
      if (!isFixedIndex(unit, node.argumentExpression)) {
        add(
          computedName,
          node.argumentExpression,
          `the index ${excerpt(node.argumentExpression)} may be no number`,
        );
      }
    } else if (ts.isComputedPropertyName(node)) {
      if (!isFixedIndex(unit, node.expression)) add(computedName, node, 'a property with a computed name');
    } else if (ts.isBinaryExpression(node)) {
      const operator = ts.tokenToString(node.operatorToken.kind) ?? '';
      if (operator === '==' || operator === '!=') add(looseEquality, node, `a comparison by ${operator}`);
      else if (outsideBinary.has(operator)) add(outsideOperator, node, `the operator ${operator}`);
    } else if (ts.isTypeOfExpression(node)) add(outsideOperator, node, 'the operator typeof');
    else if (ts.isPrefixUnaryExpression(node) && outsidePrefix.has(node.operator)) {
      add(outsideOperator, node, `the operator ${ts.tokenToString(node.operator)}`);
    }
  });
  return faults;
}

const bitwise = ['&', '|', '^', '<<', '>>', '>>>'];
const outsideBinary: ReadonlySet<string> = new Set(
  [...bitwise, '%'].flatMap((operator) => [operator, `${operator}=`]).concat('in', 'instanceof'),
);
const outsidePrefix: ReadonlySet<ts.SyntaxKind> = new Set([
  ts.SyntaxKind.TildeToken,
  ts.SyntaxKind.PlusToken,
]);

/** True for an index that is surely a number, or one fixed name. */
function isFixedIndex(unit: Unit, index: ts.Expression): boolean {
  return (
    isNumeric(unit, index) || (unit.checker.getTypeAtLocation(index).flags & ts.TypeFlags.StringLiteral) !== 0
  );
}

function isNumeric(unit: Unit, expression: ts.Expression): boolean {
  const node = bare(expression);
  if (numericConstant(unit, node) !== undefined) return true;
  if ((unit.checker.getTypeAtLocation(node).flags & ts.TypeFlags.NumberLike) !== 0) return true;
  if (ts.isCallExpression(node)) return globalPath(unit, node.expression)?.startsWith('Math.') ?? false;
  if (ts.isConditionalExpression(node))
    return isNumeric(unit, node.whenTrue) && isNumeric(unit, node.whenFalse);
  return (
    ts.isBinaryExpression(node) &&
    node.operatorToken.kind === ts.SyntaxKind.PlusToken &&
    isNumeric(unit, node.left) &&
    isNumeric(unit, node.right)
  );
}
