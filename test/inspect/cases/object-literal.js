// Created once, while the file loads: no finding.
const origin = { x: 0, y: 0 };

export function point(x, y) {
  const p = { x, y };
  //        ^ inspect.object-literal
  return p.x + origin.y;
}

// A target of an assignment creates nothing.
export function unpack(p) {
  let x = 0;
  ({ x } = p);
  let z = 0;
  ({ a: { x }, b: { z } = p } = p);
  for ({ z } of p) x = z;
//^ inspect.iteration inspect.unbounded-loop
  const { y } = p;
  return x + y + z;
}

export const nested = (t) => ({ a: { t } });
//                            ^ inspect.object-literal
//                                 ^ inspect.object-literal
