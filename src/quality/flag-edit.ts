import type { Cast, CastId } from "../cast/index.ts";
import type { Finding } from "./finding.ts";

/** The user's own word on one sample, which wins over the tests: 1 = use it, 4 = do not. */
export interface FlagEdit {
  readonly castId: CastId;
  /** Index into the samples of the cast as read. */
  readonly sampleIndex: number;
  readonly flag: 1 | 4;
}

/** The user's word on the samples of one cast, by sample; words on other casts or on samples it does not have are passed over. */
export const wordsOn = (cast: Cast, edits: readonly FlagEdit[]): ReadonlyMap<number, FlagEdit["flag"]> =>
  new Map(
    edits
      .filter(({ castId, sampleIndex }) => castId === cast.id && sampleIndex in cast.samples.lineIndex)
      .map(({ sampleIndex, flag }) => [sampleIndex, flag]),
  );

const IN_WORDS = { 1: "taken as good by hand", 4: "taken out by hand" } as const;

/** The user's word in the form of a finding. */
export const wordsAsFindings = (byHand: ReturnType<typeof wordsOn>): readonly Finding[] =>
  Array.from(byHand, ([sampleIndex, flag]) => ({ check: "by-hand", sampleIndex, flag, reason: IN_WORDS[flag] }));
