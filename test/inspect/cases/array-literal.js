const table = [1, 2, 3];

export function pair(x) {
  const p = [x, x];
  //        ^ inspect.array-literal
  return p[0] + table[1];
}

export function copy(x, out) {
  out[0] = x;
  out[1] = table[2];
}
