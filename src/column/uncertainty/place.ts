import type { Column } from "../column.ts";
import { knotAbove } from "../nodes.ts";

/** Where a depth lies among a column's knots. */
export interface Place {
  readonly depthM: number;
  /** The last knot at or above; -1 above the first. */
  readonly knotIndex: number;
  /** How far on the way to the next knot; 0 where there is none. */
  readonly shareFrac: number;
}

export function placeOf(column: Column, depthM: number): Place {
  const knotIndex = knotAbove(column, depthM);
  if (knotIndex < 0 || knotIndex + 1 >= column.n) return { depthM, knotIndex, shareFrac: 0 };
  const aboveM = column.depthM[knotIndex]!;
  return { depthM, knotIndex, shareFrac: (depthM - aboveM) / (column.depthM[knotIndex + 1]! - aboveM) };
}
