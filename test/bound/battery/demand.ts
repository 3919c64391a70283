/** Stops a check whose demand is not met. */
export function demand(met: boolean, what: () => string): void {
  if (!met) throw new Error(what());
}

/** Keeps the largest share of a bound that an error reached; an error above its bound stops the check. */
export class Shares {
  largest = 0;

  /** An error and its bound. */
  add(error: number, bound: number, what: () => string): void {
    demand(error <= bound, () => `${what()}: the error ${error} is above the bound ${bound}`);
    if (bound > 0 && bound < Infinity) this.largest = Math.max(this.largest, error / bound);
  }

  /** Demands that the bounds were reached up to a share. */
  reach(share: number, what: string): void {
    demand(this.largest >= share, () => `${what}: errors reach only ${this.largest} of the bounds`);
  }
}
