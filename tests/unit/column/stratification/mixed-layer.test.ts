import { describe, expect, it } from "vitest";
import { mixedDownToGradient, mixedDownToStep } from "../../../../src/column/stratification/mixed-layer.ts";

const toStep = (depthM: readonly number[], values: readonly number[]) =>
  mixedDownToStep(Float64Array.from(depthM), Float64Array.from(values), 30);

describe("mixed layer", () => {
  it("ends where the step is reached, linear between samples, whichever way the quantity goes", () => {
    expect(toStep([1, 5, 9], [0, 0.5, 2.5])).toEqual({ depthM: 6, reachesBottom: false });
    expect(toStep([1, 5, 9], [0, -0.5, -2.5])).toEqual({ depthM: 6, reachesBottom: false });
    expect(toStep([1, 5, 9], [7, 7.5, 5])).toEqual({ depthM: 7.4, reachesBottom: false });
    expect(toStep([1, 5], [0, 1])).toEqual({ depthM: 5, reachesBottom: false });
  });

  it("reaches the bottom of the column, not the last sample, where the step is never reached", () => {
    expect(toStep([1, 5, 9], [0, 0.5, 0.9])).toEqual({ depthM: 30, reachesBottom: true });
    expect(toStep([1], [0])).toEqual({ depthM: 30, reachesBottom: true });
  });

  it("ends, by the second opinion, where density gains by the gradient", () => {
    const setting = { gravityMs2: 10, meanRhoKgM3: 1000 };
    const smoothed = { depthM: Float64Array.of(0, 1, 2, 3), squaredPerS2: Float64Array.of(0, 0, 0.004, 0.001) };
    // 0.1 kg/m3 per metre is N2 = 10 / 1000 * 0.1 = 0.001 s-2.
    expect(mixedDownToGradient(smoothed, setting, 0.1)).toEqual({ depthM: 1.25, reachesBottom: false });
    expect(mixedDownToGradient(smoothed, setting, 0.5)).toEqual({ depthM: 3, reachesBottom: true });
    const fromTop = { ...smoothed, squaredPerS2: Float64Array.of(0.01, 0, 0, 0) };
    expect(mixedDownToGradient(fromTop, setting, 0.1)).toEqual({ depthM: 0, reachesBottom: false });
  });
});
