/**
 * Intervals with outward rounding: arithmetic, elementary functions and Kepler's equation, all on register
 * files and without allocation. Import this file as one name: `import * as interval`.
 */
export * from './interval-arithmetic.ts';
export * from './interval-functions.ts';
export * from './interval-kepler.ts';
