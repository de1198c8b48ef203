import { median } from "simple-statistics";
import type { Evidence } from "../evidence.ts";
import { written } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

/** No probe moves so far and back between three samples, in m and in ordinary steps of its own record. */
const LEAST_JUMP_M = 2;
const LEAST_STEPS_COUNT = 10;

/**
 * Single depths of a raw record that jump away from both the one before and the one after. One such depth would pass for
 * the bottom of the lowering, and everything behind it for the way up.
 * @param inTime indices of samples in the order they were recorded
 */
export function depthJumps({ depthM }: Evidence, inTime: readonly number[]): readonly Finding[] {
  const depthsM = inTime.map((i) => depthM[i]!);
  if (depthsM.length < 3) return [];
  const stepM = median(depthsM.slice(1).map((depth, k) => Math.abs(depth - depthsM[k]!)));
  const leastM = Math.max(LEAST_JUMP_M, LEAST_STEPS_COUNT * stepM);
  return inTime.flatMap((sampleIndex, k): readonly Finding[] => {
    if (k === 0 || k + 1 === inTime.length) return [];
    const [before, at, after] = [depthsM[k - 1]!, depthsM[k]!, depthsM[k + 1]!];
    const jumpM = Math.max(at - Math.max(before, after), Math.min(before, after) - at);
    if (jumpM < leastM) return [];
    const reason = `depth jumps to ${written(at)} m from ${written(before)} m and back to ${written(after)} m`;
    return [{ check: "depth-jump", sampleIndex, flag: QUALITY_FLAG.fail, reason }];
  });
}
