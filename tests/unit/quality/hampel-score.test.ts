import { describe, expect, it } from "vitest";
import { hampelScore } from "../../../src/quality/checks/hampel-score.ts";
import { residualsFromLine } from "../../../src/quality/checks/robust-line.ts";

describe("the Hampel score", () => {
  it("finds the one that is out: median 15.1, MAD 0.1, score 19.56", () => {
    // Worked by hand after Hampel (1974): (18.0 - 15.1) / (1.4826 x 0.1).
    const values = [15.0, 15.1, 15.0, 18.0, 15.2, 15.1, 15.0];
    const scores = values.map((_, i) => hampelScore(values, i, 0));
    expect(scores[3]).toBeCloseTo(19.56, 2);
    expect(scores.filter((score) => score > 3)).toHaveLength(1);
  });

  it("believes no deviation smaller than the step of the record", () => {
    const values = [15, 15, 15, 15.1, 15, 15, 15];
    expect(hampelScore(values, 3, 0)).toBe(Number.POSITIVE_INFINITY);
    expect(hampelScore(values, 3, 0.1)).toBeCloseTo(0.67, 2);
    expect(hampelScore(values, 0, 0)).toBe(0);
  });
});

describe("what is left of a robust line", () => {
  it("is nothing on a straight line, at any spacing", () => {
    const depthM = [0.2, 0.3, 1.1, 1.2, 4];
    const residuals = residualsFromLine(
      depthM,
      depthM.map((z) => 3 - 2 * z),
    );
    for (const residual of residuals) expect(residual).toBeCloseTo(0, 12);
  });

  it("is the whole height of one value beside it", () => {
    const depthM = [1, 2, 3, 4, 5, 6, 7];
    const residuals = residualsFromLine(
      depthM,
      depthM.map((z) => z + (z === 4 ? 5 : 0)),
    );
    expect(residuals.map((residual) => Math.round(residual * 1e9) / 1e9 + 0)).toEqual([0, 0, 0, 5, 0, 0, 0]);
  });

  it("does not divide by a spacing of nothing", () => {
    expect(residualsFromLine([1, 1], [3, 5])).toEqual([-1, 1]);
  });
});
