import { median } from "simple-statistics";

/** Fewer samples were picked by somebody, not recorded by a probe on its way. */
const LEAST_SAMPLES_COUNT = 10;

/** Without times, samples this dense tell a record that was kept running. */
const DENSE_SPACING_M = 0.25;

/** Whether there are two ways to choose from: depths, in the order of the file, that both increase and decrease. */
export function goesBothWays(depthM: readonly number[]): boolean {
  const isStep = (sign: 1 | -1): boolean => depthM.some((depth, k) => k > 0 && sign * (depth - depthM[k - 1]!) > 0);
  return isStep(1) && isStep(-1);
}

/**
 * Whether depths, in the order of the file, are a raw record: the probe went both down and up, and the samples follow
 * each other in time or lie dense. A table that runs one way, or lists few depths in any order, is not raw.
 * @param timeS of the same samples, where the file has times
 */
export function isRawRecord(depthM: readonly number[], timeS: readonly number[] | null): boolean {
  if (depthM.length < LEAST_SAMPLES_COUNT || !goesBothWays(depthM)) return false;
  const spacingM = median(depthM.slice(1).map((depth, k) => Math.abs(depth - depthM[k]!)));
  return followInTime(timeS) || spacingM <= DENSE_SPACING_M;
}

const followInTime = (timeS: readonly number[] | null): boolean =>
  timeS !== null && timeS.at(-1)! > timeS[0]! && timeS.every((time, k) => k === 0 || time >= timeS[k - 1]!);
