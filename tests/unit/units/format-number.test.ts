import { describe, expect, test } from "vitest";
import { displayUnit, formatNumber, formatQuantity, unitOf } from "../../../src/units/index.ts";

describe("numbers for people", () => {
  test.each([
    [1.005, 1, "1.0"],
    [-0.456, 2, "\u22120.46"],
    [-0.004, 2, "0.00"],
    [-0, 0, "0"],
    [1234.5, 0, "1235"],
    [Number.NaN, 3, "\u2013"],
    [Number.NEGATIVE_INFINITY, 1, "\u2212∞"],
  ])("%d to %d digits is %s", (value, digitsCount, text) => {
    expect(formatNumber(value, { digitsCount })).toBe(text);
  });

  test.each([
    [1234.5, "1234.5"],
    [12345.6, "12\u2009345.6"],
    [-1234567.8, "\u22121\u2009234\u2009567.8"],
  ])("thin spaces group five digits and more, not four: %d", (value, text) => {
    expect(formatNumber(value, { digitsCount: 1, grouping: "thin-space" })).toBe(text);
  });
});

describe("the SI | US switch", () => {
  test("moves values between metric and customary units", () => {
    expect(formatQuantity(12, "m", "depth", "SI")).toBe("12.00");
    expect(formatQuantity(12, "m", "depth", "US")).toBe("39.37");
    expect(formatQuantity(20, "degC", "temperature", "US")).toBe("68.00");
    expect(formatQuantity(119268.897, "Pa", "gaugePressure", "SI")).toBe("119.27");
    // methods 5.5 rounds it to 17.2985 psi; 119268.897 / 6894.757293 = 17.29849
    expect(formatQuantity(119268.897, "Pa", "gaugePressure", "US")).toBe("17.298");
    // 62.4 lb/ft3 is 999.552 kg/m3 (methods 5.2)
    expect(formatQuantity(999.552, "kg/m3", "density", "US")).toBe("62.400");
    expect(formatQuantity(16.09344, "km", "distance", "US")).toBe("10.0");
  });

  test("leaves salinity and missing values alone", () => {
    expect(formatQuantity(31.456, "1", "practicalSalinity", "US")).toBe("31.46");
    expect(formatQuantity(Number.NaN, "Pa", "departure", "US")).toBe("\u2013");
  });

  test("names its units as people write them", () => {
    expect(unitOf(displayUnit("temperature", "SI").unit).label).toBe("°C");
    expect(unitOf(displayUnit("density", "US").unit).label).toBe("lb/ft³");
    expect(unitOf(displayUnit("practicalSalinity", "SI").unit).label).toBe("");
  });
});
