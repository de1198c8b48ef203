/** A table, found in whatever kind of file, to casts. */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import type { Cast } from "../cast.ts";
import type { ColumnReading, FileReading, Question, ReadingAnswers } from "../reading.ts";
import { askAboutVertical } from "./ask-about-vertical.ts";
import { buildCast, named } from "./build-cast.ts";
import { checkColumns } from "./check-columns.ts";
import { checkPlaces } from "./check-places.ts";
import { type MeasuredRows, readMeasuredRows } from "./measured-rows.ts";
import { nameCasts } from "./name-casts.ts";
import { hasSalt, type RecognisedColumns, recogniseColumns } from "./recognise-columns.ts";
import { rowLengthIssues, withoutShiftedRows } from "./row-lengths.ts";
import { rowsBetween } from "./rows.ts";
import { type OnShare, untold, within } from "./share.ts";
import { type RowGroup, splitCasts } from "./split-casts.ts";
import type { Table, TableSource } from "./table.ts";

/** So many rows show what a file is like. */
const SHOWN_ROWS = 12;

const NO_ANSWERS: ReadingAnswers = { columns: [] };

const error = (code: string, message: string): Issue => ({ severity: "error", code, message });

const warning = (code: string, message: string): Issue => ({ severity: "warning", code, message });

/** One cast a group, named so that no two casts of the file share a name. */
function castsOf(rows: MeasuredRows, groups: readonly RowGroup[], fileName: string): readonly Cast[] {
  const unnamed = groups.map((group) => buildCast(rows, group, fileName));
  const parts = groups.map((group, i) => ({ ...group, clock: unnamed[i]!.time?.slice(11) || null }));
  const names = nameCasts(parts, fileName);
  return unnamed.map((cast, i) => named(cast, names[i]!));
}

const counted = (n: number): string => (n === 1 ? "one sample" : "no samples");

/** What is worth knowing about the text around the table. */
function tableIssues(table: Table): readonly Issue[] {
  const issues: Issue[] = [];
  if (table.header.cells.every((cell, i) => cell === `#${i + 1}`)) {
    const names = `#1 to #${table.header.cells.length}`;
    const message = `no row of headers in the file; its columns go by their places, ${names}; say what they are, as in depth=#1:m`;
    issues.push(warning("no-header", message));
  }
  const [first, last] = [table.preface[0], table.preface.at(-1)];
  if (first && last) {
    const where = first === last ? `line ${first.lineIndex}` : `lines ${first.lineIndex} to ${last.lineIndex}`;
    issues.push({
      severity: "note",
      code: "preface",
      message: `${where}: text above the headers, not read`,
      line: first.lineIndex,
    });
  }
  if (table.hasOpenQuote) {
    issues.push(
      warning("open-quote", "a quotation mark is opened and not closed; rows behind it may be lost; close it"),
    );
  }
  return issues;
}

function saltIssues(columns: RecognisedColumns): readonly Issue[] {
  if (hasSalt(columns)) return [];
  const message = "no salinity and no conductivity column is used; density will follow from temperature alone";
  return [{ severity: "note", code: "temperature-only", message }];
}

interface SortedCasts {
  readonly casts: readonly Cast[];
  readonly issues: readonly Issue[];
}

/** A cast needs two samples: others are left out, or are an error where there is nothing else. */
function withTwoSamples(all: readonly Cast[]): Outcome<SortedCasts> {
  const casts = all.filter((cast) => cast.samples.n >= 2);
  const left = all.filter((cast) => cast.samples.n < 2);
  const reasons = left.flatMap((cast) => cast.issues);
  if (casts.length === 0) {
    const found = left.length === 1 ? counted(left[0]!.samples.n) : `${left.length} casts of one sample or none`;
    return failed(error("too-few-samples", `${found} in the file; a cast needs at least two`), ...reasons);
  }
  const leftOut = left.map((c) =>
    warning("cast-left-out", `${c.name}: ${counted(c.samples.n)}, a cast needs two; left out`),
  );
  return succeeded({ casts, issues: [...leftOut, ...reasons] });
}

const asIssue = ({ code, message }: Question): Issue => warning(code, message);

/** Reads a table into casts, from whatever format it comes. Nothing is guessed without an issue that says so. */
export function readTable(
  source: TableSource,
  found: Table,
  answers: ReadingAnswers = NO_ANSWERS,
  onShare: OnShare = untold,
): Outcome<FileReading> {
  const lengths = rowLengthIssues(found);
  if (lengths.some((issue) => issue.severity === "error")) return failed(...lengths);
  const table = withoutShiftedRows(found);
  const columns = recogniseColumns(table, answers);
  const check = checkColumns(table, columns);
  if (check.errors.length > 0) return failed(...check.errors);
  const reading: FileReading = {
    ...source,
    delimiter: table.delimiter.name,
    decimalMark: columns.decimalMark,
    headerLineIndex: table.header.lineIndex,
    headers: table.header.cells,
    firstRows: rowsBetween(table.rows, 0, SHOWN_ROWS).map((row) => row.cells),
    columns: columns.readings,
    questions: [...columns.questions, ...check.questions],
    splitBy: "nothing yet",
    rowCount: found.rows.length,
    casts: [],
    issues: [...tableIssues(found), ...lengths, ...columns.issues, ...check.questions.map(asIssue)],
  };
  return check.isWaiting ? succeeded(reading) : withCasts(reading, table, columns, onShare);
}

/** The rows of a table whose columns are known. */
function withCasts(
  reading: FileReading,
  table: Table,
  columns: RecognisedColumns,
  onShare: OnShare,
): Outcome<FileReading> {
  const rows = readMeasuredRows(table, columns, within(onShare, 0, 0.8));
  const issues = [...reading.issues, ...saltIssues(columns), ...rows.issues, ...checkPlaces(rows)];
  const asked = askAboutVertical(table, columns, rows);
  if (asked !== null) return succeeded(waitingFor(asked, { ...reading, issues: [...issues, asIssue(asked)] }));
  const { groups, splitBy } = splitCasts(rows);
  const sorted = withTwoSamples(castsOf(rows, groups, reading.fileName));
  if (!sorted.ok) return sorted;
  onShare(1);
  const { casts, issues: castIssues } = sorted.value;
  const seen = rows.isAbsolute ? reading.columns.map(knownAbsolute) : reading.columns;
  return succeeded({ ...reading, columns: seen, splitBy, casts, issues: [...issues, ...castIssues] });
}

/** A column of pressure whose values have shown that the air is in it. */
const knownAbsolute = (column: ColumnReading): ColumnReading =>
  column.role === "seaPressure"
    ? {
        ...column,
        role: "absolutePressure",
        confidence: "likely",
        reason: "Named as pressure; its values show the weight of the air.",
      }
    : column;

/** A column that its values have put in doubt. */
function waitingFor(question: Question, reading: FileReading): FileReading {
  const columns = reading.columns.map(
    (column): ColumnReading =>
      column.columnIndex === question.columnIndex
        ? { ...column, role: null, unit: null, confidence: "doubtful", reason: `Not used: ${question.message}.` }
        : column,
  );
  return { ...reading, columns, questions: [...reading.questions, question] };
}
