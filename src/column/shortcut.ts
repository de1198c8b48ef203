import { waterModel } from "../water/index.ts";
import type { Column } from "./column.ts";
import { surfaceGravityMs2 } from "./gravity.ts";
import { KPA_PER_DBAR } from "./kilopascal.ts";
import { nodesAtDepths } from "./nodes.ts";
import { meanDensityKgM3, surfaceDensityKgM3 } from "./reference-density.ts";

/** A specific weight that an engineer might multiply the depth with. */
export interface Shortcut {
  readonly name: string;
  readonly weightKPaPerM: number;
}

/** Pound-force per cubic foot in kPa/m: exact, from the pound, the foot and standard gravity. */
const KPA_PER_M_OF_LBF_PER_FT3 = (0.45359237 * 9.80665) / 0.3048 ** 3 / 1000;

/** What handbooks print; a specific weight is one number, whatever the place's gravity. Common practice, no source. */
const HANDBOOK: readonly Shortcut[] = [
  { name: "fresh, 9.81 kN/m3", weightKPaPerM: 9.81 },
  { name: "fresh, 62.4 lbf/ft3", weightKPaPerM: 62.4 * KPA_PER_M_OF_LBF_PER_FT3 },
  { name: "sea, 10.05 kN/m3", weightKPaPerM: 10.05 },
  { name: "sea, 64.0 lbf/ft3", weightKPaPerM: 64 * KPA_PER_M_OF_LBF_PER_FT3 },
];

/** Every specific weight that comes to mind for a column: from handbooks, from densities, from its own samples. */
export function shortcutsFor(column: Column): readonly Shortcut[] {
  const gravityMs2 = surfaceGravityMs2(column.latitudeDeg);
  const byDensity = (name: string, rhoKgM3: number): Shortcut => ({
    name: `${name}, ${rhoKgM3.toFixed(2)} kg/m3`,
    weightKPaPerM: (rhoKgM3 * gravityMs2) / 1000,
  });
  const own = column.basis.referenceDensity;
  return [
    ...HANDBOOK,
    byDensity("fresh", 1000),
    byDensity("sea", 1025),
    byDensity("surface sample", surfaceDensityKgM3(column)),
    byDensity("depth mean", meanDensityKgM3(column)),
    byDensity("last sample", lastDensityKgM3(column)),
    ...(own.kind === "number" && own.rhoKgM3 !== 1000 && own.rhoKgM3 !== 1025 ? [byDensity("basis", own.rhoKgM3)] : []),
  ];
}

function lastDensityKgM3(column: Column): number {
  const last = column.n - 1;
  const density = waterModel(column.basis.water).density;
  return density(column.salinity[last]!, column.tempC[last]!, column.seaPressureDbar[last]!);
}

/** What a shortcut costs at some depths, one entry a depth. NaN where the column has no water; shares are NaN at the surface. */
export interface ShortcutCost {
  readonly shortcut: Shortcut;
  readonly pressureKPa: Float64Array;
  /** Shortcut less integrated gauge pressure: positive where the shortcut says too much. */
  readonly errorKPa: Float64Array;
  /** The error as a head of water of the shortcut's weight. */
  readonly errorM: Float64Array;
  /** The error over the integrated pressure. */
  readonly errorFrac: Float64Array;
  /** By how much a gauge that turns pressure into depth with this weight reads too deep. */
  readonly gaugeDepthErrorM: Float64Array;
}

/**
 * Specific weight times depth, for every shortcut, held against the integrated pressure.
 * @param depthsM below the water surface
 */
export function shortcutCosts(column: Column, depthsM: ArrayLike<number>): readonly ShortcutCost[] {
  const { depthM, seaPressureDbar } = nodesAtDepths(column, depthsM);
  const gaugeKPa = seaPressureDbar.map((dbar) => dbar * KPA_PER_DBAR);
  return shortcutsFor(column).map((shortcut) => {
    const { weightKPaPerM } = shortcut;
    const pressureKPa = depthM.map((depth, i) => (Number.isNaN(gaugeKPa[i]!) ? Number.NaN : weightKPaPerM * depth));
    const errorKPa = pressureKPa.map((pressure, i) => pressure - gaugeKPa[i]!);
    return {
      shortcut,
      pressureKPa,
      errorKPa,
      errorM: errorKPa.map((error) => error / weightKPaPerM),
      errorFrac: errorKPa.map((error, i) => error / gaugeKPa[i]!),
      gaugeDepthErrorM: gaugeKPa.map((pressure, i) => pressure / weightKPaPerM - depthM[i]!),
    };
  });
}
