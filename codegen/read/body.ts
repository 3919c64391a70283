import {
  type FunctionDeclaration,
  Node as Is,
  type Statement,
  type VariableDeclaration,
  VariableDeclarationKind,
} from 'ts-morph';
import type { Reader } from './reader.ts';
import { describe, refuse } from './refusal.ts';
import type { Value } from './value.ts';

/**
 * The value of a function of the subset: const bindings, then one return.
 *
 * @param reader reads the expressions and keeps the names of values
 * @param declaration the function
 * @param scope its parameters; the bindings are added here
 */
export function readBody(reader: Reader, declaration: FunctionDeclaration, scope: Map<string, Value>): Value {
  const body = declaration.getBody();
  if (declaration.isAsync() || declaration.isGenerator() || body === undefined || !Is.isBlock(body)) {
    return refuse(
      'read.function-form',
      declaration,
      `${declaration.getName() ?? 'the function'} is not a plain function with a body`,
    );
  }
  const statements = body.getStatements();
  const last = statements.at(-1);
  if (last === undefined || !Is.isReturnStatement(last) || last.getExpression() === undefined) {
    for (const statement of statements) bind(reader, statement, scope);
    return refuse(
      'read.return',
      last ?? declaration,
      `${declaration.getName()} does not end with a return of a value`,
    );
  }
  for (const statement of statements.slice(0, -1)) bind(reader, statement, scope);
  return reader.expression(last.getExpressionOrThrow(), scope);
}

function bind(reader: Reader, statement: Statement, scope: Map<string, Value>): void {
  if (!Is.isVariableStatement(statement)) refuseStatement(statement);
  if (statement.getDeclarationKind() !== VariableDeclarationKind.Const) {
    refuse('read.mutable-binding', statement, `${describe(statement)} is not a const`);
  }
  for (const declaration of statement.getDeclarations()) bindDeclaration(reader, declaration, scope);
}

function bindDeclaration(reader: Reader, declaration: VariableDeclaration, scope: Map<string, Value>): void {
  const value = reader.expression(declaration.getInitializerOrThrow(), scope);
  const name = declaration.getNameNode();
  if (Is.isIdentifier(name)) {
    scope.set(name.getText(), value);
    reader.label(value, name.getText());
    return;
  }
  if (!Is.isObjectBindingPattern(name))
    return refuse('read.array', name, `${describe(name)} takes an array apart`);
  for (const element of name.getElements()) {
    const target = element.getNameNode();
    if (element.getDotDotDotToken() !== undefined || element.hasInitializer() || !Is.isIdentifier(target)) {
      refuse('read.record', element, `${describe(element)} is not a plain field`);
    }
    scope.set(
      target.getText(),
      reader.field(value, element.getPropertyNameNode()?.getText() ?? target.getText(), element),
    );
  }
}

function refuseStatement(statement: Statement): never {
  if (Is.isIterationStatement(statement))
    return refuse('read.loop', statement, `${describe(statement)} is a loop`);
  if (Is.isIfStatement(statement) || Is.isSwitchStatement(statement)) {
    return refuse('read.branch-statement', statement, `${describe(statement)} chooses between statements`);
  }
  if (Is.isReturnStatement(statement))
    return refuse('read.return', statement, 'a return stands before the end');
  if (Is.isFunctionDeclaration(statement) || Is.isClassDeclaration(statement)) {
    return refuse('read.function-value', statement, `${describe(statement)} is declared inside a function`);
  }
  if (Is.isExpressionStatement(statement) && /[^=!<>]=[^=]|\+\+|--/.test(statement.getText())) {
    return refuse('read.assignment', statement, `${describe(statement)} changes a value`);
  }
  return refuse('read.statement', statement, `${describe(statement)} is not a const binding`);
}
