import { startThread } from "../worker/index.ts";

/** The page's background thread. */
export const thread = startThread();
