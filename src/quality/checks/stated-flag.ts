import type { Evidence } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";

const MEANING: Readonly<Record<number, string>> = {
  [QUALITY_FLAG.suspect]: "suspect",
  [QUALITY_FLAG.fail]: "fail",
  [QUALITY_FLAG.missing]: "missing",
};

/** The flags of the file itself: whoever made it may know more than its numbers tell. */
export const statedFlag = ({ samples }: Evidence): readonly Finding[] =>
  [...(samples.statedFlag ?? []).entries()]
    .filter(([, flag]) => flag in MEANING)
    .map(([sampleIndex, flag]) => ({
      check: "stated-flag",
      sampleIndex,
      flag: flag as Finding["flag"],
      reason: `flagged ${flag} (${MEANING[flag]}) in the file itself`,
    }));
