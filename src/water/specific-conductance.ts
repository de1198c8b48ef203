import { practicalSalinityFromConductivity } from "../gsw-ts-port/index.ts";

/**
 * Practical salinity from specific conductance, which is by definition the conductivity the water has at 25 degC:
 * PSS-78 at 25 degC and zero sea pressure, with its low-salinity branch. NaN in, NaN out.
 * @param specificConductanceMsCm compensated to 25 degC, mS/cm
 */
export const practicalSalinityFromSpecificConductance = (specificConductanceMsCm: number): number =>
  practicalSalinityFromConductivity(specificConductanceMsCm, 25, 0);
