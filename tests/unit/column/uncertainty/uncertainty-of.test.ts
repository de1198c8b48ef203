import { describe, expect, it } from "vitest";
import type { Cast } from "../../../../src/cast/index.ts";
import {
  type Accuracy,
  budgetOf,
  type Column,
  defaultAccuracy,
  defaultBasis,
  describeAtDepths,
  integrateCast,
  sampledProfile,
  uncertaintyAtDepths,
  uncertaintyOf,
} from "../../../../src/column/index.ts";
import { sensitivitiesOf } from "../../../../src/column/uncertainty/sensitivities.ts";
import { conductivityFromPracticalSalinity } from "../../../../src/gsw-ts-port/index.ts";
import { castOf } from "../../../support/cast-of.ts";

const columnOf = (cast: Cast, basis: Partial<Column["basis"]> = {}): Column => {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return outcome.value;
};

const G = 9.80665e-3;
const layered = castOf({ depthM: [1, 4, 10], practicalSalinity: [5, 20, 30], inSituTempC: [18, 14, 12] });

describe("uncertainty where salinity comes from conductivity", () => {
  // Computed with the reference implementation of TEOS-10 by finite differences, two digits.
  it.each([
    [33, 10, -0.83],
    [35, 15, -0.71],
    [20, 20, -0.31],
  ])("an error of temperature moves salinity too: at %d mS/cm and %d degC by %d a kelvin", (mSCm, tempC, perK) => {
    const cast = castOf({ depthM: [0], conductivityMsCm: [mSCm], inSituTempC: [tempC] });
    const { ownSalinityPerTempRatio } = sensitivitiesOf(columnOf(cast, { water: { id: "eos80" } }), "conductivity");
    expect(ownSalinityPerTempRatio[0]).toBeCloseTo(perK, 2);
  });

  it("the effect of temperature is that of integrating anew with the conductivity as measured", () => {
    const practicalSalinity = [20, 20];
    const inSituTempC = [20, 20];
    const depthM = [0, 10];
    const conductivityMsCm = practicalSalinity.map((s, i) =>
      conductivityFromPracticalSalinity(s, inSituTempC[i]!, depthM[i]!),
    );
    const bySalinity = castOf({ depthM, practicalSalinity, inSituTempC });
    const byConductivity = castOf({ depthM, conductivityMsCm, inSituTempC });
    const tempTerm = (cast: Cast): number =>
      uncertaintyOf(columnOf(cast), cast).contributionKPa["temperature-systematic"].at(-1)!;
    const at = (tempC: number): number => {
      const warmer = castOf({ depthM, conductivityMsCm, inSituTempC: [tempC, tempC] });
      return sampledProfile(columnOf(warmer)).gaugePressureKPa.at(-1)!;
    };
    const { systematicTempC } = defaultAccuracy;
    const byIntegratingAnew = Math.abs(at(20 + systematicTempC) - at(20 - systematicTempC)) / 2;
    expect(tempTerm(byConductivity) / byIntegratingAnew).toBeCloseTo(1, 3);
    expect(tempTerm(byConductivity)).toBeGreaterThan(1.5 * tempTerm(bySalinity));
  });

  it("specific conductance stands for the conductivity in situ", () => {
    const specificConductanceMsCm = [30, 30];
    const cast = castOf({ depthM: [0, 10], specificConductanceMsCm, inSituTempC: [10, 10] });
    const uncertainty = uncertaintyOf(columnOf(cast), cast);
    expect(uncertainty.salinityFrom).toBe("specificConductance");
    expect(budgetOf(uncertainty, 2)!.shares.map(({ words }) => words)).toContain("conductivity accuracy");
  });
});

describe("uncertainty where nothing was measured of the salt", () => {
  it("leans on what the basis says of it", () => {
    const cast = castOf({ depthM: [0, 10], inSituTempC: [10, 10] });
    const uncertainty = uncertaintyOf(columnOf(cast), cast);
    expect(uncertainty.contributionKPa["salinity-systematic"].at(-1)! / (G * 10 * 0.77 * 0.2)).toBeCloseTo(1, 1);
    expect(uncertainty.contributionKPa["salinity-random"].at(-1)).toBe(0);
  });
});

describe("uncertainty along the column", () => {
  const column = columnOf(layered);

  it("is integrating anew with every sample moved, for what is common to all samples", () => {
    const moved = (change: { depthM?: number; scale?: number; salinity?: number }): number => {
      const cast = castOf({
        depthM: [1, 4, 10].map((z) => z * (1 + (change.scale ?? 0)) + (change.depthM ?? 0)),
        practicalSalinity: [5, 20, 30].map((s) => s + (change.salinity ?? 0)),
        inSituTempC: [18, 14, 12],
      });
      return describeAtDepths(columnOf(cast), [9]).gaugePressureKPa[0]!;
    };
    const { contributionKPa } = uncertaintyAtDepths(column, layered, [9]);
    const half = (name: "depthM" | "scale" | "salinity", by: number): number =>
      Math.abs(moved({ [name]: by }) - moved({ [name]: -by })) / 2;
    expect(contributionKPa["sample-depth-systematic"][0]! / half("depthM", 0.05)).toBeCloseTo(1, 2);
    expect(contributionKPa["depth-scale"][0]! / half("scale", 0.002)).toBeCloseTo(1, 2);
    expect(contributionKPa["salinity-systematic"][0]! / half("salinity", 0.05)).toBeCloseTo(1, 3);
  });

  it("counts a level's own depth at levels alone", () => {
    const { contributionKPa } = uncertaintyAtDepths(column, layered, [4]);
    const { rhoKgM3 } = sampledProfile(column);
    expect(contributionKPa["level-depth"][0]).toBeCloseTo(G * rhoKgM3[2]! * 0.02, 12);
    expect(uncertaintyOf(column, layered).contributionKPa["level-depth"][2]).toBe(0);
  });

  it("is that of exact depths, level or not, in all else", () => {
    const atLevels = uncertaintyAtDepths(
      { ...column, basis: { ...column.basis, accuracy: { ...defaultAccuracy, levelDepthM: 0 } } },
      layered,
      [0, 1, 4, 10],
    );
    expect(Array.from(atLevels.combinedKPa)).toEqual(Array.from(uncertaintyOf(column, layered).combinedKPa));
  });

  it("leans on the surface gap from within it down, and on the bed gap below the last sample alone", () => {
    const { contributionKPa, gaps } = uncertaintyAtDepths(column, layered, [0, 0.5, 1, 9, 10, 11]);
    const surface = contributionKPa["surface-gap"];
    expect(surface[0]).toBe(0);
    expect(surface[1]! / surface[2]!).toBeCloseTo(0.5, 6);
    expect(surface[5]).toBe(surface[2]);
    // Rectangular between what is held and fresh water at the first sample's temperature: the width over root 12.
    expect(surface[2]! / ((G * 1 * 5 * 0.76) / Math.sqrt(12))).toBeCloseTo(1, 1);
    expect(gaps.surfaceBoundKPa[2]).toBeLessThan(0);
    expect(Array.from(contributionKPa["bed-gap"].subarray(0, 5))).toEqual([0, 0, 0, 0, 0]);
    expect(contributionKPa["bed-gap"][5]).toBeGreaterThan(0);
    expect(gaps.bedGapM[5]).toBe(1);
  });

  it("knows gravity better where it knows the latitude", () => {
    const placed = columnOf({ ...layered, latitudeDeg: 50 });
    const share = (one: Column): number =>
      uncertaintyOf(one, layered).contributionKPa.gravity.at(-1)! / (one.seaPressureDbar.at(-1)! * 10);
    expect(share(column)).toBeCloseTo(0.0015, 12);
    expect(share(placed)).toBeCloseTo(0.0001, 12);
  });

  it("carries the thinner air of a high lake, which water properties do not know of", () => {
    const high = uncertaintyOf(columnOf(layered, { airPressureKPa: 70 }), layered);
    // 3.1 m of water less on top: 0.0014 per cent of density.
    expect(high.contributionKPa.altitude.at(-1)! / 99).toBeGreaterThan(1.3e-5);
    expect(high.contributionKPa.altitude.at(-1)! / 99).toBeLessThan(1.5e-5);
    expect(uncertaintyOf(column, layered).contributionKPa.altitude.at(-1)).toBe(0);
  });

  it("adds the air to absolute pressure alone", () => {
    const { absCombinedKPa, combinedKPa } = uncertaintyOf(column, layered);
    expect(absCombinedKPa[3]).toBeCloseTo(Math.hypot(combinedKPa[3]!, 1), 12);
  });

  it("has no value where there is no water", () => {
    const { combinedKPa } = uncertaintyAtDepths(columnOf(layered, { bedDepthM: 12 }), layered, [
      -1,
      13,
      Number.NaN,
      12,
    ]);
    expect(Array.from(combinedKPa.subarray(0, 3))).toEqual([Number.NaN, Number.NaN, Number.NaN]);
    expect(combinedKPa[3]).toBeGreaterThan(0);
    expect(uncertaintyAtDepths(column, layered, []).n).toBe(0);
  });

  it("serves a record in sea pressure the same: its errors shift water, not the pressure at a depth", () => {
    const { seaPressureDbar } = column;
    const cast = castOf({
      seaPressureDbar: [...seaPressureDbar],
      practicalSalinity: [5, 20, 30],
      inSituTempC: [18, 14, 12],
    });
    const same: Accuracy = { ...defaultAccuracy, randomSeaPressureDbar: 0.02, systematicSeaPressureDbar: 0.05 };
    const byPressure = uncertaintyOf(columnOf(cast, { accuracy: same }), cast);
    const byDepth = uncertaintyOf(column, layered);
    expect(byPressure.combinedKPa.at(-1)! / byDepth.combinedKPa.at(-1)!).toBeCloseTo(1, 2);
  });

  it.each([
    ["one sample", [2], [10], [12]],
    ["one sample, at the surface", [0], [10], [12]],
    ["two samples at one depth", [2, 2], [10, 12], [12, 11]],
  ])("is finite for %s", (_, depthM, practicalSalinity, inSituTempC) => {
    for (const id of ["teos10", "exact", "limnological", "eos80"] as const) {
      const cast = castOf({ depthM, practicalSalinity, inSituTempC });
      const uncertainty = uncertaintyAtDepths(columnOf(cast, { water: { id } }), cast, [0, 1, 2, 3]);
      expect(uncertainty.combinedKPa.every(Number.isFinite)).toBe(true);
      expect(uncertainty.sampling.shapeKPa.every(Number.isFinite)).toBe(true);
    }
  });

  it("of water of one given density has no part in what was measured", () => {
    const { contributionKPa } = uncertaintyOf(columnOf(layered, { water: { id: "constant", rhoKgM3: 1000 } }), layered);
    for (const name of ["temperature-systematic", "salinity-random", "surface-gap", "sampling", "depth-scale"] as const)
      expect(contributionKPa[name].at(-1)).toBe(0);
  });
});
