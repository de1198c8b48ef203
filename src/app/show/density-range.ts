import type { ThumbnailRange } from "../../charts/layout/index.ts";
import type { AnsweredCast } from "../../worker/index.ts";

/** Densities in kg/m3 and depths in m of all casts, so that their thumbnails can be compared. */
export function densityRange(casts: readonly AnsweredCast[]): ThumbnailRange {
  let from = Number.POSITIVE_INFINITY;
  let to = Number.NEGATIVE_INFINITY;
  let deepest = 0;
  for (const { solution, drawn } of casts) {
    if (!solution || !drawn) continue;
    for (const rhoKgM3 of drawn.rhoKgM3) {
      if (rhoKgM3 < from) from = rhoKgM3;
      if (rhoKgM3 > to) to = rhoKgM3;
    }
    deepest = Math.max(deepest, solution.column.bottomDepthM);
  }
  return { from, to, deepest };
}
