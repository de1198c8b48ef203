/** The rows of a table as arrays in the program's own units, before they are split into casts. */
import type { Issue } from "../../base/index.ts";
import type { ColumnRole } from "../reading.ts";
import { type BadCell, CellReader } from "./cell-reader.ts";
import { statedFlags } from "./quality-flags.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import { type RowTimes, readRowTimes } from "./row-times.ts";
import { VERTICAL_ROLES } from "./settle-columns.ts";
import type { OnShare } from "./share.ts";
import type { Table } from "./table.ts";
import { readVertical, type Vertical } from "./vertical.ts";

export interface MeasuredRows extends Omit<Vertical, "issues">, RowTimes {
  readonly n: number;
  readonly lineIndex: Int32Array;
  /** The file or the user says that the air is not in its pressure. */
  readonly isGaugePressure: boolean;
  readonly inSituTempC: Float64Array;
  readonly practicalSalinity: Float64Array | null;
  readonly absSalinityGKg: Float64Array | null;
  readonly conductivityMsCm: Float64Array | null;
  readonly specificConductanceMsCm: Float64Array | null;
  readonly suspendedSedimentKgM3: Float64Array | null;
  readonly statedSigmaKgM3: Float64Array | null;
  /** In the meaning of the QARTOD manuals. */
  readonly statedFlag: Uint8Array | null;
  readonly latitudeDeg: Float64Array | null;
  readonly longitudeDeg: Float64Array | null;
  readonly distanceKm: Float64Array | null;
  readonly waterDepthM: Float64Array | null;
  readonly station: readonly string[] | null;
  readonly castName: readonly string[] | null;
  /** By row. */
  readonly badCells: ReadonlyMap<number, readonly BadCell[]>;
  /** About the file as a whole. */
  readonly issues: readonly Issue[];
}

/** Longitudes are written from -180 to 180 or from 0 to 360; ours are the former. */
const withinHalfTurn = (degrees: Float64Array | null): Float64Array | null =>
  degrees?.some((value) => value > 180 && value <= 360)
    ? degrees.map((value) => (value > 180 ? value - 360 : value))
    : degrees;

/** Solids that were dissolved in a litre stand for grams in a kilogram where nothing better is in the file. */
function dissolvedSolidsGKg(reader: CellReader, columns: RecognisedColumns): Float64Array | null {
  const { practicalSalinity, conductivity, specificConductance } = columns.used;
  if (practicalSalinity || conductivity || specificConductance) return null;
  const solids = reader.numbers("dissolvedSolids");
  if (solids === null) return null;
  const message =
    "salinity is taken from dissolved solids, 1000 mg/L as 1 g/kg; probes derive them from conductance, within 20 %; name the conductance if the file has it";
  reader.issues.push({ severity: "warning", code: "salinity-from-dissolved-solids", message });
  // One litre of water for one kilogram: within what the figure is good for.
  return solids;
}

/** Columns whose flags count for a sample. */
const FLAGGED_ROLES: readonly ColumnRole[] = [
  ...VERTICAL_ROLES,
  "temperature",
  "practicalSalinity",
  "absoluteSalinity",
  "conductivity",
  "specificConductance",
];

function flagsOf(table: Table, { flags, used }: RecognisedColumns): Uint8Array | null {
  const targets = FLAGGED_ROLES.map((role) => used[role]?.columnIndex);
  return statedFlags(
    table,
    flags.filter(({ targetIndex }) => targets.includes(targetIndex)),
  );
}

/** Names of pressure that leave no doubt that the air is not in it. */
const GAUGE = /sea|gauge|gage|psig|barg|ctd/i;

function isGauge(table: Table, { used }: RecognisedColumns): boolean {
  const column = used.seaPressure;
  if (!column) return false;
  const words = `${table.header.cells[column.columnIndex]} ${table.unitTexts[column.columnIndex]}`;
  return column.isAnswered || GAUGE.test(words);
}

/** Needs a temperature column among the used ones; without it temperature is missing throughout. */
export function readMeasuredRows(table: Table, columns: RecognisedColumns, onShare: OnShare): MeasuredRows {
  const columnCount = Object.keys(columns.used).length;
  let doneCount = 0;
  const reader = new CellReader(table, columns, () => onShare(Math.min(1, ++doneCount / columnCount)));
  const { rows } = table;
  const isGaugePressure = isGauge(table, columns);
  const { issues: verticalIssues, ...vertical } = readVertical(reader, isGaugePressure);
  const measured = {
    n: rows.length,
    lineIndex: Int32Array.from({ length: rows.length }, (_, row) => rows.lineIndexAt(row)),
    ...vertical,
    isGaugePressure,
    inSituTempC: reader.numbers("temperature") ?? new Float64Array(rows.length).fill(Number.NaN),
    practicalSalinity: reader.numbers("practicalSalinity"),
    absSalinityGKg: reader.numbers("absoluteSalinity") ?? dissolvedSolidsGKg(reader, columns),
    conductivityMsCm: reader.numbers("conductivity"),
    specificConductanceMsCm: reader.numbers("specificConductance"),
    suspendedSedimentKgM3: reader.numbers("suspendedSediment"),
    statedSigmaKgM3: reader.numbers("densityAnomaly"),
    statedFlag: flagsOf(table, columns),
    latitudeDeg: reader.numbers("latitude"),
    longitudeDeg: withinHalfTurn(reader.numbers("longitude")),
    distanceKm: reader.numbers("distance"),
    waterDepthM: reader.numbers("waterDepth"),
    station: reader.textsFilledDown("station"),
    castName: reader.textsFilledDown("castName"),
    ...readRowTimes(reader),
  };
  return { ...measured, badCells: reader.badCells, issues: [...reader.issues, ...verticalIssues] };
}
