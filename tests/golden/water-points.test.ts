import { describe, expect, test } from "vitest";
import * as teos from "../../src/gsw-ts-port/index.ts";
import { expectWithin, TOLERANCE, type Tolerance } from "../support/tolerance.ts";
import pureWater from "./pure-water.json" with { type: "json" };
import points from "./water-points.json" with { type: "json" };

const { SP, t, p, C, SR, CT, lat } = points;
const sampleCount = SP.length;

function agrees(computed: (i: number) => number, expected: readonly number[], tolerance: Tolerance): void {
  expect(expected).toHaveLength(sampleCount);
  for (let i = 0; i < sampleCount; i++) {
    expectWithin(computed(i), expected[i]!, tolerance, `point ${i} (SP ${SP[i]}, t ${t[i]}, p ${p[i]})`);
  }
}

test("the table says where it comes from", () => {
  expect(points.source).toContain("TEOS-10 reference implementation");
  expect(points.units).toMatchObject({ SR: "g/kg", CT: "degC", rho: "kg/m3", beta: "kg/g", kappa: "1/Pa" });
  expect(sampleCount).toBeGreaterThan(300);
});

describe("at every point of the reference table", () => {
  test("practical salinity follows from conductivity", () => {
    // In pure water the reference rejects a zero that rounding made negative; here it is zero.
    const expected = points.SP_from_C.map((value, i) => value ?? SP[i]!);
    agrees((i) => teos.practicalSalinityFromConductivity(C[i]!, t[i]!, p[i]!), expected, TOLERANCE.salinity);
  });

  test("conductivity follows from practical salinity", () =>
    agrees((i) => teos.conductivityFromPracticalSalinity(SP[i]!, t[i]!, p[i]!), C, TOLERANCE.conductivity));

  test("reference and Baltic salinity agree", () => {
    agrees((i) => teos.referenceSalinity(SP[i]!), SR, TOLERANCE.absoluteSalinity);
    agrees((i) => teos.balticSalinity(SP[i]!), points.SA_baltic, TOLERANCE.absoluteSalinity);
    agrees((i) => teos.practicalSalinityFromReference(SR[i]!), SP, TOLERANCE.absoluteSalinity);
  });

  test("conservative temperature agrees, from in-situ and from potential temperature", () => {
    agrees((i) => teos.conservativeTemperature(SR[i]!, t[i]!, p[i]!), CT, TOLERANCE.temperature);
    agrees((i) => teos.conservativeTemperatureFromPotential(SR[i]!, points.pt0[i]!), CT, TOLERANCE.temperature);
  });

  test("potential temperature agrees, from in-situ and from conservative temperature", () => {
    agrees((i) => teos.potentialTemperature(SR[i]!, t[i]!, p[i]!), points.pt0, TOLERANCE.temperature);
    agrees((i) => teos.potentialTemperatureFromConservative(SR[i]!, CT[i]!), points.pt0, TOLERANCE.temperature);
  });

  test("in-situ temperature follows from conservative temperature", () =>
    agrees((i) => teos.inSituTemperature(SR[i]!, CT[i]!, p[i]!), points.t_from_CT, TOLERANCE.temperature));

  test("density and specific volume are equal to the last bit", () => {
    for (let i = 0; i < sampleCount; i++) {
      expect(teos.density(SR[i]!, CT[i]!, p[i]!)).toBe(points.rho[i]);
      expect(teos.specificVolume(SR[i]!, CT[i]!, p[i]!)).toBe(points.specvol[i]);
    }
  });

  test("potential density anomaly agrees", () =>
    agrees((i) => teos.potentialDensityAnomaly(SR[i]!, CT[i]!), points.sigma0, TOLERANCE.densityAnomaly));

  test("thermal expansion and haline contraction agree", () => {
    agrees((i) => teos.thermalExpansion(SR[i]!, CT[i]!, p[i]!), points.alpha, TOLERANCE.expansion);
    agrees((i) => teos.halineContraction(SR[i]!, CT[i]!, p[i]!), points.beta, TOLERANCE.slope);
  });

  test("sound speed and compressibility agree", () => {
    agrees((i) => teos.soundSpeed(SR[i]!, CT[i]!, p[i]!), points.sound_speed, TOLERANCE.soundSpeed);
    agrees((i) => teos.compressibility(SR[i]!, CT[i]!, p[i]!), points.kappa, TOLERANCE.slope);
  });

  test("density from the full Gibbs function agrees", () =>
    agrees((i) => teos.exactDensity(SR[i]!, t[i]!, p[i]!), points.rho_exact, TOLERANCE.exactDensity));

  test("the freezing temperature agrees", () =>
    agrees((i) => teos.freezingTemperature(SR[i]!, p[i]!), points.t_freezing, TOLERANCE.freezing));

  test("height in the standard ocean and gravity there agree", () => {
    agrees((i) => teos.standardOceanHeight(p[i]!, lat[i]!), points.z, TOLERANCE.height);
    agrees((i) => teos.gravity(lat[i]!, p[i]!), points.grav, TOLERANCE.gravity);
  });
});

describe("pure water", () => {
  test("has the density of IAPWS-95", () => {
    expect(pureWater.source).toContain("IAPWS-95");
    for (const row of pureWater.density) {
      const p = (row.absolute_pressure_MPa * 1e6 - teos.STANDARD_ATMOSPHERE_PA) / teos.PA_PER_DBAR;
      const what = `pure water at ${row.temperature_degC} degC, ${row.absolute_pressure_MPa} MPa`;
      expectWithin(
        teos.exactDensity(0, row.temperature_degC, p),
        row.density_kg_m3,
        TOLERANCE.twoWaterFormulations,
        what,
      );
      const speed = teos.exactSoundSpeed(0, row.temperature_degC, p);
      expectWithin(speed, row.sound_speed_m_s, TOLERANCE.twoWaterSoundSpeeds, what);
    }
  });
});
