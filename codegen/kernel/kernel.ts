import type { Domain } from '../../src/models/description.ts';
import type { Node, Stage } from '../formula/node.ts';
import type { Choices, Format } from './choices.ts';

/** Operations of a kernel line. `round` is the rounding of a float64 value to float32. */
export type Operation =
  | 'input'
  | 'constant'
  | 'add'
  | 'sub'
  | 'mul'
  | 'div'
  | 'neg'
  | 'sqrt'
  | 'abs'
  | 'floor'
  | 'select'
  | 'round';

/**
 * One machine operation with one rounding. Arguments are numbers of earlier lines; `select` takes a, b, x, y and
 * is `a < b ? x : y`. A constant is no operation: it is written where it is used.
 */
export interface Line {
  readonly name: string;
  readonly operation: Operation;
  readonly args: readonly number[];
  readonly format: Format;
  readonly stage: Stage;
  /** Value of a constant as emitted: a number of the line's format. */
  readonly value: number;
  /** The exact value that the line stands for, as a node of the lowered formula. */
  readonly node: Node;
}

/** One output of the tick: where it comes from and what it is. */
export interface KernelOutput {
  readonly group: string;
  readonly name: string;
  readonly unit: string;
  readonly line: number;
}

/** A lowered program: straight-line assignments. What is emitted, counted and bounded is this list. */
export interface Kernel {
  readonly model: string;
  readonly choices: Choices;
  readonly domain: Domain;
  /** Fields of the elements that setup reads and checks, in order. */
  readonly elements: readonly string[];
  readonly lines: readonly Line[];
  /** Lines of setup whose values the tick needs, by slot of the state array. */
  readonly state: readonly number[];
  /** Slot whose value is above zero for every valid setup; a state that setup never filled is found by it. */
  readonly guard: number;
  readonly outputs: readonly KernelOutput[];
}

/** Operations that take a Math.fround around them in float32; the others are exact on float32 numbers. */
export function isRounded(operation: Operation): boolean {
  return (
    operation === 'add' ||
    operation === 'sub' ||
    operation === 'mul' ||
    operation === 'div' ||
    operation === 'sqrt'
  );
}
