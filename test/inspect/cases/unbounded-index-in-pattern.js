export function pattern(p) {
  for (let i = 0; i < 8; i++) ({ i } = p);
//^ inspect.unbounded-loop
  for (let j = 0; j < 8; j++) ({ a: j = 1 } = p);
//^ inspect.unbounded-loop
  for (let k = 0; k < 8; k++) for (k in p) p[0] = 1;
//^ inspect.unbounded-loop
  //                          ^ inspect.unbounded-loop
  for (let m = 0; m < 8; m++) ({ m: p.x } = p);
}
