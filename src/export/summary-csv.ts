import type { Profile, Solution, SolvedCast } from "../survey/index.ts";
import { type Cell, csvText } from "./csv.ts";

const HEADER = [
  "cast",
  "station",
  "time",
  "latitude_deg",
  "longitude_deg",
  "distance_km",
  "file",
  "samples",
  "first_sample_depth_m",
  "last_sample_depth_m",
  "bottom_depth_m",
  "bottom_sea_pressure_dbar",
  "bottom_gauge_pressure_kPa",
  "bottom_absolute_pressure_kPa",
  "reference_density_kg_m3",
  "bottom_departure_kPa",
  "bottom_departure_m",
  "bottom_departure_percent",
  "largest_buoyancy_frequency_squared_s-2",
  "largest_buoyancy_frequency_depth_m",
  "errors",
  "warnings",
] as const;

/** One row a cast: where it is, what it covers, and the pressure at its bottom. Unsolved casts keep their row. */
export const summaryCsv = (solved: readonly SolvedCast[]): string => csvText(HEADER, solved.map(summaryRow));

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
