import { describe, expect, it } from "vitest";
import {
  type Accuracy,
  type Column,
  confirmsFirstOrder,
  defaultAccuracy,
  defaultBasis,
  integrateCast,
  monteCarlo,
  sampledProfile,
  shortcutCosts,
  type Uncertainty,
  uncertaintyAtDepths,
  uncertaintyOf,
} from "../../src/column/index.ts";
import { MeasuredAnew } from "../../src/column/uncertainty/measured-anew.ts";
import { RunningIntegral } from "../../src/column/uncertainty/running-sums.ts";
import { SeededDeviates } from "../../src/column/uncertainty/seeded-deviates.ts";
import { sensitivitiesOf } from "../../src/column/uncertainty/sensitivities.ts";
import { exactDensity } from "../../src/gsw-ts-port/index.ts";
import { castOf } from "../support/cast-of.ts";
import columns from "./columns.json";
import golden from "./uncertainty.json";

/** The values' own source and tolerance stand beside each in uncertainty.json. */
const check = (id: string) => golden.find((one) => one.id === id)!;
const expected = (id: string): Record<string, number> => check(id).expected as unknown as Record<string, number>;
const expectNear = (actual: number, id: string, quantity: string): void =>
  expect(Math.abs(actual - expected(id)[quantity]!), `${id} ${quantity}: ${actual}`).toBeLessThanOrEqual(
    check(id).tolerance,
  );

const GRAVITY_MS2 = 9.80665;
const WORKED = check("C154").inputs as unknown as { depth_m: number[]; SA: number[]; t90_C: number[] };
/** Absolute over practical salinity of the reference composition. */
const GKG_PER_PRACTICAL = 35.16504 / 35;

const NOTHING_UNCERTAIN = Object.fromEntries(
  Object.keys(defaultAccuracy).map((key) => [key, 0]),
) as unknown as Accuracy;

const WORKED_ACCURACY: Accuracy = {
  ...NOTHING_UNCERTAIN,
  randomTempC: 0.01,
  systematicTempC: 0.01,
  randomSalinity: 0.05 / GKG_PER_PRACTICAL,
  systematicSalinity: 0.05 / GKG_PER_PRACTICAL,
  randomDepthM: 0.02,
};

const workedCast = castOf({
  depthM: WORKED.depth_m,
  practicalSalinity: WORKED.SA.map((absSalinityGKg) => absSalinityGKg / GKG_PER_PRACTICAL),
  inSituTempC: WORKED.t90_C,
});

function columnOf(cast: Parameters<typeof integrateCast>[0], basis: Partial<Column["basis"]> = {}): Column {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error(outcome.issues.map(({ message }) => message).join());
  return outcome.value;
}

const inPa = (values: Float64Array): number => values.at(-1)! * 1000;
const bottomPa = (uncertainty: Uncertainty, ...names: readonly (keyof Uncertainty["contributionKPa"])[]): number =>
  Math.hypot(...names.map((name) => inPa(uncertainty.contributionKPa[name])));

describe("water whose density is given (hydrostatics, closed forms)", () => {
  const weighed = (depthM: readonly number[], rhoKgM3: readonly number[]): number => {
    const last = depthM.length - 1;
    const integral = new RunningIntegral(Float64Array.from(depthM), Float64Array.from(rhoKgM3));
    return GRAVITY_MS2 * integral.downTo({ depthM: depthM[last]!, knotIndex: last, shareFrac: 0 });
  };
  const tanh = (depthM: number): number => 1012 + 10 * Math.tanh((depthM - 8) / 1.5);
  const evenly = (stepM: number): number[] => Array.from({ length: 20 / stepM + 1 }, (_, i) => i * stepM);

  it("weighs as much as published: uniform, two layers, linear", () => {
    expectNear(weighed([0, 10], [1000, 1000]), "C148", "p_Pa");
    expectNear(weighed([0, 5, 5, 10], [1000, 1000, 1025, 1025]), "C149", "p_Pa");
    expectNear(weighed([0, 20], [998, 1022]), "C150", "p_Pa");
  });

  it("weighs a smooth interface as published, from coarse and from fine samples", () => {
    expectNear(weighed(evenly(1), evenly(1).map(tanh)), "C152", "p_Pa");
    expectNear(weighed(evenly(0.0005), evenly(0.0005).map(tanh)), "C151", "p_Pa");
  });
});

describe("the worked cast", () => {
  const column = columnOf(workedCast, { water: { id: "exact" }, accuracy: WORKED_ACCURACY });
  const profile = sampledProfile(column);
  const uncertainty = uncertaintyOf(column, workedCast);

  it("has the published pressures: linear salinity and temperature, and the trapezoid of its densities", () => {
    expectNear(profile.gaugePressureKPa.at(-1)!, "C154", "fine_piecewise_linear_SA_t_kPa");
    const { depthM, rhoKgM3 } = profile;
    const published = check("C153").expected.p_dbar!;
    let trapezoidDbar = 0;
    for (let row = 1; row < profile.n; row++) {
      trapezoidDbar += (GRAVITY_MS2 * (depthM[row]! - depthM[row - 1]!) * (rhoKgM3[row]! + rhoKgM3[row - 1]!)) / 2e4;
      expect(Math.abs(trapezoidDbar - published[row - 1]!)).toBeLessThanOrEqual(check("C153").tolerance);
    }
    expectNear(trapezoidDbar * 10, "C154", "trapezoid_kPa");
  });

  it("is missed by every constant density as published", () => {
    const byName = new Map(
      shortcutCosts(column, [12]).map((cost) => [cost.shortcut.name.split(",")[0]!, cost.pressureKPa[0]!]),
    );
    expectNear(byName.get("surface sample")!, "C155", "surface_rho_kPa");
    expectNear(byName.get("last sample")!, "C155", "bottom_rho_kPa");
    const ofDensity = (rhoKgM3: number): number =>
      shortcutCosts(column, [12]).find(({ shortcut }) => shortcut.name.endsWith(`${rhoKgM3.toFixed(2)} kg/m3`))!
        .pressureKPa[0]!;
    expectNear(ofDensity(1000), "C155", "fresh_1000_kPa");
    expectNear(ofDensity(1025), "C155", "sea_1025_kPa");
  });

  it("has the published shape of the curve between samples, and a bound that contains it", () => {
    const shape = expected("C154").pchip_kPa! - expected("C154").trapezoid_kPa!;
    // The published curve runs through in-situ densities; ours leaves out how depth compresses, 1 part in 2000 of a step.
    expect(Math.abs(uncertainty.sampling.shapeKPa.at(-1)! / shape - 1)).toBeLessThan(1e-3);
    expect(inPa(uncertainty.sampling.boundKPa)).toBeGreaterThan(112);
    expect(inPa(uncertainty.sampling.boundKPa)).toBeLessThan(113.3);
  });

  it("has the published random and systematic uncertainty", () => {
    expectNear(bottomPa(uncertainty, "temperature-random", "salinity-random"), "C175", "u_random_Pa");
    expectNear(bottomPa(uncertainty, "temperature-systematic", "salinity-systematic"), "C175", "u_systematic_Pa");
  });

  it("has the published uncertainty from the depths of its inner samples, when compression is taken in as there", () => {
    const { depthM, rhoKgM3, absSalinityGKg, inSituTempC, seaPressureDbar } = profile;
    /** Effect of one sample's depth: half the step from the sample above to that below. */
    const rootOfSquares = (stepKgM3: (upper: number, lower: number) => number, from: number, to: number): number =>
      Math.hypot(
        ...Array.from({ length: to - from + 1 }, (_, i) => {
          const row = from + i;
          const above = row > 1 ? stepKgM3(row - 1, row) : 0;
          const below = row < profile.n - 1 ? stepKgM3(row, row + 1) : 0;
          return (GRAVITY_MS2 * 0.02 * (above + below)) / 2;
        }),
      );
    const inSitu = (upper: number, lower: number): number => rhoKgM3[lower]! - rhoKgM3[upper]!;
    const uncompressed = (upper: number, lower: number): number => {
      const midDbar = (seaPressureDbar[upper]! + seaPressureDbar[lower]!) / 2;
      return (
        exactDensity(absSalinityGKg[lower]!, inSituTempC[lower]!, midDbar) -
        exactDensity(absSalinityGKg[upper]!, inSituTempC[upper]!, midDbar)
      );
    };
    expect(depthM[1]).toBe(0);
    expectNear(rootOfSquares(inSitu, 2, profile.n - 2), "C175", "u_depth_Pa");
    // Water moved to another depth takes that depth's pressure, so ours is the same sum without compression, ends included.
    const ours = bottomPa(uncertainty, "sample-depth-random");
    expect(Math.abs(ours / rootOfSquares(uncompressed, 1, profile.n - 1) - 1)).toBeLessThan(1e-9);
    const published = Math.hypot(
      bottomPa(uncertainty, "temperature-random", "salinity-random", "temperature-systematic", "salinity-systematic"),
      rootOfSquares(inSitu, 2, profile.n - 2),
    );
    expectNear(published, "C175", "u_c_Pa");
  });

  it("has the published standard deviation when measured anew at random", () => {
    const { trials } = check("C176").inputs as unknown as { trials: number };
    const anew = new MeasuredAnew(column, "practicalSalinity");
    const deviates = new SeededDeviates(5);
    const pressuresPa = Array.from({ length: trials }, () => {
      anew.draw(deviates);
      const { depthM, rhoKgM3 } = anew;
      const last = column.n - 1;
      const integral = new RunningIntegral(depthM, rhoKgM3);
      return (
        GRAVITY_MS2 *
        (integral.downTo({ depthM: depthM[last]!, knotIndex: last, shareFrac: 0 }) +
          (12 - depthM[last]!) * rhoKgM3[last]!)
      );
    });
    const meanPa = pressuresPa.reduce((sum, pressurePa) => sum + pressurePa, 0) / trials;
    const variance = pressuresPa.reduce((sum, pressurePa) => sum + (pressurePa - meanPa) ** 2, 0) / (trials - 1);
    expectNear(Math.sqrt(variance), "C176", "sd_Pa");
  });
});

describe("sensitivities of density", () => {
  it.each(["C177", "C178", "C179", "C180", "C181", "C182", "C183", "C184"])("are those published: %s", (id) => {
    const { SA, t90_C } = check(id).inputs as unknown as { SA: number; t90_C: number };
    const cast = castOf({ depthM: [0], practicalSalinity: [SA / GKG_PER_PRACTICAL], inSituTempC: [t90_C] });
    const slopes = sensitivitiesOf(columnOf(cast, { water: { id: "exact" } }), "practicalSalinity");
    expectNear(slopes.tempKgM3[0]!, id, "drho_dt");
    expectNear(slopes.salinityKgM3[0]! / GKG_PER_PRACTICAL, id, "drho_dSA");
  });
});

/** With samples interpolated in, so that what may lie between them does not outweigh all else. */
function sampledFinely(values: readonly number[], parts: number): readonly number[] {
  const between = values
    .slice(1)
    .flatMap((value, i) =>
      Array.from({ length: parts }, (_, part) => values[i]! + ((value - values[i]!) * (part + 1)) / parts),
    );
  return [values[0]!, ...between];
}

describe.each(columns.columns)("$name: trials and first order", (reference) => {
  const castWith = (parts: number) =>
    castOf(
      {
        depthM: sampledFinely(reference.depth_m, parts),
        practicalSalinity: sampledFinely(reference.practical_salinity, parts),
        inSituTempC: sampledFinely(reference.temperature_degC, parts),
      },
      { latitudeDeg: reference.latitude },
    );
  const bottomM = reference.depth_m.at(-1)!;
  const depthsM = [reference.depth_m[0]! / 2, bottomM / 3, bottomM, bottomM * 1.05];

  // One contributor can hide the others, so they are also compared where sensors are what matters.
  it.each([
    ["as sampled, with all contributors", 1, defaultAccuracy],
    ["sampled finely, with those of the sensors", 10, { ...defaultAccuracy, levelDepthM: 0, gravityFrac: 0 }],
  ] as const)("agree by the criterion of JCGM 101, %s", (_, parts, accuracy) => {
    const cast = castWith(parts);
    const column = columnOf(cast, { accuracy });
    const firstOrder = uncertaintyAtDepths(column, cast, depthsM);
    const drawn = monteCarlo(column, cast, { trialCount: 10_000, seedIndex: 11, depthsM });
    depthsM.forEach((depthM, i) => {
      const both = `${depthM} m: ${drawn.standardKPa[i]} and ${firstOrder.combinedKPa[i]}`;
      expect(confirmsFirstOrder(drawn.standardKPa[i]!, firstOrder.combinedKPa[i]!), both).toBe(true);
    });
  });
});
