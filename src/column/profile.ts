import { conservativeTemperature, exactSoundSpeed, potentialTemperature, soundSpeed } from "../gsw-ts-port/index.ts";
import { absoluteSalinityOf, inSituTemperatureOf, practicalSalinityOf, waterModel } from "../water/index.ts";
import { buoyancyFrequency } from "./buoyancy-frequency.ts";
import type { Column } from "./column.ts";
import { surfaceGravityMs2 } from "./gravity.ts";
import { KPA_PER_DBAR } from "./kilopascal.ts";
import { type Nodes, nodesAtDepths, nodesOfProfile, type Origin } from "./nodes.ts";

/**
 * Everything there is to say about some depths of a column, one entry a depth. NaN where a value does not exist: no
 * elevation without a datum, no buoyancy frequency but below a sample that has another below it, nothing below the bed.
 */
export interface Profile {
  readonly n: number;
  readonly origin: readonly Origin[];
  readonly depthM: Float64Array;
  readonly elevationM: Float64Array;
  readonly seaPressureDbar: Float64Array;
  readonly gaugePressureKPa: Float64Array;
  readonly absPressureKPa: Float64Array;
  readonly inSituTempC: Float64Array;
  readonly practicalSalinity: Float64Array;
  readonly absSalinityGKg: Float64Array;
  readonly consTempC: Float64Array;
  readonly rhoKgM3: Float64Array;
  /** Density of the water brought to the surface without heat exchange, less 1000. */
  readonly sigma0KgM3: Float64Array;
  readonly soundSpeedMs: Float64Array;
  /** Of the water between this row and the next sample below. */
  readonly buoyancyFrequencySquaredPerS2: Float64Array;
  /** The basis's reference density times surface gravity times depth. */
  readonly constantDensityPressureKPa: Float64Array;
  /** Integrated less constant-density pressure. */
  readonly departureKPa: Float64Array;
  /** The departure as a head of water of the reference density. */
  readonly departureM: Float64Array;
  /** The departure over the integrated pressure; NaN at the surface. */
  readonly departureFrac: Float64Array;
}

/** The column as measured: surface, samples, and the bed where the basis gives one. */
export function sampledProfile(column: Column): Profile {
  const nodes = nodesOfProfile(column);
  const { squaredPerS2 } = buoyancyFrequency(column);
  return describe(column, nodes, (k) => (k >= 0 && k < squaredPerS2.length ? squaredPerS2[k]! : Number.NaN));
}

/** The column at depths of the user's choosing, m below the water surface. */
export const describeAtDepths = (column: Column, depthsM: ArrayLike<number>): Profile =>
  describe(column, nodesAtDepths(column, depthsM), () => Number.NaN);

function describe(column: Column, nodes: Nodes, buoyancyAtKnot: (knotIndex: number) => number): Profile {
  const { n, depthM, seaPressureDbar, salinity, tempC, knotIndex, origin } = nodes;
  const { airPressureKPa, waterSurfaceElevationM } = column.basis;
  const model = waterModel(column.basis.water);
  const weightKPaPerM = (column.referenceRhoKgM3 * surfaceGravityMs2(column.latitudeDeg)) / 1000;
  const each = (valueAt: (i: number) => number): Float64Array => {
    const values = new Float64Array(n);
    for (let i = 0; i < n; i++) values[i] = valueAt(i);
    return values;
  };
  /** What was measured stays as measured; elsewhere it follows from the model's own salinity and temperature. */
  const measuredOr = (values: Float64Array, derivedAt: (i: number) => number): Float64Array =>
    each((i) => (knotIndex[i]! >= 0 ? values[knotIndex[i]!]! : derivedAt(i)));

  const gaugePressureKPa = each((i) => seaPressureDbar[i]! * KPA_PER_DBAR);
  // A depth without water (above the surface, below the bed) has no estimate either.
  const constantDensityPressureKPa = each((i) =>
    Number.isNaN(gaugePressureKPa[i]!) ? Number.NaN : weightKPaPerM * depthM[i]!,
  );
  const departureKPa = each((i) => gaugePressureKPa[i]! - constantDensityPressureKPa[i]!);
  const absSalinityGKg = each((i) => absoluteSalinityOf(model, salinity[i]!));
  const inSituTempC = measuredOr(column.inSituTempC, (i) =>
    inSituTemperatureOf(model, { salinity: salinity[i]!, tempC: tempC[i]!, seaPressureDbar: seaPressureDbar[i]! }),
  );
  const consTempC =
    model.temperatureScale === "conservative"
      ? tempC
      : each((i) => conservativeTemperature(absSalinityGKg[i]!, inSituTempC[i]!, seaPressureDbar[i]!));
  const surfacedTempC =
    model.temperatureScale === "conservative"
      ? tempC
      : each((i) => potentialTemperature(absSalinityGKg[i]!, inSituTempC[i]!, seaPressureDbar[i]!));
  return {
    n,
    origin,
    depthM,
    elevationM: each((i) => (waterSurfaceElevationM ?? Number.NaN) - depthM[i]!),
    seaPressureDbar,
    gaugePressureKPa,
    absPressureKPa: each((i) => airPressureKPa + gaugePressureKPa[i]!),
    inSituTempC,
    practicalSalinity: measuredOr(column.practicalSalinity, (i) => practicalSalinityOf(model, salinity[i]!)),
    absSalinityGKg,
    consTempC,
    rhoKgM3: each((i) => model.density(salinity[i]!, tempC[i]!, seaPressureDbar[i]!)),
    sigma0KgM3: each((i) => model.density(salinity[i]!, surfacedTempC[i]!, 0) - 1000),
    soundSpeedMs: each((i) =>
      model.id === "exact"
        ? exactSoundSpeed(absSalinityGKg[i]!, inSituTempC[i]!, seaPressureDbar[i]!)
        : soundSpeed(absSalinityGKg[i]!, consTempC[i]!, seaPressureDbar[i]!),
    ),
    buoyancyFrequencySquaredPerS2: each((i) => buoyancyAtKnot(knotIndex[i]!)),
    constantDensityPressureKPa,
    departureKPa,
    departureM: each((i) => departureKPa[i]! / weightKPaPerM),
    departureFrac: each((i) => departureKPa[i]! / gaugePressureKPa[i]!),
  };
}
