export {
  type Accuracy,
  type AccuracyReason,
  accuracyReasons,
  type Basis,
  type Budget,
  type BudgetShare,
  budgetOf,
  type Column,
  type Contributor,
  confirmsFirstOrder,
  type DepthMade,
  defaultAccuracy,
  defaultBasis,
  departureUncertaintyKPa,
  describeAtDepths,
  type Improvement,
  type MonteCarlo,
  monteCarlo,
  type Origin,
  type Profile,
  type ReferenceDensity,
  type ShortcutCost,
  type Stratification,
  shortcutCosts,
  stratificationOf,
  type Uncertainty,
  uncertaintyAtDepths,
  uncertaintyOf,
  whereToImprove,
} from "../column/index.ts";
export type { Level, LevelId } from "../design/index.ts";
export {
  defaultPreparation,
  type FlagEdit,
  type Preparation,
  type PreparedCast,
  QUALITY_FLAG,
  type WaterKind,
} from "../quality/index.ts";
export { type WaterChoice, waterLabel } from "../water/index.ts";
export { addCasts } from "./add-casts.ts";
export { addFlagEdits, removeFlagEdits, type SampleRange } from "./flag-edits.ts";
export { type History, redo, remember, startHistory, undo } from "./history.ts";
export { type Solution, type SolvedCast, solve, solveCast, solveLevels } from "./solve.ts";
export { emptySurvey, type Survey } from "./survey.ts";
export { type WaterPoints, type WaterProperties, waterAtPoints } from "./water-points.ts";
