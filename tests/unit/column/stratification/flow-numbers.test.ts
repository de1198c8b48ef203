import { describe, expect, it } from "vitest";
import { flowNumbers } from "../../../../src/column/stratification/flow-numbers.ts";
import { LinearProfile } from "../../../../src/column/stratification/linear-profile.ts";
import { twoLayers } from "../../../../src/column/stratification/two-layers.ts";

const SETTING = { gravityMs2: 9.81, meanRhoKgM3: 1010 };
const even = new LinearProfile(Float64Array.of(0, 10), Float64Array.of(1005, 1015));

describe("numbers of a flow", () => {
  it("has the gradient Richardson number N2 / (du/dz)2, NaN without shear or below the bottom", () => {
    const velocity = { depthM: [1, 3, 7, 12], velocityMs: [0.6, 0.2, 0.2, 0] };
    const { depthM, gradientRichardsonRatio, layers } = flowNumbers(velocity, even, null, SETTING);
    expect(Array.from(depthM)).toEqual([2, 5, 9.5]);
    // N2 = 9.81 / 1010 * 1 kg/m4, shear 0.2 s-1.
    expect(gradientRichardsonRatio[0]).toBeCloseTo(9.81 / 1010 / 0.04, 12);
    expect(gradientRichardsonRatio[1]).toBeNaN();
    expect(gradientRichardsonRatio[2]).toBeNaN();
    expect(layers).toBeNull();
  });

  it("has bulk Richardson and Froude numbers of its two layers, velocities held beyond their ends", () => {
    const density = new LinearProfile(Float64Array.of(0, 6, 6, 10), Float64Array.of(1005, 1005, 1015, 1015));
    const layers = twoLayers(density, 6, { gravityMs2: 9.81, potentialEnergyAnomalyJM3: 117.72 })!;
    const { layers: flow } = flowNumbers({ depthM: [5.99, 6.01], velocityMs: [0.4, -0.1] }, density, layers, SETTING);
    const g = (9.81 * 10) / 1015;
    expect(flow!.upperVelocityMs).toBeCloseTo(0.4, 3);
    expect(flow!.lowerVelocityMs).toBeCloseTo(-0.1, 3);
    expect(flow!.upperFroudeSquaredRatio).toBeCloseTo(flow!.upperVelocityMs ** 2 / (g * 6), 12);
    expect(flow!.lowerFroudeSquaredRatio).toBeCloseTo(flow!.lowerVelocityMs ** 2 / (g * 4), 12);
    expect(flow!.compositeFroudeSquaredRatio).toBe(flow!.upperFroudeSquaredRatio + flow!.lowerFroudeSquaredRatio);
    const stepMs = flow!.upperVelocityMs - flow!.lowerVelocityMs;
    expect(flow!.bulkRichardsonRatio).toBeCloseTo((9.81 * 10 * 6) / (1010 * stepMs ** 2), 9);
  });

  it("has no bulk Richardson number where both layers move alike", () => {
    const layers = twoLayers(even, 5, { gravityMs2: 9.81, potentialEnergyAnomalyJM3: 81.75 });
    const { layers: flow } = flowNumbers({ depthM: [2], velocityMs: [0.3] }, even, layers, SETTING);
    expect(flow!.bulkRichardsonRatio).toBeNull();
    expect(flow!.upperFroudeSquaredRatio).toBeGreaterThan(0);
  });
});
