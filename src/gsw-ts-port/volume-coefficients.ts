/** The material coefficients that follow from the slopes of specific volume. */
import { specificVolume, specificVolumePressureSlope, specificVolumeSlopes } from "./specific-volume.ts";

/**
 * Thermal expansion coefficient with respect to conservative temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns 1/K, negative in cold fresh water; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 2.18.3
 * @example thermalExpansion(30, 10, 1000) // 1.748435535e-4
 */
export function thermalExpansion(SA: number, CT: number, p: number): number {
  const { v, perTemperature } = specificVolumeSlopes(SA, CT, p);
  return perTemperature / v;
}

/**
 * Haline contraction coefficient at constant conservative temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns kg/g, that is per g/kg of absolute salinity; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 2.19.3
 * @example halineContraction(30, 10, 1000) // 7.451196678e-4
 */
export function halineContraction(SA: number, CT: number, p: number): number {
  const { v, perSalinity } = specificVolumeSlopes(SA, CT, p);
  return -perSalinity / v;
}

/**
 * Isentropic compressibility.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns 1/Pa; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 2.16.1
 */
export const compressibility = (SA: number, CT: number, p: number): number =>
  -specificVolumePressureSlope(SA, CT, p) / specificVolume(SA, CT, p);

/**
 * Speed of sound.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns m/s; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 2.17.1
 */
export const soundSpeed = (SA: number, CT: number, p: number): number =>
  specificVolume(SA, CT, p) / Math.sqrt(-specificVolumePressureSlope(SA, CT, p));
