import type { SampleRange } from "../../survey/index.ts";
import type { AnsweredCast } from "../../worker/index.ts";

/** A range of depth in which samples are to be flagged; the ends may stand in either order. */
export interface DepthRange {
  readonly fromM: number;
  readonly toM: number;
}

/** More are not taken at once: each is an entry in the user's work. */
export const MOST_SELECTED_COUNT = 20_000;

export interface FlagSelection {
  readonly count: number;
  /** Runs of neighbouring samples, in the order of the file. */
  readonly ranges: readonly SampleRange[];
}

/** The samples of a cast, as read, that lie within a range of depth. */
export function selectSamples({ cast, marked }: AnsweredCast, { fromM, toM }: DepthRange): FlagSelection {
  const topM = Math.min(fromM, toM);
  const bottomM = Math.max(fromM, toM);
  const ranges: { castId: SampleRange["castId"]; fromIndex: number; toIndex: number }[] = [];
  let count = 0;
  marked.sampleDepthM.forEach((depthM, i) => {
    if (!(depthM >= topM && depthM <= bottomM)) return;
    count++;
    const last = ranges.at(-1);
    if (last?.toIndex === i - 1) last.toIndex = i;
    else ranges.push({ castId: cast.id, fromIndex: i, toIndex: i });
  });
  return { count, ranges };
}
