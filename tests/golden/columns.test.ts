import { describe, expect, it } from "vitest";
import { type Column, defaultBasis, describeAtDepths, integrateCast, sampledProfile } from "../../src/column/index.ts";
import { castOf } from "../support/cast-of.ts";
import golden from "./columns.json";

/** Source: GSW 3.6.16 density and an independent Runge-Kutta integration; see generate/make_reference.py. */
const PRESSURE_RELATIVE = 1e-8;
const BUOYANCY_RELATIVE = 1e-9;
const BUOYANCY_ABSOLUTE = 1e-15;

function columnOf(reference: (typeof golden.columns)[number], coordinate: "depth" | "pressure"): Column {
  const cast = castOf(
    {
      ...(coordinate === "depth" ? { depthM: reference.depth_m } : { seaPressureDbar: reference.sea_pressure_dbar }),
      practicalSalinity: reference.practical_salinity,
      inSituTempC: reference.temperature_degC,
    },
    { latitudeDeg: reference.latitude },
  );
  const outcome = integrateCast(cast, defaultBasis);
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join());
  return outcome.value;
}

const largestRelative = (found: ArrayLike<number>, expected: readonly number[]): number =>
  Math.max(...expected.map((value, i) => Math.abs(found[i]! - value) / Math.max(Math.abs(value), 1e-300)));

describe.each(golden.columns)("$name, against the independent integration", (reference) => {
  const column = columnOf(reference, "depth");
  const profile = sampledProfile(column);
  const samples = (values: Float64Array): Float64Array => values.subarray(1);

  it("has the sea pressure of every sample to 1e-8", () => {
    expect(largestRelative(column.seaPressureDbar, reference.sea_pressure_dbar)).toBeLessThan(PRESSURE_RELATIVE);
  });

  it("has the sea pressure at depths between, above and below the samples to 1e-8", () => {
    const levels = describeAtDepths(column, reference.query_depth_m);
    expect(levels.seaPressureDbar[0]).toBe(0);
    expect(
      largestRelative(levels.seaPressureDbar.subarray(1), reference.query_sea_pressure_dbar.slice(1)),
    ).toBeLessThan(PRESSURE_RELATIVE);
  });

  it("has density and conservative temperature of every sample", () => {
    expect(largestRelative(samples(profile.rhoKgM3), reference.density_kg_m3)).toBeLessThan(1e-12);
    expect(largestRelative(samples(profile.consTempC), reference.conservative_temperature_degC)).toBeLessThan(1e-11);
  });

  it("has the buoyancy frequency between samples to 1e-9 relative plus 1e-15", () => {
    reference.N2_per_s2.forEach((expected, k) => {
      const found = profile.buoyancyFrequencySquaredPerS2[k + 1]!;
      expect(Math.abs(found - expected)).toBeLessThanOrEqual(
        BUOYANCY_RELATIVE * Math.abs(expected) + BUOYANCY_ABSOLUTE,
      );
    });
  });

  it("gives the depths back when the same column is recorded in sea pressure", () => {
    // Linear in p and linear in z differ inside a stretch, by up to the compressibility times the stretch's share.
    const byPressure = columnOf(reference, "pressure");
    expect(largestRelative(byPressure.depthM, reference.depth_m)).toBeLessThan(2e-3);
    const again = describeAtDepths(byPressure, byPressure.depthM);
    expect(largestRelative(again.seaPressureDbar, reference.sea_pressure_dbar)).toBeLessThan(1e-10);
  });
});
