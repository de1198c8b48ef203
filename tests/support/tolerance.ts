import { expect } from "vitest";

/** A result agrees when it is within absolute + relative * |expected|. */
export interface Tolerance {
  readonly absolute?: number;
  readonly relative?: number;
  readonly reason: string;
}

/** How closely results must agree with the reference, by quantity. */
export const TOLERANCE = {
  salinity: {
    absolute: 1e-9,
    reason: "far below what PSS-78 defines (1e-4); leaves room for another order of operations",
  },
  absoluteSalinity: { relative: 1e-14, reason: "a product of two numbers" },
  conductivity: {
    absolute: 1e-9,
    relative: 1e-10,
    reason: "the reference inverts the scale to about 1e-11, relative, in pure water",
  },
  temperature: {
    absolute: 1e-11,
    relative: 1e-12,
    reason: "same Gibbs function, converged Newton steps on both sides",
  },
  exactDensity: { relative: 1e-9, reason: "same Gibbs function; only rounding may differ" },
  densityAnomaly: { absolute: 1e-9, reason: "density less 1000 keeps density's absolute error" },
  slope: { relative: 1e-11, reason: "same polynomial, differentiated in another order" },
  soundSpeed: { relative: 1e-11, reason: "same polynomial, differentiated in another order" },
  expansion: {
    absolute: 1e-17,
    relative: 1e-11,
    reason: "passes through zero at the temperature of maximum density, where only the absolute part holds",
  },
  freezing: { absolute: 1e-9, reason: "both sides solve the same equilibrium, and converge" },
  height: { absolute: 1e-8, reason: "the reference rounds its enthalpy coefficients to 11 digits: 4e-13, relative" },
  gravity: { relative: 1e-13, reason: "a short closed form" },
  twoWaterFormulations: {
    absolute: 5e-5,
    reason: "IAPWS SR7-09 fits IAPWS-95 to 4e-5 kg/m3 at 0 to 35 degC and 2 MPa",
  },
  twoWaterSoundSpeeds: { absolute: 0.03, reason: "IAPWS SR7-09 fits IAPWS-95 to 0.018 m/s at 0 to 35 degC and 2 MPa" },
} as const satisfies Record<string, Tolerance>;

/** Fails unless actual agrees with expected; NaN agrees with NaN alone. */
export function expectWithin(actual: number, expected: number, tolerance: Tolerance, what: string): void {
  const allowed = (tolerance.absolute ?? 0) + (tolerance.relative ?? 0) * Math.abs(expected);
  const agrees = Number.isNaN(expected) ? Number.isNaN(actual) : Math.abs(actual - expected) <= allowed;
  expect(agrees, `${what}: ${actual}, expected ${expected} within ${allowed} (${tolerance.reason})`).toBe(true);
}
