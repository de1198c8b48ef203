/**
 * The Gibbs function of seawater at one salinity: water part plus saline part, a polynomial in temperature and pressure.
 * Saline part: IAPWS R13-08 (2008), table 2; SA 0 to 42 g/kg, from the freezing point to 40 degC, to 10^4 dbar.
 */
import { SALINITY_SCALE } from "./constants.ts";
import { WATER } from "./gibbs-water.ts";

/**
 * Coefficient (J/kg) of y^j z^k at index 10 j + k, with y = t / 40 degC and z = p / 10^4 dbar. A plain array, because
 * the scalar functions make one per call and a typed array takes several times longer to make than to fill.
 */
export type Isohaline = number[];

/** Fresh water; what salt does not touch keeps these values. */
export const newIsohaline = (): Isohaline => WATER.slice();

/**
 * Fills `m` with the Gibbs function at one salinity.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 */
export function fillGibbs(SA: number, m: Isohaline): Isohaline {
  const x2 = Math.max(SA, 0) / SALINITY_SCALE;
  const x = Math.sqrt(x2);
  const x4 = x2 * x2;
  // x^2 ln(x) goes to 0 with x.
  return fillFromPowers(m, x2 === 0 ? 0 : x2 * Math.log(x), x2, x2 * x, x4, x4 * x, x4 * x2, x4 * x2 * x);
}

/**
 * Fills `m` with the chemical potential of the water in seawater, g - SA dg/dSA, at one salinity. In x, SA d/dSA is
 * (x/2) d/dx: it turns x^i into (i/2) x^i.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 */
export function fillWaterPotential(SA: number, m: Isohaline): Isohaline {
  const x2 = Math.max(SA, 0) / SALINITY_SCALE;
  const x = Math.sqrt(x2);
  const x4 = x2 * x2;
  return fillFromPowers(m, -0.5 * x2, 0, -0.5 * x2 * x, -x4, -1.5 * x4 * x, -2 * x4 * x2, -2.5 * x4 * x2 * x);
}

/** Water part plus the saline coefficients times what stands for x^2 ln(x) and for x^2 to x^7. */
function fillFromPowers(
  m: Isohaline,
  x2lnx: number,
  x2: number,
  x3: number,
  x4: number,
  x5: number,
  x6: number,
  x7: number,
): Isohaline {
  m[0] =
    WATER[0]! +
    5812.81456626732 * x2lnx +
    1416.27648484197 * x2 -
    2432.14662381794 * x3 +
    2025.80115603697 * x4 -
    1091.66841042967 * x5 +
    374.60123787784 * x6 -
    48.5891069025409 * x7;
  m[10] =
    WATER[10]! +
    851.226734946706 * x2lnx +
    168.072408311545 * x2 -
    493.407510141682 * x3 +
    543.835333000098 * x4 -
    196.028306689776 * x5 +
    36.7571622995805 * x6;
  m[20] = WATER[20]! + 880.031352997204 * x2 - 43.0664675978042 * x3 - 68.5572509204491 * x4;
  m[30] = WATER[30]! - 225.267649263401 * x2 - 10.0227370861875 * x3 + 49.3667694856254 * x4;
  m[40] = WATER[40]! + 91.4260447751259 * x2 + 0.875600661808945 * x3 - 17.1397577419788 * x4;
  m[50] = WATER[50]! - 21.6603240875311 * x2 + 2.49697009569508 * x4;
  m[60] = WATER[60]! + 2.13016970847183 * x2;
  m[1] = WATER[1]! - 3310.49154044839 * x2 + 199.459603073901 * x3 - 54.7919133532887 * x4 + 36.0284195611086 * x5;
  m[11] = WATER[11]! + 729.116529735046 * x2 - 175.292041186547 * x3 - 22.6683558512829 * x4;
  m[21] = WATER[21]! - 860.764303783977 * x2 + 383.058066002476 * x3;
  m[31] = WATER[31]! + 694.244814133268 * x2 - 460.319931801257 * x3;
  m[41] = WATER[41]! - 297.728741987187 * x2 + 234.565187611355 * x3;
  m[2] = WATER[2]! + 384.794152978599 * x2 - 52.2940909281335 * x3 - 4.08193978912261 * x4;
  m[12] = WATER[12]! - 343.956902961561 * x2 + 83.1923927801819 * x3;
  m[22] = WATER[22]! + 337.409530269367 * x2 - 54.1917262517112 * x3;
  m[32] = WATER[32]! - 204.889641964903 * x2;
  m[42] = WATER[42]! + 74.726141138756 * x2;
  m[3] = WATER[3]! - 96.5324320107458 * x2 + 68.0444942726459 * x3 - 30.1755111971161 * x4;
  m[13] = WATER[13]! + 124.687671116248 * x2 - 29.483064349429 * x3;
  m[23] = WATER[23]! - 178.314556207638 * x2 + 25.6398487389914 * x3;
  m[33] = WATER[33]! + 113.561697840594 * x2;
  m[43] = WATER[43]! - 36.4872919001588 * x2;
  m[4] = WATER[4]! + 15.8408172766824 * x2 - 3.41251932441282 * x3;
  m[14] = WATER[14]! - 31.656964386073 * x2;
  m[24] = WATER[24]! + 44.2040358308 * x2;
  m[34] = WATER[34]! - 11.1282734326413 * x2;
  m[5] = WATER[5]! - 2.62480156590992 * x2;
  m[15] = WATER[15]! + 7.04658803315449 * x2;
  m[25] = WATER[25]! - 7.92001547211682 * x2;
  return m;
}
