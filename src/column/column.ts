import type { Issue } from "../base/index.ts";
import type { CastId } from "../cast/index.ts";
import type { Basis } from "./basis.ts";

/**
 * One cast after integration: the knots of the physics contract, in order of depth. Between knots the model's own
 * salinity and temperature run linearly in the coordinate; above the first and below the last they are held. Plain
 * data, so that it can be handed between threads; every value at every depth follows from it (describeAtDepths).
 */
export interface Column {
  readonly castId: CastId;
  readonly basis: Basis;
  /** The latitude that gravity came from: the basis's, else the cast's, else null for standard gravity. */
  readonly latitudeDeg: number | null;
  /** What the probe's record is linear in: depth, or sea pressure where that was measured. */
  readonly coordinate: "depth" | "pressure";
  readonly n: number;
  /** Which sample of the cast each knot is. */
  readonly sampleIndex: Int32Array;
  readonly depthM: Float64Array;
  readonly seaPressureDbar: Float64Array;
  /** As measured, or from the measured conductivity or the basis. */
  readonly practicalSalinity: Float64Array;
  /** As measured, ITS-90. */
  readonly inSituTempC: Float64Array;
  /** On the water model's own scale. */
  readonly salinity: Float64Array;
  /** On the water model's own scale, ITS-90. */
  readonly tempC: Float64Array;
  /** Below the surface, from the basis or else the cast; null where neither has one below the last sample. */
  readonly bedDepthM: number | null;
  /** The bed where it is known and below the last sample, else the last sample. */
  readonly bottomDepthM: number;
  /** Density the constant-density estimate is made with. */
  readonly referenceRhoKgM3: number;
  readonly issues: readonly Issue[];
}
