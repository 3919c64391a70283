function pack(x) {
  return [x];
  //     ^ inspect.array-literal
}

function middle(x) {
  return pack(x);
  //     ^ inspect.unclean-call
}

export function top(x) {
  return middle(x) + clean(x);
  //     ^ inspect.unclean-call
}

function clean(x) {
  return Math.abs(x);
}
