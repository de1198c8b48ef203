/** A column that could have a role by its name, or because the user said so, before it is compared with others. */
import type { ColumnRole } from "../reading.ts";
import type { ResolvedAnswer } from "./answers.ts";
import { type DayCount, dayCountByName, dayCountOf } from "./day-count.ts";
import { type MarkEvidence, markEvidence } from "./number-style.ts";
import { isMissing } from "./parse-number.ts";
import { dateOrderOf, datePart, parseDateTime } from "./parse-time.ts";
import { readHeaderCell, roleByUnit, type WrittenUnit, writtenUnit } from "./read-header-cell.ts";
import { isMeasured, MEASURED } from "./roles.ts";
import type { Rows } from "./rows.ts";
import type { Table } from "./table.ts";

export interface Contender {
  readonly columnIndex: number;
  readonly header: string;
  /** How an answer of the user names it. */
  readonly name: string;
  readonly role: ColumnRole;
  /** Place of the name among those of its role; the smaller the better, and what the user said is best. */
  readonly rankIndex: number;
  readonly written: WrittenUnit | null;
  readonly unitSource: "its header" | "the units row";
  /** "days since 1950-01-01", where the header or the units row says so. */
  readonly count: DayCount | null;
  readonly countsWestOrSouth: boolean;
  /** The cells that hold something, as written. */
  readonly filled: readonly string[];
  /** How its numbers are written; null for texts and times. */
  readonly evidence: MarkEvidence | null;
  readonly answer: ResolvedAnswer | null;
}

/** So many cells tell what kind of thing a column holds. */
export const TELLING_CELLS = 200;

/** "time (seconds since 1970-01-01)" */
const BRACKETED = /[([]([^)\]]{1,80})[)\]]/;

/** "Longitude (W)", "Long_W", "Longitude West", "degrees_west". */
const WEST_OR_SOUTH = /(^|[^a-z])(w|s|west|south|degw|degs)([^a-z]|$)/i;

/** A column named for a date may hold times too, and the other way about: its cells decide. */
function roleByContent(role: ColumnRole, filled: readonly string[], named: DayCount | null): ColumnRole {
  if (role !== "date" && role !== "clock" && role !== "dateTime" && role !== "day") return role;
  if (named !== null) return "dateTime";
  const telling = filled.slice(0, TELLING_CELLS);
  const count = dayCountOf(telling);
  if (count !== null)
    return telling.every((cell) => /^\d+(\.0*)?$/.test(cell)) && count.stepMs > 1000 ? "date" : "dateTime";
  const { order } = dateOrderOf(telling.map(datePart));
  const moments = telling.map((cell) => parseDateTime(cell, order)).filter((moment) => moment !== null);
  if (moments.length === 0) return role;
  return moments.some((moment) => moment.clock !== null) ? "dateTime" : "date";
}

/** The role and the unit that a header, the format or the user gives to a column; null when none does. */
function namedRole(table: Table, columnIndex: number, answer: ResolvedAnswer | null) {
  const header = table.header.cells[columnIndex]!;
  const meaning = readHeaderCell(header);
  if (answer !== null && answer.role !== "unused") {
    const written = isMeasured(answer.role) && meaning?.role === answer.role ? meaning.written : null;
    return { role: answer.role, rankIndex: -2, written };
  }
  const ownRole = table.ownRoles?.get(header);
  if (ownRole !== undefined) return { role: ownRole, rankIndex: -1, written: null };
  return meaning;
}

/** Of a long record so many rows, evenly chosen, stand for all of them. */
const MOST_LOOKED_AT = 200_000;

function evenlyChosen(rows: Rows, columnIndex: number): readonly string[] {
  const step = Math.ceil(rows.length / MOST_LOOKED_AT);
  const texts: string[] = [];
  for (let row = 0; row < rows.length; row += step) texts.push(rows.cellAt(row, columnIndex) ?? "");
  return texts;
}

/** null when the header is no name that we use. */
export function contenderOf(
  table: Table,
  columnIndex: number,
  name: string,
  answer: ResolvedAnswer | null,
): Contender | null {
  const header = table.header.cells[columnIndex]!;
  const meaning = namedRole(table, columnIndex, answer);
  if (meaning === null || answer?.role === "unused") return null;
  const filled = evenlyChosen(table.rows, columnIndex).filter((cell) => !isMissing(cell));
  const unitText = table.unitTexts[columnIndex] ?? "";
  const count = dayCountByName(unitText) ?? dayCountByName(BRACKETED.exec(header)?.[1] ?? "");
  const role = answer
    ? meaning.role
    : roleByContent(roleByUnit(meaning.role, `${header} ${unitText}`, [unitText]), filled, count);
  const fromRow = isMeasured(role) ? writtenUnit([unitText], MEASURED[role].kind) : null;
  const isInHeader = meaning.written !== null && (meaning.written.unit !== null || fromRow === null);
  const isPlace = role === "latitude" || role === "longitude";
  return {
    columnIndex,
    header,
    name,
    role,
    rankIndex: meaning.rankIndex,
    written: isInHeader ? meaning.written : fromRow,
    unitSource: isInHeader ? "its header" : "the units row",
    count,
    countsWestOrSouth: isPlace && WEST_OR_SOUTH.test(`${header} ${unitText}`),
    filled,
    evidence: isMeasured(role) ? markEvidence(filled) : null,
    answer,
  };
}
