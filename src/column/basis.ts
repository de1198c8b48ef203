import type { WaterChoice } from "../water/index.ts";
import { type Accuracy, defaultAccuracy } from "./uncertainty/accuracy.ts";

/** The density of the estimate that the integrated pressure is held against. */
export type ReferenceDensity =
  | { readonly kind: "number"; readonly rhoKgM3: number }
  | { readonly kind: "surface" }
  | { readonly kind: "mean" };

/**
 * How the depth column came to be. Many probes measure pressure and write a "depth" worked out with a standard ocean
 * or with one density; the pressure is then recovered first.
 */
export type DepthMade =
  | { readonly kind: "measured" }
  | { readonly kind: "standard-ocean" }
  | { readonly kind: "constant"; readonly rhoKgM3: number };

/** Everything assumed beyond the samples. */
export interface Basis {
  readonly water: WaterChoice;
  /** Null: the cast's own latitude, or standard gravity where it has none. */
  readonly latitudeDeg: number | null;
  /** At the water surface. */
  readonly airPressureKPa: number;
  /** Practical salinity where the probe measured neither salinity nor conductivity. */
  readonly unmeasuredPracticalSalinity: number;
  readonly depthMade: DepthMade;
  readonly referenceDensity: ReferenceDensity;
  /** Water above the first sample and below the last: its salinity and temperature are those of that sample. */
  readonly surfaceGap: "hold";
  readonly bedGap: "hold";
  /** Depth of the bed below the water surface; null: the column ends at the last sample. */
  readonly bedDepthM: number | null;
  /** Elevation of the water surface above the datum at the time of the cast; null: no elevations are given. */
  readonly waterSurfaceElevationM: number | null;
  /** Standard uncertainties of all that goes in. */
  readonly accuracy: Accuracy;
}

export const defaultBasis: Basis = {
  water: { id: "teos10" },
  latitudeDeg: null,
  airPressureKPa: 101.325,
  unmeasuredPracticalSalinity: 0,
  depthMade: { kind: "measured" },
  referenceDensity: { kind: "number", rhoKgM3: 1025 },
  surfaceGap: "hold",
  bedGap: "hold",
  bedDepthM: null,
  waterSurfaceElevationM: null,
  accuracy: defaultAccuracy,
};
