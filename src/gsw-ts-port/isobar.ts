/**
 * The Gibbs function of seawater along an isobar. At one salinity and one pressure the Gibbs function (water part plus
 * saline part, IAPWS SR7-09 and R13-08) is a polynomial of degree seven in temperature; entropy, enthalpy and heat
 * capacity are its slopes, and the isobars of its slopes with pressure give volume and compressibility.
 */
import { CELSIUS_ZERO_K, PA_PER_DBAR, SALINITY_SCALE } from "./constants.ts";
import { SALINE, SALINE_LOGARITHM } from "./gibbs-saline-coefficients.ts";
import { WATER } from "./gibbs-water-coefficients.ts";

/** Temperature that makes the polynomial's variable y = t / 40 degC equal to 1. */
export const TEMPERATURE_SCALE_C = 40;
const PRESSURE_SCALE_DBAR = 1e4;
export const PRESSURE_SCALE_PA = PRESSURE_SCALE_DBAR * PA_PER_DBAR;

/** 0 degC in units of the temperature scale: y + ABSOLUTE_ZERO_OFFSET is the absolute temperature. */
const ABSOLUTE_OFFSET = CELSIUS_ZERO_K / TEMPERATURE_SCALE_C;

/** Coefficients of y^0 to y^7, J/kg. */
export type Isobar = Float64Array;

export const newIsobar = (): Isobar => new Float64Array(WATER.length);

/** How often the Gibbs function was differentiated with respect to z before it was collapsed. */
export type PressureOrder = 0 | 1 | 2;

/** Factor that `order` differentiations put before z^k. */
const fallingPower = (k: number, order: PressureOrder): number => (order === 0 ? 1 : order === 1 ? k : k * (k - 1));

function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * x + coefficients[i]!;
  return sum;
}

/**
 * Collapses the Gibbs function, or its first or second slope with z = p / 10^4 dbar, to an isobar.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param p sea pressure, dbar
 * @param order number of differentiations with respect to z
 * @param out receives the coefficients
 */
export function fillIsobar(SA: number, p: number, order: PressureOrder, out: Isobar): Isobar {
  const x2 = Math.max(SA, 0) / SALINITY_SCALE;
  const x = Math.sqrt(x2);
  const z = p / PRESSURE_SCALE_DBAR;
  for (let j = 0; j < WATER.length; j++) {
    const water = WATER[j]!;
    const saline = SALINE[j];
    let sum = 0;
    for (let k = water.length - 1; k >= order; k--) {
      const salt = saline?.[k];
      const coefficient = water[k]! + (salt === undefined ? 0 : x2 * polynomial(salt, x));
      sum = sum * z + fallingPower(k, order) * coefficient;
    }
    out[j] = sum;
  }
  if (order === 0) {
    // x^2 ln(x) goes to 0 with x.
    const logarithm = x2 === 0 ? 0 : x2 * Math.log(x);
    for (let j = 0; j < SALINE_LOGARITHM.length; j++) out[j]! += SALINE_LOGARITHM[j]! * logarithm;
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
