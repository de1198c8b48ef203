import { describe, expect, it } from "vitest";
import { depthAtPx, depthAxis, depthPx } from "../../src/charts/layout/depth-axis.ts";
import { linearAxis, logAxis, valuePx } from "../../src/charts/layout/value-axis.ts";

const frame = { leftPx: 100, rightPx: 300 };
const of = (...values: number[]) => [Float64Array.from(values)];
const labels = (axis: { readonly ticks: readonly { readonly label: string }[] }) =>
  axis.ticks.map((tick) => tick.label);

describe("linearAxis", () => {
  it("widens the range to whole ticks and ignores missing values", () => {
    const axis = linearAxis(of(11.7, Number.NaN, 18.2), frame);
    expect([axis.from, axis.to]).toEqual([11, 19]);
    expect(labels(axis)).toEqual(["12", "14", "16", "18"]);
    expect(valuePx(axis, 15)).toBe(200);
  });

  it("drops ticks before their labels touch", () => {
    expect(labels(linearAxis(of(11.7, 18.2), { leftPx: 0, rightPx: 90 }))).toEqual(["12", "14", "16", "18"]);
    expect(labels(linearAxis(of(11.7, 18.2), { leftPx: 0, rightPx: 60 }))).toEqual(["15"]);
  });

  it("keeps the labels at the ends inside the frame", () => {
    const { ticks } = linearAxis(of(0, 40), frame);
    expect(ticks[0]).toEqual({ xPx: 100, label: "0", anchor: "start" });
    expect(ticks.at(-1)).toEqual({ xPx: 300, label: "40", anchor: "end" });
  });

  it("writes negative numbers with a true minus and large ones without a comma", () => {
    expect(labels(linearAxis(of(-2, 0), frame))).toContain("−1.5");
    expect(labels(linearAxis(of(995, 1030), frame))).toContain("1000");
  });

  it("takes zero in where asked", () => {
    const axis = linearAxis(of(-2.2, -0.4), frame, true);
    expect(axis.to).toBe(0);
  });

  it("gives one value, and none, a range", () => {
    const one = linearAxis(of(15), frame);
    expect([one.from, one.to]).toEqual([14.5, 15.5]);
    const zero = linearAxis(of(0, 0), frame);
    expect([zero.from, zero.to]).toEqual([0, 1]);
    const none = linearAxis(of(Number.NaN), frame);
    expect([none.from, none.to]).toEqual([0, 1]);
  });
});

describe("logAxis", () => {
  it("covers whole decades, at most five below the largest value", () => {
    const axis = logAxis(of(3e-9, 2e-4, 4e-2, -1, Number.NaN), { leftPx: 0, rightPx: 300 });
    expect(axis.from).toBeCloseTo(1e-6, 12);
    expect(axis.to).toBeCloseTo(1e-1, 12);
    expect(labels(axis)).toEqual(["10⁻⁶", "10⁻⁵", "10⁻⁴", "10⁻³", "10⁻²", "10⁻¹"]);
    expect(valuePx(axis, 1e-1)).toBeCloseTo(300, 9);
  });

  it("has a range of its own where no value is positive", () => {
    const axis = logAxis(of(-1, 0), frame);
    expect(axis.from).toBeLessThan(axis.to);
  });

  it("has no place for a negative value", () => {
    expect(valuePx(logAxis(of(1e-3, 1e-2), frame), -1)).toBeNaN();
  });
});

describe("depthAxis", () => {
  it("runs from the surface to a little below the deepest point", () => {
    const axis = depthAxis(20, 44, 444);
    expect(axis.bottom).toBeCloseTo(20.6, 12);
    expect(depthPx(axis, 0)).toBe(44);
    expect(depthPx(axis, axis.bottom)).toBe(444);
    expect(axis.ticks.map((tick) => tick.label)).toEqual(["0", "2", "4", "6", "8", "10", "12", "14", "16", "18", "20"]);
  });

  it("finds the depth under a pointer and keeps to the axis", () => {
    const axis = depthAxis(20, 44, 444);
    expect(depthAtPx(axis, depthPx(axis, 7.5))).toBeCloseTo(7.5, 12);
    expect(depthAtPx(axis, 0)).toBe(0);
    expect(depthAtPx(axis, 1000)).toBe(axis.bottom);
  });

  it("stands without any depth", () => {
    expect(depthAxis(0, 0, 100).bottom).toBe(1);
  });
});
