/** One cast from its rows: what is left out and why, and the samples that remain, in file order. */
import { median, min } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import type { Cast, CastId, Samples } from "../cast.ts";
import type { MeasuredRows } from "./measured-rows.ts";
import type { RowGroup } from "./split-casts.ts";

/** Natural water that a probe is lowered into. */
const COLDEST_C = -2;
const WARMEST_C = 45;
const LISTED_LINES = 5;

export type UnnamedCast = Omit<Cast, "id" | "name">;

interface Found {
  readonly severity: Issue["severity"];
  readonly code: string;
  readonly what: string;
}

/** One issue for many rows: how many, and the first lines. */
function counted(rows: MeasuredRows, found: readonly number[], issue: Found): readonly Issue[] {
  if (found.length === 0) return [];
  const lines = found.slice(0, LISTED_LINES).map((i) => rows.lineIndex[i]!);
  const more = found.length > LISTED_LINES ? " ..." : "";
  const where = found.length === 1 ? `line ${lines[0]}` : `${found.length} rows (lines ${lines.join(", ")}${more})`;
  return [{ severity: issue.severity, code: issue.code, message: `${where}: ${issue.what}`, line: lines[0]! }];
}

const isNaNAt = (values: Float64Array | null, i: number): boolean => values === null || Number.isNaN(values[i]!);

function textIssues(rows: MeasuredRows, indices: readonly number[]): readonly Issue[] {
  const found = indices.flatMap((i) =>
    (rows.badCells.get(i) ?? []).map((cell) => ({ ...cell, line: rows.lineIndex[i]! })),
  );
  const listed = found
    .slice(0, LISTED_LINES)
    .map(
      ({ code, message, line }): Issue => ({ severity: "warning", code, message: `line ${line}: ${message}`, line }),
    );
  const more = found.length - listed.length;
  const message = `${more} more cells hold neither a number nor a time where one is expected`;
  return more > 0 ? [...listed, { severity: "warning", code: "more-bad-cells", message }] : listed;
}

interface KeptRows {
  readonly kept: readonly number[];
  readonly issues: readonly Issue[];
}

function keepRows(rows: MeasuredRows, group: RowGroup): KeptRows {
  const all = group.rowIndices;
  const vertical = rows.depthM ?? rows.seaPressureDbar;
  const word = rows.depthM ? "depth" : "sea pressure";
  const withoutDepth = all.filter((i) => isNaNAt(vertical, i));
  const withoutTemp = all.filter((i) => !isNaNAt(vertical, i) && isNaNAt(rows.inSituTempC, i));
  const inAir = all.filter((i) => vertical![i]! < 0);
  const dropped = new Set([...withoutDepth, ...withoutTemp, ...inAir]);
  const kept = all.filter((i) => !dropped.has(i));
  const outside = kept.filter((i) => rows.inSituTempC[i]! < COLDEST_C || rows.inSituTempC[i]! > WARMEST_C);
  const worst = outside.map((i) => rows.inSituTempC[i]!).sort((a, b) => Math.abs(b) - Math.abs(a))[0];
  const withoutSalinity = rows.practicalSalinity ? kept.filter((i) => isNaNAt(rows.practicalSalinity, i)) : [];
  return {
    kept,
    issues: [
      ...textIssues(rows, all),
      ...counted(rows, withoutDepth, { severity: "warning", code: "no-depth", what: `no ${word}; left out` }),
      ...counted(rows, withoutTemp, { severity: "warning", code: "no-temperature", what: "no temperature; left out" }),
      ...counted(rows, inAir, {
        severity: "warning",
        code: "above-water",
        what: `${word} is negative, above the water; left out`,
      }),
      ...counted(rows, outside, {
        severity: "warning",
        code: "temperature-outside",
        what: `temperature ${worst?.toFixed(1)} degC is outside ${COLDEST_C} to ${WARMEST_C} degC; is the column in degF?`,
      }),
      ...counted(rows, withoutSalinity, { severity: "note", code: "no-salinity", what: "no salinity" }),
      ...counted(rows, group.restartRows, {
        severity: "warning",
        code: "depth-starts-over",
        what: "depth starts over within one cast; if this is a second lowering, give each a cast number or a time",
      }),
    ],
  };
}

function samplesOf(rows: MeasuredRows, kept: readonly number[]): Samples {
  const pick = (values: Float64Array | null) => values && Float64Array.from(kept, (i) => values[i]!);
  return {
    n: kept.length,
    lineIndex: Int32Array.from(kept, (i) => rows.lineIndex[i]!),
    depthM: rows.isFromHighest ? fromLeast(pick(rows.depthM)) : pick(rows.depthM),
    seaPressureDbar: pick(rows.seaPressureDbar),
    inSituTempC: Float64Array.from(kept, (i) => rows.inSituTempC[i]!),
    practicalSalinity: pick(rows.practicalSalinity),
    conductivityMsCm: pick(rows.conductivityMsCm),
    specificConductanceMsCm: pick(rows.specificConductanceMsCm),
    absSalinityGKg: pick(rows.absSalinityGKg),
    suspendedSedimentKgM3: pick(rows.suspendedSedimentKgM3),
    timeS: sinceFirst(pick(rows.timeS)),
    statedFlag: rows.statedFlag && Uint8Array.from(kept, (i) => rows.statedFlag![i]!),
    statedSigmaKgM3: pick(rows.statedSigmaKgM3),
  };
}

/** The water level moves from cast to cast: each has its own highest sample. */
function fromLeast(depthM: Float64Array | null): Float64Array | null {
  if (depthM === null || depthM.length === 0) return depthM;
  const least = min([...depthM]);
  return depthM.map((value) => value - least);
}

/** One time for a whole cast is no time of its samples. */
function sinceFirst(timeS: Float64Array | null): Float64Array | null {
  const first = timeS?.find((value) => !Number.isNaN(value));
  if (!timeS || first === undefined || !timeS.some((value) => value !== first && !Number.isNaN(value))) return null;
  return timeS.map((value) => value - first);
}

/** A boat drifts on station: the middle of what the rows say. */
function middle(
  values: Float64Array | null,
  indices: readonly number[],
  largest = Number.POSITIVE_INFINITY,
): number | null {
  const found = values ? indices.map((i) => values[i]!).filter((value) => Math.abs(value) <= largest) : [];
  return found.length === 0 ? null : median(found);
}

export function buildCast(rows: MeasuredRows, group: RowGroup, fileName: string): UnnamedCast {
  const { kept, issues } = keepRows(rows, group);
  const clock = rows.clock?.[kept[0] ?? group.rowIndices[0]!] || null;
  return {
    station: group.station,
    time: group.date === null ? null : clock === null ? group.date : `${group.date}T${clock}`,
    latitudeDeg: middle(rows.latitudeDeg, kept, 90),
    longitudeDeg: middle(rows.longitudeDeg, kept, 180),
    distanceKm: middle(rows.distanceKm, kept),
    waterDepthM: middle(rows.waterDepthM?.map((value) => (value > 0 ? value : Number.NaN)) ?? null, kept),
    fileName,
    samples: samplesOf(rows, kept),
    issues,
  };
}

export const named = (cast: UnnamedCast, name: string): Cast => ({
  id: `${cast.fileName}/${name}` as CastId,
  name,
  ...cast,
});
