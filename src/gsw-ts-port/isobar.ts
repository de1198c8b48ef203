/**
 * The Gibbs function of seawater along an isobar. At one salinity and one pressure it is a polynomial of degree seven in
 * temperature; entropy, enthalpy and heat capacity are its slopes, and the isobars of its slopes with pressure give
 * volume and compressibility.
 */
import { CELSIUS_ZERO_K, PA_PER_DBAR } from "./constants.ts";
import type { Isohaline } from "./gibbs-saline.ts";
import { HIGHEST_PRESSURE_POWER, HIGHEST_TEMPERATURE_POWER } from "./gibbs-water.ts";

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

/** How often the Gibbs function is differentiated with respect to z before it is collapsed. */
export type PressureOrder = 0 | 1 | 2;

/** Factor that `order` differentiations put before z^k. */
const fallingPower = (k: number, order: PressureOrder): number => (order === 0 ? 1 : order === 1 ? k : k * (k - 1));

/**
 * Collapses an isohaline, or its first or second slope with z = p / 10^4 dbar, to an isobar.
 *
 * @param m the Gibbs function at one salinity
 * @param p sea pressure, dbar
 * @param order number of differentiations with respect to z
 * @param out receives the coefficients
 */
export function fillIsobar(m: Isohaline, p: number, order: PressureOrder, out: Isobar): Isobar {
  const z = p / PRESSURE_SCALE_DBAR;
  for (let j = 0; j <= HIGHEST_TEMPERATURE_POWER; j++) {
    let sum = 0;
    // At the surface only the lowest power is left.
    for (let k = z === 0 ? order : HIGHEST_PRESSURE_POWER[j]!; k >= order; k--) {
      sum = sum * z + fallingPower(k, order) * m[10 * j + k]!;
    }
    out[j] = sum;
  }
  return out;
}

/** Value of an isobar at y. */
export function valueAt(a: Isobar, y: number): number {
  return a[0]! + y * (a[1]! + y * (a[2]! + y * (a[3]! + y * (a[4]! + y * (a[5]! + y * (a[6]! + y * a[7]!))))));
}

/** First slope with y; along an isobar of the Gibbs function, minus the specific entropy times 40 degC. */
export function slopeAt(a: Isobar, y: number): number {
  return (
    a[1]! + y * (2 * a[2]! + y * (3 * a[3]! + y * (4 * a[4]! + y * (5 * a[5]! + y * (6 * a[6]! + y * (7 * a[7]!))))))
  );
}

/** Second slope with y. */
export function curvatureAt(a: Isobar, y: number): number {
  return 2 * a[2]! + y * (6 * a[3]! + y * (12 * a[4]! + y * (20 * a[5]! + y * (30 * a[6]! + y * (42 * a[7]!)))));
}

/** Specific enthalpy g - T dg/dT (J/kg) along an isobar of the Gibbs function. */
export const enthalpyAt = (a: Isobar, y: number): number => valueAt(a, y) - (ABSOLUTE_OFFSET + y) * slopeAt(a, y);

/** Slope of enthalpy with y: the heat capacity at constant pressure times 40 degC. */
export const enthalpySlopeAt = (a: Isobar, y: number): number => -(ABSOLUTE_OFFSET + y) * curvatureAt(a, y);
