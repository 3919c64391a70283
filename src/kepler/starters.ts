/**
 * First guesses of D = E - M for Kepler's equation in the form D = e sin(M + D), from the sine and cosine of
 * the mean anomaly. In the numeric subset: they are read like a model.
 */

/**
 * E - M to first order in the eccentricity, e sin M; error of order e^2.
 * Source: Lagrange's expansion of Kepler's equation, e.g. Murray and Dermott, Solar System Dynamics, section 2.5
 * (from memory).
 *
 * @param sinM sine of the mean anomaly
 * @param _cosM cosine of the mean anomaly
 * @param e eccentricity; useful up to about 0.05
 * @returns first guess of E - M, rad
 */
export function firstOrder(sinM: number, _cosM: number, e: number): number {
  return e * sinM;
}

/**
 * E - M to second order in the eccentricity, e sin M (1 + e cos M); error of order e^3.
 * Source: Lagrange's expansion of Kepler's equation, e.g. Murray and Dermott, Solar System Dynamics, section 2.5
 * (from memory).
 *
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity; useful up to about 0.1
 * @returns first guess of E - M, rad
 */
export function secondOrder(sinM: number, cosM: number, e: number): number {
  const eSinM = e * sinM;
  return eSinM + eSinM * (e * cosM);
}

/**
 * E - M to third order in the eccentricity, e sin M (1 + e cos M + e^2 (1 - 3/2 sin^2 M)); error of order e^4.
 * Source: Lagrange's expansion of Kepler's equation, e.g. Murray and Dermott, Solar System Dynamics, section 2.5
 * (from memory).
 *
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity; useful up to about 0.2
 * @returns first guess of E - M, rad
 */
export function thirdOrder(sinM: number, cosM: number, e: number): number {
  const eSinM = e * sinM;
  return eSinM + eSinM * (e * cosM + (e * e - 1.5 * (eSinM * eSinM)));
}

/**
 * E - M as 0.85 e on the upper half turn and its mirror image on the lower. Source: Danby, Fundamentals of Celestial
 * Mechanics, section 6.6 (from memory).
 *
 * @param sinM sine of the mean anomaly
 * @param _cosM cosine of the mean anomaly
 * @param e eccentricity, 0 <= e < 1
 * @returns first guess of E - M, rad
 */
export function danby(sinM: number, _cosM: number, e: number): number {
  return sinM < 0 ? -0.85 * e : 0.85 * e;
}

/**
 * E - M by one secant step between M and M + e, e sin M / (1 - sin(M + e) + sin M) on the upper half turn and its
 * mirror image on the lower. Source: Prussing and Conway, Orbital Mechanics, section 2.4 (from memory).
 *
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity, 0 <= e < 1
 * @returns first guess of E - M, rad
 */
export function secant(sinM: number, cosM: number, e: number): number {
  const s = Math.abs(sinM);
  const sinSum = s * Math.cos(e) + cosM * Math.sin(e); // sin(|M| + e)
  return (e * sinM) / (1 - sinSum + s);
}
