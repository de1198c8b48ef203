import { eos80 } from "./eos80.ts";
import { limnological } from "./limnological.ts";
import { exactTeos10, teos10 } from "./teos10.ts";
import type { WaterChoice, WaterModel } from "./water-model.ts";

/** Water of one density at every depth: for comparison, and for liquids that are not layered. */
const constantWater = (rhoKgM3: number): WaterModel => ({
  id: "constant",
  label: `Constant ${rhoKgM3} kg/m3`,
  salinityScale: "absolute",
  temperatureScale: "in-situ",
  density: () => rhoKgM3,
  isWithinRange: () => true,
  range: "any",
});

/** The model that a choice names. */
export function waterModel(choice: WaterChoice): WaterModel {
  switch (choice.id) {
    case "teos10":
      return teos10;
    case "exact":
      return exactTeos10;
    case "limnological":
      return limnological;
    case "eos80":
      return eos80;
    case "constant":
      return constantWater(choice.rhoKgM3);
  }
}

/** The name of the model for people. */
export const waterLabel = (choice: WaterChoice): string => waterModel(choice).label;
