import type { Issue } from "../base/index.ts";
import type { Cast } from "./cast.ts";

/** What a column of a file can be to us. Columns that are none of these are listed as not used. */
export type ColumnRole =
  | "depth"
  | "elevation"
  | "surfaceElevation"
  | "seaPressure"
  | "absolutePressure"
  | "temperature"
  | "practicalSalinity"
  | "absoluteSalinity"
  | "dissolvedSolids"
  | "conductivity"
  | "specificConductance"
  | "densityAnomaly"
  | "turbidity"
  | "suspendedSediment"
  | "station"
  | "castName"
  | "date"
  | "clock"
  | "dateTime"
  | "year"
  | "month"
  | "day"
  | "elapsedTime"
  | "latitude"
  | "longitude"
  | "distance"
  | "waterDepth"
  | "qualityFlag";

/** How far a choice can be relied upon: the file says so, everything points to it, or it could well be otherwise. */
export type Confidence = "sure" | "likely" | "doubtful";

/** How one column of a file was understood. */
export interface ColumnReading {
  /** 0-based position in the table. */
  readonly columnIndex: number;
  /** As written in the file. */
  readonly header: string;
  readonly role: ColumnRole | null;
  /** Symbol of the unit, where the role has one. */
  readonly unit: string | null;
  readonly confidence: Confidence;
  /** One plain sentence: why this role and this unit, or why not used. */
  readonly reason: string;
}

/** What the user has said about one column. */
export interface ColumnAnswer {
  /** As written in the file; "Temp#2" is the second column named Temp, "#3" the third column, whatever its name. */
  readonly header: string;
  readonly role: ColumnRole | "unused";
  /** null leaves the unit to the file. */
  readonly unit: string | null;
}

/** What the user has said about a file, or about all files with the same headers. */
export interface ReadingAnswers {
  readonly columns: readonly ColumnAnswer[];
}

/** Two readings of a column are possible, and which it is matters. Until it is answered the column is not used. */
export interface Question {
  /** Stable, kebab-case; an issue of the same code stands among the issues of the file. */
  readonly code: string;
  readonly columnIndex: number;
  readonly message: string;
  readonly choices: readonly { readonly label: string; readonly answer: ColumnAnswer }[];
}

/** How a whole file was understood: every decision, so that it can be checked. */
export interface FileReading {
  readonly fileName: string;
  readonly encoding: string;
  /** In words: "comma", "semicolon", "tab" ... */
  readonly delimiter: string;
  readonly decimalMark: "." | ",";
  /** 1-based line of the header row, the last where it has two; 0 where there is none. */
  readonly headerLineIndex: number;
  /** As written in the file; "#1", "#2" ... where it has none. */
  readonly headers: readonly string[];
  /** The first rows below the headers, cells as written. */
  readonly firstRows: readonly (readonly string[])[];
  readonly columns: readonly ColumnReading[];
  /** Empty where nothing is open. No casts are made while depth or temperature waits for an answer. */
  readonly questions: readonly Question[];
  /** What tells one cast from the next, in words. */
  readonly splitBy: string;
  readonly rowCount: number;
  readonly casts: readonly Cast[];
  /** About the file as a whole; each cast carries its own besides. */
  readonly issues: readonly Issue[];
}
