import { useComputed, useSignal, useSignalEffect } from "@preact/signals";
import { useEffect, useRef } from "preact/hooks";
import { drawLevels, drawPlumb, drawSheet } from "../../charts/draw/index.ts";
import { depthAtPx, layOutLevels, layOutPlumb, layOutSheet } from "../../charts/layout/index.ts";
import type { LevelId } from "../../survey/index.ts";
import { convert, displayUnit } from "../../units/index.ts";
import { levelInputs, plumbValues, profileSheet, type SheetSource } from "../show/profile-sheet.ts";
import { shownValue } from "../show/shown.ts";
import { castInHand, dispatch, plumbDepthM, solved, state, survey, visibleCasts } from "../store.ts";

/** A level that is being dragged shows where it would come to stand; the survey changes when it is let go. */
interface Drag {
  readonly levelId: LevelId;
  readonly depthM: number;
}

/** A finger that slides along the charts reads values; one that stays drops a level. */
const CLICK_SLACK_PX = 5;

/** The linked panels. One slider for keyboard and screen reader: its value is the depth of the plumb line. */
export function ProfileCharts() {
  const curves = useRef<SVGSVGElement>(null);
  const overlay = useRef<SVGSVGElement>(null);
  const size = useSignal({ widthPx: 0, heightPx: 0 });
  const drag = useSignal<Drag | null>(null);
  const pressedAtPx = useRef<number | null>(null);
  const source = useComputed((): SheetSource => {
    const { castInHandId, colourIndexOf, system } = state.value;
    const { levels } = survey.value;
    const { basis } = solved.value.survey;
    return { solved: visibleCasts.value, castInHandId, colourIndexOf, basis, levels, system };
  });
  const sheet = useComputed(() =>
    size.value.widthPx > 0 ? layOutSheet(profileSheet(source.value), size.value) : null,
  );
  const levels = useComputed(() =>
    survey.value.levels.map((level) =>
      level.id === drag.value?.levelId ? { ...level, depthM: drag.value.depthM } : level,
    ),
  );

  useEffect(() => {
    const frame = overlay.current!.parentElement!;
    const observer = new ResizeObserver(() => {
      size.value = { widthPx: frame.clientWidth, heightPx: frame.clientHeight };
    });
    observer.observe(frame);
    return () => observer.disconnect();
  }, [size]);
  useSignalEffect(() => {
    if (sheet.value) drawSheet(curves.current!, sheet.value);
  });
  useSignalEffect(() => {
    if (!sheet.value) return;
    const laid = layOutLevels(sheet.value, levelInputs(levels.value, state.value.system));
    drawLevels(overlay.current!, sheet.value, laid);
  });
  useSignalEffect(() => {
    if (!sheet.value) return;
    const depthM = plumbDepthM.value;
    const depth = depthM === null ? null : inShownDepth(depthM);
    drawPlumb(
      overlay.current!,
      sheet.value,
      depthM === null || depth === null || depth > sheet.value.depth.bottom
        ? null
        : layOutPlumb(sheet.value, depth, plumbValues(source.value, depthM)),
    );
  });

  const deepestM = (): number => inMetres(sheet.value?.depth.bottom ?? 0);
  const depthUnder = (event: PointerEvent): number => {
    const box = overlay.current!.getBoundingClientRect();
    return sheet.value ? tidyDepthM(inMetres(depthAtPx(sheet.value.depth, event.clientY - box.top))) : 0;
  };
  const onPointerDown = (event: PointerEvent): void => {
    if (event.button !== 0) return;
    pressedAtPx.current = event.clientY;
    const levelId = (event.target as Element).closest<SVGGElement>("[data-level]")?.dataset.level;
    if (!levelId) return;
    overlay.current!.setPointerCapture(event.pointerId);
    drag.value = { levelId: levelId as LevelId, depthM: depthUnder(event) };
  };
  const onPointerMove = (event: PointerEvent): void => {
    plumbDepthM.value = depthUnder(event);
    if (drag.value) drag.value = { ...drag.value, depthM: depthUnder(event) };
  };
  const onPointerUp = (event: PointerEvent): void => {
    const pressedAt = pressedAtPx.current;
    if (event.button !== 0 || pressedAt === null) return;
    pressedAtPx.current = null;
    const hasStayed = Math.abs(event.clientY - pressedAt) < CLICK_SLACK_PX;
    if (drag.value) {
      if (!hasStayed) dispatch({ kind: "level-moved", ...drag.value });
      drag.value = null;
    } else if (hasStayed) dispatch({ kind: "level-added", depthM: depthUnder(event) });
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    const next = movedBy(event.key, plumbDepthM.value ?? 0, deepestM());
    if (next !== null) plumbDepthM.value = next;
    else if (event.key === "Enter" && plumbDepthM.value !== null)
      dispatch({ kind: "level-added", depthM: plumbDepthM.value });
    else if (event.key === "Escape") plumbDepthM.value = null;
    else return;
    event.preventDefault();
  };
  const depthM = plumbDepthM.value ?? 0;
  return (
    <div
      class={`charts${drag.value ? " dragging" : ""}`}
      role="slider"
      tabIndex={0}
      aria-label={`Plumb line through the profiles of ${castInHand.value?.cast.name ?? "no cast"}; Enter drops a level`}
      aria-orientation="vertical"
      aria-valuemin={0}
      aria-valuemax={Number(deepestM().toFixed(2))}
      aria-valuenow={Number(depthM.toFixed(2))}
      aria-valuetext={shownValue(depthM, "depth", state.value.system)}
      onKeyDown={onKeyDown}
    >
      <svg ref={curves} aria-hidden="true" />
      <svg
        ref={overlay}
        aria-hidden="true"
        onPointerDown={onPointerDown}
        onPointerMove={onPointerMove}
        onPointerUp={onPointerUp}
        onPointerCancel={() => {
          pressedAtPx.current = null;
          drag.value = null;
        }}
      />
    </div>
  );
}

const depthUnit = () => displayUnit("depth", state.value.system).unit;
const inShownDepth = (depthM: number): number => convert(depthM, "m", depthUnit());
const inMetres = (depth: number): number => convert(depth, depthUnit(), "m");

/** A pointer does not know more than a hundredth of the unit shown. */
const tidyDepthM = (depthM: number): number => Number(inMetres(Number(inShownDepth(depthM).toFixed(2))).toFixed(6));

const SMALL_STEPS: Readonly<Record<string, number>> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 };
const BIG_STEPS: Readonly<Record<string, number>> = { PageDown: 1, PageUp: -1 };

/** Where a key takes the plumb line: a tenth of the unit shown, or a twentieth of the axis; null for other keys. */
function movedBy(key: string, depthM: number, deepestM: number): number | null {
  const small = SMALL_STEPS[key];
  const big = BIG_STEPS[key];
  const within = (next: number): number => tidyDepthM(Math.min(deepestM, Math.max(0, next)));
  if (small !== undefined) return within(depthM + small * inMetres(0.1));
  if (big !== undefined) return within(depthM + (big * deepestM) / 20);
  if (key === "Home") return 0;
  return key === "End" ? within(deepestM) : null;
}
