/**
 * E - sin E without cancellation: the Taylor series up to 1 rad, the plain difference above.
 *
 * @param E angle, rad, >= 0
 * @returns E - sin E, relative error a few times 2^-53
 */
export function sineDefect(E: number): number {
  if (E > 1) return E - Math.sin(E);
  const z = E * E;
  let sum = 1;
  for (let k = 10; k >= 2; k--) sum = 1 - (z / (2 * k * (2 * k + 1))) * sum;
  return ((E * z) / 6) * sum;
}
