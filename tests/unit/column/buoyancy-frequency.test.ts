import { describe, expect, it } from "vitest";
import { defaultBasis, integrateCast, sampledProfile } from "../../../src/column/index.ts";
import { inSituTemperature } from "../../../src/gsw-ts-port/index.ts";
import type { WaterChoice } from "../../../src/survey/index.ts";
import { castOf } from "../../support/cast-of.ts";

const squared = (cast: ReturnType<typeof castOf>, water: WaterChoice, latitudeDeg: number | null = null): number => {
  const outcome = integrateCast(cast, { ...defaultBasis, water, latitudeDeg });
  return outcome.ok ? sampledProfile(outcome.value).buoyancyFrequencySquaredPerS2[1]! : Number.NaN;
};

describe("buoyancy frequency", () => {
  it("is 0.039043608 s-2 for SA 10 over 20 g/kg, CT 18 over 15 degC, 2 over 4 dbar at 45 degrees", () => {
    // Source: GSW 3.6.16, and by hand from the definition.
    const cast = castOf({
      seaPressureDbar: [2, 4],
      practicalSalinity: [(10 * 35) / 35.16504, (20 * 35) / 35.16504],
      inSituTempC: [inSituTemperature(10, 18, 2), inSituTemperature(20, 15, 4)],
    });
    expect(Math.abs(squared(cast, { id: "teos10" }, 45) - 0.039043608)).toBeLessThan(1e-9);
  });

  it.each(["exact", "limnological", "eos80"] as const)("agrees with %s water to 2 % in a thermocline", (id) => {
    const cast = castOf({ depthM: [8, 9], practicalSalinity: [0.2, 0.2], inSituTempC: [18, 14] });
    expect(squared(cast, { id }) / squared(cast, { id: "teos10" })).toBeCloseTo(1, 1.7);
  });

  it("is not taken in by compressibility: water of one salt and heat content is neutral by every model", () => {
    // Left in, compressibility alone would show as g2/c2 = 4.4e-5 s-2.
    const inSituTempC = [0, 100].map((p) => inSituTemperature(0, 10, p));
    const cast = castOf({ seaPressureDbar: [0, 100], practicalSalinity: [0, 0], inSituTempC });
    for (const id of ["teos10", "exact", "limnological", "eos80"] as const)
      expect(Math.abs(squared(cast, { id }))).toBeLessThan(2e-8);
  });

  it("is negative where heavy water lies over light, and zero in water of constant density", () => {
    const cast = castOf({ depthM: [1, 2], practicalSalinity: [10, 5], inSituTempC: [15, 15] });
    expect(squared(cast, { id: "teos10" })).toBeLessThan(0);
    expect(squared(cast, { id: "constant", rhoKgM3: 1000 })).toBe(0);
  });
});
