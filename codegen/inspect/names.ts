import { ts } from 'ts-morph';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';
import { isErased, isFunctionNode, isReference, walkOwn } from './syntax.ts';
import { symbolOf, type Unit } from './unit.ts';

export const shadowedName: Rule = {
  code: 'inspect.shadowed-name',
  why: 'An engine without block scopes takes the inner name for the outer one and overwrites it.',
  remedy: 'Give each variable of a function its own name.',
};

export const redeclaredName: Rule = {
  code: 'inspect.redeclared-name',
  why: 'Both declarations are one variable, so the second overwrites the first.',
  remedy: 'Give each variable of a function its own name.',
};

/** A name that a function declares, with the scope it belongs to by the language. */
interface Declared {
  readonly name: ts.Identifier;
  readonly scope: ts.Node;
}

/** Names that mean two things in one function, and names declared twice. */
export function nameFaults(unit: Unit, fn: OwnFunction): Fault[] {
  const byName = new Map<string, Declared[]>();
  for (const declared of declaredNames(fn)) {
    const same = byName.get(declared.name.text);
    if (same === undefined) byName.set(declared.name.text, [declared]);
    else same.push(declared);
  }
  return [...byName.values()].flatMap((declared) => [
    ...shadowings(unit, fn, declared),
    ...redeclarations(declared),
  ]);
}

/** @param declared all declarations of one name in the function */
function shadowings(unit: Unit, fn: OwnFunction, declared: readonly Declared[]): Fault[] {
  const inner = declared.filter(({ scope }) => scope !== fn.node);
  return inner.flatMap((one) => {
    const outer = declared.find((other) => other.scope !== one.scope && encloses(other.scope, one.scope));
    const other = outer?.name ?? foreignUse(unit, fn, one);
    if (other === undefined) return [];
    const what = `${one.name.text} names something else in line ${lineOf(other)} of the same function`;
    return [{ rule: shadowedName, at: one.name, what }];
  });
}

/** @param declared all declarations of one name in the function */
function redeclarations(declared: readonly Declared[]): Fault[] {
  const first = new Map<ts.Node, ts.Identifier>();
  return declared.flatMap(({ name, scope }) => {
    const earlier = first.get(scope);
    if (earlier === undefined) {
      first.set(scope, name);
      return [];
    }
    return [
      { rule: redeclaredName, at: name, what: `${name.text} is declared in line ${lineOf(earlier)} already` },
    ];
  });
}

function declaredNames(fn: OwnFunction): Declared[] {
  const names: Declared[] = [];
  const addBinding = (name: ts.BindingName, scope: ts.Node): void => {
    if (ts.isIdentifier(name)) names.push({ name, scope });
    else for (const part of name.elements) if (ts.isBindingElement(part)) addBinding(part.name, scope);
  };
  for (const parameter of fn.node.parameters) addBinding(parameter.name, fn.node);
  walkOwn(fn.node, (node) => {
    if (ts.isVariableDeclaration(node)) {
      const isVar =
        ts.isVariableDeclarationList(node.parent) && (node.parent.flags & ts.NodeFlags.BlockScoped) === 0;
      addBinding(node.name, isVar ? fn.node : blockOf(node, fn));
    } else if ((ts.isFunctionDeclaration(node) && isFunctionNode(node)) || isNamedDeclaration(node)) {
      if (node.name !== undefined) names.push({ name: node.name, scope: blockOf(node, fn) });
    }
  });
  return names;
}

function isNamedDeclaration(node: ts.Node): node is ts.ClassDeclaration | ts.EnumDeclaration {
  return ts.isClassDeclaration(node) || ts.isEnumDeclaration(node);
}

/** The block, loop, switch or catch clause that a declaration belongs to; the function for its outermost block. */
function blockOf(node: ts.Node, fn: OwnFunction): ts.Node {
  let scope = node.parent;
  while (!isBlockScope(scope)) scope = scope.parent;
  return scope === fn.node.body ? fn.node : scope;
}

function isBlockScope(node: ts.Node): boolean {
  return (
    ts.isBlock(node) ||
    ts.isForStatement(node) ||
    ts.isForInStatement(node) ||
    ts.isForOfStatement(node) ||
    ts.isCaseBlock(node) ||
    ts.isCatchClause(node) ||
    isFunctionNode(node)
  );
}

function encloses(outer: ts.Node, inner: ts.Node): boolean {
  return ts.findAncestor(inner, (node) => node === outer) !== undefined;
}

/** A use in the function, outside of the declaration's block, of the same name for a thing from outside. */
function foreignUse(unit: Unit, fn: OwnFunction, declared: Declared): ts.Identifier | undefined {
  let found: ts.Identifier | undefined;
  const visit = (node: ts.Node): void => {
    if (found !== undefined || node === declared.scope || isErased(node)) return;
    if (isReference(node) && node.text === declared.name.text && !isDeclaredIn(unit, fn, node)) found = node;
    ts.forEachChild(node, visit);
  };
  ts.forEachChild(fn.node, visit);
  return found;
}

function isDeclaredIn(unit: Unit, fn: OwnFunction, name: ts.Identifier): boolean {
  return symbolOf(unit, name)?.declarations?.some((node) => encloses(fn.node, node)) ?? false;
}

function lineOf(node: ts.Node): number {
  const source = node.getSourceFile();
  return source.getLineAndCharacterOfPosition(node.getStart(source)).line + 1;
}
