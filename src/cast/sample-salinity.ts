import { practicalSalinityFromConductivity, practicalSalinityFromReference } from "../gsw-ts-port/index.ts";
import { practicalSalinityFromSpecificConductance } from "../water/index.ts";
import type { Samples } from "./cast.ts";

/** How a cast's samples get their practical salinity. */
export interface SampleSalinity {
  /** What was measured, best first; `basis` when the probe measured none of them. */
  readonly source: "practicalSalinity" | "absSalinity" | "conductivity" | "specificConductance" | "basis";
  /** Practical salinity of a sample; conductivity needs the sea pressure there, the others do not. NaN where missing. */
  readonly at: (sampleIndex: number, seaPressureDbar: number) => number;
}

/** A column of which this cast has not one value counts as not measured. */
const measured = (values: Float64Array | null): values is Float64Array =>
  values?.some((value) => !Number.isNaN(value)) ?? false;

/** @param unmeasuredPracticalSalinity what the basis says where the probe measured none */
export function sampleSalinity(samples: Samples, unmeasuredPracticalSalinity: number): SampleSalinity {
  const { practicalSalinity, absSalinityGKg, conductivityMsCm, specificConductanceMsCm, inSituTempC } = samples;
  if (measured(practicalSalinity)) return { source: "practicalSalinity", at: (i) => practicalSalinity[i]! };
  if (measured(absSalinityGKg))
    return { source: "absSalinity", at: (i) => practicalSalinityFromReference(absSalinityGKg[i]!) };
  if (measured(conductivityMsCm))
    return {
      source: "conductivity",
      at: (i, seaPressureDbar) =>
        practicalSalinityFromConductivity(conductivityMsCm[i]!, inSituTempC[i]!, seaPressureDbar),
    };
  if (measured(specificConductanceMsCm))
    return {
      source: "specificConductance",
      at: (i) => practicalSalinityFromSpecificConductance(specificConductanceMsCm[i]!),
    };
  return { source: "basis", at: () => unmeasuredPracticalSalinity };
}
