export type { Level, LevelId } from "./level.ts";
