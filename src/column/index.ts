export { type Basis, type DepthMade, defaultBasis, type ReferenceDensity } from "./basis.ts";
export type { Column } from "./column.ts";
export { integrateCast } from "./integrate.ts";
export type { Origin } from "./nodes.ts";
export { describeAtDepths, type Profile, sampledProfile } from "./profile.ts";
export { type Shortcut, type ShortcutCost, shortcutCosts } from "./shortcut.ts";
export * from "./stratification/index.ts";
export * from "./uncertainty/index.ts";
