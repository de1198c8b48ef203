import type { Evidence } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

/** Samples without one of the three values that a column stands on, and samples above the water surface. */
export const missing = (evidence: Evidence): readonly Finding[] =>
  [...evidence.depthM.keys()].flatMap((sampleIndex): readonly Finding[] => {
    const { depthM, inSituTempC, practicalSalinity } = evidence;
    const lacking = [
      ...(Number.isFinite(depthM[sampleIndex]) ? [] : ["depth"]),
      ...(Number.isFinite(inSituTempC[sampleIndex]) ? [] : ["temperature"]),
      ...(Number.isFinite(practicalSalinity[sampleIndex]) ? [] : ["salinity"]),
    ];
    if (lacking.length > 0)
      return [
        { check: "missing", sampleIndex, flag: QUALITY_FLAG.missing, reason: `${lacking.join(" and ")} missing` },
      ];
    if (depthM[sampleIndex]! < 0)
      return [
        {
          check: "above-surface",
          sampleIndex,
          flag: QUALITY_FLAG.fail,
          reason: `depth ${depthM[sampleIndex]} lies above the water surface`,
        },
      ];
    return [];
  });
