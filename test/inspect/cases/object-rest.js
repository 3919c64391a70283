export function rest(p) {
  const { x, ...others } = p;
  //         ^ inspect.object-rest
  let more = x;
  ({ x: more, ...others.rest } = p);
  //          ^ inspect.object-rest
  return more + others.y;
}

export function parts(p) {
  const { x, y: z } = p;
  return x + z;
}

// The copy is the object literal's.
export function copy(p) {
  return { ...p };
  //     ^ inspect.object-literal
}
