import { median } from "simple-statistics";
import type { Evidence } from "../evidence.ts";
import type { Finding } from "../finding.ts";

/** Shallower samples before and after a lowering were taken on deck or at the rail. */
const RAIL_M = 0.1;

/** A cell in air reads less than any natural water; it tells where the water of the cast is salty. */
const AIR_PRACTICAL_SALINITY = 0.01;
const SALTY_PRACTICAL_SALINITY = 2;

/**
 * Sets apart what was recorded before the probe entered the water and after it left it.
 * @param inTime indices of samples in the order they were recorded
 */
export function withoutDeck(
  { depthM, practicalSalinity, isSalinityMeasured }: Evidence,
  inTime: readonly number[],
): { readonly wet: readonly number[]; readonly findings: readonly Finding[] } {
  const isSalty = isSalinityMeasured && median(inTime.map((i) => practicalSalinity[i]!)) >= SALTY_PRACTICAL_SALINITY;
  const isWet = (i: number): boolean =>
    depthM[i]! >= RAIL_M && !(isSalty && practicalSalinity[i]! < AIR_PRACTICAL_SALINITY);
  const first = inTime.findIndex(isWet);
  if (first < 0) return { wet: inTime, findings: [] };
  const last = inTime.findLastIndex(isWet);
  const say = (i: number, when: string): Finding => ({
    check: "deck",
    sampleIndex: i,
    flag: null,
    leftOut: true,
    reason: `at the surface or on deck, ${when} the lowering`,
  });
  return {
    wet: inTime.slice(first, last + 1),
    findings: [
      ...inTime.slice(0, first).map((i) => say(i, "before")),
      ...inTime.slice(last + 1).map((i) => say(i, "after")),
    ],
  };
}
