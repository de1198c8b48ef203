import type { Point } from "./decimate-line.ts";
import type { DepthAxis } from "./depth-axis.ts";
import type { ValueAxis } from "./value-axis.ts";

/* What a sheet of linked profiles is made from, and what it becomes. All numbers are in the units shown. */

/** One cast in one panel: rows from the surface to the bottom. */
export interface CurveInput {
  readonly castId: string;
  readonly colourIndex: number;
  readonly isInHand: boolean;
  readonly depths: Float64Array;
  readonly values: Float64Array;
  /** How far the truth may lie to either side; null where that is not drawn. */
  readonly halfWidths: Float64Array | null;
  /** Rows outside these two belong to water the probe did not sample. */
  readonly firstSampleIndex: number;
  readonly lastSampleIndex: number;
}

export interface PanelInput {
  readonly id: string;
  readonly title: string;
  /** Shown where the title does not fit. */
  readonly shortTitle: string;
  readonly unit: string;
  readonly scale: "linear" | "log";
  /** A value belongs to the water down to the next row, rather than to its depth. */
  readonly isStepped: boolean;
  readonly withZero: boolean;
  /** Width relative to the other panels. */
  readonly share: number;
  /** Left out where the sheet is too narrow for all. */
  readonly isDroppable: boolean;
  readonly curves: readonly CurveInput[];
}

export interface LevelInput {
  readonly levelId: string;
  readonly depth: number;
  readonly label: string;
}

export interface SheetInput {
  readonly depthUnit: string;
  readonly deepest: number;
  readonly panels: readonly PanelInput[];
  /** Stretches of depth without samples in the cast in hand. */
  readonly gaps: readonly { readonly from: number; readonly to: number }[];
}

export interface Size {
  readonly widthPx: number;
  readonly heightPx: number;
}

export interface CurveLayout {
  readonly castId: string;
  readonly colourIndex: number;
  readonly isInHand: boolean;
  /** Between the values less and plus their half widths; empty where there are none. */
  readonly bandPath: string;
  /** Where there are samples. */
  readonly solidPath: string;
  /** Where there are none. */
  readonly dottedPath: string;
  /** Along the left edge: values too small for the axis. */
  readonly lowPath: string;
  /** Along the left edge: negative values, which a log axis cannot show. */
  readonly negativePath: string;
  readonly points: readonly Point[];
}

export interface PanelLayout {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly axis: ValueAxis;
  /** Of the line where the value is zero, where the panel has one. */
  readonly zeroPx: number | null;
  readonly curves: readonly CurveLayout[];
  /** What the marks at the left edge mean; none where there are no marks. */
  readonly edgeNotes: readonly string[];
}

export interface LevelLayout {
  readonly levelId: string;
  readonly label: string;
  readonly yPx: number;
  readonly labelXPx: number;
  readonly labelYPx: number;
  readonly anchor: "start" | "end";
}

export interface SheetLayout extends Size {
  readonly leftPx: number;
  readonly rightPx: number;
  /** So many curves that only their mass can be seen. */
  readonly isCrowded: boolean;
  readonly depthUnit: string;
  readonly depth: DepthAxis;
  readonly panels: readonly PanelLayout[];
  readonly gaps: readonly { readonly topPx: number; readonly heightPx: number }[];
}
