import type { Format } from '../kernel/choices.ts';
import type { Operation } from '../kernel/kernel.ts';

/** Where a statement of the file starts; lines and columns count from 1. */
export interface Mark {
  readonly line: number;
  readonly column: number;
}

/** What a line takes: the value of an earlier line, by its number, or a number written in its place. */
export type ParsedArgument = { readonly line: number } | { readonly literal: number };

/** One value of the file: an input, or one machine operation on earlier values. */
export interface ParsedLine extends Mark {
  /** As the function that computes it calls it. */
  readonly name: string;
  readonly operation: Exclude<Operation, 'constant'>;
  readonly args: readonly ParsedArgument[];
  /** `f32` when the file itself shows that the value is a float32 number. */
  readonly format: Format;
  readonly stage: 'setup' | 'tick';
}

/** An input with the range outside of which the file refuses it. */
export interface ParsedInput extends Mark {
  /** Field of the elements, `t` for the time. */
  readonly field: string;
  /** Number of its line. */
  readonly input: number;
  /** Number of the line that rounds it to float32, when that value is checked instead. */
  readonly rounded: number | undefined;
  readonly min: number;
  readonly max: number;
}

/** A word of the state: the number of the line that setup stores there. */
export interface ParsedWord extends Mark {
  readonly value: number;
}

/** What position writes to one place of the outputs. */
export interface ParsedOutput extends Mark {
  readonly value: ParsedArgument;
}

/** A kernel as its file says it. A value of setup that position loads from the state is still the same line. */
export interface ParsedKernel {
  /** All values, setup before position, each part in the order of the file. */
  readonly lines: readonly ParsedLine[];
  readonly elements: readonly ParsedInput[];
  readonly time: ParsedInput;
  /** What setup stores, by slot; position loads every slot once. */
  readonly state: readonly ParsedWord[];
  /** Slot that setup clears before anything else and position wants to be above zero; -1 when there is none. */
  readonly guard: number;
  /** What position writes, by index. */
  readonly outputs: readonly ParsedOutput[];
  /** Where the functions return 0. */
  readonly ends: { readonly setup: Mark; readonly tick: Mark };
}
