import { describe, expect, it } from "vitest";
import {
  type CurveInput,
  layOutLevels,
  layOutPlumb,
  layOutSheet,
  type PanelInput,
  type SheetInput,
} from "../../src/charts/layout/index.ts";

const curve = (values: readonly number[], over: Partial<CurveInput> = {}): CurveInput => ({
  castId: "a",
  colourIndex: 0,
  isInHand: true,
  depths: Float64Array.from(values, (_, i) => i * 5),
  values: Float64Array.from(values),
  halfWidths: null,
  firstSampleIndex: 0,
  lastSampleIndex: values.length - 1,
  ...over,
});

const panel = (id: string, over: Partial<PanelInput> = {}): PanelInput => ({
  id,
  title: id,
  shortTitle: id.slice(0, 3),
  unit: "u",
  scale: "linear",
  isStepped: false,
  withZero: false,
  share: 1,
  isDroppable: false,
  curves: [curve([0, 5, 10])],
  ...over,
});

const sheet = (over: Partial<SheetInput> = {}): SheetInput => ({
  depthUnit: "m",
  deepest: 10,
  panels: [panel("left"), panel("right", { share: 2 })],
  gaps: [],
  ...over,
});

const size = { widthPx: 586, heightPx: 352 };

describe("layOutSheet", () => {
  it("shares the width among the panels over one depth axis", () => {
    const laid = layOutSheet(sheet(), size);
    expect(laid.panels.map(({ axis }) => [axis.leftPx, axis.rightPx])).toEqual([
      [58, 224.66666666666666],
      [240.66666666666666, 574],
    ]);
    expect([laid.depth.topPx, laid.depth.bottomPx]).toEqual([44, 344]);
    expect(laid.depth.bottom).toBeCloseTo(10.3, 12);
  });

  it("leaves out the panel that can be spared, and shortens titles, where there is no room", () => {
    const panels = [
      panel("temperature", { title: "A title that is far too long for it" }),
      panel("n2", { isDroppable: true }),
    ];
    const wide = layOutSheet(sheet({ panels }), size);
    expect(wide.panels.map(({ id }) => id)).toEqual(["temperature", "n2"]);
    const narrow = layOutSheet(sheet({ panels }), { ...size, widthPx: 200 });
    expect(narrow.panels.map(({ id, title }) => [id, title])).toEqual([["temperature", "tem"]]);
  });

  it("shades the gaps to scale", () => {
    const [gap] = layOutSheet(sheet({ gaps: [{ from: 0, to: 1.03 }] }), size).gaps;
    expect(gap!.topPx).toBe(44);
    expect(gap!.heightPx).toBeCloseTo(30, 9);
  });

  it("draws a zero line only where zero lies inside the panel", () => {
    const zeroOf = (values: readonly number[]) =>
      layOutSheet(sheet({ panels: [panel("departure", { withZero: true, curves: [curve(values)] })] }), size).panels[0]!
        .zeroPx;
    expect(zeroOf([-10, 0, 10])).toBeCloseTo((58 + 574) / 2, 9);
    expect(zeroOf([-10, -5, -1])).toBeNull();
  });

  it("says what the marks at the edge mean, and only where there are any", () => {
    const n2 = (values: readonly number[]) =>
      layOutSheet(sheet({ panels: [panel("n2", { scale: "log", isStepped: true, curves: [curve(values)] })] }), size)
        .panels[0]!.edgeNotes;
    expect(n2([1e-3, 1e-2, Number.NaN])).toEqual([]);
    expect(n2([-1e-3, 1e-2, Number.NaN])).toEqual(["thick: unstable"]);
    expect(n2([1e-9, 1e-2, Number.NaN])).toEqual(["thin: below 10⁻⁷"]);
  });

  it("stands without casts", () => {
    const laid = layOutSheet(sheet({ deepest: 0, panels: [panel("left", { curves: [] })] }), size);
    expect(laid.panels[0]!.curves).toEqual([]);
    expect(laid.isCrowded).toBe(false);
  });

  it("thins every curve harder where there are many", () => {
    const values = Array.from({ length: 3000 }, (_, i) => Math.sin(i));
    const depths = Float64Array.from(values, (_, i) => i / 300);
    const many = Array.from({ length: 61 }, () => curve(values, { depths }));
    const laid = layOutSheet(sheet({ panels: [panel("left", { curves: many })] }), size);
    expect(laid.isCrowded).toBe(true);
    expect(laid.panels[0]!.curves[0]!.points.length).toBeLessThanOrEqual(4 * 101);
  });
});

describe("layOutPlumb", () => {
  it("puts a dot on every curve, the cast in hand on top", () => {
    const laid = layOutSheet(sheet(), size);
    const plumb = layOutPlumb(laid, 5.15, [
      { colourIndex: 3, isInHand: true, values: { left: 0, right: 10 } },
      { colourIndex: 1, isInHand: false, values: { left: 5, right: Number.NaN } },
    ]);
    expect(plumb.yPx).toBeCloseTo(194, 9);
    expect(plumb.dots.map(({ xPx, colourIndex }) => [Math.round(xPx), colourIndex])).toEqual([
      [141, 1],
      [58, 3],
      [574, 3],
    ]);
  });

  it("has no dot where a value lies off the panel", () => {
    const plumb = layOutPlumb(layOutSheet(sheet(), size), 5, [
      { colourIndex: 0, isInHand: true, values: { left: -4, right: 99 } },
    ]);
    expect(plumb.dots).toEqual([]);
  });
});

describe("layOutLevels", () => {
  const levels = [
    { levelId: "1", depth: 5.15, label: "Intake · 5.15 m" },
    { levelId: "2", depth: 5.2, label: "Logger · 5.20 m" },
  ];
  const upright = (value: number) => panel("right", { curves: [curve([value, value, value])] });

  it("puts a name at the right end of the last panel where no curve runs there", () => {
    // One value stands in the middle of its axis, so both ends of the panel are free.
    const laid = layOutSheet(sheet({ panels: [panel("left"), upright(10)] }), size);
    const [first] = layOutLevels(laid, levels);
    const { rightPx } = laid.panels[1]!.axis;
    expect(first).toMatchObject({ levelId: "1", anchor: "end", labelXPx: rightPx - 5 });
    expect(first!.yPx).toBeCloseTo(194, 9);
    expect(first!.labelYPx).toBeCloseTo(189, 9);
  });

  it("moves a name away from curves and from other names", () => {
    const wall = panel("right", { curves: [curve([9, 9, 9]), curve([0, 0, 0]), curve([10, 10, 10])] });
    const laid = layOutSheet(sheet({ panels: [panel("left"), wall] }), size);
    const [first, second] = layOutLevels(laid, levels);
    expect(first).toMatchObject({ anchor: "start", labelXPx: laid.panels[1]!.axis.leftPx + 5 });
    expect(second).not.toMatchObject({ labelXPx: first!.labelXPx, labelYPx: first!.labelYPx });
  });

  it("keeps a long name within the sheet", () => {
    const laid = layOutSheet(
      sheet({ panels: [panel("left"), panel("right", { curves: [curve([1, 5, 9]), curve([9, 5, 1])] })] }),
      size,
    );
    const label = "An intake with a name that is longer than a panel is wide";
    const [level] = layOutLevels(laid, [{ levelId: "1", depth: 5, label }]);
    expect(level).toMatchObject({ anchor: "end", labelXPx: laid.rightPx - 5 });
  });
});
