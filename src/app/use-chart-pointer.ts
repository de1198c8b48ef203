import { type Signal, useSignal } from "@preact/signals";
import type { JSX } from "preact";
import { useRef } from "preact/hooks";
import type { LevelId } from "../survey/index.ts";
import { dispatch, plumbDepthM } from "./store.ts";

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

/** What a pointer does on the charts: it leads the plumb line, drops levels and drags them by their flags. */
export function useChartPointer(depthAtM: (yPx: number) => number): ChartPointer {
  const drag = useSignal<Drag | null>(null);
  const pressedAtPx = useRef<number | null>(null);
  const depthUnder: (event: JSX.TargetedPointerEvent<SVGSVGElement>) => number = (event) =>
    depthAtM(event.clientY - event.currentTarget.getBoundingClientRect().top);

  const onPointerDown: Handler = (event) => {
    if (event.button !== 0) return;
    pressedAtPx.current = event.clientY;
    const levelId = (event.target as Element).closest<SVGGElement>("[data-level]")?.dataset.level;
    if (!levelId) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    drag.value = { levelId: levelId as LevelId, depthM: depthUnder(event) };
  };
  const onPointerMove: Handler = (event) => {
    plumbDepthM.value = depthUnder(event);
    if (drag.value) drag.value = { ...drag.value, depthM: plumbDepthM.value };
  };
  const onPointerUp: Handler = (event) => {
    const pressedAt = pressedAtPx.current;
    if (event.button !== 0 || pressedAt === null) return;
    pressedAtPx.current = null;
    const hasStayed = Math.abs(event.clientY - pressedAt) < CLICK_SLACK_PX;
    if (drag.value) {
      if (!hasStayed) dispatch({ kind: "level-moved", ...drag.value });
      drag.value = null;
    } else if (hasStayed) dispatch({ kind: "level-added", depthM: depthUnder(event) });
  };
  const onPointerCancel: Handler = () => {
    pressedAtPx.current = null;
    drag.value = null;
  };
  return { drag, handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel } };
}
