import { ts } from 'ts-morph';
import { calleeOf, isRounding } from './callees.ts';
import type { Fault, Rule } from './fault.ts';
import { exactParts, isFloat32, isSelfDifference } from './float32-values.ts';
import type { OwnFunction } from './functions.ts';
import { countLoop } from './loops.ts';
import { isConcatenation } from './strings.ts';
import { bare, excerpt, isAssignment, isFunctionNode, isUpdate, walkOwn, wrapped } from './syntax.ts';
import type { Unit } from './unit.ts';

export const unrounded: Rule = {
  code: 'inspect.float32-unrounded',
  why: 'Its result is a double, so the function is not one of float32 arithmetic.',
  remedy: 'Put each single operation directly inside Math.fround.',
};

export const unroundedOperand: Rule = {
  code: 'inspect.float32-operand',
  why:
    'Rounding the result of one operation to float32 equals float32 arithmetic only when both operands are ' +
    'float32 numbers.',
  remedy:
    'Name its rounded value first: `const x1 = Math.fround(t);`, or declare the array as a Float32Array.',
};

export const unroundedLiteral: Rule = {
  code: 'inspect.float32-literal',
  why: 'The literal is not a float32 number, so an engine of float32 numbers reads another value.',
  remedy: 'Write the decimal form of the float32 number itself.',
};

/**
 * Faults of a function that must be float32 arithmetic.
 *
 * The rule: every result of + - * / and Math.sqrt stands directly inside Math.fround, one operation each, and its
 * operands are float32 numbers. One rounding to double and then one to float32 equals the single rounding to float32
 * for these five operations, since 53 >= 2 * 24 + 2 (S. A. Figueroa, When is double rounding innocuous?, SIGNUM
 * Newsletter 30, 1995; from memory). Exact operations need no rounding: negation, Math.abs, Math.floor,
 * comparisons, ?:, and x - x, which is 0 or NaN. Float32 numbers are: results of Math.fround, literals that equal
 * their float32 value, elements of arrays declared as Float32Array by type or JSDoc, indices of counted loops up to
 * 2^24, variables that only ever hold these. Arithmetic inside an index and in a counted loop's step is exempt.
 *
 * @param variables the variables that hold float32 numbers only, from `float32Variables`
 */
export function float32Faults(unit: Unit, variables: ReadonlySet<ts.Symbol>, fn: OwnFunction): Fault[] {
  const faults: Fault[] = [];
  walkOwn(fn.node, (node) => {
    if (ts.isNumericLiteral(node)) {
      const value = Number(node.text);
      if (Math.fround(value) !== value) {
        faults.push({ rule: unroundedLiteral, at: node, what: `${node.getText()} is not a float32 number` });
      }
      return;
    }
    const operands = operandsOf(unit, node);
    if (operands === undefined || isIndexing(unit, node)) return;
    if (!isRounded(unit, node)) {
      faults.push({
        rule: unrounded,
        at: node,
        what: `the result of ${excerpt(node)} is not rounded to float32`,
      });
    }
    for (const leaf of operands.flatMap((operand) => rawParts(unit, variables, operand))) {
      faults.push({ rule: unroundedOperand, at: leaf, what: `the operand ${excerpt(leaf)} may be a double` });
    }
  });
  return faults;
}

/** The operands of a node that computes with rounding; undefined for any other node. */
function operandsOf(unit: Unit, node: ts.Node): readonly ts.Expression[] | undefined {
  if (isUpdate(node)) return [];
  if (ts.isCallExpression(node)) {
    const callee = calleeOf(unit, node);
    return callee.kind === 'operation' && callee.operation === 'sqrt' ? node.arguments : undefined;
  }
  if (!ts.isBinaryExpression(node) || isConcatenation(unit, node) || isSelfDifference(unit, node))
    return undefined;
  if (!arithmetic.has(node.operatorToken.kind)) return undefined;
  return isAssignment(node) ? [node.right] : [node.left, node.right];
}

const arithmetic: ReadonlySet<ts.SyntaxKind> = new Set([
  ts.SyntaxKind.PlusToken,
  ts.SyntaxKind.MinusToken,
  ts.SyntaxKind.AsteriskToken,
  ts.SyntaxKind.SlashToken,
  ts.SyntaxKind.PlusEqualsToken,
  ts.SyntaxKind.MinusEqualsToken,
  ts.SyntaxKind.AsteriskEqualsToken,
  ts.SyntaxKind.SlashEqualsToken,
]);

function isRounded(unit: Unit, node: ts.Node): boolean {
  const outer = wrapped(node);
  return !isAssignment(node) && isRounding(unit, outer.parent) && outer.parent.arguments[0] === outer;
}

/** True inside brackets, where an address is computed, and for the step of a counted loop. */
function isIndexing(unit: Unit, node: ts.Node): boolean {
  for (let inner = node; !ts.isStatement(inner) && !isFunctionNode(inner); inner = inner.parent) {
    const parent = inner.parent;
    if (ts.isElementAccessExpression(parent) && parent.argumentExpression === inner) return true;
    if (ts.isForStatement(parent)) {
      return parent.incrementor === inner && typeof countLoop(unit, parent) !== 'string';
    }
  }
  return false;
}

/** The parts of an operand that may be doubles; unrounded operations among them are left to their own report. */
function rawParts(unit: Unit, variables: ReadonlySet<ts.Symbol>, operand: ts.Expression): ts.Expression[] {
  const node = bare(operand);
  const exact = exactParts(unit, node);
  if (exact !== undefined) return exact.flatMap((part) => rawParts(unit, variables, part));
  if (ts.isNumericLiteral(node) || operandsOf(unit, node) !== undefined || isFloat32(unit, variables, node))
    return [];
  return [node];
}
