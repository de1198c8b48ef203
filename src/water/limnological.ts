import { IPTS68_PER_ITS90 } from "../gsw-ts-port/index.ts";
import type { WaterModel } from "./water-model.ts";

/**
 * Density of lake water, kg/m3. Its absolute level lies 0.003 to 0.005 kg/m3 below IAPWS-95: good for differences.
 * Source: Chen & Millero 1986, Limnology and Oceanography 31(3), 657-662.
 * @param absSalinityGKg 0 to 0.6 g/kg
 * @param ipts68TempC in-situ temperature on the scale of the paper, 0 to 30 degC
 * @param seaPressureDbar 0 to 1800 dbar
 */
export function limnologicalDensity(absSalinityGKg: number, ipts68TempC: number, seaPressureDbar: number): number {
  const s = absSalinityGKg;
  const t = ipts68TempC;
  const bar = seaPressureDbar / 10;
  const surface =
    0.9998395 +
    t * (6.7914e-5 + t * (-9.0894e-6 + t * (1.0171e-7 + t * (-1.2846e-9 + t * (1.1592e-11 - t * 5.0125e-14))))) +
    s * (8.181e-4 + t * (-3.85e-6 + t * 4.96e-8));
  const modulus =
    19652.17 +
    t * (148.113 + t * (-2.293 + t * (1.256e-2 - t * 4.18e-5))) +
    bar * (3.2726 + t * (-2.147e-4 + t * 1.128e-4)) +
    s * (53.238 - 0.313 * t + 5.728e-3 * bar);
  return (1000 * surface) / (1 - bar / modulus);
}

/** Chen & Millero 1986, for lakes and reservoirs of low salinity. */
export const limnological: WaterModel = {
  id: "limnological",
  label: "Limnological (Chen & Millero 1986)",
  salinityScale: "absolute",
  temperatureScale: "in-situ",
  density: (salinity, tempC, seaPressureDbar) =>
    limnologicalDensity(salinity, tempC * IPTS68_PER_ITS90, seaPressureDbar),
  isWithinRange: (salinity, inSituTempC, seaPressureDbar) =>
    salinity >= 0 &&
    salinity <= 0.6 &&
    inSituTempC >= 0 &&
    inSituTempC <= 30 &&
    seaPressureDbar >= 0 &&
    seaPressureDbar <= 1800,
  range: "absolute salinity 0 to 0.6 g/kg, 0 to 30 degC, 0 to 1800 dbar",
};
