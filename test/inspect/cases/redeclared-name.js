export function twice(x) {
  var a = x;
  if (x > 0) {
    var a = 2;
    //  ^ inspect.redeclared-name
  }
  return a;
}

export function parameter(t) {
  var t = 1;
  //  ^ inspect.redeclared-name
  return t;
}

export function once(x) {
  var b = x;
  b = b + 1;
  return b;
}
