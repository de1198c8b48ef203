import { ownSalinity, waterModel } from "../../water/index.ts";
import { type Evidence, written } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

/** Supercooling and a sensor's error together stay within this. */
const ALLOWANCE_C = 0.1;

/** Warmer water freezes at no salinity. */
const NEVER_FREEZES_C = 0.1;

const TEOS10 = waterModel({ id: "teos10" });

/**
 * Water colder than its freezing point by more than 0.1 degC. The freezing point is where the range of TEOS-10 ends on
 * the cold side, so water that is within range when a little warmer, and not as it is, is too cold.
 */
export function freezing(evidence: Evidence): readonly Finding[] {
  const { depthM, inSituTempC, practicalSalinity } = evidence;
  const isLiquid = (i: number, tempC: number): boolean =>
    TEOS10.isWithinRange(ownSalinity(TEOS10, practicalSalinity[i]!), tempC, depthM[i]!);
  return [...inSituTempC.keys()]
    .filter((i) => inSituTempC[i]! < NEVER_FREEZES_C - ALLOWANCE_C)
    .filter((i) => isLiquid(i, NEVER_FREEZES_C) && !isLiquid(i, inSituTempC[i]! + ALLOWANCE_C))
    .map((i) => ({
      check: "freezing",
      sampleIndex: i,
      flag: QUALITY_FLAG.suspect,
      reason: `${written(inSituTempC[i]!)} degC is more than 0.1 degC below the freezing point of water of salinity ${written(practicalSalinity[i]!)}`,
    }));
}
