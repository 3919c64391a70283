/** Generated file, do not edit. Elements that setup takes. */
export interface Elements {
  /** m, [6600000, 43000000] */
  readonly a: number;
  /** 1, [0, 0.1] */
  readonly e: number;
  /** rad, [0, 3.141592653589793] */
  readonly i: number;
  /** rad, [-3.141592653589793, 3.141592653589793] */
  readonly Omega: number;
  /** rad, [-3.141592653589793, 3.141592653589793] */
  readonly omega: number;
  /** rad, [-3.141592653589793, 3.141592653589793] */
  readonly M0: number;
}

/** 0 good; 1 element outside its range or state not filled; 2 time outside its span; 3 not a finite number. */
export type Status = 0 | 1 | 2 | 3;

/** Words of the state array. */
export declare const stateWords: 11;

/** Prepares the state of one satellite. */
export declare function setup(elements: Elements, state: Float64Array): Status;

/** Predicts at one epoch: out[0] position x in m, out[1] position y in m, out[2] position z in m. */
export declare function position(t: number, state: Float64Array, out: Float64Array | number[]): Status;
