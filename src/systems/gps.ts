import type { EarthConstants } from './constants.ts';

/** Constants of the GPS user algorithm. Source: IS-GPS-200, 20.3.3.4.3 (Table 20-IV) and 20.3.3.3.3.1. */
export const GPS: EarthConstants = {
  mu: 3.986005e14,
  OmegaEDot: 7.2921151467e-5,
  F: -4.442807633e-10,
};

/** The value of pi that GPS fixes for turning semicircles into radians. Source: IS-GPS-200, 20.3.3.4.3. */
export const GPS_PI = 3.1415926535898;

/** Speed of light in vacuum, m/s. Source: IS-GPS-200, 20.3.4.3. */
export const SPEED_OF_LIGHT = 299792458;
