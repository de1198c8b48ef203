import type { Issue } from "../../base/index.ts";
import type { CastId, FileReading } from "../../cast/index.ts";
import { emptySurvey, type History, type Survey, startHistory } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";

/** How a file was understood, kept beside its casts, which live in the survey. */
export interface KeptReading extends Omit<FileReading, "casts"> {
  /** SHA-256 of the bytes, hexadecimal; null where the browser does not compute it. */
  readonly sha256: string | null;
}

/** What one file's reading had to say, whether or not casts came of it. */
export interface FileTrouble {
  readonly fileName: string;
  readonly wasRead: boolean;
  readonly issues: readonly Issue[];
}

/** All that the page knows and keeps; results follow from it. */
export interface AppState {
  readonly history: History<Survey>;
  readonly readings: readonly KeptReading[];
  readonly troubles: readonly FileTrouble[];
  readonly castInHandId: CastId | null;
  readonly hiddenIds: readonly CastId[];
  /** A cast keeps its colour, whatever is added or removed around it. */
  readonly colourIndexOf: Readonly<Record<string, number>>;
  readonly system: DisplaySystem;
}

export const initialState: AppState = {
  history: startHistory(emptySurvey),
  readings: [],
  troubles: [],
  castInHandId: null,
  hiddenIds: [],
  colourIndexOf: {},
  system: "SI",
};

export const surveyOf = (state: AppState): Survey => state.history.present;
