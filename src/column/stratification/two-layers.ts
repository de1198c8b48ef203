import type { LinearProfile } from "./linear-profile.ts";
import type { LayerDensities, TwoLayers, TwoLayerWaves } from "./stratification.ts";

/** g (lower less upper) / lower, m/s2; some divide by the mean density instead, which adds half that difference, relative. */
export const reducedGravity = (gravityMs2: number, upperRhoKgM3: number, lowerRhoKgM3: number): number =>
  (gravityMs2 * (lowerRhoKgM3 - upperRhoKgM3)) / lowerRhoKgM3;

/**
 * Speeds of long waves on two layers, m/s: the roots of c^4 - g H c^2 + g g' h1 h2 = 0 with the water surface free, and
 * c^2 = g' h1 h2 / H with it held flat (Gill 1982, sec. 6.2; from memory).
 */
export function twoLayerWaves(layers: {
  readonly upperThicknessM: number;
  readonly lowerThicknessM: number;
  readonly gravityMs2: number;
  readonly reducedGravityMs2: number;
}): TwoLayerWaves {
  const { upperThicknessM, lowerThicknessM, gravityMs2, reducedGravityMs2 } = layers;
  const totalM = upperThicknessM + lowerThicknessM;
  const sum = gravityMs2 * totalM;
  const product = gravityMs2 * reducedGravityMs2 * upperThicknessM * lowerThicknessM;
  const external = (sum + Math.sqrt(sum * sum - 4 * product)) / 2;
  return {
    rigidLidMs: Math.sqrt((reducedGravityMs2 * upperThicknessM * lowerThicknessM) / totalM),
    // The small root from the large one: their difference from the sum would lose its digits.
    freeSurfaceMs: Math.sqrt(product / external),
    externalMs: Math.sqrt(external),
  };
}

/**
 * The two mixed layers that stand for a column when it is cut at one depth: with its depth means, and with the densities
 * that keep both its mass and its potential energy anomaly, which differ by 2 H phi / (g h1 h2) about the same mean.
 * Null where the cut leaves no layer, or the lower layer would not be the heavier.
 * @param density potential density as measured, kg/m3, from the water surface down
 */
export function twoLayers(
  density: LinearProfile,
  interfaceDepthM: number,
  energy: { readonly gravityMs2: number; readonly potentialEnergyAnomalyJM3: number },
): TwoLayers | null {
  const { gravityMs2, potentialEnergyAnomalyJM3 } = energy;
  const totalM = density.bottomDepthM;
  const upperThicknessM = interfaceDepthM;
  const lowerThicknessM = totalM - interfaceDepthM;
  if (!(upperThicknessM > 0 && lowerThicknessM > 0)) return null;
  const upperRhoKgM3 = density.mean(0, interfaceDepthM);
  const lowerRhoKgM3 = density.mean(interfaceDepthM, totalM);
  if (!(lowerRhoKgM3 > upperRhoKgM3 && potentialEnergyAnomalyJM3 > 0)) return null;
  const layered = (aboveRhoKgM3: number, belowRhoKgM3: number): LayerDensities => ({
    upperRhoKgM3: aboveRhoKgM3,
    lowerRhoKgM3: belowRhoKgM3,
    reducedGravityMs2: reducedGravity(gravityMs2, aboveRhoKgM3, belowRhoKgM3),
  });
  const means = layered(upperRhoKgM3, lowerRhoKgM3);
  const stepKgM3 = (2 * totalM * potentialEnergyAnomalyJM3) / (gravityMs2 * upperThicknessM * lowerThicknessM);
  const meanRhoKgM3 = density.mean(0, totalM);
  return {
    upperThicknessM,
    lowerThicknessM,
    means,
    energyKept: layered(
      meanRhoKgM3 - (stepKgM3 * lowerThicknessM) / totalM,
      meanRhoKgM3 + (stepKgM3 * upperThicknessM) / totalM,
    ),
    waves: twoLayerWaves({
      upperThicknessM,
      lowerThicknessM,
      gravityMs2,
      reducedGravityMs2: means.reducedGravityMs2,
    }),
  };
}
