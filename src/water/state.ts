import {
  conservativeTemperature,
  inSituTemperature,
  practicalSalinityFromReference,
  referenceSalinity,
} from "../gsw-ts-port/index.ts";
import type { WaterModel } from "./water-model.ts";

/** Salinity on the model's own scale from practical salinity, by the reference composition. NaN in, NaN out. */
export const ownSalinity = (model: WaterModel, practicalSalinity: number): number =>
  model.salinityScale === "practical" ? practicalSalinity : referenceSalinity(practicalSalinity);

/** Practical and absolute salinity back from the model's own. NaN in, NaN out. */
export const practicalSalinityOf = (model: WaterModel, salinity: number): number =>
  model.salinityScale === "practical" ? salinity : practicalSalinityFromReference(salinity);

export const absoluteSalinityOf = (model: WaterModel, salinity: number): number =>
  model.salinityScale === "absolute" ? salinity : referenceSalinity(salinity);

/** Temperature on the model's own scale from a measured one. NaN in, NaN out. */
export const ownTemperature = (
  model: WaterModel,
  at: { readonly salinity: number; readonly inSituTempC: number; readonly seaPressureDbar: number },
): number =>
  model.temperatureScale === "in-situ"
    ? at.inSituTempC
    : conservativeTemperature(absoluteSalinityOf(model, at.salinity), at.inSituTempC, at.seaPressureDbar);

/** In-situ temperature back from the model's own. NaN in, NaN out. */
export const inSituTemperatureOf = (
  model: WaterModel,
  at: { readonly salinity: number; readonly tempC: number; readonly seaPressureDbar: number },
): number =>
  model.temperatureScale === "in-situ"
    ? at.tempC
    : inSituTemperature(absoluteSalinityOf(model, at.salinity), at.tempC, at.seaPressureDbar);
