import { median } from "simple-statistics";

/** Fewer samples were picked by somebody, not recorded by a probe on its way. */
const LEAST_SAMPLES_COUNT = 10;

/** Without times, samples this dense tell a record that was kept running. */
const DENSE_SPACING_M = 0.25;

/**
 * Whether depths, in the order of the file, are a raw record: the probe went both down and up, and the samples follow
 * each other in time or lie dense. A table that runs one way, or lists few depths in any order, is not raw.
 * @param timeS of the same samples, where the file has times
 */
export function isRawRecord(depthM: readonly number[], timeS: readonly number[] | null): boolean {
  if (depthM.length < LEAST_SAMPLES_COUNT) return false;
  const stepsM = depthM.slice(1).map((depth, k) => depth - depthM[k]!);
  const goesBothWays = stepsM.some((step) => step > 0) && stepsM.some((step) => step < 0);
  return goesBothWays && (followInTime(timeS) || median(stepsM.map(Math.abs)) <= DENSE_SPACING_M);
}

const followInTime = (timeS: readonly number[] | null): boolean =>
  timeS !== null && timeS.at(-1)! > timeS[0]! && timeS.every((time, k) => k === 0 || time >= timeS[k - 1]!);
