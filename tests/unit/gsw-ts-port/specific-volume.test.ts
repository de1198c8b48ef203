import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  compressibility,
  conservativeTemperature,
  density,
  densityInto,
  dynamicEnthalpy,
  exactDensity,
  exactSoundSpeed,
  halineContraction,
  soundSpeed,
  specificVolume,
  specificVolumeSlopes,
  thermalExpansion,
} from "../../../src/gsw-ts-port/index.ts";

const samples = [
  { SA: 0.3, CT: 6, p: 20 },
  { SA: 12, CT: 24, p: 5 },
  { SA: 35, CT: 2, p: 4000 },
] as const;

describe("specific volume", () => {
  test.each(samples)("has slopes that match its differences at $SA g/kg, $CT degC, $p dbar", ({ SA, CT, p }) => {
    const slopes = specificVolumeSlopes(SA, CT, p);
    const central = (v: (d: number) => number, d: number): number => (v(d) - v(-d)) / (2 * d);
    const perTemperature = central((d) => specificVolume(SA, CT + d, p), 0.01);
    const perSalinity = central((d) => specificVolume(SA + d, CT, p), 0.01);
    const perPa = central((d) => specificVolume(SA, CT, p + d), 1) / 1e4;
    expect(slopes.perTemperature / perTemperature).toBeCloseTo(1, 5);
    expect(slopes.perSalinity / perSalinity).toBeCloseTo(1, 6);
    expect(slopes.v / specificVolume(SA, CT, p)).toBeCloseTo(1, 14);
    expect(compressibility(SA, CT, p) / (-perPa / slopes.v)).toBeCloseTo(1, 6);
  });

  test.each(samples)(
    "is the slope of dynamic enthalpy with pressure at $SA g/kg, $CT degC, $p dbar",
    ({ SA, CT, p }) => {
      const perPa = (dynamicEnthalpy(SA, CT, p + 1) - dynamicEnthalpy(SA, CT, p - 1)) / 2e4;
      expect(perPa / specificVolume(SA, CT, p)).toBeCloseTo(1, 9);
      expect(dynamicEnthalpy(SA, CT, 0)).toBe(0);
    },
  );

  test("stays within 0.0015 kg/m3 of the Gibbs function from rivers to lagoons (Roquet et al. 2015)", () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(number(0, 42), number(0, 35), number(0, 100), (SA, t, p) => {
        const CT = conservativeTemperature(SA, t, p);
        expect(Math.abs(density(SA, CT, p) - exactDensity(SA, t, p))).toBeLessThan(1.5e-3);
        expect(Math.abs(soundSpeed(SA, CT, p) - exactSoundSpeed(SA, t, p))).toBeLessThan(0.25);
      }),
      { numRuns: 2000, seed: 2015 },
    );
  });

  test("counts salinity below zero as zero: sensor noise at the fresh end", () => {
    expect(density(-0.01, 10, 5)).toBe(density(0, 10, 5));
    expect(exactDensity(-0.01, 10, 5)).toBe(exactDensity(0, 10, 5));
  });

  test("makes cold fresh water contract on warming and salt always add weight", () => {
    expect(thermalExpansion(0, 1, 0)).toBeLessThan(0);
    expect(thermalExpansion(0, 10, 0)).toBeGreaterThan(0);
    for (const { SA, CT, p } of samples) expect(halineContraction(SA, CT, p)).toBeGreaterThan(0);
  });

  test("of arrays equals that of numbers, and may overwrite its input", () => {
    const SA = Float64Array.of(0, 10, 35, Number.NaN);
    const CT = Float64Array.of(5, 15, 25, 10);
    const p = Float64Array.of(0, 10, 100, 0);
    const expected = Array.from(SA, (value, i) => density(value, CT[i]!, p[i]!));
    expect(Array.from(densityInto(SA, CT, p, SA))).toEqual(expected);
  });
});
