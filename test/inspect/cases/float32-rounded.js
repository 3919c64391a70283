const fround = Math.fround;
const half = 0.5;
const tenth = 0.1;

/**
 * @param {number} t
 * @param {Float32Array} state
 * @param {number[]} plain
 */
export function kernel(t, state, plain, out) {
  if (!(t >= -7200 && t <= 7200)) return t - t === 0 ? 2 : 3;
  const s3 = state[3];
  const x1 = fround(t);
  const x2 = fround(x1 * s3);
  const x3 = x1 * s3;
  //            ^ inspect.float32-unrounded
  const x4 = fround(x1 * s3 + x2);
  //                   ^ inspect.float32-unrounded
  const x5 = fround(t * x1);
  //                ^ inspect.float32-operand
  const x6 = fround(plain[0] * x1);
  //                ^ inspect.float32-operand
  const x7 = fround(x1 + 0.1);
  //                     ^ inspect.float32-literal
  const x8 = fround(x1 + half);
  const x9 = fround(x1 + tenth);
  //                     ^ inspect.float32-operand
  const x10 = Math.sqrt(x1);
  //               ^ inspect.float32-unrounded
  const x11 = fround(Math.sqrt(Math.abs(x1)));
  const x12 = fround(-x1 / (x1 < 1 ? x2 : 2));
  const x13 = fround(Math.floor(t) * x1);
  //                            ^ inspect.float32-operand
  const x14 = fround(x3 * x1);
  //                 ^ inspect.float32-operand
  const x15 = Math.fround(Math.fround(plain[1]) * x1);
  let x16 = x15;
  x16 = fround(x16 * x16);
  let x17 = x16;
  x17 *= x1;
  //  ^ inspect.float32-unrounded
  const x18 = fround(x17 * x1);
  //                 ^ inspect.float32-operand
  for (let i = 0; i < 4; i++) out[i + 1] = fround(x1 * i);
  out[0] = fround((x4 - x5));
  out[5] = fround(helper(x1));
  //              ^ inspect.unclean-call
  out[6] = x6 < x7 ? x8 : x9;
  out[7] = x10 < x11 ? x12 : x13;
  out[8] = x14 < x18 ? -1.5 : 3;
  return 0;
}

// What a float32 function runs is held to the same.
function helper(x) {
  return x * 2;
  //       ^ inspect.float32-unrounded
  //     ^ inspect.float32-operand
}

// This one nobody asked to be float32.
export function double(x) {
  return x * 0.1;
}
