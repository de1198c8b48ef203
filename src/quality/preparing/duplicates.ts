import type { Samples } from "../../cast/index.ts";
import type { Finding } from "../finding.ts";

/**
 * Samples that repeat an earlier one in every measured column, time included: the same row twice in the file.
 * @param indices of the samples to compare
 */
export function duplicates(samples: Samples, indices: readonly number[]): readonly Finding[] {
  const columns = [
    samples.depthM,
    samples.seaPressureDbar,
    samples.inSituTempC,
    samples.practicalSalinity,
    samples.absSalinityGKg,
    samples.conductivityMsCm,
    samples.specificConductanceMsCm,
    samples.timeS,
  ].filter((column) => column !== null);
  /** 0 for the same row; a value that is missing equals one that is missing. */
  const compare = (i: number, k: number): number => {
    for (const column of columns) {
      if (Object.is(column[i], column[k])) continue;
      return column[i]! < column[k]! || Number.isNaN(column[i]) ? -1 : 1;
    }
    return 0;
  };
  const sorted = [...indices].sort((a, b) => compare(a, b) || a - b);
  let first = -1;
  return sorted.flatMap((i): readonly Finding[] => {
    if (first < 0 || compare(first, i) !== 0) {
      first = i;
      return [];
    }
    const reason = `repeats line ${samples.lineIndex[first]}`;
    return [{ check: "duplicate", sampleIndex: i, flag: null, leftOut: true, reason }];
  });
}
