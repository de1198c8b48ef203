import { describe, expect, it } from "vitest";
import { defaultBasis, describeAtDepths, integrateCast } from "../../src/column/index.ts";
import {
  agencySalinity,
  eos80Density,
  limnologicalDensity,
  pureWaterDensity,
  saundersPressure,
  sedimentLadenDensity,
  unescoDepth,
} from "../../src/water/index.ts";
import { castOf } from "../support/cast-of.ts";
import { iapws95 } from "../support/iapws95.ts";
import checks from "./water-models.json";

type Numbers = Readonly<Record<string, number>>;
interface Check {
  readonly id: string;
  readonly method: string;
  readonly inputs: Numbers;
  readonly expected: Numbers;
  readonly tolerance: number;
  readonly source: string;
}

/** Practical salinity of a TEOS-10 absolute salinity, so that a cast can carry it. */
const practical = (SA: number): number => (SA * 35) / 35.16504;

/** Sea pressure at a depth of a column of two samples, surface and bottom. */
function columnPressure(top: Numbers, bottom: Numbers, depthM: number, latitudeDeg: number | null): number {
  const cast = castOf(
    {
      depthM: [0, depthM],
      practicalSalinity: [practical(top.SA!), practical(bottom.SA!)],
      inSituTempC: [top.t!, bottom.t!],
    },
    { latitudeDeg },
  );
  const outcome = integrateCast(cast, { ...defaultBasis, water: { id: "exact" } });
  return outcome.ok ? describeAtDepths(outcome.value, [depthM]).seaPressureDbar[0]! : Number.NaN;
}

/** What computes each kind of check, by the first words of its method. */
const COMPUTE: readonly (readonly [string, (inputs: Numbers) => Numbers])[] = [
  ["1.4", ({ SC25_uS_cm }) => ({ S: agencySalinity(SC25_uS_cm! / 1000) })],
  ["3.3 EOS-80 density", ({ SP, t68_C, p_dbar }) => ({ rho: eos80Density(SP!, t68_C!, p_dbar!) })],
  [
    "3.3 EOS-80",
    ({ SP, t68_C, p_dbar }) => ({
      sigma: eos80Density(SP!, t68_C!, p_dbar!) - 1000,
      svan_1e8: (1 / eos80Density(SP!, t68_C!, p_dbar!) - 1 / eos80Density(35, 0, p_dbar!)) * 1e8,
    }),
  ],
  ["3.5 pure air-free water", ({ t90_C }) => ({ rho: pureWaterDensity(t90_C!) })],
  ["3.2 IAPWS-95", ({ T_K, rho }) => iapws95(T_K!, rho!)],
  ["3.4", ({ S_g_kg, t_C, p_bar_gauge }) => ({ rho: limnologicalDensity(S_g_kg!, t_C!, p_bar_gauge! * 10) })],
  ["3.6", ({ rho_w, rho_s, C_kg_m3 }) => ({ rho_b: sedimentLadenDensity(rho_w!, C_kg_m3!, rho_s!) })],
  ["4.2 Saunders", ({ depth_m, lat }) => ({ p_dbar: saundersPressure(depth_m!, lat!) })],
  ["4.2 UNESCO", ({ p_dbar, lat }) => ({ depth_m: unescoDepth(p_dbar!, lat!) })],
  [
    "4.3 own-density column, linear",
    ({ SA_top, SA_bot, t_top, t_bot, D_m }) => ({
      p_dbar: columnPressure({ SA: SA_top!, t: t_top! }, { SA: SA_bot!, t: t_bot! }, D_m!, null),
    }),
  ],
  [
    "4.3",
    ({ SA, t90_C, D_m, lat }) => ({
      p_dbar: columnPressure({ SA: SA!, t: t90_C! }, { SA: SA!, t: t90_C! }, D_m!, lat ?? null),
    }),
  ],
];

/** Half a unit in the last digit of a value as printed: no computation can be held closer to it. */
const printedTo = (value: number): number => 0.5 * 10 ** -(String(value).split(".")[1]?.length ?? 0);

/**
 * The anomaly printed with the 1983 listing (981.3021) came out of single-precision arithmetic, good to about 3e-7; in
 * double precision the listing itself and the full equation both give 981.3019.
 */
const SINGLE_PRECISION: Readonly<Record<string, number>> = { svan_1e8: 3e-7 };

describe("water models against published values", () => {
  it.each(checks as unknown as readonly Check[])("$id $method ($source)", ({ method, inputs, expected, tolerance }) => {
    const found = COMPUTE.find(([start]) => method.startsWith(start))![1](inputs);
    for (const [name, value] of Object.entries(expected)) {
      const allowed = Math.max(tolerance, printedTo(value), (SINGLE_PRECISION[name] ?? 0) * value);
      expect(Math.abs(found[name]! - value), `${name}: ${found[name]} for ${value}`).toBeLessThanOrEqual(allowed);
    }
  });
});
