import type { LinearProfile } from "./linear-profile.ts";
import type { StratificationMoments } from "./stratification.ts";

/**
 * Centre of the buoyancy frequency squared and its root-mean-square distance from there: exact for density that is linear
 * between depths, as each stretch then weighs by the density it gains. Null where density gains nothing.
 * A tanh of half-thickness d has the width pi d / sqrt(12).
 * @param sorted density that does not decrease downward, kg/m3
 */
export function stratificationMoments({ depthM, values }: LinearProfile): StratificationMoments | null {
  const gain = (k: number): number => values[k]! - values[k - 1]!;
  const middleM = (k: number): number => (depthM[k]! + depthM[k - 1]!) / 2;
  let total = 0;
  let first = 0;
  for (let k = 1; k < depthM.length; k++) {
    total += gain(k);
    first += gain(k) * middleM(k);
  }
  if (!(total > 0)) return null;
  const centroidDepthM = first / total;
  let second = 0;
  for (let k = 1; k < depthM.length; k++)
    second += gain(k) * ((middleM(k) - centroidDepthM) ** 2 + (depthM[k]! - depthM[k - 1]!) ** 2 / 12);
  return { centroidDepthM, rmsWidthM: Math.sqrt(second / total) };
}
