import { describe, expect, test } from "vitest";
import * as teos from "../../../src/gsw-ts-port/index.ts";

/** Every kernel, with inputs for which it gives a number. */
const kernels: Readonly<Record<string, readonly [kernel: (...inputs: number[]) => number, inputs: readonly number[]]>> =
  {
    practicalSalinityFromConductivity: [teos.practicalSalinityFromConductivity, [30, 10, 5]],
    "practicalSalinityFromConductivity, fresh": [teos.practicalSalinityFromConductivity, [0.4, 10, 5]],
    practicalSalinityFromRatio: [teos.practicalSalinityFromRatio, [0.8, 10, 5]],
    practicalSalinityFromSurfaceRatio: [teos.practicalSalinityFromSurfaceRatio, [0.8, 10]],
    conductivityFromPracticalSalinity: [teos.conductivityFromPracticalSalinity, [30, 10, 5]],
    "conductivityFromPracticalSalinity, fresh": [teos.conductivityFromPracticalSalinity, [0.4, 10, 5]],
    referenceSalinity: [teos.referenceSalinity, [30]],
    practicalSalinityFromReference: [teos.practicalSalinityFromReference, [30]],
    balticSalinity: [teos.balticSalinity, [7]],
    conservativeTemperature: [teos.conservativeTemperature, [30, 10, 5]],
    conservativeTemperatureFromPotential: [teos.conservativeTemperatureFromPotential, [30, 10]],
    potentialTemperatureFromConservative: [teos.potentialTemperatureFromConservative, [30, 10]],
    inSituTemperature: [teos.inSituTemperature, [30, 10, 5]],
    potentialTemperature: [teos.potentialTemperature, [30, 10, 5, 100]],
    specificVolume: [teos.specificVolume, [30, 10, 5]],
    dynamicEnthalpy: [teos.dynamicEnthalpy, [30, 10, 5]],
    density: [teos.density, [30, 10, 5]],
    potentialDensityAnomaly: [teos.potentialDensityAnomaly, [30, 10]],
    thermalExpansion: [teos.thermalExpansion, [30, 10, 5]],
    halineContraction: [teos.halineContraction, [30, 10, 5]],
    compressibility: [teos.compressibility, [30, 10, 5]],
    soundSpeed: [teos.soundSpeed, [30, 10, 5]],
    exactDensity: [teos.exactDensity, [30, 10, 5]],
    exactSoundSpeed: [teos.exactSoundSpeed, [30, 10, 5]],
    freezingTemperature: [teos.freezingTemperature, [30, 5]],
    surfaceGravity: [teos.surfaceGravity, [45]],
    gravity: [teos.gravity, [45, 5]],
    gravityAtDepth: [teos.gravityAtDepth, [45, 5]],
    standardOceanHeight: [teos.standardOceanHeight, [5, 45]],
    standardOceanPressure: [teos.standardOceanPressure, [-5, 45]],
  };

describe("a missing input", () => {
  test.each(Object.entries(kernels))("makes %s missing", (_, [kernel, inputs]) => {
    expect(Number.isFinite(kernel(...inputs))).toBe(true);
    for (const k of inputs.keys()) expect(kernel(...inputs.with(k, Number.NaN)), `input ${k}`).toBeNaN();
  });
});
