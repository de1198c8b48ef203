import { describe, expect, it } from "vitest";
import { smoothedBuoyancy } from "../../../../src/column/stratification/buoyancy-profiles.ts";
import { LinearProfile } from "../../../../src/column/stratification/linear-profile.ts";
import { peaksOf } from "../../../../src/column/stratification/peaks.ts";
import { pycnoclinesOf } from "../../../../src/column/stratification/pycnoclines.ts";

const HOW = {
  gravityMs2: 9.80665,
  meanRhoKgM3: 1012,
  prominenceFrac: 0.2,
  densityNoiseKgM3: 0.03,
  smoothingLengthM: 0.5,
};

/** Water of 20 m, density a function of depth, a sample every 5 cm. */
const pycnoclines = (rhoAt: (depthM: number) => number, how = HOW) => {
  const depthM = Float64Array.from({ length: 401 }, (_, i) => i / 20);
  const sorted = new LinearProfile(depthM, depthM.map(rhoAt));
  return pycnoclinesOf(smoothedBuoyancy(sorted, how.smoothingLengthM, how), sorted, how);
};

const tanhStep = (depthM: number, centreM: number, gain: number, halfThicknessM: number): number =>
  (gain / 2) * (1 + Math.tanh((depthM - centreM) / halfThicknessM));

describe("pycnoclines", () => {
  it("finds depth, strength and thickness of a tanh", () => {
    const [only, ...more] = pycnoclines((depth) => 1000 + tanhStep(depth, 8.013, 20, 1));
    expect(more).toEqual([]);
    expect(Math.abs(only!.depthM - 8.013)).toBeLessThan(0.005);
    // g drho / (2 rho0 d), less what a running mean of length L takes off a sech2: (L / d)^2 / 12.
    const closedPerS2 = (9.80665 * 20) / (2 * 1012);
    expect(Math.abs(only!.peakSquaredPerS2 / closedPerS2 - (1 - 0.25 / 12))).toBeLessThan(1e-3);
    expect(only!.bruntPeriodS).toBe((2 * Math.PI) / Math.sqrt(only!.peakSquaredPerS2));
    expect(only!.rhoStepKgM3).toBeCloseTo(20, 4);
    // 15 and 85 %: tanh x = 0.7, so 2 * 0.8673 d.
    expect(Math.abs(only!.thicknessM - 2 * Math.atanh(0.7))).toBeLessThan(2e-3);
    expect(only!.topDepthM + only!.thicknessM).toBeCloseTo(only!.bottomDepthM, 12);
    expect(only!.prominenceFrac).toBe(1);
  });

  it("lists a thermocline beside a halocline, the one that gains most first", () => {
    const found = pycnoclines((depth) => 1000 + tanhStep(depth, 4, 3, 0.5) + tanhStep(depth, 13, 15, 1.5));
    expect(found.map(({ depthM }) => Math.round(depthM))).toEqual([13, 4]);
    expect(Math.abs(found[0]!.rhoStepKgM3 - 15)).toBeLessThan(0.05);
    expect(Math.abs(found[1]!.rhoStepKgM3 - 3)).toBeLessThan(0.05);
  });

  it("passes over a peak that stands out too little, by share or against noise", () => {
    const faint = (depth: number): number => 1000 + tanhStep(depth, 4, 0.8, 0.5) + tanhStep(depth, 13, 20, 1.5);
    expect(pycnoclines(faint)).toHaveLength(1);
    expect(pycnoclines(faint, { ...HOW, prominenceFrac: 0.05 })).toHaveLength(2);
    expect(pycnoclines(faint, { ...HOW, prominenceFrac: 0.05, densityNoiseKgM3: 1 })).toHaveLength(1);
    expect(pycnoclines((depth) => 1000 + 1e-4 * depth)).toEqual([]);
  });

  it("puts even layering in the middle and tells it once", () => {
    const found = pycnoclines((depth) => 1000 + depth / 2);
    expect(found).toHaveLength(1);
    expect(found[0]!.depthM).toBeCloseTo(10, 9);
    expect(found[0]!.thicknessM).toBeCloseTo(14, 9);
  });

  it("may lie at the surface", () => {
    expect(pycnoclines((depth) => 1005 - 5 * Math.exp(-depth))[0]!.depthM).toBe(0);
  });
});

describe("peaks", () => {
  const prominences = (...values: readonly number[]) =>
    peaksOf(Float64Array.from(values)).map((peak) => [peak.peakIndex, peak.prominencePerS2]);

  it("stand above the higher trough that parts them from higher ground, zero beyond the ends", () => {
    expect(prominences(1, 3, 2, 7, 6, 8, 4)).toEqual([
      [1, 1],
      [3, 1],
      [5, 8],
    ]);
    expect(prominences(5, 1, 4)).toEqual([
      [0, 5],
      [2, 3],
    ]);
  });

  it("of one height count once at full prominence, and a flat top at its first place", () => {
    expect(prominences(4, 3, 4)).toEqual([
      [0, 4],
      [2, 1],
    ]);
    expect(prominences(1, 2, 2, 1)).toEqual([[1, 2]]);
    expect(prominences(0, 0, 0)).toEqual([]);
    expect(prominences()).toEqual([]);
  });
});
