import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { type AnyFileReading, readFile } from "../../src/cast/index.ts";

const bytesOf = (name: string): Uint8Array => new Uint8Array(readFileSync(new URL(name, import.meta.url)));

async function reading(name: string, sheet?: string): Promise<AnyFileReading> {
  const outcome = await readFile(name, bytesOf(name), sheet === undefined ? {} : { sheet });
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("\n"));
  return outcome.value;
}

/** As make_formats.py wrote them. */
const TEMP_C = [18.25, 18.125, 17.5, 14.75, 12.0625];
const PRACTICAL_SALINITY = [2.5, 3.25, 10, 24.5, 30.125];

describe("netCDF with CF conventions", () => {
  it("reads one profile in the classic format, its place and time from scalars", async () => {
    const { encoding, casts, questions, issues } = await reading("single-profile-classic.nc");
    expect(issues).toEqual([]);
    expect(encoding).toBe("netCDF classic");
    expect(questions).toEqual([]);
    const [cast] = casts;
    expect(cast).toMatchObject({ latitudeDeg: 51.5, longitudeDeg: -29.25, time: "2026-05-17T12:00:00" });
    expect([...cast!.samples.depthM!]).toEqual([0.5, 1, 2, 4, 8]);
    expect([...cast!.samples.inSituTempC]).toEqual(TEMP_C);
    expect([...cast!.samples.practicalSalinity!]).toEqual(PRACTICAL_SALINITY);
  });

  it("reads a grid of profiles of unequal length in netCDF-4, packed values, names in characters", async () => {
    const { encoding, casts } = await reading("profile-grid-netcdf4.nc");
    expect(encoding).toBe("netCDF-4");
    expect(casts.map(({ samples }) => samples.n)).toEqual([5, 5, 3]);
    expect(casts.map(({ name }) => name[0])).toEqual(["A", "B", "C"]);
    expect(casts.map(({ time }) => time)).toEqual([
      "2023-11-14T22:13:20",
      "2023-11-14T23:13:20",
      "2023-11-15T00:13:20",
    ]);
    expect([...casts[1]!.samples.inSituTempC]).toEqual(TEMP_C.map((t) => t + 0.5));
    expect([...casts[2]!.samples.seaPressureDbar!]).toEqual([0.5, 1, 2]);
    expect([...casts[0]!.samples.conductivityMsCm!]).toEqual([4, 5, 15, 32, 38]);
  });

  it("reads a contiguous ragged array in the 64-bit offset format, kelvin to degC", async () => {
    const { casts } = await reading("ragged-profiles-64bit.nc");
    expect(casts.map(({ name, latitudeDeg, time, samples }) => [name, latitudeDeg, time, samples.n])).toEqual([
      ["Cast 11", 51, "2026-05-17T06:00:00", 4],
      ["Cast 12", 52, "2026-05-17T07:30:00", 3],
    ]);
    casts[1]!.samples.inSituTempC.forEach((t, i) => {
      expect(t).toBeCloseTo([16, 15, 14][i]!, 12);
    });
  });

  it("reads an indexed ragged array, compressed", async () => {
    const { casts } = await reading("indexed-profiles-netcdf4.nc");
    expect(casts.map(({ longitudeDeg, samples }) => [longitudeDeg, [...samples.inSituTempC]])).toEqual([
      [-29, [10, 10.5, 11]],
      [-29.1, [9, 9.5, 10]],
    ]);
  });
});

describe("workbooks", () => {
  it("takes the first sheet that holds casts and offers all", async () => {
    const { sheet, sheets, casts, headerLineIndex } = await reading("two-sheets.xlsx");
    expect(sheets).toEqual(["About", "May", "June"]);
    expect(sheet).toBe("May");
    expect(headerLineIndex).toBe(3);
    expect(casts.map(({ station, time, samples }) => [station, time, samples.n])).toEqual([
      ["Quay", "2026-05-17T09:30:00", 5],
      ["Mouth", "2026-05-17T09:30:00", 5],
    ]);
    expect([...casts[0]!.samples.inSituTempC]).toEqual(TEMP_C);
  });

  it("reads the sheet asked for, with its row of units", async () => {
    const { casts } = await reading("two-sheets.xlsx", "June");
    expect([...casts[0]!.samples.inSituTempC].map((t) => t.toFixed(6))).toEqual([
      "20.000000",
      "18.000000",
      "15.000000",
    ]);
    expect(casts[0]!.samples.depthM![0]).toBeCloseTo(0.9144, 12);
  });

  it("says which sheets there are when asked for another", async () => {
    const outcome = await readFile("a.xlsx", bytesOf("two-sheets.xlsx"), { sheet: "July" });
    expect(outcome.issues[0]!.message).toBe("no sheet July; there are About, May, June");
  });
});

describe("damaged and hostile files", () => {
  it.each(["two-sheets.xlsx", "single-profile-classic.nc", "profile-grid-netcdf4.nc"])(
    "%s cut short is refused with a reason",
    async (name) => {
      const bytes = bytesOf(name);
      const outcome = await readFile(name, bytes.slice(0, Math.floor(bytes.length / 3)));
      expect(outcome.ok).toBe(false);
      expect(outcome.issues[0]!.message.length).toBeGreaterThan(20);
    },
  );

  it("a netCDF header that promises more than the file holds is not believed", async () => {
    const bytes = bytesOf("single-profile-classic.nc");
    // The length of dimension z, 5, stands behind its name in the header.
    const view = new DataView(bytes.buffer);
    const at = Array.from({ length: 64 }, (_, i) => i * 4).find((i) => view.getInt32(i) === 0x7a00_0000)!;
    view.setInt32(at + 4, 0x7fff_fff0);
    const outcome = await readFile("lying.nc", bytes);
    expect(outcome.ok).toBe(false);
    expect(outcome.issues[0]!.code).toBe("broken-file");
  });

  it("a workbook that would unpack beyond 256 MB is refused before it is", async () => {
    const { zipSync } = await import("fflate");
    const bomb = zipSync({ "xl/worksheets/sheet1.xml": new Uint8Array(257 * 2 ** 20) }, { level: 9 });
    expect(bomb.length).toBeLessThan(2 ** 20);
    const outcome = await readFile("bomb.xlsx", bomb);
    expect(outcome.issues[0]!.code).toBe("unpacks-too-large");
  });

  it("a workbook that lies about what it unpacks to is refused", async () => {
    const { zipSync } = await import("fflate");
    const bomb = zipSync({ "xl/worksheets/sheet1.xml": new Uint8Array(20 * 2 ** 20) }, { level: 9 });
    const view = new DataView(bomb.buffer, bomb.byteOffset, bomb.byteLength);
    for (let i = 0; i + 4 <= bomb.length; i++)
      if (view.getUint32(i, true) === 20 * 2 ** 20) view.setUint32(i, 1000, true);
    const outcome = await readFile("lying.xlsx", bomb);
    expect(outcome.ok).toBe(false);
  });

  it("text goes the way of text", async () => {
    const outcome = await readFile("a.csv", new TextEncoder().encode("depth_m,temperature_degC\n1,10\n2,9\n"));
    expect(outcome.ok && outcome.value.sheets).toEqual([]);
  });
});
