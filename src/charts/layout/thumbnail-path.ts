import { line } from "d3-shape";
import { decimateLine, type Point } from "./decimate-line.ts";
import type { Size } from "./sheet.ts";

const INSET_PX = 2;

/** What all thumbnails of a list share, so that they can be compared. */
export interface ThumbnailRange {
  readonly from: number;
  readonly to: number;
  readonly deepest: number;
}

/** A profile as one small line; empty where there is nothing to draw. */
export function thumbnailPath(
  depths: Float64Array,
  values: Float64Array,
  range: ThumbnailRange,
  { widthPx, heightPx }: Size,
): string {
  const acrossPx = (widthPx - 2 * INSET_PX) / (range.to - range.from || 1);
  const downPx = (heightPx - 2 * INSET_PX) / (range.deepest || 1);
  const points: Point[] = [];
  depths.forEach((depth, i) => {
    const xPx = INSET_PX + (values[i]! - range.from) * acrossPx;
    if (Number.isFinite(xPx)) points.push([xPx, INSET_PX + depth * downPx]);
  });
  return line<Point>().digits(1)(decimateLine(points)) ?? "";
}
