import type { Place } from "./place.ts";

/*
 * Sums over the knots of a column down to any depth, each in one step after one pass. Every quantity runs linearly
 * between knots; at share s of an interval the upper knot's hat has s - s^2/2 of the interval's length behind it, the
 * lower knot's s^2/2.
 */

/** The integral from the surface of a quantity that is linear between knots and held above the first and below the last. */
export class RunningIntegral {
  readonly #depthM: Float64Array;
  readonly #values: Float64Array;
  readonly #toKnot: Float64Array;

  constructor(depthM: Float64Array, values: Float64Array) {
    this.#depthM = depthM;
    this.#values = values;
    this.#toKnot = new Float64Array(depthM.length);
    let sum = depthM[0]! * values[0]!;
    this.#toKnot[0] = sum;
    for (let k = 1; k < depthM.length; k++) {
      sum += ((depthM[k]! - depthM[k - 1]!) * (values[k]! + values[k - 1]!)) / 2;
      this.#toKnot[k] = sum;
    }
  }

  downTo({ depthM, knotIndex: k, shareFrac }: Place): number {
    if (k < 0) return depthM * this.#values[0]!;
    const upper = this.#values[k]!;
    const lower = this.#values[k + 1] ?? upper;
    return this.#toKnot[k]! + (depthM - this.#depthM[k]!) * (upper + ((lower - upper) * shareFrac) / 2);
  }
}

/** The sum of something that every interval adds to, in equal measure along it. */
export class RunningSum {
  readonly #values: Float64Array;
  readonly #toKnot: Float64Array;

  constructor(values: Float64Array) {
    this.#values = values;
    this.#toKnot = new Float64Array(values.length + 1);
    let sum = 0;
    values.forEach((added, k) => {
      sum += added;
      this.#toKnot[k + 1] = sum;
    });
  }

  downTo({ knotIndex: k, shareFrac }: Place): number {
    return k < 0 ? 0 : this.#toKnot[k]! + (this.#values[k] ?? 0) * shareFrac;
  }
}

/**
 * The sum of squares of knot values times knot weights, where a knot's weight is half of either neighbouring interval:
 * what independent errors of the knots come to. What an interval measures is the caller's: its height, or a step.
 */
export class RunningSquares {
  readonly #along: Float64Array;
  readonly #values: Float64Array;
  readonly #aboveKnot: Float64Array;
  /** The knots' depths where water in the gaps leans on the first and last knot; null where the gaps add nothing. */
  readonly #gapDepthM: Float64Array | null;

  constructor(along: Float64Array, values: Float64Array, gapDepthM: Float64Array | null) {
    this.#along = along;
    this.#values = values;
    this.#gapDepthM = gapDepthM;
    this.#aboveKnot = new Float64Array(values.length);
    let sum = 0;
    for (let k = 0; k + 1 < values.length; k++) {
      this.#aboveKnot[k] = sum;
      sum += ((this.#weightAbove(k) + along[k]! / 2) * values[k]!) ** 2;
    }
    this.#aboveKnot[values.length - 1] = sum;
  }

  #weightAbove(k: number): number {
    return k === 0 ? (this.#gapDepthM?.[0] ?? 0) : this.#along[k - 1]! / 2;
  }

  downTo({ depthM, knotIndex: k, shareFrac: s }: Place): number {
    if (k < 0) return this.#gapDepthM ? (depthM * this.#values[0]!) ** 2 : 0;
    const interval = this.#along[k];
    if (interval === undefined) {
      const below = this.#gapDepthM ? depthM - this.#gapDepthM[k]! : 0;
      return this.#aboveKnot[k]! + ((this.#weightAbove(k) + below) * this.#values[k]!) ** 2;
    }
    const lower = (s * s) / 2;
    return (
      this.#aboveKnot[k]! +
      ((this.#weightAbove(k) + interval * (s - lower)) * this.#values[k]!) ** 2 +
      (interval * lower * this.#values[k + 1]!) ** 2
    );
  }
}
