import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { testHost } from "../support/test-host.ts";

const bytesOf = (path: string): Uint8Array => new Uint8Array(readFileSync(new URL(`../../${path}`, import.meta.url)));

async function layerhead(files: Parameters<typeof testHost>[0], ...args: readonly string[]) {
  const { host, said } = testHost(files);
  const status = await run(host, args);
  return { status, ...said };
}

const estuary = { "estuary.csv": bytesOf("sample-data/corrow-estuary.csv") };

describe("layerhead inspect", () => {
  it("tells every column's role, unit, how sure it is and why, and every sample left out", async () => {
    const { status, out } = await layerhead(estuary, "inspect", "estuary.csv");
    expect(status).toBe(0);
    expect(out).toMatch(/Temperature +temperature +degC +sure +\S/);
    expect(out).toMatch(/estuary\.csv:78: Quay: flag \d, left out: \S/);
    expect(out).toMatch(/estuary\.csv:273: Old Mill: flag 4, left out: \S/);
  });

  it("gives the same as JSON", async () => {
    const { status, out } = await layerhead(estuary, "inspect", "estuary.csv", "--json");
    expect(status).toBe(0);
    const [file] = JSON.parse(out).files;
    expect(file).toMatchObject({ read: true, delimiter: "comma", header_line: 4, questions: [] });
    expect(file.columns[7]).toMatchObject({ column: 8, role: "temperature", unit: "degC", confidence: "sure" });
    expect(file.casts).toHaveLength(7);
    const mill = file.casts.find((cast: { name: string }) => cast.name === "Old Mill");
    expect(mill).toMatchObject({ samples: 46, samples_used: 45 });
    expect(mill.remarks[0]).toMatchObject({ line: 273, flag: 4, used: false });
  });

  it("warns of what is read after a damaged netCDF-4 file in the same run", async () => {
    const grid = bytesOf("tests/formats/profile-grid-netcdf4.nc");
    const files = { "cut.nc": grid.subarray(0, 3000), "whole.nc": grid };
    const warning = "whole.nc: warning: read after cut.nc, which is damaged";
    expect((await layerhead(files, "inspect", "cut.nc", "whole.nc")).err).toContain(warning);
    expect((await layerhead(files, "inspect", "whole.nc", "cut.nc")).err).not.toContain(warning);
  });

  it("reads a workbook's sheet by name", async () => {
    const book = { "book.xlsx": bytesOf("tests/formats/two-sheets.xlsx") };
    expect((await layerhead(book, "inspect", "book.xlsx")).out).toContain("sheet May, of About, May, June");
    expect((await layerhead(book, "inspect", "book.xlsx", "--sheet", "June")).out).toContain("sheet June");
    const { status, err } = await layerhead(book, "inspect", "book.xlsx", "--sheet", "July");
    expect(status).toBe(2);
    expect(err).toBe("book.xlsx: no sheet July; there are About, May, June\n");
  });

  it("joins a list of stations and says how", async () => {
    const files = {
      "casts.csv": bytesOf("tests/data/usbr-ship-channel.csv"),
      "sites.csv": bytesOf("tests/data/usbr-ship-channel-sites.csv"),
    };
    const { err, out } = await layerhead(files, "inspect", "casts.csv", "--stations", "sites.csv", "--json");
    expect(err).toContain("sites.csv: note: station 16 is taken for NL 16");
    expect(err).toContain("sites.csv: warning: station Pro is not in the list");
    const {
      files: [file],
      stations,
    } = JSON.parse(out);
    expect(stations.find((match: { station: string }) => match.station === "16")).toMatchObject({
      in_list: "NL 16",
      how: "tolerant",
    });
    const cast = file.casts.find((one: { station: string }) => one.station === "16");
    expect(cast.latitude).toBe(38.0889);
    expect(cast.water_depth_m).toBeCloseTo(9.1, 1);
  });
});

describe("an open question on the command line", () => {
  // Between 0.3 and 3 a conductivity can be S/m, mS/cm or a ratio.
  const doubtful = { "a.csv": "Depth (m),Temp (degC),Conductivity\n1,15,1.2\n2,14,1.6\n3,13,2.2\n" };

  it("is put with the words that answer it, and nothing is computed from the column", async () => {
    const { status, err } = await layerhead(doubtful, "column", "a.csv", "--json");
    expect(status).toBe(2);
    expect(err).toMatch(/a\.csv: needs your answer: .*Conductivity.*--read "conductivity=Conductivity:mS\/cm"/);
  });

  it("is settled by --read", async () => {
    const { status, out, err } = await layerhead(
      doubtful,
      "column",
      "a.csv",
      "--json",
      "--read",
      "conductivity=Conductivity:mS/cm",
    );
    expect(err).not.toContain("needs your answer");
    expect(status).toBe(0);
    expect(JSON.parse(out).casts[0].profile.practical_salinity[1]).toBeCloseTo(0.74, 1);
  });

  it("refuses an answer that means nothing", async () => {
    const { status, err } = await layerhead(doubtful, "column", "a.csv", "--read", "colour=Conductivity");
    expect(status).toBe(64);
    expect(err).toContain("--read");
  });
});

describe("preparation on the command line", () => {
  it("takes means of bins", async () => {
    const { out } = await layerhead(estuary, "column", "estuary.csv", "--bins", "1", "--json");
    const { profile } = JSON.parse(out).casts[0];
    expect(profile.depth_m.length).toBeLessThan(22);
    expect(profile.depth_m[2] - profile.depth_m[1]).toBeCloseTo(1, 0);
  });

  it.each([
    [["--bins", "2"], "--bins 2: expected none, 0.1, 0.25, 0.5, 1"],
    [["--way", "sideways"], "--way sideways: expected auto, down, up, all"],
    [["--water-kind", "beer"], "--water-kind beer: expected any, fresh, estuary, sea"],
  ])("refuses %j", async (args, message) => {
    const { status, err } = await layerhead(estuary, "column", "estuary.csv", ...args);
    expect(status).toBe(64);
    expect(err).toContain(message);
  });
});

describe("a long file on a terminal", () => {
  it("shows a bar that fills up and is taken away", async () => {
    const remark = "a remark that makes the line long ".repeat(15);
    const rows = Array.from({ length: 20_000 }, (_, i) => `${(i / 1000).toFixed(3)},15.000,10.000,${remark}`).join(
      "\n",
    );
    const file = `depth_m,temperature_degC,practical_salinity,remark\n${rows}\n`;
    const { shown } = await layerhead({ "long.csv": file }, "inspect", "long.csv", "--json");
    expect(shown.length).toBeGreaterThan(5);
    expect(shown[0]).toMatch(/^long\.csv \[[#.]{30}\] \d+ %$/);
    expect(shown.at(-2)).toContain("100 %");
    expect(shown.at(-1)).toBe("");
  });
});
