import type { Cast } from "../../cast/index.ts";
import type { Column } from "../column.ts";
import { nodesAtDepths } from "../nodes.ts";
import { describeAtDepths } from "../profile.ts";
import { PLACED_GRAVITY_FRAC, UNPLACED_GRAVITY_FRAC } from "./accuracy.ts";
import { measuresConductivity } from "./sensitivities.ts";
import type { Contributor, Improvement, Uncertainty } from "./uncertainty.ts";
import { uncertaintyAtDepths, uncertaintyOf } from "./uncertainty-of.ts";

/**
 * What would lower the uncertainty of the pressure at a level most: one more sample (in either gap, or where the straight
 * line between samples may be most wrong) or one thing known twice as well. Best first; what would not help is left out.
 * A sample to be taken is expected to find what the column holds there now.
 * @param depthM of the level, below the water surface; outside the water there is nothing to improve
 */
export function whereToImprove(column: Column, cast: Cast, depthM: number): readonly Improvement[] {
  const now = uncertaintyAtDepths(column, cast, [depthM]);
  const nowKPa = now.combinedKPa[0]!;
  const judged = (kind: Improvement["kind"], words: string, sampleDepthM: number | null, combinedKPa: number) => ({
    kind,
    words,
    depthM: sampleDepthM,
    combinedKPa,
    gainFrac: 1 - combinedKPa / nowKPa,
  });
  const bySample = sampleDepths(column, cast, depthM).map((sampleDepthM) => {
    const then = uncertaintyAtDepths(withSample(column, sampleDepthM), cast, [depthM]);
    return judged("sample", `one more sample at ${sampleDepthM.toFixed(2)} m`, sampleDepthM, then.combinedKPa[0]!);
  });
  const bySensor = sensors(column, now).map(({ words, contributors, leftFrac }) => {
    const saved = contributors.reduce((sum, name) => sum + (1 - leftFrac ** 2) * now.contributionKPa[name][0]! ** 2, 0);
    return judged("sensor", words, null, Math.sqrt(Math.max(nowKPa ** 2 - saved, 0)));
  });
  return [...bySample, ...bySensor].filter(({ gainFrac }) => gainFrac > 0).sort((a, b) => b.gainFrac - a.gainFrac);
}

interface Sensor {
  readonly words: string;
  readonly contributors: readonly Contributor[];
  /** What would be left of their standard uncertainty. */
  readonly leftFrac: number;
}

/** Everything that can be bought, calibrated or looked up. */
function sensors(column: Column, { salinityFrom }: Uncertainty): readonly Sensor[] {
  const twice = (words: string, ...contributors: readonly Contributor[]): Sensor => ({
    words: `${words} known twice as well`,
    contributors,
    leftFrac: 0.5,
  });
  const latitude: Sensor = {
    words: "the latitude, for gravity",
    contributors: ["gravity"],
    leftFrac: PLACED_GRAVITY_FRAC / UNPLACED_GRAVITY_FRAC,
  };
  const gravityUnplaced = column.latitudeDeg === null && column.basis.accuracy.gravityFrac === null;
  return [
    twice("temperature", "temperature-random", "temperature-systematic"),
    twice(measuresConductivity(salinityFrom) ? "conductivity" : "salinity", "salinity-random", "salinity-systematic"),
    twice("depths of the samples", "sample-depth-random", "sample-depth-systematic", "depth-scale"),
    twice("depth of the level", "level-depth"),
    twice("composition of the salt", "composition"),
    ...(gravityUnplaced ? [latitude] : []),
  ];
}

/** Where one more sample could tell something: at the surface, at the level below the last sample, and between samples. */
function sampleDepths(column: Column, cast: Cast, levelDepthM: number): readonly number[] {
  const firstDepthM = column.depthM[0]!;
  const lastDepthM = column.depthM[column.n - 1]!;
  const between = widestOpen(column, uncertaintyOf(column, cast), levelDepthM);
  return [
    ...(firstDepthM > 0 ? [0] : []),
    ...(between === null ? [] : [between]),
    ...(levelDepthM > lastDepthM ? [levelDepthM] : []),
  ];
}

/** Halfway down the interval above a level over which the straight line may be most wrong; null where there is none. */
function widestOpen(column: Column, { sampling }: Uncertainty, levelDepthM: number): number | null {
  let most = 0;
  let depthM: number | null = null;
  for (let k = 0; k + 1 < column.n && column.depthM[k]! < levelDepthM; k++) {
    // The first row of the profile is the surface.
    const boundKPa = sampling.boundKPa[k + 2]! - sampling.boundKPa[k + 1]!;
    if (!(boundKPa > most)) continue;
    most = boundKPa;
    depthM = (column.depthM[k]! + Math.min(column.depthM[k + 1]!, levelDepthM)) / 2;
  }
  return depthM;
}

type Knots = Pick<Column, "depthM" | "seaPressureDbar" | "practicalSalinity" | "inSituTempC" | "salinity" | "tempC">;

/** The column with one more knot, where it holds what it has there already. */
function withSample(column: Column, depthM: number): Column {
  const added: Knots = { ...describeAtDepths(column, [depthM]), ...nodesAtDepths(column, [depthM]) };
  const below = column.depthM.findIndex((knotM) => knotM > depthM);
  const at = below < 0 ? column.n : below;
  const inserted = (quantity: keyof Knots): Float64Array => {
    const values = column[quantity];
    return Float64Array.from([...values.subarray(0, at), ...added[quantity], ...values.subarray(at)]);
  };
  return {
    ...column,
    n: column.n + 1,
    depthM: inserted("depthM"),
    seaPressureDbar: inserted("seaPressureDbar"),
    practicalSalinity: inserted("practicalSalinity"),
    inSituTempC: inserted("inSituTempC"),
    salinity: inserted("salinity"),
    tempC: inserted("tempC"),
  };
}
