import type { Cast, Samples } from "../../cast/index.ts";
import { defaultBasis, emptySurvey, type History, type Survey } from "../../survey/index.ts";
import { type CastOnShelf, onShelf } from "../../worker/index.ts";
import { type AppState, emptyWork, initialState, type Work } from "./app-state.ts";

/** The state with the samples of its casts named by key; these are kept apart, since they are large and never change. */
export interface SavedState extends Omit<AppState, "history"> {
  readonly history: History<SavedWork>;
}

interface SavedWork extends Omit<Work, "survey"> {
  readonly survey: SavedSurvey;
}

interface SavedSurvey extends Omit<Survey, "casts"> {
  readonly casts: readonly CastOnShelf[];
}

const throughout = <A, B>({ past, present, future }: History<A>, change: (value: A) => B): History<B> => ({
  past: past.map(change),
  present: change(present),
  future: future.map(change),
});

/** Work once for each object, so that what steps of the history share stays shared. */
function once<K extends object, V>(make: (key: K) => V): (key: K) => V {
  const made = new WeakMap<K, V>();
  return (key) => {
    if (!made.has(key)) made.set(key, make(key));
    return made.get(key)!;
  };
}

/** Makes states ready to be saved; of one state to the next only what has changed is made anew. */
export function statePacker(keyOf: (samples: Samples) => string): (state: AppState) => SavedState {
  const packCast = once((cast: Cast) => onShelf(cast, keyOf(cast.samples)));
  const packCasts = once((casts: readonly Cast[]) => casts.map(packCast));
  const packWork = once((work: Work): SavedWork => {
    const { survey } = work;
    return { ...work, survey: { ...survey, casts: packCasts(survey.casts) } };
  });
  return (state) => ({ ...state, history: throughout(state.history, packWork) });
}

/** The keys of all samples that a saved state needs, undo included. */
export const samplesKeysOf = ({ history }: SavedState): ReadonlySet<string> =>
  new Set(
    [...history.past, history.present, ...history.future].flatMap(({ survey }) =>
      survey.casts.map(({ samplesKey }) => samplesKey),
    ),
  );

/**
 * A saved state with its samples; what has come to the program since is at its default. Casts whose samples are lost are
 * left out.
 */
export function takeUp(saved: SavedState, samplesByKey: ReadonlyMap<string, Samples>): AppState {
  const unpackCast = once(({ samplesKey, ...cast }: CastOnShelf): Cast | null => {
    const samples = samplesByKey.get(samplesKey);
    return samples ? { ...cast, samples } : null;
  });
  const unpackCasts = once((casts: readonly CastOnShelf[]) => casts.flatMap((cast) => unpackCast(cast) ?? []));
  const unpackWork = (work: SavedWork): Work => {
    const { survey } = work;
    const casts = unpackCasts(survey.casts);
    return {
      ...emptyWork,
      ...work,
      survey: { ...emptySurvey, ...survey, basis: { ...defaultBasis, ...survey.basis }, casts },
    };
  };
  return { ...initialState, ...saved, history: throughout(saved.history, unpackWork) };
}
