import { describe, expect, test } from "vitest";
import { codesOf, issueOf, onlyCast, readText } from "./reading.ts";

const namesOf = (text: string): readonly string[] => readText(text).casts.map((cast) => cast.name);

const lowering = (prefix: string, depths: readonly number[] = [1, 2, 3, 4, 5]): string =>
  depths.map((depth) => `${prefix}${depth},10,30`).join("\n");

describe("what tells casts apart", () => {
  test("station alone, on one date: the station is the name", () => {
    const text = `Station,Depth (m),Temp (C),Sal\n${lowering("2.0,")}\n${lowering("Quay,")}\n${lowering("29.5,")}`;
    expect(namesOf(text)).toEqual(["Station 2", "Quay", "Station 29.5"]);
    expect(readText(text).casts[0]!.station).toBe("2.0");
  });

  test("rows of one cast need not stand together", () => {
    const text = `Station,Depth (m),Temp (C),Sal\n${lowering("A,", [1, 2])}\n${lowering("B,", [1, 2])}\n${lowering("A,", [3, 4])}`;
    expect(readText(text).casts.map((cast) => [...cast.samples.depthM!])).toEqual([
      [1, 2, 3, 4],
      [1, 2],
    ]);
  });

  test("a cast column", () => {
    const text = `Station,Cast,Depth (m),Temp (C),Sal\n${lowering("A,1,")}\n${lowering("A,2,")}`;
    expect(namesOf(text)).toEqual(["A, Cast 1", "A, Cast 2"]);
    expect(readText(text).splitBy).toBe("station and cast");
  });

  test("no key: one cast, named by the file", () => {
    const reading = readText(`Depth (m),Temp (C),Sal\n${lowering("")}`);
    expect(onlyCast(reading).name).toBe("cast");
    expect(reading.splitBy).toBe("nothing: the file is one cast");
  });

  test("a station written once and left out below is filled down, with a warning", () => {
    const text = "Station,Depth (m),Temp (C),Sal\nA,1,10,30\n,2,10,30\nB,1,10,30\n,2,10,30\n";
    expect(namesOf(text)).toEqual(["A", "B"]);
    expect(issueOf(readText(text).issues, "filled-down").message).toContain(
      "station is blank in 2 rows (first line 3)",
    );
  });

  test("dates that cannot be read still tell days apart, and are named", () => {
    const text = `Date,Depth (m),Temp (C),Sal\n${lowering("day one,")}\n${lowering("day two,")}`;
    const { casts } = readText(text);
    expect(casts.map((cast) => [cast.name, cast.time])).toEqual([
      ["cast (1)", null],
      ["cast (2)", null],
    ]);
    expect(codesOf(casts[0]!.issues)).toContain("not-a-time");
  });

  test("a cast of one sample is left out with a warning when there are others", () => {
    const reading = readText(`Station,Depth (m),Temp (C),Sal\n${lowering("A,")}\nB,1,10,30\n`);
    expect(reading.casts.length).toBe(1);
    expect(issueOf(reading.issues, "cast-left-out").message).toBe("B: one sample, a cast needs two; left out");
  });
});

describe("times", () => {
  const timed = (prefix: string, clocks: readonly string[], depths = [1, 2, 3, 4, 5]): string =>
    depths.map((depth, i) => `${prefix}${clocks[i % clocks.length]},${depth},10,30`).join("\n");
  const HEADER = "Station,Date,Time,Depth (m),Temp (C),Sal";

  test("that run on from sample to sample do not split a cast", () => {
    const text = `${HEADER}\n${timed("A,2020-01-13,", ["09:00", "09:02", "09:04", "09:12", "09:14"])}`;
    expect(onlyCast(readText(text)).time).toBe("2020-01-13T09:00");
  });

  test("one time a cast splits two visits of one day, named by their times", () => {
    const text = `${HEADER}\n${timed("A,2020-01-13,", ["09:00"])}\n${timed("A,2020-01-13,", ["15:30"])}`;
    expect(namesOf(text)).toEqual(["A, 09:00", "A, 15:30"]);
    expect(readText(text).splitBy).toBe("station, date and depth starting over");
  });

  test("seconds that run on, then a gap with depth starting over: two casts", () => {
    const first = timed("A,2020-01-13,", ["09:00:00", "09:00:10", "09:00:20", "09:00:30", "09:00:40"]);
    const second = timed("A,2020-01-13,", ["09:05:00", "09:05:10", "09:05:20", "09:05:30", "09:05:40"]);
    expect(namesOf(`${HEADER}\n${first}\n${second}`)).toEqual(["A, 09:00", "A, 09:05"]);
  });

  test("the same without a gap: one cast, with a warning", () => {
    const text = `Station,Depth (m),Temp (C),Sal\n${lowering("A,")}\n${lowering("A,")}`;
    const cast = onlyCast(readText(text));
    expect(cast.samples.n).toBe(10);
    expect(issueOf(cast.issues, "depth-starts-over")).toMatchObject({ severity: "warning", line: 7 });
  });

  test("without any key a depth that starts over is a new cast", () => {
    expect(namesOf(`Depth (m),Temp (C),Sal\n${lowering("")}\n${lowering("")}`)).toEqual(["cast (1)", "cast (2)"]);
  });

  test("so it is for casts written from the bed upwards", () => {
    const upwards = lowering("", [5, 4, 3, 2, 1]);
    expect(readText(`Depth (m),Temp (C),Sal\n${upwards}\n${upwards}`).casts.length).toBe(2);
  });

  test.each([
    ["down and up again", [1, 2, 3, 4, 5, 6, 5, 4, 3, 2, 1]],
    ["a soak at the surface", [0.5, 1, 0.4, 0.9, 0.5, 1, 2, 3, 4]],
    ["a spike in depth", [1, 2, 3, 30, 4, 5, 6, 7]],
    ["depth dropping out for one sample", [1, 2, 3, 4, 5, 6, 0, 7, 8]],
    ["a soak that starts on the way up", [0.5, 0.4, 0.5, 5, 5.5, 6]],
  ])("%s is one lowering", (_, depths) => {
    const cast = onlyCast(readText(`Depth (m),Temp (C),Sal\n${lowering("", depths)}`));
    expect(cast.samples.n).toBe(depths.length);
    expect(cast.issues).toEqual([]);
  });

  test("a lowering past midnight is one cast, of the day it began on", () => {
    const rows = ["13T23:58:40,1", "13T23:59:20,2", "14T00:00:00,3", "14T00:00:40,4"];
    const cast = onlyCast(
      readText(`Site,DateTime,Depth (m),Temp\n${rows.map((row) => `A,2020-01-${row},10`).join("\n")}`),
    );
    expect(cast).toMatchObject({ time: "2020-01-13T23:58:40", samples: { n: 4 } });
  });

  test("the next morning is another day", () => {
    const rows = ["13T23:58:40,1", "13T23:59:20,2", "14T06:00:00,1", "14T06:00:40,2"];
    const text = `Site,DateTime,Depth (m),Temp\n${rows.map((row) => `A,2020-01-${row},10`).join("\n")}`;
    expect(namesOf(text)).toEqual(["2020-01-13", "2020-01-14"]);
  });

  test("elapsed seconds are no clock", () => {
    const reading = readText("Time (s),Depth (m),Temp (C)\n0,1,10\n0.25,2,10\n0.5,3,10\n");
    expect(reading.columns[0]).toMatchObject({ role: "elapsedTime", unit: "s" });
    expect(onlyCast(reading).time).toBeNull();
    expect([...onlyCast(reading).samples.timeS!]).toEqual([0, 0.25, 0.5]);
  });
});

test("a column named Day may hold whole dates, or the day of a year and a month beside it", () => {
  const whole = readText("Day,Depth (m),Temp (C)\n2026-07-04,1,10\n2026-07-04,2,9\n");
  const parts = readText("Day,Month,Year,Depth (m),Temp (C)\n4,Jul,2026,1,10\n4,Jul,2026,2,9\n");
  const alone = readText("Day,Depth (m),Temp (C)\n4,1,10\n4,2,9\n");
  expect([whole, parts, alone].map((reading) => onlyCast(reading).time)).toEqual(["2026-07-04", "2026-07-04", null]);
});

test("a latitude that is none is not used, with a warning", () => {
  const reading = readText("Lat,Lon,Depth (m),Temp (C)\n5130,-3,1,10\n5130,-3,2,10\n");
  expect(onlyCast(reading)).toMatchObject({ latitudeDeg: null, longitudeDeg: -3 });
  expect(issueOf(reading.issues, "off-the-earth").message).toContain("latitude 5130 is outside -90 to 90 degrees");
});

test("place is the middle of what the rows of a cast say", () => {
  const text = "Lat,Lon,Depth (m),Temp (C)\n51.1,-3,1,10\n51.3,-3.2,2,10\n51.2,-3.1,3,10\n";
  expect(onlyCast(readText(text))).toMatchObject({ latitudeDeg: 51.2, longitudeDeg: -3.1 });
});
