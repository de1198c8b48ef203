import { expectWithin, type Tolerance } from "../../support/tolerance.ts";

const CONVERTED: Tolerance = {
  absolute: 3e-13,
  relative: 1e-15,
  reason: "a product, a quotient and the zero of a scale, each rounded once",
};

/** A number that went through one conversion of units. */
export const expectConverted = (found: number | null | undefined, expected: number): void =>
  expectWithin(found ?? Number.NaN, expected, CONVERTED, "converted value");
