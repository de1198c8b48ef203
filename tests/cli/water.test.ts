import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import points from "../golden/water-points.json";
import { testHost } from "../support/test-host.ts";

const water = async (table: string) => {
  const { host, said } = testHost({}, table);
  const status = await run(host, ["water", "-"]);
  const [head = "", ...rows] = said.out.trim().split("\n");
  const names = head.split(",");
  const cells = rows.map((row) => row.split(","));
  return { status, ...said, names, column: (name: string) => cells.map((row) => Number(row[names.indexOf(name)])) };
};

/** The reference has no conductivity for water without salt; those rows are null there. */
const expectRelative = (
  found: readonly number[],
  expected: readonly (number | null)[],
  relative: number,
  absolute = 0,
): void => {
  expected.forEach((value, i) => {
    if (value === null) return;
    expect(Math.abs(found[i]! - value), `row ${i}`).toBeLessThanOrEqual(relative * Math.abs(value) + absolute);
  });
};

describe("layerhead water against the TEOS-10 reference", () => {
  const rows = (salinity: readonly (number | null)[]) =>
    salinity.map((s, i) => [s, points.t[i], points.p[i]].join()).join("\n");

  it("agrees in every property at every point, from practical salinity", async () => {
    const { status, column } = await water(
      `practical_salinity,temperature_degC,sea_pressure_dbar\n${rows(points.SP)}\n`,
    );
    expect(status).toBe(0);
    expectRelative(column("density_kg_m3"), points.rho, 1e-12);
    expectRelative(
      column("density_kg_m3").map((rho) => 1 / rho),
      points.specvol,
      1e-12,
    );
    expectRelative(column("absolute_salinity_g_kg"), points.SR, 1e-14);
    expectRelative(column("conservative_temperature_degC"), points.CT, 1e-12, 1e-11);
    expectRelative(column("thermal_expansion_1_K"), points.alpha, 1e-11);
    expectRelative(column("haline_contraction_kg_g"), points.beta, 1e-11);
    expectRelative(column("sound_speed_m_s"), points.sound_speed, 1e-11);
    expectRelative(column("freezing_temperature_degC"), points.t_freezing, 0, 2e-3);
    expectRelative(column("density_exact_kg_m3"), points.rho_exact, 1e-9);
    expectRelative(column("sigma0_kg_m3"), points.sigma0, 0, 1e-9);
  });

  it("takes conductivity, and absolute salinity, and gives the same water", async () => {
    const byConductivity = await water(`conductivity_mS_cm,temperature_degC,sea_pressure_dbar\n${rows(points.C)}\n`);
    expectRelative(byConductivity.column("practical_salinity"), points.SP_from_C, 0, 1e-9);
    expect(points.SP_from_C.filter((salinity) => salinity !== null).length).toBeGreaterThan(330);
    const byAbsolute = await water(`absolute_salinity_g_kg,temperature_degC,sea_pressure_dbar\n${rows(points.SR)}\n`);
    expectRelative(byAbsolute.column("density_kg_m3"), points.rho, 1e-12);
  });
});

describe("layerhead water on tables as they come", () => {
  it("passes other columns through and adds only what is not there", async () => {
    const { names, out } = await water(
      "bottle,practical_salinity,temperature_degC,sea_pressure_dbar\n007,35,10,0\n=1+1,35,10,0\n",
    );
    expect(names.slice(0, 5)).toEqual([
      "bottle",
      "practical_salinity",
      "temperature_degC",
      "sea_pressure_dbar",
      "absolute_salinity_g_kg",
    ]);
    expect(out).toContain("\n007,");
    expect(out).toContain("\n'=1+1,");
  });

  it("leaves properties empty where a value is missing, and names what is no number", async () => {
    const { status, err, out } = await water(
      "practical_salinity,temperature_degC,sea_pressure_dbar\n35,,0\n35,ten,0\n",
    );
    expect(status).toBe(2);
    expect(err).toBe('-:3: temperature_degC is "ten", expected a number; this row\'s properties are left empty\n');
    expect(out.trim().split("\n")[1]).toMatch(/^35,,0,35\.16504,,/);
  });

  it.each([
    ["", "holds no table"],
    [
      "practical_salinity,temperature_degC\n35,10\n",
      "no column sea_pressure_dbar; found practical_salinity, temperature_degC",
    ],
    [
      "temperature_degC,sea_pressure_dbar\n10,0\n",
      "no column absolute_salinity_g_kg or practical_salinity or conductivity_mS_cm",
    ],
  ])("%j is bad input: %s", async (table, message) => {
    const { status, err } = await water(table);
    expect(status).toBe(2);
    expect(err).toContain(message);
  });
});
