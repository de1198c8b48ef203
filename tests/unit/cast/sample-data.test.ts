import { execFileSync } from "node:child_process";
import { copyFileSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { bytesOfFile, codesOf, readSample, rolesOf } from "./reading.ts";

const FILES = ["corrow-estuary.csv", "halvane-reservoir.csv"];

test("the generator makes the same bytes again", () => {
  const folder = mkdtempSync(join(tmpdir(), "sample-data-"));
  try {
    const script = join(folder, "make-sample-data.mjs");
    copyFileSync(fileURLToPath(new URL("../../../sample-data/make-sample-data.mjs", import.meta.url)), script);
    execFileSync(process.execPath, [script]);
    for (const name of FILES)
      expect(readFileSync(join(folder, name)).equals(bytesOfFile("sample-data", name))).toBe(true);
  } finally {
    rmSync(folder, { recursive: true });
  }
});

test.each(FILES)("%s says that it is invented", (name) => {
  expect(new TextDecoder().decode(bytesOfFile("sample-data", name)).split("\n")[0]).toContain("INVENTED");
});

describe("the estuary", () => {
  const reading = readSample("corrow-estuary.csv");

  test("is seven stations in order, units from the row below the headers", () => {
    expect(reading.casts.map((cast) => cast.name)).toEqual([
      "Mouth",
      "Quay",
      "Ferry",
      "Bend 4",
      "Old Mill",
      "Rail Bridge",
      "Weir Pool",
    ]);
    expect(rolesOf(reading).depth).toEqual(["Depth", "m"]);
    expect(rolesOf(reading).distance).toEqual(["Distance from mouth", "km"]);
    expect(reading.casts.map((cast) => cast.distanceKm)).toEqual([0, 2.7, 5.1, 8.4, 11.9, 15.2, 18.6]);
    expect(reading.issues).toEqual([]);
  });

  test("keeps soak, reversal and spike in the samples, and names the one missing salinity", () => {
    const withIssues = reading.casts.filter((cast) => cast.issues.length > 0);
    expect(withIssues.map((cast) => cast.name)).toEqual(["Rail Bridge"]);
    expect(codesOf(withIssues[0]!.issues)).toEqual(["no-salinity"]);
  });
});

test("the reservoir is three sites with specific conductance", () => {
  const reading = readSample("halvane-reservoir.csv");
  expect(reading.casts.map((cast) => cast.name)).toEqual(["Dam", "Narrows", "Inlet Arm"]);
  expect(rolesOf(reading).specificConductance).toEqual(["Specific Conductance (uS/cm)", "uS/cm"]);
  expect(reading.issues).toEqual([]);
});
