/**
 * Properties of seawater straight from its Gibbs function, in in-situ temperature: the truth that the 75-term polynomial
 * fits. Valid from the freezing point to 40 degC, SA 0 to 42 g/kg, to 10^4 dbar.
 */
import { fillGibbs, newIsohaline } from "./gibbs-saline.ts";
import { fillIsobar, newIsobar, PRESSURE_SCALE_PA, TEMPERATURE_SCALE_C } from "./isobar.ts";
import { curvatureAt, slopeAt, valueAt } from "./polynomial.ts";

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
  PRESSURE_SCALE_PA /
  valueAt(fillIsobar(fillGibbs(SA, newIsohaline()), p, newIsobar(), slopeAt), t / TEMPERATURE_SCALE_C);

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
  const gyy = curvatureAt(fillIsobar(gibbs, p, scratch), y);
  fillIsobar(gibbs, p, scratch, slopeAt);
  const gz = valueAt(scratch, y);
  const gyz = slopeAt(scratch, y);
  const gzz = valueAt(fillIsobar(gibbs, p, scratch, curvatureAt), y);
  // The scales of y and of z cancel.
  return gz * Math.sqrt(gyy / (gyz * gyz - gyy * gzz));
}
