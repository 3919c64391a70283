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
