import { describe, expect, it } from "vitest";
import { decimateLine, type Point } from "../../src/charts/layout/decimate-line.ts";
import { depthAxis } from "../../src/charts/layout/depth-axis.ts";
import { layOutCurve } from "../../src/charts/layout/lay-out-curve.ts";
import { thumbnailPath } from "../../src/charts/layout/thumbnail-path.ts";

describe("decimateLine", () => {
  it("keeps first, leftmost, rightmost and last of each row of pixels, in their order", () => {
    const points: Point[] = [
      [5, 0.1],
      [9, 0.2],
      [6, 0.3],
      [1, 0.4],
      [4, 0.5],
      [3, 1.5],
    ];
    expect(decimateLine(points)).toEqual([
      [5, 0.1],
      [9, 0.2],
      [1, 0.4],
      [4, 0.5],
      [3, 1.5],
    ]);
  });

  it("draws no more than four points a row, however many there are", () => {
    const points = Array.from({ length: 10_000 }, (_, i): Point => [Math.sin(i) * 100, i / 100]);
    expect(decimateLine(points).length).toBeLessThanOrEqual(400);
    expect(decimateLine(points, 3).length).toBeLessThanOrEqual(4 * 34);
  });

  it("leaves short lines as they are", () => {
    expect(decimateLine([])).toEqual([]);
    expect(decimateLine([[1, 2]])).toEqual([[1, 2]]);
    expect(
      decimateLine([
        [1, 2],
        [3, 9],
      ]),
    ).toEqual([
      [1, 2],
      [3, 9],
    ]);
  });
});

describe("layOutCurve", () => {
  const depth = { ...depthAxis(10, 0, 100), bottom: 10 };
  const linear = { kind: "linear", from: 0, to: 10, leftPx: 0, rightPx: 100, ticks: [] } as const;
  const curve = (values: readonly number[]) => ({
    castId: "a",
    colourIndex: 2,
    isInHand: true,
    depths: Float64Array.from([0, 2, 4, 6, 8]),
    values: Float64Array.from(values),
    halfWidths: null,
    firstSampleIndex: 1,
    lastSampleIndex: 3,
  });

  it("lays a band between the values less and plus their half widths, and none without them", () => {
    const frame = { axis: linear, depth, isStepped: false, rowPx: 1 };
    const halfWidths = Float64Array.from([0, 1, 1, 2, 2]);
    expect(layOutCurve({ ...curve([1, 1, 5, 3, 3]), halfWidths }, frame).bandPath).toBe(
      "M10,0L20,20L60,40L50,60L50,80L10,80L10,60L40,40L0,20L10,0Z",
    );
    expect(layOutCurve(curve([1, 1, 5, 3, 3]), frame).bandPath).toBe("");
  });

  it("draws samples solid and the gaps above and below them dotted", () => {
    const laid = layOutCurve(curve([1, 1, 5, 3, 3]), { axis: linear, depth, isStepped: false, rowPx: 1 });
    expect(laid.solidPath).toBe("M10,20L50,40L30,60");
    expect(laid.dottedPath).toBe("M10,0L10,20M30,60L30,80");
  });

  it("breaks where a value is missing", () => {
    const laid = layOutCurve(
      { ...curve([1, 1, Number.NaN, 3, 3]), firstSampleIndex: 0, lastSampleIndex: 4 },
      { axis: linear, depth, isStepped: false, rowPx: 1 },
    );
    expect(laid.solidPath).toBe("M10,0L10,20M30,60L30,80");
    expect(laid.dottedPath).toBe("");
  });

  it("steps through values that belong to the water down to the next row", () => {
    const laid = layOutCurve(curve([Number.NaN, 2, 4, Number.NaN, Number.NaN]), {
      axis: linear,
      depth,
      isStepped: true,
      rowPx: 1,
    });
    expect(laid.solidPath).toBe("M20,20L20,40L40,40L40,60");
    expect(laid.dottedPath).toBe("");
  });

  it("marks at the left edge what a log axis cannot show, small and negative apart", () => {
    const log = { ...linear, kind: "log", from: 1e-4, to: 1e-2, leftPx: 10 } as const;
    const laid = layOutCurve(
      { ...curve([1e-5, -1e-3, 1e-3, 1e-5, Number.NaN]), firstSampleIndex: 0, lastSampleIndex: 4 },
      { axis: log, depth, isStepped: true, rowPx: 1 },
    );
    expect(laid.lowPath).toBe("M10,0L10,20M10,60L10,80");
    expect(laid.negativePath).toBe("M10,20L10,40");
    expect(laid.solidPath).toBe("M55,40L55,60");
  });
});

describe("thumbnailPath", () => {
  it("fits a profile into the range that all share", () => {
    const path = thumbnailPath(
      Float64Array.from([0, 10]),
      Float64Array.from([1000, 1020]),
      { from: 1000, to: 1020, deepest: 20 },
      { widthPx: 46, heightPx: 30 },
    );
    expect(path).toBe("M2,2L44,15");
  });

  it("is empty without values and stands equal densities upright", () => {
    const range = { from: 1000, to: 1000, deepest: 10 };
    const size = { widthPx: 46, heightPx: 30 };
    expect(thumbnailPath(new Float64Array(0), new Float64Array(0), range, size)).toBe("");
    expect(thumbnailPath(Float64Array.from([0, 10]), Float64Array.from([1000, 1000]), range, size)).toBe("M2,2L2,28");
  });
});
