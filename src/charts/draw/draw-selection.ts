import type { SheetLayout } from "../layout/index.ts";
import { layer, sized } from "./layer.ts";

/** A range of depth that is selected, in pixels; null draws none. */
export function drawSelection(
  root: SVGSVGElement,
  sheet: SheetLayout,
  range: { readonly topPx: number; readonly bottomPx: number } | null,
): void {
  layer(sized(root, sheet), "selection")
    .selectAll("rect")
    .data(range ? [range] : [])
    .join("rect")
    .attr("x", sheet.leftPx)
    .attr("width", sheet.rightPx - sheet.leftPx)
    .attr("y", ({ topPx }) => topPx)
    .attr("height", ({ topPx, bottomPx }) => Math.max(1, bottomPx - topPx));
}
