import type { Issue, Outcome } from "../base/index.ts";
import type { AnyFileReading, StationMatch } from "../cast/index.ts";
import { VERSION } from "../export/index.ts";
import type { Preparation, SolvedCast } from "../survey/index.ts";

/** What inspection found: the files as read, and their casts after the quality tests. */
export interface Inspection {
  readonly files: readonly { readonly path: string; readonly reading: Outcome<AnyFileReading> }[];
  readonly solved: readonly SolvedCast[];
  readonly matches: readonly StationMatch[];
  readonly preparation: Preparation;
}

const issueJson = ({ severity, code, message, line }: Issue) => ({ severity, code, message, line: line ?? null });

/** How files were read, decision by decision, as one JSON value. */
export const inspectionJson = ({ files, solved, matches, preparation }: Inspection): Record<string, unknown> => ({
  version: VERSION,
  preparation: { way: preparation.way, bin_m: preparation.binM, water_kind: preparation.waterKind },
  files: files.map(({ path, reading }) => ({
    file: path,
    read: reading.ok,
    issues: reading.issues.map(issueJson),
    ...(reading.ok &&
      readingJson(
        reading.value,
        solved.filter(({ cast }) => cast.fileName === reading.value.fileName),
      )),
  })),
  stations: matches.map(({ castStation, listStation, how, reason }) => ({
    station: castStation,
    in_list: listStation,
    how,
    reason,
  })),
});

const readingJson = (reading: AnyFileReading, solved: readonly SolvedCast[]): Record<string, unknown> => ({
  encoding: reading.encoding,
  delimiter: reading.delimiter,
  decimal_mark: reading.decimalMark,
  header_line: reading.headerLineIndex,
  sheet: reading.sheet,
  sheets: reading.sheets,
  rows: reading.rowCount,
  columns: reading.columns.map(({ columnIndex, header, role, unit, confidence, reason }) => ({
    column: columnIndex + 1,
    header,
    role,
    unit,
    confidence,
    reason,
  })),
  questions: reading.questions.map(({ code, columnIndex, message, choices }) => ({
    code,
    column: columnIndex + 1,
    message,
    choices: choices.map(({ label, answer }) => ({ label, ...answer })),
  })),
  split_by: reading.splitBy,
  casts: solved.map(castJson),
});

/** Flagged or left out; samples that passed are only counted. */
const castJson = ({ cast, issues, prepared }: SolvedCast): Record<string, unknown> => ({
  name: cast.name,
  station: cast.station,
  time: cast.time,
  latitude: cast.latitudeDeg,
  longitude: cast.longitudeDeg,
  distance_km: cast.distanceKm,
  water_depth_m: cast.waterDepthM,
  samples: cast.samples.n,
  samples_used: prepared.use.reduce((sum, used) => sum + used, 0),
  remarks: Array.from(prepared.flag, (flag, i) => ({ flag, i })).flatMap(({ flag, i }) =>
    prepared.reasons[i]!.length === 0
      ? []
      : [{ line: cast.samples.lineIndex[i]!, flag, used: prepared.use[i] === 1, reasons: prepared.reasons[i]! }],
  ),
  issues: issues.map(issueJson),
});
