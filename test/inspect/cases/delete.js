export function drop(o) {
  delete o.x;
//^ inspect.delete
}

export function clear(o) {
  o.x = 0;
}
