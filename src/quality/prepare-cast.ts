import type { Cast } from "../cast/index.ts";
import { densityDisagreement } from "./density-agreement.ts";
import type { FlagEdit } from "./flag-edit.ts";
import type { Preparation } from "./preparation.ts";
import type { PreparedCast } from "./prepared-cast.ts";
import { QUALITY_FLAG } from "./quality-flag.ts";

/** Runs every test on a cast, takes out what does not belong into a column, and says why of each sample. */
export function prepareCast(
  cast: Cast,
  _preparation: Preparation,
  _edits: readonly FlagEdit[],
  unmeasuredPracticalSalinity: number,
): PreparedCast {
  const { n } = cast.samples;
  const flag = new Uint8Array(n).fill(QUALITY_FLAG.notEvaluated);
  const { sampleIndex, issues } = densityDisagreement(cast, unmeasuredPracticalSalinity);
  for (const i of sampleIndex) flag[i] = QUALITY_FLAG.suspect;
  return {
    cast,
    flag,
    reasons: Array.from(flag, () => []),
    use: new Uint8Array(n).fill(1),
    sampleIndexOf: Int32Array.from(flag, (_, i) => i),
    preparedFlag: flag,
    binCount: null,
    issues,
  };
}
