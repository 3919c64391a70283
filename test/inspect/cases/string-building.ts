const name = 'sat';
const title = name + ' ' + name;

export function label(id: string, n: number): string {
  const a = id + 'x';
  //           ^ inspect.string-building
  let b = a;
  b += id;
  //^ inspect.string-building
  const c = String(n);
  //        ^ inspect.string-building
  const d = n.toFixed(2);
  //          ^ inspect.string-building
  return n === 0 ? title : b === c ? c : d;
}

// Numbers are added; comparing and returning strings that exist builds none.
export function status(n: number): string {
  return n + 1 > 2 ? 'late' : 'good';
}
