import {
  conservativeTemperature,
  density,
  halineContraction,
  inSituTemperature,
  PA_PER_DBAR,
  thermalExpansion,
} from "../gsw-ts-port/index.ts";
import { absoluteSalinityOf, type WaterModel, waterModel } from "../water/index.ts";
import type { Column } from "./column.ts";
import { gravityAtPressureMs2 } from "./gravity.ts";

/** Buoyancy frequency squared between neighbouring samples; entry k belongs to the water from knot k to knot k + 1. */
export interface BuoyancyFrequency {
  readonly squaredPerS2: Float64Array;
  readonly midSeaPressureDbar: Float64Array;
}

/**
 * Buoyancy frequency squared, s-2, on the raw column (n - 1 values; NaN where two samples share a pressure, negative
 * where the water is unstable). For TEOS-10: g^2 rho (beta dSA - alpha dCT) / dp at the mean of salinity, temperature
 * and pressure (IOC, SCOR & IAPSO 2010, eq. 3.10.2). For the other models: both samples are brought to the mid-pressure
 * without heat exchange and their densities by that model are compared there, which is the same to second order.
 */
export function buoyancyFrequency(column: Column): BuoyancyFrequency {
  const intervals = Math.max(column.n - 1, 0);
  const squaredPerS2 = new Float64Array(intervals);
  const midSeaPressureDbar = new Float64Array(intervals);
  const model = waterModel(column.basis.water);
  const densityStep = model.id === "teos10" ? byExpansion : byDisplacement(model);
  const { seaPressureDbar, salinity, tempC, latitudeDeg } = column;
  for (let k = 0; k < intervals; k++) {
    const upper = { salinity: salinity[k]!, tempC: tempC[k]!, seaPressureDbar: seaPressureDbar[k]! };
    const lower = { salinity: salinity[k + 1]!, tempC: tempC[k + 1]!, seaPressureDbar: seaPressureDbar[k + 1]! };
    const midDbar = (upper.seaPressureDbar + lower.seaPressureDbar) / 2;
    const gravityMs2 =
      (gravityAtPressureMs2(latitudeDeg, upper.seaPressureDbar) +
        gravityAtPressureMs2(latitudeDeg, lower.seaPressureDbar)) /
      2;
    const pressureStepPa = (lower.seaPressureDbar - upper.seaPressureDbar) * PA_PER_DBAR;
    midSeaPressureDbar[k] = midDbar;
    squaredPerS2[k] =
      pressureStepPa > 0 ? (gravityMs2 * gravityMs2 * densityStep(upper, lower, midDbar)) / pressureStepPa : Number.NaN;
  }
  return { squaredPerS2, midSeaPressureDbar };
}

interface WaterState {
  readonly salinity: number;
  readonly tempC: number;
  readonly seaPressureDbar: number;
}

/** What makes the water heavier downward, kg/m3, compressibility left out. */
type DensityStep = (upper: WaterState, lower: WaterState, midDbar: number) => number;

/** rho (beta dSA - alpha dCT). */
const byExpansion: DensityStep = (upper, lower, midDbar) => {
  const absSalinityGKg = (upper.salinity + lower.salinity) / 2;
  const consTempC = (upper.tempC + lower.tempC) / 2;
  return (
    density(absSalinityGKg, consTempC, midDbar) *
    (halineContraction(absSalinityGKg, consTempC, midDbar) * (lower.salinity - upper.salinity) -
      thermalExpansion(absSalinityGKg, consTempC, midDbar) * (lower.tempC - upper.tempC))
  );
};

/** Density of the lower less the upper water, both moved to the mid-pressure keeping their salt and heat. */
const byDisplacement =
  (model: WaterModel): DensityStep =>
  (upper, lower, midDbar) =>
    movedDensity(model, lower, midDbar) - movedDensity(model, upper, midDbar);

/** Density by a model of in-situ temperature after moving water to another pressure without heat exchange. */
function movedDensity(model: WaterModel, water: WaterState, toDbar: number): number {
  const absSalinityGKg = absoluteSalinityOf(model, water.salinity);
  const consTempC = conservativeTemperature(absSalinityGKg, water.tempC, water.seaPressureDbar);
  return model.density(water.salinity, inSituTemperature(absSalinityGKg, consTempC, toDbar), toDbar);
}
