/**
 * Every unit the program knows, from exact defining constants: NIST SP 811 (2008) appendix B; the international foot,
 * pound and psi from 0.3048 m, 0.45359237 kg and standard gravity. Conventional heads (mH2O, ftH2O, mmHg) are a column of
 * fixed density under standard gravity, 1000 kg/m3 for water and 13 595.1 kg/m3 for mercury: never the water of a cast.
 * The base unit of a kind is the one with factor 1 and offset 0.
 */
import type { QuantityKind, UnitShape } from "./unit.ts";

const STANDARD_GRAVITY_MS2 = 9.80665;
const FOOT_M = 0.3048;
const POUND_KG = 0.45359237;
const POUND_FORCE_N = POUND_KG * STANDARD_GRAVITY_MS2;
const WATER_COLUMN_PA = 1000 * STANDARD_GRAVITY_MS2;

const unit = <S extends string>(
  kind: QuantityKind,
  symbol: S,
  factor: number,
  aliases: readonly string[] = [],
  more: { readonly label?: string; readonly offset?: number } = {},
) => ({ kind, symbol, factor, aliases, label: more.label ?? symbol, offset: more.offset ?? 0 });

export const UNITS = [
  unit("length", "m", 1, ["meter", "meters", "metre", "metres", "mtr"]),
  unit("length", "cm", 0.01, ["centimeter", "centimeters", "centimetre", "centimetres"]),
  unit("length", "mm", 0.001, ["millimeter", "millimeters", "millimetre", "millimetres"]),
  unit("length", "km", 1000, ["kilometer", "kilometers", "kilometre", "kilometres"]),
  unit("length", "ft", FOOT_M, ["foot", "feet", "international_foot", "'"]),
  unit("length", "in", FOOT_M / 12, ["inch", "inches"]),
  unit("length", "fathom", 6 * FOOT_M, ["fathoms", "ftm", "fm"]),
  unit("length", "mi", 5280 * FOOT_M, ["mile", "miles", "statute_mile", "statute_miles", "international_mile"]),
  unit("length", "nmi", 1852, ["nautical_mile", "nautical_miles"]),

  unit("pressure", "Pa", 1, ["pascal", "pascals", "N m-2"]),
  unit("pressure", "hPa", 100, ["hectopascal", "mbar", "millibar", "millibars", "mb"]),
  unit("pressure", "kPa", 1000, ["kilopascal", "kilopascals"]),
  unit("pressure", "MPa", 1e6, ["megapascal", "megapascals"]),
  unit("pressure", "dbar", 1e4, ["decibar", "decibars", "db", "dbars"]),
  unit("pressure", "bar", 1e5, ["bars"]),
  unit("pressure", "psi", POUND_FORCE_N / (FOOT_M / 12) ** 2, [
    "lbf/in2",
    "psig",
    "psia",
    "pound_force_per_square_inch",
  ]),
  unit("pressure", "mH2O", WATER_COLUMN_PA, ["m_H2O", "meter_H2O", "mwc"], { label: "mH₂O" }),
  unit("pressure", "ftH2O", WATER_COLUMN_PA * FOOT_M, ["ft_H2O", "foot_H2O", "feet_H2O"], { label: "ftH₂O" }),
  unit("pressure", "mmHg", 13.5951 * STANDARD_GRAVITY_MS2, ["mm_Hg", "millimeter_Hg"]),
  unit("pressure", "atm", 101325, ["atmosphere", "standard_atmosphere"]),

  unit(
    "temperature",
    "degC",
    1,
    [
      "C",
      "°C",
      "deg_C",
      "degrees_C",
      "degree_C",
      "celsius",
      "degree_celsius",
      "degrees_celsius",
      "deg_celsius",
      "centigrade",
      "degrees_centigrade",
      "ITS-90",
      "ITS-90 degC",
      "degC ITS-90",
      "°C ITS-90",
    ],
    { label: "°C" },
  ),
  unit(
    "temperature",
    "degF",
    5 / 9,
    ["F", "°F", "deg_F", "degrees_F", "degree_F", "fahrenheit", "degree_fahrenheit", "degrees_fahrenheit"],
    { label: "°F", offset: 32 },
  ),
  // t68 = 1.00024 t90: Saunders (1990), WOCE Newsletter 10.
  unit("temperature", "degC68", 1 / 1.00024, ["IPTS-68", "ITS-68", "IPTS-68 degC", "degC IPTS-68"], {
    label: "°C (IPTS-68)",
  }),
  unit("temperature", "K", 1, ["kelvin", "degK", "deg_K", "degree_K", "degrees_K"], { offset: 273.15 }),

  unit("conductivity", "S/m", 1e4, ["S m-1", "siemens/m", "siemens per meter", "siemens per metre", "mho/m"]),
  unit("conductivity", "mS/cm", 1000, ["mS", "mS cm-1", "mmho/cm", "mmhos/cm", "dS/m", "millisiemens per centimeter"]),
  unit(
    "conductivity",
    "uS/cm",
    1,
    [
      "uS",
      "uS cm-1",
      "umho/cm",
      "umhos/cm",
      "umho",
      "umhos",
      "microS/cm",
      "usiemens/cm",
      "microsiemens",
      "microsiemens/cm",
      "microsiemens per centimeter",
      "microsiemens per centimetre",
    ],
    { label: "µS/cm" },
  ),
  // To the conductivity of standard sea water at 15 degC (IPTS-68), 42.914 mS/cm: Culkin and Smith (1980).
  unit("conductivity", "ratio", 42914, ["conductivity ratio", "R", "C(S,t,p)/C(35,15,0)"]),

  unit("density", "kg/m3", 1, ["kg m-3", "g/L", "g L-1", "kilogram per cubic meter", "kilograms per cubic metre"], {
    label: "kg/m³",
  }),
  unit("density", "g/cm3", 1000, ["g cm-3", "g/cc", "g/ml", "kg/L", "t/m3"], { label: "g/cm³" }),
  // Dissolved and suspended matter is given per volume; a part in a million of fresh water is the same number.
  unit("density", "mg/L", 1e-3, ["mg l-1", "g m-3", "ppm", "milligrams per liter", "milligrams per litre"]),
  unit("density", "lb/ft3", POUND_KG / FOOT_M ** 3, ["lbm/ft3", "lb ft-3", "pcf", "pounds per cubic foot"], {
    label: "lb/ft³",
  }),

  unit(
    "salinity",
    "1",
    1,
    ["psu", "pss", "pss-78", "pss78", "ppt", "ppth", "‰", "1e-3", "0.001", "practical salinity units", "unitless"],
    { label: "" },
  ),
  unit("salinity", "g/kg", 1, ["g kg-1", "gram per kilogram", "grams per kilogram"]),

  unit("force", "N", 1, ["newton", "newtons"]),
  unit("force", "kN", 1000, ["kilonewton", "kilonewtons"]),
  unit("force", "MN", 1e6, ["meganewton", "meganewtons"]),
  unit("force", "lbf", POUND_FORCE_N, ["pound_force", "pounds_force"]),
  unit("force", "kip", 1000 * POUND_FORCE_N, ["kips"]),

  unit("forcePerLength", "N/m", 1, ["N m-1"]),
  unit("forcePerLength", "kN/m", 1000, ["kN m-1"]),
  unit("forcePerLength", "lbf/ft", POUND_FORCE_N / FOOT_M, ["lbf ft-1", "plf"]),
  unit("forcePerLength", "kip/ft", (1000 * POUND_FORCE_N) / FOOT_M, ["kip ft-1", "klf"]),

  unit("moment", "N m", 1, ["newton metre", "newton meter"], { label: "N·m" }),
  unit("moment", "kN m", 1000, ["kilonewton metre", "kilonewton meter"], { label: "kN·m" }),
  unit("moment", "lbf ft", POUND_FORCE_N * FOOT_M, ["ft lbf", "pound_force foot"], { label: "lbf·ft" }),
  unit("moment", "kip ft", 1000 * POUND_FORCE_N * FOOT_M, ["ft kip"], { label: "kip·ft" }),

  unit("fraction", "fraction", 1, []),
  unit("fraction", "%", 0.01, ["percent", "pct"]),

  unit(
    "angle",
    "deg",
    1,
    [
      "degree",
      "degrees",
      "°",
      "degrees_north",
      "degrees_east",
      "degree_north",
      "degree_east",
      "degrees N",
      "degrees E",
      "°N",
      "°E",
      "decimal degrees",
      "dd",
    ],
    {
      label: "°",
    },
  ),

  unit("time", "s", 1, ["sec", "secs", "second", "seconds"]),
  unit("time", "min", 60, ["mins", "minute", "minutes"]),
  unit("time", "h", 3600, ["hr", "hrs", "hour", "hours"]),
  unit("time", "day", 86400, ["d", "days"]),

  unit("perTimeSquared", "s-2", 1, ["1/s2", "s^-2", "rad2/s2"], { label: "s⁻²" }),
] as const satisfies readonly UnitShape[];

export type Unit = (typeof UNITS)[number];
export type UnitSymbol = Unit["symbol"];
