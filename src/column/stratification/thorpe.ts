import type { Overturn, ThorpeSorting } from "./stratification.ts";

/** Fewer samples show an exchange, not an overturn. */
const FEWEST_SAMPLES_COUNT = 3;

/** Which sample comes at each place when they are put in order of density; equal ones stay in order of depth. */
const densityOrder = (rhoKgM3: Float64Array): Uint32Array =>
  Uint32Array.from(Array.from(rhoKgM3.keys()).sort((a, b) => rhoKgM3[a]! - rhoKgM3[b]! || a - b));

/** Densities from the lightest to the heaviest. */
export const inDensityOrder = (rhoKgM3: Float64Array): Float64Array =>
  Float64Array.from(densityOrder(rhoKgM3), (sample) => rhoKgM3[sample]!);

/**
 * Puts the samples of a column in order of density and says how far each would move: the depth it sorts to less its own
 * (Thorpe 1977, Philosophical Transactions A 286, 125), over samples of any spacing. An overturn is a shortest stretch
 * of samples that keeps to itself; it exceeds the noise with three samples or more whose density sorting changes by more
 * than the noise, root mean square (after Galbraith & Kelley 1996).
 * @param depthM of the samples, not decreasing
 * @param rhoKgM3 their potential density
 */
export function thorpeSorting(depthM: Float64Array, rhoKgM3: Float64Array, densityNoiseKgM3: number): ThorpeSorting {
  const order = densityOrder(rhoKgM3);
  const displacementM = new Float64Array(depthM.length);
  order.forEach((sample, place) => {
    displacementM[sample] = depthM[place]! - depthM[sample]!;
  });

  const overturns: Overturn[] = [];
  let start = 0;
  let deepest = 0;
  order.forEach((sample, place) => {
    deepest = Math.max(deepest, sample);
    if (deepest > place) return;
    const sampleCount = place + 1 - start;
    if (sampleCount > 1) {
      const within = order.subarray(start, place + 1);
      const rmsRhoChangeKgM3 = rootMeanSquare(
        Float64Array.from(within, (sorted, i) => rhoKgM3[sorted]! - rhoKgM3[start + i]!),
      );
      overturns.push({
        fromDepthM: depthM[start]!,
        toDepthM: depthM[place]!,
        sampleCount,
        runLengthCount: longestRunCount(displacementM.subarray(start, place + 1)),
        rmsRhoChangeKgM3,
        exceedsNoise: sampleCount >= FEWEST_SAMPLES_COUNT && rmsRhoChangeKgM3 > densityNoiseKgM3,
      });
    }
    start = place + 1;
  });
  return { displacementM, rmsDisplacementM: rootMeanSquare(displacementM), overturns };
}

const rootMeanSquare = (values: Float64Array): number =>
  Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);

/** Most neighbours that are displaced one way; a sample that stays where it is ends a run. */
function longestRunCount(displacementM: Float64Array): number {
  let longest = 0;
  let run = 0;
  displacementM.forEach((moved, i) => {
    const continues = i > 0 && Math.sign(moved) === Math.sign(displacementM[i - 1]!);
    run = moved === 0 ? 0 : continues ? run + 1 : 1;
    longest = Math.max(longest, run);
  });
  return longest;
}
