import { describe, expect, it } from "vitest";
import { spikeValue } from "../../../src/quality/checks/spike.ts";
import { calmWater, everyHalfMetre, flagsOf, preparedOf } from "./prepared.ts";

it("has the spike value of the QARTOD manual: 2.8 for 20.0, 23.0, 20.4", () => {
  expect(spikeValue(20.0, 23.0, 20.4)).toBeCloseTo(2.8, 12);
});

describe("a spike", () => {
  const water = calmWater(40);

  it("in salinity fails, alone, and says by how much", () => {
    const salinity = water.practicalSalinity.with(12, water.practicalSalinity[12]! + 4);
    const { flag, reasons, use, issues } = preparedOf({ ...water, practicalSalinity: salinity });
    expect([...flag.keys()].filter((i) => flag[i] !== 1)).toEqual([12]);
    expect(flag[12]).toBe(4);
    expect(use[12]).toBe(0);
    expect(reasons[12]![0]).toMatch(/^salinity [\d.]+ sticks out by [\d.]+ from [\d.]+ above and [\d.]+ below$/);
    expect(issues).toContainEqual(expect.objectContaining({ code: "spike", line: 14 }));
  });

  it("in temperature fails too, downward as upward", () => {
    for (const height of [2, -2]) {
      const inSituTempC = water.inSituTempC.with(30, water.inSituTempC[30]! + height);
      expect(flagsOf({ ...water, inSituTempC })[30]).toBe(4);
    }
  });

  it("that is small for its noisy neighbours is only suspect", () => {
    const inSituTempC = [15, 15.04, 14.99, 15.03, 14.98, 15.35, 14.99, 15.02, 14.98, 15.03, 15];
    const flags = flagsOf({
      depthM: everyHalfMetre(inSituTempC),
      inSituTempC,
      practicalSalinity: inSituTempC.map((_, i) => i),
    });
    expect(flags).toEqual([1, 1, 1, 1, 1, 3, 1, 1, 1, 1, 1]);
  });
});

describe("no spike", () => {
  it("is a halocline, however sharp", () => {
    const practicalSalinity = [0.4, 0.4, 0.4, 0.5, 29, 29.1, 29.1, 29.1];
    const depthM = [1, 2, 3, 4, 6.4, 7, 8, 9];
    const inSituTempC = [21, 21, 21, 20.9, 15, 14.9, 14.9, 14.9];
    expect(flagsOf({ depthM, practicalSalinity, inSituTempC })).toEqual(depthM.map(() => 1));
  });

  it("is a thin lens at the surface or a step at the bed", () => {
    const practicalSalinity = [2, 20, 20.1, 20.1, 20.2, 20.2, 20.3, 33];
    const inSituTempC = practicalSalinity.map(() => 12);
    expect(flagsOf({ depthM: everyHalfMetre(inSituTempC), practicalSalinity, inSituTempC })).not.toContain(4);
  });

  it("is the last digit of a coarse record", () => {
    const inSituTempC = [12.1, 12.1, 12.2, 12.1, 12.1, 12.3, 12.1, 12.1];
    expect(flagsOf({ depthM: everyHalfMetre(inSituTempC), inSituTempC })).toEqual(inSituTempC.map(() => 1));
  });

  it("is a sample whose neighbours are far away", () => {
    const depthM = [1, 1.5, 2, 2.5, 10, 20, 20.5, 21, 21.5];
    const inSituTempC = [15, 15, 15, 15, 18, 14, 14, 14, 14];
    expect(flagsOf({ depthM, inSituTempC, practicalSalinity: depthM.map((z) => 20 + z / 4) })[4]).toBe(1);
  });
});
