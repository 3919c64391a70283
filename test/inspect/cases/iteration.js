const pair = [1, 2];
const [first] = pair;

export function spreads(f, xs) {
  for (const x of xs) f[0] = x;
//^ inspect.iteration inspect.unbounded-loop
  const [a] = xs;
  //    ^ inspect.iteration
  const all = [...xs];
  //          ^ inspect.array-literal
  //           ^ inspect.iteration
  let b = 0;
  [b] = xs;
//^ inspect.iteration
  ({ a: [b] } = xs);
  //    ^ inspect.iteration
  [...[b]] = xs;
//^ inspect.iteration
  //  ^ inspect.iteration
  return a + b + all[0];
}

// Elements by index, properties by name.
export function indexed(xs) {
  const { length } = xs;
  return first + xs[0] + length;
}
