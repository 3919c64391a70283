function scoped(o) {
  with (o) return x;
//^ inspect.with
}
function plain(o) {
  return o.with;
}
