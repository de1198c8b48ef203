import { select } from "d3-selection";
import type { PlumbLayout } from "../layout/index.ts";

const WEIGHT = "l9,5l-9,5z";

/** Draws the plumb line over a sheet, or takes it away. Cheap enough for every move of the pointer. */
export function drawPlumb(root: SVGSVGElement, plumb: PlumbLayout | null): void {
  const group = select(root).selectChild("g.plumb");
  const lines = plumb
    ? [
        { look: "line", path: `M${plumb.leftPx},${plumb.yPx}H${plumb.rightPx}` },
        { look: "weight", path: `M${plumb.leftPx},${plumb.yPx - 5}${WEIGHT}` },
      ]
    : [];
  group
    .selectAll("path")
    .data(lines)
    .join("path")
    .attr("class", (line) => line.look)
    .attr("d", (line) => line.path);
  group
    .selectAll("circle")
    .data(plumb?.dots ?? [])
    .join("circle")
    .attr("class", (dot) => `dot c${dot.colourIndex}${dot.isInHand ? " in-hand" : ""}`)
    .attr("r", (dot) => (dot.isInHand ? 4 : 2.5))
    .attr("cx", (dot) => dot.xPx)
    .attr("cy", plumb?.yPx ?? 0);
}
