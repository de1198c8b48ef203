import { type Remote, wrap } from "comlink";
import type { Tasks } from "./tasks.ts";

/** Starts the background thread; its tasks answer with promises. */
export const startThread = (): Remote<Tasks> =>
  wrap<Tasks>(new Worker(new URL("./thread.ts", import.meta.url), { type: "module" }));
