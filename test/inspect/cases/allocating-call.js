const keys = Object.keys({ a: 1 });

export function lists(xs, text) {
  const a = xs.slice(1);
  //           ^ inspect.allocating-call
  const b = JSON.parse(text);
  //             ^ inspect.allocating-call
  const c = Object.keys(b);
  //               ^ inspect.allocating-call
  const d = Array(3);
  //        ^ inspect.allocating-call
  const e = xs.map(own).filter(own);
  //           ^ inspect.allocating-call
  //                    ^ inspect.allocating-call
  return a === c ? d : e[0] + keys[0];
}

function own(x) {
  return x;
}

// Reads of the same names are no calls.
export function reads(xs) {
  return xs.map + xs.slice;
}
