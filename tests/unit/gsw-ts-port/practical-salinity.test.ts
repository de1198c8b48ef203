import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  conductivityFromPracticalSalinity,
  practicalSalinityFromConductivity,
  practicalSalinityFromConductivityInto,
} from "../../../src/gsw-ts-port/index.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("practical salinity", () => {
  test("returns from conductivity to 1e-12 over rivers, lagoons and deep water", () => {
    fc.assert(
      fc.property(between(0, 42), between(-2, 40), between(0, 10000), (SP, t, p) => {
        const C = conductivityFromPracticalSalinity(SP, t, p);
        expect(Math.abs(practicalSalinityFromConductivity(C, t, p) - SP)).toBeLessThanOrEqual(1e-12 * Math.max(SP, 1));
      }),
      { numRuns: 2000, seed: 1978 },
    );
  });

  test("conductivity returns from salinity to 1e-12, relative", () => {
    fc.assert(
      fc.property(between(0.01, 70), between(-2, 40), between(0, 6000), (C, t, p) => {
        const SP = practicalSalinityFromConductivity(C, t, p);
        expect(Math.abs(conductivityFromPracticalSalinity(SP, t, p) / C - 1)).toBeLessThanOrEqual(1e-12);
      }),
      { numRuns: 2000, seed: 1986 },
    );
  });

  test("is continuous where the continuation to fresh water joins the scale", () => {
    for (const t of [0, 5, 15, 25, 35]) {
      const C = conductivityFromPracticalSalinity(2, t, 0);
      const below = practicalSalinityFromConductivity(C * (1 - 1e-10), t, 0);
      const above = practicalSalinityFromConductivity(C * (1 + 1e-10), t, 0);
      expect(above - below).toBeGreaterThan(0);
      expect(above - below).toBeLessThan(1e-9);
    }
  });

  test("is zero without conductivity and never negative next to it", () => {
    for (const t of [0, 15, 30]) {
      expect(practicalSalinityFromConductivity(0, t, 0)).toBeLessThan(1e-15);
      for (let C = 1e-6; C < 0.01; C *= 1.5)
        expect(practicalSalinityFromConductivity(C, t, 0)).toBeGreaterThanOrEqual(0);
    }
  });

  test("is NaN for a negative conductivity, and conductivity is NaN for a negative salinity", () => {
    expect(practicalSalinityFromConductivity(-0.1, 10, 0)).toBeNaN();
    expect(conductivityFromPracticalSalinity(-0.1, 10, 0)).toBeNaN();
  });

  test("of arrays equals that of numbers, and may overwrite its input", () => {
    const C = Float64Array.of(0.3, 3, 30, Number.NaN);
    const t = Float64Array.of(5, 15, 25, 10);
    const p = Float64Array.of(0, 10, 100, 0);
    const expected = Array.from(C, (value, i) => practicalSalinityFromConductivity(value, t[i]!, p[i]!));
    expect(Array.from(practicalSalinityFromConductivityInto(C, t, p, C))).toEqual(expected);
    expect(practicalSalinityFromConductivityInto(new Float64Array(), t, p, new Float64Array())).toHaveLength(0);
  });
});
