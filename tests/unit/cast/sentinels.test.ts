import { describe, expect, test } from "vitest";
import type { MeasuredRole } from "../../../src/cast/read/roles.ts";
import { findSentinels } from "../../../src/cast/read/sentinels.ts";

const foundIn = (role: MeasuredRole, ...values: readonly number[]): readonly number[] => [
  ...findSentinels(values, role).found,
];

describe("a number that could stand for not measured", () => {
  test.each<[string, MeasuredRole, readonly number[], readonly number[]]>([
    ["-9 under ice", "temperature", [-1.2, -1.6, -9, -1.7], [-9]],
    ["-9 that is no water, alone", "temperature", [-9, -9], [-9]],
    ["-9 among elevations about it", "elevation", [-7, -8, -9, -10], []],
    ["-999 among elevations far above it", "elevation", [310, 305, -999], [-999]],
    ["-99 below a deep cast", "depth", [0, 50, 150, -99], [-99]],
    ["-9 in a column counted upward", "depth", [-1, -5, -9, -12], []],
    ["9 and 99 among depths", "depth", [9, 50, 99, 120], []],
    ["999 among conductances about it", "specificConductance", [950, 999, 1040], []],
    ["999 far above conductances", "specificConductance", [100, 104, 999, 999], [999]],
    ["99.99 in water of ten degrees", "temperature", [10.5, 9.5, 99.99], [99.99]],
    ["-99 as the only longitude", "longitude", [-99, -99], []],
    ["-99 far from longitudes of the Pacific", "longitude", [-122.1, -122.2, -99], [-99]],
    ["-999 as a longitude", "longitude", [-122.1, -999], [-999]],
    ["zero salinity in the air", "practicalSalinity", [0, 0, 0, 0, 30, 31], []],
    ["a spike of 183 degC", "temperature", [10, 183, 9], []],
    ["-5555 again and again", "temperature", [10, -5555, -5555, -5555, 9], [-5555]],
    ["-5555 once is a wrong value, not a fill", "temperature", [10, -5555, 9], []],
    [
      "tiny and huge",
      "practicalSalinity",
      [30, -9.99e-29, 1e35, Number.POSITIVE_INFINITY],
      [-9.99e-29, 1e35, Number.POSITIVE_INFINITY],
    ],
    ["nothing at all", "temperature", [], []],
    ["nothing measured", "temperature", [Number.NaN, Number.NaN], []],
  ])("%s", (_, role, values, fills) => {
    expect(foundIn(role, ...values)).toEqual(fills);
  });

  test("is kept, and said to be, where it fits its column", () => {
    expect([...findSentinels([-7, -8, -9, -10], "elevation").kept]).toEqual([-9]);
  });
});
