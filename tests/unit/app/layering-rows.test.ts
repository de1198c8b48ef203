import { describe, expect, it } from "vitest";
import { layeringRows } from "../../../src/app/show/layering-rows.ts";
import { defaultBasis, integrateCast, stratificationOf } from "../../../src/column/index.ts";
import { castOf } from "../../support/cast-of.ts";

function rowsOf(practicalSalinity: (depthM: number) => number) {
  const depthM = Array.from({ length: 41 }, (_, i) => i / 2);
  const cast = castOf({ depthM, inSituTempC: depthM.map(() => 12), practicalSalinity: depthM.map(practicalSalinity) });
  const outcome = integrateCast(cast, defaultBasis);
  const whole = outcome.ok ? stratificationOf(outcome.value) : null;
  return new Map(layeringRows(whole!, "SI"));
}

describe("the layering of a column in a few lines", () => {
  it("names the pycnocline, the two layers and the waves of a halocline", () => {
    const rows = rowsOf((z) => 15 + 12 * Math.tanh((z - 8) / 1.5));
    expect(rows.get("The water is")).toBe("stable");
    expect(rows.get("Pycnocline")).toMatch(/^(7\.9|8\.0)\d\u00a0m, [23]\.\d\d\u00a0m thick$/);
    expect(rows.get("Two layers")).toMatch(/^\d+\.\d\d \/ \d+\.\d\d\u00a0kg\/m³$/);
    expect(Number.parseFloat(rows.get("Long internal waves")!)).toBeCloseTo(0.85, 0);
  });

  it("says that mixed water is mixed, and where heavy water lies over light", () => {
    expect(rowsOf(() => 20).get("The water is")).toBe("mixed throughout");
    expect(rowsOf(() => 20).get("Pycnocline")).toBe("none");
    const upside = rowsOf((z) => 20 - z / 4);
    expect(upside.get("The water is")).toBe("unstable");
    expect(upside.get("Heavy over light")).toMatch(/ over /);
  });
});
