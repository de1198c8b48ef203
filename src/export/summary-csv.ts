import type { Profile, Solution, SolvedCast } from "../survey/index.ts";
import { type Cell, csvText } from "./csv.ts";
import { type ColumnDescription, countColumn, numberColumn, textColumn } from "./table.ts";

export const SUMMARY_TABLE: readonly ColumnDescription[] = [
  textColumn("cast", "Name of the cast"),
  textColumn("station", "Station as written in the file"),
  textColumn("time", "ISO 8601, in the file's own zone"),
  numberColumn("latitude_deg", "degrees north", "Latitude from the file"),
  numberColumn("longitude_deg", "degrees east", "Longitude from the file"),
  numberColumn("distance_km", "km", "Along the channel, from the file's own origin"),
  textColumn("file", "File the cast was read from"),
  countColumn("samples", "Samples the column stands on"),
  numberColumn("first_sample_depth_m", "m", "Depth of the first sample"),
  numberColumn("last_sample_depth_m", "m", "Depth of the last sample"),
  numberColumn("bottom_depth_m", "m", "The bed where the basis gives it, else the last sample"),
  numberColumn("bottom_sea_pressure_dbar", "dbar", "Sea pressure at the bottom depth"),
  numberColumn("bottom_gauge_pressure_kPa", "kPa", "Gauge pressure at the bottom depth"),
  numberColumn("bottom_absolute_pressure_kPa", "kPa", "Absolute pressure at the bottom depth"),
  numberColumn("reference_density_kg_m3", "kg/m3", "Density of the constant-density estimate"),
  numberColumn("bottom_departure_kPa", "kPa", "Departure at the bottom depth"),
  numberColumn("bottom_departure_m", "m", "The same as a head of water of the reference density"),
  numberColumn("bottom_departure_percent", "%", "The same over the gauge pressure"),
  numberColumn("largest_buoyancy_frequency_squared_s-2", "s-2", "Largest between neighbouring samples"),
  numberColumn("largest_buoyancy_frequency_depth_m", "m", "Depth halfway between those samples"),
  countColumn("errors", "Errors among the cast's issues"),
  countColumn("warnings", "Warnings among the cast's issues"),
];

/** One row a cast: where it is, what it covers, and the pressure at its bottom. Unsolved casts keep their row. */
export const summaryCsv = (solved: readonly SolvedCast[]): string => csvText(SUMMARY_TABLE, solved.map(summaryRow));

function summaryRow({ cast, issues, solution }: SolvedCast): readonly Cell[] {
  const count = (severity: string): number => issues.filter((issue) => issue.severity === severity).length;
  const where = [
    cast.name,
    cast.station,
    cast.time,
    cast.latitudeDeg,
    cast.longitudeDeg,
    cast.distanceKm,
    cast.fileName,
  ];
  return [
    ...where,
    ...(solution ? resultCells(solution) : missingCells(cast.samples.n)),
    count("error"),
    count("warning"),
  ];
}

const missingCells = (sampleCount: number): readonly Cell[] => [sampleCount, ...new Array<null>(12).fill(null)];

function resultCells({ column, profile }: Solution): readonly Cell[] {
  const bottom = profile.n - 1;
  const steepest = indexOfLargest(profile.buoyancyFrequencySquaredPerS2);
  return [
    column.n,
    column.depthM[0]!,
    column.depthM[column.n - 1]!,
    column.bottomDepthM,
    profile.seaPressureDbar[bottom]!,
    profile.gaugePressureKPa[bottom]!,
    profile.absPressureKPa[bottom]!,
    column.referenceRhoKgM3,
    profile.departureKPa[bottom]!,
    profile.departureM[bottom]!,
    profile.departureFrac[bottom]! * 100,
    steepest === null ? null : profile.buoyancyFrequencySquaredPerS2[steepest]!,
    steepest === null ? null : middleDepthM(profile, steepest),
  ];
}

const middleDepthM = (profile: Profile, row: number): number => (profile.depthM[row]! + profile.depthM[row + 1]!) / 2;

function indexOfLargest(values: Float64Array): number | null {
  let largest: number | null = null;
  values.forEach((value, i) => {
    if (!Number.isNaN(value) && (largest === null || value > values[largest]!)) largest = i;
  });
  return largest;
}
