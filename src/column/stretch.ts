import { integrateOde } from "../base/index.ts";
import { PA_PER_DBAR } from "../gsw-ts-port/index.ts";
import { type WaterModel, waterModel } from "../water/index.ts";
import type { Column } from "./column.ts";
import { gravityByDepth } from "./gravity.ts";

/** What integration needs to know of a column, whether finished or still being made. */
export type ColumnFrame = Pick<Column, "coordinate" | "latitudeDeg"> & { readonly model: WaterModel };

export const frameOf = (column: Column): ColumnFrame => ({
  coordinate: column.coordinate,
  latitudeDeg: column.latitudeDeg,
  model: waterModel(column.basis.water),
});

/** The knots that stretches run between; `along` is depth in m or sea pressure in dbar, as the column's coordinate says. */
export interface StretchEnds {
  readonly along: Float64Array;
  readonly salinity: Float64Array;
  readonly tempC: Float64Array;
}

/**
 * Water whose own salinity and temperature are linear in one coordinate (depth in m or sea pressure in dbar), and the
 * hydrostatic equation dp/dz = rho(S, T, p) g(z) through it, either way. One is made per column and laid anew over each
 * pair of samples.
 */
export class Stretch {
  readonly #byDepth: boolean;
  #start = 0;
  #salinity = Number.NaN;
  #salinityRate = 0;
  #tempC = Number.NaN;
  #tempRate = 0;
  readonly #density: WaterModel["density"];
  readonly #gravity: (depthM: number) => number;

  constructor(frame: ColumnFrame) {
    this.#byDepth = frame.coordinate === "depth";
    this.#density = frame.model.density;
    this.#gravity = gravityByDepth(frame.latitudeDeg);
  }

  /** Water of one salinity and temperature, as in a gap. */
  hold(salinity: number, tempC: number): void {
    this.#start = 0;
    this.#salinity = salinity;
    this.#tempC = tempC;
    this.#salinityRate = 0;
    this.#tempRate = 0;
  }

  /** Linear from knot k to the next; two knots at one place leave no stretch between them. */
  between({ along, salinity, tempC }: StretchEnds, k: number): void {
    this.hold(salinity[k]!, tempC[k]!);
    const length = along[k + 1]! - along[k]!;
    if (!(length > 0)) return;
    this.#start = along[k]!;
    this.#salinityRate = (salinity[k + 1]! - salinity[k]!) / length;
    this.#tempRate = (tempC[k + 1]! - tempC[k]!) / length;
  }

  salinityAt(depthM: number, seaPressureDbar: number): number {
    return this.#salinity + this.#salinityRate * this.#along(depthM, seaPressureDbar);
  }

  tempCAt(depthM: number, seaPressureDbar: number): number {
    return this.#tempC + this.#tempRate * this.#along(depthM, seaPressureDbar);
  }

  /** Sea pressure in dbar at `toDepthM`, given it at `fromDepthM`. */
  pressureDown(fromDepthM: number, fromPressureDbar: number, toDepthM: number): number {
    return integrateOde(this.#dbarPerM, fromDepthM, fromPressureDbar, toDepthM);
  }

  /** Depth in m at `toPressureDbar`, given it at `fromPressureDbar`. */
  depthDown(fromPressureDbar: number, fromDepthM: number, toPressureDbar: number): number {
    return integrateOde(this.#mPerDbar, fromPressureDbar, fromDepthM, toPressureDbar);
  }

  #along(depthM: number, seaPressureDbar: number): number {
    return (this.#byDepth ? depthM : seaPressureDbar) - this.#start;
  }

  readonly #dbarPerM = (depthM: number, seaPressureDbar: number): number => {
    const along = this.#along(depthM, seaPressureDbar);
    const rhoKgM3 = this.#density(
      this.#salinity + this.#salinityRate * along,
      this.#tempC + this.#tempRate * along,
      seaPressureDbar,
    );
    return (rhoKgM3 * this.#gravity(depthM)) / PA_PER_DBAR;
  };

  readonly #mPerDbar = (seaPressureDbar: number, depthM: number): number => 1 / this.#dbarPerM(depthM, seaPressureDbar);
}
