export { waterModel } from "./choose.ts";
export { practicalSalinityFromSpecificConductance } from "./specific-conductance.ts";
export { absoluteSalinityOf, inSituTemperatureOf, ownSalinity, ownTemperature, practicalSalinityOf } from "./state.ts";
export type { WaterChoice, WaterModel, WaterModelId } from "./water-model.ts";
