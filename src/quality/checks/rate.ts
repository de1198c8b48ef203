import type { Evidence, Quantity } from "../evidence.ts";
import { written } from "../evidence.ts";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import type { InOwnUnit } from "../resolution.ts";

/** Change a metre, in degC and salinity, beyond the sharpest haloclines and thermoclines that are usually met. */
const STEEPEST_PER_M: Readonly<Record<Quantity["name"], InOwnUnit>> = { temperature: 10, salinity: 20 };

/** Closer samples are held to the change that is allowed over this distance: noise divided by nothing is no gradient. */
const SHORTEST_STEP_M = 0.1;

/** Water drifts past even a probe that rests: so many metres of change a second are allowed for. */
const DRIFT_M_PER_S = 0.1;

/** Changes between neighbours that are too fast for their distance in depth, or in time where the probe rested. */
export const rate: NeighbourCheck = (evidence, order) =>
  evidence.quantities.flatMap((quantity) =>
    order.slice(1).flatMap((lower, k) => tooFast(quantity, evidence, order[k]!, lower)),
  );

function tooFast(
  { name, values, write }: Quantity,
  evidence: Evidence,
  upperIndex: number,
  lowerIndex: number,
): readonly Finding[] {
  const { depthM, samples } = evidence;
  const stepM = depthM[lowerIndex]! - depthM[upperIndex]!;
  const waitedS = samples.timeS ? Math.abs(samples.timeS[lowerIndex]! - samples.timeS[upperIndex]!) : 0;
  const reachM = Math.max(stepM, SHORTEST_STEP_M, DRIFT_M_PER_S * (waitedS || 0));
  const change = Math.abs(values[lowerIndex]! - values[upperIndex]!);
  if (change <= STEEPEST_PER_M[name] * reachM) return [];
  return [upperIndex, lowerIndex].map((sampleIndex) => ({
    check: "rate",
    sampleIndex,
    flag: QUALITY_FLAG.suspect,
    reason: `${name} changes by ${write(change)} within ${written(stepM)} m, between lines ${samples.lineIndex[upperIndex]} and ${samples.lineIndex[lowerIndex]}`,
  }));
}
