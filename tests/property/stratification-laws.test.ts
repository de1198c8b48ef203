import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { defaultBasis, integrateCast, type Stratification, stratificationOf } from "../../src/column/index.ts";
import { LinearProfile } from "../../src/column/stratification/linear-profile.ts";
import { stratificationMoments } from "../../src/column/stratification/moments.ts";
import { potentialEnergyAnomaly } from "../../src/column/stratification/potential-energy.ts";
import { inDensityOrder, thorpeSorting } from "../../src/column/stratification/thorpe.ts";
import { twoLayers } from "../../src/column/stratification/two-layers.ts";
import { modeSpeeds } from "../../src/column/stratification/vertical-modes.ts";
import { anySamples } from "../support/any-samples.ts";
import { castOf } from "../support/cast-of.ts";

const RUNS = { seed: 20_261_201, numRuns: 200 };
const GRAVITY_MS2 = 9.80665;
const SETTING = { gravityMs2: GRAVITY_MS2, meanRhoKgM3: 1012 };

const anyDensity = fc.double({ min: 995, max: 1030, noNaN: true });

/** Densities of layers that are all equally thick. */
const equalLayers = fc.record({
  thicknessM: fc.double({ min: 0.05, max: 2, noNaN: true }),
  rhoKgM3: fc.array(anyDensity, { minLength: 1, maxLength: 60 }).map((rho) => Float64Array.from(rho)),
});

/** A column from the surface down, at uneven depths. */
const anyColumn = fc
  .array(fc.tuple(fc.double({ min: 0.02, max: 5, noNaN: true }), anyDensity), { minLength: 2, maxLength: 40 })
  .map((knots) => {
    let depth = -knots[0]![0];
    return {
      depthM: Float64Array.from(knots, ([step]) => (depth += step)),
      rhoKgM3: Float64Array.from(knots, ([, rho]) => rho),
    };
  });

const sortedColumn = anyColumn.map(({ depthM, rhoKgM3 }) => ({ depthM, rhoKgM3: rhoKgM3.toSorted() }));

/** Where layering is more than rounding. */
const layeredColumn = sortedColumn.filter(({ rhoKgM3 }) => rhoKgM3.at(-1)! - rhoKgM3[0]! > 0.01);

const profileOf = ({ depthM, rhoKgM3 }: { readonly depthM: Float64Array; readonly rhoKgM3: Float64Array }) =>
  new LinearProfile(depthM, rhoKgM3);

/** A column of layers with jumps between them. */
const layeredProfile = (thicknessM: number, rhoKgM3: Float64Array): LinearProfile =>
  new LinearProfile(
    Float64Array.from({ length: 2 * rhoKgM3.length }, (_, i) => Math.ceil(i / 2) * thicknessM),
    Float64Array.from({ length: 2 * rhoKgM3.length }, (_, i) => rhoKgM3[Math.floor(i / 2)]!),
  );

/** Weight of the water above every layer's lower face, Pa. */
const weightsPa = (thicknessM: number, rhoKgM3: Float64Array): Float64Array => {
  let pressurePa = 0;
  return rhoKgM3.map((rho) => (pressurePa += rho * GRAVITY_MS2 * thicknessM));
};

describe("sorting", () => {
  it("keeps the mass and the bed pressure of equal layers, and presses nowhere harder", () => {
    fc.assert(
      fc.property(equalLayers, ({ thicknessM, rhoKgM3 }) => {
        const before = weightsPa(thicknessM, rhoKgM3);
        const after = weightsPa(thicknessM, inDensityOrder(rhoKgM3));
        expect(Math.abs(after.at(-1)! / before.at(-1)! - 1)).toBeLessThan(1e-13);
        after.forEach((pressurePa, k) => {
          expect(pressurePa).toBeLessThanOrEqual(before[k]! * (1 + 1e-13));
        });
      }),
      RUNS,
    );
  });

  it("moves equal layers by nothing on the whole, and within every overturn", () => {
    fc.assert(
      fc.property(equalLayers, ({ thicknessM, rhoKgM3 }) => {
        const depthM = rhoKgM3.map((_, k) => (k + 0.5) * thicknessM);
        const { displacementM, overturns } = thorpeSorting(depthM, rhoKgM3, 0.03);
        const sumWithin = (fromM: number, toM: number): number =>
          displacementM.reduce((sum, moved, k) => (depthM[k]! >= fromM && depthM[k]! <= toM ? sum + moved : sum), 0);
        expect(Math.abs(sumWithin(0, Number.POSITIVE_INFINITY))).toBeLessThan(1e-9);
        for (const { fromDepthM, toDepthM } of overturns)
          expect(Math.abs(sumWithin(fromDepthM, toDepthM))).toBeLessThan(1e-9);
        const outside = displacementM.filter(
          (_, k) => !overturns.some(({ fromDepthM, toDepthM }) => depthM[k]! >= fromDepthM && depthM[k]! <= toDepthM),
        );
        expect(outside.every((moved) => moved === 0)).toBe(true);
      }),
      RUNS,
    );
  });

  it("leaves the column that takes most work to mix", () => {
    fc.assert(
      fc.property(equalLayers, ({ thicknessM, rhoKgM3 }) => {
        const measured = potentialEnergyAnomaly(layeredProfile(thicknessM, rhoKgM3), GRAVITY_MS2);
        const sorted = potentialEnergyAnomaly(layeredProfile(thicknessM, inDensityOrder(rhoKgM3)), GRAVITY_MS2);
        expect(sorted).toBeGreaterThanOrEqual(measured - 1e-9);
      }),
      RUNS,
    );
  });
});

describe("potential energy anomaly", () => {
  it("is zero for mixed columns and not negative for sorted ones", () => {
    fc.assert(
      fc.property(sortedColumn, ({ depthM, rhoKgM3 }) => {
        expect(potentialEnergyAnomaly(profileOf({ depthM, rhoKgM3 }), GRAVITY_MS2)).toBeGreaterThanOrEqual(-1e-9);
        const mixed = rhoKgM3.map(() => rhoKgM3[0]!);
        expect(potentialEnergyAnomaly(profileOf({ depthM, rhoKgM3: mixed }), GRAVITY_MS2)).toBe(0);
      }),
      RUNS,
    );
  });

  it("is not changed by a sample interpolated in, nor are moments and mode speeds", () => {
    const share = fc.double({ min: 0.05, max: 0.95, noNaN: true });
    fc.assert(
      fc.property(layeredColumn, fc.nat(), share, (column, pick, at) => {
        const k = pick % (column.depthM.length - 1);
        const inserted = (values: Float64Array): Float64Array =>
          Float64Array.from([
            ...values.subarray(0, k + 1),
            values[k]! + at * (values[k + 1]! - values[k]!),
            ...values.subarray(k + 1),
          ]);
        const before = profileOf(column);
        const after = profileOf({ depthM: inserted(column.depthM), rhoKgM3: inserted(column.rhoKgM3) });
        const phi = [before, after].map((profile) => potentialEnergyAnomaly(profile, GRAVITY_MS2));
        expect(Math.abs(phi[1]! - phi[0]!)).toBeLessThan(1e-9 * (1 + phi[0]!));
        const [widthM, widthAfterM] = [before, after].map((profile) => stratificationMoments(profile)?.rmsWidthM ?? 0);
        expect(Math.abs(widthAfterM! - widthM!)).toBeLessThan(1e-6 * (1 + widthM!));
        const [speedMs, speedAfterMs] = [before, after].map((profile) => modeSpeeds(profile, SETTING, 1)[0] ?? 0);
        expect(Math.abs(speedAfterMs! - speedMs!)).toBeLessThan(1e-9);
      }),
      RUNS,
    );
  });

  it("is kept, with the mass, by the two layers that are meant to keep it", () => {
    fc.assert(
      fc.property(sortedColumn, fc.double({ min: 0.1, max: 0.9, noNaN: true }), (column, share) => {
        const measured = profileOf(column);
        const phi = potentialEnergyAnomaly(measured, GRAVITY_MS2);
        const totalM = measured.bottomDepthM;
        const layers = twoLayers(measured, share * totalM, {
          gravityMs2: GRAVITY_MS2,
          potentialEnergyAnomalyJM3: phi,
        });
        if (!layers) return;
        const { upperThicknessM, energyKept, means } = layers;
        const asProfile = (rho: typeof means): LinearProfile =>
          new LinearProfile(
            Float64Array.of(0, upperThicknessM, upperThicknessM, totalM),
            Float64Array.of(rho.upperRhoKgM3, rho.upperRhoKgM3, rho.lowerRhoKgM3, rho.lowerRhoKgM3),
          );
        const meanKgM3 = measured.mean(0, totalM);
        expect(Math.abs(asProfile(means).mean(0, totalM) / meanKgM3 - 1)).toBeLessThan(1e-12);
        expect(Math.abs(asProfile(energyKept).mean(0, totalM) / meanKgM3 - 1)).toBeLessThan(1e-12);
        const kept = potentialEnergyAnomaly(asProfile(energyKept), GRAVITY_MS2);
        expect(Math.abs(kept - phi)).toBeLessThan(1e-9 * (1 + phi));
      }),
      RUNS,
    );
  });
});

describe("mode speeds", () => {
  it("fall from mode to mode, and none exceeds that of all the stratification halfway down", () => {
    fc.assert(
      fc.property(sortedColumn, (column) => {
        const sorted = profileOf(column);
        const speedMs = modeSpeeds(sorted, SETTING, 5);
        const gain = column.rhoKgM3.at(-1)! - column.rhoKgM3[0]!;
        const greatestMs = Math.sqrt((GRAVITY_MS2 * gain * sorted.bottomDepthM) / SETTING.meanRhoKgM3) / 2;
        speedMs.forEach((speed, k) => {
          expect(speed).toBeGreaterThan(0);
          expect(speed).toBeLessThanOrEqual(k === 0 ? greatestMs * (1 + 1e-12) : speedMs[k - 1]!);
        });
      }),
      RUNS,
    );
  });

  it("tend to the speed of two layers as their interface thins", () => {
    const depths = fc.record({
      upperM: fc.double({ min: 1, max: 15, noNaN: true }),
      lowerM: fc.double({ min: 1, max: 15, noNaN: true }),
      gain: fc.double({ min: 0.5, max: 25, noNaN: true }),
    });
    fc.assert(
      fc.property(depths, ({ upperM, lowerM, gain }) => {
        const totalM = upperM + lowerM;
        const twoLayerMs = Math.sqrt((GRAVITY_MS2 * gain * upperM * lowerM) / (SETTING.meanRhoKgM3 * totalM));
        const errors = [1, 0.25, 0.0625, 0].map((thicknessM) => {
          const interfaceM = [upperM - thicknessM / 2, upperM + thicknessM / 2];
          const depthM = Float64Array.of(0, ...interfaceM, totalM);
          const rhoKgM3 = Float64Array.of(1000, 1000, 1000 + gain, 1000 + gain);
          return Math.abs(modeSpeeds(new LinearProfile(depthM, rhoKgM3), SETTING, 1)[0]! / twoLayerMs - 1);
        });
        expect(errors[1]!).toBeLessThan(errors[0]!);
        expect(errors[2]!).toBeLessThan(errors[1]!);
        expect(errors[3]!).toBeLessThan(1e-12);
      }),
      RUNS,
    );
  });
});

describe("a column's stratification", () => {
  const anyCast = anySamples(1, 40).map((samples) => castOf(samples));

  /** Every number in a result, at any depth of it. */
  const numbersOf = (value: unknown): readonly number[] =>
    typeof value === "number"
      ? [value]
      : ArrayBuffer.isView(value)
        ? Array.from(value as Float64Array)
        : value !== null && typeof value === "object"
          ? Object.values(value).flatMap(numbersOf)
          : [];

  it("is finite, lies in the water and goes between threads whole, for any water", () => {
    fc.assert(
      fc.property(anyCast, (cast) => {
        const outcome = integrateCast(cast, { ...defaultBasis, latitudeDeg: 51 });
        if (!outcome.ok) throw new Error("no column");
        const found = stratificationOf(outcome.value) as Stratification;
        expect(numbersOf(found).every(Number.isFinite)).toBe(true);
        expect(structuredClone(found)).toEqual(found);
        const { bottomDepthM } = outcome.value;
        for (const { depthM, topDepthM, bottomDepthM: underM, thicknessM } of found.pycnoclines) {
          expect(Math.min(depthM, topDepthM, thicknessM)).toBeGreaterThanOrEqual(0);
          expect(Math.max(depthM, underM)).toBeLessThanOrEqual(bottomDepthM);
        }
        expect(found.mixedLayer.byThreshold.depthM).toBeLessThanOrEqual(bottomDepthM);
        expect(found.buoyancy.sorted.squaredPerS2.every((squared) => squared >= 0)).toBe(true);
        expect(found.buoyancy.smoothed.squaredPerS2.every((squared) => squared >= 0)).toBe(true);
      }),
      RUNS,
    );
  });
});
