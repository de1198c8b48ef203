export { type AnsweredCast, type CastOnShelf, onShelf, unpackCast } from "./answered-cast.ts";
export { inStore, keepOnly } from "./database.ts";
export type { DrawnProfile } from "./drawn-profile.ts";
export type { MarkedRun, MarkedSamples, Marks } from "./marked-samples.ts";
export type { ReadAnswer, ReadRequest, RememberedAnswers } from "./reader-tasks.ts";
export type { Layering } from "./solver-tasks.ts";
export { Stopped, startThreads, type Threads } from "./threads.ts";
