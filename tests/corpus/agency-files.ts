import { DT, file, type Understood } from "./expected.ts";

/** Extracts of real files; their sources are in README.md. */
export const AGENCY_FILES: readonly Understood[] = [
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
