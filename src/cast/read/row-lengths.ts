/** Rows that are longer or shorter than their header, and tables that are too wide to be one. */
import type { Issue } from "../../base/index.ts";
import { widthOf } from "./parse-table.ts";
import { chosenRows, type Rows } from "./rows.ts";
import type { Table } from "./table.ts";

/** No table of samples has more; what has was cut at the wrong sign, and would take very long to go through. */
const MOST_COLUMNS = 2000;

/** Whether a row holds something beyond the last column that has a name. */
function isWide({ rows, header }: Table, row: number): boolean {
  const width = header.cells.length;
  if (rows.cellAt(row, width) === undefined) return false;
  return rows
    .cellsAt(row)
    .slice(width)
    .some((cell) => cell !== "");
}

const isShort = ({ rows, header }: Table, row: number): boolean =>
  rows.cellAt(row, widthOf(header.cells) - 1) === undefined;

/** How many rows are not of the header's width, with the first of them; null when none is. */
function describe({ rows, header }: Table, odd: Rows, word: string): { found: string; line: number } | null {
  if (odd.length === 0) return null;
  const line = odd.lineIndexAt(0);
  const found = `${odd.length} of ${rows.length} rows are ${word} than the header (line ${line}: ${odd.cellsAt(0).length} cells, expected ${header.cells.length})`;
  return { found, line };
}

/** Rows wider than their header have their values under the wrong names, or a decimal comma among delimiting commas. */
function widthIssue(table: Table): Issue | null {
  const wide = chosenRows(table.rows, (row) => isWide(table, row));
  const described = describe(table, wide, "wider");
  if (described === null) return null;
  const { found, line } = described;
  const isMost = wide.length > table.rows.length / 2;
  return isMost
    ? {
        severity: "error",
        code: "rows-too-wide",
        line,
        message: `${found}; write decimals with a point, or delimit with semicolons`,
      }
    : { severity: "warning", code: "rows-too-wide", line, message: `${found}; check them, surplus cells are not read` };
}

/** Rows that end early: what is missing is blank, unless blanks part the cells, where nobody can say which is missing. */
function shortIssue(table: Table): Issue | null {
  const described = describe(
    table,
    chosenRows(table.rows, (row) => isShort(table, row)),
    "shorter",
  );
  if (described === null) return null;
  const { found, line } = described;
  const isLeftOut = table.delimiter.blanks !== undefined;
  const what = isLeftOut
    ? "left out, as blanks do not tell which cell is missing"
    : "their last cells are read as blank";
  return {
    severity: isLeftOut ? "warning" : "note",
    code: "rows-too-short",
    line,
    message: `${found}; ${what}`,
  };
}

/** Without the rows whose cells may stand under the wrong names. */
export function withoutShiftedRows(table: Table): Table {
  if (table.delimiter.blanks === undefined) return table;
  return { ...table, rows: chosenRows(table.rows, (row) => !isShort(table, row)) };
}

/** What the lengths of the rows say; only an error keeps them from being used. */
export function rowLengthIssues(table: Table): readonly Issue[] {
  const count = table.header.cells.length;
  if (count > MOST_COLUMNS) {
    const message = `the header has ${count} columns, expected at most ${MOST_COLUMNS}; take out what holds no samples`;
    return [{ severity: "error", code: "too-many-columns", message, line: table.header.lineIndex }];
  }
  return [widthIssue(table), shortIssue(table)].filter((issue) => issue !== null);
}
