import { expect, it } from "vitest";
import { worstFlag } from "../../../src/quality/quality-flag.ts";

// IOOS QARTOD manuals: 4 outweighs 3 outweighs 1; missing stays missing; not evaluated where no test ran.
it.each([
  [[1, 3, 4], 4],
  [[1, 3, 1], 3],
  [[1, 2], 1],
  [[9, 4], 9],
  [[2, 2], 2],
  [[], 2],
])("%j come to %i", (flags, worst) => {
  expect(worstFlag(flags)).toBe(worst);
});
