import { IPTS68_PER_ITS90 } from "../gsw-ts-port/index.ts";
import type { WaterModel } from "./water-model.ts";

/**
 * Density by the International Equation of State of Seawater 1980, kg/m3.
 * Source: UNESCO Technical Papers in Marine Science 36 (1981); Millero & Poisson 1981; Fofonoff & Millard 1983, p. 15.
 * @param practicalSalinity PSS-78, 0 to 42
 * @param ipts68TempC in-situ temperature on the scale of the paper, -2 to 40 degC
 * @param seaPressureDbar 0 to 10000 dbar
 */
export function eos80Density(practicalSalinity: number, ipts68TempC: number, seaPressureDbar: number): number {
  const s = practicalSalinity;
  const t = ipts68TempC;
  const bar = seaPressureDbar / 10;
  const rootS = Math.sqrt(s);
  const water =
    999.842594 + t * (6.793952e-2 + t * (-9.09529e-3 + t * (1.001685e-4 + t * (-1.120083e-6 + t * 6.536332e-9))));
  const surface =
    water +
    s * (0.824493 + t * (-4.0899e-3 + t * (7.6438e-5 + t * (-8.2467e-7 + t * 5.3875e-9)))) +
    s * rootS * (-5.72466e-3 + t * (1.0227e-4 - t * 1.6546e-6)) +
    s * s * 4.8314e-4;
  const modulusWater = 19652.21 + t * (148.4206 + t * (-2.327105 + t * (1.360477e-2 - t * 5.155288e-5)));
  const modulusSurface =
    modulusWater +
    s * (54.6746 + t * (-0.603459 + t * (1.09987e-2 - t * 6.167e-5))) +
    s * rootS * (7.944e-2 + t * (1.6483e-2 - t * 5.3009e-4));
  const a =
    3.239908 +
    t * (1.43713e-3 + t * (1.16092e-4 - t * 5.77905e-7)) +
    s * (2.2838e-3 + t * (-1.0981e-5 - t * 1.6078e-6)) +
    s * rootS * 1.91075e-4;
  const b = 8.50935e-5 + t * (-6.12293e-6 + t * 5.2787e-8) + s * (-9.9348e-7 + t * (2.0816e-8 + t * 9.1697e-10));
  return surface / (1 - bar / (modulusSurface + bar * (a + bar * b)));
}

/** EOS-80, for results that must match older work. Temperatures come in on ITS-90 and are taken to IPTS-68 here. */
export const eos80: WaterModel = {
  id: "eos80",
  label: "EOS-80",
  salinityScale: "practical",
  temperatureScale: "in-situ",
  density: (salinity, tempC, seaPressureDbar) => eos80Density(salinity, tempC * IPTS68_PER_ITS90, seaPressureDbar),
  isWithinRange: (salinity, inSituTempC, seaPressureDbar) =>
    salinity >= 0 &&
    salinity <= 42 &&
    inSituTempC >= -2 &&
    inSituTempC <= 40 &&
    seaPressureDbar >= 0 &&
    seaPressureDbar <= 1e4,
  range: "practical salinity 0 to 42, -2 to 40 degC, 0 to 10000 dbar",
};
