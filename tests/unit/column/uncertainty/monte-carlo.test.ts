import { describe, expect, it } from "vitest";
import { isToolError } from "../../../../src/base/index.ts";
import type { Cast } from "../../../../src/cast/index.ts";
import {
  type Column,
  confirmsFirstOrder,
  defaultAccuracy,
  defaultBasis,
  integrateCast,
  monteCarlo,
  uncertaintyAtDepths,
} from "../../../../src/column/index.ts";
import { MeasuredAnew } from "../../../../src/column/uncertainty/measured-anew.ts";
import { SeededDeviates } from "../../../../src/column/uncertainty/seeded-deviates.ts";
import { practicalSalinityFromConductivity, referenceSalinity } from "../../../../src/gsw-ts-port/index.ts";
import { ownTemperature, waterModel } from "../../../../src/water/index.ts";
import { castOf } from "../../../support/cast-of.ts";

const columnOf = (cast: Cast, basis: Partial<Column["basis"]> = {}): Column => {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return outcome.value;
};

const layered = castOf({ depthM: [1, 4, 10], practicalSalinity: [5, 20, 30], inSituTempC: [18, 14, 12] });

describe("seeded deviates", () => {
  it("are the same for the same seed and others for another", () => {
    const first = (seed: number): number[] => {
      const deviates = new SeededDeviates(seed);
      return Array.from({ length: 5 }, () => deviates.uniform());
    };
    expect(first(3)).toEqual(first(3));
    expect(first(3)).not.toEqual(first(4));
    expect(first(0).every((value) => value > 0 && value < 1)).toBe(true);
  });

  it("have the moments of their distributions, and neighbours that know nothing of each other", () => {
    const deviates = new SeededDeviates(1);
    const n = 200_000;
    const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;
    const normal = Array.from({ length: n }, () => deviates.normal());
    const uniform = Array.from({ length: n }, () => deviates.uniform());
    // Within four standard errors of each moment.
    const near = (found: number, expected: number, variance: number): void =>
      expect(Math.abs(found - expected)).toBeLessThan(4 * Math.sqrt(variance / n));
    near(mean(normal), 0, 1);
    near(mean(normal.map((x) => x ** 2)), 1, 2);
    near(mean(normal.map((x) => x ** 3)), 0, 15);
    near(mean(normal.map((x) => x ** 4)), 3, 96);
    near(mean(normal.slice(1).map((x, i) => x * normal[i]!)), 0, 1);
    near(mean(uniform), 0.5, 1 / 12);
    near(mean(uniform.map((x) => x ** 2)), 1 / 3, 4 / 45);
  });
});

describe("samples measured anew", () => {
  it.each([
    // Of the largest effect of an error of conductivity and temperature on density, how much the straight line may miss.
    [0.2, 5, 0.02],
    [2, 25, 0.004],
    [20, 20, 0.003],
    [50, 12, 0.003],
  ])(
    "have the density that %d mS/cm and %d degC with their errors have, but for a share of %d",
    (mSCm, tempC, share) => {
      const cast = castOf({ depthM: [1], conductivityMsCm: [mSCm], inSituTempC: [tempC] });
      const { systematicTempC, systematicConductivityMsCm } = defaultAccuracy;
      const nothing = Object.fromEntries(Object.keys(defaultAccuracy).map((key) => [key, 0]));
      const column = columnOf(cast, {
        accuracy: { ...defaultAccuracy, ...nothing, systematicTempC, systematicConductivityMsCm },
      });
      const model = waterModel(column.basis.water);
      const seaPressureDbar = column.seaPressureDbar[0]!;
      const densityOf = (conductivityMsCm: number, inSituTempC: number): number => {
        const salinity = referenceSalinity(
          practicalSalinityFromConductivity(conductivityMsCm, inSituTempC, seaPressureDbar),
        );
        return model.density(
          salinity,
          ownTemperature(model, { salinity, inSituTempC, seaPressureDbar }),
          seaPressureDbar,
        );
      };
      const anew = new MeasuredAnew(column, "conductivity");
      let worstKgM3 = 0;
      let largestEffectKgM3 = 0;
      for (let seed = 0; seed < 500; seed++) {
        anew.draw(new SeededDeviates(seed));
        const same = new SeededDeviates(seed);
        const drawnTempC = tempC + systematicTempC * same.normal();
        const rhoKgM3 = densityOf(mSCm + systematicConductivityMsCm * same.normal(), drawnTempC);
        worstKgM3 = Math.max(worstKgM3, Math.abs(anew.rhoKgM3[0]! - rhoKgM3));
        largestEffectKgM3 = Math.max(largestEffectKgM3, Math.abs(rhoKgM3 - densityOf(mSCm, tempC)));
      }
      expect(largestEffectKgM3).toBeGreaterThan(0.03);
      expect(worstKgM3 / largestEffectKgM3).toBeLessThan(share);
    },
  );

  it("keep their order, however close they lie, and stay in the water", () => {
    const n = 400;
    const depthM = Array.from({ length: n }, (_, i) => 0.005 * i);
    const cast = castOf({ depthM, practicalSalinity: depthM.map(() => 20), inSituTempC: depthM.map(() => 12) });
    const anew = new MeasuredAnew(columnOf(cast), "practicalSalinity");
    const deviates = new SeededDeviates(9);
    for (let trial = 0; trial < 20; trial++) {
      anew.draw(deviates);
      expect(anew.depthM[0]).toBeGreaterThanOrEqual(0);
      for (let k = 1; k < n; k++) expect(anew.depthM[k]).toBeGreaterThanOrEqual(anew.depthM[k - 1]!);
    }
  });
});

describe("monteCarlo", () => {
  it("is the same for the same seed, at depths in any order", () => {
    const column = columnOf(layered);
    const at = (depthsM: readonly number[]) => monteCarlo(column, layered, { trialCount: 500, seedIndex: 2, depthsM });
    expect(at([4, 11, 0.5])).toEqual(at([4, 11, 0.5]));
    expect(at([11, 0.5]).standardKPa[0]).toBe(at([0.5, 11]).standardKPa[1]);
  });

  it("finds the pressure lower on average by half of what fresh water in the gap would take", () => {
    const column = columnOf(layered, { accuracy: { ...defaultAccuracy, levelDepthM: 0 } });
    const drawn = monteCarlo(column, layered, { trialCount: 20_000, seedIndex: 2, depthsM: [1] });
    const { gaps } = uncertaintyAtDepths(column, layered, [1]);
    const shiftKPa = drawn.meanKPa[0]! - column.seaPressureDbar[0]! * 10;
    expect(shiftKPa / (gaps.surfaceBoundKPa[0]! / 2)).toBeCloseTo(1, 1);
    expect(drawn.lowKPa[0]).toBeLessThan(drawn.meanKPa[0]!);
    expect(drawn.highKPa[0]).toBeGreaterThan(drawn.meanKPa[0]!);
  });

  it("tells how far it is", () => {
    const shares: number[] = [];
    monteCarlo(columnOf(layered), layered, {
      trialCount: 1000,
      seedIndex: 1,
      depthsM: [5],
      onShare: (doneFrac) => shares.push(doneFrac),
    });
    expect(shares).toHaveLength(100);
    expect(shares.at(-1)).toBeLessThan(1);
  });

  it("has no value where there is no water, and refuses what are no trials", () => {
    const column = columnOf(layered, { bedDepthM: 12 });
    const drawn = monteCarlo(column, layered, { trialCount: 100, seedIndex: 1, depthsM: [13, 5] });
    expect(drawn.meanKPa[0]).toBeNaN();
    expect(drawn.standardKPa[1]).toBeGreaterThan(0);
    for (const trialCount of [0, 1, 2.5, Number.NaN])
      try {
        monteCarlo(column, layered, { trialCount, seedIndex: 1, depthsM: [5] });
        expect.unreachable();
      } catch (error) {
        expect(isToolError(error, "DomainError")).toBe(true);
      }
  });

  it("is held to five per cent", () => {
    expect(confirmsFirstOrder(1.049, 1)).toBe(true);
    expect(confirmsFirstOrder(0.94, 1)).toBe(false);
    expect(confirmsFirstOrder(Number.NaN, 1)).toBe(false);
  });
});
