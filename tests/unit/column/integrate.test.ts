import { describe, expect, it } from "vitest";
import {
  type Basis,
  type Column,
  defaultBasis,
  describeAtDepths,
  integrateCast,
  sampledProfile,
} from "../../../src/column/index.ts";
import {
  conductivityFromPracticalSalinity,
  standardOceanHeight,
  surfaceGravity,
} from "../../../src/gsw-ts-port/index.ts";
import { castOf } from "../../support/cast-of.ts";

const columnOf = (cast: ReturnType<typeof castOf>, basis: Partial<Basis> = {}): Column => {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("; "));
  return outcome.value;
};

const codes = (column: Column): readonly string[] => column.issues.map((issue) => issue.code);

const brackish = { depthM: [0.5, 2, 4], practicalSalinity: [3, 12, 25], inSituTempC: [18, 16, 14] };

describe("integrateCast on water of one density", () => {
  const cast = castOf({ depthM: [0, 10], inSituTempC: [10, 10] });

  it("gives rho g h with standard gravity where no latitude is known: 98066.5 Pa for 10 m of 1000 kg/m3", () => {
    const column = columnOf(cast, { water: { id: "constant", rhoKgM3: 1000 } });
    expect(column.seaPressureDbar[1]! * 1e4).toBeCloseTo(98066.5, 8);
    expect(codes(column)).toContain("gravity-assumed");
  });

  it("lets gravity grow with depth where the latitude is known", () => {
    const column = columnOf(cast, { water: { id: "constant", rhoKgM3: 1000 }, latitudeDeg: 45 });
    const expected = (1000 * surfaceGravity(45) * 10 * (1 + (2.26e-7 * 10) / 2)) / 1e4;
    expect(column.seaPressureDbar[1]!).toBeCloseTo(expected, 12);
  });

  it("adds layers: 5 m of 1000 over 5 m of 1025 kg/m3 is 99292.33125 Pa", () => {
    // Closed form. A jump is two samples at one depth; a model of salinity only stands in for a density step.
    const upper = columnOf(castOf({ depthM: [0, 5], inSituTempC: [10, 10] }), {
      water: { id: "constant", rhoKgM3: 1000 },
    });
    const lower = columnOf(castOf({ depthM: [0, 5], inSituTempC: [10, 10] }), {
      water: { id: "constant", rhoKgM3: 1025 },
    });
    expect((upper.seaPressureDbar[1]! + lower.seaPressureDbar[1]!) * 1e4).toBeCloseTo(99292.33125, 8);
  });
});

describe("integrateCast on a worked cast", () => {
  // TEOS-10 exact density with an implicit trapezoid, standard gravity: 119.268897 kPa at 12 m. Between samples the
  // trapezoid takes density as linear; the contract takes salinity and temperature so, which is 0.03 Pa apart here.
  const depthM = [0, 1, 2, 3, 4, 5, 6, 8, 10, 12];
  const absSalinityGKg = [4, 4.2, 5, 9, 16, 22, 25, 27, 28, 28.5];
  const cast = castOf({
    depthM,
    practicalSalinity: absSalinityGKg.map((salinity) => (salinity * 35) / 35.16504),
    inSituTempC: [22, 21.9, 21.6, 20.5, 18.8, 17.2, 16.3, 15.6, 15.2, 15],
  });
  const bottomKPa = (basis: Partial<Basis>) => {
    const profile = sampledProfile(columnOf(cast, { water: { id: "exact" }, ...basis }));
    return {
      gauge: profile.gaugePressureKPa.at(-1)!,
      constant: profile.constantDensityPressureKPa.at(-1)!,
      share: profile.departureFrac.at(-1)!,
    };
  };

  it("has its bottom pressure to 0.1 Pa", () => {
    expect(Math.abs(bottomKPa({}).gauge - 119.268897)).toBeLessThan(1e-4);
  });

  it.each([
    ["fresh nominal", { kind: "number", rhoKgM3: 1000 }, 117.6798, -1.33],
    ["surface sample", { kind: "surface" }, 117.772813, -1.25],
    ["column mean", { kind: "mean" }, 119.268897, 0],
    ["sea nominal", { kind: "number", rhoKgM3: 1025 }, 120.621795, 1.13],
    ["62.4 lb/ft3", { kind: "number", rhoKgM3: 999.552 }, 117.6271, -1.38],
  ] as const)("compares with %s", (_, referenceDensity, estimateKPa, errorPercent) => {
    const { constant, gauge, share } = bottomKPa({ referenceDensity });
    expect(Math.abs(constant - estimateKPa)).toBeLessThan(1e-4);
    expect(Math.abs(((constant - gauge) / gauge) * 100 - errorPercent)).toBeLessThan(0.006);
    expect(share).toBeCloseTo((gauge - constant) / gauge, 12);
  });
});

describe("integrateCast at the edges of the record", () => {
  it("holds the first sample up to the surface and the last down to the bed", () => {
    const column = columnOf(castOf(brackish), { bedDepthM: 5 });
    const profile = sampledProfile(column);
    expect(profile.origin).toEqual(["surface-gap", "sample", "sample", "sample", "bed-gap"]);
    expect(profile.depthM[0]).toBe(0);
    expect(profile.gaugePressureKPa[0]).toBe(0);
    expect(profile.absPressureKPa[0]).toBe(101.325);
    expect(profile.consTempC[0]).toBe(profile.consTempC[1]);
    expect(profile.absSalinityGKg[4]).toBe(profile.absSalinityGKg[3]);
    expect(profile.depthM[4]).toBe(5);
  });

  it("has no result below a known bed, and says when the bed contradicts the samples", () => {
    const column = columnOf(castOf(brackish), { bedDepthM: 5 });
    expect(describeAtDepths(column, [5.001]).seaPressureDbar[0]).toBeNaN();
    expect(describeAtDepths(column, [-0.1]).seaPressureDbar[0]).toBeNaN();
    const contradicted = columnOf(castOf(brackish), { bedDepthM: 3 });
    expect(codes(contradicted)).toContain("bed-above-last-sample");
    expect(contradicted.bottomDepthM).toBe(4);
  });

  it("leaves out what is incomplete or in air, sorts what is out of order, and says so", () => {
    const column = columnOf(
      castOf({
        depthM: [-0.2, 4, 1, 2, Number.NaN],
        practicalSalinity: [0, 25, 3, Number.NaN, 5],
        inSituTempC: [20, 14, 18, 16, 15],
      }),
    );
    expect([...column.depthM]).toEqual([1, 4]);
    expect([...column.sampleIndex]).toEqual([2, 1]);
    expect(codes(column)).toEqual(expect.arrayContaining(["incomplete-sample", "above-surface", "not-in-order"]));
    expect(column.issues.find((issue) => issue.code === "incomplete-sample")!.message).toContain("lines 5, 6");
  });

  it("fails with a reason when no sample can be used", () => {
    const outcome = integrateCast(castOf({ depthM: [Number.NaN], inSituTempC: [12] }), defaultBasis);
    expect(outcome.ok).toBe(false);
    expect(outcome.issues.at(-1)).toMatchObject({ severity: "error", code: "no-usable-sample" });
  });

  it("stands on one sample as well as on two, and on two at one depth", () => {
    expect(columnOf(castOf({ depthM: [3], inSituTempC: [12] })).seaPressureDbar[0]).toBeGreaterThan(2.9);
    const jump = columnOf(
      castOf({ depthM: [1, 2, 2, 3], practicalSalinity: [0, 0, 30, 30], inSituTempC: [12, 12, 12, 12] }),
    );
    expect(jump.seaPressureDbar[1]).toBe(jump.seaPressureDbar[2]);
    expect(sampledProfile(jump).buoyancyFrequencySquaredPerS2[2]).toBeNaN();
  });
});

describe("integrateCast on what the probe measured", () => {
  it("computes salinity from conductivity at the pressure it integrates", () => {
    const bySalinity = columnOf(castOf(brackish));
    const conductivityMsCm = brackish.practicalSalinity.map((salinity, i) =>
      conductivityFromPracticalSalinity(salinity, brackish.inSituTempC[i]!, bySalinity.seaPressureDbar[i]!),
    );
    const { depthM, inSituTempC } = brackish;
    const byConductivity = columnOf(castOf({ depthM, inSituTempC, conductivityMsCm }));
    byConductivity.seaPressureDbar.forEach((p, i) => {
      expect(p).toBeCloseTo(bySalinity.seaPressureDbar[i]!, 11);
    });
  });

  it("takes the salinity of the basis where none was measured, and says so", () => {
    const column = columnOf(castOf({ depthM: [0, 9], inSituTempC: [8, 6] }), { unmeasuredPracticalSalinity: 0.2 });
    expect([...column.practicalSalinity]).toEqual([0.2, 0.2]);
    expect(codes(column)).toContain("salinity-assumed");
  });

  it("recovers the pressure from a depth made with the standard ocean, and from that the true depth", () => {
    const seaPressureDbar = [10, 50, 100];
    const depthM = seaPressureDbar.map((p) => -standardOceanHeight(p, 45));
    const fresh = { practicalSalinity: [0, 0, 0], inSituTempC: [10, 10, 10] };
    const column = columnOf(castOf({ depthM, ...fresh }, { latitudeDeg: 45 }), {
      depthMade: { kind: "standard-ocean" },
    });
    column.seaPressureDbar.forEach((p, i) => {
      expect(p).toBeCloseTo(seaPressureDbar[i]!, 9);
    });
    // Fresh water of 10 degC: the standard ocean's 99.16 m at 100 dbar is truly 101.98 m, 2.8 % more.
    expect(column.depthM[2]! / depthM[2]!).toBeCloseTo(1.028, 3);
  });

  it("recovers the pressure from a depth made with one density", () => {
    const column = columnOf(castOf({ depthM: [10], inSituTempC: [10] }), {
      depthMade: { kind: "constant", rhoKgM3: 1025 },
    });
    expect(column.seaPressureDbar[0]! * 1e4).toBeCloseTo(1025 * 9.80665 * 10, 8);
    expect(column.depthM[0]).toBeGreaterThan(10.2);
  });
});
