import type { ColumnAnswer, ColumnReading, ColumnRole } from "../../cast/index.ts";

interface RoleChoice {
  readonly role: ColumnRole;
  readonly label: string;
  /** Units the role is met in; empty where it has none. */
  readonly units: readonly string[];
}

const LENGTHS = ["m", "ft", "cm", "fathom"];
const PRESSURES = ["dbar", "bar", "kPa", "MPa", "psi", "mH2O"];
const CONDUCTIVITIES = ["mS/cm", "S/m", "uS/cm"];
const ORDERS = ["day-first", "month-first"];

const choice = (role: ColumnRole, label: string, units: readonly string[] = []): RoleChoice => ({ role, label, units });

/** What a column can be, as the user chooses it: in groups, the ones most needed first. */
export const ROLE_GROUPS: readonly { readonly label: string; readonly choices: readonly RoleChoice[] }[] = [
  {
    label: "Depth",
    choices: [
      choice("depth", "depth", LENGTHS),
      choice("seaPressure", "sea pressure", PRESSURES),
      choice("absolutePressure", "absolute pressure", PRESSURES),
      choice("elevation", "elevation", LENGTHS),
      choice("surfaceElevation", "elevation of the surface", LENGTHS),
    ],
  },
  {
    label: "Water",
    choices: [
      choice("temperature", "temperature", ["degC", "degF", "K", "degC68"]),
      choice("practicalSalinity", "practical salinity"),
      choice("absoluteSalinity", "absolute salinity", ["g/kg"]),
      choice("conductivity", "conductivity", CONDUCTIVITIES),
      choice("specificConductance", "specific conductance", CONDUCTIVITIES),
      choice("dissolvedSolids", "dissolved solids", ["kg/m3", "mg/L"]),
      choice("densityAnomaly", "density anomaly", ["kg/m3"]),
      choice("turbidity", "turbidity"),
      choice("suspendedSediment", "suspended sediment", ["kg/m3", "mg/L"]),
      choice("qualityFlag", "quality flag"),
    ],
  },
  {
    label: "Which cast",
    choices: [
      choice("station", "station"),
      choice("castName", "cast name"),
      choice("latitude", "latitude", ["deg"]),
      choice("longitude", "longitude", ["deg"]),
      choice("distance", "distance along the channel", ["km", "m", "mi", "nmi"]),
      choice("waterDepth", "depth of the water", LENGTHS),
    ],
  },
  {
    label: "When",
    choices: [
      choice("dateTime", "date and time", ORDERS),
      choice("date", "date", ORDERS),
      choice("clock", "time of day"),
      choice("year", "year"),
      choice("month", "month"),
      choice("day", "day of the month"),
      choice("elapsedTime", "elapsed time", ["s", "min", "h", "day"]),
    ],
  },
];

/** The units to choose from for a column as it is read; the one it has is always among them. */
export function unitsFor(role: ColumnRole, unit: string | null): readonly string[] {
  const all = ROLE_GROUPS.flatMap(({ choices }) => choices).find((known) => known.role === role)?.units ?? [];
  return unit === null || unit === "1" || all.includes(unit) ? all : [unit, ...all];
}

/** How an answer names a column: by its header, numbered where several columns have the same, by its place where it has none. */
export function answerName(headers: readonly string[], columnIndex: number): string {
  const header = headers[columnIndex] ?? "";
  if (header === "") return `#${columnIndex + 1}`;
  const isSame = (other: string): boolean => other === header;
  const before = headers.slice(0, columnIndex).filter(isSame).length;
  return headers.filter(isSame).length > 1 ? `${header}#${before + 1}` : header;
}

/** A column as the user has it, where the file could not be read with what they said. */
export function asAnswered(
  column: ColumnReading,
  answers: readonly ColumnAnswer[],
  headers: readonly string[],
): ColumnReading {
  const name = answerName(headers, column.columnIndex);
  const answer = answers.find(({ header }) => header === name);
  if (!answer) return column;
  const role = answer.role === "unused" ? null : answer.role;
  return { ...column, role, unit: answer.unit, confidence: "sure", reason: "as you said" };
}
