import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { convert, formatNumber, UNITS, type Unit } from "../../src/units/index.ts";

const pairs: readonly (readonly [Unit, Unit])[] = UNITS.flatMap((from) =>
  UNITS.filter((to) => to.kind === from.kind && to !== from).map((to) => [from, to] as const),
);

describe("conversions", () => {
  test.each(pairs.map(([from, to]) => [from.symbol, to.symbol] as const))("%s to %s and back", (from, to) => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (value) => {
        const back = convert(convert(value, from, to), to, from);
        // The zero of a scale (up to 459.67) is added and taken off again, so rounding is relative to it too.
        expect(Math.abs(back - value)).toBeLessThanOrEqual(4e-16 * (4 * Math.abs(value) + 2000));
      }),
      { seed: 1, numRuns: 50 },
    );
  });

  test("keep order: more stays more", () => {
    const value = fc.double({ min: -1e3, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(
        fc.constantFrom(...pairs),
        value,
        fc.double({ min: 1e-3, max: 1e3, noNaN: true }),
        ([from, to], low, step) => {
          expect(convert(low + step, from.symbol, to.symbol)).toBeGreaterThan(convert(low, from.symbol, to.symbol));
        },
      ),
      { seed: 2 },
    );
  });
});

test("a formatted number reads back to what was rounded", () => {
  fc.assert(
    fc.property(
      fc.double({ min: -1e9, max: 1e9, noNaN: true }),
      fc.integer({ min: 0, max: 6 }),
      (value, digitsCount) => {
        const text = formatNumber(value, { digitsCount, grouping: "thin-space" });
        const back = Number(text.replace("\u2212", "-").replaceAll("\u2009", ""));
        expect(Math.abs(back - value)).toBeLessThanOrEqual(0.5 * 10 ** -digitsCount + 1e-6);
      },
    ),
    { seed: 3 },
  );
});
