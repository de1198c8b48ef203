import { standardOceanHeight } from "./standard-ocean.ts";
import { GRAVITY_DEPTH_RATE, surfaceGravity } from "./surface-gravity.ts";

/**
 * Gravity at a depth below the water surface.
 *
 * @param lat latitude, degrees north
 * @param depthM depth, m, positive down from the surface
 * @returns gravity, m/s2; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. D.3
 */
export const gravityAtDepth = (lat: number, depthM: number): number =>
  surfaceGravity(lat) * (1 + GRAVITY_DEPTH_RATE * depthM);

/**
 * Gravity in the standard ocean at a sea pressure.
 *
 * @param lat latitude, degrees north
 * @param p sea pressure, dbar
 * @returns gravity, m/s2; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. D.3
 * @example gravity(45, 100) // 9.806419645
 */
export const gravity = (lat: number, p: number): number => gravityAtDepth(lat, -standardOceanHeight(p, lat));
