const cos = Math.cos;
const { atan2: angle } = Math;
const M = Math;
const quarter = Math.sin(Math.PI / 2);

export function orbit(E) {
  const a = Math.sin(E);
  //             ^ inspect.engine-function
  const b = cos(E);
  //        ^ inspect.engine-function
  const c = angle(a, b);
  //        ^ inspect.engine-function
  const d = M.exp(c);
  //          ^ inspect.engine-function
  const e = d ** 2;
  //          ^ inspect.engine-function
  const f = Math['tan'](e);
  //        ^ inspect.engine-function
  return f + quarter;
}

const root = Math.sqrt;
export function exact(x) {
  return root(x) + Math.abs(x) + Math.floor(x) + Math.fround(x) + Math.PI;
}
