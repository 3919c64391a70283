export function run(text) {
  const a = eval(text);
  //        ^ inspect.eval
  const f = new Function(text);
  //        ^ inspect.eval
  const g = Function(text);
  //        ^ inspect.eval
  return a === f ? g : 0;
}

// An own function of that name is another thing.
const tools = { eval: 1 };
export function property() {
  return tools.eval;
}
