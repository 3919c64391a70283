import { eccentricAnomaly } from '../kepler/eccentric-anomaly.ts';
import type { Position } from './position.ts';

/** Classical orbital elements at an epoch. */
export interface ClassicalElements {
  /** Semi-major axis, m. */
  readonly a: number;
  /** Eccentricity, 0 <= e < 1. */
  readonly e: number;
  /** Inclination, rad. */
  readonly i: number;
  /** Right ascension of the ascending node, rad. */
  readonly Omega: number;
  /** Argument of perigee, rad. */
  readonly omega: number;
  /** Mean anomaly at the epoch, rad. */
  readonly M0: number;
}

/** The constant of a two-body problem. */
export interface CentralBody {
  /** Gravitational parameter, m^3/s^2. */
  readonly mu: number;
}

/**
 * Inertial position on an unperturbed elliptic orbit.
 * Source: Vallado, Fundamentals of Astrodynamics and Applications, section 2.6 (perifocal frame and its
 * rotation by Omega, i, omega) and Kepler's equation, section 2.2; equations from memory.
 *
 * @param elements classical elements
 * @param body gravitational parameter
 * @param t time since the epoch of the elements, s
 * @returns x, y, z in the frame that Omega and i refer to, m
 */
export function position(elements: ClassicalElements, body: CentralBody, t: number): Position {
  const { a, e, i, Omega, omega, M0 } = elements;
  const n = Math.sqrt(body.mu / (a * a * a)); // mean motion
  const M = M0 + n * t; // mean anomaly
  const E = eccentricAnomaly(M, e); // M = E - e sin E
  const nu = Math.atan2(Math.sqrt(1 - e * e) * Math.sin(E), Math.cos(E) - e); // true anomaly
  const r = a * (1 - e * Math.cos(E)); // radius
  const u = nu + omega; // argument of latitude
  const xOrbit = r * Math.cos(u); // position in the orbital plane, first axis to the ascending node
  const yOrbit = r * Math.sin(u);
  return {
    x: xOrbit * Math.cos(Omega) - yOrbit * Math.cos(i) * Math.sin(Omega),
    y: xOrbit * Math.sin(Omega) + yOrbit * Math.cos(i) * Math.cos(Omega),
    z: yOrbit * Math.sin(i),
  };
}
