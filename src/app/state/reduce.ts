import type { Outcome } from "../../base/index.ts";
import type { Cast, CastId, FileReading } from "../../cast/index.ts";
import type { LevelId } from "../../survey/index.ts";
import { addCasts, type Basis, emptySurvey, redo, remember, type Survey, undo } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import { type AppState, type FileTrouble, surveyOf } from "./app-state.ts";
import { addLevel, changeLevel, removeLevel } from "./levels.ts";

export interface ReadFile {
  readonly fileName: string;
  readonly sha256: string | null;
  readonly outcome: Outcome<FileReading>;
}

/** What a survey that has no casts yet takes over with its first files. */
export interface SurveyStart {
  readonly name: string;
  readonly basis?: Partial<Basis>;
}

export type Action =
  | { readonly kind: "files-read"; readonly files: readonly ReadFile[]; readonly start: SurveyStart }
  | { readonly kind: "troubles-dismissed" }
  | { readonly kind: "survey-renamed"; readonly name: string }
  | { readonly kind: "survey-cleared" }
  | { readonly kind: "cast-taken"; readonly castId: CastId }
  | { readonly kind: "cast-toggled"; readonly castId: CastId }
  | { readonly kind: "cast-removed"; readonly castId: CastId }
  | { readonly kind: "level-added"; readonly depthM: number }
  | { readonly kind: "level-moved"; readonly levelId: LevelId; readonly depthM: number }
  | { readonly kind: "level-renamed"; readonly levelId: LevelId; readonly name: string }
  | { readonly kind: "level-removed"; readonly levelId: LevelId }
  | { readonly kind: "basis-changed"; readonly change: Partial<Basis> }
  | { readonly kind: "system-chosen"; readonly system: DisplaySystem }
  | { readonly kind: "undone" }
  | { readonly kind: "redone" };

/** Colours told apart by eye; with more casts they come round again. */
const COLOURS_COUNT = 6;

/** The next state. What changes the survey goes through its history and can be undone; the rest is how one looks at it. */
export function reduce(state: AppState, action: Action): AppState {
  const survey = surveyOf(state);
  const change = (next: Survey): AppState => settled({ ...state, history: remember(state.history, next) });
  switch (action.kind) {
    case "files-read":
      return filesRead(state, action.files, action.start);
    case "troubles-dismissed":
      return { ...state, troubles: [] };
    case "survey-renamed":
      return change({ ...survey, name: action.name });
    case "survey-cleared":
      return { ...change(emptySurvey), troubles: [] };
    case "cast-taken":
      return { ...state, castInHandId: action.castId, hiddenIds: without(state.hiddenIds, action.castId) };
    case "cast-toggled":
      return { ...state, hiddenIds: toggled(state.hiddenIds, action.castId) };
    case "cast-removed":
      return change({ ...survey, casts: survey.casts.filter((cast) => cast.id !== action.castId) });
    case "level-added":
      return change({ ...survey, levels: addLevel(survey.levels, action.depthM) });
    case "level-moved":
      return change({ ...survey, levels: changeLevel(survey.levels, action.levelId, { depthM: action.depthM }) });
    case "level-renamed":
      return change({ ...survey, levels: changeLevel(survey.levels, action.levelId, { name: action.name }) });
    case "level-removed":
      return change({ ...survey, levels: removeLevel(survey.levels, action.levelId) });
    case "basis-changed":
      return change({ ...survey, basis: { ...survey.basis, ...action.change } });
    case "system-chosen":
      return { ...state, system: action.system };
    case "undone":
      return settled({ ...state, history: undo(state.history) });
    case "redone":
      return settled({ ...state, history: redo(state.history) });
  }
}

const without = <T>(items: readonly T[], item: T): readonly T[] => items.filter((other) => other !== item);
const toggled = <T>(items: readonly T[], item: T): readonly T[] =>
  items.includes(item) ? without(items, item) : [...items, item];

/** After any change of casts: one of them is in hand, and each has a colour. */
function settled(state: AppState): AppState {
  const { casts } = surveyOf(state);
  const inHand = casts.some((cast) => cast.id === state.castInHandId) ? state.castInHandId : (casts[0]?.id ?? null);
  return { ...state, castInHandId: inHand, colourIndexOf: coloured(casts, state.colourIndexOf) };
}

/** New casts take the colours that the fewest others wear. */
function coloured(casts: readonly Cast[], worn: AppState["colourIndexOf"]): AppState["colourIndexOf"] {
  const colourless = casts.filter((cast) => worn[cast.id] === undefined);
  if (colourless.length === 0) return worn;
  const wearersCount = new Array<number>(COLOURS_COUNT).fill(0);
  for (const cast of casts) {
    const colourIndex = worn[cast.id];
    if (colourIndex !== undefined) wearersCount[colourIndex]!++;
  }
  const next: Record<string, number> = { ...worn };
  for (const cast of colourless) {
    const colourIndex = wearersCount.indexOf(Math.min(...wearersCount));
    next[cast.id] = colourIndex;
    wearersCount[colourIndex]!++;
  }
  return next;
}

function filesRead(state: AppState, files: readonly ReadFile[], start: SurveyStart): AppState {
  const survey = surveyOf(state);
  const read = files.flatMap(({ outcome, sha256 }) => (outcome.ok ? [{ ...outcome.value, sha256 }] : []));
  const casts = read.flatMap((reading) => reading.casts);
  const begun: Survey =
    survey.casts.length > 0
      ? survey
      : { ...survey, name: survey.name || start.name, basis: { ...survey.basis, ...start.basis } };
  const next = casts.length === 0 ? survey : addCasts(begun, casts);
  const readings = read.map(({ casts: _, ...reading }) => reading);
  const readAgain = new Set(readings.map((reading) => reading.fileName));
  const troubles = files.flatMap(({ fileName, outcome }): FileTrouble[] => {
    const issues = outcome.ok ? outcome.value.issues : outcome.issues;
    return issues.length > 0 ? [{ fileName, wasRead: outcome.ok, issues }] : [];
  });
  return settled({
    ...state,
    history: remember(state.history, next),
    readings: [...state.readings.filter((reading) => !readAgain.has(reading.fileName)), ...readings],
    troubles,
  });
}
