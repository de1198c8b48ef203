import { type ReadonlySignal, useComputed, useSignalEffect } from "@preact/signals";
import type { RefObject } from "preact";
import { useRef } from "preact/hooks";
import { drawLevels, drawMarks, drawPlumb, drawSelection, drawSheet } from "../../charts/draw/index.ts";
import {
  depthAtPx,
  depthPx,
  layOutLevels,
  layOutMarks,
  layOutPlumb,
  layOutSheet,
  type SheetLayout,
} from "../../charts/layout/index.ts";
import { inMetres, inShownDepth, steppedDepthM, tidyDepthM } from "../show/plumb-steps.ts";
import { isSameSheet, levelInputs, plumbValues, profileSheet, type SheetSource } from "../show/profile-sheet.ts";
import { sampleMarks } from "../show/sample-marks.ts";
import { shownValue } from "../show/shown.ts";
import {
  castInHand,
  dispatch,
  flagRange,
  isFlagging,
  plumbDepthM,
  solved,
  state,
  survey,
  visibleCasts,
} from "../store.ts";
import { type Drag, useChartPointer } from "../use-chart-pointer.ts";
import { useElementSize } from "../use-element-size.ts";

/** The linked panels. One slider for keyboard and screen reader: its value is the depth of the plumb line. */
export function ProfileCharts() {
  const frame = useRef<HTMLDivElement>(null);
  const curves = useRef<SVGSVGElement>(null);
  const overlay = useRef<SVGSVGElement>(null);
  const size = useElementSize(frame);
  const drawnSource = useRef<SheetSource | null>(null);
  const source = useComputed(() => {
    const next = sheetSource();
    if (!drawnSource.current || !isSameSheet(drawnSource.current, next)) drawnSource.current = next;
    return drawnSource.current;
  });
  const sheet = useComputed(() =>
    size.value.widthPx > 0 ? layOutSheet(profileSheet(source.value), size.value) : null,
  );
  const { system } = state.value;
  const { drag, handlers } = useChartPointer((yPx) =>
    sheet.value ? tidyDepthM(inMetres(depthAtPx(sheet.value.depth, yPx), system), system) : 0,
  );
  useSignalEffect(() => {
    if (sheet.value) drawSheet(curves.current!, sheet.value);
  });
  useMarks(curves, sheet);
  useSelection(curves, sheet);
  useLevels(overlay, sheet, drag);
  usePlumb(overlay, sheet, source);

  const depthM = plumbDepthM.value ?? 0;
  const deepestM = sheet.value ? inMetres(sheet.value.depth.bottom, system) : 0;
  const onKeyDown = (event: KeyboardEvent): void => {
    const next = steppedDepthM(event.key, { depthM, deepestM }, system);
    if (next !== null) {
      if (event.shiftKey) extendFlagRange(depthM, next);
      plumbDepthM.value = next;
    } else if (event.key === "Escape" && flagRange.value) flagRange.value = null;
    else if (event.key === "Escape") plumbDepthM.value = null;
    else if (event.key === "Enter" && plumbDepthM.value !== null) dispatch({ kind: "level-added", depthM });
    else return;
    event.preventDefault();
  };
  return (
    <div
      ref={frame}
      class={`charts${drag.value ? " dragging" : ""}${isFlagging.value ? " flagging" : ""}`}
      role="slider"
      tabIndex={0}
      aria-label={`Plumb line through the profiles of ${castInHand.value?.cast.name ?? "no cast"}; Enter drops a level, Shift with arrows selects samples to flag`}
      aria-orientation="vertical"
      aria-valuemin={0}
      aria-valuemax={Number(deepestM.toFixed(2))}
      aria-valuenow={Number(depthM.toFixed(2))}
      aria-valuetext={shownValue(depthM, "depth", system)}
      onKeyDown={onKeyDown}
    >
      <svg ref={curves} aria-hidden="true" />
      <svg ref={overlay} aria-hidden="true" {...handlers} />
    </div>
  );
}

function sheetSource(): SheetSource {
  const { castInHandId, colourIndexOf, system } = state.value;
  const deepestLevelM = Math.max(0, ...survey.value.levels.map((level) => level.depthM));
  const { basis } = solved.value.survey;
  return { solved: visibleCasts.value, castInHandId, colourIndexOf, basis, deepestLevelM, system };
}

/** From where the plumb line hung when Shift was first held. */
function extendFlagRange(fromM: number, toM: number): void {
  isFlagging.value = true;
  flagRange.value = { fromM: flagRange.value?.fromM ?? fromM, toM };
}

type SheetSignal = ReadonlySignal<SheetLayout | null>;

/** Draws the flagged samples of the cast in hand, where it is shown. */
function useMarks(curves: RefObject<SVGSVGElement>, sheet: SheetSignal): void {
  const marks = useComputed(() => {
    const inHand = visibleCasts.value.find(({ cast }) => cast.id === state.value.castInHandId);
    return inHand ? sampleMarks(inHand, state.value.system) : [];
  });
  useSignalEffect(() => {
    if (!sheet.value) return;
    const { castInHandId, colourIndexOf } = state.value;
    drawMarks(
      curves.current!,
      sheet.value,
      layOutMarks(sheet.value, marks.value),
      colourIndexOf[castInHandId ?? ""] ?? 0,
    );
  });
}

/** Shades the range of depth that is selected for flagging. */
function useSelection(curves: RefObject<SVGSVGElement>, sheet: SheetSignal): void {
  useSignalEffect(() => {
    if (!sheet.value) return;
    const { depth } = sheet.value;
    const { fromM, toM } = flagRange.value ?? { fromM: Number.NaN, toM: Number.NaN };
    const [topPx, bottomPx] = [Math.min(fromM, toM), Math.max(fromM, toM)].map((depthM) =>
      depthPx(depth, inShownDepth(depthM, state.value.system)),
    ) as [number, number];
    drawSelection(curves.current!, sheet.value, flagRange.value ? { topPx, bottomPx } : null);
  });
}

/** Draws the levels, the dragged one where the pointer has it. */
function useLevels(overlay: RefObject<SVGSVGElement>, sheet: SheetSignal, drag: ReadonlySignal<Drag | null>): void {
  useSignalEffect(() => {
    if (!sheet.value) return;
    const { levelId, depthM } = drag.value ?? {};
    const levels = survey.value.levels.map((level) =>
      level.id === levelId && depthM !== undefined ? { ...level, depthM } : level,
    );
    drawLevels(overlay.current!, sheet.value, layOutLevels(sheet.value, levelInputs(levels, state.value.system)));
  });
}

/** Draws the plumb line with a dot for every cast. */
function usePlumb(overlay: RefObject<SVGSVGElement>, sheet: SheetSignal, source: ReadonlySignal<SheetSource>): void {
  useSignalEffect(() => {
    const depthM = plumbDepthM.value;
    if (!sheet.value) return;
    const depth = depthM === null ? Number.POSITIVE_INFINITY : inShownDepth(depthM, state.value.system);
    const isOut = depthM !== null && depth <= sheet.value.depth.bottom;
    const plumb = isOut ? layOutPlumb(sheet.value, depth, plumbValues(source.value, depthM)) : null;
    drawPlumb(overlay.current!, sheet.value, plumb);
  });
}
