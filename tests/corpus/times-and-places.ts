import { DT, DTS, FIRST, file, LAST, NO_SALT, type Understood, waiting } from "./expected.ts";

/** Dates, clocks, places, flags and names. */
export const TIMES_AND_PLACES: readonly Understood[] = [
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
];
