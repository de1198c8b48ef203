import type { LinearProfile } from "./linear-profile.ts";

/**
 * Potential energy anomaly, J/m3: the work per volume that it takes to mix the column, (g/H) times the integral of depth
 * times (density less its depth mean) (Simpson 1981; Simpson et al. 1990). Two layers: g drho h1 h2 / (2 H); a
 * constant gradient: g drho H / 12. Exact for density that is linear between depths; negative where mixing would set
 * energy free.
 * @param density potential density, so that the water's own compression counts for nothing; kg/m3, from the water surface down
 */
export function potentialEnergyAnomaly(density: LinearProfile, gravityMs2: number): number {
  const { depthM, values, bottomDepthM } = density;
  // Densities less the first: the integral of a difference keeps its digits.
  const excess = values.map((value) => value - values[0]!);
  let moment = 0;
  for (let k = 1; k < depthM.length; k++) {
    const [z0, z1] = [depthM[k - 1]!, depthM[k]!];
    const [r0, r1] = [excess[k - 1]!, excess[k]!];
    moment += ((z1 - z0) * (2 * z0 * r0 + z0 * r1 + z1 * r0 + 2 * z1 * r1)) / 6;
  }
  const uniformMoment = (density.meanExcess(0, bottomDepthM) * bottomDepthM ** 2) / 2;
  return (gravityMs2 * (moment - uniformMoment)) / bottomDepthM;
}
