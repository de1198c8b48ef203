import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  conservativeTemperature,
  conservativeTemperatureFromPotential,
  conservativeTemperatureInto,
  inSituTemperature,
  inSituTemperatureInto,
  potentialTemperature,
  potentialTemperatureFromConservative,
  STANDARD_OCEAN_SALINITY,
} from "../../../src/gsw-ts-port/index.ts";

const salinity = fc.double({ min: 0, max: 42, noNaN: true });
const temperature = fc.double({ min: -2, max: 40, noNaN: true });
const pressure = fc.double({ min: 0, max: 10000, noNaN: true });

describe("temperature", () => {
  test("goes to conservative and back to 1e-12 degC", () => {
    fc.assert(
      fc.property(salinity, temperature, pressure, (SA, t, p) => {
        expect(Math.abs(inSituTemperature(SA, conservativeTemperature(SA, t, p), p) - t)).toBeLessThan(1e-12);
      }),
      { numRuns: 2000, seed: 2010 },
    );
  });

  test("goes to another reference pressure and back to 1e-12 degC", () => {
    fc.assert(
      fc.property(salinity, temperature, pressure, pressure, (SA, t, p, referenceP) => {
        const there = potentialTemperature(SA, t, p, referenceP);
        expect(Math.abs(potentialTemperature(SA, there, referenceP, p) - t)).toBeLessThan(1e-12);
      }),
      { numRuns: 2000, seed: 2010 },
    );
  });

  test("goes from potential to conservative and back to 1e-12 degC", () => {
    fc.assert(
      fc.property(salinity, temperature, (SA, pt0) => {
        const CT = conservativeTemperatureFromPotential(SA, pt0);
        expect(Math.abs(potentialTemperatureFromConservative(SA, CT) - pt0)).toBeLessThan(1e-12);
      }),
      { numRuns: 2000, seed: 2010 },
    );
  });

  test("is unchanged when the reference pressure is the water's own", () => {
    expect(potentialTemperature(20, 15, 300, 300)).toBeCloseTo(15, 13);
  });

  test("is zero on the conservative scale for standard ocean water at 0 degC, by definition (IOC et al. 2010, sec. 3.3)", () => {
    // The definition rests on IAPWS-95; the water part in use differs from it by 3.3e-4 J/kg here.
    expect(Math.abs(conservativeTemperature(STANDARD_OCEAN_SALINITY, 0, 0))).toBeLessThan(1e-7);
  });

  test("falls as cold fresh water is compressed and rises as warm seawater is: the sign of thermal expansion", () => {
    expect(inSituTemperature(0, conservativeTemperature(0, 1, 0), 100)).toBeLessThan(1);
    expect(inSituTemperature(35, conservativeTemperature(35, 20, 0), 100)).toBeGreaterThan(20);
  });

  test("of arrays equals that of numbers, and may overwrite its input", () => {
    const SA = Float64Array.of(0, 10, 35, Number.NaN);
    const t = Float64Array.of(5, 15, 25, 10);
    const p = Float64Array.of(0, 10, 100, 0);
    const CT = conservativeTemperatureInto(SA, t, p, new Float64Array(4));
    expect(Array.from(CT)).toEqual(Array.from(SA, (value, i) => conservativeTemperature(value, t[i]!, p[i]!)));
    const expected = Array.from(SA, (value, i) => inSituTemperature(value, CT[i]!, p[i]!));
    expect(Array.from(inSituTemperatureInto(SA, CT, p, CT))).toEqual(expected);
  });
});
