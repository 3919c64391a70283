/** Generated file, do not edit. Elements that setup takes. */
export interface Elements {
  /** m^(1/2), [5150, 5160] */
  readonly sqrtA: number;
  /** 1, [0, 0.03] */
  readonly e: number;
  /** rad, [0.9, 1.02] */
  readonly i0: number;
  /** rad, [-3.1415926536, 3.1415926536] */
  readonly Omega0: number;
  /** rad, [-3.1415926536, 3.1415926536] */
  readonly omega: number;
  /** rad, [-3.1415926536, 3.1415926536] */
  readonly M0: number;
  /** rad/s, [-1.1703344634254336e-8, 1.1702987476520137e-8] */
  readonly deltaN: number;
  /** rad/s, [-2.925836158563584e-9, 2.925479000829385e-9] */
  readonly IDOT: number;
  /** rad/s, [-1e-8, -6e-9] */
  readonly OmegaDot: number;
  /** rad, [-0.00006103515625061035, 0.0000610332936054611] */
  readonly Cuc: number;
  /** rad, [-0.00006103515625061035, 0.0000610332936054611] */
  readonly Cus: number;
  /** m, [-1024.00000001024, 1023.9687500102397] */
  readonly Crc: number;
  /** m, [-1024.00000001024, 1023.9687500102397] */
  readonly Crs: number;
  /** rad, [-0.00006103515625061035, 0.0000610332936054611] */
  readonly Cic: number;
  /** rad, [-0.00006103515625061035, 0.0000610332936054611] */
  readonly Cis: number;
  /** s, [0, 604784] */
  readonly toe: number;
  /** s, [-0.0009765625000097656, 0.0009765620343484783] */
  readonly af0: number;
  /** s/s, [-3.725290298499167e-9, 3.725176611661444e-9] */
  readonly af1: number;
  /** s/s^2, [-3.552713678836028e-15, 3.5249581032201215e-15] */
  readonly af2: number;
  /** s, [-5.960464477598667e-8, 5.9138983488674274e-8] */
  readonly TGD: number;
  /** s, [-7200, 7200] */
  readonly toeMinusToc: number;
}

/** 0 good; 1 element outside its range or state not filled; 2 time outside its span; 3 not a finite number. */
export type Status = 0 | 1 | 2 | 3;

/** Words of the state array. */
export declare const stateWords: 26;

/** Prepares the state of one satellite. */
export declare function setup(elements: Elements, state: Float64Array): Status;

/** Predicts at one epoch: out[0] position x in m, out[1] position y in m, out[2] position z in m, out[3] clock in s. */
export declare function position(t: number, state: Float64Array, out: Float64Array | number[]): Status;
