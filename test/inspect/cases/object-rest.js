export function rest(p) {
  const { x, ...others } = p;
  //         ^ inspect.object-rest
  return x + others.y;
}

export function parts(p) {
  const { x, y: z } = p;
  return x + z;
}
