/** A vector of three components. */
export type Vector = readonly [number, number, number];

/** Radial, along-track and cross-track unit vectors of an orbit at a point. */
export interface OrbitAxes {
  readonly radial: Vector;
  readonly along: Vector;
  readonly cross: Vector;
}

/**
 * Axes of the orbital frame: radial outward, cross-track along r x v with v inertial, along-track completing.
 *
 * @param position position, m
 * @param velocity rate of the position in its frame, m/s
 * @param frameRate rotation rate of that frame about z, rad/s
 */
export function orbitAxes(position: Vector, velocity: Vector, frameRate: number): OrbitAxes {
  const [x, y] = position;
  const inertial: Vector = [velocity[0] - frameRate * y, velocity[1] + frameRate * x, velocity[2]];
  const radial = unit(position);
  const cross = unit(product(position, inertial));
  return { radial, along: product(cross, radial), cross };
}

/** Scalar product. */
export function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

function product(a: Vector, b: Vector): Vector {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

function unit(a: Vector): Vector {
  const length = Math.sqrt(dot(a, a));
  return [a[0] / length, a[1] / length, a[2] / length];
}
