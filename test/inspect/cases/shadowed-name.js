const k = 1;

export function inner(x) {
  const y = x;
  if (x > 0) {
    const y = 2 * x;
    //    ^ inspect.shadowed-name
    return y;
  }
  return y;
}

export function parameter(t) {
  for (let t = 0; t < 2; t++) t === 1;
  //       ^ inspect.shadowed-name
  return t;
}

// The inner k would be taken for the k of the last line.
export function outside(x) {
  if (x > 0) {
    const k = x;
    //    ^ inspect.shadowed-name
    if (k > 2) return k;
  }
  return k;
}

// Blocks side by side, another function, and a name that nothing else uses.
export function beside(x) {
  if (x > 0) {
    const a = x;
    return a;
  } else {
    const a = -x;
    return a;
  }
}
export function another(y) {
  const k = y;
  return k;
}
export function propertyName(o) {
  if (o.z > 0) {
    const z = 1;
    return z;
  }
  return o.z;
}
