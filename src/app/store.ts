import { computed, signal } from "@preact/signals";
import { emptySurvey } from "../survey/index.ts";
import type { AnsweredCast } from "../worker/index.ts";
import type { DepthRange } from "./show/flag-selection.ts";
import { initialState, surveyOf } from "./state/app-state.ts";
import { type Action, reduce } from "./state/reduce.ts";
import type { Solved } from "./state/solved-share.ts";

/* The page's one state and what follows from it. Parts of the page read these and dispatch; they hold no numbers. */

export const state = signal(initialState);

export const dispatch = (action: Action): void => {
  state.value = reduce(state.value, action);
};

export const survey = computed(() => surveyOf(state.value));

/** The newest finished results; they may lag behind the survey while the background thread works. */
export const solved = signal<Solved<AnsweredCast>>({ survey: emptySurvey, casts: [] });

/** How much of the work in hand is done, null when there is none. */
export const progress = signal<{ readonly doneCount: number; readonly allCount: number } | null>(null);

export const castInHand = computed(
  (): AnsweredCast | null => solved.value.casts.find(({ cast }) => cast.id === state.value.castInHandId) ?? null,
);

export const visibleCasts = computed((): readonly AnsweredCast[] => {
  const hidden = new Set(state.value.hiddenIds);
  return solved.value.casts.filter(({ cast }) => !hidden.has(cast.id));
});

/** Where the plumb line hangs, null where it is not out. */
export const plumbDepthM = signal<number | null>(null);

/** Whether dragging in the charts selects samples to be flagged. */
export const isFlagging = signal(false);

/** The range of depth that is selected, null where none is. */
export const flagRange = signal<DepthRange | null>(null);

/** The file whose reading is shown, null where none is. */
export const openReading = signal<string | null>(null);

/** Whether the stations of the list are shown against those of the casts. */
export const isStationPanelOpen = signal(false);

/** Why there are no results for the last change; empty while solving works. */
export const solvingTrouble = signal("");

/** Why the last change could not be saved; empty while saving works. */
export const savingTrouble = signal("");
