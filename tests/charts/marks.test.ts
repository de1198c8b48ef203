import { describe, expect, it } from "vitest";
import { layOutMarks, layOutSheet, type MarkInput, type PanelInput } from "../../src/charts/layout/index.ts";

const panel = (id: string, scale: PanelInput["scale"], values: readonly number[]): PanelInput => ({
  id,
  title: id,
  shortTitle: id,
  unit: "u",
  scale,
  isStepped: false,
  withZero: false,
  share: 1,
  isDroppable: false,
  curves: [
    {
      castId: "a",
      colourIndex: 0,
      isInHand: true,
      depths: Float64Array.from(values, (_, i) => i * 5),
      values: Float64Array.from(values),
      halfWidths: null,
      firstSampleIndex: 0,
      lastSampleIndex: values.length - 1,
    },
  ],
});

const sheet = layOutSheet(
  {
    depthUnit: "m",
    deepest: 10,
    panels: [panel("t", "linear", [0, 5, 10]), panel("n2", "log", [1e-4, 1e-3, 1e-2])],
    gaps: [],
  },
  { widthPx: 586, heightPx: 352 },
);
const placesIn = (path: string): readonly string[] =>
  [...path.matchAll(/M([-\d.]+,[-\d.]+)/g)].map((found) => found[1]!);
const mark = (over: Partial<MarkInput> = {}): MarkInput => ({
  kind: "left-out",
  depth: 5.15,
  values: { t: 5, n2: 1e-3 },
  ...over,
});

describe("layOutMarks", () => {
  it("puts a mark into every panel that has a value for it, in the shape of its kind", () => {
    const laid = layOutMarks(sheet, [mark(), mark({ kind: "suspect", values: { t: 10 } })]);
    // Two panels of 250 px from 58 on, 16 apart; half of the axis of 10.3 is half of the 300 px between top and bottom.
    expect(placesIn(laid.leftOutPath)).toEqual(["183,194", "449,194"]);
    expect(placesIn(laid.suspectPath).length).toBe(1);
    expect(laid.suspectPath).toMatch(/z$/);
    expect(laid.leftOutPath).not.toContain("z");
  });

  it("keeps at the edge what lies beyond a panel, and what a log axis cannot show", () => {
    const [t, n2] = sheet.panels.map(({ axis }) => axis);
    const [left, right] = placesIn(layOutMarks(sheet, [mark({ values: { t: 99, n2: -1 } })]).leftOutPath);
    expect(Number(left!.split(",")[0])).toBe(Math.round(t!.rightPx - 3.5));
    expect(Number(right!.split(",")[0])).toBe(Math.round(n2!.leftPx + 3.5));
  });

  it("draws one mark where several fall on the same pixel, and none off the depth axis", () => {
    const marks = [mark(), mark(), mark({ depth: -1 }), mark({ depth: 99 }), mark({ depth: Number.NaN })];
    expect(placesIn(layOutMarks(sheet, marks).leftOutPath).length).toBe(2);
    expect(layOutMarks(sheet, [mark({ values: { t: Number.NaN } })]).leftOutPath).toBe("");
  });
});
