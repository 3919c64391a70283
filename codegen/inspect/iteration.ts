import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import { hasModifier, type OwnFunction } from './functions.ts';
import { isTarget, walkOwn } from './syntax.ts';
import type { Unit } from './unit.ts';

export const iteration: Rule = {
  code: 'inspect.iteration',
  why: 'The iteration protocol makes an iterator and one result object a step, and its length is up to the data.',
  remedy: 'Read elements by index, with a literal bound.',
};

export const generator: Rule = {
  code: 'inspect.generator',
  why: 'Each call makes a generator object, and each yield a result object.',
  remedy: 'Write results into an array that the caller hands in.',
};

export const asynchronous: Rule = {
  code: 'inspect.async',
  why: 'Each call makes a promise, and the rest of the work runs at a time that the caller does not choose.',
  remedy: 'Make the function synchronous.',
};

export const objectRest: Rule = {
  code: 'inspect.object-rest',
  why: 'The remaining properties are copied into a new object.',
  remedy: 'Read each property by its name.',
};

/** Uses of the iteration protocol, generators, asynchronous functions and copies by rest. */
export function iterationFaults(_unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  const add = (rule: Rule, at: ts.Node, what: string): void => {
    faults.push({ rule, at, what });
  };
  const star = 'asteriskToken' in fn.node ? fn.node.asteriskToken : undefined;
  if (star !== undefined) add(generator, star, `${fn.name} is a generator`);
  if (hasModifier(fn.node, ts.SyntaxKind.AsyncKeyword)) {
    const keyword = fn.node.modifiers?.find((modifier) => modifier.kind === ts.SyntaxKind.AsyncKeyword);
    add(asynchronous, keyword ?? fn.node, `${fn.name} is asynchronous`);
  }
  walkOwn(fn.node, (node) => {
    if (ts.isForOfStatement(node)) add(iteration, node, 'a for-of loop');
    else if (ts.isArrayBindingPattern(node)) add(iteration, node, 'an array is destructured');
    else if (ts.isArrayLiteralExpression(node)) {
      if (isTarget(node)) add(iteration, node, 'an array is destructured');
    } else if (ts.isSpreadElement(node)) {
      if (!isTarget(node.parent)) add(iteration, node, 'a spread of values');
    } else if (ts.isSpreadAssignment(node)) {
      if (isTarget(node.parent)) add(objectRest, node, 'an object is destructured with rest');
    } else if (isObjectRest(node)) add(objectRest, node, 'an object is destructured with rest');
  });
  return faults;
}

function isObjectRest(node: ts.Node): boolean {
  return (
    ts.isBindingElement(node) && node.dotDotDotToken !== undefined && ts.isObjectBindingPattern(node.parent)
  );
}
