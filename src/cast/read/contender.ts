/** A column that could have a role by its name, before it is compared with others of the same role. */
import type { ColumnRole } from "../reading.ts";
import { isMissing } from "./parse-number.ts";
import { dateOrderOf, datePart, parseDateTime } from "./parse-time.ts";
import { readHeaderCell, type WrittenUnit, writtenUnit } from "./read-header-cell.ts";
import { isMeasured, MEASURED } from "./roles.ts";
import type { Table } from "./table.ts";

export interface Contender {
  readonly columnIndex: number;
  readonly header: string;
  readonly role: ColumnRole;
  /** Place of the name among those of its role; the smaller the better. */
  readonly rankIndex: number;
  readonly written: WrittenUnit | null;
  readonly unitSource: "its header" | "the units row";
  /** The cells that hold something, as written. */
  readonly filled: readonly string[];
}

/** So many cells tell what kind of thing a column holds. */
export const TELLING_CELLS = 200;

/** A column named for a date may hold times too, and the other way about: its cells decide. */
function roleByContent(role: ColumnRole, filled: readonly string[]): ColumnRole {
  if (role !== "date" && role !== "clock" && role !== "dateTime") return role;
  const telling = filled.slice(0, TELLING_CELLS);
  const { order } = dateOrderOf(telling.map(datePart));
  const moments = telling.map((cell) => parseDateTime(cell, order)).filter((moment) => moment !== null);
  if (moments.length === 0) return role;
  return moments.some((moment) => moment.clock !== null) ? "dateTime" : "date";
}

/** null when the header is no name that we use. */
export function contenderOf(table: Table, columnIndex: number): Contender | null {
  const header = table.header.cells[columnIndex]!;
  const meaning = readHeaderCell(header);
  if (meaning === null) return null;
  const filled = table.rows.map((row) => row.cells[columnIndex] ?? "").filter((cell) => !isMissing(cell));
  const role = roleByContent(meaning.role, filled);
  const fromRow = isMeasured(role) ? writtenUnit([table.unitTexts[columnIndex]!], MEASURED[role].kind) : null;
  const isInHeader = meaning.written !== null && (meaning.written.unit !== null || fromRow === null);
  return {
    columnIndex,
    header,
    role,
    rankIndex: meaning.rankIndex,
    written: isInHeader ? meaning.written : fromRow,
    unitSource: isInHeader ? "its header" : "the units row",
    filled,
  };
}
