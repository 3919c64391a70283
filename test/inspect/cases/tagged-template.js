export function raw(n, tag) {
  return tag`a${n}`;
  //     ^ inspect.tagged-template
}

export function plain() {
  return `a`;
}
