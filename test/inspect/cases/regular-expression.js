const word = /\w+/;

export function reads(text) {
  const r = /\d+/;
  //        ^ inspect.regular-expression
  const q = RegExp('a');
  //        ^ inspect.regular-expression
  const n = new RegExp('a');
  //        ^ inspect.regular-expression
  return r === word ? q : n / 2;
}
