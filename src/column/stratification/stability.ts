import type { Inversion, Stability } from "./stratification.ts";

/**
 * Whether a column is stable as a whole, by potential density: every sample is held against the heaviest above it.
 * @param depthM of the samples, not decreasing
 * @param rhoKgM3 their potential density
 */
export function stabilityOf(depthM: Float64Array, rhoKgM3: Float64Array, densityNoiseKgM3: number): Stability {
  let heaviest = 0;
  let lightest = 0;
  let greatestInversion: Inversion | null = null;
  let unstableM = 0;
  let wasUnstable = false;
  rhoKgM3.forEach((rho, k) => {
    if (rho < rhoKgM3[lightest]!) lightest = k;
    if (rho >= rhoKgM3[heaviest]!) heaviest = k;
    const excessKgM3 = rhoKgM3[heaviest]! - rho;
    if (excessKgM3 > (greatestInversion?.excessKgM3 ?? 0))
      greatestInversion = { heavyDepthM: depthM[heaviest]!, lightDepthM: depthM[k]!, excessKgM3 };
    const isUnstable = excessKgM3 > densityNoiseKgM3;
    // Each sample speaks for the water halfway to its neighbours.
    if (k > 0) unstableM += ((Number(wasUnstable) + Number(isUnstable)) * (depthM[k]! - depthM[k - 1]!)) / 2;
    wasUnstable = isUnstable;
  });
  const rhoRangeKgM3 = rhoKgM3[heaviest]! - rhoKgM3[lightest]!;
  const sampledM = depthM.at(-1)! - depthM[0]!;
  return {
    verdict: verdictOf(rhoRangeKgM3, greatestInversion, densityNoiseKgM3),
    rhoRangeKgM3,
    greatestInversion,
    unstableFrac: sampledM > 0 ? unstableM / sampledM : 0,
  };
}

function verdictOf(
  rhoRangeKgM3: number,
  greatestInversion: Inversion | null,
  densityNoiseKgM3: number,
): Stability["verdict"] {
  if (!(rhoRangeKgM3 > densityNoiseKgM3)) return "neutral";
  return greatestInversion !== null && greatestInversion.excessKgM3 > densityNoiseKgM3 ? "unstable" : "stable";
}
