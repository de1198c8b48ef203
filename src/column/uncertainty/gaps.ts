import { ownTemperature, waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";
import type { Place } from "./place.ts";

/**
 * How far the weight of water that was not sampled may lie from what is held, as density times depth (kg/m2), signed,
 * down to any depth. Above the first sample: fresh water at that sample's temperature, or the trend of the water below
 * it where that leads farther, as in a warm lake. Below the last sample: the trend of the water above it. No trend makes
 * water heavier upward.
 */
export class GapErrors {
  readonly #firstDepthM: number;
  readonly #lastDepthM: number;
  readonly #fresherKgM3: number;
  readonly #column: Column;
  readonly #rhoKgM3: Float64Array;
  readonly #surfaceTrend: number;

  /** @param stepKgM3 density step of each interval */
  constructor(column: Column, stepKgM3: Float64Array) {
    this.#column = column;
    this.#firstDepthM = column.depthM[0]!;
    this.#lastDepthM = column.depthM[column.n - 1]!;
    this.#rhoKgM3 = new Float64Array(column.n);
    for (let k = 1; k < column.n; k++) this.#rhoKgM3[k] = this.#rhoKgM3[k - 1]! + stepKgM3[k - 1]!;
    this.#fresherKgM3 = freshLessFirstKgM3(column);
    this.#surfaceTrend = this.#trend(0, 1, this.#firstDepthM);
  }

  surfaceGapM({ depthM }: Place): number {
    return Math.min(depthM, this.#firstDepthM);
  }

  bedGapM({ depthM }: Place): number {
    return Math.max(depthM - this.#lastDepthM, 0);
  }

  surfaceDownTo(place: Place): number {
    const gapM = this.surfaceGapM(place);
    const asFresh = gapM * this.#fresherKgM3;
    const asTrend = -this.#surfaceTrend * gapM * (this.#firstDepthM - gapM / 2);
    return Math.abs(asTrend) > Math.abs(asFresh) ? asTrend : asFresh;
  }

  bedDownTo(place: Place): number {
    const gapM = this.bedGapM(place);
    return gapM > 0 ? (this.#trend(this.#column.n - 1, -1, gapM) * gapM * gapM) / 2 : 0;
  }

  /**
   * Density per metre beside an end of the samples, over as much water as the gap is thick, so that two samples close
   * together do not set it: kg/m4, 0 where the water is not heavier downward.
   */
  #trend(endIndex: number, inward: 1 | -1, gapM: number): number {
    const { depthM, n } = this.#column;
    const spanM = (k: number): number => Math.abs(depthM[k]! - depthM[endIndex]!);
    let k = endIndex;
    while (spanM(k) < gapM && k + inward >= 0 && k + inward < n) k += inward;
    const heavierDownKgM3 = inward * (this.#rhoKgM3[k]! - this.#rhoKgM3[endIndex]!);
    return spanM(k) > 0 ? Math.max(heavierDownKgM3, 0) / spanM(k) : 0;
  }
}

/** Density of fresh water at the first sample's temperature, less that of the first sample, both at the surface. */
function freshLessFirstKgM3(column: Column): number {
  const model = waterModel(column.basis.water);
  const freshTempC = ownTemperature(model, { salinity: 0, inSituTempC: column.inSituTempC[0]!, seaPressureDbar: 0 });
  return model.density(0, freshTempC, 0) - model.density(column.salinity[0]!, column.tempC[0]!, 0);
}
