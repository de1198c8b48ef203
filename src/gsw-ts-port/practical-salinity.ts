import { IPTS68_PER_ITS90, STANDARD_CONDUCTIVITY_MS_CM } from "./constants.ts";
import { rootRatioAt, salinityAt, temperatureFactor } from "./practical-salinity-scale.ts";

/** Conductivity of SP 35 at sea pressure 0 and t68 (degC), over that at 15 degC. */
const standardRatio = (t68: number): number =>
  0.6766097 + t68 * (2.00564e-2 + t68 * (1.104259e-4 + t68 * (-6.9698e-7 + t68 * 1.0031e-9)));

// Pressure raises the ratio R by the factor 1 + pressureTerm / (divisorAtZero + divisorSlope R).
const pressureTerm = (p: number): number => p * (2.07e-5 + p * (-6.37e-10 + p * 3.989e-15));
const divisorAtZero = (t68: number): number => 1 + t68 * (3.426e-2 + t68 * 4.464e-4);
const divisorSlope = (t68: number): number => 4.215e-1 - 3.107e-3 * t68;

/**
 * Practical salinity from the ratio of conductivities at one temperature and sea pressure 0.
 *
 * @param Rt conductivity of the sample over that of SP 35 at the same temperature, dimensionless
 * @param t68 temperature, degC (IPTS-68)
 * @returns practical salinity, dimensionless; below SP 2 the rescaled continuation of Hill et al. (1986); NaN in or a
 *   negative ratio, NaN out
 * @see UNESCO 1981, Technical Papers in Marine Science 37
 * @example practicalSalinityFromSurfaceRatio(1.0568875, 20) // 37.245628
 */
export const practicalSalinityFromSurfaceRatio = (Rt: number, t68: number): number =>
  salinityAt(Math.sqrt(Rt), temperatureFactor(t68));

/**
 * Practical salinity from a conductivity ratio in situ.
 *
 * @param R conductivity over that of SP 35 at 15 degC (IPTS-68) and sea pressure 0, dimensionless
 * @param t68 temperature, degC (IPTS-68)
 * @param p sea pressure, dbar
 * @returns practical salinity, dimensionless; NaN in or a negative ratio, NaN out
 * @see UNESCO 1981; Fofonoff & Millard 1983, eqs 1-4
 * @example practicalSalinityFromRatio(1.2, 20, 2000) // 37.245628
 */
export function practicalSalinityFromRatio(R: number, t68: number, p: number): number {
  const pressureFactor = 1 + pressureTerm(p) / (divisorAtZero(t68) + divisorSlope(t68) * R);
  return practicalSalinityFromSurfaceRatio(R / (pressureFactor * standardRatio(t68)), t68);
}

/**
 * Practical salinity from conductivity.
 *
 * @param C conductivity, mS/cm
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns practical salinity, dimensionless; 0 where conductivity all but vanishes (below 0.002 mS/cm); NaN in or a
 *   negative conductivity, NaN out
 * @see UNESCO 1981; below SP 2 Hill, Dauphinee & Woods 1986, rescaled to meet the scale at 2
 * @example practicalSalinityFromConductivity(34.5487, 28.7856, 10) // 20.0098695991
 */
export const practicalSalinityFromConductivity = (C: number, t: number, p: number): number =>
  practicalSalinityFromRatio(C / STANDARD_CONDUCTIVITY_MS_CM, IPTS68_PER_ITS90 * t, p);

/**
 * Conductivity from practical salinity: the inverse of practicalSalinityFromConductivity, to a round trip of 1e-12.
 *
 * @param SP practical salinity, dimensionless, from 0
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns conductivity, mS/cm; NaN in or a negative salinity, NaN out
 * @example conductivityFromPracticalSalinity(35, 25, 0) // 53.0710320487
 */
export function conductivityFromPracticalSalinity(SP: number, t: number, p: number): number {
  const t68 = IPTS68_PER_ITS90 * t;
  const q = rootRatioAt(SP, temperatureFactor(t68));
  const surfaceRatio = q * q * standardRatio(t68);
  // R = surfaceRatio (1 + pressureTerm / (zero + slope R)) is a quadratic; its positive root, without cancellation.
  const zero = divisorAtZero(t68);
  const slope = divisorSlope(t68);
  const product = surfaceRatio * (zero + pressureTerm(p));
  const half = 0.5 * (zero - slope * surfaceRatio);
  const R = product / (half + Math.sqrt(half * half + slope * product));
  return R * STANDARD_CONDUCTIVITY_MS_CM;
}

/** Practical salinity of n samples of C (mS/cm), t (degC, in situ) and p (dbar); `out` may be one of the inputs. */
export function practicalSalinityFromConductivityInto(
  C: Float64Array,
  t: Float64Array,
  p: Float64Array,
  out: Float64Array,
): Float64Array {
  for (let i = 0; i < out.length; i++) out[i] = practicalSalinityFromConductivity(C[i]!, t[i]!, p[i]!);
  return out;
}
