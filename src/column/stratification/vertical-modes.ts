import { type Setting, squaredFrequency } from "./buoyancy-profiles.ts";
import type { LinearProfile } from "./linear-profile.ts";
import type { VerticalModes } from "./stratification.ts";

const COARSE_COUNT = 256;
const FINE_COUNT = 2 * COARSE_COUNT;

/** Weaker buoyancy frequencies squared, s-2, belong to mixed water: they are rounding, or periods above 17 hours. */
const MIXED_PER_S2 = 1e-8;

/** A mode whose speed differs by more than this share between both grids is made by the grid. */
const UNRESOLVED_FRAC = 0.02;

/** Halvings that take a speed to the last digit of the greatest one possible. */
const HALVINGS_COUNT = 54;

/** Rotation of the Earth against the stars, rad/s (Geodetic Reference System 1980, Moritz 2000). */
const EARTH_ROTATION_RAD_S = 7.292115e-5;

/**
 * Speeds of the internal long waves of a continuously layered column, m/s, first mode first: W'' + (N^2 / c^2) W = 0 with
 * W = 0 at the surface (held flat) and at the bed (Gill 1982, sec. 6.11; from memory). Constant N: c = N H / (n pi).
 *
 * By finite elements of even thickness with the mass lumped, which makes N^2 at each joint the difference of the mean
 * densities of the elements above and below, so that a jump of density weighs in full wherever it lies. The error falls
 * with the square of the thickness; the speeds of two grids are carried on to none (Richardson).
 * @param sorted potential density that does not decrease downward, kg/m3, from surface to bed
 * @returns no more than `modeCount`; fewer where the grids cannot tell any more from mixed water or a jump
 */
export function modeSpeeds(sorted: LinearProfile, setting: Setting, modeCount: number): Float64Array {
  const gainKgM3 = sorted.values.at(-1)! - sorted.values[0]!;
  const depthM = sorted.bottomDepthM;
  // No column has a faster wave than the one whose whole gain in density lies halfway down.
  const greatestMs = Math.sqrt(squaredFrequency(setting, gainKgM3, depthM)) * (depthM / 2);
  const coarse = jointFrequencies(sorted, setting, COARSE_COUNT);
  const fine = jointFrequencies(sorted, setting, FINE_COUNT);
  const speeds: number[] = [];
  for (let mode = 0; mode < modeCount; mode++) {
    const coarseMs = speedOfMode(mode, coarse, depthM / COARSE_COUNT, greatestMs);
    const fineMs = speedOfMode(mode, fine, depthM / FINE_COUNT, greatestMs);
    if (!(coarseMs > 0 && Math.abs(fineMs - coarseMs) < UNRESOLVED_FRAC * fineMs)) break;
    speeds.push((4 * fineMs - coarseMs) / 3);
  }
  return Float64Array.from(speeds);
}

/** Buoyancy frequency squared at the joints of elements of even thickness. */
function jointFrequencies(sorted: LinearProfile, setting: Setting, elementCount: number): Float64Array {
  const thicknessM = sorted.bottomDepthM / elementCount;
  const meanRho = (elementIndex: number): number =>
    sorted.meanExcess(elementIndex * thicknessM, (elementIndex + 1) * thicknessM);
  return Float64Array.from({ length: elementCount - 1 }, (_, i) => {
    const squaredPerS2 = squaredFrequency(setting, meanRho(i + 1) - meanRho(i), thicknessM);
    return squaredPerS2 > MIXED_PER_S2 ? squaredPerS2 : 0;
  });
}

/** By bisection between zero and the greatest speed: mode k (from 0) is faster than a speed that more than k modes exceed. */
function speedOfMode(modeIndex: number, squaredPerS2: Float64Array, thicknessM: number, greatestMs: number): number {
  let slow = 0;
  let fast = greatestMs * (1 + 1e-9);
  for (let halving = 0; halving < HALVINGS_COUNT; halving++) {
    const middle = (slow + fast) / 2;
    if (fasterModeCount(squaredPerS2, thicknessM, middle) > modeIndex) slow = middle;
    else fast = middle;
  }
  return slow;
}

/**
 * How many modes are faster than a speed: the negative pivots of the tridiagonal matrix 2 - (N h / c)^2, -1 (Sturm).
 * Joints in mixed water (N = 0) do no harm here.
 */
function fasterModeCount(squaredPerS2: Float64Array, thicknessM: number, speedMs: number): number {
  const weight = (thicknessM / speedMs) ** 2;
  let count = 0;
  let pivot = Number.POSITIVE_INFINITY;
  for (let i = 0; i < squaredPerS2.length; i++) {
    pivot = 2 - weight * squaredPerS2[i]! - 1 / pivot;
    if (pivot < 0) count++;
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
