import type { Column } from "../column.ts";
import type { Setting } from "./buoyancy-profiles.ts";
import { partWay } from "./part-way.ts";
import type { BuoyancyProfile, MixedLayer, MixedLayerEnd, StratificationOptions } from "./stratification.ts";

/**
 * The mixed layer of a column by its threshold, on the samples as measured, and by the gradient of smoothed density.
 * @param potentialRhoKgM3 of the samples
 * @param smoothed buoyancy frequency from surface to bottom
 */
export function mixedLayerOf(
  column: Column,
  potentialRhoKgM3: Float64Array,
  smoothed: BuoyancyProfile,
  how: Setting & Pick<StratificationOptions, "mixedLayerThreshold" | "mixedLayerGradientKgM3PerM">,
): MixedLayer {
  const { depthM, inSituTempC, bottomDepthM } = column;
  const { mixedLayerThreshold: threshold } = how;
  const inSteps =
    threshold.quantity === "density"
      ? potentialRhoKgM3.map((rhoKgM3) => rhoKgM3 / threshold.stepKgM3)
      : inSituTempC.map((tempC) => tempC / threshold.stepC);
  return {
    referenceDepthM: depthM[0]!,
    byThreshold: mixedDownToStep(depthM, inSteps, bottomDepthM),
    byGradient: mixedDownToGradient(smoothed, how, how.mixedLayerGradientKgM3PerM),
  };
}

/**
 * The shallowest depth at which a quantity differs from that of the first sample by one step, up or down, linear between
 * samples; the bottom where it never does (threshold method: de Boyer Montegut et al. 2004, there from 10 m).
 * @param depthM of the samples, not decreasing
 * @param values potential density or temperature of the samples, counted in steps
 */
export function mixedDownToStep(depthM: Float64Array, values: Float64Array, bottomDepthM: number): MixedLayerEnd {
  const k = values.findIndex((value) => Math.abs(value - values[0]!) >= 1);
  if (k < 0) return { depthM: bottomDepthM, reachesBottom: true };
  const crossed = values[0]! + Math.sign(values[k]! - values[0]!);
  const share = (crossed - values[k - 1]!) / (values[k]! - values[k - 1]!);
  return { depthM: partWay([depthM[k - 1]!, depthM[k]!], share), reachesBottom: false };
}

/** The shallowest depth at which smoothed potential density gains `gradientKgM3PerM`; the bottom where it never does. */
export function mixedDownToGradient(
  { depthM, squaredPerS2 }: BuoyancyProfile,
  setting: Setting,
  gradientKgM3PerM: number,
): MixedLayerEnd {
  const limitPerS2 = (setting.gravityMs2 / setting.meanRhoKgM3) * gradientKgM3PerM;
  const k = squaredPerS2.findIndex((squared) => squared >= limitPerS2);
  if (k < 0) return { depthM: depthM.at(-1)!, reachesBottom: true };
  if (k === 0) return { depthM: depthM[0]!, reachesBottom: false };
  const share = (limitPerS2 - squaredPerS2[k - 1]!) / (squaredPerS2[k]! - squaredPerS2[k - 1]!);
  return { depthM: partWay([depthM[k - 1]!, depthM[k]!], share), reachesBottom: false };
}
