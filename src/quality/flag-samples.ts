import type { Issue } from "../base/index.ts";
import type { Cast } from "../cast/index.ts";
import { densityDisagreement } from "./density-agreement.ts";

/** Flags of the open QARTOD manuals (IOOS 2016): 1 pass, 2 not evaluated, 3 suspect, 4 fail, 9 missing. */
export const QUALITY_FLAG = { pass: 1, notEvaluated: 2, suspect: 3, fail: 4, missing: 9 } as const;

/** A flag for every sample of a cast, in the order of the file. Flagged samples are kept and used; the flag tells. */
export function flagSamples(
  cast: Cast,
  unmeasuredPracticalSalinity: number,
): { readonly flag: Uint8Array; readonly issues: readonly Issue[] } {
  const flag = new Uint8Array(cast.samples.n).fill(QUALITY_FLAG.notEvaluated);
  const { sampleIndex, issues } = densityDisagreement(cast, unmeasuredPracticalSalinity);
  for (const i of sampleIndex) flag[i] = QUALITY_FLAG.suspect;
  return { flag, issues };
}
