export { type Accuracy, type AccuracyReason, accuracyReasons, defaultAccuracy } from "./accuracy.ts";
export {
  type Budget,
  type BudgetShare,
  CONTRIBUTORS,
  type Contributor,
  type GapBounds,
  type Improvement,
  type MonteCarlo,
  type SamplingError,
  type Uncertainty,
} from "./uncertainty.ts";
