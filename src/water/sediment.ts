/** Density of quartz, kg/m3: the usual value for mineral grains. */
const QUARTZ_KGM3 = 2650;

/**
 * Density of water that carries suspended grains, kg/m3; grains that rest on the bed add nothing. NaN in, NaN out.
 * Source: the law of mixtures (van Rijn 1993).
 * @param rhoKgM3 density of the water alone
 * @param concentrationKgM3 dry mass of grains per volume of the mixture
 * @param grainRhoKgM3 density of a grain, or the effective density of a floc (1300 to 1600)
 */
export const sedimentLadenDensity = (rhoKgM3: number, concentrationKgM3: number, grainRhoKgM3 = QUARTZ_KGM3): number =>
  rhoKgM3 + concentrationKgM3 * (1 - rhoKgM3 / grainRhoKgM3);
