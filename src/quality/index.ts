export type { FlagEdit } from "./flag-edit.ts";
export { defaultPreparation, type Preparation, type WaterKind } from "./preparation.ts";
export { prepareCast } from "./prepare-cast.ts";
export type { PreparedCast } from "./prepared-cast.ts";
export { QUALITY_FLAG } from "./quality-flag.ts";
