export { waterLabel, waterModel } from "./choose.ts";
export { eos80Density } from "./eos80.ts";
export { agencySalinity, pureWaterDensity, saundersPressure, unescoDepth } from "./handbook.ts";
export { limnologicalDensity } from "./limnological.ts";
export { sedimentLadenDensity } from "./sediment.ts";
export { practicalSalinityFromSpecificConductance } from "./specific-conductance.ts";
export { absoluteSalinityOf, inSituTemperatureOf, ownSalinity, ownTemperature, practicalSalinityOf } from "./state.ts";
export type { WaterChoice, WaterModel, WaterModelId } from "./water-model.ts";
