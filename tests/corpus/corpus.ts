/**
 * What must be understood of each file in `files/`, written from the files by hand and not from what the program says.
 * Values are those of the first sample of the first cast and the last sample of the last.
 */

export interface Understood {
  readonly file: string;
  /** What makes the file hard. */
  readonly trap: string;
  readonly casts: number;
  /** Over all casts; what was left out is not among them. */
  readonly samples: number;
  /** Role and unit of each column in use, in the order of the file. */
  readonly reads: string;
  readonly first: Readonly<Record<string, number>>;
  readonly last: Readonly<Record<string, number>>;
  /** Codes of the questions that must be open. */
  readonly asks: readonly string[];
  /** Codes of the issues about the file and its casts, each once. */
  readonly says: readonly string[];
  /** Of the first cast, as far as they matter: time, place, station. */
  readonly cast: Readonly<Record<string, string | number | null>>;
}

/** Files that must be refused, and the code of the reason. */
export interface Refused {
  readonly file: string;
  readonly trap: string;
  readonly refusedFor: string;
}

type Row = readonly [depthM: number, inSituTempC: number, practicalSalinity?: number];

const sampleOf = ([depthM, inSituTempC, practicalSalinity]: Row): Readonly<Record<string, number>> =>
  practicalSalinity === undefined ? { depthM, inSituTempC } : { depthM, inSituTempC, practicalSalinity };

const DTS = "depth m, temperature degC, practicalSalinity 1";
const DT = "depth m, temperature degC";
const NO_SALT = ["temperature-only"];
/** The lowering that most of the invented files hold. */
const FIRST: Row = [0.5, 18.25, 2.1];
const LAST: Row = [5, 11.9, 24.6];

type Part = Partial<Omit<Understood, "file" | "trap" | "first" | "last">>;

/** One lowering of depth, temperature and salinity, unless `part` says otherwise. */
function file(
  name: string,
  trap: string,
  first: Row | Readonly<Record<string, number>> = FIRST,
  last: Row | Readonly<Record<string, number>> = LAST,
  part: Part = {},
): Understood {
  const values = (row: Row | Readonly<Record<string, number>>) =>
    Array.isArray(row) ? sampleOf(row as Row) : (row as Readonly<Record<string, number>>);
  return {
    file: name,
    trap,
    casts: 1,
    samples: first === FIRST && last === LAST ? 5 : 2,
    reads: DTS,
    asks: [],
    says: [],
    cast: {},
    ...part,
    first: values(first),
    last: values(last),
  };
}

/** A file that makes no cast before its questions are answered. */
const waiting = (name: string, trap: string, reads: string, ...asks: readonly string[]): Understood =>
  file(name, trap, {}, {}, { casts: 0, samples: 0, reads, asks, says: asks });

const SC = "depth m, temperature degC, specificConductance uS/cm";

export const UNDERSTOOD: readonly Understood[] = [
  file("comma.csv", "comma"),
  file("semicolon-decimal-comma.csv", "semicolons, decimal commas, names in German"),
  file("tab.txt", "tab"),
  file("pipe.txt", "vertical bar"),
  file("blanks.txt", "runs of blanks, lined up by eye"),
  file("runs-of-blanks.txt", "runs of blanks between names with blanks in them"),
  file("exponents-minus.csv", "exponents, plus signs, true minus signs", [0.5, -1.25, 31], [1, -1.5, 31.5]),
  file(
    "thousands-comma.csv",
    "commas part thousands",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-point.csv",
    "points part thousands, commas are decimal",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-blank.csv",
    "blanks part thousands",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-by-water.csv",
    "1,234 uS/cm can only be thousands: no water is so pure",
    { specificConductanceMsCm: 1.234 },
    { specificConductanceMsCm: 1.31 },
    { reads: SC, samples: 3, says: ["assumed-thousands"] },
  ),
  waiting(
    "decimal-or-thousands.csv",
    "depth 1,250 could be either",
    "temperature degC, practicalSalinity 1",
    "decimal-or-thousands",
  ),

  file("utf8-mark.csv", "UTF-8 with byte-order mark"),
  file("utf16le-mark.csv", "UTF-16, little end first, with mark"),
  file("utf16be-no-mark.csv", "UTF-16, big end first, without mark"),
  file("latin1.csv", "Latin-1 degree sign"),
  file("cr.csv", "lines end in CR"),
  file("mixed-line-ends.csv", "CR, LF and CRLF in one file"),

  file("comments.csv", "comment lines of three signs, also among the rows"),
  file("long-preamble.txt", "1100 lines of text above the table", FIRST, LAST, { says: ["preface"] }),
  file("preamble-table.csv", "a small table of its own above the table", FIRST, LAST, { says: ["preface"] }),
  file("preamble-names.txt", "text above that holds the same names", FIRST, LAST, { says: ["preface"] }),
  file(
    "two-line-names.csv",
    "names on two lines: Specific over cond",
    { depthM: 0.5, specificConductanceMsCm: 0.98 },
    { depthM: 5, specificConductanceMsCm: 19.875 },
    { reads: SC, samples: 5 },
  ),
  file("names-over-units.csv", "units on a line of their own, in brackets", [3.048, 10, 2], [6.096, 5, 24], {
    reads: "depth ft, temperature degF, practicalSalinity 1",
  }),
  file("two-lines-and-units.csv", "names on two lines and units on a third"),
  file("header-in-comment.csv", "the header stands behind a comment sign"),
  {
    ...waiting("no-header.csv", "no header at all", "", "no-depth-column", "no-temperature-column"),
    says: ["no-header", "no-depth-column", "no-temperature-column"],
  },
  file("trailing-delimiter.csv", "every line ends in a delimiter"),
  file("trailing-delimiter-rows-only.csv", "every row ends in a delimiter, the header does not"),
  file("short-rows.csv", "rows shorter than the header", FIRST, LAST, { says: ["rows-too-short"] }),
  file("wide-row.csv", "a row longer than the header", FIRST, LAST, { says: ["rows-too-wide"] }),
  file("blanks-with-a-hole.txt", "blanks as delimiter and a cell that is not there", FIRST, [3, 12.75, 21.35], {
    samples: 3,
    says: ["rows-too-short"],
  }),
  file("header-repeated.csv", "files joined, header and all"),
  file("cell-over-lines.csv", "a quoted cell over two lines", FIRST, [1, 18.1, 2.4]),
  file("open-quote.csv", "a quotation that never closes", FIRST, [2, 16.4, 9.8], { samples: 3, says: ["open-quote"] }),
  file("footer.csv", "means and words below the table", FIRST, LAST, {
    says: ["rows-too-short", "not-a-number", "no-depth"],
  }),

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

  file("day-first.csv", "day first, told by another row", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `station, date, ${DT}`,
    says: NO_SALT,
    cast: { time: "2017-08-02" },
  }),
  file("month-first-named.csv", "the header spells the order out", [1, 10], [2, 9], {
    reads: `date, ${DT}`,
    says: NO_SALT,
    cast: { time: "2017-02-08" },
  }),
  file("date-order-untold.csv", "2/8/2017 alone", [1, 10], [2, 9], {
    reads: DT,
    asks: ["date-order"],
    says: ["date-order", "temperature-only"],
    cast: { time: null },
  }),
  file("date-same-both-ways.csv", "3/3/2017 is one day in either order", [1, 10], [2, 9], {
    reads: `date, ${DT}`,
    says: NO_SALT,
    cast: { time: "2017-03-03" },
  }),
  file("clock-without-colon.csv", "801 is 08:01", [1, 10], [2, 9], {
    reads: `date, clock, ${DT}`,
    says: NO_SALT,
    cast: { time: "2026-07-04T08:01" },
  }),
  file("two-digit-year.csv", "69 is 1969, 68 is 2068", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `date, ${DT}`,
    says: NO_SALT,
    cast: { time: "1969-01-13" },
  }),
  file("year-month-day.csv", "year, month and day in columns of their own", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `year, month, day, ${DT}`,
    says: NO_SALT,
    cast: { time: "2026-07-04" },
  }),
  file(
    "epoch-seconds.csv",
    "seconds since 1970",
    { depthM: 1, timeS: 0 },
    { depthM: 3, timeS: 3 },
    {
      samples: 3,
      reads: `dateTime seconds since 1970-01-01, ${DT}`,
      says: NO_SALT,
      cast: { time: "2026-07-04T13:46:00" },
    },
  ),
  file(
    "epoch-milliseconds.csv",
    "milliseconds since 1970",
    { timeS: 0 },
    { timeS: 0.5 },
    {
      samples: 3,
      reads: `dateTime milliseconds since 1970-01-01, ${DT}`,
      says: NO_SALT,
      cast: { time: "2026-07-04T13:46:00" },
    },
  ),
  file("serial-days.csv", "serial day numbers of spreadsheets", [1, 10], [2, 9], {
    reads: `dateTime days since 1899-12-30, ${DT}`,
    says: NO_SALT,
    cast: { time: "2026-07-04T13:46:00" },
  }),
  file("julian-days.csv", "Julian days", [1, 10], [2, 9], {
    reads: `date Julian days, ${DT}`,
    says: NO_SALT,
    cast: { time: "2026-07-04" },
  }),
  file(
    "iso-fractions.csv",
    "fractions of a second, a zone at the end",
    { timeS: 0 },
    { timeS: 0.5 },
    {
      samples: 3,
      reads: `dateTime, ${DT}`,
      says: NO_SALT,
      cast: { time: "2026-07-04T13:46:00" },
    },
  ),
  file("named-months.csv", "04-Jul-2026, 1:46 PM", [1, 10], [2, 9], {
    reads: `date, clock, ${DT}`,
    says: NO_SALT,
    cast: { time: "2026-07-04T13:46" },
  }),
  file(
    "elapsed-seconds.csv",
    "seconds since the start are no clock",
    { timeS: 0 },
    { timeS: 1 },
    {
      samples: 3,
      reads: `elapsedTime s, ${DT}`,
      says: NO_SALT,
      cast: { time: null },
    },
  ),
  file(
    "time-in-seconds.csv",
    "a column named Time that holds seconds",
    { timeS: 0 },
    { timeS: 0.5 },
    { samples: 3, reads: `elapsedTime s, ${DT}`, says: NO_SALT, cast: { time: null } },
  ),
  file(
    "cf-time.csv",
    "hours since a moment, as the CF conventions write it",
    { timeS: 0 },
    { timeS: 1800 },
    {
      reads: `dateTime hours since 2026-07-04 12:00:00, ${DT}`,
      says: NO_SALT,
      cast: { time: "2026-07-04T13:00:00" },
    },
  ),
  file(
    "past-midnight.csv",
    "a clock that runs past midnight",
    { timeS: 0 },
    { timeS: 20 },
    {
      samples: 3,
      reads: `clock, ${DT}`,
      says: NO_SALT,
    },
  ),

  file("degrees-minutes.csv", "degrees, minutes, seconds and hemisphere letters", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `station, latitude deg, longitude deg, ${DT}`,
    says: NO_SALT,
    cast: { latitudeDeg: 38 + 2.5 / 60, longitudeDeg: -121.5 },
  }),
  file("longitude-west.csv", "the header says west", [1, 10], [2, 9], {
    reads: `latitude deg, longitude deg, ${DT}`,
    says: NO_SALT,
    cast: { latitudeDeg: 38.5, longitudeDeg: -121.75 },
  }),
  file("longitude-west-signed.csv", "the header says west and the sign says so again", [1, 10], [2, 9], {
    reads: `latitude deg, longitude deg, ${DT}`,
    says: NO_SALT,
    cast: { longitudeDeg: -121.75 },
  }),
  file("longitude-360.csv", "longitudes from 0 to 360", [1, 10], [2, 9], {
    reads: `latitude deg, longitude deg, ${DT}`,
    says: NO_SALT,
    cast: { latitudeDeg: -33.5, longitudeDeg: -121.75 },
  }),
  file("off-the-earth.csv", "a latitude of 5130", [1, 10], [2, 9], {
    reads: `latitude deg, longitude deg, ${DT}`,
    says: ["temperature-only", "off-the-earth"],
    cast: { latitudeDeg: null, longitudeDeg: -3 },
  }),

  file(
    "exchange-ctd.csv",
    "exchange CSV of the world hydrographic programme: keys, units row, flags, END_DATA",
    { seaPressureDbar: 2, inSituTempC: 13.4512, practicalSalinity: 33.2011, statedFlag: 1 },
    { seaPressureDbar: 8, inSituTempC: 13.3112, statedFlag: 9 },
    {
      samples: 4,
      reads:
        "seaPressure dbar, qualityFlag, temperature degC, qualityFlag, practicalSalinity 1, qualityFlag, qualityFlag, station, castName, date, clock, latitude deg, longitude deg, waterDepth m",
      says: ["sentinel", "no-salinity"],
      cast: {
        station: "12",
        time: "2026-07-04T13:46",
        latitudeDeg: 38.0417,
        longitudeDeg: -123.5025,
        waterDepthM: 1260,
      },
    },
  ),
  file(
    "exchange-bottle.csv",
    "exchange CSV of bottles: two stations, two salinities",
    { seaPressureDbar: 3.1, practicalSalinity: 33.2, statedFlag: 1 },
    { seaPressureDbar: 9.8, practicalSalinity: 33.25, statedFlag: 4 },
    {
      casts: 2,
      samples: 4,
      reads:
        "station, castName, qualityFlag, date, clock, latitude deg, longitude deg, waterDepth m, seaPressure dbar, temperature degC, practicalSalinity 1, qualityFlag, qualityFlag",
      says: ["two-columns-for-one-role"],
      cast: { station: "1", time: "2026-07-04T08:01", waterDepthM: 1260 },
    },
  ),
  file(
    "flags-qartod.csv",
    "flags 1, 3, 4 and 9 behind each column",
    { depthM: 1, statedFlag: 1 },
    { depthM: 4, statedFlag: 9 },
    {
      samples: 4,
      reads: "depth m, qualityFlag, temperature degC, qualityFlag, practicalSalinity 1, qualityFlag",
      says: ["no-salinity"],
    },
  ),
  file(
    "flags-words.csv",
    "good, suspect and bad",
    { statedFlag: 1 },
    { statedFlag: 4 },
    {
      samples: 3,
      reads: `${DTS}, qualityFlag`,
    },
  ),
  file("flags-untold.csv", "flags A7 and c, whatever they mean", [1, 10], [2, 9], { reads: DT, says: NO_SALT }),
  file(
    "sediment.csv",
    "turbidity is listed, sediment in mg/L is read",
    { suspendedSedimentKgM3: 0.12 },
    { suspendedSedimentKgM3: 2.4 },
    { reads: `${DTS}, turbidity, suspendedSediment mg/L` },
  ),
  file("water-depth.csv", "depth of the water beside depth of the sample", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `station, waterDepth m, ${DT}`,
    says: NO_SALT,
    cast: { waterDepthM: 31 },
  }),
  waiting(
    "water-depth-alone.csv",
    "water depth, of the place or of the sample",
    "waterDepth ft, temperature degC",
    "no-depth-column",
  ),
  file("two-temperatures.csv", "two columns for temperature, one better named", [1, 10, 30], [2, 9, 31], {
    says: ["two-columns-for-one-role"],
  }),
  {
    ...waiting(
      "same-names.csv",
      "two columns of one name and different values",
      "depth m, practicalSalinity 1",
      "same-name-twice",
    ),
  },
  waiting("unknown-names.csv", "no known name", "", "no-depth-column", "no-temperature-column"),
  file("script-and-formula.csv", "stations that could be script or a formula stay plain text", [1, 10], [2, 9], {
    casts: 2,
    samples: 4,
    reads: `station, ${DT}`,
    says: NO_SALT,
    cast: { station: "<script>alert(1)</script>" },
  }),
  file("many-casts.csv", "station, cast, date and time tell four casts apart", FIRST, LAST, {
    casts: 4,
    samples: 20,
    reads: `station, castName, date, clock, ${DTS}`,
    cast: { station: "2.0", time: "2026-07-04T09:15" },
  }),

  file("real-bay-2020.csv", "agency file: 22 quoted columns, many of them blank", [1, 9.67, 1.27], [4, 9.63, 1.96], {
    casts: 2,
    samples: 15,
    reads: "date, clock, station, distance km, depth m, practicalSalinity 1, temperature degC, densityAnomaly kg/m3",
    cast: { station: "2.0", time: "2020-01-13T13:46", distanceKm: 127.7053 },
  }),
  file("real-bay-2022.csv", "agency file: stations as 2.0", [1, 13.14, 0.31], [3, 12.88, 0.49], {
    casts: 2,
    samples: 13,
    reads: "date, clock, station, distance km, depth m, practicalSalinity 1, temperature degC",
    cast: { station: "2.0", time: "2022-03-09T15:49" },
  }),
  file(
    "real-bay-2017.csv",
    "agency file: byte-order mark, no units, M/D/YY, times as 801",
    [1, 12.04, 15.94],
    [9, 12.63, 0.07],
    {
      casts: 2,
      samples: 14,
      reads: "date, clock, station, depth m, practicalSalinity 1, temperature degC",
      says: ["assumed-unit-depth", "assumed-unit-temperature"],
      cast: { station: "20", time: "2017-02-08T08:01" },
    },
  ),
  file(
    "real-ship-channel.csv",
    "sonde file: names as Depth.feet, a time for each sample",
    { depthM: 1.891 * 0.3048, inSituTempC: 22.93, specificConductanceMsCm: 0.148, timeS: 0 },
    { depthM: 32.064 * 0.3048, inSituTempC: 22.9, specificConductanceMsCm: 0.16, timeS: 234 },
    {
      samples: 14,
      reads: "station, dateTime, depth ft, temperature degC, specificConductance uS/cm, date",
      cast: { station: "16", time: "2016-06-30T07:40:55" },
    },
  ),
  file(
    "real-mendota.csv",
    "lake file: no units, blank flag columns, times run on",
    { depthM: 0, inSituTempC: 21.19, specificConductanceMsCm: 0.518 },
    { depthM: 22, inSituTempC: 11.76, specificConductanceMsCm: 0.641 },
    {
      samples: 19,
      reads: "station, date, clock, depth m, temperature degC, specificConductance uS/cm, turbidity",
      says: ["assumed-unit-depth", "assumed-unit-temperature", "assumed-unit-specific-conductance"],
      cast: { station: "ME", time: "2017-09-29T15:18:00" },
    },
  ),
  file("real-falling-creek.csv", "reservoir file: three columns, no units", [0.1, 18.3691], [9.2, 8.5808], {
    casts: 2,
    samples: 22,
    reads: `date, ${DT}`,
    says: ["assumed-unit-depth", "assumed-unit-temperature", "temperature-only"],
    cast: { time: "2013-05-16", station: null },
  }),
];

export const REFUSED: readonly Refused[] = [
  { file: "prose.txt", trap: "sentences with commas", refusedFor: "no-table" },
  { file: "empty.csv", trap: "no bytes", refusedFor: "empty-file" },
  { file: "no-text.csv", trap: "bytes that are no text", refusedFor: "not-text" },
  { file: "zip-in-disguise.csv", trap: "an archive named as text", refusedFor: "format-not-read" },
  { file: "station-list.csv", trap: "places and nothing measured", refusedFor: "station-list" },
  { file: "real-bay-stations.csv", trap: "agency list of stations", refusedFor: "station-list" },
  { file: "real-channel-sites.csv", trap: "agency list of sites, depths in two units", refusedFor: "station-list" },
];
