import type { Column, Profile } from "../../survey/index.ts";

/** What stands behind a value at a depth: samples on both sides, or a held sample on one. */
export type Behind = "sampled" | "above-first-sample" | "below-last-sample" | "no-water";

export function behindDepth(column: Column, depthM: number): Behind {
  if (!(depthM >= 0) || depthM > (column.bedDepthM ?? Number.POSITIVE_INFINITY)) return "no-water";
  if (depthM < column.depthM[0]!) return "above-first-sample";
  return depthM > column.depthM[column.n - 1]! ? "below-last-sample" : "sampled";
}

export const BEHIND_NOTE: Readonly<Record<Behind, string>> = {
  sampled: "",
  "above-first-sample": "held above first sample",
  "below-last-sample": "held below last sample",
  "no-water": "below the bed",
};

/** Buoyancy frequency squared, s-2, of the water between the two samples around a depth; NaN where there are not two. */
export function buoyancyAround(profile: Profile, depthM: number): number {
  let low = 0;
  let high = profile.n;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (profile.depthM[middle]! <= depthM) low = middle + 1;
    else high = middle;
  }
  return profile.buoyancyFrequencySquaredPerS2[low - 1] ?? Number.NaN;
}

export interface Strongest {
  readonly perS2: number;
  readonly depthM: number;
}

/** The most stratified interval between two samples. */
export function strongestStratification({ n, depthM, buoyancyFrequencySquaredPerS2 }: Profile): Strongest | null {
  let strongest = -1;
  let perS2 = Number.NEGATIVE_INFINITY;
  for (let row = 0; row < n; row++) {
    const value = buoyancyFrequencySquaredPerS2[row]!;
    if (!(value > perS2)) continue;
    strongest = row;
    perS2 = value;
  }
  return strongest < 0 ? null : { perS2, depthM: (depthM[strongest]! + depthM[strongest + 1]!) / 2 };
}
