/** What becomes of columns once all others are known: some need one another, some questions have become idle. */
import type { ColumnRole, Question } from "../reading.ts";
import { choose } from "./ask.ts";
import { type Decision, doubt, leave } from "./decision.ts";

export const VERTICAL_ROLES: readonly ColumnRole[] = ["depth", "seaPressure", "absolutePressure", "elevation"];
export const SALT_ROLES: readonly ColumnRole[] = [
  "practicalSalinity",
  "absoluteSalinity",
  "conductivity",
  "specificConductance",
  "dissolvedSolids",
];
const CONDUCTING_ROLES: readonly ColumnRole[] = ["conductivity", "specificConductance", "dissolvedSolids"];

const usesAny = (decisions: readonly Decision[], roles: readonly ColumnRole[]): boolean =>
  decisions.some(({ reading }) => reading.role !== null && roles.includes(reading.role));

/** A question is only asked when the answer changes a result: not about a second depth, or conductance beside salinity. */
export function isWorthAsking(question: Question, decisions: readonly Decision[]): boolean {
  const roles = question.choices.map(({ answer }) => answer.role).filter((role) => role !== "unused");
  const areAll = (of: readonly ColumnRole[]): boolean => roles.every((role) => of.includes(role));
  if (areAll(["turbidity"])) return false;
  if (areAll(VERTICAL_ROLES)) return !usesAny(decisions, VERTICAL_ROLES);
  return !areAll(CONDUCTING_ROLES) || !usesAny(decisions, SALT_ROLES);
}

/** Heights above a datum are depths only against the height of the water surface. */
function settleElevation(decision: Decision, decisions: readonly Decision[], names: readonly string[]): Decision {
  const { reading } = decision;
  if (reading.role !== "elevation" || decision.used?.isAnswered || usesAny(decisions, ["surfaceElevation"]))
    return decision;
  if (usesAny(decisions, ["depth", "seaPressure", "absolutePressure"])) return decision;
  const name = names[reading.columnIndex]!;
  const why = "the file does not give the elevation of the water surface, from which depth counts";
  const message = `"${reading.header}": ${why}; say that the highest sample of a cast is at the surface, or add a column of water-surface elevation`;
  return doubt({ ...reading, name }, why, {
    code: "no-surface-elevation",
    message,
    choices: [
      choose(name, "elevation", decision.used!.unit, "the highest sample of each cast is at the water surface"),
    ],
  });
}

/** Year, month and day make a date together or not at all. */
function settleDateParts(decision: Decision, decisions: readonly Decision[]): Decision {
  const role = decision.reading.role;
  const parts: readonly ColumnRole[] = ["year", "month", "day"];
  const isPart = role !== null && parts.includes(role);
  if (!isPart || parts.every((part) => usesAny(decisions, [part]))) return decision;
  return leave(decision.reading, "year, month and day make a date only together");
}

export function settled(decisions: readonly Decision[], names: readonly string[]): readonly Decision[] {
  return decisions.map((decision) => settleDateParts(settleElevation(decision, decisions, names), decisions));
}
