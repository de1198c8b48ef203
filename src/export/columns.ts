import type { Profile } from "../survey/index.ts";
import { type ColumnDescription, numberColumn } from "./table.ts";

/** A numeric column of a profile and where its values stand. */
export interface ProfileColumn extends ColumnDescription {
  readonly values: (profile: Profile) => Float64Array;
}

const number = (
  name: string,
  unit: string,
  description: string,
  values: (profile: Profile) => Float64Array,
): ProfileColumn => ({ ...numberColumn(name, unit, description), values });

const percent = (fractions: Float64Array): Float64Array => fractions.map((fraction) => fraction * 100);

/** The numeric columns of every profile table, in order; the names are part of the product and do not change. */
export const PROFILE_COLUMNS: readonly ProfileColumn[] = [
  number("depth_m", "m", "Depth below the water surface", (p) => p.depthM),
  number("elevation_m", "m", "Elevation above the datum of the basis", (p) => p.elevationM),
  number("sea_pressure_dbar", "dbar", "Pressure above that at the water surface", (p) => p.seaPressureDbar),
  number("gauge_pressure_kPa", "kPa", "Pressure above that of the air at the water surface", (p) => p.gaugePressureKPa),
  number("absolute_pressure_kPa", "kPa", "Air pressure of the basis plus gauge pressure", (p) => p.absPressureKPa),
  number("temperature_degC", "degC", "In-situ temperature, ITS-90", (p) => p.inSituTempC),
  number("practical_salinity", "1", "Practical salinity, PSS-78", (p) => p.practicalSalinity),
  number("absolute_salinity_g_kg", "g/kg", "Absolute salinity of the reference composition", (p) => p.absSalinityGKg),
  number("conservative_temperature_degC", "degC", "Conservative temperature, ITS-90", (p) => p.consTempC),
  number("density_kg_m3", "kg/m3", "In-situ density by the water model of the basis", (p) => p.rhoKgM3),
  number("sigma0_kg_m3", "kg/m3", "Potential density at zero sea pressure less 1000 kg/m3", (p) => p.sigma0KgM3),
  number("sound_speed_m_s", "m/s", "Speed of sound", (p) => p.soundSpeedMs),
  number(
    "buoyancy_frequency_squared_s-2",
    "s-2",
    "Buoyancy frequency squared of the water between this sample and the next below",
    (p) => p.buoyancyFrequencySquaredPerS2,
  ),
  number(
    "constant_density_pressure_kPa",
    "kPa",
    "Gauge pressure by the reference density of the basis, times surface gravity, times depth",
    (p) => p.constantDensityPressureKPa,
  ),
  number("departure_kPa", "kPa", "Gauge pressure less the constant-density pressure", (p) => p.departureKPa),
  number("departure_m", "m", "The departure as a head of water of the reference density", (p) => p.departureM),
  number("departure_percent", "%", "The departure over the gauge pressure", (p) => percent(p.departureFrac)),
];

/** Stands behind PROFILE_COLUMNS in every table of them; it belongs to the pressure, not to the profile. */
export const UNCERTAINTY_COLUMN: ColumnDescription = numberColumn(
  "pressure_uncertainty_kPa",
  "kPa",
  "Standard uncertainty (k = 1) of the gauge pressure; of a level, how well its depth is known is in it",
);
