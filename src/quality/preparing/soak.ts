import { min } from "simple-statistics";

/** The probe is back at the surface when it is within this of the shallowest sample. */
const SURFACE_M = 0.5;

/** Bobbing by less is the sea, not a soak. */
const LEAST_RETURN_M = 0.15;

/** Waiting takes time: fewer samples are a heave. */
const LEAST_SAMPLES_COUNT = 4;

/**
 * Where the way down starts after the probe was held near the surface to let its sensors settle: the last time it was
 * at its shallowest before it went down for good. Needs the return to the surface; a probe that soaks at depth and goes
 * on from there keeps the water above, and the standing samples fall to the rule that each must be deeper than the last.
 * @param depthsM from entering the water to the deepest sample, in order of time
 * @returns 0 where there was no soak
 */
export function soakEnd(depthsM: readonly number[]): number {
  const surfaceM = min(depthsM as number[]) + SURFACE_M;
  const lastNearSurface = depthsM.findLastIndex((depth) => depth <= surfaceM);
  let deepestM = Number.NEGATIVE_INFINITY;
  let endIndex = 0;
  for (let k = 0; k <= lastNearSurface; k++) {
    deepestM = Math.max(deepestM, depthsM[k]!);
    const hasReturned = deepestM - depthsM[k]! >= LEAST_RETURN_M;
    const isShallowest = endIndex === 0 || depthsM[k]! <= depthsM[endIndex]!;
    if (hasReturned && isShallowest) endIndex = k;
  }
  return endIndex >= LEAST_SAMPLES_COUNT ? endIndex : 0;
}
