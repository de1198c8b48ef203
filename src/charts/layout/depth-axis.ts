import { scaleLinear } from "d3-scale";

/** The vertical axis all panels share, in the unit shown; zero is the water surface. */
export interface DepthAxis {
  readonly bottom: number;
  readonly topPx: number;
  readonly bottomPx: number;
  readonly ticks: readonly { readonly yPx: number; readonly label: string }[];
}

const PX_PER_TICK = 46;
/** A little paper under the deepest point, so that it can be seen to end. */
const ROOM_BELOW = 1.03;

export const depthPx = (axis: Omit<DepthAxis, "ticks">, depth: number): number =>
  axis.topPx + (depth / axis.bottom) * (axis.bottomPx - axis.topPx);

/** The depth under a pointer, kept between the surface and the end of the axis. */
export const depthAtPx = (axis: Omit<DepthAxis, "ticks">, yPx: number): number =>
  Math.min(1, Math.max(0, (yPx - axis.topPx) / (axis.bottomPx - axis.topPx))) * axis.bottom;

/** An axis from the surface to just below the deepest of the depths. */
export function depthAxis(deepest: number, topPx: number, bottomPx: number): DepthAxis {
  const bottom = deepest > 0 ? deepest * ROOM_BELOW : 1;
  const axis = { bottom, topPx, bottomPx };
  const scale = scaleLinear().domain([0, bottom]);
  const count = Math.max(2, Math.floor((bottomPx - topPx) / PX_PER_TICK));
  const format = scale.tickFormat(count, "f");
  return { ...axis, ticks: scale.ticks(count).map((depth) => ({ yPx: depthPx(axis, depth), label: format(depth) })) };
}
