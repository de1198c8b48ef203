import { describe, expect, it } from "vitest";
import { LinearProfile } from "../../../../src/column/stratification/linear-profile.ts";
import { deformationRadiusM, modeSpeeds, verticalModes } from "../../../../src/column/stratification/vertical-modes.ts";

const SETTING = { gravityMs2: 9.80665, meanRhoKgM3: 1000 };
const column = (depthM: readonly number[], rhoKgM3: readonly number[]) =>
  new LinearProfile(Float64Array.from(depthM), Float64Array.from(rhoKgM3));

describe("mode speeds", () => {
  it("of a single jump are one: that of two layers", () => {
    const speedMs = modeSpeeds(column([0, 5, 5, 20], [1000, 1000, 1010, 1010]), SETTING, 3);
    expect(speedMs).toHaveLength(1);
    expect(Math.abs(speedMs[0]! / Math.sqrt((9.80665 * 0.01 * 5 * 15) / 20) - 1)).toBeLessThan(1e-12);
  });

  it("of two jumps are the roots of the three-layer problem", () => {
    // By hand: W is linear in each layer, so c2 is an eigenvalue of the 2 by 2 matrix G diag(b), with
    // G_ij = z_upper (H - z_lower) / H at the two jumps and b = g drho / rho0.
    const [z1, z2, H] = [4, 10, 16];
    const b = [0.03, 0.08].map((step) => (step * 9.80665) / 1000);
    const g11 = (z1 * (H - z1)) / H;
    const g22 = (z2 * (H - z2)) / H;
    const g12 = (z1 * (H - z2)) / H;
    const trace = g11 * b[0]! + g22 * b[1]!;
    const determinant = b[0]! * b[1]! * (g11 * g22 - g12 * g12);
    const root = Math.sqrt(trace * trace - 4 * determinant);
    const speedMs = modeSpeeds(
      column([0, z1, z1, z2, z2, H], [1000, 1000, 1000.03, 1000.03, 1000.11, 1000.11]),
      SETTING,
      3,
    );
    expect(speedMs).toHaveLength(2);
    expect(Math.abs(speedMs[0]! / Math.sqrt((trace + root) / 2) - 1)).toBeLessThan(1e-9);
    expect(Math.abs(speedMs[1]! / Math.sqrt((trace - root) / 2) - 1)).toBeLessThan(1e-9);
  });

  it("do not exist in mixed water, nor below what rounding makes", () => {
    expect(modeSpeeds(column([0, 20], [1000, 1000]), SETTING, 3)).toHaveLength(0);
    expect(modeSpeeds(column([0, 20], [1000, 1000 + 1e-10]), SETTING, 3)).toHaveLength(0);
    expect(verticalModes(column([0, 20], [1000, 1000]), SETTING, { modeCount: 3, latitudeDeg: 45 })).toBeNull();
  });

  it("stay exact in many modes: mode 40 of even layering", () => {
    const speedMs = modeSpeeds(column([0, 3, 20], [1000, 1003, 1020]), SETTING, 40);
    expect(Math.abs(speedMs[39]! / ((Math.sqrt(9.80665e-3) * 20) / (40 * Math.PI)) - 1)).toBeLessThan(1e-12);
  });
});

describe("mode speeds where samples lie on the nodes of the modes", () => {
  it("are those of even layering all the same", () => {
    const speedMs = modeSpeeds(column([0, 5, 10, 15, 20], [1000, 1005, 1010, 1015, 1020]), SETTING, 12);
    speedMs.forEach((speed, k) => {
      expect(Math.abs(speed / ((Math.sqrt(9.80665e-3) * 20) / ((k + 1) * Math.PI)) - 1)).toBeLessThan(1e-12);
    });
    expect(speedMs).toHaveLength(12);
  });
});

describe("deformation radius", () => {
  it("is speed over Coriolis parameter, the same on both hemispheres", () => {
    // 2 * 7.292115e-5 * sin 30 = 7.292115e-5.
    expect(deformationRadiusM(0.7292115, 30)).toBeCloseTo(10_000, 6);
    expect(deformationRadiusM(0.7292115, -30)).toBeCloseTo(10_000, 6);
  });

  it("does not exist without a latitude or at the equator", () => {
    expect(deformationRadiusM(0.5, null)).toBeNull();
    expect(deformationRadiusM(0.5, 0)).toBeNull();
  });
});
