import type { CastId } from "../cast/index.ts";

/** The user's own word on one sample, which wins over the tests: 1 = use it, 4 = do not. */
export interface FlagEdit {
  readonly castId: CastId;
  /** Index into the samples of the cast as read. */
  readonly sampleIndex: number;
  readonly flag: 1 | 4;
}
