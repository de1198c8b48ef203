import { PA_PER_DBAR } from "../gsw-ts-port/index.ts";
import { waterModel } from "../water/index.ts";
import type { Column } from "./column.ts";
import { gravityByDepth } from "./gravity.ts";
import { frameOf, Stretch } from "./stretch.ts";

/** Depth mean of density down to the bottom of the column, kg/m3: the bottom pressure over gravity and depth. */
export function meanDensityKgM3(column: Column): number {
  const last = column.n - 1;
  const stretch = new Stretch(frameOf(column));
  stretch.hold(column.salinity[last]!, column.tempC[last]!);
  const bottomDbar = stretch.pressureDown(column.depthM[last]!, column.seaPressureDbar[last]!, column.bottomDepthM);
  if (column.bottomDepthM === 0) return surfaceDensityKgM3(column);
  // Gravity is linear in depth, so its mean is its value halfway.
  const meanGravityMs2 = gravityByDepth(column.latitudeDeg)(column.bottomDepthM / 2);
  return (bottomDbar * PA_PER_DBAR) / (meanGravityMs2 * column.bottomDepthM);
}

/** Density of the held water at the surface, kg/m3. */
export const surfaceDensityKgM3 = (column: Column): number =>
  waterModel(column.basis.water).density(column.salinity[0]!, column.tempC[0]!, 0);

/** The density that the basis compares with, kg/m3. */
export function referenceDensityOf(unreferenced: Omit<Column, "referenceRhoKgM3">): number {
  const column: Column = { ...unreferenced, referenceRhoKgM3: Number.NaN };
  const choice = column.basis.referenceDensity;
  switch (choice.kind) {
    case "number":
      return choice.rhoKgM3;
    case "surface":
      return surfaceDensityKgM3(column);
    case "mean":
      return meanDensityKgM3(column);
  }
}
