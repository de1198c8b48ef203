import { describe, expect, it } from "vitest";
import type { CastId } from "../../../src/cast/index.ts";
import { defaultPreparation, prepareCast } from "../../../src/quality/index.ts";
import golden from "../../golden/columns.json";
import { castOf } from "../../support/cast-of.ts";
import { readSample } from "../cast/reading.ts";
import { calmWater, flagsOf, preparedOf } from "./prepared.ts";

describe("a clean cast", () => {
  it.each(golden.columns)("passes through as it is: $name", (reference) => {
    const cast = castOf({
      depthM: reference.depth_m,
      practicalSalinity: reference.practical_salinity,
      inSituTempC: reference.temperature_degC,
    });
    const prepared = prepareCast(cast, defaultPreparation, [], 0);
    expect(prepared.cast).toBe(cast);
    expect(prepared.binCount).toBeNull();
    expect([...prepared.use]).toEqual(reference.depth_m.map(() => 1));
    expect([...prepared.flag]).not.toContain(4);
  });

  it("may lie from the bed up, or hold depths twice", () => {
    const water = calmWater(12);
    const upward = castOf({
      depthM: water.depthM.toReversed(),
      inSituTempC: water.inSituTempC.toReversed(),
      practicalSalinity: water.practicalSalinity.toReversed(),
    });
    expect(prepareCast(upward, defaultPreparation, [], 0).cast).toBe(upward);
    const twice = castOf({ depthM: [1, 1, 2], inSituTempC: [15, 14.9, 14], practicalSalinity: [20, 20.1, 21] });
    expect(prepareCast(twice, defaultPreparation, [], 0).cast).toBe(twice);
  });
});

describe("the user's word", () => {
  const water = calmWater(20);
  const spiked = { ...water, practicalSalinity: water.practicalSalinity.with(3, 14) };
  const castId = "cast" as CastId;

  it("brings back what a check failed", () => {
    expect(flagsOf(spiked)[3]).toBe(4);
    const { flag, use, reasons, cast } = preparedOf(spiked, {}, [{ castId, sampleIndex: 3, flag: 1 }]);
    expect([flag[3], use[3]]).toEqual([1, 1]);
    expect(reasons[3]![0]).toBe("taken as good by hand");
    expect(reasons[3]![1]).toMatch(/^salinity 14 sticks out/);
    expect(cast.samples.n).toBe(20);
  });

  it("takes out what passes", () => {
    const { flag, use, reasons, cast, issues, sampleIndexOf } = preparedOf(water, {}, [
      { castId, sampleIndex: 5, flag: 4 },
    ]);
    expect([flag[5], use[5]]).toEqual([4, 0]);
    expect(reasons[5]).toEqual(["taken out by hand"]);
    expect(cast.samples.n).toBe(19);
    expect([...sampleIndexOf.slice(4, 6)]).toEqual([4, 6]);
    expect(issues).toEqual([
      {
        severity: "note",
        code: "by-hand",
        line: 7,
        message: "1 of 20 samples were flagged by hand and are not used (line 7)",
      },
    ]);
  });

  it("is passed over where the cast has no such sample", () => {
    expect(flagsOf(water, {}, [{ castId, sampleIndex: 99, flag: 4 }])).toEqual(water.depthM.map(() => 1));
  });

  it("is about one cast", () => {
    expect(preparedOf(water, {}, [{ castId: "other" as CastId, sampleIndex: 5, flag: 4 }]).cast.samples.n).toBe(20);
  });
});

describe("repeated rows", () => {
  it("count once", () => {
    const { use, reasons } = preparedOf({
      depthM: [1, 2, 2, 3],
      inSituTempC: [15, 14.1, 14.1, 14],
      practicalSalinity: [20, 21, 21, 22],
    });
    expect([...use]).toEqual([1, 1, 0, 1]);
    expect(reasons[2]).toEqual(["repeats line 3"]);
  });
});

describe("bins", () => {
  const { cast, binCount, sampleIndexOf, use } = preparedOf(
    {
      depthM: [0.1, 0.4, 0.6, 1.1, 3.2, 2.9],
      inSituTempC: [20, 19, 18, 17, 12, 13],
      practicalSalinity: [10, 10.2, 10.4, 11, 14, Number.NaN],
    },
    { binM: 1 },
  );

  it("hold the mean of their good samples, at the mean depth", () => {
    expect([...cast.samples.depthM!]).toEqual([0.25, 0.85, 3.2].map((z) => expect.closeTo(z, 12)));
    expect([...cast.samples.inSituTempC]).toEqual([19.5, 17.5, 12]);
    expect([...cast.samples.practicalSalinity!]).toEqual([10.1, 10.7, 14].map((s) => expect.closeTo(s, 12)));
  });

  it("have a thickness", () => {
    expect(() => preparedOf(calmWater(5), { binM: 0 })).toThrow("binM is 0, expected more than 0 m or null");
  });

  it("say how many samples they hold, and do not fill a gap", () => {
    expect([...binCount!]).toEqual([2, 2, 1]);
    expect([...sampleIndexOf]).toEqual([0, 2, 4]);
    expect([...use]).toEqual([1, 1, 1, 1, 1, 0]);
  });
});

describe("the invented estuary", () => {
  const { casts } = readSample("corrow-estuary.csv");
  const prepared = (name: string) => {
    const cast = casts.find((candidate) => candidate.name.startsWith(name))!;
    const result = prepareCast(cast, defaultPreparation, [], 0);
    const leftOut = [...result.use.keys()].filter((i) => result.use[i] === 0);
    return { ...result, leftOut: leftOut.map((i) => [cast.samples.depthM![i], result.flag[i], result.reasons[i]![0]]) };
  };

  it("has a soak at Quay", () => {
    const { leftOut } = prepared("Quay");
    expect(leftOut.map(([depthM]) => depthM)).toEqual([0.66, 0.94, 0.69, 0.91, 0.67, 0.92, 0.7, 0.91]);
    expect(new Set(leftOut.map(([, , reason]) => reason))).toEqual(
      new Set(["recorded while the probe waited near the surface"]),
    );
  });

  it("has a reversal at Ferry", () => {
    expect(prepared("Ferry").leftOut).toEqual(
      [8.67, 8.46, 8.78].map((z) => [z, 3, "not deeper than 8.98 m at line 183: the probe had turned or stood still"]),
    );
  });

  it("has a salinity spike at Old Mill", () => {
    expect(prepared("Old Mill").leftOut).toEqual([
      [4.7, 4, "salinity 10.671 sticks out by 6.177 from 4.372 above and 4.615 below"],
    ]);
  });

  it("lacks one salinity at Rail Bridge", () => {
    expect(prepared("Rail Bridge").leftOut).toEqual([[3.47, 9, "salinity missing"]]);
  });

  it("is otherwise used as it is", () => {
    const names = ["Quay", "Ferry", "Old Mill", "Rail Bridge"];
    for (const cast of casts.filter(({ name }) => !names.some((odd) => name.startsWith(odd)))) {
      const result = prepareCast(cast, defaultPreparation, [], 0);
      expect(result.cast).toBe(cast);
      expect(new Set(result.flag)).toEqual(new Set([1]));
    }
  });
});

describe("a long record", () => {
  it("of two hundred thousand equal samples is checked like any other", () => {
    const n = 200_000;
    const prepared = preparedOf({
      depthM: Array.from({ length: n }, (_, i) => i / 1000),
      inSituTempC: new Array<number>(n).fill(12.345),
      practicalSalinity: new Array<number>(n).fill(20.123),
    });
    expect(prepared.flag).toHaveLength(n);
  });
});
