export function guarded(x) {
  try {
//^ inspect.exception
    return x;
  } catch {
    return 0;
  }
}

export function thrower(x) {
  if (x < 0) throw x;
  //         ^ inspect.exception
  return x;
}

export function status(x) {
  outer: for (let i = 0; i < 2; i++) {
    for (let j = 0; j < 2; j++) if (x === j) continue outer;
  }
  return x < 0 ? 1 : 0;
}
