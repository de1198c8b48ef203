import { median } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import { type Evidence, sigmaKgM3 } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import { resolutionOf } from "../resolution.ts";

/** Rounding of temperature, salinity and an anomaly to 0.01 each explains 0.015 kg/m3. */
const AGREEMENT_KGM3 = 0.02;

/** Definitions whose misfits differ by less fit alike. */
const ALIKE_KGM3 = 0.005;

/** Pure water at its densest, which specific gravity is counted from (Tanaka et al. 2001). */
const DENSEST_PURE_WATER_KGM3 = 999.975;

/** What a column of densities can mean: stated = (density - offset) / unit, with the density at one of two pressures. */
interface Definition {
  readonly words: string;
  readonly offsetKgM3: number;
  readonly unitKgM3: number;
  readonly isInSitu: boolean;
}

/** The likelier come first; of two that fit alike the first is taken. */
const DEFINITIONS: readonly Definition[] = [
  { words: "density less 1000 kg/m3, at zero pressure", offsetKgM3: 1000, unitKgM3: 1, isInSitu: false },
  { words: "density less 1000 kg/m3, in situ", offsetKgM3: 1000, unitKgM3: 1, isInSitu: true },
  { words: "density in situ", offsetKgM3: 0, unitKgM3: 1, isInSitu: true },
  { words: "specific gravity", offsetKgM3: 0, unitKgM3: DENSEST_PURE_WATER_KGM3, isInSitu: false },
];

/**
 * Whether the density that a file states for a sample fits the sample's own temperature and salinity. Files do not say
 * which density they mean, so the definition is taken that the values fit
 * best; where it is not the usual one, which is the first, that is said.
 */
export function statedDensity(evidence: Evidence): {
  readonly findings: readonly Finding[];
  readonly issues: readonly Issue[];
} {
  const stated = evidence.samples.statedSigmaKgM3;
  if (!stated) return { findings: [], issues: [] };
  const fits = DEFINITIONS.map((definition) => {
    const differenceKgM3 = stated.map(
      (value, i) => value * definition.unitKgM3 - computedKgM3(evidence, i, definition),
    );
    return { definition, differenceKgM3, misfitKgM3: middleSize(differenceKgM3) };
  });
  const best = fits.reduce((a, b) => (b.misfitKgM3 < a.misfitKgM3 - ALIKE_KGM3 ? b : a));
  if (!Number.isFinite(best.misfitKgM3)) return { findings: [], issues: [] };
  const { definition, differenceKgM3 } = best;
  const allowedKgM3 = Math.max(AGREEMENT_KGM3, AGREEMENT_KGM3 / 2 + (resolutionOf(stated) * definition.unitKgM3) / 2);
  const findings = [...differenceKgM3.keys()]
    .filter((i) => Math.abs(differenceKgM3[i]!) > allowedKgM3)
    .map((i): Finding => {
      const own = stated[i]! - differenceKgM3[i]! / definition.unitKgM3;
      return {
        check: "stated-density-disagrees",
        sampleIndex: i,
        flag: QUALITY_FLAG.suspect,
        reason: `${definition.words} is ${stated[i]} in the file and ${own.toFixed(3)} from the sample's temperature and salinity; one of the three is wrong`,
      };
    });
  return { findings, issues: definition === DEFINITIONS[0] ? [] : [asWhat(definition)] };
}

const asWhat = ({ words }: Definition): Issue => ({
  severity: "note",
  code: "stated-density-definition",
  message: `the file's own density is taken for ${words}, which fits its temperatures and salinities best; it is compared and not used`,
});

function computedKgM3(evidence: Evidence, i: number, { offsetKgM3, isInSitu }: Definition): number {
  const seaPressureDbar = isInSitu ? evidence.depthM[i]! : 0;
  const sigma = sigmaKgM3({
    practicalSalinity: evidence.practicalSalinity[i]!,
    inSituTempC: evidence.inSituTempC[i]!,
    seaPressureDbar,
    atSeaPressureDbar: seaPressureDbar,
  });
  return sigma + (1000 - offsetKgM3);
}

/** Of the sizes of all differences that exist, the middle one; infinite where there is none. */
function middleSize(differenceKgM3: Float64Array): number {
  const sizes = Array.from(differenceKgM3.filter(Number.isFinite), Math.abs);
  return sizes.length === 0 ? Number.POSITIVE_INFINITY : median(sizes);
}
