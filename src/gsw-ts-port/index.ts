export {
  balticSalinity,
  practicalSalinityFromReference,
  referenceSalinity,
  referenceSalinityInto,
} from "./absolute-salinity.ts";
export {
  conservativeTemperature,
  conservativeTemperatureFromPotential,
  conservativeTemperatureInto,
  inSituTemperature,
  inSituTemperatureInto,
  potentialTemperatureFromConservative,
} from "./conservative-temperature.ts";
export * from "./constants.ts";
export { density, densityInto, potentialDensityAnomaly } from "./density.ts";
export { exactDensity, exactSoundSpeed } from "./exact-density.ts";
export { freezingTemperature } from "./freezing-temperature.ts";
export { gravity, gravityAtDepth } from "./gravity.ts";
export { potentialTemperature } from "./potential-temperature.ts";
export {
  conductivityFromPracticalSalinity,
  practicalSalinityFromConductivity,
  practicalSalinityFromConductivityInto,
  practicalSalinityFromRatio,
  practicalSalinityFromSurfaceRatio,
} from "./practical-salinity.ts";
export { dynamicEnthalpy, type SpecificVolumeSlopes, specificVolume, specificVolumeSlopes } from "./specific-volume.ts";
export { standardOceanHeight, standardOceanPressure } from "./standard-ocean.ts";
export { GRAVITY_DEPTH_RATE, surfaceGravity } from "./surface-gravity.ts";
export { isWithinRange } from "./valid-range.ts";
export { compressibility, halineContraction, soundSpeed, thermalExpansion } from "./volume-coefficients.ts";
