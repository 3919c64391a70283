// Another Math than the language's.
export function local(Math, x) {
  return Math.sqrt(x);
  //          ^ inspect.outside-call
}

export function global(x) {
  return Math.sqrt(x);
}
