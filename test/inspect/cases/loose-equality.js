export function same(a, b) {
  return a == b;
  //       ^ inspect.loose-equality
}

export function none(a) {
  return a != null;
  //       ^ inspect.loose-equality
}

export function strict(a, b) {
  return a === b || a !== 0;
}
