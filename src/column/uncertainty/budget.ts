import { measuresConductivity } from "./sensitivities.ts";
import { type Budget, type BudgetShare, CONTRIBUTORS, type Contributor, type Uncertainty } from "./uncertainty.ts";

/** Contributors whose words are the same whatever the cast. */
const WORDS: Readonly<Record<Exclude<Contributor, "surface-gap" | "bed-gap" | SalinityTerm>, string>> = {
  "temperature-random": "temperature noise",
  "temperature-systematic": "temperature accuracy",
  "sample-depth-random": "depths of the single samples",
  "sample-depth-systematic": "the depth common to all samples",
  "depth-scale": "scale of the samples' depths",
  "level-depth": "depth of the level",
  sampling: "the water between the samples",
  gravity: "gravity",
  "equation-of-state": "the equation of state",
  composition: "the composition of the salt",
  altitude: "the altitude",
};

type SalinityTerm = "salinity-random" | "salinity-systematic";

function wordsFor(name: Contributor, { gaps, salinityFrom }: Uncertainty, rowIndex: number): string {
  const salinity = measuresConductivity(salinityFrom) ? "conductivity" : "salinity";
  switch (name) {
    case "surface-gap":
      return `the unsampled top ${gaps.surfaceGapM[rowIndex]!.toFixed(1)} m`;
    case "bed-gap":
      return `the unsampled bottom ${gaps.bedGapM[rowIndex]!.toFixed(1)} m`;
    case "salinity-random":
      return `${salinity} noise`;
    case "salinity-systematic":
      return salinityFrom === "basis" ? "the salinity that was not measured" : `${salinity} accuracy`;
    default:
      return WORDS[name];
  }
}

/** A contributor below this share is not worth a word. */
const LEAST_SAID_FRAC = 0.01;
const MOST_SAID_COUNT = 3;

function sentenceOf(shares: readonly BudgetShare[]): string {
  const percent = ({ shareFrac }: BudgetShare): string => `${Math.round(shareFrac * 100)} %`;
  const [first, ...others] = shares.filter(({ shareFrac }) => shareFrac >= LEAST_SAID_FRAC).slice(0, MOST_SAID_COUNT);
  if (!first) return "nothing is uncertain here";
  const rest = others.map((share) => `${share.words} ${percent(share)}`);
  return [`${first.words} makes ${percent(first)} of it`, ...(rest.length > 0 ? [rest.join(", ")] : [])].join("; ");
}

/**
 * What one row's uncertainty is made of, by share of the variance, and the largest in a sentence.
 * @param rowIndex of a depth of the uncertainty; null where the column has no water there
 */
export function budgetOf(uncertainty: Uncertainty, rowIndex: number): Budget | null {
  const combinedKPa = uncertainty.combinedKPa[rowIndex] ?? Number.NaN;
  if (Number.isNaN(combinedKPa)) return null;
  const shares = CONTRIBUTORS.map((name): BudgetShare => {
    const standardKPa = uncertainty.contributionKPa[name][rowIndex]!;
    return {
      name,
      words: wordsFor(name, uncertainty, rowIndex),
      standardKPa,
      shareFrac: (standardKPa / combinedKPa) ** 2,
    };
  })
    .filter(({ standardKPa }) => standardKPa > 0)
    .sort((a, b) => b.standardKPa - a.standardKPa);
  return {
    depthM: uncertainty.depthM[rowIndex]!,
    combinedKPa,
    expandedKPa: uncertainty.expandedKPa[rowIndex]!,
    shares,
    sentence: sentenceOf(shares),
  };
}
