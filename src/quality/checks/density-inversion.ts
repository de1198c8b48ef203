import { type Evidence, sigmaKgM3, type Water, written } from "../evidence.ts";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

/** Potential density that may decrease downward before it is worth a remark, and before one sample must be wrong. */
const SUSPECT_KGM3 = 0.03;
const FAIL_KGM3 = 0.1;

/**
 * Water that is heavier than the water below it, by potential density at the surface, beyond what rounding of the record
 * explains. Both samples are suspect. An inversion shows that one of two samples is wrong, not which, so a sample fails
 * only where it alone is to blame: without it the water is stable, without the other it is not.
 */
export const densityInversion: NeighbourCheck = (evidence, order) => {
  const { samples, depthM, isSalinityMeasured } = evidence;
  const sigma = order.map((i) => sigmaKgM3(waterAt(evidence, i)));
  const findings: Finding[] = [];
  /** How much heavier the sample at one place is than that at a place below; nothing weighs on it beyond the ends. */
  const excessKgM3 = (k: number, i: number): number =>
    k < 0 || i >= order.length ? Number.NEGATIVE_INFINITY : sigma[k]! - sigma[i]! - roundingKgM3(evidence, order[k]!);
  for (let k = 0; k + 1 < order.length; k++) {
    const inversionKgM3 = excessKgM3(k, k + 1);
    if (!(inversionKgM3 > SUSPECT_KGM3)) continue;
    const stableWithoutUpper = excessKgM3(k - 1, k + 1) <= SUSPECT_KGM3;
    const stableWithoutLower = excessKgM3(k, k + 2) <= SUSPECT_KGM3;
    const isCertain = isSalinityMeasured && inversionKgM3 > FAIL_KGM3 && stableWithoutUpper !== stableWithoutLower;
    const [upper, lower] = [order[k]!, order[k + 1]!];
    const say = (sampleIndex: number, isToBlame: boolean, words: string): void =>
      void findings.push({
        check: "density-inversion",
        sampleIndex,
        flag: isCertain && isToBlame ? QUALITY_FLAG.fail : QUALITY_FLAG.suspect,
        reason: words,
      });
    const byKgM3 = `${written(sigma[k]! - sigma[k + 1]!)} kg/m3`;
    say(
      upper,
      stableWithoutUpper,
      `heavier by ${byKgM3} than the water below it (line ${samples.lineIndex[lower]}, ${written(depthM[lower]!)} m)`,
    );
    say(
      lower,
      stableWithoutLower,
      `lighter by ${byKgM3} than the water above it (line ${samples.lineIndex[upper]}, ${written(depthM[upper]!)} m)`,
    );
  }
  return findings;
};

const waterAt = ({ depthM, inSituTempC, practicalSalinity }: Evidence, i: number): Water => ({
  practicalSalinity: practicalSalinity[i]!,
  inSituTempC: inSituTempC[i]!,
  seaPressureDbar: depthM[i]!,
  atSeaPressureDbar: 0,
});

/** How far two densities may differ because temperature and salinity were each rounded by half a step in both samples. */
function roundingKgM3(evidence: Evidence, i: number): number {
  const water = waterAt(evidence, i);
  const here = sigmaKgM3(water);
  return evidence.quantities.reduce((sum, { name, resolution }) => {
    const stepped =
      name === "salinity"
        ? { ...water, practicalSalinity: water.practicalSalinity + resolution }
        : { ...water, inSituTempC: water.inSituTempC + resolution };
    return sum + Math.abs(sigmaKgM3(stepped) - here);
  }, 0);
}
