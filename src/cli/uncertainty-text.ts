import type { LevelCheck } from "./level-checks.ts";

/** How many things to do are named at a level. */
const MOST_NAMED_COUNT = 2;

const kPa = (value: number): string => value.toFixed(3);
const percent = (share: number): string => `${Math.round(share * 100)} %`;

/** For people at a terminal: how sure the pressure at each level is, what makes it unsure, and what would help. */
export const uncertaintyText = (checks: readonly LevelCheck[]): string =>
  checks
    .flatMap(checkLines)
    .map((line) => `  ${line}\n`)
    .join("");

function checkLines({ name, gaugeKPa, budget, improvements, drawn }: LevelCheck): readonly string[] {
  if (!budget) return [`${name}: no water`];
  const helps = improvements
    .slice(0, MOST_NAMED_COUNT)
    .map(({ words, gainFrac }) => `${words} (-${percent(gainFrac)})`)
    .join(", ");
  return [
    `${name}: ${kPa(gaugeKPa)} +- ${kPa(budget.expandedKPa)} kPa (k = 2); ${budget.sentence}`,
    ...(helps === "" ? [] : [`  would help most: ${helps}`]),
    ...(drawn
      ? [
          `  Monte Carlo: mean ${kPa(drawn.meanKPa)} kPa, 95 % from ${kPa(drawn.lowKPa)} to ${kPa(drawn.highKPa)}, k = 1 ${kPa(drawn.standardKPa)}; ${drawn.confirms ? "agrees with" : "does not agree with"} the first-order ${kPa(budget.combinedKPa)}`,
        ]
      : []),
  ];
}
