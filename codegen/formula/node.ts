/**
 * Operations of a formula, in exact real arithmetic.
 *
 * `select` takes four arguments a, b, x, y and stands for `a < b ? x : y`.
 * `kepler` takes M, e and is the E that solves M = E - e sin E.
 * `offset` takes sin M, cos M, e and is the D = E - M that solves D = e (sin M cos D + cos M sin D).
 */
export const OPERATIONS = {
  input: 0,
  constant: 0,
  neg: 1,
  sqrt: 1,
  abs: 1,
  floor: 1,
  sin: 1,
  cos: 1,
  add: 2,
  sub: 2,
  mul: 2,
  div: 2,
  atan2: 2,
  kepler: 2,
  offset: 3,
  select: 4,
} as const;

/** Name of an operation of a formula; its number of arguments stands in OPERATIONS. */
export type Operation = keyof typeof OPERATIONS;

/** When an input changes: with an upload of elements, or with every epoch. Constants never change. */
export type Stage = 'constant' | 'setup' | 'tick';

/** Stages from the rarest to the most frequent. */
export const STAGES: readonly Stage[] = ['constant', 'setup', 'tick'];

/** One node of an expression graph. Equal expressions of one graph are the same object. */
export interface Node {
  readonly operation: Operation;
  readonly args: readonly Node[];
  /** The latest stage of all inputs that the node depends on. */
  readonly stage: Stage;
  /** Value of a constant: a float64 number, taken as exact. */
  readonly value: number;
  /** Name of an input, '' for other nodes. */
  readonly name: string;
}

/** An input of a formula. */
export interface Input {
  readonly name: string;
  readonly unit: string;
  readonly stage: Stage;
}

/** One output: a component of a group such as position (x, y, z) or clock. */
export interface Output {
  readonly group: string;
  readonly name: string;
  readonly unit: string;
  readonly node: Node;
}

/** A model in exact real arithmetic: an expression graph with named inputs and outputs. */
export interface Formula {
  readonly name: string;
  readonly inputs: readonly Input[];
  readonly outputs: readonly Output[];
  /** Names that the reference gives to intermediate values, for people; unique. */
  readonly labels: ReadonlyMap<Node, string>;
}

/** The later of two stages. */
export function laterStage(a: Stage, b: Stage): Stage {
  return STAGES.indexOf(a) >= STAGES.indexOf(b) ? a : b;
}
