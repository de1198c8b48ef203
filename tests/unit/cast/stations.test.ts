import { describe, expect, test } from "vitest";
import { type Cast, joinStations, readStationList, type StationList } from "../../../src/cast/index.ts";
import { bytesOfFile, readDataFile, readText } from "./reading.ts";

const listOf = (name: string, bytes: Uint8Array): StationList => {
  const outcome = readStationList(name, bytes);
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("\n"));
  return outcome.value;
};

const realList = (name: string): StationList => listOf(name, bytesOfFile("tests/data", name));

const list = (text: string): StationList => listOf("list.csv", new TextEncoder().encode(text));

const castsAt = (...stations: readonly string[]): readonly Cast[] =>
  readText(`Station,Depth (m),Temp (C)\n${stations.map((s) => `${s},1,10\n${s},2,9`).join("\n")}\n`).casts;

// The places are copied by eye from the files.
describe("the ship channel and its sites", () => {
  const sites = realList("usbr-ship-channel-sites.csv");
  const { casts, matches } = joinStations(readDataFile("usbr-ship-channel.csv").casts, sites);

  test("a site has its place and the depth of its water", () => {
    expect(sites.stations[0]).toEqual({
      station: "NL 16",
      latitudeDeg: 38.0889,
      longitudeDeg: -121.7425,
      distanceKm: null,
      waterDepthM: 30 * 0.3048,
    });
  });

  test("16 is NL 16 by its figure, which is said", () => {
    expect(matches.find((match) => match.castStation === "16")).toEqual({
      castStation: "16",
      listStation: "NL 16",
      how: "tolerant",
      reason: "the figure in the name is the same",
    });
    expect(casts[0]).toMatchObject({ latitudeDeg: 38.0889, longitudeDeg: -121.7425, waterDepthM: 30 * 0.3048 });
  });

  test("Pro is not taken for PS in silence, but offered", () => {
    const match = matches.find((found) => found.castStation === "Pro");
    expect(match).toMatchObject({ listStation: null, how: "none" });
    expect(match?.reason).toContain("could be PS");
    expect(casts.filter((cast) => cast.station === "Pro").every((cast) => cast.latitudeDeg === null)).toBe(true);
  });

  test("until the user says so", () => {
    const said = joinStations(casts, sites, new Map([["Pro", "PS"]]));
    expect(said.matches.find((match) => match.castStation === "Pro")).toMatchObject({
      listStation: "PS",
      how: "corrected",
    });
    expect(said.casts.find((cast) => cast.station === "Pro")?.latitudeDeg).not.toBeNull();
  });
});

test.each(["usgs-sfbay-2017.csv", "usgs-sfbay-2020.csv", "usgs-sfbay-2022.csv"])(
  "every station of %s is in the list of the bay, west of Greenwich",
  (name) => {
    const { casts, matches } = joinStations(readDataFile(name).casts, realList("usgs-sfbay-stations.csv"));
    expect(matches.filter((match) => match.listStation === null)).toEqual([]);
    expect(casts.every((cast) => cast.latitudeDeg! > 37 && cast.longitudeDeg! < -121)).toBe(true);
  },
);

describe("names that are nearly the same", () => {
  const harbour = list("Station,Lat,Lon\nSt. 07,1,2\nQuay-3,3,4\nDAM,5,6\n12,7,8\n");

  test.each([
    ["St. 07", "St. 07", "same"],
    ["st 7", "St. 07", "tolerant"],
    ["quay 3", "Quay-3", "tolerant"],
    ["dam", "DAM", "tolerant"],
    ["12.0", "12", "tolerant"],
    ["7", "St. 07", "tolerant"],
    ["Quay 33", null, "none"],
    ["Dome", null, "none"],
  ])("%s is %s: %s", (castStation, listStation, how) => {
    expect(joinStations(castsAt(castStation), harbour).matches[0]).toMatchObject({ castStation, listStation, how });
  });

  test("two that are alike are none", () => {
    const match = joinStations(castsAt("7"), list("Station,Lat,Lon\nA 7,1,2\nB 7,3,4\n")).matches[0]!;
    expect(match).toMatchObject({ listStation: null, how: "none" });
    expect(match.reason).toContain("several");
  });

  test("a correction can leave a station out, and one to nowhere is named", () => {
    const matches = (to: string | null) => joinStations(castsAt("12"), harbour, new Map([["12", to]])).matches[0];
    expect(matches(null)).toMatchObject({ listStation: null, how: "corrected" });
    expect(matches("Moon")).toMatchObject({
      listStation: null,
      how: "none",
      reason: '"Moon", as you said, is not in the list',
    });
  });
});

test("the place of a cast itself stands above the list", () => {
  const { casts } = readText("Station,Lat,Lon,Depth (m),Temp (C)\nA,10,20,1,9\nA,10,20,2,9\n");
  const joined = joinStations(casts, list("Station,Lat,Lon,Distance (km),Bottom depth (m)\nA,1,2,5,30\n")).casts[0];
  expect(joined).toMatchObject({ latitudeDeg: 10, longitudeDeg: 20, distanceKm: 5, waterDepthM: 30 });
});

test.each([
  ["no place", "Station,Name\nA,B\n"],
  ["nothing at all", ""],
  ["no station", "Lat,Lon\n1,2\n"],
])("%s is no list", (_, text) => {
  const outcome = readStationList("list.csv", new TextEncoder().encode(text));
  expect(outcome.ok).toBe(false);
  expect(outcome.issues.length).toBeGreaterThan(0);
});

test("a station twice counts once, which is said", () => {
  const outcome = readStationList("list.csv", new TextEncoder().encode("Station,Lat,Lon\nA,1,2\nA,3,4\nB,5,6\n"));
  expect(outcome.ok && outcome.value.stations.map((found) => found.latitudeDeg)).toEqual([1, 5]);
  expect(outcome.issues.map((issue) => issue.code)).toEqual(["station-repeated"]);
});
