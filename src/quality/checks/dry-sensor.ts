import { median } from "simple-statistics";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

/** Samples above and below that say how salty the water is. */
const NEIGHBOUR_COUNT = 3;

/** Neighbours must be brackish for a near-zero value to stand out. */
const SALTY_PRACTICAL_SALINITY = 2;
const DRY_RATIO = 0.05;

/**
 * Salinity near zero below water that is salty: air in the cell, or a plug that lost contact. Fresh water lies on top of
 * salty water honestly, so salty water must have been met above.
 */
export const drySensor: NeighbourCheck = ({ practicalSalinity, isSalinityMeasured }, order) => {
  if (!isSalinityMeasured) return [];
  const findings: Finding[] = [];
  /** The last samples that were not dry, nearest last. */
  const above: number[] = [];
  for (const i of order) {
    const saltyAbove = above.length === 0 ? Number.NaN : median(above);
    if (saltyAbove >= SALTY_PRACTICAL_SALINITY && practicalSalinity[i]! < DRY_RATIO * saltyAbove) {
      findings.push({
        check: "dry-sensor",
        sampleIndex: i,
        flag: QUALITY_FLAG.fail,
        reason: `salinity ${practicalSalinity[i]!.toFixed(3)} below water of ${saltyAbove.toFixed(1)}: the sensor was dry or lost contact`,
      });
      continue;
    }
    above.push(practicalSalinity[i]!);
    if (above.length > NEIGHBOUR_COUNT) above.shift();
  }
  return findings;
};
