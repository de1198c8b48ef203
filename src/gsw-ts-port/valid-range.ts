import { conservativeTemperature } from "./conservative-temperature.ts";
import { PA_PER_DBAR, STANDARD_ATMOSPHERE_PA } from "./constants.ts";
import { freezingTemperature } from "./freezing-temperature.ts";

/** degC; warmer water freezes at no salinity or pressure, which spares it the search for its freezing point. */
const NEVER_FREEZES_C = 0.1;

/** Sea pressure of a vacuum, dbar: a little below zero is barometer or altitude, below this it is an error. */
const VACUUM_DBAR = -STANDARD_ATMOSPHERE_PA / PA_PER_DBAR;

const freezingConservative = (SA: number, p: number): number =>
  conservativeTemperature(SA, freezingTemperature(SA, p), p);

/**
 * Whether a sample lies in the range to which the 75-term polynomial was fitted: a funnel that takes in rivers to
 * lagoons near the surface and narrows to ocean water with depth.
 *
 * @param SA absolute salinity, g/kg
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns false outside the range, and for NaN
 * @see McDougall, Jackett, Wright & Feistel 2003; Roquet et al. 2015
 */
export function isWithinRange(SA: number, CT: number, p: number): boolean {
  if (!(SA >= 0 && SA <= 42 && CT <= 40 && p >= VACUUM_DBAR && p <= 8000)) return false;
  if (CT < NEVER_FREEZES_C && CT < freezingConservative(SA, Math.min(p, 500))) return false;
  if (p < 500) return true;
  if (p > 6500) return SA >= 30 && CT <= 10;
  return SA >= (p - 500) / 200 && CT <= (9500 - p) / 300;
}
