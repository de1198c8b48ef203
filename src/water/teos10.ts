import { conservativeTemperature, density, exactDensity, isWithinRange } from "../gsw-ts-port/index.ts";
import type { WaterModel } from "./water-model.ts";

/** TEOS-10 by the 75-term polynomial (Roquet et al. 2015): the default. */
export const teos10: WaterModel = {
  id: "teos10",
  label: "TEOS-10",
  salinityScale: "absolute",
  temperatureScale: "conservative",
  density,
  isWithinRange: (salinity, inSituTempC, seaPressureDbar) =>
    isWithinRange(salinity, conservativeTemperature(salinity, inSituTempC, seaPressureDbar), seaPressureDbar),
  range: "absolute salinity 0 to 42 g/kg, the temperatures of the ocean, 0 to 8000 dbar",
};

/**
 * TEOS-10 by the full Gibbs function (IAPWS-08 and IAPWS-09): for fresh water, where the polynomial is off by up to
 * 0.0014 kg/m3, which matters to the stability of a reservoir's deep water and to nothing else.
 */
export const exactTeos10: WaterModel = {
  id: "exact",
  label: "TEOS-10, exact",
  salinityScale: "absolute",
  temperatureScale: "in-situ",
  density: exactDensity,
  isWithinRange: (salinity, inSituTempC, seaPressureDbar) =>
    salinity >= 0 &&
    salinity <= 42 &&
    inSituTempC >= -6 &&
    inSituTempC <= 40 &&
    seaPressureDbar >= 0 &&
    seaPressureDbar <= 1e4,
  range: "absolute salinity 0 to 42 g/kg, -6 to 40 degC, 0 to 10000 dbar",
};
