import { describe, expect, it } from "vitest";
import { integrateOde } from "../../../src/base/index.ts";

describe("integrateOde", () => {
  it("solves y' = -y/100 to 1e-12", () => {
    expect(integrateOde((_, y) => -0.01 * y, 0, 1, 10)).toBeCloseTo(Math.exp(-0.1), 12);
  });

  it("integrates a quintic of x exactly in one step", () => {
    expect(integrateOde((x) => 6 * x ** 5, 0, 0, 2)).toBeCloseTo(64, 12);
  });

  it("halves its steps where the slope turns sharply", () => {
    // The integral of 1 / (1 + 100 x^2) from -1 to 1 is atan(10) / 5.
    expect(integrateOde((x) => 1 / (1 + 100 * x * x), -1, 0, 1)).toBeCloseTo(Math.atan(10) / 5, 10);
  });

  it("goes backward as well as forward", () => {
    const forward = integrateOde((x, y) => 1 + 1e-3 * x - 1e-4 * y, 0, 0, 30);
    expect(integrateOde((x, y) => 1 + 1e-3 * x - 1e-4 * y, 30, forward, 0)).toBeCloseTo(0, 12);
  });

  it("returns the start for a step of no length and NaN for a slope of NaN", () => {
    expect(integrateOde(() => 7, 3, 5, 3)).toBe(5);
    expect(integrateOde(() => Number.NaN, 0, 0, 1)).toBeNaN();
  });
});
