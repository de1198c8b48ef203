import { type Selection, select } from "d3-selection";
import type { SheetLayout } from "../layout/index.ts";

/** An SVG element in the sheet's own pixels. */
export const sized = (
  root: SVGSVGElement,
  { widthPx, heightPx }: SheetLayout,
): Selection<SVGSVGElement, unknown, null, undefined> => select(root).attr("viewBox", `0 0 ${widthPx} ${heightPx}`);

/** The group of that name right under an SVG element, made where it is not there yet. */
export function layer(
  svg: Selection<SVGSVGElement, unknown, null, undefined>,
  name: string,
): Selection<SVGGElement, unknown, null, undefined> {
  const found = svg.selectChild<SVGGElement>(`g.${name}`);
  return found.empty() ? svg.append("g").attr("class", name) : found;
}
