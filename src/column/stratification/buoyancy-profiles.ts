import { buoyancyFrequency } from "../buoyancy-frequency.ts";
import type { Column } from "../column.ts";
import type { LinearProfile } from "./linear-profile.ts";
import { partWay } from "./part-way.ts";
import type { BuoyancyProfile } from "./stratification.ts";
import { inDensityOrder } from "./thorpe.ts";

/** What turns a step of density into a buoyancy frequency: gravity, and the one density of the Boussinesq approximation. */
export interface Setting {
  readonly gravityMs2: number;
  readonly meanRhoKgM3: number;
}

const FEWEST_STEPS_COUNT = 200;
const MOST_STEPS_COUNT = 4000;
/** Steps over which density is averaged, where the limits above do not make it otherwise. */
const STEPS_PER_SMOOTHING_COUNT = 4;

/** g / rho0 times the gain of potential density per depth, s-2; NaN over no depth. */
export const squaredFrequency = (setting: Setting, rhoStepKgM3: number, depthStepM: number): number =>
  depthStepM > 0 ? ((setting.gravityMs2 / setting.meanRhoKgM3) * rhoStepKgM3) / depthStepM : Number.NaN;

const midDepths = (depthM: Float64Array): Float64Array =>
  Float64Array.from({ length: Math.max(depthM.length - 1, 0) }, (_, k) => (depthM[k]! + depthM[k + 1]!) / 2);

/** Between samples as measured: see buoyancyFrequency. */
export const rawBuoyancy = (column: Column): BuoyancyProfile => ({
  depthM: midDepths(column.depthM),
  squaredPerS2: buoyancyFrequency(column).squaredPerS2,
});

/**
 * Between samples in order of density, from the gradient of potential density (equal to that from expansion and
 * contraction within 1 % in the upper 100 m); never negative. NaN where two samples share a depth.
 * @param depthM of the samples, not decreasing
 * @param rhoKgM3 their potential density, in any order
 */
export function sortedBuoyancy(depthM: Float64Array, rhoKgM3: Float64Array, setting: Setting): BuoyancyProfile {
  const inOrder = inDensityOrder(rhoKgM3);
  const middleM = midDepths(depthM);
  const squaredPerS2 = middleM.map((_, k) =>
    squaredFrequency(setting, inOrder[k + 1]! - inOrder[k]!, depthM[k + 1]! - depthM[k]!),
  );
  return { depthM: middleM, squaredPerS2 };
}

/**
 * g / rho0 times the gradient of the sorted column averaged over `smoothingLengthM`, at even depths from surface to
 * bottom. The gradient of a running mean is the difference across its window over its length; at the ends the window is
 * cut off by surface and bottom.
 */
export function smoothedBuoyancy(sorted: LinearProfile, smoothingLengthM: number, setting: Setting): BuoyancyProfile {
  const bottomM = sorted.bottomDepthM;
  const wanted = Math.ceil((STEPS_PER_SMOOTHING_COUNT * bottomM) / smoothingLengthM);
  const steps = Math.min(Math.max(wanted, FEWEST_STEPS_COUNT), MOST_STEPS_COUNT);
  const depthM = Float64Array.from({ length: steps + 1 }, (_, i) => partWay([0, bottomM], i / steps));
  const squaredPerS2 = depthM.map((depth) => {
    const upperM = Math.max(depth - smoothingLengthM / 2, 0);
    const lowerM = Math.min(depth + smoothingLengthM / 2, bottomM);
    return squaredFrequency(setting, sorted.at(lowerM) - sorted.at(upperM), lowerM - upperM);
  });
  return { depthM, squaredPerS2 };
}
