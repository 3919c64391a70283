/**
 * One correction of D = E - M for f(D) = D - e sin(M + D), from the sine and cosine of the mean anomaly.
 * In the numeric subset: they are read like a model.
 */

/**
 * Newton's step, D - f / f'. Source: Vallado, Fundamentals of Astrodynamics and Applications, algorithm 2.
 *
 * @param D guess of E - M, rad
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity, 0 <= e < 1
 * @returns better guess of E - M, rad
 */
export function newton(D: number, sinM: number, cosM: number, e: number): number {
  const eSinM = e * sinM;
  const eCosM = e * cosM;
  const sinD = Math.sin(D);
  const cosD = Math.cos(D);
  const f = D - (eSinM * cosD + eCosM * sinD); // D - e sin E
  const slope = 1 - (eCosM * cosD - eSinM * sinD); // 1 - e cos E
  return D - f / slope;
}

/**
 * Halley's step, D - f / (f' - f f'' / (2 f')); error of the order of the third power. Source: Danby and Burkardt, The
 * Solution of Kepler's Equation I, Celestial Mechanics 31 (1983) (from memory).
 *
 * @param D guess of E - M, rad
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity, 0 <= e < 1
 * @returns better guess of E - M, rad
 */
export function halley(D: number, sinM: number, cosM: number, e: number): number {
  const eSinM = e * sinM;
  const eCosM = e * cosM;
  const sinD = Math.sin(D);
  const cosD = Math.cos(D);
  const bend = eSinM * cosD + eCosM * sinD; // e sin E
  const slope = 1 - (eCosM * cosD - eSinM * sinD); // 1 - e cos E
  const f = D - bend;
  return D - (f * slope) / (slope * slope - 0.5 * f * bend);
}

/**
 * The fourth-order step of Danby and Burkardt: Halley's step y, then D - f / (f' - y f'' / 2 + y^2 f''' / 6).
 * Source: Danby and Burkardt, The Solution of Kepler's Equation I, Celestial Mechanics 31 (1983) (from memory).
 *
 * @param D guess of E - M, rad
 * @param sinM sine of the mean anomaly
 * @param cosM cosine of the mean anomaly
 * @param e eccentricity, 0 <= e < 1
 * @returns better guess of E - M, rad
 */
export function quartic(D: number, sinM: number, cosM: number, e: number): number {
  const eSinM = e * sinM;
  const eCosM = e * cosM;
  const sinD = Math.sin(D);
  const cosD = Math.cos(D);
  const bend = eSinM * cosD + eCosM * sinD; // e sin E
  const turn = eCosM * cosD - eSinM * sinD; // e cos E
  const slope = 1 - turn; // 1 - e cos E
  const f = D - bend;
  const y = (f * slope) / (slope * slope - 0.5 * f * bend);
  return D - f / (slope - 0.5 * y * (bend - (y * turn) / 3));
}
