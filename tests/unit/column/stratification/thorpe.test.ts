import { describe, expect, it } from "vitest";
import { thorpeSorting } from "../../../../src/column/stratification/thorpe.ts";

const sorting = (rhoKgM3: readonly number[], densityNoiseKgM3 = 0.03) =>
  thorpeSorting(
    Float64Array.from(rhoKgM3, (_, k) => k),
    Float64Array.from(rhoKgM3),
    densityNoiseKgM3,
  );

describe("Thorpe sorting", () => {
  it("moves nothing in a stable column, one sample or none the same as many", () => {
    for (const rho of [[1000], [1000, 1001], [1000, 1000, 1000, 1003]])
      expect(sorting(rho)).toEqual({ displacementM: new Float64Array(rho.length), rmsDisplacementM: 0, overturns: [] });
  });

  it("leaves equally heavy samples in their order", () => {
    expect(Array.from(sorting([1001, 1000, 1001, 1001]).displacementM)).toEqual([1, -1, 0, 0]);
  });

  it("tells overturns apart and gives the extent, size and longest run of each", () => {
    // By hand: samples 1 to 3 sort to 3, 1, 2 and samples 5 and 6 change places.
    const { overturns } = sorting([1000, 1003, 1001, 1002, 1004, 1005.01, 1005]);
    expect(overturns).toHaveLength(2);
    expect(overturns[0]).toMatchObject({ fromDepthM: 1, toDepthM: 3, sampleCount: 3, runLengthCount: 2 });
    expect(overturns[0]!.rmsRhoChangeKgM3).toBeCloseTo(Math.sqrt((4 + 1 + 1) / 3), 12);
    expect(overturns[1]).toMatchObject({ fromDepthM: 5, toDepthM: 6, sampleCount: 2, runLengthCount: 1 });
  });

  it("holds an overturn for more than noise with three samples and a change of density above it", () => {
    const exceeds = (rho: readonly number[]) => sorting(rho, 0.1).overturns.map((overturn) => overturn.exceedsNoise);
    expect(exceeds([1000.5, 1000.4, 1000])).toEqual([true]);
    expect(exceeds([1000.05, 1000.04, 1000])).toEqual([false]);
    expect(exceeds([1001, 1000])).toEqual([false]);
  });

  it("ends a run at a sample that stays", () => {
    // Reversed: 4, 2, 0, -2, -4.
    expect(sorting([1004, 1003, 1002, 1001, 1000]).overturns[0]!.runLengthCount).toBe(2);
  });
});
