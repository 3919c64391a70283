const tag = Symbol('t');
const big = 10n;

export function boxes(x) {
  const n = new Number(x);
  //        ^ inspect.boxed-value
  const s = Symbol();
  //        ^ inspect.boxed-value
  const b = BigInt(x);
  //        ^ inspect.boxed-value
  const c = 12n;
  //        ^ inspect.boxed-value
  const e = c * 3n;
  //          ^ inspect.boxed-value
  //            ^ inspect.boxed-value
  const d = 12;
  return n === s ? b : c === tag ? d : e - big;
  //                                     ^ inspect.boxed-value
}
