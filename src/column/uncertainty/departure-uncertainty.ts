import type { Column } from "../column.ts";
import type { Profile } from "../profile.ts";
import { gravityFracOf } from "./applied-accuracy.ts";

/**
 * Standard uncertainty (k = 1) of the departure in kPa, from that of the gauge pressure at the same rows. Both the
 * integrated pressure and the estimate are made with the same gravity, so that its error stays in their difference only
 * in proportion to it; all else carries over. NaN where there is no pressure.
 */
export function departureUncertaintyKPa(
  column: Column,
  { gaugePressureKPa, departureKPa }: Profile,
  pressureUncertaintyKPa: Float64Array,
): Float64Array {
  const gravityFrac = gravityFracOf(column);
  return pressureUncertaintyKPa.map((uncertainty, i) => {
    const inPressure = gravityFrac * gaugePressureKPa[i]!;
    const inDeparture = gravityFrac * departureKPa[i]!;
    return Math.sqrt(Math.max(0, uncertainty ** 2 - inPressure ** 2 + inDeparture ** 2));
  });
}
