/** The library's public face. */
export { type Issue, isToolError, type Outcome, ToolError } from "./base/index.ts";
export { type Cast, type FileReading, readCastFile, type Samples } from "./cast/index.ts";
export {
  csvText,
  LEVELS_TABLE,
  levelsCsv,
  PROFILE_TABLE,
  profileCsv,
  SUMMARY_TABLE,
  summaryCsv,
  surveyJson,
  tableMetadata,
  VERSION,
} from "./export/index.ts";
export * as teos10 from "./gsw-ts-port/index.ts";
export {
  addCasts,
  type Basis,
  type Column,
  defaultBasis,
  describeAtDepths,
  emptySurvey,
  type Level,
  type Profile,
  type SolvedCast,
  type Survey,
  solve,
  solveCast,
  type WaterPoints,
  waterAtPoints,
} from "./survey/index.ts";
