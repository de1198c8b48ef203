export type * from "./stratification.ts";
