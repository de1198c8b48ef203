import type { Cast, CastId, Samples } from "../../src/cast/index.ts";

/** A cast from bare arrays, for tests. */
export function castOf(
  columns: {
    readonly depthM?: readonly number[];
    readonly seaPressureDbar?: readonly number[];
    readonly inSituTempC: readonly number[];
    readonly practicalSalinity?: readonly number[];
    readonly conductivityMsCm?: readonly number[];
    readonly specificConductanceMsCm?: readonly number[];
    readonly statedSigmaKgM3?: readonly number[];
    readonly absSalinityGKg?: readonly number[];
    readonly timeS?: readonly number[];
    readonly statedFlag?: readonly number[];
  },
  place: Partial<Pick<Cast, "name" | "latitudeDeg" | "station" | "distanceKm" | "waterDepthM">> = {},
): Cast {
  const array = (values: readonly number[] | undefined) => (values ? Float64Array.from(values) : null);
  const samples: Samples = {
    n: columns.inSituTempC.length,
    lineIndex: Int32Array.from(columns.inSituTempC, (_, i) => i + 2),
    depthM: array(columns.depthM),
    seaPressureDbar: array(columns.seaPressureDbar),
    inSituTempC: Float64Array.from(columns.inSituTempC),
    practicalSalinity: array(columns.practicalSalinity),
    conductivityMsCm: array(columns.conductivityMsCm),
    specificConductanceMsCm: array(columns.specificConductanceMsCm),
    statedSigmaKgM3: array(columns.statedSigmaKgM3),
    absSalinityGKg: array(columns.absSalinityGKg),
    suspendedSedimentKgM3: null,
    timeS: array(columns.timeS),
    statedFlag: columns.statedFlag ? Uint8Array.from(columns.statedFlag) : null,
  };
  return {
    id: "cast" as CastId,
    name: "cast",
    station: null,
    time: null,
    latitudeDeg: null,
    longitudeDeg: null,
    distanceKm: null,
    waterDepthM: null,
    fileName: "cast.csv",
    issues: [],
    ...place,
    samples,
  };
}
