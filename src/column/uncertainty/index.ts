export { type Accuracy, type AccuracyReason, accuracyReasons, defaultAccuracy } from "./accuracy.ts";
export { budgetOf } from "./budget.ts";
export { departureUncertaintyKPa } from "./departure-uncertainty.ts";
export { confirmsFirstOrder, type MonteCarloOptions, monteCarlo } from "./monte-carlo.ts";
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
export { uncertaintyAtDepths, uncertaintyOf } from "./uncertainty-of.ts";
export { whereToImprove } from "./where-to-improve.ts";
