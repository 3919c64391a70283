export function* steps(n) {
  //           ^ inspect.generator
  yield n;
}

export function step(n) {
  return n + 1;
}
