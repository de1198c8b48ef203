import type { Cast, CastId } from "../../cast/index.ts";
import type { FlagEdit, SolvedCast, Survey } from "../../survey/index.ts";

/** About a tenth of a second of work: long enough to be worth a message, short enough to call off the next. */
const MOST_SAMPLES_COUNT = 4000;

/** The casts to solve next, from the front. */
export function nextShare(casts: readonly Cast[]): readonly Cast[] {
  let samplesCount = 0;
  const end = casts.findIndex((cast) => {
    const full = samplesCount > 0 && samplesCount + cast.samples.n > MOST_SAMPLES_COUNT;
    samplesCount += cast.samples.n;
    return full;
  });
  return end < 0 ? casts : casts.slice(0, end);
}

/** Results and the survey they belong to. */
export interface Solved<T extends SolvedCast> {
  readonly survey: Survey;
  readonly casts: readonly T[];
}

/**
 * Results whose columns still hold for another survey: those of casts it keeps and has not flagged otherwise, as long as
 * all else that tells is the same. Levels do not tell: they are read off a column.
 */
export function stillValid<T extends SolvedCast>(solved: Solved<T>, survey: Survey): readonly T[] {
  if (solved.survey.basis !== survey.basis || solved.survey.preparation !== survey.preparation) return [];
  const kept = new Set(survey.casts);
  const before = editsByCast(solved.survey.flagEdits);
  const now = editsByCast(survey.flagEdits);
  return solved.casts.filter(({ cast }) => kept.has(cast) && isSame(before.get(cast.id), now.get(cast.id)));
}

export function editsByCast(edits: readonly FlagEdit[]): ReadonlyMap<CastId, readonly FlagEdit[]> {
  const byCast = new Map<CastId, FlagEdit[]>();
  for (const edit of edits) {
    const own = byCast.get(edit.castId);
    if (own) own.push(edit);
    else byCast.set(edit.castId, [edit]);
  }
  return byCast;
}

const isSame = (a: readonly FlagEdit[] = [], b: readonly FlagEdit[] = []): boolean =>
  a.length === b.length && a.every((edit, k) => edit === b[k]);
