import { CELSIUS_ZERO_K, PA_PER_DBAR } from "./constants.ts";
import { fillWaterPotential, newIsohaline } from "./gibbs-saline.ts";
import { iceGibbs } from "./ice.ts";
import { fillIsobar, newIsobar, TEMPERATURE_SCALE_C } from "./isobar.ts";
import { newton } from "./newton.ts";
import { slopeAt, valueAt } from "./polynomial.ts";

/** degC; leaves an error below 1e-11 degC. */
const LAST_STEP = 1e-5;

/**
 * Temperature at which seawater free of dissolved air is in equilibrium with ice.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param p sea pressure, dbar
 * @returns in-situ freezing temperature, degC (ITS-90); NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.33.1: the chemical potential of water in seawater equals that of ice
 * @example freezingTemperature(35.16504, 0) // -1.9186
 */
export function freezingTemperature(SA: number, p: number): number {
  const potential = fillIsobar(fillWaterPotential(SA, newIsohaline()), p, newIsobar());
  // A start within a degree of the answer over the whole range.
  const start = -0.055 * Math.max(SA, 0) - 7.5e-4 * p;
  return newton(start, LAST_STEP, (t) => {
    const ice = iceGibbs(CELSIUS_ZERO_K + t, PA_PER_DBAR * p);
    const y = t / TEMPERATURE_SCALE_C;
    return (valueAt(potential, y) - ice.g) / (slopeAt(potential, y) / TEMPERATURE_SCALE_C - ice.perKelvin);
  });
}
