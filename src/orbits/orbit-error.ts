import type { Position } from '../models/position.ts';

/** A difference of two positions along the axes of the orbit, m. */
export interface OrbitError {
  /** Away from the Earth's centre. */
  readonly radial: number;
  /** Across the radius in the orbital plane, the way the satellite goes. */
  readonly along: number;
  /** Along r x v, normal to the orbital plane. */
  readonly cross: number;
  /** Length of the difference. */
  readonly total: number;
}

/**
 * Half the span of the difference quotient, s: truncation and rounding stay below 1e-6 m/s on a GPS orbit.
 */
const HALF_SPAN = 0.1;

/**
 * Velocity in the frame of the positions, by a central difference of a position function of time in seconds.
 */
export function differenceVelocity(positionAt: (t: number) => Position, t: number): Position {
  return scaled(minus(positionAt(t + HALF_SPAN), positionAt(t - HALF_SPAN)), 1 / (2 * HALF_SPAN));
}

/**
 * Takes a position error apart along the axes of the orbit. Axes: radial along r, cross along r x v, along
 * completes them; v is the inertial velocity, that is the velocity in the Earth-fixed frame plus the rotation
 * of the Earth x r (common practice, no source).
 *
 * @param position position under test, Earth-fixed, m
 * @param reference position taken as true, Earth-fixed, m
 * @param velocity velocity in the Earth-fixed frame, m/s
 * @param rotation rate of the Earth's rotation about z, rad/s
 */
export function orbitError(
  position: Position,
  reference: Position,
  velocity: Position,
  rotation: number,
): OrbitError {
  const difference = minus(position, reference);
  const inertial = {
    x: velocity.x - rotation * reference.y,
    y: velocity.y + rotation * reference.x,
    z: velocity.z,
  };
  const radialAxis = unit(reference);
  const crossAxis = unit(cross(reference, inertial));
  const alongAxis = cross(crossAxis, radialAxis);
  return {
    radial: dot(difference, radialAxis),
    along: dot(difference, alongAxis),
    cross: dot(difference, crossAxis),
    total: length(difference),
  };
}

/** Distance of two points, m; of two velocities, m/s. */
export function distanceBetween(one: Position, other: Position): number {
  return length(minus(one, other));
}

function minus(a: Position, b: Position): Position {
  return { x: a.x - b.x, y: a.y - b.y, z: a.z - b.z };
}

function scaled(a: Position, factor: number): Position {
  return { x: a.x * factor, y: a.y * factor, z: a.z * factor };
}

function dot(a: Position, b: Position): number {
  return a.x * b.x + a.y * b.y + a.z * b.z;
}

function cross(a: Position, b: Position): Position {
  return { x: a.y * b.z - a.z * b.y, y: a.z * b.x - a.x * b.z, z: a.x * b.y - a.y * b.x };
}

function length(a: Position): number {
  return Math.sqrt(dot(a, a));
}

function unit(a: Position): Position {
  return scaled(a, 1 / length(a));
}
