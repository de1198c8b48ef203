import { LinearProfile } from "./linear-profile.ts";
import type { PotentialDensities } from "./potential-density.ts";
import { densityOrder } from "./thorpe.ts";

/**
 * Potential density of the column with its samples in order of density, from surface to bottom: what stratification is
 * read from, as overturns are passing. Water in the gaps is as the basis has it, but no heavier than the water below it
 * nor lighter than the water above. Sorting keeps the mass of equally spaced samples.
 */
export function sortedColumn({ depthM, rhoKgM3, sampleRhoKgM3 }: PotentialDensities): LinearProfile {
  const inOrder = Float64Array.from(densityOrder(sampleRhoKgM3), (sample) => sampleRhoKgM3[sample]!);
  const n = inOrder.length;
  const sorted = new Float64Array(depthM.length);
  sorted.set(inOrder, 1);
  sorted[0] = Math.min(rhoKgM3[0]!, inOrder[0]!);
  if (sorted.length > n + 1) sorted[n + 1] = Math.max(rhoKgM3[n + 1]!, inOrder[n - 1]!);
  return new LinearProfile(depthM, sorted);
}
