import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { testHost } from "../support/test-host.ts";

const CAST = `depth_m,temperature_degC,practical_salinity
0.9,18,3
2,16,12
4,14,25
`;

const column = async (...args: readonly string[]) => {
  const { host, said } = testHost({ "a.csv": CAST });
  const status = await run(host, ["column", "a.csv", ...args]);
  return { status, ...said };
};

describe("layerhead column --uncertainty", () => {
  it("tells how far gauge and absolute pressure may be off, why at each level, and what would help", async () => {
    const { out, status } = await column("--latitude", "51.4", "--levels", "3,5", "--uncertainty");
    expect(status).toBe(0);
    expect(out).toMatchInlineSnapshot(`
      "a  (a.csv)
        51.4 deg N, 3 samples from 0.90 to 4.00 m
        TEOS-10, departure from 1025.000 kg/m3, air 101.325 kPa
        depth  temperature  salinity   density  sea pressure   gauge  absolute  gauge +-  absolute +-  departure  departure  departure
            m         degC         1     kg/m3          dbar     kPa       kPa  kPa, k=2     kPa, k=2        kPa          m          %
        0.000       18.000     3.000  1000.896        0.0000   0.000   101.325     0.000        2.000      0.000     0.0000          -  surface-gap
        0.900       18.000     3.000  1000.900        0.8839   8.839   110.164     0.015        2.000     -0.213    -0.0212     -2.408
        2.000       16.000    12.000  1008.144        1.9681  19.681   121.006     0.048        2.001     -0.434    -0.0431     -2.205
        3.000       15.006    18.500  1013.308        2.9598  29.598   130.923     0.420        2.044     -0.574    -0.0571     -1.939  level
        4.000       14.000    25.000  1018.496        3.9566  39.566   140.891     0.164        2.007     -0.663    -0.0659     -1.676
        5.000       14.000    25.000  1018.501        4.9559  49.559   150.884     0.432        2.046     -0.727    -0.0723     -1.467  level
        3 m: 29.598 +- 0.420 kPa (k = 2); depth of the level makes 90 % of it; the water between the samples 10 %
          would help most: depth of the level known twice as well (-43 %), one more sample at 2.50 m (-3 %)
        5 m: 49.559 +- 0.432 kPa (k = 2); depth of the level makes 85 % of it; the water between the samples 14 %
          would help most: depth of the level known twice as well (-40 %), one more sample at 3.00 m (-4 %)
      "
    `);
  });

  it("speaks of the bottom where there are no levels, and then not of a level's depth", async () => {
    const { out } = await column("--uncertainty");
    expect(out).toMatch(/^ {2}bottom: .* kPa \(k = 2\); /m);
    expect(out).not.toContain("depth of the level");
  });

  it("adds a cross-check that its seed repeats and another changes", async () => {
    const trials = ["--latitude", "51.4", "--levels", "3", "--monte-carlo", "20000"];
    const [first, again, other] = await Promise.all(
      ["7", "7", "8"].map(async (seed) => (await column(...trials, "--seed", seed)).out),
    );
    expect(first).toMatch(/Monte Carlo: mean \d+\.\d+ kPa, 95 % from .* agrees with the first-order/);
    expect(again).toBe(first);
    expect(other).not.toBe(first);
  });
});

describe("layerhead column --json", () => {
  it("has the uncertainty of every row, the budget of every level, and the trials that were asked for", async () => {
    const { out } = await column("--levels", "3,9", "--bed", "5", "--monte-carlo", "1000", "--json");
    const { casts, monte_carlo } = JSON.parse(out);
    expect(casts[0].profile.pressure_uncertainty_kPa).toHaveLength(5);
    const [budget, below] = casts[0].levels.uncertainty;
    expect(below).toBeNull();
    expect(casts[0].levels.pressure_uncertainty_kPa).toEqual([budget.combined_kPa, null]);
    expect(budget.expanded_kPa).toBe(2 * budget.combined_kPa);
    const shares = budget.contributors.map(({ share }: { share: number }) => share);
    expect(shares.reduce((sum: number, share: number) => sum + share, 0)).toBeCloseTo(1, 12);
    expect(shares).toEqual([...shares].sort((a, b) => b - a));
    expect(budget.sentence).toMatch(/ makes \d+ % of it/);
    expect(monte_carlo[0]).toMatchObject({ trials: 1000, seed: 1 });
    expect(monte_carlo[0].levels[0].standard_kPa / budget.combined_kPa).toBeGreaterThan(0.9);
    expect(monte_carlo[0].levels[1].mean_kPa).toBeNull();
  });
});

describe("layerhead column on wrong trials", () => {
  it.each([
    [["--seed", "3"], "--seed goes with --monte-carlo"],
    [["--monte-carlo", "10"], "--monte-carlo 10: expected a number from 100"],
    [["--monte-carlo", "1000.5"], "--monte-carlo 1000.5: expected a whole number"],
    [["--monte-carlo", "1000", "--seed", "x"], "--seed x: expected a number"],
  ])("%j is one line and exit 64", async (args, message) => {
    const { status, err } = await column(...args);
    expect(status).toBe(64);
    expect(err).toContain(message);
    expect(err.trim().split("\n")).toHaveLength(1);
  });
});
