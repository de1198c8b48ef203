import { CELSIUS_ZERO_K, CONSERVATIVE_HEAT_CAPACITY, SALINITY_UNIT, STANDARD_OCEAN_SALINITY } from "./constants.ts";
import { entropyPart, entropyPartAtSurface, entropySlopeAtSurface } from "./entropy.ts";
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
 * Potential temperature referred to the surface, by two steps of the modified Newton method of McDougall & Wotherspoon
 * (2014) from a polynomial start: converged to rounding in the whole oceanographic range, in a fixed number of operations.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns degC; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.1.3 (equal entropies)
 */
export function surfacePotentialTemperature(SA: number, t: number, p: number): number {
  const salinity = Math.max(SA, 0);
  const target = entropyPart(salinity, t, p);
  let pt0 = firstGuess(salinity, t, p);
  let slope =
    CONSERVATIVE_HEAT_CAPACITY / ((CELSIUS_ZERO_K + pt0) * (1 - 0.05 * (1 - salinity / STANDARD_OCEAN_SALINITY)));
  for (let step = 0; step < 2; step++) {
    const before = pt0;
    const excess = entropyPartAtSurface(salinity, before) - target;
    const halfway = 0.5 * (before - excess / slope + before);
    slope = entropySlopeAtSurface(salinity, halfway);
    pt0 = before - excess / slope;
  }
  return pt0;
}

/** Within 0.05 degC to 8000 dbar; how far it is off decides the last bits of the result. */
function firstGuess(SA: number, t: number, p: number): number {
  const s = SA / SALINITY_UNIT;
  return (
    t +
    p *
      (8.65483913395442e-6 -
        s * 1.41636299744881e-6 -
        p * 7.38286467135737e-9 +
        t * (-8.38241357039698e-6 + s * 2.83933368585534e-8 + t * 1.77803965218656e-8 + p * 1.71155619208233e-10))
  );
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
  if (referenceP === 0) return surfacePotentialTemperature(SA, t, p);
  const gibbs = fillGibbs(SA, newIsohaline());
  return adiabaticTemperature(fillIsobar(gibbs, p, newIsobar()), fillIsobar(gibbs, referenceP, newIsobar()), t);
}
