import type { Issue } from "../base/index.ts";

/**
 * Samples as a struct of arrays, one entry a sample, in the order of the file. A column that the file does not have is
 * null; a value that a row does not have is NaN. Nothing is derived here: what was measured stays as it was measured.
 */
export interface Samples {
  readonly n: number;
  /** 1-based line of each sample in its file. */
  readonly lineIndex: Int32Array;
  /** Positive down from the water surface. */
  readonly depthM: Float64Array | null;
  /** Zero at the water surface. */
  readonly seaPressureDbar: Float64Array | null;
  /** ITS-90. */
  readonly inSituTempC: Float64Array;
  readonly practicalSalinity: Float64Array | null;
  /** In situ, not compensated for temperature. */
  readonly conductivityMsCm: Float64Array | null;
  /** Conductivity compensated to 25 degC by the instrument. */
  readonly specificConductanceMsCm: Float64Array | null;
  /** As the file states it, on any composition. */
  readonly absSalinityGKg: Float64Array | null;
  /** Dry mass of suspended grains per volume of the mixture. */
  readonly suspendedSedimentKgM3: Float64Array | null;
  /** Since the first sample of the cast. */
  readonly timeS: Float64Array | null;
  /** The flag the file itself gives a sample, in the meaning of the QARTOD manuals: 1 pass, 2 not evaluated, 3 suspect, 4 fail, 9 missing. */
  readonly statedFlag: Uint8Array | null;
  /** Density anomaly at zero sea pressure as the file states it, density minus 1000: never used, only compared. */
  readonly statedSigmaKgM3: Float64Array | null;
}

export type CastId = string & { readonly castId: unique symbol };

/** One lowering of a probe at one place and time. */
export interface Cast {
  readonly id: CastId;
  /** Short and unique within a survey; made of station, date and time as far as needed. */
  readonly name: string;
  /** As written in the file. */
  readonly station: string | null;
  /** ISO 8601 date or date and time, in the file's own zone. */
  readonly time: string | null;
  readonly latitudeDeg: number | null;
  readonly longitudeDeg: number | null;
  /** Along the channel, from the file's own origin. */
  readonly distanceKm: number | null;
  /** Depth of the bed below the water surface at the time of the cast, where the file or a list of stations has it. */
  readonly waterDepthM: number | null;
  readonly fileName: string;
  readonly samples: Samples;
  /** What was met while reading this cast; rows that were left out are named here. */
  readonly issues: readonly Issue[];
}
