/** Arithmetic of a stage: float64, or float32 with one rounding an operation. */
export type Format = 'f64' | 'f32';

/** Bits of a number of each format. */
export const BITS: Readonly<Record<Format, number>> = { f64: 53, f32: 24 };

/** First guess for Kepler's equation; the functions stand in src/kepler/starters.ts. */
export type Starter = 'firstOrder' | 'secondOrder' | 'thirdOrder' | 'danby' | 'secant';

/** Correction for Kepler's equation; the functions stand in src/kepler/correctors.ts. */
export type Corrector = 'newton' | 'halley' | 'quartic';

/** What makes one variant of a kernel differ from the next. */
export interface Choices {
  readonly setup: Format;
  readonly tick: Format;
  readonly starter: Starter;
  readonly corrector: Corrector;
  /** Number of corrections, fixed: there is no test for convergence. */
  readonly cap: number;
}

/** The name of a variant by its arithmetic, such as `f64` or `f64-setup-f32-tick`. */
export function arithmeticName(choices: Choices): string {
  return choices.setup === choices.tick ? choices.tick : `${choices.setup}-setup-${choices.tick}-tick`;
}
