import { max, mean, min } from "simple-statistics";
import type { Samples } from "../../cast/index.ts";
import { worstFlag } from "../quality-flag.ts";

/**
 * New samples, each made of some of the old ones: one alone stays as it is, of several every column is the mean of the
 * values that exist. The line is that of the first, the file's own flag the worst.
 */
export function selectSamples(samples: Samples, groups: readonly (readonly number[])[]): Samples {
  const means = (values: Float64Array): Float64Array => Float64Array.from(groups, (group) => meanOf(values, group));
  const meansOrNull = (values: Float64Array | null): Float64Array | null => values && means(values);
  return {
    n: groups.length,
    lineIndex: Int32Array.from(groups, (group) => samples.lineIndex[group[0]!]!),
    depthM: meansOrNull(samples.depthM),
    seaPressureDbar: meansOrNull(samples.seaPressureDbar),
    inSituTempC: means(samples.inSituTempC),
    practicalSalinity: meansOrNull(samples.practicalSalinity),
    conductivityMsCm: meansOrNull(samples.conductivityMsCm),
    specificConductanceMsCm: meansOrNull(samples.specificConductanceMsCm),
    absSalinityGKg: meansOrNull(samples.absSalinityGKg),
    suspendedSedimentKgM3: meansOrNull(samples.suspendedSedimentKgM3),
    timeS: meansOrNull(samples.timeS),
    statedFlag:
      samples.statedFlag && Uint8Array.from(groups, (group) => worstFlag(group.map((i) => samples.statedFlag![i]!))),
    statedSigmaKgM3: meansOrNull(samples.statedSigmaKgM3),
  };
}

function meanOf(values: Float64Array, group: readonly number[]): number {
  if (group.length === 1) return values[group[0]!]!;
  const known = group.map((i) => values[i]!).filter((value) => !Number.isNaN(value));
  if (known.length === 0) return Number.NaN;
  // Rounding of the sum may put the mean of equal values beside them.
  return Math.min(Math.max(mean(known), min(known)), max(known));
}
