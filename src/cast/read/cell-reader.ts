/** Reads the cells of a role, and keeps account of what could not be read or had to be filled in. */
import type { Issue } from "../../base/index.ts";
import { convert } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { isMissing, isSentinel, parseNumber } from "./parse-number.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import { MEASURED, type MeasuredRole, ROLE_WORDS } from "./roles.ts";
import type { Table } from "./table.ts";

/** A cell that should have held a number or a time and holds some other text. */
export interface BadCell {
  readonly code: "not-a-number" | "not-a-time";
  readonly message: string;
}

export class CellReader {
  /** By row of the table. */
  readonly badCells = new Map<number, BadCell[]>();
  readonly issues: Issue[] = [];
  readonly #table: Table;
  readonly #columns: RecognisedColumns;

  constructor(table: Table, columns: RecognisedColumns) {
    this.#table = table;
    this.#columns = columns;
  }

  /** null where the file has no such column. */
  texts(role: ColumnRole): readonly string[] | null {
    const column = this.#columns.used[role];
    return column ? this.#table.rows.map((row) => row.cells[column.columnIndex] ?? "") : null;
  }

  /** The header and the unit of a column, as written; empty where there is no such column. */
  nameOf(role: ColumnRole): string {
    const column = this.#columns.used[role];
    if (!column) return "";
    return `${this.#table.header.cells[column.columnIndex]} ${this.#table.unitTexts[column.columnIndex]}`;
  }

  /** As `texts`; a blank takes the text above it, as where a sheet writes the station once and leaves it out below. */
  textsFilledDown(role: ColumnRole): readonly string[] | null {
    const texts = this.texts(role);
    if (texts === null) return null;
    const filledRows: number[] = [];
    let above = "";
    const filled = texts.map((text, rowIndex) => {
      if (!isMissing(text)) above = text;
      else if (above !== "") filledRows.push(rowIndex);
      return above;
    });
    if (filledRows.length > 0) {
      const line = this.#table.rows[filledRows[0]!]!.lineIndex;
      const message = `${ROLE_WORDS[role]} is blank in ${filledRows.length} rows (first line ${line}); taken from the row above`;
      this.issues.push({ severity: "warning", code: "filled-down", message, line });
    }
    return filled;
  }

  numbers(role: MeasuredRole): Float64Array | null {
    const column = this.#columns.used[role];
    const texts = this.texts(role);
    if (!column || texts === null) return null;
    const from = column.unit ?? MEASURED[role].unit;
    const sentinels: string[] = [];
    const values = Float64Array.from(texts, (text, rowIndex) => {
      if (isSentinel(role, text)) {
        sentinels.push(text);
        return Number.NaN;
      }
      const value = parseNumber(text, this.#columns.decimalMark);
      if (value !== null) return convert(value, from, MEASURED[role].unit);
      const message = `${ROLE_WORDS[role]} "${text}" is not a number; expected a number or a blank`;
      this.#reject(rowIndex, { code: "not-a-number", message });
      return Number.NaN;
    });
    if (sentinels.length > 0) {
      const kinds = [...new Set(sentinels)].join(", ");
      const message = `${ROLE_WORDS[role]}: ${kinds} is read as not measured, in ${sentinels.length} rows`;
      this.issues.push({ severity: "note", code: "sentinel", message });
    }
    return values;
  }

  /** Blank where there is none, or where `read` cannot make sense of it. */
  times(role: ColumnRole, texts: readonly string[], read: (text: string) => string | null): readonly string[] {
    return texts.map((text, rowIndex) => {
      if (isMissing(text)) return "";
      const time = read(text);
      if (time !== null) return time;
      const message = `${ROLE_WORDS[role]} "${text}" is not understood; expected a form such as 2020-01-13 or 13:46`;
      this.#reject(rowIndex, { code: "not-a-time", message });
      return "";
    });
  }

  #reject(rowIndex: number, cell: BadCell): void {
    const found = this.badCells.get(rowIndex);
    if (found) found.push(cell);
    else this.badCells.set(rowIndex, [cell]);
  }
}
