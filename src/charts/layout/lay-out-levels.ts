import { bisector } from "d3-array";
import type { Point } from "./decimate-line.ts";
import { depthPx } from "./depth-axis.ts";
import type { LevelInput, LevelLayout, PanelLayout, SheetLayout } from "./sheet.ts";
import { labelWidthPx } from "./text-width.ts";

interface Box {
  readonly leftPx: number;
  readonly rightPx: number;
  readonly topPx: number;
  readonly bottomPx: number;
}

const ABOVE_PX = -5;
const BELOW_PX = 13;
const LABEL_HEIGHT_PX = 13;
const INSET_PX = 5;
/** Names are bold, ticks are not. */
const BOLD_RATIO = 1.05;
/** Beyond this many curves a panel is full wherever one looks. */
const MOST_CURVES_COUNT = 30;

/** Against one for a curve that is crossed. */
const COVERED_COST = 100;
const CUT_COST = 10_000;

type Placing = Omit<LevelLayout, "levelId" | "label" | "yPx"> & { readonly box: Box };

/** Levels across a sheet: each name stands at the end of a panel where it crosses the fewest curves and no other name. */
export function layOutLevels(sheet: SheetLayout, levels: readonly LevelInput[]): readonly LevelLayout[] {
  const { depth, panels } = sheet;
  const taken: Box[] = [];
  return levels.map((level) => {
    const yPx = depthPx(depth, level.depth);
    let best: Placing | null = null;
    let leastCost = Number.POSITIVE_INFINITY;
    for (const placing of placings(level, yPx, sheet)) {
      const { box } = placing;
      const isCut = box.leftPx < sheet.leftPx || box.rightPx > sheet.rightPx;
      const coveredCount = taken.filter((other) => overlap(other, box)).length;
      const cost = (isCut ? CUT_COST : 0) + COVERED_COST * coveredCount + crossings(box, panels);
      if (cost < leastCost) {
        best = placing;
        leastCost = cost;
      }
    }
    const { box, ...place } = best!;
    taken.push(box);
    return { levelId: level.levelId, label: level.label, yPx, ...place };
  });
}

/** Best liked first: the right end of the last panel, above the line. */
function* placings(level: LevelInput, yPx: number, { depth, panels }: SheetLayout): Generator<Placing> {
  const width = labelWidthPx(level.label) * BOLD_RATIO;
  const hasRoomAbove = yPx - LABEL_HEIGHT_PX > depth.topPx;
  for (const offsetPx of hasRoomAbove ? [ABOVE_PX, BELOW_PX] : [BELOW_PX])
    for (const { axis } of panels.toReversed())
      for (const anchor of ["end", "start"] as const) {
        const labelXPx = anchor === "end" ? axis.rightPx - INSET_PX : axis.leftPx + INSET_PX;
        const leftPx = anchor === "end" ? labelXPx - width : labelXPx;
        const labelYPx = yPx + offsetPx;
        const box = { leftPx, rightPx: leftPx + width, topPx: labelYPx - LABEL_HEIGHT_PX + 2, bottomPx: labelYPx + 3 };
        yield { labelXPx, labelYPx, anchor, box };
      }
}

const overlap = (a: Box, b: Box): boolean =>
  a.leftPx < b.rightPx && b.leftPx < a.rightPx && a.topPx < b.bottomPx && b.topPx < a.bottomPx;

function crossings(box: Box, panels: readonly PanelLayout[]): number {
  let count = 0;
  for (const { axis, curves } of panels) {
    if (box.leftPx < axis.leftPx && box.rightPx > axis.leftPx) count += 2;
    if (box.rightPx < axis.leftPx || box.leftPx > axis.rightPx) continue;
    for (const { points } of curves.slice(-MOST_CURVES_COUNT)) if (crosses(points, box)) count++;
  }
  return count;
}

/** Whether a curve, which runs down the page, has a leg through a box. */
function crosses(points: readonly Point[], box: Box): boolean {
  for (let i = Math.max(1, firstBelow(points, box.topPx)); i < points.length; i++) {
    const [x0, y0] = points[i - 1]!;
    const [x1, y1] = points[i]!;
    if (y0 > box.bottomPx) return false;
    if (overlap({ leftPx: Math.min(x0, x1), rightPx: Math.max(x0, x1), topPx: y0 - 1, bottomPx: y1 + 1 }, box))
      return true;
  }
  return false;
}

const firstBelow = bisector((point: Point) => point[1]).left;
