/**
 * The Gibbs function of seawater along an isobar. At one salinity and one pressure it is a polynomial of degree seven in
 * temperature; entropy, enthalpy and heat capacity are its slopes, and the isobars of its derivatives with pressure give
 * volume and compressibility.
 */
import { CELSIUS_ZERO_K, PA_PER_DBAR } from "./constants.ts";
import type { Isohaline } from "./gibbs-saline.ts";
import { curvatureAt, slopeAt, valueAt } from "./polynomial.ts";

/** Temperature at which the polynomial's variable y = t / 40 degC is 1. */
export const TEMPERATURE_SCALE_C = 40;
const PRESSURE_SCALE_DBAR = 1e4;
/** Pressure at which z is 1. */
export const PRESSURE_SCALE_PA = PRESSURE_SCALE_DBAR * PA_PER_DBAR;

/** y plus this is the absolute temperature in units of the temperature scale. */
const ABSOLUTE_OFFSET = CELSIUS_ZERO_K / TEMPERATURE_SCALE_C;

/** Coefficients of y^0 to y^7, J/kg; a plain array for the same reason as an isohaline. */
export type Isobar = number[];

export const newIsobar = (): Isobar => [0, 0, 0, 0, 0, 0, 0, 0];

/**
 * Collapses an isohaline at one pressure.
 *
 * @param m the Gibbs function at one salinity
 * @param p sea pressure, dbar
 * @param out receives the coefficients
 * @param take what to take of the polynomial in z = p / 10^4 dbar: its value, or, for the isobar of a derivative with
 *   pressure, its slope or curvature
 */
export function fillIsobar(m: Isohaline, p: number, out: Isobar, take: typeof valueAt = valueAt): Isobar {
  const z = p / PRESSURE_SCALE_DBAR;
  for (let j = 0; j < out.length; j++) out[j] = take(m, z, 10 * j);
  return out;
}

/** Specific enthalpy g - T dg/dT (J/kg) along an isobar of the Gibbs function. */
export const enthalpyAt = (a: Isobar, y: number): number => valueAt(a, y) - (ABSOLUTE_OFFSET + y) * slopeAt(a, y);

/** Slope of enthalpy with y: the heat capacity at constant pressure times 40 degC. */
export const enthalpySlopeAt = (a: Isobar, y: number): number => -(ABSOLUTE_OFFSET + y) * curvatureAt(a, y);
