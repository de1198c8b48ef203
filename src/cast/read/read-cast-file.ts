/** One delimited text file, bytes as they came from disk, to casts. */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import type { Cast } from "../cast.ts";
import type { FileReading } from "../reading.ts";
import { buildCast, named } from "./build-cast.ts";
import { checkColumns } from "./check-columns.ts";
import { decodeText } from "./decode-text.ts";
import { unreadFormat } from "./file-format.ts";
import { findTable } from "./find-header.ts";
import { type MeasuredRows, readMeasuredRows } from "./measured-rows.ts";
import { nameCasts } from "./name-casts.ts";
import { recogniseColumns } from "./recognise-columns.ts";
import { type RowGroup, splitCasts } from "./split-casts.ts";

const error = (code: string, message: string): Issue => ({ severity: "error", code, message });

const warning = (code: string, message: string): Issue => ({ severity: "warning", code, message });

function dateIssues(rows: MeasuredRows): readonly Issue[] {
  if (!rows.dateOrder.assumed) return [];
  const message =
    "dates such as 3/4/20 are read month first, because no date in the file tells; write them as 2020-03-04";
  return [warning("assumed-date-order", message)];
}

/** One cast a group, named so that no two casts of the file share a name. */
function castsOf(rows: MeasuredRows, groups: readonly RowGroup[], fileName: string): readonly Cast[] {
  const unnamed = groups.map((group) => buildCast(rows, group, fileName));
  const parts = groups.map((group, i) => ({ ...group, clock: unnamed[i]!.time?.slice(11) || null }));
  const names = nameCasts(parts, fileName);
  return unnamed.map((cast, i) => named(cast, names[i]!));
}

const counted = (n: number): string => (n === 1 ? "one sample" : "no samples");

/**
 * Reads a file into casts. Every decision is in the result: encoding, delimiter, what each column is and why, what tells
 * casts apart, rows left out. Nothing is guessed without an issue that says so; a file that cannot be read gives errors.
 */
export function readCastFile(fileName: string, bytes: Uint8Array): Outcome<FileReading> {
  if (bytes.length === 0) return failed(error("empty-file", "the file is empty; expected a table of samples"));
  const format = unreadFormat(bytes);
  if (format !== null) {
    return failed(error("format-not-read", `the file is ${format}, which is not read yet; export the table as CSV`));
  }
  const decoded = decodeText(bytes);
  if (decoded === null) return failed(error("not-text", "the file is not text; expected a table such as CSV"));
  if (decoded.text.trim() === "") return failed(error("empty-file", "the file is blank; expected a table of samples"));
  const table = findTable(decoded.text);
  if (table === null) {
    return failed(
      error("no-table", 'no table in the file; expected a row of headers such as "Depth (m)" above rows of numbers'),
    );
  }
  const columns = recogniseColumns(table);
  const errors = checkColumns(table, columns);
  if (errors.length > 0) return failed(...errors);
  const rows = readMeasuredRows(table, columns);
  const { groups, splitBy } = splitCasts(rows);
  const all = castsOf(rows, groups, fileName);
  const casts = all.filter((cast) => cast.samples.n >= 2);
  const left = all.filter((cast) => cast.samples.n < 2);
  if (casts.length === 0) {
    const found = left.length === 1 ? counted(left[0]!.samples.n) : "no cast of two samples or more";
    return failed(
      error("too-few-samples", `${found} in the file; a cast needs at least two`),
      ...left.flatMap((c) => c.issues),
    );
  }
  const leftOut = left.map((c) =>
    warning("cast-left-out", `${c.name}: ${counted(c.samples.n)}, a cast needs two; left out`),
  );
  return succeeded({
    fileName,
    encoding: decoded.encoding,
    delimiter: table.delimiter.name,
    decimalMark: columns.decimalMark,
    headerLineIndex: table.header.lineIndex,
    columns: columns.readings,
    splitBy,
    rowCount: table.rows.length,
    casts,
    issues: [...columns.issues, ...dateIssues(rows), ...leftOut],
  });
}
