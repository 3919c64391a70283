import type { Range } from '../../src/models/description.ts';
import type { Choices } from '../kernel/choices.ts';
import type { Operations } from '../kernel/operations.ts';
import type { Effort } from '../observe/observe.ts';
import type { Point } from '../observe/points.ts';

/** Error of one output, in the unit of its key. */
export interface ErrorEntry {
  /** Proven bound; null until proven. */
  readonly certified: number | null;
  /** Largest error seen. */
  readonly observed: number;
  /** What the budget allows; null for an output without a limit. */
  readonly limit: number | null;
  /** The input that gives the observed error. */
  readonly at: Point;
  /** Largest observed parts of a position's error; null for other outputs. */
  readonly radial: number | null;
  readonly along: number | null;
  readonly cross: number | null;
}

/** What a reviewer needs to know of one kernel. */
export interface Certificate {
  readonly schema: 'bound-orbit certificate 1';
  readonly tool: string;
  readonly model: string;
  readonly choices: Choices;
  readonly domain: {
    readonly name: string;
    readonly ranges: Readonly<Record<string, Range & { readonly unit: string }>>;
  };
  readonly error: {
    readonly position_m?: ErrorEntry;
    readonly velocity_mps?: ErrorEntry;
    readonly clock_s?: ErrorEntry;
  };
  /** Lines and rules that contribute most to the certified error; empty until proven. */
  readonly anatomy: readonly never[];
  readonly operations: { readonly setup: Operations; readonly tick: Operations };
  readonly state: { readonly words: number; readonly bytes: number };
  readonly code: { readonly bytes: number; readonly minified_bytes: number };
  readonly effort: Effort;
  readonly assumptions: readonly string[];
  readonly digest: { readonly kernel: string; readonly model: string; readonly outputs: string };
  readonly caution: string;
}

/** Keys of the certificate's errors by output group. */
export const ERROR_KEY_OF_GROUP: Readonly<Record<string, 'position_m' | 'velocity_mps' | 'clock_s'>> = {
  position: 'position_m',
  velocity: 'velocity_mps',
  clock: 'clock_s',
};

export const CAUTION =
  'Not certified for safety of life. The interface documents, local rules and licensed practice decide; positions must not be trusted where an error can hurt people.';

/** What every kernel rests on beside its own lines. */
export const ASSUMPTIONS: readonly string[] = [
  'The engine rounds + - * / and Math.sqrt of float64 numbers as IEEE 754 says, to nearest, ties to even.',
  'Math.floor and Math.abs are exact, and Math.fround rounds to the nearest float32 number, as ECMAScript says.',
  'Subnormal numbers are not flushed to zero.',
  'The formula takes every number written in the model and in the constants as the float64 number that the language makes of it.',
];
