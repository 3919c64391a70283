import type { Analysis } from '../faulty.ts';
import { cappedSolvers, convergence, sines, truncations } from './block-checks.ts';
import { arithmetic, functionsOfAngles, keplerEquation } from './interval-checks.ts';
import { chains, singleLines } from './rounding-checks.ts';
import { cells, subdivision } from './search-checks.ts';
import { adjoints, frames } from './tape-checks.ts';
import { errorsOfTurns, largestDirection, products, rotations, sharedLines } from './vector-checks.ts';
import { certification, WHOLES } from './whole-checks.ts';

/** Checks of the error proof, the quick ones first. */
const CHECKS: readonly ((analysis: Analysis) => void)[] = [
  singleLines,
  adjoints,
  frames,
  sharedLines,
  errorsOfTurns,
  arithmetic,
  keplerEquation,
  functionsOfAngles,
  largestDirection,
  truncations,
  cells,
  chains,
  subdivision,
  convergence,
  products,
  rotations,
  ...WHOLES.slice(0, 2),
  sines,
  certification,
  cappedSolvers,
  ...WHOLES.slice(2),
];

/**
 * Runs the checks on an analysis until one fails.
 *
 * @returns what failed; undefined when all hold
 */
export function firstFailure(analysis: Analysis): string | undefined {
  for (const check of CHECKS) {
    try {
      check(analysis);
    } catch (error) {
      return `${check.name || 'the whole proof'}: ${(error as Error).message}`;
    }
  }
  return undefined;
}
