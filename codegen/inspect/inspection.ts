import { type Finding, InputError } from '../../src/finding.ts';
import { allocationFaults } from './allocations.ts';
import { type CallGraph, callGraph } from './call-graph.ts';
import { callFaults } from './calls.ts';
import { type Count, countFunctions } from './counts.ts';
import { type Fault, toFinding } from './fault.ts';
import { float32Faults } from './float32.ts';
import { float32Variables } from './float32-values.ts';
import type { OwnFunction } from './functions.ts';
import { hazardFaults } from './hazards.ts';
import { iterationFaults } from './iteration.ts';
import { loopFaults } from './loops.ts';
import { nameFaults } from './names.ts';
import { recursionFaults, uncleanCallFaults } from './recursion.ts';
import { nestingError, parseSource, readSource } from './source.ts';
import { stringFaults } from './strings.ts';
import { makeUnit, type Unit } from './unit.ts';

/** What an inspection is asked beyond the rules that hold for every function. */
export interface InspectOptions {
  /**
   * Names of functions that must be float32 arithmetic; the functions of the file that they run are held to the
   * same. Default: none.
   */
  readonly float32?: readonly string[];
}

/** A function of an inspected file and its cost. */
export interface InspectedFunction extends Count {
  /** Its name, after those of the functions and the class around it: `make.position`. */
  readonly name: string;
  readonly exported: boolean;
  /** Line of its start, counted from 1. */
  readonly line: number;
}

/** What inspecting one file gave. */
export interface Inspection {
  /** Findings in order of their place. */
  readonly findings: readonly Finding[];
  /** The functions of the file in order of their text. */
  readonly functions: readonly InspectedFunction[];
}

/** The rules that look at one function at a time. */
const rooms: readonly ((unit: Unit, fn: OwnFunction) => Fault[])[] = [
  allocationFaults,
  stringFaults,
  iterationFaults,
  loopFaults,
  hazardFaults,
  callFaults,
  nameFaults,
];

/**
 * Inspects a TypeScript or JavaScript file.
 *
 * @param path file to read; findings name it as given
 * @throws InputError when it is missing, unreadable, above 4 MiB, no UTF-8 text or no valid source
 */
export function inspectFile(path: string, options: InspectOptions = {}): Inspection {
  return inspectSource(path, readSource(path), options);
}

/**
 * Inspects a TypeScript or JavaScript text.
 *
 * @param fileName name for findings; its ending says which language the text is in
 * @throws InputError for syntax errors, another language, or a float32 function that the text does not have
 */
export function inspectSource(fileName: string, text: string, options: InspectOptions = {}): Inspection {
  try {
    return inspectUnit(makeUnit(parseSource(fileName, text)), options);
  } catch (error) {
    if (error instanceof RangeError && error.message.includes('call stack')) throw nestingError(fileName);
    throw error;
  }
}

function inspectUnit(unit: Unit, options: InspectOptions): Inspection {
  const functions = [...unit.functions.values()];
  const graph = callGraph(unit);
  const float32 = float32Functions(unit, graph, options.float32 ?? []);
  const variables = float32.size === 0 ? new Set<never>() : float32Variables(unit);
  const circles = recursionFaults(graph);
  const own = new Map(
    functions.map((fn) => [
      fn,
      [
        ...rooms.flatMap((room) => room(unit, fn)),
        ...(float32.has(fn) ? float32Faults(unit, variables, fn) : []),
        ...(circles.get(fn) ?? []),
      ],
    ]),
  );
  const unclean = uncleanCallFaults(graph, new Set(functions.filter((fn) => own.get(fn)!.length > 0)));
  const faults = functions.flatMap((fn) => [...own.get(fn)!, ...(unclean.get(fn) ?? [])]);
  const counts = countFunctions(unit);
  return {
    findings: faults.map((fault) => toFinding(fault, unit.file)).sort(byPlace),
    functions: functions.map((fn) => ({
      name: fn.name,
      exported: fn.exported,
      line: unit.source.getLineAndCharacterOfPosition(fn.node.getStart(unit.source)).line + 1,
      ...counts.get(fn)!,
    })),
  };
}

/** The named functions and all that they run. */
function float32Functions(unit: Unit, graph: CallGraph, names: readonly string[]): Set<OwnFunction> {
  const functions = [...unit.functions.values()];
  const missing = names.filter((name) => !functions.some((fn) => fn.name === name));
  if (missing.length > 0) throw new InputError(...missing.map((name) => unknownFunction(unit.file, name)));
  const reached = new Set(functions.filter((fn) => names.includes(fn.name)));
  for (const fn of reached) for (const { to } of graph.get(fn) ?? []) reached.add(to);
  return reached;
}

function unknownFunction(file: string, name: string): Finding {
  return {
    code: 'inspect.unknown-function',
    place: { file },
    what: `there is no function ${name} to hold to float32 arithmetic`,
    why: 'A misspelt name would pass every check.',
    remedy: 'Name functions as the list of counts does.',
  };
}

function byPlace(a: Finding, b: Finding): number {
  return (
    (a.place.line ?? 0) - (b.place.line ?? 0) ||
    (a.place.column ?? 0) - (b.place.column ?? 0) ||
    (a.code < b.code ? -1 : Number(a.code > b.code))
  );
}
