export class Filter {
  step(x) {
    return this.gain * x;
  }
}

export function make() {
  const Local = class {
    //          ^ inspect.class
    step(x) {
      return x;
    }
  };
  return Local;
}
