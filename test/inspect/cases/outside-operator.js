export function bits(a, b) {
  const r = a % b;
  //          ^ inspect.outside-operator
  const s = a | 0;
  //          ^ inspect.outside-operator
  const t = ~b;
  //        ^ inspect.outside-operator
  const u = +b;
  //        ^ inspect.outside-operator
  const v = typeof b;
  //        ^ inspect.outside-operator
  const w = 'x' in a;
  //            ^ inspect.outside-operator
  return v === w ? r + s : t - u;
}

const mask = 1 << 4;
export function arithmetic(a, b) {
  return a + b - a * b / mask;
}
