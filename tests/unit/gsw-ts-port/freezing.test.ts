import { describe, expect, test } from "vitest";
import { iceGibbs } from "../../../src/gsw-ts-port/ice.ts";
import { conservativeTemperature, freezingTemperature, isWithinRange } from "../../../src/gsw-ts-port/index.ts";

describe("ice", () => {
  // IAPWS R10-06 (2009), table 6: the triple point, the melting point at one atmosphere, and 100 K at 100 MPa.
  test.each([
    [273.16, 611.657, 0.611784135, 0.12206943394e4],
    [273.152519, 101325, 0.10134274069e3, 0.1220769325496e4],
    [100, 100e6, -0.222296513088e6, 0.261195122589e4],
  ])("has the Gibbs energy and its slope of the release at %d K, %d Pa", (temperatureK, pressurePa, g, perKelvin) => {
    const ice = iceGibbs(temperatureK, pressurePa - 101325);
    expect(Math.abs(ice.g - g)).toBeLessThan(1e-6 + 1e-9 * Math.abs(g));
    expect(Math.abs(ice.perKelvin / perKelvin - 1)).toBeLessThan(1e-9);
  });
});

describe("the freezing temperature", () => {
  test("of air-free water is that of the melting point at one atmosphere, 273.152519 K (IAPWS R10-06, table 6)", () => {
    expect(Math.abs(freezingTemperature(0, 0) - 0.002519)).toBeLessThan(2e-6);
  });

  test("falls with salinity and with pressure", () => {
    expect(freezingTemperature(35, 0)).toBeLessThan(freezingTemperature(5, 0));
    expect(freezingTemperature(5, 500)).toBeLessThan(freezingTemperature(5, 0));
  });

  test("is found over the whole range and for NaN is NaN", () => {
    for (let SA = 0; SA <= 42; SA += 6)
      for (let p = 0; p <= 8000; p += 1000) expect(freezingTemperature(SA, p)).toBeLessThan(0.01);
    expect(freezingTemperature(Number.NaN, 0)).toBeNaN();
  });
});

describe("the range of the 75-term polynomial", () => {
  // Corners of the funnel: McDougall et al. 2003, from memory.
  test.each([
    { SA: 0, CT: 5, p: 0, inside: true },
    { SA: 42, CT: 40, p: 499, inside: true },
    { SA: 42.1, CT: 20, p: 0, inside: false },
    { SA: -0.01, CT: 20, p: 0, inside: false },
    { SA: 10, CT: 40.1, p: 0, inside: false },
    { SA: 20, CT: 10, p: 4499, inside: true },
    { SA: 20, CT: 10, p: 4501, inside: false },
    { SA: 35, CT: 21, p: 3150, inside: true },
    { SA: 35, CT: 21, p: 3250, inside: false },
    { SA: 35, CT: 11, p: 7000, inside: false },
    { SA: 29, CT: 5, p: 7000, inside: false },
    { SA: 35, CT: 5, p: 8001, inside: false },
    { SA: 35, CT: 5, p: -0.2, inside: true },
    { SA: 35, CT: 5, p: -11, inside: false },
  ])("holds $SA g/kg, $CT degC, $p dbar: $inside", ({ SA, CT, p, inside }) => {
    expect(isWithinRange(SA, CT, p)).toBe(inside);
  });

  test("ends at the freezing point, and below 500 dbar at that of 500 dbar", () => {
    for (const [SA, p] of [
      [0, 0],
      [0, 100],
      [35, 0],
      [35, 400],
    ] as const) {
      const freezing = conservativeTemperature(SA, freezingTemperature(SA, p), p);
      expect(isWithinRange(SA, freezing + 1e-6, p)).toBe(true);
      expect(isWithinRange(SA, freezing - 1e-6, p)).toBe(false);
    }
    const at500 = conservativeTemperature(35, freezingTemperature(35, 500), 500);
    expect(isWithinRange(35, at500 + 1e-6, 2000)).toBe(true);
    expect(isWithinRange(35, at500 - 1e-6, 2000)).toBe(false);
  });

  test("holds no NaN", () => {
    expect(isWithinRange(Number.NaN, 10, 0)).toBe(false);
    expect(isWithinRange(35, Number.NaN, 0)).toBe(false);
    expect(isWithinRange(35, 10, Number.NaN)).toBe(false);
  });
});
