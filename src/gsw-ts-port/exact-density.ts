/** Properties of seawater straight from its Gibbs function, in in-situ temperature: the truth that the 75-term polynomial fits. */
import { fillGibbs, newIsohaline } from "./gibbs-saline.ts";
import {
  curvatureAt,
  fillIsobar,
  newIsobar,
  PRESSURE_SCALE_PA,
  slopeAt,
  TEMPERATURE_SCALE_C,
  valueAt,
} from "./isobar.ts";

/**
 * In-situ density from the Gibbs function.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns density, kg/m3; NaN in, NaN out
 * @see IAPWS R13-08 and SR7-09: 1 / (dg/dp)
 * @example exactDensity(0, 20, 0) // 998.2071458
 */
export const exactDensity = (SA: number, t: number, p: number): number =>
  PRESSURE_SCALE_PA / valueAt(fillIsobar(fillGibbs(SA, newIsohaline()), p, 1, newIsobar()), t / TEMPERATURE_SCALE_C);

/**
 * Speed of sound from the Gibbs function.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns m/s; NaN in, NaN out
 * @see IAPWS R13-08, table 3: g_p sqrt(g_TT / (g_Tp^2 - g_TT g_pp))
 */
export function exactSoundSpeed(SA: number, t: number, p: number): number {
  const y = t / TEMPERATURE_SCALE_C;
  const gibbs = fillGibbs(SA, newIsohaline());
  const scratch = newIsobar();
  const gyy = curvatureAt(fillIsobar(gibbs, p, 0, scratch), y);
  fillIsobar(gibbs, p, 1, scratch);
  const gz = valueAt(scratch, y);
  const gyz = slopeAt(scratch, y);
  const gzz = valueAt(fillIsobar(gibbs, p, 2, scratch), y);
  // The scales of y cancel; z carries none beyond those of J/kg, so the root is in m/s.
  return gz * Math.sqrt(gyy / (gyz * gyz - gyy * gzz));
}
