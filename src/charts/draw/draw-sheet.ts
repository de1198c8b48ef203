import { type Selection, select } from "d3-selection";
import type { SheetLayout } from "../layout/index.ts";
import { layer, sized } from "./layer.ts";

/* Joins a sheet's layout to an SVG element. Classes carry the look (charts.css); a cast's colour comes by its class. */

type Group = Selection<SVGGElement, unknown, null, undefined>;
type Panel = SheetLayout["panels"][number];

const TICK_ABOVE_PX = 6;
const NOTE_LINE_PX = 13;

/** Draws axes and curves: what stays while the pointer moves. */
export function drawSheet(root: SVGSVGElement, sheet: SheetLayout): void {
  const svg = sized(root, sheet).classed("crowded", sheet.isCrowded);
  drawDepthAxis(layer(svg, "depth-axis"), sheet);
  drawPanels(layer(svg, "panels"), sheet);
}

function drawDepthAxis(group: Group, sheet: SheetLayout): void {
  group
    .selectAll("text.title")
    .data(["Depth"])
    .join("text")
    .attr("class", "title")
    .attr("x", 8)
    .attr("y", 14)
    .text(String);
  group
    .selectAll("text.unit")
    .data([sheet.depthUnit])
    .join("text")
    .attr("class", "unit")
    .attr("x", 8)
    .attr("y", 30)
    .text(String);
  group
    .selectAll("text.tick")
    .data(sheet.depth.ticks)
    .join("text")
    .attr("class", "tick")
    .attr("text-anchor", "end")
    .attr("x", sheet.leftPx - 14)
    .attr("y", (tick) => tick.yPx + 4)
    .text((tick) => tick.label);
}

function drawPanels(group: Group, sheet: SheetLayout): void {
  group
    .selectAll<SVGGElement, Panel>("g.panel")
    .data(sheet.panels, (panel) => panel.id)
    .join("g")
    .attr("class", "panel")
    .attr("data-panel", (panel) => panel.id)
    .each(function (panel) {
      drawPanel(select(this), panel, sheet);
    });
}

function drawPanel(group: Group, panel: Panel, { depth, gaps }: SheetLayout): void {
  const { axis } = panel;
  const width = axis.rightPx - axis.leftPx;
  const texts = [
    { kind: "title", anchor: "start", xPx: axis.leftPx, yPx: 14, label: panel.title },
    { kind: "unit", anchor: "end", xPx: axis.rightPx, yPx: 14, label: panel.unit },
    ...axis.ticks.map((tick) => ({ ...tick, kind: "tick", yPx: depth.topPx - TICK_ABOVE_PX })),
    ...panel.edgeNotes.map((label, k, { length }) => ({
      kind: "note",
      anchor: "start",
      xPx: axis.leftPx + 9,
      yPx: depth.bottomPx - 7 - NOTE_LINE_PX * (length - 1 - k),
      label,
    })),
  ];
  group
    .selectAll("rect.gap")
    .data(gaps)
    .join("rect")
    .attr("class", "gap")
    .attr("x", axis.leftPx)
    .attr("width", width)
    .attr("y", (gap) => gap.topPx)
    .attr("height", (gap) => gap.heightPx);
  group
    .selectAll("path.grid")
    .data([
      depth.ticks.map((tick) => `M${axis.leftPx},${tick.yPx}H${axis.rightPx}`).join(""),
      axis.ticks.map((tick) => `M${tick.xPx},${depth.topPx}V${depth.bottomPx}`).join(""),
    ])
    .join("path")
    .attr("class", "grid")
    .attr("d", String);
  group
    .selectAll("path.frame")
    .data([`M${axis.leftPx},${depth.topPx}H${axis.rightPx}V${depth.bottomPx}H${axis.leftPx}Z`])
    .join("path")
    .attr("class", "frame")
    .attr("d", String);
  group
    .selectAll("path.zero")
    .data(panel.zeroPx === null ? [] : [`M${panel.zeroPx},${depth.topPx}V${depth.bottomPx}`])
    .join("path")
    .attr("class", "zero")
    .attr("d", String);
  group
    .selectAll("path.band")
    .data(panel.curves.filter((curve) => curve.bandPath !== ""))
    .join("path")
    .attr("class", (curve) => `band c${curve.colourIndex}`)
    .attr("d", (curve) => curve.bandPath);
  const curves = panel.curves.flatMap((curve) =>
    (["solid", "dotted", "low", "negative"] as const).map((kind) => ({
      kind,
      path: curve[`${kind}Path`],
      look: `curve ${kind} c${curve.colourIndex}${curve.isInHand ? " in-hand" : ""}`,
    })),
  );
  group
    .selectAll("path.curve")
    .data(curves.filter((curve) => curve.path !== ""))
    .join("path")
    .attr("class", (curve) => curve.look)
    .attr("d", (curve) => curve.path);
  group
    .selectAll("text")
    .data(texts.filter((text) => text.label !== ""))
    .join("text")
    .attr("class", (text) => text.kind)
    .attr("text-anchor", (text) => text.anchor)
    .attr("x", (text) => text.xPx)
    .attr("y", (text) => text.yPx)
    .text((text) => text.label);
}
