import { DT, DTS, FIRST, file, LAST, NO_SALT, SC, type Understood, waiting } from "./expected.ts";

/** Units, roles and sentinels. */
export const QUANTITIES: readonly Understood[] = [
  file("no-units.csv", "units nowhere", FIRST, LAST, { says: ["assumed-unit-depth", "assumed-unit-temperature"] }),
  file("feet-fahrenheit.csv", "feet and Fahrenheit", [3.048, 10, 2], [6.096, 5, 24], {
    reads: "depth ft, temperature degF, practicalSalinity 1",
  }),
  file("fathoms.csv", "fathoms", [1.8288, 10, 30], [3.6576, 9, 31], {
    reads: "depth fathom, temperature degC, practicalSalinity 1",
  }),
  file("centimetres.csv", "units glued to names, centimetres", FIRST, [1, 18.1, 2.4], {
    reads: "depth cm, temperature degC, practicalSalinity 1",
  }),
  file("kelvin-named.csv", "kelvin", [1, 10, 30], [2, 9, 31], {
    reads: "depth m, temperature K, practicalSalinity 1",
  }),
  file("kelvin-by-values.csv", "kelvin, told by the values", [1, 10, 30], [2, 9, 31], {
    reads: "depth m, temperature K, practicalSalinity 1",
    says: ["assumed-unit-temperature"],
  }),
  waiting(
    "fahrenheit-or-celsius.csv",
    "36 to 41.5 is warm water or cold",
    "depth m, practicalSalinity 1",
    "no-unit-temperature",
  ),
  waiting(
    "fahrenheit-untold.csv",
    "52 to 68.5 is no water in degC",
    "depth ft, practicalSalinity 1",
    "no-unit-temperature",
  ),
  file("ipts-68.csv", "IPTS-68 becomes ITS-90", [1, 15, 30], [2, 10.0024 / 1.00024, 31], {
    reads: "depth m, temperature degC68, practicalSalinity 1",
  }),
  file("cf-names.csv", "CF standard names, a units row with a 1 in it", FIRST, [1, 18.1, 2.4], {
    reads: `${DTS}, latitude deg, longitude deg`,
    cast: { latitudeDeg: 51.5, longitudeDeg: -3.25 },
  }),
  file(
    "conductivity-s-m.csv",
    "conductivity in S/m",
    { conductivityMsCm: 35 },
    { conductivityMsCm: 36 },
    { reads: "depth m, temperature degC, conductivity S/m" },
  ),
  file(
    "conductivity-ratio.csv",
    "conductivity as a ratio to 42.914 mS/cm",
    { conductivityMsCm: 42.914 },
    { conductivityMsCm: 21.457 },
    { reads: "depth m, temperature degC, conductivity ratio" },
  ),
  file("conductivity-untold.csv", "conductivity 15 in one of three units", [1, 10], [2, 9], {
    reads: DT,
    asks: ["no-unit-conductivity"],
    says: ["no-unit-conductivity", "temperature-only"],
  }),
  file("conductivity-beside-salinity.csv", "the same beside salinity needs no answer", [1, 10, 9], [2, 9, 9.2], {
    says: ["no-unit-conductivity"],
  }),
  file(
    "conductance-at-25.csv",
    "called conductivity, compensated to 25 degC",
    { specificConductanceMsCm: 0.518 },
    { specificConductanceMsCm: 0.641 },
    { reads: SC },
  ),
  file(
    "conductance-in-units-row.csv",
    "the units row says compensated to 25 degC",
    { specificConductanceMsCm: 0.518 },
    { specificConductanceMsCm: 0.52 },
    { reads: SC },
  ),
  file("ec.csv", "EC, compensated or not", [1, 10], [2, 9], {
    reads: DT,
    asks: ["compensated-or-not"],
    says: ["compensated-or-not", "temperature-only"],
  }),
  file(
    "dissolved-solids.csv",
    "dissolved solids in mg/L",
    { absSalinityGKg: 0.35 },
    { absSalinityGKg: 0.42 },
    { reads: "depth m, temperature degC, dissolvedSolids mg/L", says: ["salinity-from-dissolved-solids"] },
  ),
  file(
    "absolute-salinity.csv",
    "absolute salinity",
    { absSalinityGKg: 30.15 },
    { absSalinityGKg: 31.15 },
    { reads: "depth m, temperature degC, absoluteSalinity g/kg" },
  ),
  file("salinity-g-kg.csv", "salinity in g/kg, absolute or practical", [1, 10], [2, 9], {
    reads: DT,
    asks: ["practical-or-absolute"],
    says: ["practical-or-absolute", "temperature-only"],
  }),

  file(
    "pressure-kpa.csv",
    "gauge pressure in kPa",
    { seaPressureDbar: 1 },
    { seaPressureDbar: 5 },
    { reads: "seaPressure kPa, temperature degC, practicalSalinity 1" },
  ),
  file(
    "pressure-mpa.csv",
    "sea pressure in MPa, CF name",
    { seaPressureDbar: 10 },
    { seaPressureDbar: 20 },
    { reads: "seaPressure MPa, temperature degC, practicalSalinity 1" },
  ),
  file(
    "pressure-mh2o.csv",
    "pressure as a height of water",
    { seaPressureDbar: 0.980665 },
    { seaPressureDbar: 1.96133 },
    { reads: "seaPressure mH2O, temperature degC, practicalSalinity 1" },
  ),
  file(
    "absolute-with-deck.csv",
    "psia with readings on deck",
    { seaPressureDbar: 0 },
    // 7.25 psi of 0.6894757293 dbar: NIST SP 811.
    { seaPressureDbar: 4.998699037 },
    {
      reads: "absolutePressure psi, temperature degC, practicalSalinity 1",
      samples: 6,
      says: ["deck-reading-taken-off"],
    },
  ),
  file(
    "absolute-without-deck.csv",
    "absolute pressure without a reading in air: one atmosphere is taken off",
    { seaPressureDbar: 2 },
    { seaPressureDbar: 10 },
    { reads: "absolutePressure dbar, temperature degC, practicalSalinity 1", says: ["standard-air-taken-off"] },
  ),
  file(
    "depth-beside-absolute.csv",
    "depth and absolute pressure in one file",
    { depthM: 1, seaPressureDbar: 0.9775 },
    { depthM: 2, seaPressureDbar: 1.9575 },
    { reads: "depth m, temperature degC, absolutePressure kPa", says: ["standard-air-taken-off", "temperature-only"] },
  ),
  file(
    "deck-reading-untold.csv",
    "pressure that does not say it is absolute, but its readings on deck do",
    { seaPressureDbar: 0 },
    { seaPressureDbar: 5 },
    {
      reads: "absolutePressure dbar, temperature degC, practicalSalinity 1",
      samples: 5,
      says: ["deck-reading-taken-off"],
    },
  ),
  waiting(
    "gauge-or-absolute.csv",
    "pressure starts at 10.2 dbar: in air, or 10 m deep",
    "temperature degC, practicalSalinity 1",
    "pressure-may-be-absolute",
  ),
  waiting("depth-in-dbar.csv", "depth in dbar", "temperature degC, practicalSalinity 1", "no-unit-depth"),
  waiting("depth-in-psi.csv", "depth in psi", "temperature degC, practicalSalinity 1", "no-unit-depth"),
  file(
    "elevation-and-surface.csv",
    "elevations in feet, the water surface moves from day to day",
    [3.048, 20],
    [19 * 0.3048, 12],
    { reads: "date, elevation ft, surfaceElevation ft, temperature degC", casts: 2, samples: 4, says: NO_SALT },
  ),
  waiting(
    "elevation-alone.csv",
    "elevations without that of the water surface",
    "temperature degC",
    "no-surface-elevation",
  ),
  {
    ...waiting("depth-upward.csv", "depth counts upward", "temperature degC", "depth-upside-down"),
    says: ["temperature-only", "depth-upside-down"],
  },
  file("in-air-rows.csv", "rows above the water", FIRST, LAST, { samples: 2, says: ["above-water"] }),

  file("minus-nine-arctic.csv", "-9 in water of -1.6 degC is no temperature", [1, -1.2, 30], [6, -1.6, 33], {
    samples: 4,
    says: ["sentinel", "no-temperature"],
  }),
  file("minus-nine-elevation.csv", "-9 between -8 and -10 is an elevation", [9, 10], [12, 7], {
    samples: 4,
    reads: "elevation m, surfaceElevation m, temperature degC",
    says: ["temperature-only", "sentinel-kept"],
  }),
  file("nines.csv", "-99, -999, -9999.0, -99.99 and -999.99 in three columns", [1, 10], [6, 7, 33], {
    samples: 4,
    says: ["sentinel", "no-temperature", "no-salinity"],
  }),
  file("tiny-fill.csv", "-9.99e-29", [1, 10, 30], [3, 9, 31], { says: ["sentinel", "no-temperature"] }),
  file("huge-fill.csv", "1e35 and 9.96921e36", [1, 10, 30], [3, 9, 31], { says: ["sentinel", "no-temperature"] }),
  file("positive-nines.csv", "99.99 and 999", [1, 10.5, 30], [3, 9.5, 31], { says: ["sentinel", "no-temperature"] }),
  file(
    "nines-that-are-water.csv",
    "999 uS/cm between 950 and 1040 is measured",
    { specificConductanceMsCm: 0.95 },
    { specificConductanceMsCm: 1.04 },
    { reads: SC, samples: 3 },
  ),
  file("repeated-impossible.csv", "-5555 three times", [1, 10, 30], [6, 8, 32], {
    samples: 3,
    says: ["sentinel", "no-temperature"],
  }),
  file("missing-words.csv", "NA, N/A, NaN, -, *, blank and ***", [1, 10], [8, 3, 33], {
    samples: 8,
    says: ["no-salinity"],
  }),
  file("longitude-minus-99.csv", "-99 is a longitude", [1, 10], [2, 9], {
    reads: `${DT}, latitude deg, longitude deg`,
    says: NO_SALT,
    cast: { latitudeDeg: 19.4, longitudeDeg: -99 },
  }),
];
