/*
 * Formulas that older reports and instruments used. The program computes nothing from them; they are here so that a
 * number in such a report can be reproduced and told apart from ours.
 */

/**
 * Density of air-free pure water at one standard atmosphere, kg/m3. NaN in, NaN out.
 * Source: Tanaka et al. 2001, Metrologia 38, 301-309; 0 to 40 degC.
 * @param inSituTempC ITS-90
 */
export function pureWaterDensity(inSituTempC: number): number {
  const t = inSituTempC;
  return 999.97495 * (1 - ((t - 3.983035) ** 2 * (t + 301.797)) / (522528.9 * (t + 69.34881)));
}

/**
 * Salinity from specific conductance by a hydrological agency's polynomial; ours is PSS-78 at 25 degC. NaN in, NaN out.
 * Source: Wagner et al. 2006, USGS Techniques and Methods 1-D3, after Miller et al. 1988.
 * @param specificConductanceMsCm compensated to 25 degC, mS/cm
 */
export function agencySalinity(specificConductanceMsCm: number): number {
  const root = Math.sqrt(specificConductanceMsCm / 53.087);
  return 0.012 + root * (-0.2174 + root * (25.3283 + root * (13.7714 + root * (-6.4788 + root * 2.5842))));
}

const squaredSine = (latitudeDeg: number): number => Math.sin((latitudeDeg * Math.PI) / 180) ** 2;

/**
 * Sea pressure in dbar at a depth in m of a standard ocean. NaN in, NaN out.
 * Source: Saunders 1981, Journal of Physical Oceanography 11, 573.
 */
export function saundersPressure(depthM: number, latitudeDeg: number): number {
  const c1 = (5.92 + 5.25 * squaredSine(latitudeDeg)) * 1e-3;
  const c2 = 2.21e-6;
  return (1 - c1 - Math.sqrt((1 - c1) ** 2 - 4 * c2 * depthM)) / (2 * c2);
}

/**
 * Depth in m at a sea pressure in dbar of a standard ocean. NaN in, NaN out.
 * Source: Fofonoff & Millard 1983, UNESCO Technical Papers in Marine Science 44, p. 25.
 */
export function unescoDepth(seaPressureDbar: number, latitudeDeg: number): number {
  const p = seaPressureDbar;
  const s = squaredSine(latitudeDeg);
  const gravityMs2 = 9.780318 * (1 + s * (5.2788e-3 + s * 2.36e-5)) + 1.092e-6 * p;
  return (p * (9.72659 + p * (-2.2512e-5 + p * (2.279e-10 - p * 1.82e-15)))) / gravityMs2;
}
