import { fillGibbs, newIsohaline } from "./gibbs-saline.ts";
import { curvatureAt, fillIsobar, type Isobar, newIsobar, slopeAt, TEMPERATURE_SCALE_C } from "./isobar.ts";

/** Newton doubles its digits: a step below this, in units of 40 degC, leaves an error below 1e-13 degC. */
const LAST_STEP = 1e-7;
const MOST_STEPS = 8;

/**
 * Temperature that water of temperature t on one isobar takes on another without exchange of heat or salt.
 *
 * @param from isobar of the Gibbs function on which the water is
 * @param to isobar of the Gibbs function to which it is brought, at the same salinity
 * @param t temperature on `from`, degC
 * @returns temperature on `to`, degC
 */
export function adiabaticTemperature(from: Isobar, to: Isobar, t: number): number {
  let y = t / TEMPERATURE_SCALE_C;
  const target = slopeAt(from, y);
  for (let count = 0; count < MOST_STEPS; count++) {
    const step = (slopeAt(to, y) - target) / curvatureAt(to, y);
    y -= step;
    if (!(Math.abs(step) > LAST_STEP)) break;
  }
  return TEMPERATURE_SCALE_C * y;
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
  return adiabaticTemperature(fillIsobar(gibbs, p, 0, newIsobar()), fillIsobar(gibbs, referenceP, 0, newIsobar()), t);
}
