import { readCastFile } from "../cast/index.ts";
import { solve } from "../survey/index.ts";

/** What the background thread does. Arguments and results are plain data, so that they can cross between threads. */
export const tasks = {
  readCastFile,
  solve,
};

export type Tasks = typeof tasks;
