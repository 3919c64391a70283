import { basename } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { SourceFile } from 'ts-morph';
import { InputError } from '../../src/finding.ts';
import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import { exportedFunction, Reader } from './reader.ts';
import { finding } from './refusal.ts';
import { openSource } from './source.ts';
import { asNumber } from './value.ts';

const opened = new Map<string, SourceFile>();

/**
 * The result of a function of the numeric subset for given arguments, as a node.
 *
 * @param graph graph of the arguments
 * @param file the function's file
 * @param name the function's name
 * @param args one node a parameter
 */
export function applyFunction(graph: Graph, file: URL, name: string, args: readonly Node[]): Node {
  const path = fileURLToPath(file);
  const source = opened.get(path) ?? openSource(path);
  opened.set(path, source);
  const declaration = exportedFunction(source, name);
  if (declaration === undefined) {
    throw new InputError(
      finding('read.missing-function', { file: basename(path) }, `there is no exported function "${name}"`),
    );
  }
  return asNumber(new Reader(graph, []).call(declaration, args, declaration), declaration);
}
