import type { MarksLayout, SheetLayout } from "../layout/index.ts";
import { layer, sized } from "./layer.ts";

/** Draws the flagged samples of the cast in hand over its curves. */
export function drawMarks(root: SVGSVGElement, sheet: SheetLayout, marks: MarksLayout, colourIndex: number): void {
  const paths = [
    { look: "suspect", path: marks.suspectPath },
    { look: "left-out", path: marks.leftOutPath },
  ];
  layer(sized(root, sheet), "marks")
    .selectAll("path")
    .data(paths.filter(({ path }) => path !== ""))
    .join("path")
    .attr("class", ({ look }) => `${look} c${colourIndex}`)
    .attr("d", ({ path }) => path);
}
