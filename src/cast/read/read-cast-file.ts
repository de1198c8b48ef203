/** One delimited text file, bytes as they came from disk, to casts. */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import type { Cast } from "../cast.ts";
import type { FileReading } from "../reading.ts";
import { buildCast, named } from "./build-cast.ts";
import { checkColumns } from "./check-columns.ts";
import { checkRows } from "./check-rows.ts";
import { type DecodedText, decodeText } from "./decode-text.ts";
import { unreadFormat } from "./file-format.ts";
import { type FoundTable, findTable } from "./find-header.ts";
import { type MeasuredRows, readMeasuredRows } from "./measured-rows.ts";
import { nameCasts } from "./name-casts.ts";
import { type RecognisedColumns, recogniseColumns } from "./recognise-columns.ts";
import { type RowGroup, splitCasts } from "./split-casts.ts";

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
function tableIssues(table: FoundTable): readonly Issue[] {
  const issues: Issue[] = [];
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

function saltIssues({ used }: RecognisedColumns): readonly Issue[] {
  if (used.practicalSalinity || used.conductivity || used.specificConductance) return [];
  const message = "no salinity and no conductivity column is used; density will follow from temperature alone";
  return [{ severity: "note", code: "temperature-only", message }];
}

/** The text of a file, or why it has none. */
function readText(bytes: Uint8Array): Outcome<DecodedText> {
  const format = unreadFormat(bytes);
  if (format !== null) {
    return failed(error("format-not-read", `the file is ${format}, which is not read yet; export the table as CSV`));
  }
  const decoded = decodeText(bytes);
  if (decoded === null) return failed(error("not-text", "the file is not text; expected a table such as CSV"));
  if (decoded.text.trim() === "") return failed(error("empty-file", "the file is empty; expected a table of samples"));
  return succeeded(decoded);
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

/**
 * Reads a file into casts. Every decision is in the result: encoding, delimiter, what each column is and why, what tells
 * casts apart, rows left out. Nothing is guessed without an issue that says so; a file that cannot be read gives errors.
 */
export function readCastFile(fileName: string, bytes: Uint8Array): Outcome<FileReading> {
  const decoded = readText(bytes);
  if (!decoded.ok) return decoded;
  const table = findTable(decoded.value.text);
  if (table === null) {
    const message = 'no table in the file; expected a row of headers such as "Depth (m)" above rows of numbers';
    return failed(error("no-table", message));
  }
  const columns = recogniseColumns(table);
  const errors = checkColumns(table, columns);
  if (errors.length > 0) return failed(...errors);
  const rows = readMeasuredRows(table, columns);
  const rowIssues = checkRows(table, rows);
  if (rowIssues.some((issue) => issue.severity === "error")) return failed(...rowIssues);
  const { groups, splitBy } = splitCasts(rows);
  const sorted = withTwoSamples(castsOf(rows, groups, fileName));
  if (!sorted.ok) return sorted;
  return succeeded({
    fileName,
    encoding: decoded.value.encoding,
    delimiter: table.delimiter.name,
    decimalMark: columns.decimalMark,
    headerLineIndex: table.header.lineIndex,
    columns: columns.readings,
    splitBy,
    rowCount: table.rows.length,
    casts: sorted.value.casts,
    issues: [
      ...tableIssues(table),
      ...columns.issues,
      ...saltIssues(columns),
      ...rows.issues,
      ...rowIssues,
      ...sorted.value.issues,
    ],
  });
}
