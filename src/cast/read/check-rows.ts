/** What the rows of a table must be like, taken together, before casts can be made of them. */
import { min } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import type { Question } from "../reading.ts";
import { answerNames } from "./answers.ts";
import { choose, chooseForm, type Doubt, questionOf } from "./ask.ts";
import type { MeasuredRows } from "./measured-rows.ts";
import { widthOf } from "./parse-table.ts";
import type { RecognisedColumns, UsedColumn } from "./recognise-columns.ts";
import { chosenRows, type Rows } from "./rows.ts";
import type { Table } from "./table.ts";
import { couldHoldAir } from "./vertical.ts";

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

/** A column in use, as a question names it. */
function asked(table: Table, { columnIndex }: UsedColumn, doubtOf: (name: string) => Doubt): Question {
  const name = answerNames(table.header.cells)[columnIndex]!;
  return questionOf(columnIndex, name, doubtOf(name));
}

/** Depths that are mostly negative count upwards, or have a wrong sign. */
function upsideDown(table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null {
  const column = columns.used.depth;
  const depths = [...(rows.depthM ?? [])].filter((depth) => !Number.isNaN(depth));
  const negativeCount = depths.filter((depth) => depth < 0).length;
  if (!column || negativeCount <= depths.length / 2) return null;
  const unit = column.unit ?? "m";
  return asked(table, column, (name) => ({
    code: "depth-upside-down",
    message: `depth is negative in ${negativeCount} of ${depths.length} rows, down to ${min(depths)} m; depth counts positive down: change the sign, or say that the column counts upward`,
    choices: [chooseForm(name, "depth", `${unit} upward`, `depth in ${unit}, counted upward: its sign is changed`)],
  }));
}

/** Pressure that starts at the weight of the air, without saying whether the air is in it. */
function airInPressure(table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null {
  const column = columns.used.seaPressure;
  const pressures = [...(rows.seaPressureDbar ?? [])].filter((pressure) => !Number.isNaN(pressure));
  if (!column || rows.depthM !== null || rows.isGaugePressure || pressures.length === 0) return null;
  const least = min(pressures);
  if (!couldHoldAir(least)) return null;
  const header = table.header.cells[column.columnIndex]!;
  return asked(table, column, (name) => ({
    code: "pressure-may-be-absolute",
    message: `"${header}" starts at ${least.toFixed(2)} dbar, about the weight of the air or a little more; expected 0 at the surface; say whether it is gauge or absolute`,
    choices: [
      choose(name, "absolutePressure", column.unit, "absolute: it holds the weight of the air"),
      choose(name, "seaPressure", column.unit, `gauge: the first sample lies ${least.toFixed(1)} dbar deep`),
    ],
  }));
}

/** What the values of the vertical put in doubt, so that no cast can be made of them yet. */
export const askAboutVertical = (table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null =>
  upsideDown(table, columns, rows) ?? airInPressure(table, columns, rows);

function offTheEarthIssue(words: string, degrees: Float64Array | null, largestDeg: number): Issue | null {
  const found = degrees?.find((value) => Math.abs(value) > largestDeg);
  if (found === undefined) return null;
  const message = `${words} ${found} is outside -${largestDeg} to ${largestDeg} degrees; not used; is it in degrees and decimals?`;
  return { severity: "warning", code: "off-the-earth", message };
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

/** What the values say, taken together. */
export function checkRows(rows: MeasuredRows): readonly Issue[] {
  const issues = [
    offTheEarthIssue("latitude", rows.latitudeDeg, 90),
    offTheEarthIssue("longitude", rows.longitudeDeg, 180),
  ];
  return issues.filter((issue) => issue !== null);
}
