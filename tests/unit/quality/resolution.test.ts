import { expect, it } from "vitest";
import { resolutionOf } from "../../../src/quality/resolution.ts";

it.each([
  ["whole degrees", [12, 13, 15], 1],
  ["tenths", [12.1, 13, 15.4], 0.1],
  ["hundredths, one value missing", [12.13, Number.NaN, 13, 15.4], 0.01],
  ["one value alone", [12.345, 12.345], 0.001],
])("is read from the decimals: %s", (_, values, step) => {
  expect(resolutionOf(Float64Array.from(values))).toBeCloseTo(step, 12);
});

it("survives a change of unit: tenths of a degree Fahrenheit are 1/18 degC", () => {
  const tempC = Float64Array.from([50, 50.1, 50.3, 51.9], (fahrenheit) => ((fahrenheit - 32) * 5) / 9);
  expect(resolutionOf(tempC)).toBeCloseTo(1 / 18, 9);
});

it("is 0 where one converted value tells nothing", () => {
  expect(resolutionOf(Float64Array.of(1 / 3, 1 / 3))).toBe(0);
});
