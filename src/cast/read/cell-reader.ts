/** Reads the cells of a role, and keeps account of what could not be read or had to be filled in. */
import type { Issue } from "../../base/index.ts";
import { convertArray } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { isMissing, parseNumber } from "./parse-number.ts";
import { parsePosition } from "./parse-position.ts";
import type { RecognisedColumns, UsedColumn } from "./recognise-columns.ts";
import { MEASURED, type MeasuredRole, ROLE_WORDS } from "./roles.ts";
import { columnTexts } from "./rows.ts";
import { findSentinels } from "./sentinels.ts";
import type { Table } from "./table.ts";
import type { TimeForm } from "./time-form.ts";

/** A cell that should have held a number or a time and holds some other text. */
export interface BadCell {
  readonly code: "not-a-number" | "not-a-time";
  readonly message: string;
}

const isPlace = (role: MeasuredRole): boolean => role === "latitude" || role === "longitude";

const MONTH_FIRST: TimeForm = { order: "month-first", count: null };

const LONGEST_SHOWN = 60;

/** A cell in a message: as much as tells which it is. */
const cut = (text: string): string => (text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}...` : text);

const kindsOf = (texts: readonly string[]): string => [...new Set(texts)].join(", ");

const rowCount = (texts: readonly string[]): string => (texts.length === 1 ? "1 row" : `${texts.length} rows`);

export class CellReader {
  /** By row of the table. */
  readonly badCells = new Map<number, BadCell[]>();
  readonly issues: Issue[] = [];
  readonly #table: Table;
  readonly #columns: RecognisedColumns;
  readonly #onColumn: () => void;

  /** @param onColumn told whenever a column has been gone through */
  constructor(table: Table, columns: RecognisedColumns, onColumn: () => void = () => {}) {
    this.#table = table;
    this.#columns = columns;
    this.#onColumn = onColumn;
  }

  /** null where the file has no such column. */
  texts(role: ColumnRole): readonly string[] | null {
    const column = this.#columns.used[role];
    return column ? this.textsAt(column.columnIndex) : null;
  }

  textsAt(columnIndex: number): readonly string[] {
    const texts = columnTexts(this.#table.rows, columnIndex);
    this.#onColumn();
    return texts;
  }

  timeForm(role: "date" | "dateTime"): TimeForm {
    return this.#columns.used[role]?.time ?? MONTH_FIRST;
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
      const line = this.#table.rows.lineIndexAt(filledRows[0]!);
      const message = `${ROLE_WORDS[role]} is blank in ${filledRows.length} rows (first line ${line}); taken from the row above`;
      this.issues.push({ severity: "warning", code: "filled-down", message, line });
    }
    return filled;
  }

  /** In the unit of the program; NaN where nothing was measured. */
  numbers(role: MeasuredRole): Float64Array | null {
    const column = this.#columns.used[role];
    if (!column) return null;
    const values = this.#written(role, column);
    this.#onColumn();
    this.#dropSentinels(role, column.columnIndex, values);
    const { unit } = MEASURED[role];
    const from = column.unit ?? unit;
    const converted = from === unit ? values : convertArray(values, from, unit);
    // A header that says west or south means it only where the figures carry no sign of their own.
    const isSigned = column.isNegated && isPlace(role) && values.some((value) => value < 0);
    return column.isNegated && !isSigned ? converted.map((value) => -value) : converted;
  }

  /** The numbers as they stand in the file. */
  #written(role: MeasuredRole, column: UsedColumn): Float64Array {
    const { rows } = this.#table;
    const parse = isPlace(role) ? parsePosition : parseNumber;
    const values = new Float64Array(rows.length);
    for (let i = 0; i < rows.length; i++) {
      const text = rows.cellAt(i, column.columnIndex) ?? "";
      const value = parse(text, column.style);
      if (value === null) {
        const expected = isPlace(role) ? "degrees" : "a number or a blank";
        this.#reject(i, {
          code: "not-a-number",
          message: `${ROLE_WORDS[role]} "${cut(text)}" is not a number; expected ${expected}`,
        });
      }
      values[i] = value ?? Number.NaN;
    }
    return values;
  }

  #dropSentinels(role: MeasuredRole, columnIndex: number, values: Float64Array): void {
    const { found, kept } = findSentinels(values, role);
    if (found.size + kept.size === 0) return;
    const foundTexts: string[] = [];
    const keptTexts: string[] = [];
    for (let i = 0; i < values.length; i++) {
      const isFound = found.has(values[i]!);
      if (isFound || kept.has(values[i]!)) {
        (isFound ? foundTexts : keptTexts).push(this.#table.rows.cellAt(i, columnIndex)!);
      }
      if (isFound) values[i] = Number.NaN;
    }
    const words = ROLE_WORDS[role];
    if (foundTexts.length > 0) {
      this.#note("sentinel", `${words}: ${kindsOf(foundTexts)} is read as not measured, in ${rowCount(foundTexts)}`);
    }
    if (keptTexts.length > 0 && !isPlace(role)) {
      const why = "as it fits the rest of its column; if it means not measured, leave it blank";
      this.#note(
        "sentinel-kept",
        `${words}: ${kindsOf(keptTexts)} in ${rowCount(keptTexts)} is read as measured, ${why}`,
      );
    }
  }

  #note(code: string, message: string): void {
    this.issues.push({ severity: "note", code, message });
  }

  /** Blank where there is none, or where `read` cannot make sense of it. */
  times(
    role: ColumnRole,
    texts: readonly string[],
    read: (text: string, rowIndex: number) => string | null,
  ): readonly string[] {
    return texts.map((text, rowIndex) => {
      if (isMissing(text)) return "";
      const time = read(text, rowIndex);
      if (time !== null) return time;
      const message = `${ROLE_WORDS[role]} "${cut(text)}" is not understood; expected a form such as 2020-01-13 or 13:46`;
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
