import { describe, expect, it } from "vitest";
import { buoyancyFrequency } from "../../src/column/buoyancy-frequency.ts";
import { defaultBasis, integrateCast } from "../../src/column/index.ts";
import { squaredFrequency } from "../../src/column/stratification/buoyancy-profiles.ts";
import { bulkRichardson } from "../../src/column/stratification/flow-numbers.ts";
import { LinearProfile } from "../../src/column/stratification/linear-profile.ts";
import { stratificationMoments } from "../../src/column/stratification/moments.ts";
import { potentialEnergyAnomaly } from "../../src/column/stratification/potential-energy.ts";
import { bruntPeriodS } from "../../src/column/stratification/pycnoclines.ts";
import { thorpeSorting } from "../../src/column/stratification/thorpe.ts";
import { reducedGravity, twoLayerWaves } from "../../src/column/stratification/two-layers.ts";
import { modeSpeeds } from "../../src/column/stratification/vertical-modes.ts";
import { inSituTemperature } from "../../src/gsw-ts-port/index.ts";
import { castOf } from "../support/cast-of.ts";
import checks from "./stratification.json";

type Numbers = Readonly<Record<string, number>>;
type Arrays = Readonly<Record<string, readonly number[]>>;
type Found = Readonly<Record<string, number | ArrayLike<number>>>;

/** Buoyancy frequency squared of a cast given on the standard's own scales. */
function buoyancyOf({ SA, CT, p_dbar }: Arrays, latitudeDeg: number): Found {
  const cast = castOf({
    seaPressureDbar: p_dbar!,
    practicalSalinity: SA!.map((salinity) => (salinity * 35) / 35.16504),
    inSituTempC: CT!.map((tempC, i) => inSituTemperature(SA![i]!, tempC, p_dbar![i]!)),
  });
  const outcome = integrateCast(cast, { ...defaultBasis, latitudeDeg });
  if (!outcome.ok) throw new Error("no column");
  const { squaredPerS2, midSeaPressureDbar } = buoyancyFrequency(outcome.value);
  return { N2: squaredPerS2, p_mid: midSeaPressureDbar };
}

/** Density less its middle value, a tanh of depth, between two depths and at even steps. */
function tanhProfile(
  { d_rho, delta, centre }: { readonly d_rho: number; readonly delta: number; readonly centre: number },
  [fromM, toM]: readonly [number, number],
  steps: number,
): LinearProfile {
  const depthM = Float64Array.from({ length: steps + 1 }, (_, i) => fromM + ((toM - fromM) * i) / steps);
  return new LinearProfile(
    depthM,
    depthM.map((depth) => (d_rho / 2) * Math.tanh((depth - centre) / delta)),
  );
}

const profile = (depthM: readonly number[], rhoKgM3: readonly number[]): LinearProfile =>
  new LinearProfile(Float64Array.from(depthM), Float64Array.from(rhoKgM3));

/** What computes each check, by the first words of its method. */
const COMPUTE: readonly (readonly [string, (inputs: Numbers & Arrays) => Found])[] = [
  [
    "7.4 Thorpe",
    ({ depth, rho }) => {
      const { displacementM, rmsDisplacementM } = thorpeSorting(
        Float64Array.from(depth!),
        Float64Array.from(rho!),
        0.03,
      );
      return { thorpe_disp_sorted_minus_obs: displacementM, L_T: rmsDisplacementM };
    },
  ],
  ["8.1 N2", (inputs) => buoyancyOf(inputs, inputs.lat!)],
  [
    "8.1 tanh max N",
    ({ d_rho, delta, rho0, g }) => {
      const centre = 1e-6 * delta!;
      const tanh = tanhProfile({ d_rho: d_rho!, delta: delta!, centre }, [0, 2 * centre], 1);
      const squared = squaredFrequency(
        { gravityMs2: g!, meanRhoKgM3: rho0! },
        tanh.values[1]! - tanh.values[0]!,
        2 * centre,
      );
      return { N: Math.sqrt(squared), period_s: bruntPeriodS(squared) };
    },
  ],
  [
    "8.3",
    ({ delta }) => {
      const half = 20 * delta!;
      // The width of straight pieces is that of the curve to h^2 / 12: half a million of them are short enough.
      const tanh = tanhProfile({ d_rho: 20, delta: delta!, centre: 0 }, [-half, half], 500_000);
      return { rms_width: stratificationMoments(tanh)!.rmsWidthM };
    },
  ],
  [
    "8.5 potential energy anomaly two-layer",
    ({ h1, h2, d_rho, g }) => ({
      phi: potentialEnergyAnomaly(profile([0, h1!, h1!, h1! + h2!], [1005, 1005, 1005 + d_rho!, 1005 + d_rho!]), g!),
    }),
  ],
  [
    "8.5 potential energy anomaly linear",
    ({ H, d_rho, g }) => ({ phi: potentialEnergyAnomaly(profile([0, H!], [1000, 1000 + d_rho!]), g!) }),
  ],
  [
    "8.6 mode speeds uniform N",
    ({ N, H }) => {
      const setting = { gravityMs2: 9.80665, meanRhoKgM3: 1000 };
      const gain = (N! ** 2 * H! * setting.meanRhoKgM3) / setting.gravityMs2;
      return { c: modeSpeeds(profile([0, H!], [1000, 1000 + gain]), setting, 3) };
    },
  ],
  [
    "8.6 mode speeds tanh",
    ({ d_rho, delta, centre, H, rho0, g }) => {
      const tanh = tanhProfile({ d_rho: d_rho!, delta: delta!, centre: centre! }, [0, H!], 5000);
      const [c1, c2, c3] = modeSpeeds(tanh, { gravityMs2: g!, meanRhoKgM3: rho0! }, 3);
      return { c1: c1!, c2: c2!, c3: c3! };
    },
  ],
  [
    "8.6 two-layer long wave",
    ({ h1, h2, rho1, rho2, g }) => {
      const waves = twoLayerWaves({
        upperThicknessM: h1!,
        lowerThicknessM: h2!,
        gravityMs2: g!,
        reducedGravityMs2: reducedGravity(g!, rho1!, rho2!),
      });
      return { c_rigid_lid: waves.rigidLidMs, c_free_surface: waves.freeSurfaceMs, c_external: waves.externalMs };
    },
  ],
  [
    "8.7 bulk Richardson",
    ({ d_rho, rho0, h, dU, g }) => ({
      Ri_b: bulkRichardson(
        { gravityMs2: g!, meanRhoKgM3: rho0! },
        { rhoStepKgM3: d_rho!, thicknessM: h!, velocityStepMs: dU! },
      ),
    }),
  ],
];

interface Check {
  readonly id: string;
  readonly method: string;
  readonly inputs: Numbers & Arrays;
  readonly expected: Found;
  readonly tolerance: number;
  readonly source: string;
}

const asArray = (values: number | ArrayLike<number>): readonly number[] =>
  typeof values === "number" ? [values] : Array.from(values);

describe("stratification against closed forms and reference values", () => {
  it.each(checks as unknown as readonly Check[])("$id $method ($source)", ({ method, inputs, expected, tolerance }) => {
    const found = COMPUTE.find(([start]) => method.startsWith(start))![1](inputs);
    for (const [name, values] of Object.entries(expected)) {
      const foundValues = asArray(found[name]!);
      expect(foundValues.length, name).toBe(asArray(values).length);
      asArray(values).forEach((value, i) => {
        expect(Math.abs(foundValues[i]! - value), `${name}: ${foundValues[i]} for ${value}`).toBeLessThanOrEqual(
          tolerance,
        );
      });
    }
  });
});
