import type { Cast } from "../../cast/index.ts";
import type { SolvedCast, Survey } from "../../survey/index.ts";

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
export interface Solved {
  readonly survey: Survey;
  readonly casts: readonly SolvedCast[];
}

/** Results that still hold for another survey: those of casts it keeps, as long as all else that tells is the same. */
export function stillValid(solved: Solved, survey: Survey): readonly SolvedCast[] {
  if (!sameTerms(solved.survey, survey)) return [];
  const kept = new Set(survey.casts);
  return solved.casts.filter(({ cast }) => kept.has(cast));
}

const sameTerms = (a: Survey, b: Survey): boolean =>
  (Object.keys(b) as (keyof Survey)[]).every((key) => key === "name" || key === "casts" || a[key] === b[key]);
