/**
 * Specific volume of seawater as a polynomial of 75 terms in absolute salinity, conservative temperature and sea
 * pressure, and what follows from the same coefficients: its slopes and its integral over pressure.
 * Roquet, Madec, McDougall & Barker 2015, Ocean Modelling 90, 29-43.
 *
 *   v = sum of Cijk x^i y^j z^k,  x = sqrt((SA + 24 g/kg) / SALINITY_SCALE),  y = CT / 40 degC,  z = p / 10^4 dbar
 *
 * Nested with x inside y inside z. The order of operations is part of the contract: it is what makes the result equal
 * to the reference implementation to the last bit.
 */
import { PA_PER_DBAR, SALINITY_FACTOR } from "./constants.ts";

/** 24 / SALINITY_SCALE as the fit prints it; more digits would change the last bits of v. */
const SALINITY_OFFSET = 0.5971840214030754;
const TEMPERATURE_FACTOR = 0.025;
const PRESSURE_FACTOR = 1e-4;

const C000 = 1.0769995862e-3;
const C100 = -3.1038981976e-4;
const C200 = 6.6928067038e-4;
const C300 = -8.5047933937e-4;
const C400 = 5.8086069943e-4;
const C500 = -2.1092370507e-4;
const C600 = 3.1932457305e-5;
const C010 = -1.5649734675e-5;
const C110 = 3.5009599764e-5;
const C210 = -4.3592678561e-5;
const C310 = 3.4532461828e-5;
const C410 = -1.1959409788e-5;
const C510 = 1.3864594581e-6;
const C020 = 2.7762106484e-5;
const C120 = -3.7435842344e-5;
const C220 = 3.590782276e-5;
const C320 = -1.8698584187e-5;
const C420 = 3.8595339244e-6;
const C030 = -1.6521159259e-5;
const C130 = 2.4141479483e-5;
const C230 = -1.4353633048e-5;
const C330 = 2.2863324556e-6;
const C040 = 6.9111322702e-6;
const C140 = -8.7595873154e-6;
const C240 = 4.3703680598e-6;
const C050 = -8.053961554e-7;
const C150 = -3.30527589e-7;
const C060 = 2.0543094268e-7;
const C001 = -6.0799143809e-5;
const C101 = 2.4262468747e-5;
const C201 = -3.4792460974e-5;
const C301 = 3.7470777305e-5;
const C401 = -1.7322218612e-5;
const C501 = 3.0927427253e-6;
const C011 = 1.8505765429e-5;
const C111 = -9.5677088156e-6;
const C211 = 1.1100834765e-5;
const C311 = -9.8447117844e-6;
const C411 = 2.590922526e-6;
const C021 = -1.1716606853e-5;
const C121 = -2.3678308361e-7;
const C221 = 2.9283346295e-6;
const C321 = -4.88261392e-7;
const C031 = 7.9279656173e-6;
const C131 = -3.4558773655e-6;
const C231 = 3.1655306078e-7;
const C041 = -3.4102187482e-6;
const C141 = 1.2956717783e-6;
const C051 = 5.0736766814e-7;
const C002 = 9.9856169219e-6;
const C102 = -5.8484432984e-7;
const C202 = -4.8122251597e-6;
const C302 = 4.9263106998e-6;
const C402 = -1.7811974727e-6;
const C012 = -1.1736386731e-6;
const C112 = -5.5699154557e-6;
const C212 = 5.4620748834e-6;
const C312 = -1.3544185627e-6;
const C022 = 2.130502874e-6;
const C122 = 3.913738708e-7;
const C222 = -6.5731104067e-7;
const C032 = -4.6132540037e-7;
const C132 = 7.7618888092e-9;
const C042 = -6.3352916514e-8;
const C003 = -1.1309361437e-6;
const C103 = 3.6310188515e-7;
const C203 = 1.674630378e-8;
const C013 = -3.6527006553e-7;
const C113 = -2.7295696237e-7;
const C023 = 2.8695905159e-7;
const C004 = 1.053115308e-7;
const C104 = -1.1147125423e-7;
const C014 = 3.1454099902e-7;
const C005 = -1.2647261286e-8;
const C006 = 1.961350393e-9;

// The coefficient of z^k at (x, y); those of z^5 and z^6 are constants.

function v0(x: number, y: number): number {
  const r0 = C000 + x * (C100 + x * (C200 + x * (C300 + x * (C400 + x * (C500 + x * C600)))));
  const r1 = C010 + x * (C110 + x * (C210 + x * (C310 + x * (C410 + x * C510))));
  const r2 = C020 + x * (C120 + x * (C220 + x * (C320 + x * C420)));
  const r3 = C030 + x * (C130 + x * (C230 + x * C330));
  const r4 = C040 + x * (C140 + x * C240);
  const r5 = C050 + x * C150;
  return r0 + y * (r1 + y * (r2 + y * (r3 + y * (r4 + y * (r5 + y * C060)))));
}

function v1(x: number, y: number): number {
  const r0 = C001 + x * (C101 + x * (C201 + x * (C301 + x * (C401 + x * C501))));
  const r1 = C011 + x * (C111 + x * (C211 + x * (C311 + x * C411)));
  const r2 = C021 + x * (C121 + x * (C221 + x * C321));
  const r3 = C031 + x * (C131 + x * C231);
  const r4 = C041 + x * C141;
  return r0 + y * (r1 + y * (r2 + y * (r3 + y * (r4 + y * C051))));
}

function v2(x: number, y: number): number {
  const r0 = C002 + x * (C102 + x * (C202 + x * (C302 + x * C402)));
  const r1 = C012 + x * (C112 + x * (C212 + x * C312));
  const r2 = C022 + x * (C122 + x * C222);
  const r3 = C032 + x * C132;
  return r0 + y * (r1 + y * (r2 + y * (r3 + y * C042)));
}

function v3(x: number, y: number): number {
  const r0 = C003 + x * (C103 + x * C203);
  const r1 = C013 + x * C113;
  return r0 + y * (r1 + y * C023);
}

const v4 = (x: number, y: number): number => C004 + x * C104 + y * C014;

/** Root salinity x. Salinity below zero is sensor noise at the fresh end and counts as zero. */
const rootSalinity = (SA: number): number => Math.sqrt(SALINITY_FACTOR * Math.max(SA, 0) + SALINITY_OFFSET);

/**
 * Specific volume.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns specific volume, m3/kg; NaN in, NaN out
 * @see Roquet et al. 2015
 * @example specificVolume(32, 10, 100) // 9.756515980668401e-4
 */
export function specificVolume(SA: number, CT: number, p: number): number {
  const x = rootSalinity(SA);
  const y = TEMPERATURE_FACTOR * CT;
  const z = PRESSURE_FACTOR * p;
  return v0(x, y) + z * (v1(x, y) + z * (v2(x, y) + z * (v3(x, y) + z * (v4(x, y) + z * (C005 + z * C006)))));
}

/**
 * Enthalpy gained from sea pressure 0 to p at constant SA and CT: the integral of specific volume over pressure.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns enthalpy difference, J/kg; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, appendix A.30; Roquet et al. 2015
 */
export function dynamicEnthalpy(SA: number, CT: number, p: number): number {
  const x = rootSalinity(SA);
  const y = TEMPERATURE_FACTOR * CT;
  const z = PRESSURE_FACTOR * p;
  const deep = v3(x, y) / 4 + z * (v4(x, y) / 5 + z * (C005 / 6 + z * (C006 / 7)));
  return PA_PER_DBAR * p * (v0(x, y) + z * (v1(x, y) / 2 + z * (v2(x, y) / 3 + z * deep)));
}

/**
 * Slope of specific volume with pressure at constant SA and CT (adiabatic, isohaline).
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns m3/(kg Pa), negative; NaN in, NaN out
 */
export function specificVolumePressureSlope(SA: number, CT: number, p: number): number {
  const x = rootSalinity(SA);
  const y = TEMPERATURE_FACTOR * CT;
  const z = PRESSURE_FACTOR * p;
  const vz = v1(x, y) + z * (2 * v2(x, y) + z * (3 * v3(x, y) + z * (4 * v4(x, y) + z * (5 * C005 + z * (6 * C006)))));
  return (vz * PRESSURE_FACTOR) / PA_PER_DBAR;
}

/** Specific volume (m3/kg) with its slopes per degC of conservative temperature and per g/kg of absolute salinity. */
export interface SpecificVolumeSlopes {
  readonly v: number;
  readonly perTemperature: number;
  readonly perSalinity: number;
}

/**
 * Specific volume and its slopes at constant pressure, together: the polynomial is first collapsed at z, then one pass
 * over x and y gives the value and both slopes.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 */
export function specificVolumeSlopes(SA: number, CT: number, p: number): SpecificVolumeSlopes {
  const x = rootSalinity(SA);
  const y = TEMPERATURE_FACTOR * CT;
  const z = PRESSURE_FACTOR * p;

  const c00 = C000 + z * (C001 + z * (C002 + z * (C003 + z * (C004 + z * (C005 + z * C006)))));
  const c10 = C100 + z * (C101 + z * (C102 + z * (C103 + z * C104)));
  const c20 = C200 + z * (C201 + z * (C202 + z * C203));
  const c30 = C300 + z * (C301 + z * C302);
  const c40 = C400 + z * (C401 + z * C402);
  const c50 = C500 + z * C501;
  const c01 = C010 + z * (C011 + z * (C012 + z * (C013 + z * C014)));
  const c11 = C110 + z * (C111 + z * (C112 + z * C113));
  const c21 = C210 + z * (C211 + z * C212);
  const c31 = C310 + z * (C311 + z * C312);
  const c41 = C410 + z * C411;
  const c02 = C020 + z * (C021 + z * (C022 + z * C023));
  const c12 = C120 + z * (C121 + z * C122);
  const c22 = C220 + z * (C221 + z * C222);
  const c32 = C320 + z * C321;
  const c03 = C030 + z * (C031 + z * C032);
  const c13 = C130 + z * (C131 + z * C132);
  const c23 = C230 + z * C231;
  const c04 = C040 + z * (C041 + z * C042);
  const c14 = C140 + z * C141;
  const c05 = C050 + z * C051;

  const r0 = c00 + x * (c10 + x * (c20 + x * (c30 + x * (c40 + x * (c50 + x * C600)))));
  const r1 = c01 + x * (c11 + x * (c21 + x * (c31 + x * (c41 + x * C510))));
  const r2 = c02 + x * (c12 + x * (c22 + x * (c32 + x * C420)));
  const r3 = c03 + x * (c13 + x * (c23 + x * C330));
  const r4 = c04 + x * (c14 + x * C240);
  const r5 = c05 + x * C150;

  const d0 = c10 + x * (2 * c20 + x * (3 * c30 + x * (4 * c40 + x * (5 * c50 + x * (6 * C600)))));
  const d1 = c11 + x * (2 * c21 + x * (3 * c31 + x * (4 * c41 + x * (5 * C510))));
  const d2 = c12 + x * (2 * c22 + x * (3 * c32 + x * (4 * C420)));
  const d3 = c13 + x * (2 * c23 + x * (3 * C330));
  const d4 = c14 + x * (2 * C240);

  const v = r0 + y * (r1 + y * (r2 + y * (r3 + y * (r4 + y * (r5 + y * C060)))));
  const vx = d0 + y * (d1 + y * (d2 + y * (d3 + y * (d4 + y * C150))));
  const vy = r1 + y * (2 * r2 + y * (3 * r3 + y * (4 * r4 + y * (5 * r5 + y * (6 * C060)))));

  return { v, perTemperature: TEMPERATURE_FACTOR * vy, perSalinity: (SALINITY_FACTOR * vx) / (2 * x) };
}
