import type { LevelLayout, SheetLayout } from "../layout/index.ts";
import { layer, sized } from "./layer.ts";

const FLAG = "l-9,-5v10z";
const FLAG_GAP_PX = 3;

/** Draws the levels in an element that lies over the sheet: line, flag to drag it by, name. */
export function drawLevels(root: SVGSVGElement, sheet: SheetLayout, levels: readonly LevelLayout[]): void {
  const joined = layer(sized(root, sheet), "levels")
    .selectAll<SVGGElement, LevelLayout>("g.level")
    .data(levels, (level) => level.levelId)
    .join((enter) => {
      const level = enter.append("g").attr("class", "level");
      level.append("path").attr("class", "line");
      level.append("path").attr("class", "flag");
      level.append("rect").attr("class", "handle").attr("width", 30).attr("height", 24);
      level.append("text").attr("class", "name");
      return level;
    })
    .attr("data-level", (level) => level.levelId);
  joined.select("path.line").attr("d", (level) => `M${sheet.leftPx - FLAG_GAP_PX},${level.yPx}H${sheet.rightPx}`);
  joined.select("path.flag").attr("d", (level) => `M${sheet.leftPx - FLAG_GAP_PX},${level.yPx}${FLAG}`);
  joined
    .select("rect.handle")
    .attr("x", sheet.leftPx - 28)
    .attr("y", (level) => level.yPx - 12);
  joined
    .select("text.name")
    .attr("text-anchor", (level) => level.anchor)
    .attr("x", (level) => level.labelXPx)
    .attr("y", (level) => level.labelYPx)
    .text((level) => level.label);
}
