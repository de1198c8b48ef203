import { median } from "simple-statistics";
import type { RecordedColumn } from "../evidence.ts";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import type { InOwnUnit } from "../resolution.ts";

/** Equal values in a row (QARTOD): from the third on suspect, five fail. */
const SUSPECT_COUNT = 3;
const FAIL_COUNT = 5;

/** Steps on either side of a run that tell whether the water was changing there. */
const NEIGHBOUR_COUNT = 3;

/** How many such runs a cast may be expected to hold by chance before one is odd, and before one is wrong. */
const ODD_CHANCE_RATIO = 0.1;
const WRONG_CHANCE_RATIO = 1e-3;

interface Run {
  /** Places in the order: the first sample of the run, and the one behind its last. */
  readonly startIndex: number;
  readonly endIndex: number;
}

/**
 * Values that stay while the water changes. Well-mixed water repeats honestly when it is recorded to 0.1 or 0.01, and it
 * reaches the surface or the bed or fades into its neighbours; so a run is held against how the samples on both sides
 * change. Where they change by m steps of the record from one to the next, a value repeats by chance once in m times, and a
 * cast of n samples holds n / m^(k - 1) runs of k. Where every value is written several times, that counts as once.
 */
export const flatLine: NeighbourCheck = (evidence, order) =>
  evidence.recorded.flatMap((column) => flatLinesOf(column, order, evidence.samples.lineIndex));

function flatLinesOf(
  { name, values, resolution, write }: RecordedColumn,
  order: readonly number[],
  lines: Int32Array,
): readonly Finding[] {
  const runs = runsOf(order.map((i) => values[i]!));
  if (runs.length === 0) return [];
  const habitCount = median(runs.map(({ startIndex, endIndex }) => endIndex - startIndex));
  return runs.flatMap(({ startIndex, endIndex }): readonly Finding[] => {
    const count = endIndex - startIndex;
    if (count < SUSPECT_COUNT * habitCount) return [];
    const stepsCount =
      Math.min(
        changeAround(order, values, startIndex - NEIGHBOUR_COUNT, startIndex),
        changeAround(order, values, endIndex - 1, endIndex - 1 + NEIGHBOUR_COUNT),
      ) / resolution;
    const chance = order.length / stepsCount ** (count / habitCount - 1);
    if (!(chance < ODD_CHANCE_RATIO)) return [];
    const isCertain = count >= FAIL_COUNT * habitCount && chance < WRONG_CHANCE_RATIO;
    const run = order.slice(startIndex, endIndex);
    return run.slice(isCertain ? 0 : SUSPECT_COUNT - 1).map((sampleIndex) => ({
      check: "flat-line",
      sampleIndex,
      flag: isCertain ? QUALITY_FLAG.fail : QUALITY_FLAG.suspect,
      reason: `${name} stays at ${write(values[sampleIndex]!)} in ${count} samples from line ${lines[run[0]!]} on while the water above and below changes`,
    }));
  });
}

function runsOf(inOrder: readonly InOwnUnit[]): readonly Run[] {
  const runs: Run[] = [];
  let startIndex = 0;
  for (let k = 1; k <= inOrder.length; k++) {
    if (k < inOrder.length && inOrder[k] === inOrder[startIndex]) continue;
    runs.push({ startIndex, endIndex: k });
    startIndex = k;
  }
  return runs;
}

/** The middle one of the changes from sample to sample between two places; NaN where the record does not reach as far. */
function changeAround(order: readonly number[], values: Float64Array, fromIndex: number, toIndex: number): InOwnUnit {
  if (fromIndex < 0 || toIndex >= order.length) return Number.NaN;
  return median(
    Array.from({ length: toIndex - fromIndex }, (_, k) =>
      Math.abs(values[order[fromIndex + k + 1]!]! - values[order[fromIndex + k]!]!),
    ),
  );
}
