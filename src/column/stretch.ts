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
    this.between(0, salinity, tempC, 0, salinity, tempC);
  }

  /** Linear from one sample to the next; the coordinate is the column's own. */
  between(from: number, salinity0: number, tempC0: number, to: number, salinity1: number, tempC1: number): void {
    const length = to - from;
    this.#start = from;
    this.#salinity = salinity0;
    this.#tempC = tempC0;
    this.#salinityRate = length > 0 ? (salinity1 - salinity0) / length : 0;
    this.#tempRate = length > 0 ? (tempC1 - tempC0) / length : 0;
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
