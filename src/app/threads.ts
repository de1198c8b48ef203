import { startThreads } from "../worker/index.ts";

/** The page's background threads. */
export const threads = startThreads();
