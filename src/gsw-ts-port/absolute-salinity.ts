import { SALINITY_UNIT } from "./constants.ts";

/** Salinity that Baltic rivers carry beyond the reference composition, g/kg at SP 0 (Feistel et al. 2010). */
const BALTIC_RIVER_EXCESS = 0.087;

/**
 * Absolute salinity of water with the composition of standard seawater, however diluted.
 * The open-ocean composition anomaly (below 0.001 g/kg near most coasts) is left out on purpose.
 *
 * @param SP practical salinity, dimensionless
 * @returns absolute salinity, g/kg; NaN in, NaN out
 * @see Millero, Feistel, Wright & McDougall 2008; IOC, SCOR & IAPSO 2010, eq. 2.4.1
 * @example referenceSalinity(35) // 35.16504
 */
export const referenceSalinity = (SP: number): number => SALINITY_UNIT * SP;

/**
 * Practical salinity of reference-composition water: the inverse of referenceSalinity.
 *
 * @param SA absolute salinity, g/kg
 * @returns practical salinity, dimensionless; NaN in, NaN out
 */
export const practicalSalinityFromReference = (SA: number): number => SA / SALINITY_UNIT;

/**
 * Absolute salinity in the Baltic Sea, where river water brings extra calcium carbonate.
 *
 * @param SP practical salinity, dimensionless
 * @returns absolute salinity, g/kg; NaN in, NaN out
 * @see Feistel et al. 2010, Ocean Science 6, 3-24: the excess of 2006-2009, fading linearly to none at SP 35
 * @example balticSalinity(7.5) // 7.603722857
 */
export const balticSalinity = (SP: number): number => referenceSalinity(SP) + BALTIC_RIVER_EXCESS * (1 - SP / 35);

/** Absolute salinity (g/kg) of n samples of practical salinity; `out` may be the input. */
export function referenceSalinityInto(SP: Float64Array, out: Float64Array): Float64Array {
  for (let i = 0; i < out.length; i++) out[i] = referenceSalinity(SP[i]!);
  return out;
}
