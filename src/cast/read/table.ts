/** A table as found in a file, whatever the format: a row of headers, their units, and rows of cells as texts. */
import type { ColumnRole } from "../reading.ts";
import type { Delimiter, Row } from "./parse-table.ts";
import type { Rows } from "./rows.ts";

export interface Table {
  readonly delimiter: Delimiter;
  readonly header: Row;
  /** One text a column; all empty where the file gives no units outside the headers. */
  readonly unitTexts: readonly string[];
  /** Below the header; a cell that is not there counts as blank. */
  readonly rows: Rows;
  /** Rows above the header that are no comments. */
  readonly preface: readonly Row[];
  readonly hasOpenQuote: boolean;
  /** What a format itself says a column is, by its header; a name that is not here is read as in any other file. */
  readonly ownRoles?: ReadonlyMap<string, ColumnRole>;
}

/** Where a table was found, as it is told to the user. */
export interface TableSource {
  readonly fileName: string;
  readonly encoding: string;
}
