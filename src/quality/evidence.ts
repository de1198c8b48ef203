import { type Cast, type Samples, sampleSalinity } from "../cast/index.ts";
import { ownSalinity, ownTemperature, waterModel } from "../water/index.ts";
import { type InOwnUnit, resolutionOf } from "./resolution.ts";

/** A column of numbers as the probe recorded it. */
export interface RecordedColumn {
  readonly name: string;
  readonly values: Float64Array;
  /** The step in which it was recorded. */
  readonly resolution: InOwnUnit;
  readonly write: (value: InOwnUnit) => string;
}

/** A quantity of the water that runs along a cast; the checks treat each the same way, by its own limits. */
export interface Quantity extends RecordedColumn {
  readonly name: "temperature" | "salinity";
}

/** What the checks look at, one entry a sample as read. */
export interface Evidence {
  readonly samples: Samples;
  /** Positive down. Of a record in sea pressure 1 m a dbar: good to 3 %, and no check stands on less. */
  readonly depthM: Float64Array;
  readonly inSituTempC: Float64Array;
  /** As measured or from the conductivity; what is assumed where neither was measured. */
  readonly practicalSalinity: Float64Array;
  readonly isSalinityMeasured: boolean;
  /** The quantities that were measured, salinity perhaps by way of conductivity. */
  readonly quantities: readonly Quantity[];
  /** What the sensors themselves gave: of a conductivity cell the conductivity. */
  readonly recorded: readonly RecordedColumn[];
}

/** @param unmeasuredPracticalSalinity what the basis says where the probe measured none */
export function evidenceOf(cast: Cast, unmeasuredPracticalSalinity: number): Evidence {
  const { samples } = cast;
  const { n, inSituTempC } = samples;
  const depthM = samples.seaPressureDbar ?? samples.depthM ?? new Float64Array(n).fill(Number.NaN);
  const measured = sampleSalinity(samples, unmeasuredPracticalSalinity);
  const practicalSalinity = Float64Array.from(depthM, (pressureDbar, i) => measured.at(i, pressureDbar || 0));
  const isSalinityMeasured = measured.source !== "basis";
  const temperature: Quantity = { ...column(inSituTempC, "degC"), name: "temperature" };
  const salinity: Quantity = { ...column(practicalSalinity), name: "salinity" };
  const conductivity = samples.conductivityMsCm ?? samples.specificConductanceMsCm;
  const isByCell = measured.source === "conductivity" || measured.source === "specificConductance";
  const cell = isByCell && conductivity ? { ...column(conductivity, "mS/cm"), name: "conductivity" } : salinity;
  return {
    samples,
    depthM,
    inSituTempC,
    practicalSalinity,
    isSalinityMeasured,
    quantities: isSalinityMeasured ? [temperature, salinity] : [temperature],
    recorded: isSalinityMeasured ? [temperature, cell] : [temperature],
  };
}

const column = (values: Float64Array, unit?: string): Omit<RecordedColumn, "name"> => ({
  values,
  resolution: resolutionOf(values),
  write: (value) => (unit === undefined ? written(value) : `${written(value)} ${unit}`),
});

/** To the third decimal, which is as far as a sentence needs. */
export const written = (value: InOwnUnit): string => String(Math.round(value * 1000) / 1000);

const TEOS10 = waterModel({ id: "teos10" });

/** A sample of water as it was measured, and the sea pressure it is thought to be brought to. */
export interface Water {
  readonly practicalSalinity: number;
  readonly inSituTempC: number;
  readonly seaPressureDbar: number;
  readonly atSeaPressureDbar: number;
}

/**
 * Density less 1000 kg/m3 of water in situ at one sea pressure, after it was brought to another without heat exchange;
 * TEOS-10. NaN in, NaN out.
 */
export function sigmaKgM3(water: Water): number {
  const salinity = ownSalinity(TEOS10, water.practicalSalinity);
  const { inSituTempC, seaPressureDbar } = water;
  return (
    TEOS10.density(
      salinity,
      ownTemperature(TEOS10, { salinity, inSituTempC, seaPressureDbar }),
      water.atSeaPressureDbar,
    ) - 1000
  );
}
