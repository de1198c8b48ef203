import { describe, expect, it } from "vitest";
import { defaultPreparation, prepareCast, QUALITY_FLAG } from "../../../src/quality/index.ts";
import { castOf } from "../../support/cast-of.ts";
import { readDataFile } from "../cast/reading.ts";

const flagsOf = (columns: Parameters<typeof castOf>[0]) => [
  ...prepareCast(castOf(columns), defaultPreparation, [], 0).flag,
];

const suspects = (fileName: string) =>
  readDataFile(fileName).casts.flatMap((cast) => {
    const { flag, issues } = prepareCast(cast, defaultPreparation, [], 0);
    const lines = [...flag.keys()]
      .filter((i) => flag[i] === QUALITY_FLAG.suspect)
      .map((i) => cast.samples.lineIndex[i]!);
    expect(issues.map((issue) => issue.line)).toEqual(lines);
    return lines.map((line) => ({
      cast: cast.name,
      depthM: cast.samples.depthM![cast.samples.lineIndex.indexOf(line)],
    }));
  });

describe("a density anomaly that the file states", () => {
  it("agrees with ours to 0.02 kg/m3 in every row of the 2020 cruise", () => {
    expect(suspects("usgs-sfbay-2020.csv")).toEqual([]);
  });

  it("disagrees in just the seven rows of 2022 that do not fit their own salinity and temperature", () => {
    // Known from the agency's file: station 6 on 2022-03-09, depths 1, 2 and 4 to 8 m.
    const found = suspects("usgs-sfbay-2022.csv");
    expect(new Set(found.map(({ cast }) => cast))).toEqual(new Set(["Station 6, 2022-03-09"]));
    expect(found.map(({ depthM }) => depthM)).toEqual([1, 2, 4, 5, 6, 7, 8]);
  });

  it("flags nothing where a row or the file states none", () => {
    const sample = { depthM: [1, 2], inSituTempC: [10, 10], practicalSalinity: [20, 20] };
    expect(flagsOf(sample)).toEqual([2, 2]);
    expect(flagsOf({ ...sample, statedSigmaKgM3: [Number.NaN, 12] })).toEqual([2, 3]);
  });
});
