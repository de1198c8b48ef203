/** What the user has said about columns, taken to the columns of one table. */
import type { Issue } from "../../base/index.ts";
import { type UnitSymbol, unitByName } from "../../units/index.ts";
import type { ColumnAnswer, ColumnRole, ReadingAnswers } from "../reading.ts";
import { dayCountByName } from "./day-count.ts";
import type { NumberStyle } from "./parse-number.ts";
import { isMeasured, MEASURED, ROLE_WORDS } from "./roles.ts";
import type { TimeForm } from "./time-form.ts";

/** How the cells of a column are to be read, as far as the user has said it. */
export interface AnsweredForm {
  readonly unit: UnitSymbol | null;
  readonly style: NumberStyle | null;
  /** Counted upwards from the water surface, so that below it the figures are negative. */
  readonly isNegated: boolean;
  readonly time: TimeForm | null;
}

export interface ResolvedAnswer extends AnsweredForm {
  readonly role: ColumnRole | "unused";
  /** As the user wrote it. */
  readonly unitText: string | null;
}

const STYLES: ReadonlyMap<string, NumberStyle> = new Map([
  ["decimal-comma", { decimalMark: ",", groupMark: "." }],
  ["decimal-point", { decimalMark: ".", groupMark: "," }],
]);

const UPWARD = "upward";

const NO_FORM: AnsweredForm = { unit: null, style: null, isNegated: false, time: null };

function timeForm(text: string): TimeForm | null {
  if (text === "day-first" || text === "month-first") return { order: text, count: null };
  const count = dayCountByName(text);
  return count && { order: null, count };
}

/** What a unit text says for a role: "ft", "mS/cm decimal-comma", "m upward", "day-first"; null when it says nothing known. */
export function formByText(role: ColumnRole, text: string): AnsweredForm | null {
  if (role === "date" || role === "dateTime") {
    const time = timeForm(text.trim());
    return time && { ...NO_FORM, time };
  }
  if (!isMeasured(role)) return null;
  const words = text.trim().split(/\s+/);
  const style = words.map((word) => STYLES.get(word)).find((found) => found !== undefined) ?? null;
  const isNegated = role === "depth" && words.includes(UPWARD);
  const unitText = words.filter((word) => !STYLES.has(word) && !(isNegated && word === UPWARD)).join(" ");
  if (unitText === "") return { ...NO_FORM, style, isNegated };
  const unit = unitByName(unitText, MEASURED[role].kind);
  return unit && { ...NO_FORM, unit: unit.symbol, style, isNegated };
}

/** How answers name columns: by header where no other has the same, "Temp#2" where one has, "#3" where there is none. */
export function answerNames(headers: readonly string[]): readonly string[] {
  const counts = new Map<string, number>();
  for (const header of headers) counts.set(header, (counts.get(header) ?? 0) + 1);
  const seen = new Map<string, number>();
  return headers.map((header, i) => {
    if (header === "") return `#${i + 1}`;
    const place = (seen.get(header) ?? 0) + 1;
    seen.set(header, place);
    return counts.get(header) === 1 ? header : `${header}#${place}`;
  });
}

/** The column that a name means, or -1. */
function columnOf(headers: readonly string[], names: readonly string[], name: string): number {
  const wanted = name.trim();
  const exact = [names.indexOf(wanted), headers.indexOf(wanted)].find((i) => i >= 0);
  if (exact !== undefined) return exact;
  const position = /^#(\d+)$/.exec(wanted);
  if (position !== null) return Number(position[1]) <= headers.length ? Number(position[1]) - 1 : -1;
  return names.findIndex((other) => other.toLowerCase() === wanted.toLowerCase());
}

export interface ResolvedAnswers {
  readonly byColumn: ReadonlyMap<number, ResolvedAnswer>;
  readonly issues: readonly Issue[];
}

const refused = (message: string): Issue => ({ severity: "warning", code: "answer-not-used", message });

function resolve({ role, unit }: ColumnAnswer): ResolvedAnswer | string {
  if (role === "unused" || unit === null) return { ...NO_FORM, role, unitText: unit };
  const form = formByText(role, unit);
  return form ? { ...form, role, unitText: unit } : `"${unit}" is no unit of ${ROLE_WORDS[role]} known here`;
}

/** Where two answers name one column, the later one stands. */
export function resolveAnswers(headers: readonly string[], answers: ReadingAnswers): ResolvedAnswers {
  const byColumn = new Map<number, ResolvedAnswer>();
  const issues: Issue[] = [];
  const names = answerNames(headers);
  for (const answer of answers.columns) {
    const columnIndex = columnOf(headers, names, answer.header);
    const resolved = resolve(answer);
    if (columnIndex < 0)
      issues.push(refused(`no column is named "${answer.header}"; what was said about it is not used`));
    else if (typeof resolved === "string")
      issues.push(refused(`"${answer.header}": ${resolved}; what was said is not used`));
    else byColumn.set(columnIndex, resolved);
  }
  return { byColumn, issues };
}
