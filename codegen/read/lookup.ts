import {
  type FunctionDeclaration,
  type SourceFile,
  type Node as Syntax,
  type VariableDeclaration,
  VariableDeclarationKind,
} from 'ts-morph';
import { describe, refuse } from './refusal.ts';

/** What a name of a module stands for: a function or a module constant. */
export interface Declared {
  readonly function?: FunctionDeclaration;
  readonly constant?: VariableDeclaration;
}

/**
 * Finds the declaration of a name at the top level of a file, through named imports.
 *
 * @param source file in which the name is used
 * @param name the name
 * @param site where it is used, for the refusal of imports that cannot be followed
 */
export function lookUp(source: SourceFile, name: string, site: Syntax): Declared | undefined {
  const own = declared(source, name, site);
  if (own !== undefined) return own;
  for (const statement of source.getImportDeclarations()) {
    for (const specifier of statement.getNamedImports()) {
      if ((specifier.getAliasNode()?.getText() ?? specifier.getName()) !== name) continue;
      const target = statement.getModuleSpecifierSourceFile();
      if (target === undefined)
        return refuse(
          'read.import',
          statement,
          `the module ${statement.getModuleSpecifier().getText()} is not found`,
        );
      const found = declared(target, specifier.getName(), site);
      return (
        found ??
        refuse('read.import', specifier, `${describe(specifier)} is no function or constant of that module`)
      );
    }
  }
  return undefined;
}

function declared(source: SourceFile, name: string, site: Syntax): Declared | undefined {
  const declaration = source.getFunction(name);
  if (declaration !== undefined) return { function: declaration };
  const variable = source.getVariableDeclaration(name);
  if (variable === undefined) return undefined;
  if (variable.getVariableStatementOrThrow().getDeclarationKind() !== VariableDeclarationKind.Const) {
    return refuse('read.mutable-binding', site, `"${name}" is not a const`);
  }
  return { constant: variable };
}
