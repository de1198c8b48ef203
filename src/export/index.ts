export { type Cell, csvText } from "./csv.ts";
export { type SourceFile, tableMetadata } from "./metadata.ts";
export { levelsCsv, profileCsv } from "./profile-csv.ts";
export { summaryCsv } from "./summary-csv.ts";
export { surveyJson } from "./survey-json.ts";
export { VERSION } from "./version.ts";
