import type { Basis } from "../survey/index.ts";

/** The basis as it is written into every output: one key an item, with its unit. */
export function basisJson(basis: Basis): Record<string, unknown> {
  const { water, referenceDensity, depthMade } = basis;
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
  };
}
