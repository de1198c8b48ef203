import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Column, defaultBasis, describeAtDepths, integrateCast } from "../../src/column/index.ts";
import { anySamples } from "../support/any-samples.ts";
import { castOf } from "../support/cast-of.ts";

const RUNS = { seed: 20_260_418, numRuns: 200 };

const anyCast = anySamples(2, 40);

const columnOf = (samples: Parameters<typeof castOf>[0], water: "teos10" | "exact" = "teos10"): Column => {
  const outcome = integrateCast(castOf(samples, { latitudeDeg: 51 }), { ...defaultBasis, water: { id: water } });
  if (!outcome.ok) throw new Error("no column");
  return outcome.value;
};

const pressureAt = (column: Column, depthM: number): number => describeAtDepths(column, [depthM]).seaPressureDbar[0]!;

describe("laws of a column", () => {
  it("pressure increases with depth", () => {
    fc.assert(
      fc.property(anyCast, (samples) => {
        const { seaPressureDbar } = columnOf(samples);
        expect(seaPressureDbar[0]).toBeGreaterThan(0);
        for (let k = 1; k < seaPressureDbar.length; k++)
          expect(seaPressureDbar[k]).toBeGreaterThan(seaPressureDbar[k - 1]!);
      }),
      RUNS,
    );
  });

  it("asking at a sample's depth gives that sample", () => {
    fc.assert(
      fc.property(anyCast, (samples) => {
        const column = columnOf(samples);
        column.depthM.forEach((depthM, k) => {
          expect(pressureAt(column, depthM)).toBe(column.seaPressureDbar[k]);
        });
      }),
      RUNS,
    );
  });

  it("a sample interpolated in changes nothing", () => {
    fc.assert(
      fc.property(anyCast, fc.nat(), fc.double({ min: 0.05, max: 0.95, noNaN: true }), (samples, pick, share) => {
        const k = pick % (samples.depthM.length - 1);
        const inserted = (values: readonly number[]) => [
          ...values.slice(0, k + 1),
          values[k]! + share * (values[k + 1]! - values[k]!),
          ...values.slice(k + 1),
        ];
        const finer = {
          depthM: inserted(samples.depthM),
          practicalSalinity: inserted(samples.practicalSalinity),
          inSituTempC: inserted(samples.inSituTempC),
        };
        // The exact model is linear in in-situ temperature, so the interpolated sample lies on its line.
        const before = columnOf(samples, "exact").seaPressureDbar.at(-1)!;
        const after = columnOf(finer, "exact").seaPressureDbar.at(-1)!;
        expect(Math.abs(after / before - 1)).toBeLessThan(1e-10);
      }),
      RUNS,
    );
  });

  it("gauge plus air is absolute, and estimate plus departure is gauge", () => {
    fc.assert(
      fc.property(anyCast, fc.double({ min: 0, max: 50, noNaN: true }), (samples, depthM) => {
        const at = describeAtDepths(columnOf(samples), [depthM]);
        expect(at.absPressureKPa[0]).toBeCloseTo(101.325 + at.gaugePressureKPa[0]!, 10);
        expect(at.constantDensityPressureKPa[0]! + at.departureKPa[0]!).toBeCloseTo(at.gaugePressureKPa[0]!, 10);
      }),
      RUNS,
    );
  });

  it("pressure lies between that of its lightest and its heaviest water", () => {
    fc.assert(
      fc.property(anyCast, (samples) => {
        const column = columnOf(samples, "exact");
        const at = describeAtDepths(column, column.depthM);
        const bottomM = column.depthM.at(-1)!;
        const meanKgM3 = (column.seaPressureDbar.at(-1)! * 1e4) / (9.812 * bottomM);
        // Between samples mixtures can be heavier than both ends, in fresh water near 4 degC most of all: by 0.2 kg/m3 at most.
        expect(meanKgM3).toBeGreaterThan(Math.min(...at.rhoKgM3) * 0.9995 - 0.6);
        expect(meanKgM3).toBeLessThan(Math.max(...at.rhoKgM3) * 1.0005 + 0.6);
      }),
      RUNS,
    );
  });
});
