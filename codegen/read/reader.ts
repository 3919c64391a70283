import {
  type BinaryExpression,
  type CallExpression,
  type Expression,
  type FunctionDeclaration,
  Node as Is,
  type ObjectLiteralExpression,
  type PropertyAccessExpression,
  type SourceFile,
  SyntaxKind,
} from 'ts-morph';
import type { Graph } from '../formula/graph.ts';
import type { Node, Operation } from '../formula/node.ts';
import { readBody } from './body.ts';
import { intrinsic, MATH_FUNCTIONS } from './intrinsics.ts';
import { type Declared, lookUp } from './lookup.ts';
import { describe, refuse } from './refusal.ts';
import { asNumber, isRecord, record, type Value } from './value.ts';

const ARITHMETIC: Readonly<Partial<Record<SyntaxKind, Operation>>> = {
  [SyntaxKind.PlusToken]: 'add',
  [SyntaxKind.MinusToken]: 'sub',
  [SyntaxKind.AsteriskToken]: 'mul',
  [SyntaxKind.SlashToken]: 'div',
};

/** Names that a function body or a module has in scope. */
export type Scope = ReadonlyMap<string, Value>;

/** Turns functions and expressions of the numeric subset into nodes of one graph. */
export class Reader {
  readonly graph: Graph;
  readonly labels: Map<Node, string> = new Map();
  private readonly usedLabels = new Set<string>();
  private readonly stack: FunctionDeclaration[] = [];

  constructor(graph: Graph, reservedNames: Iterable<string>) {
    this.graph = graph;
    for (const name of reservedNames) this.usedLabels.add(name);
  }

  /** The value of a call of a declared function with the given arguments. */
  call(declaration: FunctionDeclaration, args: readonly Value[], site: Is): Value {
    if (this.stack.includes(declaration))
      refuse('read.recursion', site, `${declaration.getName()} calls itself`);
    const scope = new Map<string, Value>();
    const parameters = declaration.getParameters();
    if (parameters.length !== args.length) {
      refuse(
        'read.arguments',
        site,
        `${declaration.getName()} takes ${parameters.length} arguments, not ${args.length}`,
      );
    }
    for (const [index, parameter] of parameters.entries()) {
      const name = parameter.getNameNode();
      if (
        !Is.isIdentifier(name) ||
        parameter.isRestParameter() ||
        parameter.hasInitializer() ||
        parameter.isOptional()
      ) {
        refuse('read.function-form', parameter, `the parameter ${describe(parameter)} is not a plain name`);
      }
      scope.set(name.getText(), args[index]!);
    }
    this.stack.push(declaration);
    const value = readBody(this, declaration, scope);
    this.stack.pop();
    return value;
  }

  /** Remembers the name that the reference gives to a value; the first name of a value stays. */
  label(value: Value, name: string): void {
    if (isRecord(value) || value.args.length === 0 || this.labels.has(value) || this.usedLabels.has(name))
      return;
    this.usedLabels.add(name);
    this.labels.set(value, name);
  }

  /** The value of an expression. */
  expression(syntax: Expression, scope: Scope): Value {
    if (Is.isParenthesizedExpression(syntax)) return this.expression(syntax.getExpression(), scope);
    if (Is.isNumericLiteral(syntax)) return this.literal(syntax);
    if (Is.isIdentifier(syntax)) return this.name(syntax.getText(), syntax, scope);
    if (Is.isPropertyAccessExpression(syntax)) return this.property(syntax, scope);
    if (Is.isBinaryExpression(syntax)) return this.binary(syntax, scope);
    if (Is.isConditionalExpression(syntax)) {
      const whenTrue = this.number(syntax.getWhenTrue(), scope);
      const whenFalse = this.number(syntax.getWhenFalse(), scope);
      return this.select(syntax.getCondition(), whenTrue, whenFalse, scope);
    }
    if (Is.isCallExpression(syntax)) return this.callExpression(syntax, scope);
    if (Is.isObjectLiteralExpression(syntax)) return this.objectLiteral(syntax, scope);
    if (Is.isPrefixUnaryExpression(syntax)) {
      if (syntax.getOperatorToken() === SyntaxKind.MinusToken)
        return this.graph.make('neg', this.number(syntax.getOperand(), scope));
      if (
        syntax.getOperatorToken() === SyntaxKind.PlusPlusToken ||
        syntax.getOperatorToken() === SyntaxKind.MinusMinusToken
      ) {
        refuse('read.assignment', syntax, `${describe(syntax)} changes a value`);
      }
      refuse('read.operator', syntax, `the operator of ${describe(syntax)} is outside the subset`);
    }
    return refuseExpression(syntax);
  }

  /** The value of an expression that must be a number. */
  number(syntax: Expression, scope: Scope): Node {
    return asNumber(this.expression(syntax, scope), syntax);
  }

  private literal(syntax: Expression): Node {
    const value = Number(syntax.getText().replaceAll('_', ''));
    if (!Number.isFinite(value))
      refuse('read.literal', syntax, `${describe(syntax)} is not finite as a float64 number`);
    return this.graph.constant(value);
  }

  private name(name: string, syntax: Expression, scope: Scope): Value {
    const local = scope.get(name);
    if (local !== undefined) return local;
    const declared = lookUp(syntax.getSourceFile(), name, syntax);
    if (declared?.constant !== undefined) return this.constant(declared, syntax);
    if (declared?.function !== undefined)
      refuse('read.function-value', syntax, `the function ${name} is used as a value`);
    return refuse('read.unknown-name', syntax, `the name "${name}" has no value here`);
  }

  /** A constant of a module: a number or a flat record of numbers. */
  private constant(declared: Declared, syntax: Expression): Value {
    const initializer = declared.constant?.getInitializer();
    if (initializer === undefined)
      return refuse('read.unknown-name', syntax, `${describe(syntax)} has no initial value`);
    return this.expression(initializer, new Map());
  }

  private property(syntax: PropertyAccessExpression, scope: Scope): Value {
    if (syntax.hasQuestionDotToken())
      refuse('read.property', syntax, `${describe(syntax)} is optional chaining`);
    const name = syntax.getName();
    const left = syntax.getExpression();
    if (Is.isIdentifier(left) && left.getText() === 'Math' && !scope.has('Math')) {
      if (name === 'PI') return this.graph.constant(Math.PI);
      refuse('read.unknown-call', syntax, `Math.${name} is outside the subset`);
    }
    return this.field(this.expression(left, scope), name, syntax);
  }

  /** A field of a record. */
  field(value: Value, name: string, syntax: Is): Node {
    if (!isRecord(value))
      return refuse('read.unknown-field', syntax, `${describe(syntax)} reads a field of a number`);
    const field = value.field(name);
    if (field === undefined)
      return refuse(
        'read.unknown-field',
        syntax,
        `there is no number "${name}"; known are ${value.names.join(', ')}`,
      );
    return field;
  }

  private binary(syntax: BinaryExpression, scope: Scope): Node {
    const token = syntax.getOperatorToken();
    const operation = ARITHMETIC[token.getKind()];
    if (operation !== undefined) {
      return this.graph.make(
        operation,
        this.number(syntax.getLeft(), scope),
        this.number(syntax.getRight(), scope),
      );
    }
    if (token.getText().endsWith('=') && !/^[<>=!]=/.test(token.getText())) {
      refuse('read.assignment', syntax, `${describe(syntax)} assigns`);
    }
    if (/^([<>]=?|[=!]==?|&&|\|\||\?\?)$/.test(token.getText())) {
      refuse('read.comparison', token, `${describe(syntax)} is not a number`);
    }
    return refuse('read.operator', token, `the operator "${token.getText()}" is outside the subset`);
  }

  /** a < b ? x : y and its three relatives; a <= b ? x : y is b < a ? y : x. */
  private select(condition: Expression, x: Node, y: Node, scope: Scope): Node {
    const test = Is.isParenthesizedExpression(condition) ? condition.getExpression() : condition;
    if (!Is.isBinaryExpression(test))
      return refuse('read.comparison', test, `${describe(test)} is not one comparison`);
    const operator = test.getOperatorToken().getText();
    if (!/^[<>]=?$/.test(operator))
      return refuse('read.comparison', test, `${describe(test)} is not one of < <= > >=`);
    const a = this.number(test.getLeft(), scope);
    const b = this.number(test.getRight(), scope);
    switch (operator) {
      case '<':
        return this.graph.make('select', a, b, x, y);
      case '>':
        return this.graph.make('select', b, a, x, y);
      case '<=':
        return this.graph.make('select', b, a, y, x);
      default:
        return this.graph.make('select', a, b, y, x);
    }
  }

  private callExpression(syntax: CallExpression, scope: Scope): Value {
    const args = syntax.getArguments().map((arg) => {
      if (!Is.isExpression(arg) || Is.isSpreadElement(arg))
        return refuse('read.arguments', arg, `${describe(arg)} is not one value`);
      return this.expression(arg, scope);
    });
    const callee = syntax.getExpression();
    if (Is.isPropertyAccessExpression(callee) && callee.getExpression().getText() === 'Math') {
      return this.operation(MATH_FUNCTIONS[callee.getName()], args, syntax);
    }
    if (!Is.isIdentifier(callee))
      return refuse('read.unknown-call', syntax, `${describe(callee)} cannot be called here`);
    const declaration = lookUp(syntax.getSourceFile(), callee.getText(), callee)?.function;
    if (declaration === undefined)
      return refuse('read.unknown-call', syntax, `${describe(callee)} is no function of the subset`);
    const operation = intrinsic(declaration);
    return operation === undefined
      ? this.call(declaration, args, syntax)
      : this.operation(operation, args, syntax);
  }

  private operation(operation: Operation | undefined, args: readonly Value[], syntax: CallExpression): Node {
    if (operation === undefined)
      return refuse('read.unknown-call', syntax, `${describe(syntax)} is outside the subset`);
    const numbers = args.map((arg, index) => asNumber(arg, syntax.getArguments()[index]!));
    const wanted = operation === 'atan2' || operation === 'kepler' ? 2 : 1;
    if (numbers.length !== wanted) {
      return refuse(
        'read.arguments',
        syntax,
        `${describe(syntax)} has ${numbers.length} arguments in place of ${wanted}`,
      );
    }
    return this.graph.make(operation, ...numbers);
  }

  private objectLiteral(syntax: ObjectLiteralExpression, scope: Scope): Value {
    const fields = new Map<string, Node>();
    for (const property of syntax.getProperties()) {
      if (Is.isShorthandPropertyAssignment(property)) {
        fields.set(
          property.getName(),
          asNumber(this.name(property.getName(), property.getNameNode(), scope), property),
        );
      } else if (Is.isPropertyAssignment(property) && Is.isIdentifier(property.getNameNode())) {
        fields.set(property.getName(), this.number(property.getInitializerOrThrow(), scope));
      } else {
        refuse('read.record', property, `${describe(property)} is not a plain field`);
      }
    }
    return record(fields);
  }
}

/** The refusal that fits an expression of no known kind. */
function refuseExpression(syntax: Expression): never {
  if (Is.isElementAccessExpression(syntax))
    refuse('read.property', syntax, `${describe(syntax)} reads by a computed name`);
  if (Is.isArrayLiteralExpression(syntax)) refuse('read.array', syntax, `${describe(syntax)} is an array`);
  if (Is.isArrowFunction(syntax) || Is.isFunctionExpression(syntax) || Is.isClassExpression(syntax)) {
    refuse('read.function-value', syntax, `${describe(syntax)} is a function or class as a value`);
  }
  if (
    Is.isAsExpression(syntax) ||
    Is.isSatisfiesExpression(syntax) ||
    Is.isNonNullExpression(syntax) ||
    Is.isTypeAssertion(syntax)
  ) {
    refuse('read.type-conversion', syntax, `${describe(syntax)} asserts a type`);
  }
  if (Is.isPostfixUnaryExpression(syntax))
    refuse('read.assignment', syntax, `${describe(syntax)} changes a value`);
  if (
    Is.isLiteralExpression(syntax) ||
    Is.isTrueLiteral(syntax) ||
    Is.isFalseLiteral(syntax) ||
    Is.isNullLiteral(syntax) ||
    Is.isTemplateExpression(syntax)
  ) {
    refuse('read.literal', syntax, `${describe(syntax)} is not a number`);
  }
  return refuse('read.operator', syntax, `${describe(syntax)} is outside the subset`);
}

/** The function of a file that is exported under a name, or the refusal. */
export function exportedFunction(source: SourceFile, name: string): FunctionDeclaration | undefined {
  const declaration = source.getFunction(name);
  return declaration?.isExported() ? declaration : undefined;
}
