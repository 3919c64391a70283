import { helper } from './helper.js';

export function calls(x, f, o) {
  const a = helper(x);
  //        ^ inspect.outside-call
  const b = f(x);
  //        ^ inspect.outside-call
  const c = o.step(x);
  //          ^ inspect.outside-call
  const d = Math.max(a, b);
  //             ^ inspect.outside-call
  const e = Number.isFinite(c);
  //               ^ inspect.outside-call
  using g = d;
//^ inspect.outside-call
  return e ? g : own(x);
}

const own = (x) => x + 1;
const alias = own;
export function inside(x) {
  return alias(own(x));
}

// A function variable that is written again may be anything.
let changing = own;
export function swap(f) {
  changing = f;
  return changing(1);
  //     ^ inspect.outside-call
}
