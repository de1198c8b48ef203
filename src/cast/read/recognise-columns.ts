/** Which column is what, in which unit, and why: at most one column for each role, but for flags about other columns. */
import type { Issue } from "../../base/index.ts";
import type { ColumnReading, ColumnRole, Question, ReadingAnswers } from "../reading.ts";
import { answerNames, resolveAnswers } from "./answers.ts";
import { COLUMN_NAMES } from "./column-names.ts";
import { type Contender, contenderOf } from "./contender.ts";
import { decide, passOver } from "./decide-column.ts";
import { type Decision, leave, type UsedColumn } from "./decision.ts";
import { tableMark } from "./number-style.ts";
import type { DecimalMark } from "./parse-number.ts";
import { type FlagColumn, flagColumnOf } from "./quality-flags.ts";
import { askAboutTwins } from "./same-name.ts";
import { isWorthAsking, SALT_ROLES, settled } from "./settle-columns.ts";
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

export const hasSalt = ({ used }: Pick<RecognisedColumns, "used">): boolean =>
  SALT_ROLES.some((role) => used[role] !== undefined);

/** Reads every header of a table. What must be asked leaves its column unused, with an issue and a question. */
export function recogniseColumns(table: Table, answers: ReadingAnswers): RecognisedColumns {
  const headers = table.header.cells;
  const names = answerNames(headers);
  const said = resolveAnswers(headers, answers);
  const all = headers.map((_, i) => contenderOf(table, i, names[i]!, said.byColumn.get(i) ?? null));
  const contenders = all.filter((contender) => contender !== null);
  const markOfTable = tableMark(contenders.flatMap((contender) => contender.evidence ?? []));
  const winners = winnersOf(contenders);
  const twins = askAboutTwins(winners, contenders);
  const flags: FlagColumn[] = [];
  const first = all.map((contender, columnIndex): Decision => {
    const place = { columnIndex, header: headers[columnIndex]!, name: names[columnIndex]! };
    if (said.byColumn.get(columnIndex)?.role === "unused") return leave(place, "as you said");
    const flag = flagColumnOf(table, columnIndex, contender);
    if (flag !== null) {
      if (flag.column) flags.push(flag.column);
      return flag.decision;
    }
    if (contender === null) return whyUnused(place);
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
    issues: [
      ...said.issues, // What is said of the way the whole table is written is said once.
      ...new Set(decisions.flatMap((decision) => decision.issues)),
    ],
  };
}
