export function sum(a, ...more) {
  //                   ^ inspect.rest-parameter
  return a + more[0];
}

export function two(a, b) {
  return a + b;
}
