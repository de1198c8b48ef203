import type { DayCount } from "./day-count.ts";
import type { SlashOrder } from "./parse-time.ts";

/** How the times of a column are written; neither is known while the user has not said which of two it is. */
export interface TimeForm {
  readonly order: SlashOrder | null;
  readonly count: DayCount | null;
}
