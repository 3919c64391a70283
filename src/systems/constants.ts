/** Physical constants of a navigation system's user algorithm. */
export interface EarthConstants {
  /** Gravitational parameter of the Earth, m^3/s^2. */
  readonly mu: number;
  /** Rotation rate of the Earth, rad/s. */
  readonly OmegaEDot: number;
  /** Relativistic clock constant F = -2 sqrt(mu) / c^2, s/m^(1/2). */
  readonly F: number;
}
