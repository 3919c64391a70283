import { fileURLToPath } from 'node:url';
import type { FunctionDeclaration } from 'ts-morph';
import type { Operation } from '../formula/node.ts';

/** Functions of Math that the subset knows, each an operation of the formula. */
export const MATH_FUNCTIONS: Readonly<Record<string, Operation>> = {
  sqrt: 'sqrt',
  sin: 'sin',
  cos: 'cos',
  atan2: 'atan2',
  abs: 'abs',
  floor: 'floor',
};

const KEPLER_FILE = fileURLToPath(new URL('../../src/kepler/eccentric-anomaly', import.meta.url));

/**
 * The operation that a declared function stands for without being read: Kepler's equation has no closed
 * form, so the converged solver of src/kepler is a kind of node of its own.
 */
export function intrinsic(declaration: FunctionDeclaration): Operation | undefined {
  const path = declaration
    .getSourceFile()
    .getFilePath()
    .replace(/\.(d\.)?[cm]?[tj]s$/, '');
  return path === KEPLER_FILE && declaration.getName() === 'eccentricAnomaly' ? 'kepler' : undefined;
}
