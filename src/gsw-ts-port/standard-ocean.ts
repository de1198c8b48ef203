import { PA_PER_DBAR, STANDARD_OCEAN_SALINITY } from "./constants.ts";
import { newton } from "./newton.ts";
import { dynamicEnthalpy, specificVolume } from "./specific-volume.ts";
import { GRAVITY_DEPTH_RATE, surfaceGravity } from "./surface-gravity.ts";

/** Leaves an error below rounding: enthalpy is nearly straight in pressure. */
const LAST_STEP_DBAR = 1e-4;

/**
 * Height in the standard ocean (SA 35.16504 g/kg, CT 0 degC) of a sea pressure: what most probes print as depth.
 * Gravity work down to z equals the enthalpy of the water: g0 (z - rate z^2 / 2) = -h(p).
 *
 * @param p sea pressure, dbar
 * @param lat latitude, degrees north
 * @returns height, m, positive up from the sea surface (so negative in water); NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.32.3
 * @example standardOceanHeight(100, 45) // -99.16434939
 */
export function standardOceanHeight(p: number, lat: number): number {
  const g0 = surfaceGravity(lat);
  const h = dynamicEnthalpy(STANDARD_OCEAN_SALINITY, 0, p);
  // The root in the form that does not cancel near the surface.
  return (-2 * h) / (g0 + Math.sqrt(g0 * (g0 + 2 * GRAVITY_DEPTH_RATE * h)));
}

/**
 * Sea pressure in the standard ocean at a height: the inverse of standardOceanHeight.
 *
 * @param z height, m, positive up from the sea surface (negative in water)
 * @param lat latitude, degrees north
 * @returns sea pressure, dbar; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.32.3
 * @example standardOceanPressure(-100, 45) // 100.8428986
 */
export function standardOceanPressure(z: number, lat: number): number {
  const target = -surfaceGravity(lat) * z * (1 - 0.5 * GRAVITY_DEPTH_RATE * z);
  return newton(-z, LAST_STEP_DBAR, (p) => {
    const excess = dynamicEnthalpy(STANDARD_OCEAN_SALINITY, 0, p) - target;
    return excess / (PA_PER_DBAR * specificVolume(STANDARD_OCEAN_SALINITY, 0, p));
  });
}
