import { describe, expect, it } from "vitest";
import { stabilityOf } from "../../../../src/column/stratification/stability.ts";

const stability = (rhoKgM3: readonly number[]) =>
  stabilityOf(
    Float64Array.from(rhoKgM3, (_, k) => k),
    Float64Array.from(rhoKgM3),
    0.03,
  );

describe("stability of a column", () => {
  it("is stable where density falls nowhere by more than noise", () => {
    expect(stability([1000, 1001, 1000.98, 1002])).toMatchObject({ verdict: "stable", unstableFrac: 0 });
    expect(stability([1000, 1001, 1002]).greatestInversion).toBeNull();
  });

  it("is unstable by the greatest excess of water above over water below, however far apart", () => {
    const found = stability([1000, 1002, 1001.98, 1001.96, 1001.94, 1003]);
    expect(found.verdict).toBe("unstable");
    expect(found.greatestInversion).toMatchObject({ heavyDepthM: 1, lightDepthM: 4 });
    expect(found.greatestInversion!.excessKgM3).toBeCloseTo(0.06, 9);
    // The samples at 3 and 4 m, with half a metre above and below each, of 5 m.
    expect(found.unstableFrac).toBe(0.4);
    expect(found.rhoRangeKgM3).toBe(3);
  });

  it("is neutral where all water is equally heavy up to noise, one sample included", () => {
    expect(stability([1000.02, 1000])).toMatchObject({ verdict: "neutral", rhoRangeKgM3: expect.closeTo(0.02, 9) });
    expect(stability([1000])).toEqual({
      verdict: "neutral",
      rhoRangeKgM3: 0,
      greatestInversion: null,
      unstableFrac: 0,
    });
  });
});
