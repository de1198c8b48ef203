import {
  type Budget,
  budgetOf,
  confirmsFirstOrder,
  type Improvement,
  monteCarlo,
  type SolvedCast,
  type Survey,
  uncertaintyAtDepths,
  whereToImprove,
} from "../survey/index.ts";

/** The trials a command line asks for. */
export interface TrialTerms {
  readonly trialCount: number;
  readonly seedIndex: number;
}

/** How sure the pressure at one level is. */
export interface LevelCheck {
  readonly name: string;
  readonly depthM: number;
  readonly gaugeKPa: number;
  /** Null where the column has no water at the level. */
  readonly budget: Budget | null;
  readonly improvements: readonly Improvement[];
  /** Null where no trials were asked for. */
  readonly drawn: DrawnPressure | null;
}

interface DrawnPressure {
  readonly meanKPa: number;
  readonly standardKPa: number;
  readonly lowKPa: number;
  readonly highKPa: number;
  readonly confirms: boolean;
}

/** At the survey's levels; where it has none, at the bottom of the cast, which stands at exactly its depth. */
export function levelChecks(
  survey: Survey,
  { prepared, solution }: SolvedCast,
  trials: TrialTerms | null,
): readonly LevelCheck[] {
  if (!solution) return [];
  const { cast } = prepared;
  const atBottom = survey.levels.length === 0;
  const { column, profile, levels } = solution;
  const accuracy = { ...column.basis.accuracy, ...(atBottom && { levelDepthM: 0 }) };
  const judged = { ...column, basis: { ...column.basis, accuracy } };
  const names = atBottom ? ["bottom"] : survey.levels.map(({ name }) => name);
  const depthsM = atBottom ? [column.bottomDepthM] : survey.levels.map(({ depthM }) => depthM);
  const uncertainty = uncertaintyAtDepths(judged, cast, depthsM);
  const drawn = trials && monteCarlo(judged, cast, { ...trials, depthsM });
  return names.map((name, i) => {
    const budget = budgetOf(uncertainty, i);
    return {
      name,
      depthM: depthsM[i]!,
      gaugeKPa: atBottom ? profile.gaugePressureKPa[profile.n - 1]! : levels.gaugePressureKPa[i]!,
      budget,
      improvements: budget ? whereToImprove(judged, cast, depthsM[i]!) : [],
      drawn:
        drawn && budget
          ? {
              meanKPa: drawn.meanKPa[i]!,
              standardKPa: drawn.standardKPa[i]!,
              lowKPa: drawn.lowKPa[i]!,
              highKPa: drawn.highKPa[i]!,
              confirms: confirmsFirstOrder(drawn.standardKPa[i]!, budget.combinedKPa),
            }
          : null,
    };
  });
}

/** The cross-check as the command writes it in JSON. */
export const levelChecksJson = (checks: readonly LevelCheck[], { trialCount, seedIndex }: TrialTerms) => ({
  trials: trialCount,
  seed: seedIndex,
  levels: checks.map(({ name, depthM, drawn }) => ({
    level: name,
    depth_m: depthM,
    mean_kPa: drawn?.meanKPa ?? null,
    standard_kPa: drawn?.standardKPa ?? null,
    low_kPa: drawn?.lowKPa ?? null,
    high_kPa: drawn?.highKPa ?? null,
    agrees_with_first_order: drawn?.confirms ?? null,
  })),
});
