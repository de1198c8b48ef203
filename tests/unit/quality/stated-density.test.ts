import { describe, expect, it } from "vitest";
import { sigmaKgM3 } from "../../../src/quality/evidence.ts";
import { defaultPreparation, prepareCast } from "../../../src/quality/index.ts";
import { readDataFile } from "../cast/reading.ts";
import { flagsOf, preparedOf } from "./prepared.ts";

const disagreeing = (fileName: string) =>
  readDataFile(fileName).casts.flatMap((cast) => {
    const { reasons } = prepareCast(cast, defaultPreparation, [], 0);
    return [...reasons.keys()]
      .filter((i) => reasons[i]!.some((reason) => reason.endsWith("one of the three is wrong")))
      .map((i) => ({ cast: cast.name, depthM: cast.samples.depthM![i] }));
  });

describe("a density that the file states", () => {
  it("agrees with ours to 0.02 kg/m3 in every row of the 2020 cruise", () => {
    expect(disagreeing("usgs-sfbay-2020.csv")).toEqual([]);
  });

  it("disagrees in just the seven rows of 2022 that do not fit their own salinity and temperature", () => {
    // Known from the agency's file: station 6 on 2022-03-09, depths 1, 2 and 4 to 8 m.
    const found = disagreeing("usgs-sfbay-2022.csv");
    expect(new Set(found.map(({ cast }) => cast))).toEqual(new Set(["Station 6, 2022-03-09"]));
    expect(found.map(({ depthM }) => depthM)).toEqual([1, 2, 4, 5, 6, 7, 8]);
  });

  it("is not asked for where a row or the file has none", () => {
    const sample = { depthM: [1, 2], inSituTempC: [10, 10], practicalSalinity: [20, 20] };
    expect(flagsOf(sample)).toEqual([1, 1]);
    expect(flagsOf({ ...sample, statedSigmaKgM3: [Number.NaN, 12] })).toEqual([1, 3]);
    expect(flagsOf({ ...sample, statedSigmaKgM3: [Number.NaN, Number.NaN] })).toEqual([1, 1]);
  });
});

describe("what the file means by density", () => {
  const depthM = [50, 100, 200, 300];
  const inSituTempC = [14.2, 10.1, 9.3, 8.4];
  const practicalSalinity = [30.1, 33.2, 34.1, 34.6];
  const sigma = (i: number, isInSitu: boolean) =>
    sigmaKgM3({
      practicalSalinity: practicalSalinity[i]!,
      inSituTempC: inSituTempC[i]!,
      seaPressureDbar: isInSitu ? depthM[i]! : 0,
      atSeaPressureDbar: isInSitu ? depthM[i]! : 0,
    });
  const rounded = (value: number, perUnit: number) => Math.round(value * perUnit) / perUnit;

  it.each([
    ["density less 1000 kg/m3, at zero pressure", (i: number) => rounded(sigma(i, false), 1000), null],
    ["density less 1000 kg/m3, in situ", (i: number) => rounded(sigma(i, true), 1000), "less 1000 kg/m3, in situ"],
    ["density in situ", (i: number) => rounded(1000 + sigma(i, true), 100), "density in situ"],
    ["specific gravity", (i: number) => rounded((1000 + sigma(i, false)) / 999.975, 1e4), "specific gravity"],
  ])("is told from the values: %s", (words, statedAt, note) => {
    const stated = depthM.map((_, i) => statedAt(i));
    const columns = { depthM, inSituTempC, practicalSalinity, statedSigmaKgM3: stated };
    const good = preparedOf(columns);
    expect([...good.flag]).toEqual([1, 1, 1, 1]);
    expect(good.issues.map(({ message }) => message)).toEqual(note ? [expect.stringContaining(note)] : []);
    const wrong = preparedOf({ ...columns, statedSigmaKgM3: stated.with(2, stated[2]! * 1.05) });
    expect([...wrong.flag]).toEqual([1, 1, 3, 1]);
    expect(wrong.reasons[2]![0]!.startsWith(`${words} is `)).toBe(true);
  });
});
