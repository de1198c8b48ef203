import {
  budgetOf,
  type PreparedCast,
  type Profile,
  type SolvedCast,
  type Survey,
  type Uncertainty,
} from "../survey/index.ts";
import { basisJson } from "./basis-json.ts";
import { PROFILE_COLUMNS, UNCERTAINTY_COLUMN } from "./columns.ts";
import { preparationJson } from "./preparation-json.ts";
import { VERSION } from "./version.ts";

type Numbers = readonly (number | null)[];

/** JSON has no NaN: missing is null. */
const numbers = (values: ArrayLike<number>): Numbers =>
  Array.from(values, (value) => (Number.isFinite(value) ? value : null));

const profileJson = (profile: Profile, uncertaintyKPa: Float64Array): Record<string, Numbers | readonly string[]> => ({
  ...Object.fromEntries(PROFILE_COLUMNS.map((column) => [column.name, numbers(column.values(profile))])),
  [UNCERTAINTY_COLUMN.name]: numbers(uncertaintyKPa),
  origin: profile.origin,
});

/** What each level's uncertainty is made of, largest share first; null where a level has no water. */
const budgetsJson = (uncertainty: Uncertainty): readonly unknown[] =>
  Array.from(uncertainty.depthM, (_, row) => {
    const budget = budgetOf(uncertainty, row);
    return (
      budget && {
        combined_kPa: budget.combinedKPa,
        expanded_kPa: budget.expandedKPa,
        contributors: budget.shares.map(({ name, standardKPa, shareFrac }) => ({
          name,
          kPa: standardKPa,
          share: shareFrac,
        })),
        sentence: budget.sentence,
      }
    );
  });

/** The samples of a cast that are not in its column, and why; depth as the file has it. */
const leftOutJson = (
  { samples }: SolvedCast["cast"],
  { use, flag, reasons }: PreparedCast,
): readonly Record<string, unknown>[] =>
  [...use.keys()]
    .filter((i) => use[i] === 0)
    .map((i) => ({
      line: samples.lineIndex[i]!,
      depth_m: samples.depthM && Number.isFinite(samples.depthM[i]) ? samples.depthM[i]! : null,
      flag: flag[i]!,
      reasons: reasons[i]!,
    }));

/**
 * A solved survey as one JSON value: every profile as arrays in order of depth, every level, every sample
 * left out, every issue, and the basis and preparation they stand on. A cast that could not be solved has null for profile and levels, and its issues say why.
 */
export function surveyJson(survey: Survey, solved: readonly SolvedCast[]): Record<string, unknown> {
  return {
    version: VERSION,
    basis: basisJson(survey.basis),
    preparation: preparationJson(survey.preparation),
    casts: solved.map(({ cast, prepared, solution, issues }) => ({
      name: cast.name,
      station: cast.station,
      time: cast.time,
      latitude: cast.latitudeDeg,
      longitude: cast.longitudeDeg,
      distance_km: cast.distanceKm,
      file: cast.fileName,
      reference_density_kg_m3: solution?.column.referenceRhoKgM3 ?? null,
      profile: solution && { ...profileJson(solution.profile, solution.uncertaintyKPa), flag: numbers(solution.flag) },
      levels: solution && {
        level: survey.levels.map((level) => level.name),
        ...profileJson(solution.levels, solution.levelUncertainty.combinedKPa),
        uncertainty: budgetsJson(solution.levelUncertainty),
      },
      left_out: leftOutJson(cast, prepared),
      issues: issues.map(({ severity, code, message, line }) => ({ severity, code, message, line: line ?? null })),
    })),
  };
}
