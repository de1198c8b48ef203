import type { Issue } from "../../base/index.ts";
import type { AnyFileReading, Cast, CastId, ReadingAnswers, StationList, StationMatch } from "../../cast/index.ts";
import { emptySurvey, type History, type Survey, startHistory } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import type { RememberedAnswers } from "../../worker/index.ts";

/** How a file was understood, kept beside its casts, which live in the survey. */
export interface KeptReading extends Omit<AnyFileReading, "casts"> {
  /** SHA-256 of the bytes, hexadecimal; null where the browser does not compute it. */
  readonly sha256: string | null;
  /** What the user has said about its columns. */
  readonly answers: ReadingAnswers;
  /** The answers were given for an earlier file with the same headers. */
  readonly areAnswersRemembered: boolean;
  /** Under which answers for such a file are remembered. */
  readonly headerKey: string;
  /** Why there are no casts with the answers as they stand; empty where the file was read. */
  readonly refusal: readonly Issue[];
}

/** What one file's reading had to say, whether or not casts came of it. */
export interface FileTrouble {
  readonly fileName: string;
  readonly wasRead: boolean;
  readonly issues: readonly Issue[];
}

export type Place = Pick<Cast, "latitudeDeg" | "longitudeDeg" | "distanceKm" | "waterDepthM">;

/** A list of stations that the casts take their places from. */
export interface KeptStations {
  readonly list: StationList;
  /** What the user has said: by station of the casts, the station of the list, or null for none. */
  readonly corrections: Readonly<Record<string, string | null>>;
  /** One a station of the casts. */
  readonly matches: readonly StationMatch[];
  /** The places that casts had before, by cast, where the list has given them others. */
  readonly placesAsRead: Readonly<Record<string, Place>>;
}

/** What can be undone: the survey, and what was said on the way from files to its casts. */
export interface Work {
  readonly survey: Survey;
  readonly readings: readonly KeptReading[];
  readonly remembered: RememberedAnswers;
  readonly stations: KeptStations | null;
}

export const emptyWork: Work = { survey: emptySurvey, readings: [], remembered: {}, stations: null };

/** All that the page knows and keeps; results follow from it. */
export interface AppState {
  readonly history: History<Work>;
  readonly troubles: readonly FileTrouble[];
  readonly castInHandId: CastId | null;
  readonly hiddenIds: readonly CastId[];
  /** A cast keeps its colour, whatever is added or removed around it. */
  readonly colourIndexOf: Readonly<Record<string, number>>;
  readonly system: DisplaySystem;
}

export const initialState: AppState = {
  history: startHistory(emptyWork),
  troubles: [],
  castInHandId: null,
  hiddenIds: [],
  colourIndexOf: {},
  system: "SI",
};

export const surveyOf = (state: AppState): Survey => state.history.present.survey;

export const readingsOf = (state: AppState): readonly KeptReading[] => state.history.present.readings;

/** Those of the whole history, since undo can bring any of them back. */
export const allReadingsOf = ({ history: { past, present, future } }: AppState): readonly KeptReading[] =>
  [...past, present, ...future].flatMap(({ readings }) => readings);
