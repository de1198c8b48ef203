import { createHash } from "node:crypto";
import { readdirSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { expectConverted } from "./converted.ts";
import { bytesOfFile, codesOf, errorsOf, readDataFile, rolesOf } from "./reading.ts";

// First and last samples are copied by eye from the files; counts are those of tests/data/README.md.

describe("the data are what their README says", () => {
  const readme = new TextDecoder().decode(bytesOfFile("tests/data", "README.md"));
  const files = readdirSync(new URL("../../data/", import.meta.url)).filter((name) => name.endsWith(".csv"));

  test.each(files)("%s has the checksum stated", (name) => {
    const sum = createHash("sha256").update(bytesOfFile("tests/data", name)).digest("hex");
    expect(readme).toContain(`${sum}  ${name}`);
  });
});

describe("bay cruise of 2020", () => {
  const reading = readDataFile("usgs-sfbay-2020.csv");

  test("is 34 casts of 521 samples, told apart by station and date", () => {
    expect(reading.casts.length).toBe(34);
    expect(reading.casts.reduce((sum, cast) => sum + cast.samples.n, 0)).toBe(521);
    expect(reading.splitBy).toBe("station and date");
    expect(reading.issues).toEqual([]);
    expect(reading.casts.flatMap((cast) => cast.issues)).toEqual([]);
  });

  test("uses these columns in these units and no other", () => {
    expect(rolesOf(reading)).toEqual({
      date: ["Date", null],
      clock: ["Time", null],
      station: ["Station", null],
      distance: ["Distance from Sta. 36 (km)", "km"],
      depth: ["Depth (m)", "m"],
      practicalSalinity: ["Salinity", "1"],
      temperature: ["Temperature (Degrees Celsius)", "degC"],
      densityAnomaly: ["Sigma-t", "kg/m3"],
    });
  });

  test("keeps place, time and values of the first cast", () => {
    const cast = reading.casts[0]!;
    expect(cast).toMatchObject({ name: "Station 2", station: "2.0", time: "2020-01-13T13:46", distanceKm: 127.7053 });
    const { samples } = cast;
    expect([samples.depthM?.[0], samples.inSituTempC[0], samples.practicalSalinity?.[0]]).toEqual([1, 9.67, 1.27]);
    expect(samples.statedSigmaKgM3?.[0]).toBe(0.73);
    expect(samples.lineIndex[0]).toBe(2);
    expect(samples.conductivityMsCm).toBeNull();
  });

  test("keeps the last sample of the file, where sigma-t is left blank", () => {
    const { samples, distanceKm } = reading.casts.at(-1)!;
    expect(distanceKm).toBe(147.2548);
    expect([samples.depthM?.at(-1), samples.inSituTempC.at(-1), samples.practicalSalinity?.at(-1)]).toEqual([
      11, 9.49, 0.1,
    ]);
    expect(samples.statedSigmaKgM3?.at(-1)).toBeNaN();
  });
});

describe("bay cruises of 2022", () => {
  const reading = readDataFile("usgs-sfbay-2022.csv");

  test("are 36 and 19 casts, the date in the name", () => {
    expect(reading.casts.length).toBe(55);
    expect(reading.casts.filter((cast) => cast.time?.startsWith("2022-03-09")).length).toBe(36);
    expect(reading.casts[0]!.name).toBe("Station 2, 2022-03-09");
    expect(new Set(reading.casts.map((cast) => cast.id)).size).toBe(55);
  });

  test("end at station 36 at 07:52, at distance zero", () => {
    const cast = reading.casts.at(-1)!;
    expect(cast).toMatchObject({ station: "36.0", time: "2022-03-25T07:52", distanceKm: 0 });
    expect([cast.samples.depthM?.at(-1), cast.samples.inSituTempC.at(-1)]).toEqual([5, 16.15]);
    expect([cast.samples.practicalSalinity?.at(-1), cast.samples.statedSigmaKgM3?.at(-1)]).toEqual([26.4, 19.11]);
  });
});

describe("bay cruises of 2017", () => {
  const reading = readDataFile("usgs-sfbay-2017.csv");

  test("are 51 casts from a file with a byte-order mark", () => {
    expect(reading.casts.length).toBe(51);
    expect(reading.encoding).toBe("UTF-8 with byte-order mark");
  });

  test("2/8/17 is 8 February, because 3/21/17 stands in the same column; 801 is 08:01", () => {
    expect(reading.casts[0]).toMatchObject({ station: "20", time: "2017-02-08T08:01" });
    expect(reading.casts.at(-1)).toMatchObject({ station: "657", time: "2017-03-21T16:09" });
  });

  test("oxygen is no temperature, and the missing units are stated as assumed", () => {
    expect(Object.keys(rolesOf(reading)).sort()).toEqual(
      ["clock", "date", "depth", "practicalSalinity", "station", "temperature"].sort(),
    );
    expect(codesOf(reading.issues)).toEqual(["assumed-unit-depth", "assumed-unit-temperature"]);
    expect(reading.columns.find((column) => column.header === "Discrete_Oxygen")?.reason).toContain(
      "single water samples",
    );
  });

  test("keeps the last sample", () => {
    const { samples } = reading.casts.at(-1)!;
    expect([samples.depthM?.at(-1), samples.inSituTempC.at(-1), samples.practicalSalinity?.at(-1)]).toEqual([
      9, 12.63, 0.07,
    ]);
  });
});

describe("ship channel", () => {
  const reading = readDataFile("usbr-ship-channel.csv");

  test("is 38 casts although every sample has its own time", () => {
    expect(reading.casts.length).toBe(38);
    expect(reading.splitBy).toBe("station and date");
    expect(reading.issues).toEqual([]);
  });

  test("turns feet into metres and uS/cm into mS/cm", () => {
    const { samples, ...cast } = reading.casts[0]!;
    expect(cast).toMatchObject({ name: "Station 16, 2016-06-30", station: "16", time: "2016-06-30T07:40:55" });
    expect(samples.n).toBe(14);
    expectConverted(samples.depthM?.[0], 1.891 * 0.3048);
    expectConverted(samples.depthM?.at(-1), 32.064 * 0.3048);
    expect([samples.specificConductanceMsCm?.[0], samples.inSituTempC[0]]).toEqual([0.148, 22.93]);
    expect(samples.conductivityMsCm).toBeNull();
    expect(samples.practicalSalinity).toBeNull();
  });

  test("keeps the last sample", () => {
    const { samples, station } = reading.casts.at(-1)!;
    expect(station).toBe("WSP");
    expectConverted(samples.depthM?.at(-1), 13.539 * 0.3048);
    expect([samples.inSituTempC.at(-1), samples.specificConductanceMsCm?.at(-1)]).toEqual([17.19, 0.663]);
  });
});

describe("lake", () => {
  const reading = readDataFile("ntl-mendota.csv");

  test("is 99 casts, one a date, although times run on through a cast", () => {
    expect(reading.casts.length).toBe(99);
    expect(reading.casts.every((cast) => cast.station === "ME")).toBe(true);
    expect(reading.casts[0]).toMatchObject({ name: "2017-09-29", time: "2017-09-29T15:18:00" });
  });

  test("says that it takes conductance without a unit as uS/cm, and flag columns for nothing", () => {
    expect(codesOf(reading.issues)).toEqual([
      "assumed-unit-depth",
      "assumed-unit-temperature",
      "assumed-unit-specific-conductance",
    ]);
    expect(rolesOf(reading).specificConductance).toEqual(["spec_cond", "uS/cm"]);
    expect(reading.columns.filter((column) => column.header.startsWith("flag_")).every((c) => c.role === null)).toBe(
      true,
    );
  });

  test("keeps first and last samples", () => {
    const first = reading.casts[0]!.samples;
    expect([first.depthM?.[0], first.inSituTempC[0], first.specificConductanceMsCm?.[0]]).toEqual([0, 21.19, 0.518]);
    expect([first.depthM?.at(-1), first.inSituTempC.at(-1), first.specificConductanceMsCm?.at(-1)]).toEqual([
      22, 11.76, 0.641,
    ]);
    const last = reading.casts.at(-1)!.samples;
    expect([last.depthM?.at(-1), last.inSituTempC.at(-1), last.specificConductanceMsCm?.at(-1)]).toEqual([
      20, 11.77, 0.546,
    ]);
  });
});

describe("reservoir", () => {
  const reading = readDataFile("falling-creek-reservoir.csv");

  test("is 356 casts told apart by date alone, temperature only", () => {
    expect(reading.casts.length).toBe(356);
    expect(reading.rowCount).toBe(3639);
    expect(reading.splitBy).toBe("date");
    expect(Object.keys(rolesOf(reading)).sort()).toEqual(["date", "depth", "temperature"]);
    expect(codesOf(reading.issues)).toContain("temperature-only");
  });

  test("keeps first and last samples", () => {
    const first = reading.casts[0]!;
    expect(first).toMatchObject({ name: "2013-05-16", station: null, time: "2013-05-16" });
    expect([first.samples.n, first.samples.depthM?.[0], first.samples.inSituTempC[0]]).toEqual([11, 0.1, 18.3691]);
    const last = reading.casts.at(-1)!;
    expect([last.time, last.samples.depthM?.at(-1), last.samples.inSituTempC.at(-1)]).toEqual([
      "2019-12-06",
      9.2,
      5.4919,
    ]);
  });
});

test.each(["usgs-sfbay-stations.csv", "usbr-ship-channel-sites.csv"])("%s is told to be a list of stations", (name) => {
  const errors = errorsOf(bytesOfFile("tests/data", name));
  expect(codesOf(errors)).toEqual(["station-list"]);
  expect(errors[0]!.message).toContain("looks like a list of stations, not casts");
});
