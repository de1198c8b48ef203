import { describe, expect, it } from "vitest";
import { LinearProfile } from "../../../../src/column/stratification/linear-profile.ts";

describe("a linear profile", () => {
  const jump = new LinearProfile(Float64Array.of(1, 3, 3, 5), Float64Array.of(10, 14, 20, 20));

  it("is linear between depths, held beyond the ends, and below a jump at the jump", () => {
    expect([0, 1, 2, 3, 4, 9].map((depthM) => jump.at(depthM))).toEqual([10, 10, 12, 20, 20, 20]);
  });

  it("has the depth means of its pieces, beyond the ends too", () => {
    expect(jump.mean(1, 3)).toBe(12);
    expect(jump.mean(3, 5)).toBe(20);
    expect(jump.mean(2, 4)).toBe(16.5);
    expect(jump.mean(0, 1)).toBe(10);
    expect(jump.mean(0, 10)).toBeCloseTo((10 + 24 + 40 + 100) / 10, 12);
    expect(jump.mean(2, 2)).toBe(12);
  });

  it("says where a value is first reached", () => {
    expect([9, 10, 12, 17, 20, 21].map((value) => jump.depthReaching(value))).toEqual([1, 1, 2, 3, 3, 5]);
  });

  it("of one value is that value everywhere", () => {
    const one = new LinearProfile(Float64Array.of(2), Float64Array.of(7));
    expect([one.at(0), one.at(5), one.mean(0, 4)]).toEqual([7, 7, 7]);
  });
});
