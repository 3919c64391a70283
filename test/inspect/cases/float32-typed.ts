const scratch = new Float32Array(4);
const doubles = new Float64Array(4);
const fround = Math.fround;
export function kernel(t: number, state: Float32Array, other: Float32Array | number[], out: number[]): number {
  const x1 = fround(t);
  const x2 = fround(scratch[0]! * x1);
  const x3 = fround(doubles[0]! * x1);
  //                ^ inspect.float32-operand
  const x4 = fround(x2 + other[1]!);
  //                     ^ inspect.float32-operand
  out[0] = fround(x2 + state[1]!);
  out[1] = fround(x3 + x4);
  out[2] = 16777217;
  //       ^ inspect.float32-literal
  out[3] = 16777216;
  return 0;
}
