import { median, medianAbsoluteDeviation } from "simple-statistics";
import type { InOwnUnit } from "../resolution.ts";

/** Of a normal distribution: standard deviation over median absolute deviation, 1 / inverse normal of 3/4. */
const SIGMA_PER_MAD_RATIO = 1.482602218505602;

/**
 * How many robust standard deviations one of some values lies from their median (Hampel 1974; Davies & Gather 1993).
 * @param resolution the step the values were recorded in; the deviation is not believed to be less
 */
export function hampelScore(values: readonly InOwnUnit[], i: number, resolution: InOwnUnit): number {
  const scale = SIGMA_PER_MAD_RATIO * Math.max(medianAbsoluteDeviation(values as number[]), resolution);
  const distance = Math.abs(values[i]! - median(values as number[]));
  return distance === 0 ? 0 : distance / scale;
}
