import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { walkOwn } from './syntax.ts';
import type { Unit } from './unit.ts';

export const stringBuilding: Rule = {
  code: 'inspect.string-building',
  why: 'A new string is made on the heap, of a length that data decides.',
  remedy: 'Return a number, such as a status, and make text outside of the kernel.',
};

export const template: Rule = {
  code: 'inspect.template-literal',
  why: 'A template with substitutions makes a new string at each call.',
  remedy: 'Return a number, such as a status, and make text outside of the kernel.',
};

export const taggedTemplate: Rule = {
  code: 'inspect.tagged-template',
  why: 'A tagged template calls a function with an array of its parts.',
  remedy: 'Call a function with plain arguments.',
};

/** Strings that a function builds by operators and templates; calls that build strings are reported as calls. */
export function stringFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  walkOwn(fn.node, (node) => {
    if (isConcatenation(unit, node)) {
      faults.push({ rule: stringBuilding, at: node, what: 'strings are joined' });
    } else if (ts.isTaggedTemplateExpression(node)) {
      faults.push({ rule: taggedTemplate, at: node, what: 'a tagged template' });
    } else if (ts.isTemplateExpression(node) && !ts.isTaggedTemplateExpression(node.parent)) {
      faults.push({ rule: template, at: node, what: 'a template literal with substitutions' });
    }
  });
  return faults;
}

/** True for `+` and `+=` whose result is known to be a string: by a literal, a template or a declared type. */
export function isConcatenation(unit: Unit, node: ts.Node): boolean {
  if (!ts.isBinaryExpression(node)) return false;
  const operator = node.operatorToken.kind;
  if (operator !== ts.SyntaxKind.PlusToken && operator !== ts.SyntaxKind.PlusEqualsToken) return false;
  return (unit.checker.getTypeAtLocation(node).flags & ts.TypeFlags.StringLike) !== 0;
}
