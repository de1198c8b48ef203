import type { CastId } from "../../cast/index.ts";
import type { SolvedCast } from "../../survey/index.ts";

export interface GoverningCast {
  readonly castId: CastId;
  readonly name: string;
  readonly gaugePressureKPa: number;
}

/** Of some casts, the one with the greatest gauge pressure at a level; null where none reaches it. */
export function governingCast(solved: readonly SolvedCast[], levelIndex: number): GoverningCast | null {
  let governing: GoverningCast | null = null;
  for (const { cast, solution } of solved) {
    const gaugePressureKPa = solution?.levels.gaugePressureKPa[levelIndex] ?? Number.NaN;
    if (gaugePressureKPa > (governing?.gaugePressureKPa ?? Number.NEGATIVE_INFINITY))
      governing = { castId: cast.id, name: cast.name, gaugePressureKPa };
  }
  return governing;
}
