import type { Column } from "../column.ts";
import type { Place } from "./place.ts";

/** Errors of the straight line between samples, as density times depth (kg/m2), down to any depth. */
export class SamplingErrors {
  readonly #heightM: Float64Array;
  readonly #stepKgM3: Float64Array;
  readonly #slope: Float64Array;
  readonly #shapeToKnot: Float64Array;
  readonly #boundToKnot: Float64Array;

  /** @param stepKgM3 density step of each interval */
  constructor({ n, depthM }: Column, stepKgM3: Float64Array) {
    this.#stepKgM3 = stepKgM3;
    this.#heightM = Float64Array.from(stepKgM3, (_, k) => depthM[k + 1]! - depthM[k]!);
    this.#slope = monotoneSlopes(this.#heightM, stepKgM3);
    this.#shapeToKnot = new Float64Array(n);
    this.#boundToKnot = new Float64Array(n);
    for (let k = 0; k + 1 < n; k++) {
      this.#shapeToKnot[k + 1] = this.#shapeToKnot[k]! + this.#shape(k, 1);
      this.#boundToKnot[k + 1] = this.#boundToKnot[k]! + this.#bound(k, 1);
    }
  }

  /** The monotone cubic's integral less the straight line's (signed). */
  shapeDownTo({ knotIndex: k, shareFrac }: Place): number {
    return k < 0 ? 0 : this.#shapeToKnot[k]! + this.#shape(k, shareFrac);
  }

  /** No monotone course between the samples can be farther from the straight line's integral. */
  boundDownTo({ knotIndex: k, shareFrac }: Place): number {
    return k < 0 ? 0 : this.#boundToKnot[k]! + this.#bound(k, shareFrac);
  }

  /** Integral over the first share s of an interval of Hermite's cubic less the chord. */
  #shape(k: number, shareFrac: number): number {
    const s = shareFrac;
    const heightM = this.#heightM[k];
    if (heightM === undefined) return 0;
    const s2 = s * s;
    const fromStep = this.#stepKgM3[k]! * s2 * (s - s2 / 2 - 0.5);
    const fromUpper = this.#slope[k]! * heightM * s2 * (0.5 - (2 / 3) * s + s2 / 4);
    const fromLower = this.#slope[k + 1]! * heightM * s2 * (s2 / 4 - s / 3);
    return heightM * (fromStep + fromUpper + fromLower);
  }

  /** A jump right below the upper sample against the chord: the worse of the two ways, whole interval or part. */
  #bound(k: number, shareFrac: number): number {
    const heightM = this.#heightM[k];
    return heightM === undefined ? 0 : heightM * Math.abs(this.#stepKgM3[k]!) * (shareFrac - shareFrac ** 2 / 2);
  }
}

/**
 * Slopes at the knots with which Hermite's cubic never overshoots: the weighted harmonic mean of the neighbouring
 * secants (Fritsch & Butland 1984), three-point slopes at the ends, limited as Fritsch & Carlson 1980 ask.
 */
function monotoneSlopes(heightM: Float64Array, stepKgM3: Float64Array): Float64Array {
  const intervals = heightM.length;
  const slope = new Float64Array(intervals + 1);
  const secant = stepKgM3.map((step, k) => (heightM[k]! > 0 ? step / heightM[k]! : 0));
  for (let k = 1; k < intervals; k++) {
    const above = secant[k - 1]!;
    const below = secant[k]!;
    if (above * below <= 0) continue;
    const weightAbove = 2 * heightM[k]! + heightM[k - 1]!;
    const weightBelow = heightM[k]! + 2 * heightM[k - 1]!;
    slope[k] = (weightAbove + weightBelow) / (weightAbove / above + weightBelow / below);
  }
  const end = (ownIndex: number, nextIndex: number): number => {
    const [first, second] = [secant[ownIndex]!, secant[nextIndex]!];
    const [near, far] = [heightM[ownIndex]!, heightM[nextIndex]!];
    const threePoint = ((2 * near + far) * first - near * second) / (near + far);
    if (!(threePoint * first > 0)) return 0;
    return first * second < 0 && Math.abs(threePoint) > 3 * Math.abs(first) ? 3 * first : threePoint;
  };
  if (intervals === 1) slope.fill(secant[0]!);
  if (intervals > 1) {
    slope[0] = end(0, 1);
    slope[intervals] = end(intervals - 1, intervals - 2);
  }
  return slope;
}
