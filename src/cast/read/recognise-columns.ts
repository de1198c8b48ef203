/** Which column is what, in which unit, and why: at most one column for each role, but for flags about other columns. */
import type { Issue } from "../../base/index.ts";
import type { ColumnReading, ColumnRole, Question, ReadingAnswers } from "../reading.ts";
import { answerNames, resolveAnswers } from "./answers.ts";
import { choose } from "./ask.ts";
import { COLUMN_NAMES } from "./column-names.ts";
import { type Contender, contenderOf } from "./contender.ts";
import { ASSUMED_COMMA, decide, passOver } from "./decide-column.ts";
import { type Decision, doubt, leave, type UsedColumn } from "./decision.ts";
import { tableMark } from "./number-style.ts";
import type { DecimalMark } from "./parse-number.ts";
import { type FlagColumn, flagColumnOf } from "./quality-flags.ts";
import { ROLE_WORDS } from "./roles.ts";
import type { Table } from "./table.ts";
import { whyUnused } from "./why-unused.ts";

export type { UsedColumn } from "./decision.ts";

export interface RecognisedColumns {
  readonly used: Readonly<Partial<Record<ColumnRole, UsedColumn>>>;
  /** Columns of flags about other columns. */
  readonly flags: readonly FlagColumn[];
  readonly readings: readonly ColumnReading[];
  readonly decimalMark: DecimalMark;
  readonly questions: readonly Question[];
  readonly issues: readonly Issue[];
}

/** Better first: one with values, the better name, a stated unit, the place in the file. */
const byMerit = (a: Contender, b: Contender): number =>
  Number(b.filled.length > 0) - Number(a.filled.length > 0) ||
  a.rankIndex - b.rankIndex ||
  Number(b.written !== null) - Number(a.written !== null) ||
  a.columnIndex - b.columnIndex;

function winnersOf(contenders: readonly Contender[]): ReadonlyMap<ColumnRole, Contender> {
  const winners = new Map<ColumnRole, Contender>();
  for (const role of Object.keys(COLUMN_NAMES) as ColumnRole[]) {
    const best = contenders.filter((contender) => contender.role === role).sort(byMerit)[0];
    if (best) winners.set(role, best);
  }
  return winners;
}

export const VERTICAL_ROLES: readonly ColumnRole[] = ["depth", "seaPressure", "absolutePressure", "elevation"];
/** Best first: each of them makes those behind it unneeded. */
const SALT_ROLES: readonly ColumnRole[] = [
  "practicalSalinity",
  "absoluteSalinity",
  "conductivity",
  "specificConductance",
  "dissolvedSolids",
];
const CONDUCTING_ROLES: readonly ColumnRole[] = ["conductivity", "specificConductance", "dissolvedSolids"];

const usesAny = (decisions: readonly Decision[], roles: readonly ColumnRole[]): boolean =>
  decisions.some(({ reading }) => reading.role !== null && roles.includes(reading.role));

export const hasSalt = ({ used }: Pick<RecognisedColumns, "used">): boolean =>
  SALT_ROLES.some((role) => used[role] !== undefined);

/** A question is only asked when the answer changes a result: not about a second depth, or conductance beside salinity. */
function isWorthAsking(question: Question, decisions: readonly Decision[]): boolean {
  const roles = question.choices.map(({ answer }) => answer.role).filter((role) => role !== "unused");
  const areAll = (of: readonly ColumnRole[]): boolean => roles.every((role) => of.includes(role));
  if (areAll(VERTICAL_ROLES)) return !usesAny(decisions, VERTICAL_ROLES);
  return !areAll(CONDUCTING_ROLES) || !usesAny(decisions, SALT_ROLES);
}

/** Two columns of one name that hold different values: only the user can say which it is. */
function whichTwin(winner: Contender, contenders: readonly Contender[]): Decision | null {
  const isTwin = ({ role, header, filled }: Contender): boolean =>
    role === winner.role && header === winner.header && filled.length > 0;
  const twins = winner.answer === null ? contenders.filter(isTwin) : [];
  const isSame = ({ filled }: Contender): boolean => filled.join("\n") === winner.filled.join("\n");
  if (twins.length < 2 || twins.every(isSame)) return null;
  const words = ROLE_WORDS[winner.role];
  const why = `${twins.length} columns of this name hold different values`;
  const unit = winner.written?.unit?.symbol ?? null;
  return doubt(winner, why, {
    code: "same-name-twice",
    message: `"${winner.header}": ${why}; say which is ${words}`,
    choices: twins.map(({ name, columnIndex }) =>
      choose(name, winner.role, unit, `column ${columnIndex + 1} is ${words}`),
    ),
  });
}

/** By role, where it has to be asked. */
function twinsOf(
  winners: ReadonlyMap<ColumnRole, Contender>,
  contenders: readonly Contender[],
): ReadonlyMap<ColumnRole, Decision> {
  return new Map(
    [...winners].flatMap(([role, winner]) => {
      const asked = whichTwin(winner, contenders);
      return asked === null ? [] : [[role, asked]];
    }),
  );
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
  return doubt(reading, why, {
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

function settled(decisions: readonly Decision[], names: readonly string[]): readonly Decision[] {
  return decisions.map((decision) => settleDateParts(settleElevation(decision, decisions, names), decisions));
}

/** One note of each kind is enough where it is about the way a whole table is written. */
function once(issues: readonly Issue[]): readonly Issue[] {
  return issues.filter((issue, i) => issue !== ASSUMED_COMMA || issues.indexOf(issue) === i);
}

/** Reads every header of a table. What must be asked leaves its column unused, with an issue and a question. */
export function recogniseColumns(table: Table, answers: ReadingAnswers): RecognisedColumns {
  const headers = table.header.cells;
  const names = answerNames(headers);
  const said = resolveAnswers(headers, answers);
  const all = headers.map((_, i) => contenderOf(table, i, names[i]!, said.byColumn.get(i) ?? null));
  const contenders = all.filter((contender) => contender !== null);
  const markOfTable = tableMark(contenders.flatMap((contender) => contender.evidence ?? []));
  const winners = winnersOf(contenders);
  const twins = twinsOf(winners, contenders);
  const flags: FlagColumn[] = [];
  const first = all.map((contender, columnIndex): Decision => {
    const place = { columnIndex, header: headers[columnIndex]! };
    if (said.byColumn.get(columnIndex)?.role === "unused") return leave(place, "as you said");
    const flag = flagColumnOf(table, columnIndex, contender);
    if (flag !== null) {
      if (flag.column) flags.push(flag.column);
      return flag.decision;
    }
    if (contender === null) return whyUnused(place, names[columnIndex]!);
    const winner = winners.get(contender.role)!;
    const asked = twins.get(contender.role);
    if (winner === contender) return asked ?? decide(contender, markOfTable);
    const isAsked = asked !== undefined && contender.header === winner.header;
    return isAsked
      ? leave(place, "which column of this name it is has to be said", "doubtful")
      : passOver(contender, winner);
  });
  const decisions = settled(first, names);
  const used: Partial<Record<ColumnRole, UsedColumn>> = {};
  for (const [i, decision] of decisions.entries()) {
    const role = decision.reading.role ?? all[i]?.role;
    if (decision.used !== null && role !== undefined && role !== "qualityFlag") used[role] = decision.used;
  }
  const questions = decisions.flatMap(({ question }) => question ?? []);
  return {
    used,
    flags,
    readings: decisions.map((decision) => decision.reading),
    decimalMark: used.depth?.style.decimalMark ?? used.temperature?.style.decimalMark ?? markOfTable ?? ".",
    questions: questions.filter((question) => isWorthAsking(question, decisions)),
    issues: [...said.issues, ...once(decisions.flatMap((decision) => decision.issues))],
  };
}
