import { departureUncertaintyKPa, type Profile, type Solution } from "../survey/index.ts";

/** The quantities that are drawn. */
const DRAWN = [
  "inSituTempC",
  "practicalSalinity",
  "rhoKgM3",
  "buoyancyFrequencySquaredPerS2",
  "departureKPa",
] as const satisfies readonly (keyof Profile)[];

/** A profile with no more rows than a screen can tell apart. */
export interface DrawnProfile extends Pick<Profile, "n" | "depthM" | (typeof DRAWN)[number]> {
  /** Rows outside these two belong to water the probe did not sample. */
  readonly firstSampleIndex: number;
  readonly lastSampleIndex: number;
  /** Standard (k = 1). */
  readonly departureUncertaintyKPa: Float64Array;
}

const MOST_ROWS_COUNT = 2000;
/** No fewer than the eye can follow down a chart. */
const SLICES_COUNT = 120;

/** Of each thin slice of depth the first and last row, and those with the least and greatest of every quantity. */
function rowsToDraw({ profile, column }: Solution): Int32Array {
  const kept = new Set<number>([0, 1, column.n, profile.n - 1]);
  const sliceM = column.bottomDepthM / SLICES_COUNT;
  let start = 0;
  while (start < profile.n) {
    const slice = Math.floor(profile.depthM[start]! / sliceM);
    let end = start + 1;
    while (end < profile.n && Math.floor(profile.depthM[end]! / sliceM) === slice) end++;
    kept.add(start).add(end - 1);
    for (const quantity of DRAWN) for (const row of extremes(profile[quantity], start, end)) kept.add(row);
    start = end;
  }
  return Int32Array.from(kept).sort();
}

function extremes(values: Float64Array, start: number, end: number): readonly [number, number] {
  let least = start;
  let greatest = start;
  for (let row = start + 1; row < end; row++) {
    if (!(values[row]! >= values[least]!)) least = row;
    if (!(values[row]! <= values[greatest]!)) greatest = row;
  }
  return [least, greatest];
}

/** What is drawn of a solution: all of it, or of a long one the rows that can be seen. */
export function drawnProfile(solution: Solution): DrawnProfile {
  const { profile, column } = solution;
  const uncertaintyKPa = departureUncertaintyKPa(column, profile, solution.uncertaintyKPa);
  if (profile.n <= MOST_ROWS_COUNT)
    return {
      ...picked(profile),
      firstSampleIndex: 1,
      lastSampleIndex: column.n,
      departureUncertaintyKPa: uncertaintyKPa,
    };
  const rows = rowsToDraw(solution);
  const thinned = (values: Float64Array): Float64Array => Float64Array.from(rows, (row) => values[row]!);
  return {
    n: rows.length,
    depthM: thinned(profile.depthM),
    inSituTempC: thinned(profile.inSituTempC),
    practicalSalinity: thinned(profile.practicalSalinity),
    rhoKgM3: thinned(profile.rhoKgM3),
    buoyancyFrequencySquaredPerS2: thinned(profile.buoyancyFrequencySquaredPerS2),
    departureKPa: thinned(profile.departureKPa),
    firstSampleIndex: rows.indexOf(1),
    lastSampleIndex: rows.indexOf(column.n),
    departureUncertaintyKPa: thinned(uncertaintyKPa),
  };
}

const picked = (profile: Profile) => ({
  n: profile.n,
  depthM: profile.depthM,
  inSituTempC: profile.inSituTempC,
  practicalSalinity: profile.practicalSalinity,
  rhoKgM3: profile.rhoKgM3,
  buoyancyFrequencySquaredPerS2: profile.buoyancyFrequencySquaredPerS2,
  departureKPa: profile.departureKPa,
});
