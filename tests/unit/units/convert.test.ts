import { describe, expect, test } from "vitest";
import { isToolError } from "../../../src/base/index.ts";
import { convert, convertArray, type UnitSymbol } from "../../../src/units/index.ts";

const relativeError = (found: number, expected: number): number => Math.abs(found / expected - 1);

describe("factors agree with NIST SP 811 (2008), appendix B, to the digits printed there", () => {
  // psi, ftH2O, mmHg, atm and bar as quoted in methods 5.5; the others from memory of the same appendix, which gives the
  // fathom of the survey foot: ours is six international feet.
  // from | to | printed factor | half a unit of its last digit, relative
  const printed: readonly (readonly [UnitSymbol, UnitSymbol, number, number])[] = [
    ["psi", "Pa", 6894.757, 1e-7],
    ["ftH2O", "Pa", 2989.067, 2e-7],
    ["mmHg", "Pa", 133.3224, 4e-7],
    ["atm", "Pa", 101325, 0],
    ["bar", "Pa", 1e5, 0],
    ["lbf", "N", 4.448222, 2e-7],
    ["kip", "N", 4448.222, 2e-7],
    ["lb/ft3", "kg/m3", 16.01846, 4e-7],
    ["fathom", "m", 1.8288, 1e-12],
    ["mi", "m", 1609.344, 1e-12],
    ["nmi", "m", 1852, 0],
    ["in", "cm", 2.54, 1e-12],
    ["lbf/ft", "N/m", 14.5939, 4e-6],
    ["lbf ft", "N m", 1.355818, 4e-7],
  ];
  test.each(printed)("1 %s in %s is %d", (from, to, factor, tolerance) => {
    expect(relativeError(convert(1, from, to), factor)).toBeLessThanOrEqual(tolerance);
  });

  test("the defining constants give more digits than are printed", () => {
    // 0.45359237 * 9.80665 / 0.0254^2; 1000 * 9.80665 * 0.3048; 13595.1 * 9.80665 / 1000
    expect(relativeError(convert(1, "psi", "Pa"), 6894.757293168361)).toBeLessThan(1e-15);
    expect(relativeError(convert(1, "ftH2O", "Pa"), 2989.06692)).toBeLessThan(1e-15);
    expect(relativeError(convert(1, "mmHg", "Pa"), 133.322387415)).toBeLessThan(1e-15);
  });

  // methods 5.5: one pressure in four units of head, to the digits printed there
  test.each([
    ["mH2O", 12.162, 5e-5],
    ["ftH2O", 39.9017, 5e-5],
    ["psi", 17.2985, 5e-5],
    ["mmHg", 894.59, 5e-3],
  ] as const)("119 268.897 Pa in %s is %d", (to, expected, halfDigit) => {
    expect(Math.abs(convert(119268.897, "Pa", to) - expected)).toBeLessThanOrEqual(halfDigit);
  });
});

describe("temperature scales have their own zero", () => {
  test.each([
    [32, "degF", 0, "degC"],
    [212, "degF", 100, "degC"],
    [-40, "degF", -40, "degC"],
    [273.15, "K", 0, "degC"],
    [0, "K", -459.67, "degF"],
  ] as const)("%d %s is %d %s", (value, from, expected, to) => {
    expect(Math.abs(convert(value, from, to) - expected)).toBeLessThan(1e-12);
  });
});

describe("decimal multiples stay as they are written", () => {
  test.each([
    [518, "uS/cm", "mS/cm", 0.518],
    [5.3, "S/m", "mS/cm", 53],
    [12.34, "dbar", "kPa", 123.4],
    [150, "cm", "m", 1.5],
    [12500, "m", "km", 12.5],
    [1.025, "g/cm3", "kg/m3", 1025],
  ] as const)("%d %s to %s is %d", (value, from, to, expected) => {
    expect(convert(value, from, to)).toBe(expected);
  });
});

test("units of two kinds do not convert", () => {
  let caught: unknown;
  try {
    convert(1, "m", "Pa");
  } catch (e) {
    caught = e;
  }
  expect(isToolError(caught, "DomainError")).toBe(true);
  expect(String(caught)).toContain("m is a unit of length, Pa one of pressure");
});

describe("arrays", () => {
  test("each value is converted, a missing one stays missing, the input is left alone", () => {
    const feet = Float64Array.of(0, 10, Number.NaN);
    expect([...convertArray(feet, "ft", "m")]).toEqual([0, convert(10, "ft", "m"), Number.NaN]);
    expect(feet[1]).toBe(10);
  });

  test("no values give no values", () => {
    expect(convertArray([], "ft", "m").length).toBe(0);
  });
});
