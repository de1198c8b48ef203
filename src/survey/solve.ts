import type { Issue } from "../base/index.ts";
import type { Cast } from "../cast/index.ts";
import {
  type Column,
  describeAtDepths,
  integrateCast,
  type Profile,
  sampledProfile,
  type Uncertainty,
  uncertaintyAtDepths,
  uncertaintyOf,
} from "../column/index.ts";
import { type PreparedCast, prepareCast, QUALITY_FLAG } from "../quality/index.ts";
import { emptySurvey, type Survey } from "./survey.ts";

/** What a survey says about one of its casts; plain data, so that it can be handed between threads. */
export type SolvedCast = {
  readonly cast: Cast;
  /** From reading, preparing, integrating and the levels, in that order. */
  readonly issues: readonly Issue[];
  /** The cast's samples after their tests: what each is flagged, why, and whether it is in the column. */
  readonly prepared: PreparedCast;
} & ({ readonly solution: Solution } | { readonly solution: null });

export interface Solution {
  readonly column: Column;
  /** Surface, samples in order of depth, and the bed where it is known. */
  readonly profile: Profile;
  /** Quality flag of each row of the profile (QARTOD), the worst of a bin; 9 where there was no sample. */
  readonly flag: Uint8Array;
  /** Standard uncertainty (k = 1) of gauge pressure in each row of the profile; what it is made of, uncertaintyOf tells. */
  readonly uncertaintyKPa: Float64Array;
  /** One row a level, in the survey's order. */
  readonly levels: Profile;
  /** Of each level, and what it is made of. */
  readonly levelUncertainty: Uncertainty;
  /** The last of the cast's issues: what is to be said of the levels. */
  readonly levelIssues: readonly Issue[];
}

/** The one way from a survey to its results: the page, the command and the library all come through here. */
export const solve = (survey: Survey): readonly SolvedCast[] => survey.casts.map((cast) => solveCast(survey, cast));

/** What solving one cast needs of a survey; without a word on them, samples are prepared as in an empty survey. */
type SolvingTerms = Pick<Survey, "basis" | "levels"> & Partial<Pick<Survey, "preparation" | "flagEdits">>;

/** One cast of a survey. Never throws for bad data: a cast without a solution says why among its issues. */
export function solveCast(survey: SolvingTerms, cast: Cast): SolvedCast {
  const { basis, levels, preparation, flagEdits } = { ...emptySurvey, ...survey };
  const prepared = prepareCast(cast, preparation, flagEdits, basis.unmeasuredPracticalSalinity);
  const found = [...cast.issues, ...prepared.issues];
  const integrated = integrateCast(prepared.cast, basis);
  if (!integrated.ok) return { cast, issues: [...found, ...integrated.issues], prepared, solution: null };
  const column = integrated.value;
  const profile = sampledProfile(column);
  const flag = new Uint8Array(profile.n).fill(QUALITY_FLAG.missing);
  // The first row is the surface; the samples follow in the column's order.
  column.sampleIndex.forEach((sample, knot) => {
    flag[knot + 1] = prepared.preparedFlag[sample]!;
  });
  const uncertaintyKPa = uncertaintyOf(column, prepared.cast).combinedKPa;
  const solvedLevels = atLevels(levels, column, prepared.cast);
  const issues = [...found, ...integrated.issues, ...solvedLevels.levelIssues];
  return { cast, issues, prepared, solution: { column, profile, flag, uncertaintyKPa, ...solvedLevels } };
}

/** The same cast at other levels: its column stands, so this is quick. */
export function solveLevels(survey: Pick<Survey, "levels">, solved: SolvedCast): SolvedCast {
  const { solution, issues, prepared } = solved;
  if (!solution) return solved;
  const solvedLevels = atLevels(survey.levels, solution.column, prepared.cast);
  const ownIssues = issues.slice(0, issues.length - solution.levelIssues.length);
  return {
    ...solved,
    issues: [...ownIssues, ...solvedLevels.levelIssues],
    solution: { ...solution, ...solvedLevels },
  };
}

/** @param cast the prepared one, which the column was made of */
function atLevels(
  levels: Survey["levels"],
  column: Column,
  cast: Cast,
): Pick<Solution, "levels" | "levelUncertainty" | "levelIssues"> {
  const depthsM = levels.map((level) => level.depthM);
  return {
    levels: describeAtDepths(column, depthsM),
    levelUncertainty: uncertaintyAtDepths(column, cast, depthsM),
    levelIssues: levelIssues(levels, column),
  };
}

function levelIssues(levels: Survey["levels"], column: Column): readonly Issue[] {
  const firstDepthM = column.depthM[0]!;
  const lastDepthM = column.depthM[column.n - 1]!;
  return levels.flatMap((level): Issue[] => {
    const at = `level ${level.name} at ${level.depthM} m`;
    const warn = (code: string, message: string): Issue[] => [{ severity: "warning", code, message }];
    if (column.bedDepthM !== null && level.depthM > column.bedDepthM)
      return warn(
        "level-below-bed",
        `${at} lies below the bed at ${column.bedDepthM} m; it has no result, move it or the bed`,
      );
    if (level.depthM > lastDepthM)
      return warn(
        "level-in-bed-gap",
        `${at} lies ${(level.depthM - lastDepthM).toFixed(2)} m below the last sample; the last sample is held down to it`,
      );
    if (level.depthM < firstDepthM)
      return [
        {
          severity: "note",
          code: "level-in-surface-gap",
          message: `${at} lies above the first sample at ${firstDepthM.toFixed(2)} m; the first sample is held up to the surface`,
        },
      ];
    return [];
  });
}
