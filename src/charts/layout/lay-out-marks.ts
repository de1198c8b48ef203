import { depthPx } from "./depth-axis.ts";
import type { SheetLayout } from "./sheet.ts";
import { valuePx } from "./value-axis.ts";

/** A sample that is shown apart from its curve, its value in each panel by the panel's id. */
export interface MarkInput {
  readonly kind: "suspect" | "left-out";
  readonly depth: number;
  readonly values: Readonly<Record<string, number>>;
}

export interface MarksLayout {
  readonly suspectPath: string;
  readonly leftOutPath: string;
}

/** Half of a mark's width. */
const REACH_PX = 3.5;

const SHAPES = {
  suspect: `m0,-${REACH_PX + 0.5}l${REACH_PX + 0.5},${REACH_PX + 0.5}l-${REACH_PX + 0.5},${REACH_PX + 0.5}l-${REACH_PX + 0.5},-${REACH_PX + 0.5}z`,
  "left-out": `m-${REACH_PX},-${REACH_PX}l${2 * REACH_PX},${2 * REACH_PX}m0,-${2 * REACH_PX}l-${2 * REACH_PX},${2 * REACH_PX}`,
} as const;

/**
 * Marks in all panels, told apart by shape: a diamond for a suspect sample, a cross for one that is left out. A value that
 * lies beyond a panel stands at its edge, so that it is not lost.
 */
export function layOutMarks(sheet: SheetLayout, marks: readonly MarkInput[]): MarksLayout {
  const pathOf = (kind: MarkInput["kind"]): string => {
    const places = new Set<string>();
    for (const mark of marks) if (mark.kind === kind) for (const place of placesOf(mark, sheet)) places.add(place);
    return Array.from(places, (place) => `M${place}${SHAPES[kind]}`).join("");
  };
  return { suspectPath: pathOf("suspect"), leftOutPath: pathOf("left-out") };
}

/** In each panel, to the pixel. */
function* placesOf({ depth, values }: MarkInput, sheet: SheetLayout): Generator<string> {
  const yPx = Math.round(depthPx(sheet.depth, depth));
  if (!(yPx >= sheet.depth.topPx && yPx <= sheet.depth.bottomPx)) return;
  for (const { id, axis } of sheet.panels) {
    const value = values[id] ?? Number.NaN;
    if (Number.isNaN(value)) continue;
    const xPx = value <= 0 && axis.kind === "log" ? axis.leftPx : valuePx(axis, value);
    yield `${Math.round(Math.min(axis.rightPx - REACH_PX, Math.max(axis.leftPx + REACH_PX, xPx)))},${yPx}`;
  }
}
