/** The error proof, part by part: what the battery of checks runs on, as it stands or with a fault in it. */
export { errorsByCell } from '../../codegen/approximate/kepler-cells.ts';
export { KeplerConvergence } from '../../codegen/approximate/kepler-convergence.ts';
export { Backward } from '../../codegen/bound/backward.ts';
export { KernelBlocks } from '../../codegen/bound/blocks.ts';
export { certify } from '../../codegen/bound/certify.ts';
export { ErrorVector } from '../../codegen/bound/error-vector.ts';
export { Forward } from '../../codegen/bound/forward.ts';
export { lineRanges } from '../../codegen/bound/line-ranges.ts';
export { LineTape } from '../../codegen/bound/line-tape.ts';
export { sphereMaximum } from '../../codegen/bound/norm.ts';
export { ProductRounding } from '../../codegen/bound/product-rounding.ts';
export { Proof } from '../../codegen/bound/proof.ts';
export { rotationRounding } from '../../codegen/bound/rotation-rounding.ts';
export { subdivide } from '../../codegen/bound/search.ts';
export { sineErrors } from '../../codegen/bound/sine-block.ts';
export * as interval from '../../codegen/numbers/interval.ts';
export { boundCosineBins, boundSineBins } from '../../codegen/numbers/rational.ts';
