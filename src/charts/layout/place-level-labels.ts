import type { LevelInput, LevelLayout, PanelLayout } from "./sheet.ts";
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
/** Beyond this many curves a panel is full wherever one looks. */
const MOST_CURVES_COUNT = 30;

type Placing = Omit<LevelLayout, "levelId" | "label" | "yPx"> & { readonly box: Box };

/** Puts each level's name at the end of a panel where it crosses the fewest curves and no other name. */
export function placeLevelLabels(
  levels: readonly LevelInput[],
  yPxOf: (depth: number) => number,
  panels: readonly PanelLayout[],
): readonly LevelLayout[] {
  const taken: Box[] = [];
  return levels.map((level) => {
    const yPx = yPxOf(level.depth);
    let best: Placing | null = null;
    let leastCost = Number.POSITIVE_INFINITY;
    for (const placing of placings(level, yPx, panels)) {
      const cost = 100 * taken.filter((box) => overlap(box, placing.box)).length + crossings(placing.box, panels);
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
function* placings(level: LevelInput, yPx: number, panels: readonly PanelLayout[]): Generator<Placing> {
  const width = labelWidthPx(level.label) * 1.05;
  for (const offsetPx of yPx < 70 ? [BELOW_PX] : [ABOVE_PX, BELOW_PX])
    for (const { axis } of [...panels].reverse())
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
    for (const { points } of curves.slice(-MOST_CURVES_COUNT))
      for (let i = 1; i < points.length; i++) {
        const [x0, y0] = points[i - 1]!;
        const [x1, y1] = points[i]!;
        const leg = {
          leftPx: Math.min(x0, x1),
          rightPx: Math.max(x0, x1),
          topPx: Math.min(y0, y1),
          bottomPx: Math.max(y0, y1),
        };
        if (y1 - y0 < 1e3 && overlap(leg, box)) {
          count++;
          break;
        }
      }
  }
  return count;
}
