export function factorial(n) {
  return n < 2 ? 1 : n * factorial(n - 1);
  //                     ^ inspect.recursion
}

export function even(n) {
  return n === 0 ? 1 : odd(n - 1);
  //                   ^ inspect.recursion
}

function odd(n) {
  return n === 0 ? 0 : even(n - 1);
  //                   ^ inspect.recursion
}

// Calls that meet again below are no circle.
export function top(x) {
  return left(x) + right(x);
}
const left = (x) => base(x);
const right = (x) => base(x) + base(x);
function base(x) {
  return x;
}

// Another function of the same name, from a parameter.
export function inner(inner) {
  return inner.x;
}
