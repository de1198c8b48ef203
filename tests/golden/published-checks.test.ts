import { describe, expect, test } from "vitest";
import * as teos from "../../src/gsw-ts-port/index.ts";
import { hillSalinity, temperatureFactor } from "../../src/gsw-ts-port/practical-salinity-scale.ts";
import { iapws95LiquidDensity } from "../support/iapws95.ts";
import { expectWithin, TOLERANCE } from "../support/tolerance.ts";
import checks from "./published-checks.json" with { type: "json" };

type Values = Readonly<Record<string, number>>;
type Compute = (inputs: Values) => Values;

/** IPTS-68 inputs reach the functions of ITS-90 temperature through the same factor as in the code under test. */
const its90 = (t68: number): number => t68 / teos.IPTS68_PER_ITS90;
const seaPressure = (absoluteMPa: number): number =>
  (absoluteMPa * 1e6 - teos.STANDARD_ATMOSPHERE_PA) / teos.PA_PER_DBAR;

/** What to compute for the checks whose description starts so. */
const computations: readonly (readonly [start: string, compute: Compute])[] = [
  [
    "1.1 SP from conductivity ratio",
    ({ R, t68_C, p_dbar }) => ({ SP: teos.practicalSalinityFromRatio(R!, t68_C!, p_dbar!) }),
  ],
  [
    "1.1 cond. ratio from SP",
    ({ SP, t68_C, p_dbar }) => ({
      R: teos.conductivityFromPracticalSalinity(SP!, its90(t68_C!), p_dbar!) / teos.STANDARD_CONDUCTIVITY_MS_CM,
    }),
  ],
  ["1.1 SP from Rt", ({ Rt, t68_C }) => ({ SP: teos.practicalSalinityFromSurfaceRatio(Rt!, t68_C!) })],
  [
    "1.1 unit trap",
    ({ C_mS_cm, t68_C, p_dbar }) => ({
      R: C_mS_cm! / teos.STANDARD_CONDUCTIVITY_MS_CM,
      SP: teos.practicalSalinityFromConductivity(C_mS_cm!, its90(t68_C!), p_dbar!),
    }),
  ],
  [
    "1.2 original Hill",
    ({ C_mS_cm, t90_C }) => {
      // At sea pressure 0 the surface ratio is the conductivity over that of SP 35 at the same temperature.
      const Rt = C_mS_cm! / teos.conductivityFromPracticalSalinity(35, t90_C!, 0);
      return { SP: hillSalinity(Math.sqrt(Rt), temperatureFactor(teos.IPTS68_PER_ITS90 * t90_C!)) };
    },
  ],
  [
    "1.4 salinity from specific conductance at 25 C (PSS-78",
    ({ SC25_uS_cm }) => ({ SP: teos.practicalSalinityFromConductivity(SC25_uS_cm! / 1000, 25, 0) }),
  ],
  ["1.5 IPTS-68/ITS-90", ({ t90_C }) => ({ t68_C: teos.IPTS68_PER_ITS90 * t90_C! })],
  [
    "1.3 C from SP",
    ({ SP, t90_C, p_dbar }) => ({ C_mS_cm: teos.conductivityFromPracticalSalinity(SP!, t90_C!, p_dbar!) }),
  ],
  ["1.", ({ C_mS_cm, t90_C, p_dbar }) => ({ SP: teos.practicalSalinityFromConductivity(C_mS_cm!, t90_C!, p_dbar!) })],
  ["2.1 reference salinity", ({ SP }) => ({ SR_g_kg: teos.referenceSalinity(SP!) })],
  ["2.3 Baltic", ({ SP }) => ({ SA_g_kg: teos.balticSalinity(SP!) })],
  [
    "2.5 Conservative Temperature",
    ({ SA, t90_C, p_dbar }) => ({
      CT_C: teos.conservativeTemperature(SA!, t90_C!, p_dbar!),
      pt0_C: teos.potentialTemperature(SA!, t90_C!, p_dbar!),
    }),
  ],
  [
    "3.1 75-term",
    ({ SA, CT, p_dbar }) => ({
      specvol: teos.specificVolume(SA!, CT!, p_dbar!),
      rho: teos.density(SA!, CT!, p_dbar!),
      alpha: teos.thermalExpansion(SA!, CT!, p_dbar!),
      beta: teos.halineContraction(SA!, CT!, p_dbar!),
    }),
  ],
  [
    "3.1/3.2 density",
    ({ SA, t90_C, p_dbar }) => ({
      rho_exact: teos.exactDensity(SA!, t90_C!, p_dbar!),
      rho_75: teos.density(SA!, teos.conservativeTemperature(SA!, t90_C!, p_dbar!), p_dbar!),
    }),
  ],
  ["3.5 ITTC", ({ SA, t90_C, p_dbar_sea }) => ({ rho: teos.exactDensity(SA!, t90_C!, p_dbar_sea!) })],
  ["4.1 gravity", ({ lat, p_dbar }) => ({ g: teos.gravity(lat!, p_dbar!) })],
  ["4.2 z from p", ({ p_dbar, lat }) => ({ z_m: teos.standardOceanHeight(p_dbar!, lat!) })],
  ["4.2 p from z", ({ z_m, lat }) => ({ p_dbar: teos.standardOceanPressure(z_m!, lat!) })],
];

/** Checks that need a test of their own, below. */
const ATLAS = ["C055", "C056", "C057"];
const PURE_WATER = ["C110", "C111", "C112", "C113"];
const OUT_OF_RANGE = ["C116"];
/** The release adds its saline part to IAPWS-95, where the product has the simpler IAPWS SR7-09 for the water part. */
const SALINE_RELEASE = ["C115", "C116", "C117"];
const apart = new Set([...ATLAS, ...PURE_WATER, ...SALINE_RELEASE]);

const valuesOf = (record: object): Values =>
  Object.fromEntries(Object.entries(record).filter((entry): entry is [string, number] => typeof entry[1] === "number"));
const named = (ids: readonly string[]) => checks.filter(({ id }) => ids.includes(id));

describe("published and computed single values", () => {
  for (const check of checks.filter(({ id }) => !apart.has(id))) {
    test(`${check.id} ${check.method}: ${JSON.stringify(check.inputs)} (${check.source})`, () => {
      const computation = computations.find(([start]) => check.method.startsWith(start));
      expect(computation, `no computation for ${check.method}`).toBeDefined();
      const results = computation![1](valuesOf(check.inputs));
      const expected = Object.entries(valuesOf(check.expected));
      expect(expected.length).toBeGreaterThan(0);
      for (const [name, value] of expected) {
        expectWithin(results[name]!, value, { absolute: check.tolerance, reason: check.source }, name);
      }
    });
  }

  test.each(named(PURE_WATER))("$id: the density of IAPWS-95 is met by the simpler formulation in use", (check) => {
    const { t90_C, p_MPa_abs } = valuesOf(check.inputs);
    const rho = teos.exactDensity(0, t90_C!, seaPressure(p_MPa_abs!));
    expectWithin(rho, valuesOf(check.expected).rho!, TOLERANCE.twoWaterFormulations, "rho");
    const truth = iapws95LiquidDensity(teos.CELSIUS_ZERO_K + t90_C!, p_MPa_abs!);
    expectWithin(truth, valuesOf(check.expected).rho!, { absolute: check.tolerance, reason: check.source }, "IAPWS-95");
  });

  test.each(named(ATLAS))("$id: leaving the composition anomaly out costs less than 0.001 g/kg", (check) => {
    const SA = teos.referenceSalinity(valuesOf(check.inputs).SP!);
    expect(Math.abs(SA - valuesOf(check.expected).SA_g_kg!)).toBeLessThan(0.001);
  });

  test.each(named(OUT_OF_RANGE))(
    "$id: 353 K and 100 g/kg are beyond the water and saline parts in use, and said so",
    (check) => {
      const { T_K, S_kg_kg, p_MPa } = valuesOf(check.inputs);
      const p = seaPressure(p_MPa!);
      expect(teos.isWithinRange(S_kg_kg! * 1000, T_K! - teos.CELSIUS_ZERO_K, p)).toBe(false);
      expect(teos.isWithinRange(35, T_K! - teos.CELSIUS_ZERO_K, p)).toBe(false);
      expect(teos.isWithinRange(S_kg_kg! * 1000, 20, p)).toBe(false);
    },
  );

  test.each(named(SALINE_RELEASE))("$id: the saline part upon IAPWS-95 water is the volume of the release", (check) => {
    const { T_K, p_MPa, S_kg_kg } = valuesOf(check.inputs);
    const volume = (SA: number): number => 1 / teos.exactDensity(SA, T_K! - teos.CELSIUS_ZERO_K, seaPressure(p_MPa!));
    const salinePart = volume(S_kg_kg! * 1000) - volume(0);
    const tolerance = { absolute: check.tolerance, reason: check.source };
    const found = 1 / iapws95LiquidDensity(T_K!, p_MPa!) + salinePart;
    expectWithin(found, valuesOf(check.expected).specvol!, tolerance, "specvol");
  });

  test("no check is lost on the way", () => {
    expect(checks).toHaveLength(111);
    expect(named([...apart])).toHaveLength(apart.size);
  });
});
