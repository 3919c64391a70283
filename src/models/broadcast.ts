import { eccentricAnomaly } from '../kepler/eccentric-anomaly.ts';
import type { EarthConstants } from '../systems/constants.ts';
import type { Position } from './position.ts';

/**
 * Quasi-Keplerian elements of a broadcast ephemeris, in SI units and radians.
 * Source: IS-GPS-200, Table 20-II (definitions) and Table 20-III (units on the air).
 */
export interface BroadcastElements {
  /** Square root of the semi-major axis, m^(1/2). */
  readonly sqrtA: number;
  /** Eccentricity, 0 <= e < 1. */
  readonly e: number;
  /** Inclination at the reference time, rad. */
  readonly i0: number;
  /** Longitude of the ascending node at the weekly epoch, rad. */
  readonly Omega0: number;
  /** Argument of perigee, rad. */
  readonly omega: number;
  /** Mean anomaly at the reference time, rad. */
  readonly M0: number;
  /** Correction to the computed mean motion, rad/s. */
  readonly deltaN: number;
  /** Rate of the inclination, rad/s. */
  readonly IDOT: number;
  /** Rate of the right ascension, rad/s. */
  readonly OmegaDot: number;
  /** Cosine harmonic correction to the argument of latitude, rad. */
  readonly Cuc: number;
  /** Sine harmonic correction to the argument of latitude, rad. */
  readonly Cus: number;
  /** Cosine harmonic correction to the orbit radius, m. */
  readonly Crc: number;
  /** Sine harmonic correction to the orbit radius, m. */
  readonly Crs: number;
  /** Cosine harmonic correction to the inclination, rad. */
  readonly Cic: number;
  /** Sine harmonic correction to the inclination, rad. */
  readonly Cis: number;
  /** Reference time of the ephemeris, seconds of the system's week. */
  readonly toe: number;
}

/** Clock parameters of a broadcast ephemeris. Source: IS-GPS-200, Table 20-I. */
export interface ClockParameters {
  /** Clock bias at the clock reference time, s. */
  readonly af0: number;
  /** Clock drift, s/s. */
  readonly af1: number;
  /** Clock drift rate, s/s^2. */
  readonly af2: number;
  /** Group delay differential, s. */
  readonly TGD: number;
  /** Reference time of the ephemeris minus that of the clock, toe - toc, s, wrapped to half a week. */
  readonly toeMinusToc: number;
}

/**
 * Position of the satellite's antenna phase centre in the Earth-fixed frame of the system at time t.
 * Source: IS-GPS-200, Table 20-IV (the user algorithm), line by line.
 *
 * @param elements broadcast elements
 * @param earth constants of the system
 * @param t time since the reference epoch, tk = t - toe, s, wrapped to half a week
 * @returns x, y, z, m
 */
export function position(elements: BroadcastElements, earth: EarthConstants, t: number): Position {
  const { e, i0, Omega0, omega, IDOT, OmegaDot, Cuc, Cus, Crc, Crs, Cic, Cis, toe } = elements;
  const A = elements.sqrtA * elements.sqrtA; // semi-major axis
  const M = meanAnomaly(elements, earth, t);
  const E = eccentricAnomaly(M, e); // M = E - e sin E
  const nu = Math.atan2(Math.sqrt(1 - e * e) * Math.sin(E), Math.cos(E) - e); // true anomaly
  const phi = nu + omega; // argument of latitude
  const sin2phi = Math.sin(2 * phi);
  const cos2phi = Math.cos(2 * phi);
  const u = phi + (Cus * sin2phi + Cuc * cos2phi); // corrected argument of latitude
  const r = A * (1 - e * Math.cos(E)) + (Crs * sin2phi + Crc * cos2phi); // corrected radius
  const i = i0 + IDOT * t + (Cis * sin2phi + Cic * cos2phi); // corrected inclination
  const xOrbit = r * Math.cos(u); // position in the orbital plane
  const yOrbit = r * Math.sin(u);
  const Omega = Omega0 + (OmegaDot - earth.OmegaEDot) * t - earth.OmegaEDot * toe; // corrected longitude of the node
  return {
    x: xOrbit * Math.cos(Omega) - yOrbit * Math.cos(i) * Math.sin(Omega),
    y: xOrbit * Math.sin(Omega) + yOrbit * Math.cos(i) * Math.cos(Omega),
    z: yOrbit * Math.sin(i),
  };
}

/**
 * Offset of the satellite's clock from system time for a single-frequency user of the first signal:
 * polynomial, relativistic term and group delay. Source: IS-GPS-200, 20.3.3.3.3.1 and 20.3.3.3.3.2.
 *
 * @param elements broadcast elements and clock parameters
 * @param earth constants of the system
 * @param t time since the reference epoch of the ephemeris, s
 * @returns offset, s; system time = satellite time - offset
 */
export function clock(
  elements: BroadcastElements & ClockParameters,
  earth: EarthConstants,
  t: number,
): number {
  const { af0, af1, af2, TGD, toeMinusToc } = elements;
  const dt = t + toeMinusToc; // t - toc
  const polynomial = af0 + af1 * dt + af2 * (dt * dt);
  return polynomial + relativisticTerm(elements, earth, t) - TGD;
}

/**
 * Relativistic correction of the clock, F e sqrt(A) sin E. Source: IS-GPS-200, 20.3.3.3.3.1.
 *
 * @returns correction, s
 */
export function relativisticTerm(elements: BroadcastElements, earth: EarthConstants, t: number): number {
  const E = eccentricAnomaly(meanAnomaly(elements, earth, t), elements.e);
  return earth.F * elements.e * elements.sqrtA * Math.sin(E);
}

/**
 * Mean anomaly at time t. Source: IS-GPS-200, Table 20-IV.
 *
 * @returns mean anomaly, rad, not reduced to one turn
 */
function meanAnomaly(elements: BroadcastElements, earth: EarthConstants, t: number): number {
  const A = elements.sqrtA * elements.sqrtA;
  const n0 = Math.sqrt(earth.mu / (A * A * A)); // computed mean motion
  const n = n0 + elements.deltaN; // corrected mean motion
  return elements.M0 + n * t;
}
