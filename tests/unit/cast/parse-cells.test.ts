import { describe, expect, test } from "vitest";
import { dayCountByName, dayCountOf } from "../../../src/cast/read/day-count.ts";
import { type NumberStyle, parseNumber } from "../../../src/cast/read/parse-number.ts";
import { parsePosition } from "../../../src/cast/read/parse-position.ts";
import { secondsOfDay } from "../../../src/cast/read/parse-time.ts";

const POINT: NumberStyle = { decimalMark: ".", groupMark: null };
const COMMA: NumberStyle = { decimalMark: ",", groupMark: "." };

describe("positions", () => {
  test.each([
    ["38.0417", 38.0417],
    ["-121.75", -121.75],
    ["38 02.5 N", 38 + 2.5 / 60],
    ["38 02.5 S", -(38 + 2.5 / 60)],
    ["N 38 02.5", 38 + 2.5 / 60],
    ["38° 2' 30\" N", 38 + 2 / 60 + 30 / 3600],
    ["121°45.0'W", -121.75],
    ["121-45.0W", -121.75],
    ["121:45:00 W", -121.75],
    ["-33 30", -33.5],
    ["38,5 N", 38.5],
    ["45S", -45],
    ["", Number.NaN],
    ["NA", Number.NaN],
  ])("%s is %d", (text, degrees) => {
    expect(parsePosition(text, POINT)).toBe(degrees);
  });

  test.each(["38 62.5 N", "38 02.5 X", "up north", "1234 N", "N", "38 2 30 15 N"])("%s is none", (text) => {
    expect(parsePosition(text, POINT)).toBeNull();
  });
});

describe("numbers", () => {
  test.each<[string, NumberStyle, number | null]>([
    ["1.5", POINT, 1.5],
    ["1,5", COMMA, 1.5],
    ["1,234.5", { decimalMark: ".", groupMark: "," }, 1234.5],
    ["1.234,5", COMMA, 1234.5],
    ["1 234.5", POINT, 1234.5],
    ["1'234'567", POINT, 1234567],
    ["12,34.5", { decimalMark: ".", groupMark: "," }, null],
    ["1,234", POINT, null],
    ["−1.5", POINT, -1.5],
    ["***", POINT, Number.NaN],
    ["#N/A", POINT, Number.NaN],
    ["1.5 m", POINT, null],
    ["1e999", POINT, Number.POSITIVE_INFINITY],
  ])("%s", (text, style, value) => {
    expect(parseNumber(text, style)).toBe(value);
  });

  test("a long run of figures that ends in a letter is refused at once", () => {
    const startMs = performance.now();
    expect(parseNumber(`${"9".repeat(200_000)}x`, POINT)).toBeNull();
    expect(performance.now() - startMs).toBeLessThan(200);
  });
});

describe("counted times", () => {
  test.each([
    [["46207.5"], "days since 1899-12-30"],
    [["739800.25"], "days since year 0"],
    [["2461226"], "Julian days"],
    [["1783172760"], "seconds since 1970-01-01"],
    [["1783172760000"], "milliseconds since 1970-01-01"],
  ])("%j", (cells, name) => {
    expect(dayCountOf(cells)?.name).toBe(name);
  });

  test.each([[["12"]], [["46207", "noon"]], [["46207", "1783172760"]], [[]]])("%j is none", (cells) => {
    expect(dayCountOf(cells)).toBeNull();
  });

  test.each([
    ["seconds since 1970-01-01", 1000, 0],
    ["hours since 2020-01-01T06:00:00Z", 3_600_000, Date.UTC(2020, 0, 1, 6)],
    ["days since 1950-01-01 00:00:00", 86_400_000, Date.UTC(1950, 0, 1)],
    ["d since 1950-1-1", 86_400_000, Date.UTC(1950, 0, 1)],
  ])("%s", (name, stepMs, originMs) => {
    expect(dayCountByName(name)).toMatchObject({ stepMs, originMs });
  });

  test.each(["fortnights since 2020-01-01", "seconds since noon", "hours", "since 2020-01-01"])(
    "%s is none",
    (name) => {
      expect(dayCountByName(name)).toBeNull();
    },
  );
});

test.each([
  ["13:46:00.25", 49_560.25],
  ["629", 23_340],
  ["1:05 PM", 47_100],
  ["noon", Number.NaN],
])("%s is %d s since midnight", (text, seconds) => {
  expect(secondsOfDay(text)).toBe(seconds);
});
