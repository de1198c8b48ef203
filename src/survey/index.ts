export { type History, redo, remember, startHistory, undo } from "./history.ts";
export { type Solution, type SolvedCast, solve, solveCast } from "./solve.ts";
export { emptySurvey, type Survey } from "./survey.ts";
