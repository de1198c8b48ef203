import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  dynamicEnthalpy,
  gravity,
  gravityAtDepth,
  STANDARD_OCEAN_SALINITY,
  standardOceanHeight,
  standardOceanPressure,
  surfaceGravity,
} from "../../../src/gsw-ts-port/index.ts";

const latitude = fc.double({ min: -90, max: 90, noNaN: true });

describe("the standard ocean", () => {
  test("gives the pressure back from the height to 1e-12, relative", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 10000, noNaN: true }), latitude, (p, lat) => {
        expect(Math.abs(standardOceanPressure(standardOceanHeight(p, lat), lat) - p)).toBeLessThanOrEqual(
          1e-12 * (1 + p),
        );
      }),
      { numRuns: 2000, seed: 1981 },
    );
  });

  test("balances the work of gravity against enthalpy (IOC et al. 2010, eq. 3.32.3)", () => {
    const z = standardOceanHeight(5000, 30);
    const work = -surfaceGravity(30) * (z - 0.5 * 2.26e-7 * z * z);
    expect(work / dynamicEnthalpy(STANDARD_OCEAN_SALINITY, 0, 5000)).toBeCloseTo(1, 13);
  });

  test("has height zero at sea pressure zero, negative heights below and positive heights above", () => {
    expect(Math.abs(standardOceanHeight(0, 45))).toBe(0);
    expect(standardOceanHeight(10, 45)).toBeLessThan(0);
    expect(standardOceanHeight(-1, 45)).toBeGreaterThan(0);
  });
});

describe("gravity", () => {
  test("is the same north and south, and largest at the poles", () => {
    expect(surfaceGravity(-35)).toBe(surfaceGravity(35));
    expect(surfaceGravity(90) - surfaceGravity(0)).toBeCloseTo(0.0518592, 6);
  });

  test("grows by 2.26e-7 of itself per metre of depth", () => {
    expect(gravityAtDepth(45, 1000) / surfaceGravity(45) - 1).toBeCloseTo(2.26e-4, 12);
    expect(gravityAtDepth(45, 0)).toBe(surfaceGravity(45));
    expect(gravity(45, 1000)).toBe(gravityAtDepth(45, -standardOceanHeight(1000, 45)));
  });
});
