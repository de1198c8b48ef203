import { describe, expect, it } from "vitest";
import { type Basis, defaultBasis, integrateCast, shortcutCosts } from "../../../src/column/index.ts";
import { castOf } from "../../support/cast-of.ts";

function costs(cast: ReturnType<typeof castOf>, depthsM: readonly number[], basis: Partial<Basis> = {}) {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return new Map(shortcutCosts(outcome.value, depthsM).map((cost) => [cost.shortcut.name, cost]));
}

const stratified = castOf({ depthM: [0, 10, 20], practicalSalinity: [2, 15, 30], inSituTempC: [20, 16, 12] });

describe("what a shortcut costs", () => {
  it("a gauge set to 1000 reads water of 1015 kg/m3 0.15 m too deep at 10 m, one set to 1025 0.0976 m too shallow", () => {
    // Closed form: d rho_mean / rho_assumed - d.
    const found = costs(castOf({ depthM: [0, 10], inSituTempC: [10, 10] }), [10], {
      water: { id: "constant", rhoKgM3: 1015 },
    });
    expect(found.get("fresh, 1000.00 kg/m3")!.gaugeDepthErrorM[0]).toBeCloseTo(0.15, 9);
    expect(found.get("sea, 1025.00 kg/m3")!.gaugeDepthErrorM[0]).toBeCloseTo(-0.0976, 4);
  });

  it("62.4 lbf/ft3 is 9802.26 N/m3, and 64.0 is 10053.6", () => {
    // NIST SP 811: the pound is 0.45359237 kg, the foot 0.3048 m, standard gravity 9.80665 m/s2.
    const found = costs(stratified, [20]);
    expect(found.get("fresh, 62.4 lbf/ft3")!.shortcut.weightKPaPerM).toBeCloseTo(9.80226, 4);
    expect(found.get("sea, 64.0 lbf/ft3")!.shortcut.weightKPaPerM).toBeCloseTo(10.0536, 4);
  });

  it("the surface sample says too little and the last sample too much in a stable column", () => {
    for (const [name, cost] of costs(stratified, [5, 20])) {
      if (name.startsWith("surface sample")) expect(Math.max(...cost.errorKPa)).toBeLessThan(0);
      if (name.startsWith("last sample")) expect(Math.min(...cost.errorKPa)).toBeGreaterThan(0);
    }
  });

  it("the depth mean is right at the bottom, and there only", () => {
    const [, mean] = [...costs(stratified, [10, 20])].find(([name]) => name.startsWith("depth mean"))!;
    expect(Math.abs(mean.errorKPa[1]!)).toBeLessThan(1e-3);
    expect(mean.errorKPa[0]).toBeGreaterThan(0.1);
  });

  it("a density of one's own joins the list, and the surface has no share", () => {
    const found = costs(stratified, [0], { referenceDensity: { kind: "number", rhoKgM3: 1012 } });
    expect(found.get("basis, 1012.00 kg/m3")!.errorKPa[0]).toBe(0);
    expect(found.get("basis, 1012.00 kg/m3")!.errorFrac[0]).toBeNaN();
  });
});
