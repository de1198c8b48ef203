import type { Setting } from "./buoyancy-profiles.ts";
import type { LinearProfile } from "./linear-profile.ts";
import type { VerticalModes } from "./stratification.ts";

/** Slower waves take hours to a metre: what drives them is rounding, not layering. */
const SLOWEST_MS = 1e-4;

/** A speed is known when its bounds are this close to each other, relative. */
const CLOSE_FRAC = 1e-13;

/** Rotation of the Earth against the stars, rad/s (Geodetic Reference System 1980, Moritz 2000). */
const EARTH_ROTATION_RAD_S = 7.292115e-5;

/**
 * Speeds of the internal long waves of a continuously layered column, m/s, first mode first: W'' + (N^2 / c^2) W = 0 with
 * W = 0 at the surface (held flat) and at the bed (Gill 1982, sec. 6.11; from memory). Constant N: c = N H / (n pi).
 *
 * Density that is linear between depths makes N constant there, where W is a sine (Pruess 1973), and a jump of density
 * breaks the slope of W: so W is followed down the column exactly, for any c. Mode n is the greatest c that gives W a
 * zero at the bed with n - 1 above it (Sturm); it is found by halving the range that the number of zeros leaves.
 * @param sorted potential density that does not decrease downward, kg/m3, from surface to bed
 * @returns no more than `modeCount`; fewer where the next is slower than 0.1 mm/s, as below a single jump
 */
export function modeSpeeds(sorted: LinearProfile, setting: Setting, modeCount: number): Float64Array {
  const weightMs2 = setting.gravityMs2 / setting.meanRhoKgM3;
  const gainKgM3 = sorted.values.at(-1)! - sorted.values[0]!;
  // No column has a faster wave than the one whose whole gain in density lies halfway down.
  const greatestMs = Math.sqrt(weightMs2 * gainKgM3 * sorted.bottomDepthM) / 2;
  const speeds: number[] = [];
  for (let mode = 0; mode < modeCount; mode++) {
    if (zeroCount(sorted, weightMs2, SLOWEST_MS) <= mode) break;
    let slow = SLOWEST_MS;
    let fast = greatestMs * (1 + CLOSE_FRAC);
    while (fast - slow > CLOSE_FRAC * fast) {
      const middle = (slow + fast) / 2;
      if (zeroCount(sorted, weightMs2, middle) > mode) slow = middle;
      else fast = middle;
    }
    speeds.push(slow);
  }
  return Float64Array.from(speeds);
}

/**
 * Zeros of W below the surface, the bed included, for waves of one speed: as many modes are as fast or faster.
 * @param weightMs2 gravity over mean density, for densities in kg/m3
 */
function zeroCount({ depthM, values }: LinearProfile, weightMs2: number, speedMs: number): number {
  let count = 0;
  let w = 0;
  let slope = 1;
  for (let i = 1; i < depthM.length; i++) {
    const thicknessM = depthM[i]! - depthM[i - 1]!;
    const bend = (weightMs2 * (values[i]! - values[i - 1]!)) / speedMs ** 2;
    if (thicknessM === 0) {
      slope -= bend * w;
    } else if (bend === 0) {
      const next = w + slope * thicknessM;
      if (next * w < 0) count++;
      w = next;
    } else {
      const wavenumber = Math.sqrt(bend / thicknessM);
      const phase = Math.atan2(wavenumber * w, slope);
      const turned = wavenumber * thicknessM;
      count += Math.floor((phase + turned) / Math.PI) - Math.floor(phase / Math.PI);
      const next = w * Math.cos(turned) + (slope / wavenumber) * Math.sin(turned);
      slope = slope * Math.cos(turned) - wavenumber * w * Math.sin(turned);
      w = next;
    }
    // Only the ratio counts; both would grow without bound otherwise.
    const size = Math.max(Math.abs(w), Math.abs(slope));
    w /= size;
    slope /= size;
  }
  return count;
}

/** Speed over the Coriolis parameter, m; null without a latitude and at the equator, where it has no bound. */
export function deformationRadiusM(speedMs: number, latitudeDeg: number | null): number | null {
  if (latitudeDeg === null || latitudeDeg === 0) return null;
  return speedMs / (2 * EARTH_ROTATION_RAD_S * Math.abs(Math.sin((latitudeDeg * Math.PI) / 180)));
}

/** The modes of a column; null where it has none. */
export function verticalModes(
  sorted: LinearProfile,
  setting: Setting,
  wanted: { readonly modeCount: number; readonly latitudeDeg: number | null },
): VerticalModes | null {
  const speedMs = modeSpeeds(sorted, setting, wanted.modeCount);
  if (speedMs.length === 0) return null;
  return { speedMs, deformationRadiusM: deformationRadiusM(speedMs[0]!, wanted.latitudeDeg) };
}
