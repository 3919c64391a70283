export function count(a) {
  return a + arguments.length;
  //         ^ inspect.arguments-object
}

// A property of that name is no use of the object.
export function property(call) {
  return call.arguments;
}
