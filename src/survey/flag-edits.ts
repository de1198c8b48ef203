import type { CastId } from "../cast/index.ts";
import type { FlagEdit } from "../quality/index.ts";
import type { Survey } from "./survey.ts";

/** Neighbouring samples of one cast as read, both ends included; the ends may be given in either order. */
export interface SampleRange {
  readonly castId: CastId;
  readonly fromIndex: number;
  readonly toIndex: number;
}

function isWithin({ castId, fromIndex, toIndex }: SampleRange, edit: FlagEdit): boolean {
  const lowest = Math.min(fromIndex, toIndex);
  const highest = Math.max(fromIndex, toIndex);
  return edit.castId === castId && edit.sampleIndex >= lowest && edit.sampleIndex <= highest;
}

/** A survey in which the user's flags on a range of samples are taken back, so that the tests decide again. */
export function removeFlagEdits<S extends Pick<Survey, "flagEdits">>(survey: S, range: SampleRange): S {
  const flagEdits = survey.flagEdits.filter((edit) => !isWithin(range, edit));
  return flagEdits.length === survey.flagEdits.length ? survey : { ...survey, flagEdits };
}

/** A survey in which every sample of a range has the user's flag, in place of an earlier one. */
export function addFlagEdits<S extends Pick<Survey, "flagEdits">>(
  survey: S,
  range: SampleRange,
  flag: FlagEdit["flag"],
): S {
  const firstIndex = Math.min(range.fromIndex, range.toIndex);
  const lastIndex = Math.max(range.fromIndex, range.toIndex);
  const added = Array.from(
    { length: lastIndex - firstIndex + 1 },
    (_, k): FlagEdit => ({ castId: range.castId, sampleIndex: firstIndex + k, flag }),
  );
  return { ...survey, flagEdits: [...removeFlagEdits(survey, range).flagEdits, ...added] };
}
