import { fillGibbs, newIsohaline } from "./gibbs-saline.ts";
import { fillIsobar, type Isobar, newIsobar, TEMPERATURE_SCALE_C } from "./isobar.ts";
import { newton } from "./newton.ts";
import { curvatureAt, slopeAt } from "./polynomial.ts";

/** In units of 40 degC: leaves an error below 1e-13 degC, also in the enthalpy of water brought to a temperature. */
export const LAST_TEMPERATURE_STEP = 1e-7;

/**
 * Temperature that water of temperature t on one isobar takes on another without exchange of heat or salt.
 *
 * @param from isobar of the Gibbs function on which the water is
 * @param to isobar of the Gibbs function to which it is brought, at the same salinity
 * @param t temperature on `from`, degC
 * @returns temperature on `to`, degC
 */
export function adiabaticTemperature(from: Isobar, to: Isobar, t: number): number {
  const start = t / TEMPERATURE_SCALE_C;
  const target = slopeAt(from, start);
  const step = (y: number): number => (slopeAt(to, y) - target) / curvatureAt(to, y);
  return TEMPERATURE_SCALE_C * newton(start, LAST_TEMPERATURE_STEP, step);
}

/**
 * Potential temperature: the temperature of water brought adiabatically to a reference pressure.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @param referenceP reference sea pressure, dbar; the surface unless given
 * @returns degC, converged to 1e-13; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.1.3 (equal entropies)
 * @example potentialTemperature(35, 20, 1000) // 19.812437088
 */
export function potentialTemperature(SA: number, t: number, p: number, referenceP = 0): number {
  const gibbs = fillGibbs(SA, newIsohaline());
  return adiabaticTemperature(fillIsobar(gibbs, p, newIsobar()), fillIsobar(gibbs, referenceP, newIsobar()), t);
}
