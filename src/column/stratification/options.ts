import { ToolError } from "../../base/index.ts";
import type { StratificationOptions, VelocityProfile } from "./stratification.ts";

export const defaultStratificationOptions: StratificationOptions = {
  // An estuary's mixed layer is hours old and fresh within tenths of a kg/m3 (the ocean's 0.03 is met by noise there).
  // For a lake 0.5 degC serves better: around 4 degC half a degree weighs nothing, yet still tells old water from new.
  mixedLayerThreshold: { quantity: "density", stepKgM3: 0.1 },
  // What bounds a lake's metalimnion, by custom.
  mixedLayerGradientKgM3PerM: 0.1,
  // Averages four samples of a probe read every 0.25 m; a halocline of some metres is left as it is.
  smoothingLengthM: 1,
  // Lets a seasonal thermocline stand beside a halocline, and steps of the record not.
  prominenceFrac: 0.2,
  modeCount: 3,
  // Temperature read to 0.1 degC in warm water makes 0.026; quality control calls an inversion suspect above the same.
  densityNoiseKgM3: 0.03,
  velocity: null,
};

/** The options given, checked, over the defaults. Throws a DomainError or ShapeError for options without a meaning. */
export function completeOptions(given: Partial<StratificationOptions>): StratificationOptions {
  const options = { ...defaultStratificationOptions, ...given };
  const { mixedLayerThreshold: threshold } = options;
  requirePositive("mixedLayerThreshold", threshold.quantity === "density" ? threshold.stepKgM3 : threshold.stepC);
  requirePositive("mixedLayerGradientKgM3PerM", options.mixedLayerGradientKgM3PerM);
  requirePositive("smoothingLengthM", options.smoothingLengthM);
  requirePositive("densityNoiseKgM3", options.densityNoiseKgM3);
  if (!(options.prominenceFrac >= 0 && options.prominenceFrac <= 1))
    throw new ToolError("DomainError", `prominenceFrac is ${options.prominenceFrac}, expected 0 to 1`);
  if (!(Number.isInteger(options.modeCount) && options.modeCount >= 0))
    throw new ToolError("DomainError", `modeCount is ${options.modeCount}, expected a whole number from 0 up`);
  if (options.velocity) requireVelocities(options.velocity);
  return options;
}

function requirePositive(name: string, values: number): void {
  if (!(values > 0 && Number.isFinite(values)))
    throw new ToolError("DomainError", `${name} is ${values}, expected a number above 0`);
}

function requireVelocities({ depthM, velocityMs }: VelocityProfile): void {
  if (depthM.length !== velocityMs.length)
    throw new ToolError(
      "ShapeError",
      `velocityMs has ${velocityMs.length} values, expected ${depthM.length} as in depthM`,
    );
  if (depthM.length === 0) throw new ToolError("ShapeError", "velocity has no values, expected one or more");
  for (let i = 0; i < depthM.length; i++) {
    if (!Number.isFinite(velocityMs[i]!))
      throw new ToolError(
        "DomainError",
        `velocity ${i + 1} is ${velocityMs[i]}, expected m/s; leave it out if unknown`,
      );
    if (!(depthM[i]! >= 0 && (i === 0 || depthM[i]! > depthM[i - 1]!)))
      throw new ToolError(
        "DomainError",
        `depth ${i + 1} of the velocities is ${depthM[i]} m, expected depths that increase from 0`,
      );
  }
}
