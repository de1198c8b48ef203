/** What a table must have before casts can be made of it. */
import type { Issue } from "../../base/index.ts";
import { COLUMN_NAMES } from "./column-names.ts";
import type { FoundTable } from "./find-header.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";

const headersOf = (table: FoundTable): string => table.header.cells.map((cell) => `"${cell}"`).join(", ");

const error = (code: string, message: string, line: number): Issue => ({ severity: "error", code, message, line });

/** Places with coordinates and nothing measured there. */
const isStationList = ({ used }: RecognisedColumns): boolean =>
  used.latitude !== undefined && used.longitude !== undefined && used.temperature === undefined;

/** The errors that keep a table from being read, none when it can be. */
export function checkColumns(table: FoundTable, columns: RecognisedColumns): readonly Issue[] {
  const { used, issues } = columns;
  const line = table.header.lineIndex;
  if (isStationList(columns)) {
    return [
      error(
        "station-list",
        `this looks like a list of stations, not casts: coordinates but no temperature among ${headersOf(table)}; add the file with the samples`,
        line,
      ),
    ];
  }
  const cannotDoWithout = issues.filter(
    (issue) => issue.severity === "error" && !(/[cC]onduct/.test(issue.code) && used.practicalSalinity !== undefined),
  );
  const asked = (role: string) => issues.some((issue) => issue.code === `no-unit-${role}`);
  const missing: Issue[] = [];
  if (used.depth === undefined && used.seaPressure === undefined) {
    const message = `no depth or pressure column among ${headersOf(table)}; expected a header such as "Depth (m)" or "Pressure (dbar)"`;
    missing.push(error("no-depth-column", message, line));
  }
  if (used.temperature === undefined && !asked("temperature")) {
    const message = `no temperature column among ${headersOf(table)}; expected a header such as "Temperature (degC)" or "${COLUMN_NAMES.temperature[0]}"`;
    missing.push(error("no-temperature-column", message, line));
  }
  return [...missing, ...cannotDoWithout];
}
