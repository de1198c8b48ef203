import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import type { InOwnUnit } from "../resolution.ts";

/** Fewer samples, or a shorter way, say little about a sensor. */
const LEAST_SAMPLES_COUNT = 10;
const LEAST_WAY_M = 2;

/** Water recorded in coarser steps, or to fewer digits, can be honestly the same from top to bottom. */
const FINE_STEP: InOwnUnit = 0.002;
const FINE_STEP_RATIO = 2e-4;

/** Of a single value that came out of a conversion no step can be told. */
const isFine = (value: InOwnUnit, resolution: InOwnUnit): boolean =>
  resolution > 0 && resolution <= Math.min(FINE_STEP, FINE_STEP_RATIO * Math.abs(value));

/**
 * One fine value over a whole cast while depth moves: a sensor that is stuck, or a column that was filled in. The water may
 * yet be that well mixed, so it is suspect and not more.
 */
export const stuckSensor: NeighbourCheck = ({ recorded, depthM }, order) => {
  const wayM = depthM[order.at(-1)!]! - depthM[order[0]!]!;
  if (order.length < LEAST_SAMPLES_COUNT || !(wayM >= LEAST_WAY_M)) return [];
  return recorded
    .filter(
      ({ values, resolution }) =>
        isFine(values[order[0]!]!, resolution) && order.every((i) => values[i] === values[order[0]!]),
    )
    .flatMap(({ name, values, write }) =>
      order.map(
        (sampleIndex): Finding => ({
          check: "stuck-sensor",
          sampleIndex,
          flag: QUALITY_FLAG.suspect,
          reason: `${name} is ${write(values[sampleIndex]!)} in all ${order.length} samples while the depth changes`,
        }),
      ),
    );
};
