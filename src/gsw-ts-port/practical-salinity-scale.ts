/**
 * The Practical Salinity Scale 1978 as a function of q = sqrt(Rt), where Rt is the conductivity of the sample over that
 * of SP 35 at the same temperature and sea pressure 0; and its continuation to fresh water.
 * UNESCO Technical Papers in Marine Science 37 (1981); Hill, Dauphinee & Woods 1986, IEEE J. Oceanic Eng. 11, 109-112.
 */
import { newton } from "./newton.ts";

const A0 = 0.008;
const A1 = -0.1692;
const A2 = 25.3851;
const A3 = 14.0941;
const A4 = -7.0261;
const A5 = 2.7081;

const B0 = 0.0005;
const B1 = -0.0056;
const B2 = -0.0066;
const B3 = -0.0375;
const B4 = 0.0636;
const B5 = -0.0144;

/** The scale proper ends here; below, the continuation takes over. */
const LOWEST_SALINITY = 2;

/** In q; leaves an error below rounding. */
const LAST_STEP = 1e-9;

/** Temperature factor of the scale's second polynomial; t68 in degC. Zero at 15 degC. */
export const temperatureFactor = (t68: number): number => (t68 - 15) / (1 + 0.0162 * (t68 - 15));

const scale = (q: number, f: number): number =>
  A0 +
  q * (A1 + q * (A2 + q * (A3 + q * (A4 + q * A5)))) +
  f * (B0 + q * (B1 + q * (B2 + q * (B3 + q * (B4 + q * B5)))));

const scaleSlope = (q: number, f: number): number =>
  A1 +
  q * (2 * A2 + q * (3 * A3 + q * (4 * A4 + q * (5 * A5)))) +
  f * (B1 + q * (2 * B2 + q * (3 * B3 + q * (4 * B4 + q * (5 * B5)))));

/** The continuation of Hill et al. as published: it takes the scale's value at zero conductivity off, smoothly. */
export function hillSalinity(q: number, f: number): number {
  const x = 400 * q * q;
  return scale(q, f) - A0 / (1 + x * (1.5 + x)) - (B0 * f) / (1 + q * (10 + q * (100 + q * 1000)));
}

function hillSlope(q: number, f: number): number {
  const x = 400 * q * q;
  const divisorA = 1 + x * (1.5 + x);
  const divisorB = 1 + q * (10 + q * (100 + q * 1000));
  return (
    scaleSlope(q, f) +
    (A0 * (1.5 + 2 * x) * 800 * q) / (divisorA * divisorA) +
    (B0 * f * (10 + q * (200 + q * 3000))) / (divisorB * divisorB)
  );
}

/** Root q of S(q, f) = salinity. The start keeps clear of the dip of the continuation below q = 0.006. */
function solve(
  S: (q: number, f: number) => number,
  slope: (q: number, f: number) => number,
  salinity: number,
  f: number,
): number {
  return newton(0.006 + Math.sqrt(salinity / 35), LAST_STEP, (q) => (S(q, f) - salinity) / slope(q, f));
}

/** Factor on the continuation that makes it meet the scale at SP 2, at any temperature. IOC et al. 2010, appendix E. */
const joiningFactor = (f: number): number =>
  LOWEST_SALINITY / hillSalinity(solve(scale, scaleSlope, LOWEST_SALINITY, f), f);

/** Practical salinity at q: the scale, and below SP 2 the continuation rescaled to meet it. */
export function salinityAt(q: number, f: number): number {
  const salinity = scale(q, f);
  if (!(salinity < LOWEST_SALINITY)) return salinity;
  // The continuation dips to -0.0003 where conductivity all but vanishes (below 0.002 mS/cm).
  return Math.max(0, joiningFactor(f) * hillSalinity(q, f));
}

/** The inverse of salinityAt. */
export const rootRatioAt = (salinity: number, f: number): number =>
  salinity < LOWEST_SALINITY
    ? solve(hillSalinity, hillSlope, salinity / joiningFactor(f), f)
    : solve(scale, scaleSlope, salinity, f);
