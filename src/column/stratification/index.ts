export { defaultStratificationOptions } from "./options.ts";
export type * from "./stratification.ts";
export { stratificationOf } from "./stratification-of.ts";
