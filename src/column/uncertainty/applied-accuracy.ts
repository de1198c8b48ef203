import type { SampleSalinity } from "../../cast/index.ts";
import { PA_PER_DBAR } from "../../gsw-ts-port/index.ts";
import type { Column } from "../column.ts";
import { surfaceGravityMs2 } from "../gravity.ts";
import { PLACED_GRAVITY_FRAC, UNPLACED_GRAVITY_FRAC } from "./accuracy.ts";

/** In the unit of what was measured: practical salinity, or conductivity in mS/cm. */
export type MeasuredSalinity = number;

/**
 * The standard uncertainties that apply to one column, gathered from its basis and from what was measured: of the
 * salinity as it was measured, of depth in m whether depth or pressure was.
 */
export interface AppliedAccuracy {
  readonly randomTempC: number;
  readonly systematicTempC: number;
  readonly randomSalinity: MeasuredSalinity;
  readonly systematicSalinity: MeasuredSalinity;
  readonly randomDepthM: number;
  readonly systematicDepthM: number;
  readonly gravityFrac: number;
}

/** Of gravity as a share of itself: the basis's word, or what it is where the latitude is known or not. */
export const gravityFracOf = ({ basis, latitudeDeg }: Column): number =>
  basis.accuracy.gravityFrac ?? (latitudeDeg === null ? UNPLACED_GRAVITY_FRAC : PLACED_GRAVITY_FRAC);

export function appliedAccuracy(column: Column, salinityFrom: SampleSalinity["source"]): AppliedAccuracy {
  const { accuracy } = column.basis;
  const { randomTempC, systematicTempC } = accuracy;
  return {
    randomTempC,
    systematicTempC,
    ...salinityAccuracy(column, salinityFrom),
    ...depthAccuracy(column),
    gravityFrac: gravityFracOf(column),
  };
}

function salinityAccuracy({ basis }: Column, salinityFrom: SampleSalinity["source"]) {
  const { accuracy } = basis;
  switch (salinityFrom) {
    case "basis":
      return { randomSalinity: 0, systematicSalinity: accuracy.unmeasuredSalinity };
    case "conductivity":
    case "specificConductance":
      return {
        randomSalinity: accuracy.randomConductivityMsCm,
        systematicSalinity: accuracy.systematicConductivityMsCm,
      };
    case "practicalSalinity":
    case "absSalinity":
      return { randomSalinity: accuracy.randomSalinity, systematicSalinity: accuracy.systematicSalinity };
  }
}

function depthAccuracy(column: Column) {
  const { accuracy } = column.basis;
  if (column.coordinate === "depth")
    return { randomDepthM: accuracy.randomDepthM, systematicDepthM: accuracy.systematicDepthM };
  const last = column.n - 1;
  const mPerDbar =
    column.seaPressureDbar[last]! > 0
      ? column.depthM[last]! / column.seaPressureDbar[last]!
      : PA_PER_DBAR / (column.referenceRhoKgM3 * surfaceGravityMs2(column.latitudeDeg));
  return {
    randomDepthM: accuracy.randomSeaPressureDbar * mPerDbar,
    systematicDepthM: accuracy.systematicSeaPressureDbar * mPerDbar,
  };
}
