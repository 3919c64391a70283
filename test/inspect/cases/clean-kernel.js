const fround = Math.fround;
export const stateWords = 2;
export function setup(elements, state) {
  const sqrtA = elements.sqrtA;
  if (!(sqrtA >= 5150 && sqrtA <= 5160)) return sqrtA - sqrtA === 0 ? 1 : 3;
  const x1 = sqrtA * sqrtA;
  state[0] = x1;
  state[1] = fround(Math.sqrt(x1));
  return 0;
}
export function position(t, state, out) {
  const s0 = state[0];
  if (!(s0 > 0)) return 1;
  if (!(t >= -7200 && t <= 7200)) return t - t === 0 ? 2 : 3;
  const x2 = s0 * t;
  const x3 = x2 < 1 ? x2 : -x2;
  out[0] = x3;
  return 0;
}
