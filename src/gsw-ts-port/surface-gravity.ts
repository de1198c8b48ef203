/** Relative growth of gravity with depth inside the ocean, 1/m. IOC, SCOR & IAPSO 2010, eq. D.3. */
export const GRAVITY_DEPTH_RATE = 2.26e-7;

/**
 * Gravity at the sea surface, from the Geodetic Reference System 1980.
 *
 * @param lat latitude, degrees north
 * @returns gravity, m/s2; NaN in, NaN out
 * @see Moritz 2000; IOC, SCOR & IAPSO 2010, eq. D.3
 * @example surfaceGravity(45) // 9.806199877
 */
export function surfaceGravity(lat: number): number {
  const sine = Math.sin((lat * Math.PI) / 180);
  const s = sine * sine;
  return 9.780327 * (1 + (5.2792e-3 + 2.32e-5 * s) * s);
}
