import { type DepthAxis, depthAxis, depthPx } from "./depth-axis.ts";
import { layOutCurve } from "./lay-out-curve.ts";
import { powerOfTen } from "./power-of-ten.ts";
import type { CurveInput, PanelInput, PanelLayout, SheetInput, SheetLayout, Size } from "./sheet.ts";
import { labelWidthPx, titleWidthPx } from "./text-width.ts";
import { linearAxis, logAxis, valuePx } from "./value-axis.ts";

const MARGIN = { leftPx: 58, rightPx: 12, topPx: 44, bottomPx: 8 } as const;
const BETWEEN_PANELS_PX = 16;
const LEAST_PANEL_PX = 118;
/** With more curves than this, each is thinned harder: nobody can follow one of them. */
const FEW_CURVES_COUNT = 20;
const CROWD_CURVES_COUNT = 60;

/** Panels side by side over one depth axis, to fill a size. Levels come after, so that one can be dragged at little cost. */
export function layOutSheet(input: SheetInput, size: Size): SheetLayout {
  const leftPx = MARGIN.leftPx;
  const rightPx = size.widthPx - MARGIN.rightPx;
  const depth = depthAxis(input.deepest, MARGIN.topPx, size.heightPx - MARGIN.bottomPx);
  const chosen = fittingPanels(input.panels, rightPx - leftPx);
  const shareSum = chosen.reduce((sum, panel) => sum + panel.share, 0);
  const sharePx = (rightPx - leftPx - BETWEEN_PANELS_PX * (chosen.length - 1)) / shareSum;
  let nextPx = leftPx;
  const panels = chosen.map((panel) => {
    const frame = { leftPx: nextPx, rightPx: nextPx + panel.share * sharePx };
    nextPx = frame.rightPx + BETWEEN_PANELS_PX;
    return layOutPanel(panel, frame, depth);
  });
  return {
    ...size,
    leftPx,
    rightPx,
    isCrowded: chosen.some((panel) => panel.curves.length > CROWD_CURVES_COUNT),
    depthUnit: input.depthUnit,
    depth,
    panels,
    gaps: input.gaps.map(({ from, to }) => ({
      topPx: depthPx(depth, from),
      heightPx: depthPx(depth, to) - depthPx(depth, from),
    })),
  };
}

/** All panels where there is room, else those that cannot be spared. */
function fittingPanels(panels: readonly PanelInput[], widthPx: number): readonly PanelInput[] {
  const least = panels.length * LEAST_PANEL_PX + BETWEEN_PANELS_PX * (panels.length - 1);
  return widthPx >= least ? panels : panels.filter((panel) => !panel.isDroppable);
}

/** The values of a curve, and the edges of its band. */
function valuesToHold({ values, halfWidths }: CurveInput): readonly Float64Array[] {
  if (halfWidths === null) return [values];
  return [values, values.map((value, i) => value - halfWidths[i]!), values.map((value, i) => value + halfWidths[i]!)];
}

function layOutPanel(
  panel: PanelInput,
  frame: { readonly leftPx: number; readonly rightPx: number },
  depth: DepthAxis,
): PanelLayout {
  const values = panel.curves.flatMap(valuesToHold);
  const axis = panel.scale === "log" ? logAxis(values, frame) : linearAxis(values, frame, panel.withZero);
  const rowPx = panel.curves.length > FEW_CURVES_COUNT ? 3 : 1;
  const curves = panel.curves.map((curve) => layOutCurve(curve, { axis, depth, isStepped: panel.isStepped, rowPx }));
  const roomPx = frame.rightPx - frame.leftPx - labelWidthPx(panel.unit) - 12;
  const zeroPx = valuePx(axis, 0);
  return {
    id: panel.id,
    title: titleWidthPx(panel.title) <= roomPx ? panel.title : panel.shortTitle,
    unit: panel.unit,
    axis,
    zeroPx: panel.withZero && zeroPx > frame.leftPx + 1 && zeroPx < frame.rightPx - 1 ? zeroPx : null,
    curves,
    edgeNotes: [
      ...(curves.some((curve) => curve.lowPath)
        ? [`thin: below ${powerOfTen(Math.round(Math.log10(axis.from)))}`]
        : []),
      ...(curves.some((curve) => curve.negativePath) ? ["thick: unstable"] : []),
    ],
  };
}
