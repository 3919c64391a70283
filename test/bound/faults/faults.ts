import type { Fault } from '../faulty.ts';
import { ADJOINTS } from './adjoints.ts';
import { BLOCKS_AND_SEARCH } from './blocks-and-search.ts';
import { NUMBERS } from './numbers.ts';
import { ROUNDING } from './rounding.ts';

/** Faults that somebody could make in the analysis: each must be noticed. */
export const FAULTS: readonly Fault[] = [...NUMBERS, ...ROUNDING, ...ADJOINTS, ...BLOCKS_AND_SEARCH];
