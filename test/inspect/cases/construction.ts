const scratch = new Float32Array(3);

export function make(x: number): number {
  const v = new Float32Array(3);
  //        ^ inspect.construction
  v[0] = x;
  return v[0];
}

export function reuse(x: number): number {
  scratch[0] = x;
  return scratch[0];
}
