import { median } from "simple-statistics";
import type { InOwnUnit } from "../resolution.ts";

/**
 * What is left of values after a robust straight line in depth is taken away: the line has the median of the slopes
 * between all pairs (Theil 1950, Sen 1968) and the median of what then remains. Half the pairs may be wrong.
 */
export function residualsFromLine(depthM: readonly number[], values: readonly InOwnUnit[]): readonly InOwnUnit[] {
  const slopes: number[] = [];
  for (let i = 0; i < values.length; i++)
    for (let k = i + 1; k < values.length; k++) {
      const slope = (values[k]! - values[i]!) / (depthM[k]! - depthM[i]!);
      if (Number.isFinite(slope)) slopes.push(slope);
    }
  const slope = slopes.length === 0 ? 0 : median(slopes);
  const level = values.map((value, i) => value - slope * depthM[i]!);
  const middle = median(level);
  return level.map((value) => value - middle);
}
