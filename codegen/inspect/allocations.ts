import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { isFunctionNode, isReference, isTarget, walkOwn } from './syntax.ts';
import { globalPath, symbolOf, type Unit } from './unit.ts';

const heap = 'It takes memory from the heap at each call, which the garbage collector has to clear later.';

export const objectLiteral: Rule = {
  code: 'inspect.object-literal',
  why: heap,
  remedy: 'Return values through an array that the caller allocated once.',
};

export const arrayLiteral: Rule = {
  code: 'inspect.array-literal',
  why: heap,
  remedy: 'Use separate variables, or an array that was made at module level.',
};

export const construction: Rule = {
  code: 'inspect.construction',
  why: heap,
  remedy: 'Construct it once at start-up and hand it in as a parameter.',
};

export const closure: Rule = {
  code: 'inspect.closure',
  why: 'A function object is made each time the line runs, and it keeps the variables around it alive.',
  remedy: 'Move the function to module level and pass what it needs as parameters.',
};

export const classInFunction: Rule = {
  code: 'inspect.class',
  why: 'A class inside a function makes a constructor and a prototype each time the line runs.',
  remedy: 'Move the class to module level.',
};

export const boxedValue: Rule = {
  code: 'inspect.boxed-value',
  why: 'The value lives on the heap instead of in a register.',
  remedy: 'Use plain numbers.',
};

export const regularExpression: Rule = {
  code: 'inspect.regular-expression',
  why: 'A regular expression object is made at each call, and the time a match takes depends on the data.',
  remedy: 'Read text before the kernel runs, and hand numbers in.',
};

export const restParameter: Rule = {
  code: 'inspect.rest-parameter',
  why: 'An array is made at each call to hold the arguments.',
  remedy: 'Name each parameter.',
};

export const argumentsObject: Rule = {
  code: 'inspect.arguments-object',
  why: 'Mentioning `arguments` makes the engine build an object at each call.',
  remedy: 'Name each parameter.',
};

export const accessor: Rule = {
  code: 'inspect.accessor',
  why: 'A read or write of the property runs a function that the reading line does not show.',
  remedy: 'Use a plain property or a named function.',
};

const boxes: ReadonlySet<string> = new Set(['Number', 'String', 'Boolean', 'Object']);

/** Objects, functions and boxed values that a call creates, but for strings and iterators. */
export function allocationFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  const add = (rule: Rule, at: ts.Node, what: string): void => {
    faults.push({ rule, at, what });
  };
  if (ts.isAccessor(fn.node)) add(accessor, fn.node, `${fn.name} is a getter or setter`);
  walkOwn(fn.node, (node) => {
    if (ts.isObjectLiteralExpression(node)) {
      if (!isTarget(node)) add(objectLiteral, node, 'an object literal inside a function');
    } else if (ts.isJsxElement(node) || ts.isJsxSelfClosingElement(node) || ts.isJsxFragment(node)) {
      add(objectLiteral, node, 'an element literal inside a function');
    } else if (ts.isEnumDeclaration(node)) add(objectLiteral, node, 'an enum inside a function');
    else if (ts.isArrayLiteralExpression(node)) {
      if (!isTarget(node)) add(arrayLiteral, node, 'an array literal inside a function');
    } else if (ts.isNewExpression(node)) addConstruction(unit, node, add);
    else if (isFunctionNode(node)) {
      if (!ts.isClassLike(node.parent)) add(closure, node, 'a function is created inside a function');
    } else if (ts.isClassLike(node)) add(classInFunction, node, 'a class is created inside a function');
    else if (ts.isBigIntLiteral(node)) add(boxedValue, node, 'a bigint literal');
    else if (isBigArithmetic(unit, node)) add(boxedValue, node, 'bigint arithmetic');
    else if (ts.isRegularExpressionLiteral(node))
      add(regularExpression, node, 'a regular expression literal');
    else if (ts.isParameter(node) && node.dotDotDotToken !== undefined) {
      add(restParameter, node, 'a rest parameter');
    } else if (isReference(node) && node.text === 'arguments' && symbolOf(unit, node) === undefined) {
      add(argumentsObject, node, 'a use of the arguments object');
    }
  });
  return faults;
}

/** True for an operator whose result is known to be a bigint. */
export function isBigArithmetic(unit: Unit, node: ts.Node): boolean {
  if (!ts.isBinaryExpression(node) || node.operatorToken.kind === ts.SyntaxKind.EqualsToken) return false;
  return (unit.checker.getTypeAtLocation(node).flags & ts.TypeFlags.BigIntLike) !== 0;
}

function addConstruction(
  unit: Unit,
  node: ts.NewExpression,
  add: (rule: Rule, at: ts.Node, what: string) => void,
): void {
  const path = globalPath(unit, node.expression);
  if (path === 'Function') return; // an evaluation, reported as such
  if (path === 'RegExp') add(regularExpression, node, 'new RegExp makes a regular expression');
  else if (path !== undefined && boxes.has(path)) add(boxedValue, node, `new ${path} makes a boxed value`);
  else add(construction, node, `new ${node.expression.getText()} inside a function`);
}
