import type { Basis } from "../survey/index.ts";

/** The basis as it is written into every output: one key an item, with its unit. */
export function basisJson(basis: Basis): Record<string, unknown> {
  const { water, referenceDensity, depthMade, accuracy } = basis;
  return {
    water: water.id === "constant" ? { constant_density_kg_m3: water.rhoKgM3 } : water.id,
    latitude_deg: basis.latitudeDeg,
    air_pressure_kPa: basis.airPressureKPa,
    unmeasured_practical_salinity: basis.unmeasuredPracticalSalinity,
    depth_made: depthMade.kind === "constant" ? { constant_density_kg_m3: depthMade.rhoKgM3 } : depthMade.kind,
    reference_density:
      referenceDensity.kind === "number" ? { density_kg_m3: referenceDensity.rhoKgM3 } : referenceDensity.kind,
    surface_gap: basis.surfaceGap,
    bed_gap: basis.bedGap,
    bed_depth_m: basis.bedDepthM,
    water_surface_elevation_m: basis.waterSurfaceElevationM,
    temperature_random_uncertainty_degC: accuracy.randomTempC,
    temperature_systematic_uncertainty_degC: accuracy.systematicTempC,
    practical_salinity_random_uncertainty: accuracy.randomSalinity,
    practical_salinity_systematic_uncertainty: accuracy.systematicSalinity,
    unmeasured_practical_salinity_uncertainty: accuracy.unmeasuredSalinity,
    conductivity_random_uncertainty_mS_cm: accuracy.randomConductivityMsCm,
    conductivity_systematic_uncertainty_mS_cm: accuracy.systematicConductivityMsCm,
    sample_depth_random_uncertainty_m: accuracy.randomDepthM,
    sample_depth_systematic_uncertainty_m: accuracy.systematicDepthM,
    sea_pressure_random_uncertainty_dbar: accuracy.randomSeaPressureDbar,
    sea_pressure_systematic_uncertainty_dbar: accuracy.systematicSeaPressureDbar,
    depth_scale_uncertainty_fraction: accuracy.depthScaleFrac,
    level_depth_uncertainty_m: accuracy.levelDepthM,
    gravity_uncertainty_fraction: accuracy.gravityFrac,
    air_pressure_uncertainty_kPa: accuracy.airPressureKPa,
    equation_of_state_uncertainty_kg_m3: accuracy.equationOfStateKgM3,
    composition_uncertainty_fraction: accuracy.compositionFrac,
  };
}
