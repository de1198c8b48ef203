import { specificVolume } from "./specific-volume.ts";

/**
 * In-situ density.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns density, kg/m3; NaN in, NaN out
 * @see Roquet et al. 2015: within about 4e-4 kg/m3 (rms) of the Gibbs function over the oceanographic range
 * @example density(34.7118, 28.8099, 10) // 1021.839935738
 */
export const density = (SA: number, CT: number, p: number): number => 1 / specificVolume(SA, CT, p);

/**
 * Potential density anomaly referred to the sea surface (sigma0): density at sea pressure 0, less 1000 kg/m3.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @returns kg/m3; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, sec. 3.6
 */
export const potentialDensityAnomaly = (SA: number, CT: number): number => density(SA, CT, 0) - 1000;

/** In-situ density (kg/m3) of n samples of SA (g/kg), CT (degC) and p (dbar); `out` may be one of the inputs. */
export function densityInto(SA: Float64Array, CT: Float64Array, p: Float64Array, out: Float64Array): Float64Array {
  for (let i = 0; i < out.length; i++) out[i] = density(SA[i]!, CT[i]!, p[i]!);
  return out;
}
