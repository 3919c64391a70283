import { ts } from 'ts-morph';
import { calleeOf } from './callees.ts';
import type { OwnFunction } from './functions.ts';
import { isFunctionNode, walkOwn } from './syntax.ts';
import type { Unit } from './unit.ts';

/** A place where one function runs, or may run, another of the same file. */
export interface Edge {
  readonly from: OwnFunction;
  readonly to: OwnFunction;
  readonly at: ts.Node;
  /** False for a function that is only created there: whoever gets it may call it. */
  readonly isCall: boolean;
}

/** Who runs whom: the edges that leave each function of a file. */
export type CallGraph = ReadonlyMap<OwnFunction, readonly Edge[]>;

/** The call graph of a file. Methods called through an object are followed where the object's form is known. */
export function callGraph(unit: Unit): CallGraph {
  const graph = new Map<OwnFunction, Edge[]>();
  for (const from of unit.functions.values()) {
    const edges: Edge[] = [];
    walkOwn(from.node, (at) => {
      const created = isFunctionNode(at) ? unit.functions.get(at) : undefined;
      if (created !== undefined) edges.push({ from, to: created, at, isCall: false });
      if (!ts.isCallExpression(at)) return;
      const to = calledFunction(unit, at);
      if (to !== undefined) edges.push({ from, to, at, isCall: true });
    });
    graph.set(from, edges);
  }
  return graph;
}

function calledFunction(unit: Unit, call: ts.CallExpression): OwnFunction | undefined {
  const callee = calleeOf(unit, call);
  if (callee.kind === 'own') return callee.fn;
  if (!ts.isPropertyAccessExpression(call.expression)) return undefined;
  for (const declaration of unit.checker.getSymbolAtLocation(call.expression.name)?.declarations ?? []) {
    const node = ts.isPropertyAssignment(declaration) ? declaration.initializer : declaration;
    const fn = unit.functions.get(node);
    if (fn !== undefined) return fn;
  }
  return undefined;
}

/** Number of the strongly connected component of each function; one without a call back to itself is alone. */
export function components(graph: CallGraph): Map<OwnFunction, number> {
  // Tarjan's algorithm: depth-first, `low` being the oldest function on the path that can be reached again.
  const order = new Map<OwnFunction, number>();
  const low = new Map<OwnFunction, number>();
  const path: OwnFunction[] = [];
  const component = new Map<OwnFunction, number>();
  const visit = (fn: OwnFunction): void => {
    order.set(fn, order.size);
    low.set(fn, order.get(fn)!);
    path.push(fn);
    for (const { to } of graph.get(fn) ?? []) {
      if (!order.has(to)) visit(to);
      if (!component.has(to)) low.set(fn, Math.min(low.get(fn)!, low.get(to)!));
    }
    if (low.get(fn) !== order.get(fn)) return;
    const number = order.get(fn)!;
    for (let member = path.pop(); member !== undefined; member = path.pop()) {
      component.set(member, number);
      if (member === fn) return;
    }
  };
  for (const fn of graph.keys()) if (!order.has(fn)) visit(fn);
  return component;
}
