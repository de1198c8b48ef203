export { csvText } from "./csv.ts";
export { levelsCsv, profileCsv } from "./profile-csv.ts";
