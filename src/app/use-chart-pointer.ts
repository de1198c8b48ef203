import { type Signal, useSignal } from "@preact/signals";
import type { JSX } from "preact";
import { useRef } from "preact/hooks";
import type { LevelId } from "../survey/index.ts";
import { dispatch, flagRange, isFlagging, plumbDepthM } from "./store.ts";

/** A level that is being dragged shows where it would come to stand; the survey changes when it is let go. */
export interface Drag {
  readonly levelId: LevelId;
  readonly depthM: number;
}

/** A finger that slides along the charts reads values; one that stays drops a level. */
const CLICK_SLACK_PX = 5;

type Handler = (event: JSX.TargetedPointerEvent<SVGSVGElement>) => void;

interface ChartPointer {
  readonly drag: Signal<Drag | null>;
  readonly handlers: Readonly<Record<"onPointerDown" | "onPointerMove" | "onPointerUp" | "onPointerCancel", Handler>>;
}

/** What a pointer does on the charts: it leads the plumb line, drops and drags levels, or selects a range to be flagged. */
export function useChartPointer(depthAtM: (yPx: number) => number): ChartPointer {
  const drag = useSignal<Drag | null>(null);
  const pressedAtPx = useRef<number | null>(null);
  const isSelecting = useRef(false);
  const depthUnder: (event: JSX.TargetedPointerEvent<SVGSVGElement>) => number = (event) =>
    depthAtM(event.clientY - event.currentTarget.getBoundingClientRect().top);
  const hasStayed: (event: JSX.TargetedPointerEvent<SVGSVGElement>) => boolean = (event) =>
    Math.abs(event.clientY - (pressedAtPx.current ?? Number.NaN)) < CLICK_SLACK_PX;

  const onPointerDown: Handler = (event) => {
    if (event.button !== 0) return;
    pressedAtPx.current = event.clientY;
    const levelId = (event.target as Element).closest<SVGGElement>("[data-level]")?.dataset.level;
    if (levelId) drag.value = { levelId: levelId as LevelId, depthM: depthUnder(event) };
    else if (isFlagging.value) {
      isSelecting.current = true;
      flagRange.value = { fromM: depthUnder(event), toM: depthUnder(event) };
    } else return;
    event.currentTarget.setPointerCapture(event.pointerId);
  };
  const onPointerMove: Handler = (event) => {
    plumbDepthM.value = depthUnder(event);
    if (drag.value) drag.value = { ...drag.value, depthM: plumbDepthM.value };
    if (isSelecting.current && flagRange.value) flagRange.value = { ...flagRange.value, toM: plumbDepthM.value };
  };
  const onPointerUp: Handler = (event) => {
    if (event.button !== 0 || pressedAtPx.current === null) return;
    if (drag.value && !hasStayed(event)) dispatch({ kind: "level-moved", ...drag.value });
    else if (isSelecting.current && hasStayed(event)) flagRange.value = null;
    else if (!drag.value && !isSelecting.current && hasStayed(event))
      dispatch({ kind: "level-added", depthM: depthUnder(event) });
    letGo();
  };
  const letGo = (): void => {
    pressedAtPx.current = null;
    isSelecting.current = false;
    drag.value = null;
  };
  return { drag, handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel: letGo } };
}
