import { describe, expect, it } from "vitest";
import { type Column, defaultBasis, integrateCast, stratificationOf } from "../../../../src/column/index.ts";
import { readDataFile } from "../../cast/reading.ts";

const FILES = [
  ["usgs-sfbay-2017.csv", 51],
  ["usgs-sfbay-2020.csv", 34],
  ["usgs-sfbay-2022.csv", 55],
  ["usbr-ship-channel.csv", 38],
  ["ntl-mendota.csv", 99],
  ["falling-creek-reservoir.csv", 356],
] as const;

const columnsOf = (fileName: string): readonly Column[] =>
  readDataFile(fileName).casts.map((cast) => {
    const outcome = integrateCast(cast, { ...defaultBasis, latitudeDeg: cast.latitudeDeg ?? 40 });
    if (!outcome.ok) throw new Error(`${cast.name} has no column`);
    return outcome.value;
  });

const within = (value: number, [least, most]: readonly [number, number]): boolean => value >= least && value <= most;

describe("real water", () => {
  it.each(FILES)("%s: every one of %i casts has a stratification that such water can have", (fileName, count) => {
    const columns = columnsOf(fileName);
    expect(columns).toHaveLength(count);
    for (const column of columns) {
      const found = stratificationOf(column)!;
      const { bottomDepthM } = column;
      expect(within(found.potentialEnergyAnomalyJM3, [-1, 500])).toBe(true);
      expect(within(found.mixedLayer.byThreshold.depthM, [0, bottomDepthM])).toBe(true);
      expect(within(found.mixedLayer.byGradient.depthM, [0, bottomDepthM])).toBe(true);
      for (const pycnocline of found.pycnoclines) {
        expect(within(pycnocline.depthM, [0, bottomDepthM])).toBe(true);
        expect(within(pycnocline.bruntPeriodS, [10, 600])).toBe(true);
      }
      const isLayered = found.stability.verdict !== "neutral";
      expect(found.modes !== null).toBe(isLayered);
      if (found.modes) {
        expect(within(found.modes.speedMs[0]!, [0.005, 1])).toBe(true);
        expect(within(found.modes.deformationRadiusM!, [50, 10_000])).toBe(true);
      }
      if (found.twoLayers) expect(found.twoLayers.waves.freeSurfaceMs).toBeLessThan(1);
    }
  });

  it("under ice a lake is stable with its coldest water on top; in the cold of spring it is mixed", () => {
    const verdictOn = (date: string): string => {
      const { casts } = readDataFile("ntl-mendota.csv");
      const outcome = integrateCast(casts.find((cast) => cast.time?.startsWith(date))!, defaultBasis);
      return outcome.ok ? stratificationOf(outcome.value)!.stability.verdict : "none";
    };
    // 0.8 degC over 2.2 degC, 1.3 over 2.5; then 3.6 degC throughout; then 6.4 over 4.0.
    expect(["2018-01-11", "2018-01-26", "2018-04-11", "2018-04-25"].map(verdictOn)).toEqual([
      "stable",
      "stable",
      "neutral",
      "stable",
    ]);
  });

  it("a reservoir's sensor that reads 4.1 over 6.5 degC is not taken for stable water", () => {
    const { casts } = readDataFile("falling-creek-reservoir.csv");
    const outcome = integrateCast(casts.find((cast) => cast.time === "2017-12-11")!, defaultBasis);
    const stability = outcome.ok ? stratificationOf(outcome.value)!.stability : null;
    expect(stability).toMatchObject({ verdict: "unstable", greatestInversion: { heavyDepthM: 0.1, lightDepthM: 1 } });
  });
});
