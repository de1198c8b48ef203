import { type Basis, type Profile, type SolvedCast, type Survey, waterLabel } from "../survey/index.ts";
import { textTable } from "./text-table.ts";

/** A terminal shows this many rows of a cast at most; --out and --json give all. */
const MOST_ROWS_COUNT = 40;

type Head = readonly [string, string];

const HEADS_BEFORE: readonly Head[] = [
  ["depth", "m"],
  ["temperature", "degC"],
  ["salinity", "1"],
  ["density", "kg/m3"],
  ["sea pressure", "dbar"],
  ["gauge", "kPa"],
  ["absolute", "kPa"],
];
/** Expanded uncertainty of gauge and of absolute pressure. */
const HEADS_UNCERTAINTY: readonly Head[] = [
  ["gauge +-", "kPa, k=2"],
  ["absolute +-", "kPa, k=2"],
];
const HEADS_BEHIND: readonly Head[] = [
  ["departure", "kPa"],
  ["departure", "m"],
  ["departure", "%"],
  ["", ""],
];

const fixed = (value: number, digits: number): string => (Number.isNaN(value) ? "-" : value.toFixed(digits));

const rowText = (profile: Profile, i: number, sure: readonly number[], note: string): readonly string[] => [
  fixed(profile.depthM[i]!, 3),
  fixed(profile.inSituTempC[i]!, 3),
  fixed(profile.practicalSalinity[i]!, 3),
  fixed(profile.rhoKgM3[i]!, 3),
  fixed(profile.seaPressureDbar[i]!, 4),
  fixed(profile.gaugePressureKPa[i]!, 3),
  fixed(profile.absPressureKPa[i]!, 3),
  ...sure.map((expandedKPa) => fixed(expandedKPa, 3)),
  fixed(profile.departureKPa[i]!, 3),
  fixed(profile.departureM[i]!, 4),
  fixed(profile.departureFrac[i]! * 100, 3),
  note,
];

/** First, last and evenly chosen rows between. */
function chosenRows(n: number): readonly number[] {
  const step = Math.max(1, Math.ceil((n - 1) / (MOST_ROWS_COUNT - 1)));
  const rows: number[] = [];
  for (let i = 0; i < n - 1; i += step) rows.push(i);
  return [...rows, n - 1];
}

/**
 * One cast for people at a terminal: what it is, what was assumed, the table, the levels.
 * @param withUncertainty whether pressures are told with what they may be off by
 */
export function columnText(survey: Survey, { cast, solution }: SolvedCast, withUncertainty: boolean): string {
  if (!solution) return `${cast.name}  (${cast.fileName})\n  no result\n`;
  const { column, profile, uncertaintyKPa, levels, levelUncertainty, flag } = solution;
  const expanded = (standardKPa: number): readonly number[] =>
    withUncertainty ? [2 * standardKPa, 2 * Math.hypot(standardKPa, column.basis.accuracy.airPressureKPa)] : [];
  const rows = chosenRows(profile.n);
  const profileNote = (i: number): string =>
    profile.origin[i] !== "sample" ? profile.origin[i]! : flag[i] === 3 ? "suspect" : "";
  const table = [
    ...rows.map((i) => ({
      depthM: profile.depthM[i]!,
      text: rowText(profile, i, expanded(uncertaintyKPa[i]!), profileNote(i)),
    })),
    ...survey.levels.map((level, i) => ({
      depthM: level.depthM,
      text: rowText(levels, i, expanded(levelUncertainty.combinedKPa[i]!), "level"),
    })),
  ].sort((a, b) => a.depthM - b.depthM);
  const thinned =
    rows.length < profile.n ? `  ${rows.length} of ${profile.n} rows shown; --out DIR or --json gives all\n` : "";
  const first = column.depthM[0]!.toFixed(2);
  const last = column.depthM[column.n - 1]!.toFixed(2);
  return [
    `${cast.name}  (${cast.fileName})`,
    `  ${[...whereAndWhen(survey.basis, cast), `${column.n} samples from ${first} to ${last} m`].join(", ")}`,
    `  ${waterLabel(survey.basis.water)}, departure from ${column.referenceRhoKgM3.toFixed(3)} kg/m3, air ${survey.basis.airPressureKPa} kPa`,
    textTable(
      [...HEADS_BEFORE, ...(withUncertainty ? HEADS_UNCERTAINTY : []), ...HEADS_BEHIND],
      table.map((row) => row.text),
    ),
    thinned,
  ].join("\n");
}

const whereAndWhen = (basis: Basis, cast: SolvedCast["cast"]): readonly string[] => [
  ...(cast.time === null ? [] : [cast.time.replace("T", " ")]),
  ...(cast.distanceKm === null ? [] : [`${cast.distanceKm} km`]),
  latitudeText(basis.latitudeDeg ?? cast.latitudeDeg),
];

const latitudeText = (latitudeDeg: number | null): string =>
  latitudeDeg === null ? "standard gravity" : `${Math.abs(latitudeDeg)} deg ${latitudeDeg < 0 ? "S" : "N"}`;
