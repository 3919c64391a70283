export function label(n) {
  const constant = `no substitution`;
  const built = `satellite ${n}`;
  //            ^ inspect.template-literal
  return n === 0 ? constant : built;
}

const loaded = `${1 + 1}`;
export function two() {
  return loaded;
}
