import { partWay } from "./part-way.ts";

/** Something known at some depths, linear between them and held beyond the ends; two depths may coincide at a jump. */
export class LinearProfile {
  readonly depthM: Float64Array;
  readonly values: Float64Array;
  /** Integral of the values less the first, from the first depth down: the difference keeps the digits of what varies. */
  readonly #excess: Float64Array;

  /** @param depthM not decreasing, at least one */
  constructor(depthM: Float64Array, values: Float64Array) {
    this.depthM = depthM;
    this.values = values;
    this.#excess = new Float64Array(depthM.length);
    for (let k = 1; k < depthM.length; k++) {
      const meanExcess = (values[k - 1]! - values[0]! + (values[k]! - values[0]!)) / 2;
      this.#excess[k] = this.#excess[k - 1]! + (depthM[k]! - depthM[k - 1]!) * meanExcess;
    }
  }

  get topDepthM(): number {
    return this.depthM[0]!;
  }

  get bottomDepthM(): number {
    return this.depthM.at(-1)!;
  }

  at(depthM: number): number {
    const k = this.#above(depthM);
    if (k < 0) return this.values[0]!;
    const last = this.depthM.length - 1;
    if (k === last) return this.values[last]!;
    const share = (depthM - this.depthM[k]!) / (this.depthM[k + 1]! - this.depthM[k]!);
    return partWay([this.values[k]!, this.values[k + 1]!], share);
  }

  /** Depth mean; the value itself where both depths are one. */
  mean(fromDepthM: number, toDepthM: number): number {
    if (fromDepthM === toDepthM) return this.at(fromDepthM);
    return this.values[0]! + this.meanExcess(fromDepthM, toDepthM);
  }

  /** Depth mean less the first value: good to the last digits where only differences of means count. */
  meanExcess(fromDepthM: number, toDepthM: number): number {
    return (this.#excessDownTo(toDepthM) - this.#excessDownTo(fromDepthM)) / (toDepthM - fromDepthM);
  }

  /** For values that do not decrease downward: the shallowest depth at which `values` is reached; the bottom if never. */
  depthReaching(values: number): number {
    const k = this.values.findIndex((value) => value >= values);
    if (k < 0) return this.bottomDepthM;
    if (k === 0) return this.topDepthM;
    const share = (values - this.values[k - 1]!) / (this.values[k]! - this.values[k - 1]!);
    return partWay([this.depthM[k - 1]!, this.depthM[k]!], share);
  }

  #excessDownTo(depthM: number): number {
    const k = this.#above(depthM);
    if (k < 0) return 0;
    const mean = (this.values[k]! - this.values[0]! + (this.at(depthM) - this.values[0]!)) / 2;
    return this.#excess[k]! + (depthM - this.depthM[k]!) * mean;
  }

  /** Index of the last depth at or above one; -1 above all. */
  #above(depthM: number): number {
    let low = 0;
    let high = this.depthM.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (this.depthM[middle]! <= depthM) low = middle + 1;
      else high = middle;
    }
    return low - 1;
  }
}
