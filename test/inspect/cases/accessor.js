export class Clock {
  get seconds() {
//^ inspect.accessor
    return this.ticks / 1000;
  }
  minutes() {
    return this.ticks / 60000;
  }
}
export const zero = {
  set origin(value) {
//^ inspect.accessor
    this.value = value;
  },
  get: 1,
};
