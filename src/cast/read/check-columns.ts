/** What a table must have before casts can be made of it. */
import type { Issue } from "../../base/index.ts";
import { askedUnitCode } from "./choose-unit.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import type { MeasuredRole } from "./roles.ts";
import type { Table } from "./table.ts";

const VERTICAL_ROLES: readonly MeasuredRole[] = ["depth", "seaPressure"];
const TEMPERATURE_ROLES: readonly MeasuredRole[] = ["temperature"];
const SALT_ROLES: readonly MeasuredRole[] = ["practicalSalinity", "conductivity", "specificConductance"];

const hasOneOf = (columns: RecognisedColumns, roles: readonly MeasuredRole[]): boolean =>
  roles.some((role) => columns.used[role] !== undefined);

/** The questions about units that stand between us and any of the roles. */
const askedAbout = (columns: RecognisedColumns, roles: readonly MeasuredRole[]): readonly Issue[] =>
  columns.issues
    .filter((issue) => roles.some((role) => issue.code === askedUnitCode(role)))
    .map((issue) => ({ ...issue, severity: "error" }));

/** Places with coordinates and nothing measured there. */
const isStationList = ({ used }: RecognisedColumns): boolean =>
  used.latitude !== undefined && used.longitude !== undefined && used.temperature === undefined;

const LISTED_HEADERS = 12;

function listed(headers: readonly string[]): string {
  const names = headers.slice(0, LISTED_HEADERS).map((header) => `"${header}"`);
  const more = headers.length - names.length;
  return names.join(", ") + (more > 0 ? ` and ${more} more` : "");
}

/** The errors that keep a table from being read, none when it can be. */
export function checkColumns(table: Table, columns: RecognisedColumns): readonly Issue[] {
  const headers = listed(table.header.cells);
  const error = (code: string, message: string): Issue => ({
    severity: "error",
    code,
    message,
    line: table.header.lineIndex,
  });
  /** A role that is needed: nothing when it is there, else the unit asked for, else the error given. */
  const needed = (roles: readonly MeasuredRole[], missing: Issue | null): readonly Issue[] => {
    if (hasOneOf(columns, roles)) return [];
    const asked = askedAbout(columns, roles);
    return asked.length > 0 || missing === null ? asked : [missing];
  };
  const noDepth = `no depth or pressure column among ${headers}; expected a header such as "Depth (m)" or "Pressure (dbar)"`;
  const noTemperature = `no temperature column among ${headers}; expected a header such as "Temperature (degC)"`;
  if (isStationList(columns) && askedAbout(columns, TEMPERATURE_ROLES).length === 0) {
    const message = `this looks like a list of stations, not casts: coordinates but no temperature among ${headers}; add the file that holds the samples`;
    return [error("station-list", message)];
  }
  return [
    ...needed(VERTICAL_ROLES, error("no-depth-column", noDepth)),
    ...needed(TEMPERATURE_ROLES, error("no-temperature-column", noTemperature)),
    ...needed(SALT_ROLES, null),
  ];
}
