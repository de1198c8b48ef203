import type { Issue } from "../base/index.ts";
import type { Cast } from "./cast.ts";

/** What a column of a file can be to us. Columns that are none of these are listed as not used. */
export type ColumnRole =
  | "depth"
  | "seaPressure"
  | "temperature"
  | "practicalSalinity"
  | "conductivity"
  | "specificConductance"
  | "densityAnomaly"
  | "station"
  | "castName"
  | "date"
  | "clock"
  | "dateTime"
  | "latitude"
  | "longitude"
  | "distance";

/** How one column of a file was understood. */
export interface ColumnReading {
  /** 0-based position in the table. */
  readonly columnIndex: number;
  /** As written in the file. */
  readonly header: string;
  readonly role: ColumnRole | null;
  /** Symbol of the unit, where the role has one. */
  readonly unit: string | null;
  /** One plain sentence: why this role and this unit, or why not used. */
  readonly reason: string;
}

/** How a whole file was understood: every decision, so that it can be checked. */
export interface FileReading {
  readonly fileName: string;
  readonly encoding: string;
  /** In words: "comma", "semicolon", "tab" ... */
  readonly delimiter: string;
  readonly decimalMark: "." | ",";
  /** 1-based line of the header row. */
  readonly headerLineIndex: number;
  readonly columns: readonly ColumnReading[];
  /** What tells one cast from the next, in words. */
  readonly splitBy: string;
  readonly rowCount: number;
  readonly casts: readonly Cast[];
  /** About the file as a whole; each cast carries its own besides. */
  readonly issues: readonly Issue[];
}
