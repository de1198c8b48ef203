import { LinearProfile } from "./linear-profile.ts";
import type { PotentialDensities } from "./potential-density.ts";
import { inDensityOrder } from "./thorpe.ts";

/**
 * Potential density of the column with its samples in order of density, from surface to bottom: what stratification is
 * read from, as overturns are passing. Water in the gaps is as the basis has it, but no heavier than the water below it
 * nor lighter than the water above. Sorting keeps the mass of equally spaced samples.
 */
export function sortedColumn({ depthM, rhoKgM3, firstSampleIndex, sampleRhoKgM3 }: PotentialDensities): LinearProfile {
  const inOrder = inDensityOrder(sampleRhoKgM3);
  const [lightest, heaviest] = [inOrder[0]!, inOrder.at(-1)!];
  const sorted = rhoKgM3.map((rho, i) =>
    i < firstSampleIndex ? Math.min(rho, lightest) : (inOrder[i - firstSampleIndex] ?? Math.max(rho, heaviest)),
  );
  return new LinearProfile(depthM, sorted);
}
