import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type Accuracy,
  CONTRIBUTORS,
  type Column,
  defaultAccuracy,
  defaultBasis,
  describeAtDepths,
  integrateCast,
  uncertaintyAtDepths,
  uncertaintyOf,
  whereToImprove,
} from "../../src/column/index.ts";
import { IPTS68_PER_ITS90 } from "../../src/gsw-ts-port/index.ts";
import { eos80Density } from "../../src/water/index.ts";
import { anySamples } from "../support/any-samples.ts";
import { castOf } from "../support/cast-of.ts";

const RUNS = { seed: 20_261_201, numRuns: 150 };

const anyCast = anySamples(2, 30).map((samples) => castOf(samples));

const columnOf = (cast: Parameters<typeof integrateCast>[0], basis: Partial<Column["basis"]> = {}): Column => {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return outcome.value;
};

const ACCURACIES = (Object.keys(defaultAccuracy) as (keyof Accuracy)[]).filter((name) => name !== "gravityFrac");

describe("laws of the uncertainty", () => {
  it("a better sensor never raises it, at any depth", () => {
    fc.assert(
      fc.property(
        anyCast,
        fc.constantFrom(...ACCURACIES),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 200, noNaN: true }),
        (cast, name, factor, depthM) => {
          const column = columnOf(cast);
          const accuracy = { ...defaultAccuracy, [name]: defaultAccuracy[name]! * factor };
          const before = uncertaintyAtDepths(column, cast, [depthM]);
          const after = uncertaintyAtDepths({ ...column, basis: { ...column.basis, accuracy } }, cast, [depthM]);
          expect(after.combinedKPa[0]).toBeLessThanOrEqual(before.combinedKPa[0]!);
          expect(after.absCombinedKPa[0]).toBeLessThanOrEqual(before.absCombinedKPa[0]!);
        },
      ),
      RUNS,
    );
  });

  it("is the root of the sum of squares of its contributors, random and systematic apart", () => {
    fc.assert(
      fc.property(anyCast, (cast) => {
        const uncertainty = uncertaintyOf(columnOf(cast), cast);
        for (let i = 0; i < uncertainty.n; i++) {
          const all = Math.hypot(...CONTRIBUTORS.map((name) => uncertainty.contributionKPa[name][i]!));
          const apart = Math.hypot(uncertainty.randomKPa[i]!, uncertainty.systematicKPa[i]!);
          expect(Math.abs(uncertainty.combinedKPa[i]! - all)).toBeLessThanOrEqual(1e-12 * all);
          expect(Math.abs(apart - all)).toBeLessThanOrEqual(1e-12 * all);
        }
      }),
      RUNS,
    );
  });

  it("of a uniform column is the closed form", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 60 }),
        fc.double({ min: 0.1, max: 3, noNaN: true }),
        fc.double({ min: 1, max: 38, noNaN: true }),
        // Near 4 degC expansion changes sign, and with pressure, so that no one slope holds for the column.
        fc.double({ min: 8, max: 30, noNaN: true }),
        (n, stepM, salinity, tempC) => {
          const same = (value: number) => new Array<number>(n).fill(value);
          // From the surface down, so that there is no gap.
          const depthM = Array.from({ length: n }, (_, i) => i * stepM);
          const cast = castOf({ depthM, practicalSalinity: same(salinity), inSituTempC: same(tempC) });
          const column = columnOf(cast, { water: { id: "eos80" } });
          const { contributionKPa } = uncertaintyOf(column, cast);
          const of = (name: (typeof CONTRIBUTORS)[number]) => contributionKPa[name].at(-1)!;
          const bottomM = depthM.at(-1)!;
          const midDbar = column.seaPressureDbar.at(-1)! / 2;
          const densityAt = (s: number, t: number): number => eos80Density(s, t * IPTS68_PER_ITS90, midDbar);
          const perSalinity = (densityAt(salinity + 0.01, tempC) - densityAt(salinity - 0.01, tempC)) / 0.02;
          const perTemp = Math.abs(densityAt(salinity, tempC + 0.01) - densityAt(salinity, tempC - 0.01)) / 0.02;
          const g = 9.80665e-3;
          // Slopes are not quite straight lines in pressure.
          const near = (found: number, expected: number): void =>
            expect(Math.abs(found / expected - 1)).toBeLessThanOrEqual(1e-3);
          near(of("salinity-systematic"), g * bottomM * perSalinity * 0.05);
          near(of("temperature-systematic"), g * bottomM * perTemp * 0.02);
          // n samples, of which the first and last weigh half: the root of (n - 3/2) steps.
          near(of("salinity-random"), g * stepM * Math.sqrt(n - 1.5) * perSalinity * 0.02);
          near(of("temperature-random"), g * stepM * Math.sqrt(n - 1.5) * perTemp * 0.01);
          near(of("equation-of-state"), g * bottomM * 0.004);
          near(of("gravity"), 0.0015 * column.seaPressureDbar.at(-1)! * 10);
          for (const name of ["sample-depth-random", "sample-depth-systematic", "depth-scale", "sampling"] as const)
            expect(of(name)).toBeLessThan(1e-12);
        },
      ),
      RUNS,
    );
  });

  it("systematic errors do not shrink with more samples, random ones do", () => {
    const at = (n: number) => {
      const depthM = Array.from({ length: n }, (_, i) => (10 * i) / (n - 1));
      const same = (value: number) => new Array<number>(n).fill(value);
      const cast = castOf({ depthM, practicalSalinity: same(20), inSituTempC: same(10) });
      return uncertaintyOf(columnOf(cast), cast);
    };
    const [few, many] = [at(11), at(1001)];
    expect(many.contributionKPa["salinity-systematic"].at(-1)).toBeCloseTo(
      few.contributionKPa["salinity-systematic"].at(-1)!,
      8,
    );
    expect(many.randomKPa.at(-1)! / few.randomKPa.at(-1)!).toBeLessThan(0.11);
  });
});

/** Salinity that only grows downward, by jumps of any size at any depth. */
const monotoneWater = fc
  .array(
    fc.record({
      atM: fc.integer({ min: 0, max: 30_000 }).map((millimetres) => millimetres / 1000),
      jump: fc.double({ min: 0, max: 3, noNaN: true }),
    }),
    { minLength: 1, maxLength: 12 },
  )
  .map((jumps) => ({
    salinityAt: (depthM: number): number =>
      jumps.reduce((salinity, { atM, jump }) => salinity + (depthM > atM ? jump : 0), 1),
    jumps: jumps.map(({ atM }) => atM),
  }));

describe("the bound of what lies between samples", () => {
  const castOfWater = (salinityAt: (depthM: number) => number, depthM: readonly number[]) =>
    castOf({ depthM, practicalSalinity: depthM.map(salinityAt), inSituTempC: depthM.map(() => 12) });

  it("holds the true pressure of every monotone column, at samples and between", () => {
    fc.assert(
      fc.property(
        monotoneWater,
        fc.array(fc.double({ min: 0.1, max: 6, noNaN: true }), { minLength: 4, maxLength: 20 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        ({ salinityAt, jumps }, stepsM, share) => {
          let depth = 0;
          const depthM = [0, ...stepsM.map((stepM) => (depth += stepM))];
          // The truth: a pair of samples around every jump, and all the coarse ones.
          const truthDepthM = [...new Set([...depthM, ...jumps.flatMap((atM) => [atM, atM + 1e-9])])]
            .filter((z) => z <= depth)
            .sort((a, b) => a - b);
          const truth = columnOf(castOfWater(salinityAt, truthDepthM));
          const coarseCast = castOfWater(salinityAt, depthM);
          const coarse = columnOf(coarseCast);
          const askedM = [...depthM, share * depth];
          const { boundKPa } = uncertaintyAtDepths(coarse, coarseCast, askedM).sampling;
          const trueKPa = describeAtDepths(truth, askedM).gaugePressureKPa;
          const foundKPa = describeAtDepths(coarse, askedM).gaugePressureKPa;
          askedM.forEach((_, i) => {
            // Density is not quite a straight line where salinity is: within 0.2 per cent of the step's half.
            expect(Math.abs(trueKPa[i]! - foundKPa[i]!)).toBeLessThanOrEqual(boundKPa[i]! * 1.002 + 1e-7);
          });
        },
      ),
      RUNS,
    );
  });

  it("falls to nothing as samples come close", () => {
    const boundAt = (n: number): number => {
      const depthM = Array.from({ length: n }, (_, i) => (20 * i) / (n - 1));
      const cast = castOfWater((z) => 15 + 10 * Math.tanh((z - 8) / 1.5), depthM);
      return uncertaintyOf(columnOf(cast), cast).sampling.boundKPa.at(-1)!;
    };
    expect(boundAt(401) / boundAt(41)).toBeCloseTo(0.1, 3);
  });
});

describe("what would help", () => {
  it("never promises that a sample or sensor makes it worse, and puts the best first", () => {
    fc.assert(
      fc.property(anyCast, fc.double({ min: 0.01, max: 60, noNaN: true }), (cast, depthM) => {
        const column = columnOf(cast);
        const now = uncertaintyAtDepths(column, cast, [depthM]).combinedKPa[0]!;
        const improvements = whereToImprove(column, cast, depthM);
        expect(improvements.length).toBeGreaterThan(0);
        improvements.forEach(({ combinedKPa, gainFrac }, i) => {
          expect(combinedKPa).toBeLessThan(now);
          expect(Math.abs(combinedKPa - now * (1 - gainFrac))).toBeLessThan(1e-12);
          if (i > 0) expect(gainFrac).toBeLessThanOrEqual(improvements[i - 1]!.gainFrac);
        });
      }),
      RUNS,
    );
  });
});
