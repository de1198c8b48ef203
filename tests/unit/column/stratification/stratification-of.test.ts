import { describe, expect, it } from "vitest";
import { isToolError } from "../../../../src/base/index.ts";
import {
  type Basis,
  defaultBasis,
  defaultStratificationOptions,
  integrateCast,
  type Stratification,
  type StratificationOptions,
  stratificationOf,
} from "../../../../src/column/index.ts";
import { inSituTemperature } from "../../../../src/gsw-ts-port/index.ts";
import { castOf } from "../../../support/cast-of.ts";

type Columns = Parameters<typeof castOf>[0];

const resultOf = (
  columns: Columns,
  options: Partial<StratificationOptions> = {},
  basis: Partial<Basis> = {},
): Stratification | null => {
  const outcome = integrateCast(castOf(columns), { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return stratificationOf(outcome.value, options);
};

const stratified = (...given: Parameters<typeof resultOf>): Stratification => {
  const result = resultOf(...given);
  if (!result) throw new Error("no stratification");
  return result;
};

/** Fresh over salt with a halocline from 4 to 6 m, first sample at 1 m. */
const estuary: Columns = {
  depthM: [1, 2, 4, 6, 8, 10],
  practicalSalinity: [5, 5, 5, 25, 25, 25],
  inSituTempC: [15, 15, 15, 15, 15, 15],
};

describe("stratification of an estuary", () => {
  const found = stratified(estuary, {}, { bedDepthM: 12, latitudeDeg: 51 });

  it("finds one halocline, with the layers that meet there reaching surface and bed", () => {
    expect(found.stability).toMatchObject({ verdict: "stable", greatestInversion: null });
    expect(found.pycnoclines).toHaveLength(1);
    // The flat top of an even gradient is placed to half a step of the smoothed profile.
    expect(Math.abs(found.pycnoclines[0]!.depthM - 5)).toBeLessThanOrEqual(12 / 200 / 2);
    // Water of one temperature as measured is a little stable: 1e-5 m.
    expect(found.moments!.centroidDepthM).toBeCloseTo(5, 4);
    // An even gradient over 2 m: 2 / sqrt 12, and a trace of that little stability.
    expect(Math.abs(found.moments!.rmsWidthM - 2 / Math.sqrt(12))).toBeLessThan(2e-4);
    expect(found.twoLayers!.upperThicknessM + found.twoLayers!.lowerThicknessM).toBe(12);
    expect(found.twoLayers!.energyKept.lowerRhoKgM3).toBeGreaterThan(found.twoLayers!.means.lowerRhoKgM3);
  });

  it("counts the mixed layer from the first sample", () => {
    const { referenceDepthM, byThreshold, byGradient } = found.mixedLayer;
    expect(referenceDepthM).toBe(1);
    // 0.1 of some 15 kg/m3 into 2 m.
    expect(byThreshold.depthM).toBeGreaterThan(4);
    expect(byThreshold.depthM).toBeLessThan(4.05);
    expect(Math.abs(byGradient.depthM - 3.5)).toBeLessThan(0.1);
  });

  it("has an internal wave near that of its two layers, and a deformation radius where it has a latitude", () => {
    const [first, second] = found.modes!.speedMs;
    expect(Math.abs(first! / found.twoLayers!.waves.rigidLidMs - 1)).toBeLessThan(0.05);
    expect(second).toBeLessThan(first! / 2);
    expect(found.modes!.deformationRadiusM).toBeCloseTo(first! / (2 * 7.292115e-5 * Math.sin((51 * Math.PI) / 180)), 6);
    expect(stratified(estuary).modes!.deformationRadiusM).toBeNull();
  });

  it("reads density at the pressure halfway down", () => {
    // 6 m of water between 1000 and 1020 kg/m3.
    expect(found.referenceSeaPressureDbar).toBeGreaterThan(5.88);
    expect(found.referenceSeaPressureDbar).toBeLessThan(6.01);
    expect(found.potentialRhoKgM3).toHaveLength(6);
  });

  it("keeps raw, sorted and smoothed buoyancy frequency alike where water is stable", () => {
    const { raw, sorted, smoothed } = found.buoyancy;
    expect(Array.from(raw.depthM)).toEqual([1.5, 3, 5, 7, 9]);
    expect(sorted.depthM).toEqual(raw.depthM);
    expect(Math.abs(sorted.squaredPerS2[2]! / raw.squaredPerS2[2]! - 1)).toBeLessThan(0.01);
    const inHalocline = smoothed.depthM.findIndex((depthM) => depthM >= 5);
    expect(Math.abs(smoothed.squaredPerS2[inHalocline]! / sorted.squaredPerS2[2]! - 1)).toBeLessThan(1e-9);
    expect([smoothed.depthM[0], smoothed.depthM.at(-1)]).toEqual([0, 12]);
  });
});

describe("options of stratification", () => {
  it("go with the result, the defaults where none are given", () => {
    expect(stratified(estuary).options).toEqual(defaultStratificationOptions);
    expect(stratified(estuary, { modeCount: 1 }).options).toEqual({ ...defaultStratificationOptions, modeCount: 1 });
    expect(stratified(estuary, { modeCount: 1 }).modes!.speedMs).toHaveLength(1);
  });

  it("judge the mixed layer of a lake by temperature, to the bottom where nothing differs", () => {
    const lake: Columns = { depthM: [0, 4, 8], practicalSalinity: [0.1, 0.1, 0.1], inSituTempC: [20, 19.8, 18.8] };
    const by = (stepC: number) =>
      stratified(lake, { mixedLayerThreshold: { quantity: "temperature", stepC } }).mixedLayer.byThreshold;
    expect(by(0.5).depthM).toBeCloseTo(5.2, 9);
    expect(by(2)).toEqual({ depthM: 8, reachesBottom: true });
  });

  it("give numbers of the flow only where velocities are given", () => {
    expect(stratified(estuary).flow).toBeNull();
    const flow = stratified(estuary, { velocity: { depthM: [0, 5, 10], velocityMs: [0.5, 0.5, -0.1] } }).flow!;
    expect(Array.from(flow.depthM)).toEqual([2.5, 7.5]);
    expect(flow.gradientRichardsonRatio[0]).toBeNaN();
    expect(flow.gradientRichardsonRatio[1]).toBeGreaterThan(1);
  });

  it.each([
    ["smoothingLengthM", { smoothingLengthM: 0 }],
    ["densityNoiseKgM3", { densityNoiseKgM3: Number.NaN }],
    ["mixedLayerThreshold", { mixedLayerThreshold: { quantity: "density", stepKgM3: -1 } }],
    ["prominenceFrac", { prominenceFrac: 2 }],
    ["modeCount", { modeCount: 1.5 }],
    ["velocity 2", { velocity: { depthM: [1, 2], velocityMs: [0.5, Number.NaN] } }],
    ["depth 2", { velocity: { depthM: [1, 1], velocityMs: [0.5, 0.5] } }],
    ["velocityMs", { velocity: { depthM: [1, 2], velocityMs: [0.5] } }],
    ["velocity", { velocity: { depthM: [], velocityMs: [] } }],
  ] as readonly (readonly [string, Partial<StratificationOptions>])[])(
    "without a meaning are refused: %s",
    (name, options) => {
      try {
        resultOf(estuary, options);
        expect.unreachable();
      } catch (error) {
        expect(isToolError(error, "DomainError") || isToolError(error, "ShapeError")).toBe(true);
        expect((error as Error).message).toContain(name);
      }
    },
  );
});

describe("fresh water around 4 degC", () => {
  const lake = (inSituTempC: readonly number[]) => ({
    depthM: inSituTempC.map((_, k) => 0.5 + 10 * k),
    practicalSalinity: inSituTempC.map(() => 0.1),
    inSituTempC,
  });

  it.each(["teos10", "exact", "limnological", "eos80"] as const)(
    "is judged by density, not by temperature (%s)",
    (id) => {
      const verdict = (inSituTempC: readonly number[]) =>
        stratified(lake(inSituTempC), { densityNoiseKgM3: 0.002 }, { water: { id } }).stability.verdict;
      expect(verdict([0.3, 1.5, 2.8, 3.6])).toBe("stable");
      expect(verdict([3.6, 2.8, 1.5, 0.3])).toBe("unstable");
      expect(verdict([8, 6, 5, 4.5])).toBe("stable");
      expect(verdict([4.5, 5, 6, 8])).toBe("unstable");
      // Colder water lies over the warmer and heavier in winter, on either side of the greatest density.
      expect(verdict([2, 3.8, 4, 3.9])).toBe("stable");
      expect(verdict([3.9, 3.9, 3.9, 3.9])).toBe("neutral");
    },
  );

  it("of one heat and salt content is neutral to 1e-4 kg/m3 over 100 m, compression and its warming left out", () => {
    const inSituTempC = [0, 25, 50, 75, 100].map((p) => inSituTemperature(0, 8, p));
    for (const id of ["teos10", "exact", "limnological", "eos80"] as const) {
      const column = { seaPressureDbar: [0, 25, 50, 75, 100], practicalSalinity: [0, 0, 0, 0, 0], inSituTempC };
      expect(stratified(column, {}, { water: { id } }).stability.rhoRangeKgM3).toBeLessThan(1e-4);
    }
  });
});

describe("columns with little to say", () => {
  it("of one sample are mixed to the bottom", () => {
    const found = stratified({ depthM: [3], practicalSalinity: [10], inSituTempC: [15] });
    expect(found).toMatchObject({
      stability: { verdict: "neutral" },
      mixedLayer: { byThreshold: { depthM: 3, reachesBottom: true }, byGradient: { depthM: 3, reachesBottom: true } },
      pycnoclines: [],
      moments: null,
      potentialEnergyAnomalyJM3: 0,
      twoLayers: null,
      modes: null,
      flow: null,
    });
    expect(found.buoyancy.raw.depthM).toHaveLength(0);
  });

  it("of two samples are one pycnocline", () => {
    const found = stratified({ depthM: [1, 3], practicalSalinity: [10, 20], inSituTempC: [15, 15] });
    // The window of 1 m lies whole within the gradient from 1.5 m on, and at the bottom is cut off.
    expect(found.pycnoclines[0]!.depthM).toBeCloseTo((1.5 + 3) / 2, 9);
    expect(found.buoyancy.sorted.squaredPerS2).toHaveLength(1);
  });

  it("of constant density are neutral", () => {
    const found = stratified(estuary, {}, { water: { id: "constant", rhoKgM3: 1000 } });
    expect(found.stability.verdict).toBe("neutral");
    expect(found.potentialEnergyAnomalyJM3).toBe(0);
  });

  it("with two samples at one depth have no buoyancy frequency between them", () => {
    const found = stratified({
      depthM: [1, 3, 3, 5],
      practicalSalinity: [10, 10, 20, 20],
      inSituTempC: [15, 15, 15, 15],
    });
    expect(found.buoyancy.sorted.squaredPerS2[1]).toBeNaN();
    expect(Math.abs(found.pycnoclines[0]!.depthM - 3)).toBeLessThan(5 / 200);
  });

  it("without depth, or with water no model computes, have no stratification", () => {
    expect(resultOf({ depthM: [0], practicalSalinity: [10], inSituTempC: [15] })).toBeNull();
    // The square root of salinity in EOS-80.
    const below = { depthM: [1, 2], practicalSalinity: [-0.01, 5], inSituTempC: [15, 15] };
    expect(resultOf(below, {}, { water: { id: "eos80" } })).toBeNull();
  });
});

describe("an unstable column", () => {
  const found = stratified({ depthM: [1, 2, 3, 4], practicalSalinity: [5, 20, 10, 15], inSituTempC: [15, 15, 15, 15] });

  it("is said to be so, where and by how much, and is sorted before its layers are told", () => {
    expect(found.stability).toMatchObject({
      verdict: "unstable",
      greatestInversion: { heavyDepthM: 2, lightDepthM: 3 },
    });
    expect(found.stability.greatestInversion!.excessKgM3).toBeGreaterThan(7);
    expect(Array.from(found.thorpe.displacementM)).toEqual([0, 2, -1, -1]);
    expect(found.buoyancy.raw.squaredPerS2[1]).toBeLessThan(0);
    expect(Math.min(...found.buoyancy.sorted.squaredPerS2)).toBeGreaterThan(0);
  });
});
