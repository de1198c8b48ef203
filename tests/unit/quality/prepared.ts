import { defaultPreparation, type FlagEdit, type Preparation, prepareCast } from "../../../src/quality/index.ts";
import { castOf } from "../../support/cast-of.ts";

export type Columns = Parameters<typeof castOf>[0];

/** A cast from bare arrays, checked and prepared. */
export const preparedOf = (
  columns: Columns,
  preparation: Partial<Preparation> = {},
  edits: readonly FlagEdit[] = [],
  unmeasuredPracticalSalinity = 0,
) => prepareCast(castOf(columns), { ...defaultPreparation, ...preparation }, edits, unmeasuredPracticalSalinity);

export const flagsOf = (...args: Parameters<typeof preparedOf>): number[] => [...preparedOf(...args).flag];

/** Depths 0.5, 1, 1.5 ... m, as many as there are values. */
export const everyHalfMetre = (values: readonly number[]): number[] => values.map((_, i) => 0.5 * (i + 1));

/** A calm halocline in `n` samples, recorded to 0.001: what no check has a word to say about. */
export function calmWater(n: number): { depthM: number[]; inSituTempC: number[]; practicalSalinity: number[] } {
  const depthM = Array.from({ length: n }, (_, i) => 0.5 * (i + 1));
  const step = depthM.map((z) => Math.tanh((z - n / 4) / 2));
  const thousandths = (value: number): number => Math.round(value * 1000) / 1000;
  return {
    depthM,
    inSituTempC: step.map((s, i) => thousandths(14 - 3 * s - 0.01 * i)),
    practicalSalinity: step.map((s, i) => thousandths(18 + 12 * s + 0.01 * i)),
  };
}
