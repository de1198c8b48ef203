import type { Cast, CastId, StationList } from "../../cast/index.ts";
import {
  addFlagEdits,
  type Basis,
  type FlagEdit,
  type LevelId,
  type Preparation,
  redo,
  remember,
  removeFlagEdits,
  type SampleRange,
  type Survey,
  undo,
} from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import { type AppState, emptyWork, surveyOf, type Work } from "./app-state.ts";
import { type FileAgain, type ReadFile, type SurveyStart, takeAgain, takeFiles, troublesOf } from "./files.ts";
import { addLevel, changeLevel, removeLevel } from "./levels.ts";
import { correctStation, dropStations, joinList, withStations } from "./stations.ts";

export type Action =
  | { readonly kind: "files-read"; readonly files: readonly ReadFile[]; readonly start: SurveyStart }
  | {
      readonly kind: "files-read-again";
      readonly files: readonly FileAgain[];
      /** What becomes of the answers remembered for files with the same headers. */
      readonly memory: "keep" | "forget" | "as-it-is";
    }
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
  | { readonly kind: "preparation-changed"; readonly change: Partial<Preparation> }
  | {
      readonly kind: "samples-flagged";
      readonly ranges: readonly SampleRange[];
      /** Null takes the user's flags back. */
      readonly flag: FlagEdit["flag"] | null;
    }
  | { readonly kind: "stations-listed"; readonly list: StationList }
  | { readonly kind: "station-corrected"; readonly castStation: string; readonly listStation: string | null }
  | { readonly kind: "stations-dropped" }
  | { readonly kind: "system-chosen"; readonly system: DisplaySystem }
  | { readonly kind: "undone" }
  | { readonly kind: "redone" };

/** Colours told apart by eye; with more casts they come round again. */
const COLOURS_COUNT = 10;

/** The next state. What changes the work goes through its history and can be undone; the rest is how one looks at it. */
export function reduce(state: AppState, action: Action): AppState {
  const work = state.history.present;
  const { survey } = work;
  const changeWork = (next: Work): AppState => settled({ ...state, history: remember(state.history, next) });
  const change = (next: Survey): AppState => changeWork(next === survey ? work : { ...work, survey: next });
  switch (action.kind) {
    case "files-read":
      return {
        ...changeWork(withStations(work, (plain) => takeFiles(plain, action.files, action.start))),
        troubles: troublesOf(action.files),
      };
    case "files-read-again":
      return changeWork(withStations(work, (plain) => remembering(readAgain(plain, action.files), action)));
    case "troubles-dismissed":
      return { ...state, troubles: [] };
    case "survey-renamed":
      return change({ ...survey, name: action.name });
    case "survey-cleared":
      return { ...changeWork({ ...emptyWork, remembered: work.remembered }), troubles: [] };
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
    case "preparation-changed":
      return change({ ...survey, preparation: { ...survey.preparation, ...action.change } });
    case "samples-flagged":
      return change(flagged(survey, action.ranges, action.flag));
    case "stations-listed":
      return changeWork(joinList(work, action.list));
    case "station-corrected":
      return changeWork(correctStation(work, action.castStation, action.listStation));
    case "stations-dropped":
      return changeWork(dropStations(work));
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

const flagged = (survey: Survey, ranges: readonly SampleRange[], flag: FlagEdit["flag"] | null): Survey =>
  ranges.reduce(
    (next, range) => (flag === null ? removeFlagEdits(next, range) : addFlagEdits(next, range, flag)),
    survey,
  );

const readAgain = (work: Work, files: readonly FileAgain[]): Work =>
  files.reduce((taken, file) => takeAgain(taken, file), work);

/** What is remembered for files with the same headers, after some were read again. */
function remembering(work: Work, { files, memory }: Extract<Action, { kind: "files-read-again" }>): Work {
  const file = files[0]!;
  const reading = work.readings.find(({ fileName }) => fileName === file.fileName);
  if (memory === "as-it-is" || !reading) return work;
  const { [reading.headerKey]: _, ...others } = work.remembered;
  return { ...work, remembered: memory === "forget" ? others : { ...others, [reading.headerKey]: file.answers } };
}

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
