import type { PlumbLayout, SheetLayout } from "../layout/index.ts";
import { layer, sized } from "./layer.ts";

const WEIGHT = "l9,5l-9,5z";

/**
 * Draws the plumb line in an element that lies over the sheet, or takes it away. In an element of its own, so that a move
 * of the pointer does not make the browser paint all curves again.
 */
export function drawPlumb(root: SVGSVGElement, sheet: SheetLayout, plumb: PlumbLayout | null): void {
  const group = layer(sized(root, sheet), "plumb");
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
