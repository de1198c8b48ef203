import {
  conservativeTemperature,
  density,
  exactDensity,
  freezingTemperature,
  halineContraction,
  practicalSalinityFromConductivity,
  practicalSalinityFromReference,
  referenceSalinity,
  soundSpeed,
  thermalExpansion,
} from "../gsw-ts-port/index.ts";

/** Single points of water, one entry a point. One of the salinities is given; of several the first in this order counts. */
export interface WaterPoints {
  readonly absSalinityGKg?: Float64Array;
  readonly practicalSalinity?: Float64Array;
  /** In situ, not compensated for temperature. */
  readonly conductivityMsCm?: Float64Array;
  /** ITS-90. */
  readonly inSituTempC: Float64Array;
  readonly seaPressureDbar: Float64Array;
}

/** TEOS-10 properties of each point, by output name; NaN where a point lacks a value. */
export type WaterProperties = Record<(typeof PROPERTY_NAMES)[number], Float64Array>;

const PROPERTY_NAMES = [
  "practical_salinity",
  "absolute_salinity_g_kg",
  "conservative_temperature_degC",
  "density_kg_m3",
  "density_exact_kg_m3",
  "sigma0_kg_m3",
  "thermal_expansion_1_K",
  "haline_contraction_kg_g",
  "sound_speed_m_s",
  "freezing_temperature_degC",
] as const;

/** TEOS-10 properties of single points, with the reference composition. NaN in, NaN out. */
export function waterAtPoints(points: WaterPoints): WaterProperties {
  const { inSituTempC, seaPressureDbar } = points;
  const each = (valueAt: (i: number) => number): Float64Array => Float64Array.from(inSituTempC, (_, i) => valueAt(i));
  const practical =
    points.practicalSalinity ??
    each((i) =>
      points.absSalinityGKg
        ? practicalSalinityFromReference(points.absSalinityGKg[i]!)
        : practicalSalinityFromConductivity(
            points.conductivityMsCm?.[i] ?? Number.NaN,
            inSituTempC[i]!,
            seaPressureDbar[i]!,
          ),
    );
  const absSalinityGKg = points.absSalinityGKg ?? practical.map(referenceSalinity);
  const consTempC = each((i) => conservativeTemperature(absSalinityGKg[i]!, inSituTempC[i]!, seaPressureDbar[i]!));
  const bySaltAndHeat = (
    property: (absSalinityGKg: number, consTempC: number, seaPressureDbar: number) => number,
  ): Float64Array => each((i) => property(absSalinityGKg[i]!, consTempC[i]!, seaPressureDbar[i]!));
  return {
    practical_salinity: practical,
    absolute_salinity_g_kg: absSalinityGKg,
    conservative_temperature_degC: consTempC,
    density_kg_m3: bySaltAndHeat(density),
    density_exact_kg_m3: each((i) => exactDensity(absSalinityGKg[i]!, inSituTempC[i]!, seaPressureDbar[i]!)),
    sigma0_kg_m3: each((i) => density(absSalinityGKg[i]!, consTempC[i]!, 0) - 1000),
    thermal_expansion_1_K: bySaltAndHeat(thermalExpansion),
    haline_contraction_kg_g: bySaltAndHeat(halineContraction),
    sound_speed_m_s: bySaltAndHeat(soundSpeed),
    freezing_temperature_degC: each((i) => freezingTemperature(absSalinityGKg[i]!, seaPressureDbar[i]!)),
  };
}
