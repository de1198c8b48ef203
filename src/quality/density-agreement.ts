import type { Issue } from "../base/index.ts";
import { type Cast, sampleSalinity } from "../cast/index.ts";
import { ownSalinity, ownTemperature, waterModel } from "../water/index.ts";

/**
 * Files that carry a density anomaly let us check ours against it. Rounding of temperature, salinity and the anomaly to
 * 0.01 each explains 0.015 kg/m3; what differs by more was not made from the row's own temperature and salinity.
 */
const AGREEMENT_KGM3 = 0.02;

/** Which samples' stated density anomaly at zero pressure disagrees with their own temperature and salinity. */
export function densityDisagreement(
  cast: Cast,
  unmeasuredPracticalSalinity: number,
): { readonly sampleIndex: readonly number[]; readonly issues: readonly Issue[] } {
  const { samples } = cast;
  const stated = samples.statedSigmaKgM3;
  if (!stated) return { sampleIndex: [], issues: [] };
  const model = waterModel({ id: "teos10" });
  const measured = sampleSalinity(samples, unmeasuredPracticalSalinity);
  const sampleIndex: number[] = [];
  const issues: Issue[] = [];
  for (let i = 0; i < samples.n; i++) {
    const salinity = ownSalinity(model, measured.at(i, 0));
    const tempC = ownTemperature(model, { salinity, inSituTempC: samples.inSituTempC[i]!, seaPressureDbar: 0 });
    const computedKgM3 = model.density(salinity, tempC, 0) - 1000;
    if (!(Math.abs(computedKgM3 - stated[i]!) > AGREEMENT_KGM3)) continue;
    sampleIndex.push(i);
    issues.push({
      severity: "warning",
      code: "stated-density-disagrees",
      line: samples.lineIndex[i]!,
      message: `density anomaly ${stated[i]} kg/m3 in the file, ${computedKgM3.toFixed(3)} from this row's temperature and salinity; one of the three is wrong`,
    });
  }
  return { sampleIndex, issues };
}
