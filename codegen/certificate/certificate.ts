import type { Range } from '../../src/models/description.ts';
import type { Choices } from '../kernel/choices.ts';
import type { Operations } from '../kernel/operations.ts';
import type { Effort } from '../observe/observe.ts';
import type { Point } from '../observe/points.ts';

/** A part of an error along one axis of the orbit. */
export interface ErrorPart {
  readonly certified: number | null;
  readonly observed: number;
}

/** Error of one output, in the unit of its key. */
export interface ErrorEntry {
  /** Proven bound. */
  readonly certified: number;
  /** Largest error seen. */
  readonly observed: number;
  /** Largest proven bound found at a single point: what subdivision cannot get below. */
  readonly limit: number;
  /** What the budget allows. */
  readonly allowed: number;
  readonly certified_to_observed: number;
  readonly certified_to_limit: number;
  /** Boxes of the proof. */
  readonly boxes: number;
  /** The input that gives the observed error. */
  readonly at: Point;
  /** Parts of a position's error; null for other outputs. */
  readonly radial: ErrorPart | null;
  readonly along: ErrorPart | null;
  readonly cross: ErrorPart | null;
}

/** A line of the kernel and its share in the certified error of an output, where that is largest. */
export interface AnatomyEntry {
  readonly output: string;
  readonly line: string;
  readonly share: number;
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
  /** Lines that contribute most to the certified error; a line that ends a block stands for the whole block. */
  readonly anatomy: readonly AnatomyEntry[];
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
  'The proof: ranges and adjoints are rounded outward from correctly rounded + - * / and Math.sqrt of the engine that runs it; its sines are its own, proven to 2.5 units of 2^-53; truncations of polynomials are bounded in exact rational arithmetic.',
  'The proof: the exact rules of lowering (sums of angles, true anomaly, regrouped products) hold as published; they are checked in 30-digit arithmetic, not proven by machine.',
  'The formula takes every number written in the model and in the constants as the float64 number that the language makes of it.',
];
