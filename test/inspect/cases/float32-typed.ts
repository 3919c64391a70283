const scratch = new Float32Array(4);
const doubles = new Float64Array(4);
const fround = Math.fround;
declare const Unknown: number;
export function kernel(t: number, state: Float32Array, other: Float32Array | number[], out: number[]): number {
  const x1 = fround(t);
  const x2 = fround(scratch[0]! * x1);
  const x3 = fround(doubles[0]! * x1);
  //                ^ inspect.float32-operand
  const x4 = fround(x2 + other[1]!);
  //                     ^ inspect.float32-operand
  out[0] = fround(x2 + state[1]!);
  out[1] = fround(x3 + x4);
  out[6] = fround(x2 * Infinity);
  out[7] = fround(x2 * NaN);
  out[8] = fround(x2 * Unknown);
  //                   ^ inspect.float32-operand
  out[2] = 16777217;
  //       ^ inspect.float32-literal
  out[3] = 16777216;
  for (const v of state) out[4] = fround(v * x2);
//^ inspect.iteration inspect.unbounded-loop
  //                                     ^ inspect.float32-operand
  for (let i = 16777215; i < 16777218; i++) out[5] = fround(i * x2);
  //                                                        ^ inspect.float32-operand
  for (let i = 16777214; i < 16777216; i++) out[5] = fround(i * x2);
  return 0;
}
