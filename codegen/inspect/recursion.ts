import type { CallGraph } from './call-graph.ts';
import { components } from './call-graph.ts';
import type { Fault, Rule } from './fault.ts';
import type { OwnFunction } from './functions.ts';

export const recursion: Rule = {
  code: 'inspect.recursion',
  why: 'The depth, and with it time and stack, is up to the data.',
  remedy: 'Write a loop with a literal bound.',
};

export const uncleanCall: Rule = {
  code: 'inspect.unclean-call',
  why: 'What is wrong in the called function happens whenever this one runs.',
  remedy: 'Mend the called function.',
};

/** Calls that lead back to the function that makes them, directly or through others. */
export function recursionFaults(graph: CallGraph): Map<OwnFunction, Fault[]> {
  const component = components(graph);
  const faults = new Map<OwnFunction, Fault[]>();
  for (const [from, edges] of graph) {
    const circular = edges.filter((edge) => edge.isCall && component.get(edge.to) === component.get(from));
    faults.set(
      from,
      circular.map(({ to, at }) => ({
        rule: recursion,
        at,
        what:
          to === from ? `${from.name} calls itself` : `${from.name} calls ${to.name}, which leads back to it`,
      })),
    );
  }
  return faults;
}

/**
 * Calls of functions that have faults of their own or call such functions. Calls within a circle are left out:
 * they are reported as recursion.
 *
 * @param unclean the functions with faults so far
 */
export function uncleanCallFaults(
  graph: CallGraph,
  unclean: ReadonlySet<OwnFunction>,
): Map<OwnFunction, Fault[]> {
  const component = components(graph);
  const callers = new Map<OwnFunction, OwnFunction[]>();
  for (const { from, to, isCall } of [...graph.values()].flat()) {
    if (isCall) callers.set(to, [...(callers.get(to) ?? []), from]);
  }
  const reached = new Set(unclean);
  for (const fn of reached) for (const caller of callers.get(fn) ?? []) reached.add(caller);
  const faults = new Map<OwnFunction, Fault[]>();
  for (const [from, edges] of graph) {
    const tainted = edges.filter(
      ({ to, isCall }) => isCall && reached.has(to) && component.get(to) !== component.get(from),
    );
    faults.set(
      from,
      tainted.map(({ to, at }) => ({
        rule: uncleanCall,
        at,
        what: `${to.name} is called, which has findings`,
      })),
    );
  }
  return faults;
}
