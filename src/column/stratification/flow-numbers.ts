import { type Setting, squaredFrequency } from "./buoyancy-profiles.ts";
import { LinearProfile } from "./linear-profile.ts";
import type { FlowNumbers, LayerFlow, TwoLayers, VelocityProfile } from "./stratification.ts";

/**
 * Bulk Richardson number: g drho h / (rho0 dU^2).
 * @param flow upper layer's thickness, and how much lower and upper layer differ in density and velocity
 */
export const bulkRichardson = (
  setting: Setting,
  flow: { readonly rhoStepKgM3: number; readonly thicknessM: number; readonly velocityStepMs: number },
): number =>
  (setting.gravityMs2 * flow.rhoStepKgM3 * flow.thicknessM) / (setting.meanRhoKgM3 * flow.velocityStepMs ** 2);

/** Froude number of a layer, squared: u^2 / (g' h) (Armi 1986). */
export const froudeSquared = (velocityMs: number, reducedGravityMs2: number, thicknessM: number): number =>
  velocityMs ** 2 / (reducedGravityMs2 * thicknessM);

/**
 * Stratification against shear: gradient Richardson numbers between neighbouring velocities (below 1/4 shear can, but need
 * not, overturn the layering: Miles 1961), and the bulk Richardson and Froude numbers of the two layers.
 * @param sorted potential density that does not decrease downward, kg/m3
 * @param layers whose velocities are depth means of those given, held beyond the first and the last
 */
export function flowNumbers(
  velocity: VelocityProfile,
  sorted: LinearProfile,
  layers: TwoLayers | null,
  setting: Setting,
): FlowNumbers {
  const velocities = new LinearProfile(Float64Array.from(velocity.depthM), Float64Array.from(velocity.velocityMs));
  const { depthM: atM, values: speedMs } = velocities;
  const intervals = atM.length - 1;
  const depthM = new Float64Array(intervals);
  const gradientRichardsonRatio = new Float64Array(intervals).fill(Number.NaN);
  for (let k = 0; k < intervals; k++) {
    const [upperM, lowerM] = [atM[k]!, atM[k + 1]!];
    depthM[k] = (upperM + lowerM) / 2;
    const shearPerS = (speedMs[k + 1]! - speedMs[k]!) / (lowerM - upperM);
    if (shearPerS === 0 || lowerM > sorted.bottomDepthM) continue;
    const squaredPerS2 = squaredFrequency(setting, sorted.at(lowerM) - sorted.at(upperM), lowerM - upperM);
    gradientRichardsonRatio[k] = squaredPerS2 / shearPerS ** 2;
  }
  return { depthM, gradientRichardsonRatio, layers: layers && layerFlow(velocities, layers, setting) };
}

function layerFlow(velocities: LinearProfile, layers: TwoLayers, setting: Setting): LayerFlow {
  const { upperThicknessM, lowerThicknessM, means } = layers;
  const upperVelocityMs = velocities.mean(0, upperThicknessM);
  const lowerVelocityMs = velocities.mean(upperThicknessM, upperThicknessM + lowerThicknessM);
  const velocityStepMs = lowerVelocityMs - upperVelocityMs;
  const rhoStepKgM3 = means.lowerRhoKgM3 - means.upperRhoKgM3;
  const upperFroudeSquaredRatio = froudeSquared(upperVelocityMs, means.reducedGravityMs2, upperThicknessM);
  const lowerFroudeSquaredRatio = froudeSquared(lowerVelocityMs, means.reducedGravityMs2, lowerThicknessM);
  return {
    upperVelocityMs,
    lowerVelocityMs,
    bulkRichardsonRatio:
      velocityStepMs === 0
        ? null
        : bulkRichardson(setting, { rhoStepKgM3, thicknessM: upperThicknessM, velocityStepMs }),
    upperFroudeSquaredRatio,
    lowerFroudeSquaredRatio,
    compositeFroudeSquaredRatio: upperFroudeSquaredRatio + lowerFroudeSquaredRatio,
  };
}
