import { convert, type DisplaySystem, displayUnit } from "../../units/index.ts";

const unitOfDepth = (system: DisplaySystem) => displayUnit("depth", system).unit;

export const inShownDepth = (depthM: number, system: DisplaySystem): number =>
  convert(depthM, "m", unitOfDepth(system));

export const inMetres = (depth: number, system: DisplaySystem): number => convert(depth, unitOfDepth(system), "m");

/** A pointer does not know more than a hundredth of the unit shown. */
export const tidyDepthM = (depthM: number, system: DisplaySystem): number =>
  Number(inMetres(Number(inShownDepth(depthM, system).toFixed(2)), system).toFixed(6));

const SMALL_STEPS: Readonly<Record<string, number>> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 };
const BIG_STEPS: Readonly<Record<string, number>> = { PageDown: 1, PageUp: -1 };

/**
 * Where a key takes the plumb line: a tenth of the unit shown, a twentieth of the axis, or an end; null for other keys.
 * @example steppedDepthM("ArrowDown", { depthM: 2, deepestM: 20 }, "SI") // 2.1
 */
export function steppedDepthM(
  key: string,
  { depthM, deepestM }: { readonly depthM: number; readonly deepestM: number },
  system: DisplaySystem,
): number | null {
  const small = SMALL_STEPS[key];
  const big = BIG_STEPS[key];
  const within = (next: number): number => tidyDepthM(Math.min(deepestM, Math.max(0, next)), system);
  if (small !== undefined) return within(depthM + small * inMetres(0.1, system));
  if (big !== undefined) return within(depthM + (big * deepestM) / 20);
  if (key === "Home") return 0;
  return key === "End" ? within(deepestM) : null;
}
