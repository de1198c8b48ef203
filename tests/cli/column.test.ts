import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import golden from "../golden/columns.json";
import { FOLDER, testHost } from "../support/test-host.ts";

const CAST = `depth_m,temperature_degC,practical_salinity
0.5,18,3
2,16,12
4,14,25
`;

const column = async (files: Parameters<typeof testHost>[0], ...args: readonly string[]) => {
  const { host, said, written } = testHost(files);
  const status = await run(host, ["column", ...args]);
  return { status, ...said, written };
};

interface Json {
  version: string;
  basis: Record<string, unknown>;
  casts: {
    name: string;
    station: string | null;
    profile: Record<string, (number | null)[]> & { origin: string[] };
    levels: Record<string, (number | null)[]> & { origin: string[]; level: string[] };
    issues: { severity: string; code: string; message: string; line: number | null }[];
  }[];
}

describe("layerhead column --json", () => {
  it.each(golden.columns)("agrees with the independent integration: $name", async (reference) => {
    const rows = reference.depth_m.map((depth, i) =>
      [depth, reference.practical_salinity[i], reference.temperature_degC[i]].join(),
    );
    const file = `depth_m,practical_salinity,temperature_degC\n${rows.join("\n")}\n`;
    const levels = reference.query_depth_m.join();
    const { status, out } = await column(
      { "cast.csv": file },
      "cast.csv",
      "--latitude",
      String(reference.latitude),
      "--levels",
      levels,
      "--json",
    );
    expect(status).toBe(0);
    const [cast] = (JSON.parse(out) as Json).casts;
    const samples = (name: string) => cast!.profile[name]!.filter((_, i) => cast!.profile.origin[i] === "sample");
    reference.sea_pressure_dbar.forEach((p, i) => {
      expect(Math.abs(samples("sea_pressure_dbar")[i]! / p - 1)).toBeLessThan(1e-8);
    });
    reference.query_sea_pressure_dbar.forEach((p, i) => {
      expect(Math.abs(cast!.levels.sea_pressure_dbar![i]! - p)).toBeLessThanOrEqual(1e-8 * p);
    });
    reference.N2_per_s2.forEach((n2, i) => {
      const found = samples("buoyancy_frequency_squared_s-2")[i]!;
      expect(Math.abs(found - n2)).toBeLessThanOrEqual(1e-9 * Math.abs(n2) + 1e-15);
    });
  });

  it("has one entry a sample, one for the surface and one for the bed, null for what is missing", async () => {
    const { out } = await column({ "a.csv": CAST }, "a.csv", "--bed", "5", "--json");
    const { version, basis, casts } = JSON.parse(out) as Json;
    expect(version).toMatch(/^\d+\.\d+\.\d+$/);
    expect(basis).toMatchObject({ water: "teos10", bed_depth_m: 5, air_pressure_kPa: 101.325 });
    expect(casts[0]!.profile.origin).toEqual(["surface-gap", "sample", "sample", "sample", "bed-gap"]);
    expect(casts[0]!.profile.depth_m).toEqual([0, 0.5, 2, 4, 5]);
    expect(casts[0]!.profile.temperature_degC!.slice(1, 4)).toEqual([18, 16, 14]);
    expect(casts[0]!.profile.elevation_m).toEqual([null, null, null, null, null]);
    expect(casts[0]!.profile["buoyancy_frequency_squared_s-2"]!.map((value) => value === null)).toEqual([
      true,
      false,
      false,
      true,
      true,
    ]);
    expect(casts[0]!.issues.map((issue) => issue.code)).toContain("gravity-assumed");
  });

  it("takes every item of the basis from the options", async () => {
    const { out, status } = await column(
      { "a.csv": "depth_m,temperature_degC\n1,10\n9,8\n" },
      ..."a.csv --latitude -38.2 --water constant:1010 --salinity 0.3 --air-pressure 95 --reference-density mean --depth-made constant:1000 --json".split(
        " ",
      ),
    );
    expect(status).toBe(0);
    expect((JSON.parse(out) as Json).basis).toEqual({
      water: { constant_density_kg_m3: 1010 },
      latitude_deg: -38.2,
      air_pressure_kPa: 95,
      unmeasured_practical_salinity: 0.3,
      depth_made: { constant_density_kg_m3: 1000 },
      reference_density: "mean",
      surface_gap: "hold",
      bed_gap: "hold",
      bed_depth_m: null,
      water_surface_elevation_m: null,
      temperature_random_uncertainty_degC: 0.01,
      temperature_systematic_uncertainty_degC: 0.02,
      practical_salinity_random_uncertainty: 0.02,
      practical_salinity_systematic_uncertainty: 0.05,
      unmeasured_practical_salinity_uncertainty: 0.2,
      conductivity_random_uncertainty_mS_cm: 0.02,
      conductivity_systematic_uncertainty_mS_cm: 0.05,
      sample_depth_random_uncertainty_m: 0.02,
      sample_depth_systematic_uncertainty_m: 0.05,
      sea_pressure_random_uncertainty_dbar: 0.01,
      sea_pressure_systematic_uncertainty_dbar: 0.05,
      depth_scale_uncertainty_fraction: 0.002,
      level_depth_uncertainty_m: 0.02,
      gravity_uncertainty_fraction: null,
      air_pressure_uncertainty_kPa: 1,
      equation_of_state_uncertainty_kg_m3: 0.004,
      composition_uncertainty_fraction: 0.001,
    });
  });
});

describe("layerhead column on a terminal", () => {
  it("prints a table a cast, levels among the samples", async () => {
    const { out, status } = await column({ "a.csv": CAST }, "a.csv", "--latitude", "51.4", "--levels", "3");
    expect(status).toBe(0);
    expect(out).toMatchInlineSnapshot(`
      "a  (a.csv)
        51.4 deg N, 3 samples from 0.50 to 4.00 m
        TEOS-10, departure from 1025.000 kg/m3, air 101.325 kPa
        depth  temperature  salinity   density  sea pressure   gauge  absolute  departure  departure  departure
            m         degC         1     kg/m3          dbar     kPa       kPa        kPa          m          %
        0.000       18.000     3.000  1000.896        0.0000   0.000   101.325      0.000     0.0000          -  surface-gap
        0.500       18.000     3.000  1000.898        0.4910   4.910   106.235     -0.118    -0.0118     -2.408
        2.000       16.000    12.000  1008.144        1.9695  19.695   121.020     -0.420    -0.0417     -2.131
        3.000       15.006    18.500  1013.308        2.9612  29.612   130.937     -0.560    -0.0557     -1.890  level
        4.000       14.000    25.000  1018.496        3.9580  39.580   140.905     -0.649    -0.0645     -1.640
      "
    `);
  });

  it("shows a long cast thinned, and says so", async () => {
    const rows = Array.from({ length: 500 }, (_, i) => `${(i + 1) / 10},15,10`).join("\n");
    const { out } = await column({ "a.csv": `depth_m,temperature_degC,practical_salinity\n${rows}\n` }, "a.csv");
    expect(out).toContain("40 of 501 rows shown; --out DIR or --json gives all");
    expect(out).toContain("50.000");
  });
});

describe("layerhead column --out", () => {
  it("writes one CSV a cast and summary.csv, each with its metadata", async () => {
    const { written, status, out } = await column(
      { "a.csv": CAST, "b.csv": CAST },
      "a.csv",
      "b.csv",
      "--out",
      "results",
      "--levels",
      "1",
    );
    expect(status).toBe(0);
    expect(out).toBe("");
    const names = [...written.keys()].map((name) => name.replace("results/", ""));
    expect(names).toHaveLength(6);
    expect(names).toContain("summary.csv");
    expect(names.filter((name) => name.endsWith("-metadata.json"))).toHaveLength(3);
    const [profile] = [...written.values()];
    const lines = profile!.trim().split("\n");
    expect(lines[0]).toBe(
      "cast,depth_m,elevation_m,sea_pressure_dbar,gauge_pressure_kPa,absolute_pressure_kPa,temperature_degC,practical_salinity,absolute_salinity_g_kg,conservative_temperature_degC,density_kg_m3,sigma0_kg_m3,sound_speed_m_s,buoyancy_frequency_squared_s-2,constant_density_pressure_kPa,departure_kPa,departure_m,departure_percent,pressure_uncertainty_kPa,flag,origin",
    );
    expect(lines.slice(1).map((line) => line.split(",").at(-1))).toEqual([
      "surface-gap",
      "sample",
      "level",
      "sample",
      "sample",
    ]);
    const metadata = JSON.parse(written.get(`results/${names[1]}`)!);
    expect(metadata.tableSchema.columns.map((description: { name: string }) => description.name).join()).toBe(lines[0]);
    expect(metadata.notes[0].sources).toHaveLength(1);
    expect(metadata.notes[0].sources[0].sha256).toMatch(/^[0-9a-f]{64}$/);
  });
});

describe("layerhead column on bad input", () => {
  const good = { "good.csv": CAST };
  it.each([
    ["an empty file", { "bad.csv": "" }, "bad.csv"],
    ["no depth column", { "bad.csv": "temperature_degC,practical_salinity\n12,3\n11,4\n" }, "bad.csv"],
    ["one sample", { "bad.csv": "depth_m,temperature_degC,practical_salinity\n1,12,3\n" }, "bad.csv"],
    ["not a table at all", { "bad.csv": "Dear all,\nthe boat leaves at nine.\n" }, "bad.csv"],
    ["bytes that are no text", { "bad.csv": Uint8Array.from({ length: 300 }, (_, i) => (i * 7919) % 256) }, "bad.csv"],
    ["a folder", { "bad.csv": FOLDER }, "bad.csv"],
    ["no such file", {}, "missing.csv"],
    ["a name of no length", {}, ""],
  ] as const)("%s: one clear line, exit 2, the other file still done", async (_, files, name) => {
    const { status, err, out } = await column({ ...files, ...good }, name, "good.csv");
    expect(status).toBe(2);
    const about = err.split("\n").filter((line) => line !== "" && !line.startsWith("good.csv"));
    expect(about).toHaveLength(1);
    expect(about[0]!.length).toBeGreaterThan(20);
    expect(out).toContain("good.csv");
    expect(out).toContain("4.000");
  });

  it("text among the numbers is named by line, and its row left out", async () => {
    const { err, out, status } = await column({ "a.csv": CAST.replace("16,12", "warm,12") }, "a.csv");
    expect(err).toMatch(/a\.csv.*:3: .*"?warm"?/);
    expect(out).not.toContain("2.000 ");
    expect(status).toBe(0);
  });
});

describe("layerhead on a wrong command line", () => {
  it.each([
    [["column"], "name at least one cast file"],
    [["column", "a.csv", "--latitude", "95"], "--latitude 95: expected a number from -90 to 90 degrees"],
    [
      ["column", "a.csv", "--water", "salty"],
      "--water salty: expected teos10, exact, limnological, eos80 or constant:RHO",
    ],
    [["column", "a.csv", "--water", "constant:4"], "--water constant 4: expected a number from 500 to 3000 kg/m3"],
    [["column", "a.csv", "--levels", "1,,3"], "--levels"],
    [["column", "a.csv", "--reference-density", "heavy"], "expected surface, mean or a number"],
    [["column", "a.csv", "--colour"], "--colour"],
    [["swim"], "swim: no such command"],
    [[], "no command given"],
  ])("%j is one line and exit 64", async (args, message) => {
    const { host, said } = testHost({ "a.csv": CAST });
    expect(await run(host, args)).toBe(64);
    expect(said.err).toContain(message);
    expect(said.err.trim().split("\n")).toHaveLength(1);
  });

  it.each([["--help"], ["column", "--help"], ["water", "--help"], ["inspect", "--help"], ["--version"]])(
    "%j %j helps and exits 0",
    async (...args) => {
      const { host, said } = testHost();
      expect(await run(host, args.filter(Boolean))).toBe(0);
      expect(said.out.length).toBeGreaterThan(10);
    },
  );
});
