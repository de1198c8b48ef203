/** What each role is in words, and for those that hold measured numbers: their kind, our unit and what can occur in nature. */
import type { QuantityKind, UnitSymbol } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";

interface MeasuredFacts {
  readonly kind: QuantityKind;
  /** The unit of the program, in which columns of numbers are kept. */
  readonly unit: UnitSymbol;
  /** Least and most that natural water can show, in whatever unit of the kind; what lies outside was not measured. */
  readonly possible: readonly [number, number];
}

/** Deepest water is 11 km or 36 000 ft; taken in centimetres it is 1.1e6. */
const LENGTHS = [-1.2e6, 1.2e6] as const;
/** 1100 bar in pascals. */
const PRESSURES = [-2000, 1.2e8] as const;

/** Roles whose columns hold numbers with a unit; the others hold texts or times. */
export const MEASURED = {
  depth: { kind: "length", unit: "m", possible: LENGTHS },
  elevation: { kind: "length", unit: "m", possible: LENGTHS },
  surfaceElevation: { kind: "length", unit: "m", possible: LENGTHS },
  seaPressure: { kind: "pressure", unit: "dbar", possible: PRESSURES },
  absolutePressure: { kind: "pressure", unit: "dbar", possible: [0, 1.2e8] },
  temperature: { kind: "temperature", unit: "degC", possible: [-5, 330] },
  practicalSalinity: { kind: "salinity", unit: "1", possible: [-1, 500] },
  absoluteSalinity: { kind: "salinity", unit: "g/kg", possible: [-1, 500] },
  dissolvedSolids: { kind: "density", unit: "kg/m3", possible: [-1, 1e6] },
  conductivity: { kind: "conductivity", unit: "mS/cm", possible: [-1, 1e6] },
  specificConductance: { kind: "conductivity", unit: "mS/cm", possible: [-1, 1e6] },
  densityAnomaly: { kind: "density", unit: "kg/m3", possible: [-10, 400] },
  suspendedSediment: { kind: "density", unit: "kg/m3", possible: [-5, 1e6] },
  elapsedTime: { kind: "time", unit: "s", possible: [0, 1e9] },
  latitude: { kind: "angle", unit: "deg", possible: [-90, 90] },
  longitude: { kind: "angle", unit: "deg", possible: [-180, 360] },
  distance: { kind: "length", unit: "km", possible: LENGTHS },
  waterDepth: { kind: "length", unit: "m", possible: [0, 1.2e6] },
} as const satisfies Partial<Record<ColumnRole, MeasuredFacts>>;

export type MeasuredRole = keyof typeof MEASURED;

export const isMeasured = (role: ColumnRole): role is MeasuredRole => role in MEASURED;

export const ROLE_WORDS: Readonly<Record<ColumnRole, string>> = {
  depth: "depth",
  elevation: "elevation",
  surfaceElevation: "elevation of the water surface",
  seaPressure: "sea pressure",
  absolutePressure: "absolute pressure",
  temperature: "temperature",
  practicalSalinity: "practical salinity",
  absoluteSalinity: "absolute salinity",
  dissolvedSolids: "dissolved solids",
  conductivity: "conductivity",
  specificConductance: "specific conductance",
  densityAnomaly: "density anomaly",
  turbidity: "turbidity",
  suspendedSediment: "suspended sediment",
  station: "station",
  castName: "cast name",
  date: "date",
  clock: "time of day",
  dateTime: "date and time",
  year: "year",
  month: "month",
  day: "day of the month",
  elapsedTime: "elapsed time",
  latitude: "latitude",
  longitude: "longitude",
  distance: "distance along the channel",
  waterDepth: "depth of the water",
  qualityFlag: "quality flag",
};
