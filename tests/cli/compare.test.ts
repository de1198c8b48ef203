import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { testHost } from "../support/test-host.ts";

const CAST = "depth_m,temperature_degC,practical_salinity\n0,20,2\n10,16,15\n20,12,30\n";

async function compare(...args: readonly string[]) {
  const { host, said } = testHost({ "a.csv": CAST });
  const status = await run(host, ["compare", ...args]);
  return { status, ...said };
}

describe("layerhead compare", () => {
  it("holds every shortcut against the integrated pressure at the bottom", async () => {
    const { status, out } = await compare("a.csv", "--latitude", "51");
    expect(status).toBe(0);
    expect(out).toContain("at 20.000 m:");
    expect(out).toMatch(/-?\d+\.\d{3} +-\d+\.\d{3} .* fresh, 62\.4 lbf\/ft3/);
    expect(out).toMatch(/sea, 1025\.00 kg\/m3/);
  });

  it("gives the same as JSON at the levels asked for", async () => {
    const { out } = await compare("a.csv", "--levels", "5,20", "--reference-density", "1012", "--json");
    const [cast] = JSON.parse(out).casts;
    expect(cast.depth_m).toEqual([5, 20]);
    const own = cast.shortcuts.find((shortcut: { name: string }) => shortcut.name.startsWith("basis"));
    for (const i of [0, 1]) {
      expect(own.pressure_kPa[i] - own.error_kPa[i]).toBeCloseTo(cast.gauge_pressure_kPa[i], 10);
      expect(own.pressure_kPa[i]).toBeCloseTo((1012 * 9.80665 * cast.depth_m[i]) / 1000, 9);
    }
  });

  it("explains itself, and needs a file", async () => {
    expect((await compare("--help")).out).toContain("usage: layerhead compare");
    expect((await compare()).status).toBe(64);
  });
});
