import { describe, expect, it } from "vitest";
import { flagsOf, preparedOf } from "./prepared.ts";

describe("missing", () => {
  const { flag, use, reasons, issues, cast, sampleIndexOf } = preparedOf({
    depthM: [1, 2, Number.NaN, 4, -0.3],
    inSituTempC: [12, 12, 12, Number.NaN, 12],
    practicalSalinity: [20, Number.NaN, 20, Number.NaN, 20],
  });

  it("says what each sample lacks and does not use it", () => {
    expect([...flag]).toEqual([1, 9, 9, 9, 4]);
    expect([...use]).toEqual([1, 0, 0, 0, 0]);
    expect(reasons).toEqual([
      [],
      ["salinity missing"],
      ["depth missing"],
      ["temperature and salinity missing"],
      ["depth -0.3 lies above the water surface"],
    ]);
    expect(issues.map(({ code }) => code)).toEqual(["incomplete-sample", "above-surface"]);
    expect(issues[0]!.message).toBe(
      "3 of 5 samples lack depth, temperature or salinity and are not used (lines 3 to 5)",
    );
  });

  it("leaves the rest to the column", () => {
    expect(cast.samples.n).toBe(1);
    expect([...sampleIndexOf]).toEqual([0]);
  });

  it("can not be overruled", () => {
    const edit = { castId: cast.id, sampleIndex: 1, flag: 1 } as const;
    const again = preparedOf({ depthM: [1, 2], inSituTempC: [12, 12], practicalSalinity: [20, Number.NaN] }, {}, [
      edit,
    ]);
    expect([...again.flag]).toEqual([1, 9]);
    expect([...again.use]).toEqual([1, 0]);
  });
});

describe("gross range", () => {
  const at = (inSituTempC: number, practicalSalinity: number, waterKind: "any" | "fresh" | "estuary" | "sea" = "any") =>
    flagsOf({ depthM: [1], inSituTempC: [inSituTempC], practicalSalinity: [practicalSalinity] }, { waterKind })[0];

  it("fails what no sensor reads in water", () => {
    expect(at(85, 20)).toBe(4);
    expect(at(-6, 20)).toBe(4);
    expect(at(12, -0.2)).toBe(4);
    expect(flagsOf({ depthM: [1], inSituTempC: [12], conductivityMsCm: [0] })).toEqual([4]);
  });

  it("fails a depth that no water has", () => {
    expect(flagsOf({ depthM: [1, 1e9], inSituTempC: [12, 12], practicalSalinity: [20, 21] })).toEqual([1, 4]);
  });

  it("makes what is unusual for the kind of water suspect", () => {
    // IOOS QARTOD manual, default ranges: -2 to 40 degC, salinity 0 to 42; from memory.
    expect(at(41, 20)).toBe(3);
    expect(at(12, 60)).toBe(3);
    expect(at(12, -0.02)).toBe(3);
    expect(at(12, 5)).toBe(1);
    expect(at(12, 5, "fresh")).toBe(3);
    expect(at(12, 5, "estuary")).toBe(1);
    expect(at(12, 5, "sea")).toBe(3);
    expect(at(12, 40, "estuary")).toBe(3);
    expect(at(12, 40, "sea")).toBe(1);
  });

  it("says the value, the range and the water", () => {
    const { reasons } = preparedOf({ depthM: [1], inSituTempC: [12], practicalSalinity: [5] }, { waterKind: "fresh" });
    expect(reasons[0]).toEqual(["salinity 5 is outside 0 to 1, the range of fresh water"]);
  });
});

describe("freezing", () => {
  const at = (tempC: number, salinity: number) =>
    flagsOf({ depthM: [1], inSituTempC: [tempC], practicalSalinity: [salinity] })[0];

  it("makes water suspect that is more than 0.1 degC below its freezing point", () => {
    // Freezing point of salinity 35 at the surface: -1.92 degC (UNESCO 1983: -1.922); fresh water 0.
    expect(at(-1.99, 35)).toBe(1);
    expect(at(-2, 33)).toBe(3);
    expect(at(-0.05, 0)).toBe(1);
    expect(at(-0.15, 0)).toBe(3);
    expect(at(-0.5, 20)).toBe(1);
  });
});

describe("the file's own flags", () => {
  const { flag, use, reasons } = preparedOf({
    depthM: [1, 2, 3, 4, 5],
    inSituTempC: [12, 12, 12, 12, 12],
    practicalSalinity: [20, 20, 20, 20, 20],
    statedFlag: [1, 2, 3, 4, 9],
  });

  it("are carried in", () => {
    expect([...flag]).toEqual([1, 1, 3, 4, 9]);
    expect([...use]).toEqual([1, 1, 1, 0, 0]);
    expect(reasons[3]).toEqual(["flagged 4 (fail) in the file itself"]);
  });
});
