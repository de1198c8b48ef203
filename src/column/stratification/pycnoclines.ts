import { type Setting, squaredFrequency } from "./buoyancy-profiles.ts";
import type { LinearProfile } from "./linear-profile.ts";
import { type Peak, peaksOf } from "./peaks.ts";
import type { BuoyancyProfile, Pycnocline, StratificationOptions } from "./stratification.ts";

/** Shares of the gain in density between which a pycnocline's thickness is measured. */
const TOP_FRAC = 0.15;
const BOTTOM_FRAC = 0.85;

/** Values this close to the highest belong to one flat top, as where density gains evenly from sample to sample. */
const FLAT_FRAC = 1e-6;

/**
 * The pycnoclines of a column: peaks of its smoothed buoyancy frequency squared that stand out by more than a share of
 * the highest and by more than noise over the smoothing length makes. Each owns the water down to the trough before the
 * next; its thickness is the distance in which density gains from 15 % to 85 % of what it gains there. The main one,
 * which gains most, comes first. A tanh of half-thickness d is 1.735 d thick.
 * @param sorted potential density that does not decrease downward, kg/m3, the ground of `smoothed`
 */
export function pycnoclinesOf(
  smoothed: BuoyancyProfile,
  sorted: LinearProfile,
  how: Setting & Pick<StratificationOptions, "prominenceFrac" | "densityNoiseKgM3" | "smoothingLengthM">,
): readonly Pycnocline[] {
  const { depthM, squaredPerS2 } = smoothed;
  const highestPerS2 = squaredPerS2.reduce((highest, squared) => Math.max(highest, squared), 0);
  const noisePerS2 = squaredFrequency(how, how.densityNoiseKgM3, how.smoothingLengthM);
  const leastPerS2 = Math.max(how.prominenceFrac * highestPerS2, noisePerS2);
  const peaks = peaksOf(squaredPerS2).filter((peak) => peak.prominencePerS2 > leastPerS2);
  const troughDepthsM = peaks
    .slice(1)
    .map((peak, i) => depthM[lowestBetween(squaredPerS2, peaks[i]!.peakIndex, peak.peakIndex)]!);
  const edgesM = [sorted.topDepthM, ...troughDepthsM, sorted.bottomDepthM];
  return peaks
    .map((peak, i): Pycnocline => {
      const fromRho = sorted.at(edgesM[i]!);
      const rhoStepKgM3 = sorted.at(edgesM[i + 1]!) - fromRho;
      const topDepthM = sorted.depthReaching(fromRho + TOP_FRAC * rhoStepKgM3);
      const bottomDepthM = sorted.depthReaching(fromRho + BOTTOM_FRAC * rhoStepKgM3);
      const { depthM: peakDepthM, squaredPerS2: peakSquaredPerS2 } = summit(smoothed, peak);
      return {
        depthM: peakDepthM,
        peakSquaredPerS2,
        bruntPeriodS: bruntPeriodS(peakSquaredPerS2),
        prominenceFrac: peak.prominencePerS2 / highestPerS2,
        rhoStepKgM3,
        topDepthM,
        bottomDepthM,
        thicknessM: bottomDepthM - topDepthM,
      };
    })
    .sort((a, b) => b.rhoStepKgM3 - a.rhoStepKgM3);
}

/** Period of the free oscillation of stratified water about its depth, 2 pi / N. @param squaredPerS2 above 0 */
export const bruntPeriodS = (squaredPerS2: number): number => (2 * Math.PI) / Math.sqrt(squaredPerS2);

/** The top of the parabola through a peak and its two neighbours; the middle of a flat top. */
function summit({ depthM, squaredPerS2 }: BuoyancyProfile, peak: Peak): { depthM: number; squaredPerS2: number } {
  const { peakIndex: index } = peak;
  const height = squaredPerS2[index]!;
  let last = index;
  while (last + 1 < squaredPerS2.length && squaredPerS2[last + 1]! >= (1 - FLAT_FRAC) * height) last++;
  let first = index;
  while (first > 0 && squaredPerS2[first - 1]! >= (1 - FLAT_FRAC) * height) first--;
  const isAtEnd = index === 0 || index === squaredPerS2.length - 1;
  if (last > first || isAtEnd) return { depthM: (depthM[first]! + depthM[last]!) / 2, squaredPerS2: height };
  const before = squaredPerS2[index - 1]!;
  const after = squaredPerS2[index + 1]!;
  const steps = (0.5 * (before - after)) / (before - 2 * height + after);
  return {
    depthM: depthM[index]! + steps * (depthM[index + 1]! - depthM[index]!),
    squaredPerS2: height - 0.25 * (before - after) * steps,
  };
}

function lowestBetween(values: Float64Array, fromIndex: number, toIndex: number): number {
  let lowest = fromIndex;
  for (let i = fromIndex; i <= toIndex; i++) if (values[i]! < values[lowest]!) lowest = i;
  return lowest;
}
