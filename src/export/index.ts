export { type Cell, csvText } from "./csv.ts";
export { type SourceFile, tableMetadata } from "./metadata.ts";
export { LEVELS_TABLE, levelsCsv, PROFILE_TABLE, profileCsv } from "./profile-csv.ts";
export { SUMMARY_TABLE, summaryCsv } from "./summary-csv.ts";
export { surveyJson } from "./survey-json.ts";
export type { ColumnDescription } from "./table.ts";
export { VERSION } from "./version.ts";
