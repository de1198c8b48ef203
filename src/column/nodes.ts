import type { Column } from "./column.ts";
import { frameOf, Stretch } from "./stretch.ts";

/** How a row of a profile came to be: measured, asked for, or in water the probe did not sample. */
export type Origin = "sample" | "level" | "surface-gap" | "bed-gap";

/** The state of the water at some depths of a column, on the model's own scales; the ground of every derived quantity. */
export interface Nodes {
  readonly n: number;
  readonly depthM: Float64Array;
  readonly seaPressureDbar: Float64Array;
  readonly salinity: Float64Array;
  readonly tempC: Float64Array;
  readonly origin: readonly Origin[];
  /** Which knot of the column a node is; -1 where it is none. */
  readonly knotIndex: Int32Array;
}

/** Index of the last knot at or above a depth; -1 above the first. */
export function knotAbove(column: Column, depthM: number): number {
  let low = 0;
  let high = column.n;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (column.depthM[middle]! <= depthM) low = middle + 1;
    else high = middle;
  }
  return low - 1;
}

/**
 * The state at any depths, m below the water surface, by the same equation that made the column. Held above the first
 * and below the last sample; NaN above the surface and below a known bed.
 */
export function nodesAtDepths(column: Column, depthsM: ArrayLike<number>, origin: Origin = "level"): Nodes {
  const n = depthsM.length;
  const stretch = new Stretch(frameOf(column));
  const nodes = {
    n,
    depthM: Float64Array.from(depthsM),
    seaPressureDbar: new Float64Array(n).fill(Number.NaN),
    salinity: new Float64Array(n).fill(Number.NaN),
    tempC: new Float64Array(n).fill(Number.NaN),
    origin: new Array<Origin>(n).fill(origin),
    knotIndex: new Int32Array(n).fill(-1),
  };
  const { salinity, tempC } = column;
  const along = column.coordinate === "depth" ? column.depthM : column.seaPressureDbar;
  for (let i = 0; i < n; i++) {
    const depthM = nodes.depthM[i]!;
    if (!(depthM >= 0) || depthM > (column.bedDepthM ?? Number.POSITIVE_INFINITY)) continue;
    const above = knotAbove(column, depthM);
    const k = Math.max(above, 0);
    if (above >= 0 && k + 1 < column.n) stretch.between({ along, salinity, tempC }, k);
    else stretch.hold(salinity[k]!, tempC[k]!);
    const fromDepthM = above < 0 ? 0 : column.depthM[k]!;
    const fromPressureDbar = above < 0 ? 0 : column.seaPressureDbar[k]!;
    const pressureDbar = stretch.pressureDown(fromDepthM, fromPressureDbar, depthM);
    nodes.seaPressureDbar[i] = pressureDbar;
    nodes.salinity[i] = stretch.salinityAt(depthM, pressureDbar);
    nodes.tempC[i] = stretch.tempCAt(depthM, pressureDbar);
  }
  return nodes;
}

/** The column's own rows: the water surface, every sample, and the bed where the basis gives one. */
export function nodesOfProfile(column: Column): Nodes {
  const surface = nodesAtDepths(column, [0], "surface-gap");
  const bed = nodesAtDepths(column, column.bedDepthM === null ? [] : [column.bedDepthM], "bed-gap");
  const joined = (pick: (part: Pick<Nodes, "depthM" | "seaPressureDbar" | "salinity" | "tempC">) => Float64Array) =>
    Float64Array.from([...pick(surface), ...pick(column), ...pick(bed)]);
  return {
    n: 1 + column.n + bed.n,
    depthM: joined((part) => part.depthM),
    seaPressureDbar: joined((part) => part.seaPressureDbar),
    salinity: joined((part) => part.salinity),
    tempC: joined((part) => part.tempC),
    origin: [...surface.origin, ...new Array<Origin>(column.n).fill("sample"), ...bed.origin],
    knotIndex: Int32Array.from([-1, ...Int32Array.from({ length: column.n }, (_, k) => k), ...bed.knotIndex]),
  };
}
