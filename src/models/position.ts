/** A point in a right-handed Cartesian frame, metres. */
export interface Position {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}
