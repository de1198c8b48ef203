import { defaultBasis, emptySurvey, type History, type Survey } from "../../survey/index.ts";
import { type AppState, initialState } from "./app-state.ts";

/** Work saved by an earlier version, with what has come since at its default. */
export function takeUp(saved: AppState): AppState {
  const { past, present, future }: History<Survey> = saved.history;
  return {
    ...initialState,
    ...saved,
    history: { past: past.map(completed), present: completed(present), future: future.map(completed) },
  };
}

const completed = (survey: Survey): Survey => ({
  ...emptySurvey,
  ...survey,
  basis: { ...defaultBasis, ...survey.basis },
});
