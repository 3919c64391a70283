import { ts } from 'ts-morph';
import { boxedValue, regularExpression } from './allocations.ts';
import { calleeOf } from './callees.ts';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { evaluation } from './hazards.ts';
import { stringBuilding } from './strings.ts';
import { isAssignment, isUsing, walkOwn } from './syntax.ts';
import type { Unit } from './unit.ts';

export const engineFunction: Rule = {
  code: 'inspect.engine-function',
  why: 'The language does not fix its accuracy, so results differ between engines in the last place.',
  remedy: 'Use a polynomial or another form made of + - * / and Math.sqrt.',
};

export const allocatingCall: Rule = {
  code: 'inspect.allocating-call',
  why: 'It returns or grows an object on the heap, which the garbage collector has to clear later.',
  remedy: 'Write into memory that was allocated at start-up.',
};

export const outsideCall: Rule = {
  code: 'inspect.outside-call',
  why: 'Its cost, its allocations and its result cannot be read from this file.',
  remedy: 'Call only Math.sqrt, Math.abs, Math.floor, Math.fround and functions of the same file.',
};

/** Calls that leave the set of known cost and result; calls of the file's own functions are judged elsewhere. */
export function callFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  walkOwn(fn.node, (node) => {
    if (ts.isCallExpression(node)) {
      const fault = callFault(unit, node);
      if (fault !== undefined) faults.push(fault);
    } else if (isUsing(node)) {
      faults.push({ rule: outsideCall, at: node, what: 'using calls a method when its block ends' });
    } else if (isPower(node)) {
      faults.push({ rule: engineFunction, at: node, what: 'the operator ** is computed by the engine' });
    }
  });
  return faults;
}

function isPower(node: ts.Node): boolean {
  if (!ts.isBinaryExpression(node)) return false;
  const power = isAssignment(node)
    ? ts.SyntaxKind.AsteriskAsteriskEqualsToken
    : ts.SyntaxKind.AsteriskAsteriskToken;
  return node.operatorToken.kind === power;
}

function callFault(unit: Unit, call: ts.CallExpression): Fault | undefined {
  const callee = calleeOf(unit, call);
  switch (callee.kind) {
    case 'operation':
    case 'own':
      return undefined;
    case 'engine':
      return { rule: engineFunction, at: call, what: `${callee.name} is computed by the engine` };
    case 'eval':
      return { rule: evaluation, at: call, what: `${callee.name} makes code while running` };
    case 'string':
      return { rule: stringBuilding, at: call, what: `${callee.name} builds a string` };
    case 'boxed':
      return { rule: boxedValue, at: call, what: `${callee.name} makes a boxed value` };
    case 'regex':
      return { rule: regularExpression, at: call, what: 'RegExp makes a regular expression' };
    case 'allocating':
      return { rule: allocatingCall, at: call, what: `${callee.name} allocates` };
    case 'outside':
      return {
        rule: outsideCall,
        at: call,
        what: `the call of ${callee.name} leads out of the inspected functions`,
      };
  }
}
