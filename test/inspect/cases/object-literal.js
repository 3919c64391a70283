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
  const { y } = p;
  return x + y;
}

export const nested = (t) => ({ a: { t } });
//                            ^ inspect.object-literal
//                                 ^ inspect.object-literal
