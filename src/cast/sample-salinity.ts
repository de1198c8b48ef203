import { practicalSalinityFromConductivity } from "../gsw-ts-port/index.ts";
import { practicalSalinityFromSpecificConductance } from "../water/index.ts";
import type { Samples } from "./cast.ts";

/** Where a cast's salinity comes from, best first; `basis` when the probe measured none. */
export type SalinitySource = "practicalSalinity" | "conductivity" | "specificConductance" | "basis";

export function salinitySource(samples: Samples): SalinitySource {
  if (samples.practicalSalinity) return "practicalSalinity";
  if (samples.conductivityMsCm) return "conductivity";
  if (samples.specificConductanceMsCm) return "specificConductance";
  return "basis";
}

/**
 * Practical salinity of one sample. Conductivity needs the sea pressure at the sample; the others do not use it.
 * @param unmeasuredPracticalSalinity what the basis says where the probe measured none
 * @returns NaN where the sample has no value
 */
export function samplePracticalSalinity(
  samples: Samples,
  sampleIndex: number,
  seaPressureDbar: number,
  unmeasuredPracticalSalinity: number,
): number {
  if (samples.practicalSalinity) return samples.practicalSalinity[sampleIndex]!;
  if (samples.conductivityMsCm)
    return practicalSalinityFromConductivity(
      samples.conductivityMsCm[sampleIndex]!,
      samples.inSituTempC[sampleIndex]!,
      seaPressureDbar,
    );
  if (samples.specificConductanceMsCm)
    return practicalSalinityFromSpecificConductance(samples.specificConductanceMsCm[sampleIndex]!);
  return unmeasuredPracticalSalinity;
}
