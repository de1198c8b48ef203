import { describe, expect, it } from "vitest";
import type { Preparation } from "../../../src/quality/index.ts";
import { isRawRecord } from "../../../src/quality/preparing/raw-record.ts";
import { soakEnd } from "../../../src/quality/preparing/soak.ts";
import { type Columns, preparedOf } from "./prepared.ts";

/** Depths in the order of time, one a second, in water whose salinity follows the depth. */
const recorded = (depthM: readonly number[], salinityAt = (z: number) => 20 + z): Columns => ({
  depthM,
  inSituTempC: depthM.map((z) => Math.round((15.004 - z / 10) * 1000) / 1000),
  practicalSalinity: depthM.map((z) => Math.round(1000 * salinityAt(z)) / 1000),
  timeS: depthM.map((_, i) => i),
});

const DECK = [0, 0.02, -0.01];
const SOAK = [0.6, 1.1, 1.3, 1.2, 1.4, 1.2, 1.3, 0.9];
const DOWN = [0.4, 1.02, 1.6, 2.2, 2.8, 2.6, 2.7, 3.3, 4, 4.7, 5.2];
const UP = [5.1, 4.1, 3.2, 2.3, 1.4, 0.5];
const WHOLE = [...DECK, ...SOAK, ...DOWN, ...UP, 0.03];

const kept = (depthM: readonly number[], preparation: Partial<Preparation> = {}) => [
  ...preparedOf(recorded(depthM), preparation).cast.samples.depthM!,
];

describe("a raw record", () => {
  it("is one that goes down and up in time, or densely", () => {
    const times = WHOLE.map((_, i) => i);
    expect(isRawRecord(WHOLE, times)).toBe(true);
    expect(isRawRecord(WHOLE, null)).toBe(false);
    const dense = WHOLE.map((z) => z / 10);
    expect(isRawRecord(dense, null)).toBe(true);
    expect(
      isRawRecord(
        dense,
        dense.map(() => Number.NaN),
      ),
    ).toBe(true);
  });

  it("is not a table that runs one way, or a few depths in any order", () => {
    const down = Array.from({ length: 30 }, (_, i) => i / 8);
    expect(isRawRecord(down, down)).toBe(false);
    expect(isRawRecord([...down].reverse(), down)).toBe(false);
    expect(isRawRecord([0, 5, 2, 9, 7, 12, 10, 20, 15, 30, 25], null)).toBe(false);
  });
});

describe("one way of a raw record", () => {
  it("is the way down by itself: without deck, soak, reversal and the way up", () => {
    expect(kept(WHOLE)).toEqual([0.4, 1.02, 1.6, 2.2, 2.8, 3.3, 4, 4.7, 5.2]);
  });

  it("says of every other sample why it is left out", () => {
    const { reasons, flag, issues } = preparedOf(recorded(WHOLE));
    const reasonAt = (k: number) => reasons[k]!.join();
    expect(reasonAt(0)).toBe("at the surface or on deck, before the lowering");
    expect(reasonAt(2)).toBe("depth -0.01 lies above the water surface");
    expect(reasonAt(5)).toBe("recorded while the probe waited near the surface");
    expect(reasonAt(16)).toBe("not deeper than 2.8 m at line 17: the probe had turned or stood still");
    expect(reasonAt(24)).toBe("recorded on the way up; the way down is used");
    expect(reasonAt(28)).toBe("at the surface or on deck, after the lowering");
    expect(flag[16]).toBe(3);
    expect(flag[24]).toBe(1);
    expect(issues.map(({ code }) => code)).toEqual(["above-surface", "deck", "soak", "pressure-reversal", "other-way"]);
  });

  it("can be the way up, from the top down", () => {
    expect(kept(WHOLE, { way: "up" })).toEqual([0.5, 1.4, 2.3, 3.2, 4.1, 5.1, 5.2]);
  });

  it("is the way up by itself where the way down was not recorded", () => {
    expect(kept([4.8, 5.2, ...UP, 0.45, 0.47, 0.4, 0.42])).toEqual([0.4, 0.45, 0.5, 1.4, 2.3, 3.2, 4.1, 5.1, 5.2]);
  });

  it("can be everything in water", () => {
    expect(kept(WHOLE, { way: "all" })).toEqual(WHOLE.filter((z) => z >= 0));
  });

  it("holds nothing against a sample of a probe that only stood still", () => {
    const { flag, use } = preparedOf(recorded(DOWN.with(5, 2.79)));
    expect([flag[5], use[5]]).toEqual([1, 0]);
    expect([flag[6], use[6]]).toEqual([3, 0]);
  });

  it("is not asked for where the samples run one way already", () => {
    const upward = DOWN.toSorted((a, b) => b - a);
    expect(kept(upward, { way: "down" })).toEqual(upward);
    expect(kept(upward, { way: "up" })).toEqual(upward);
  });

  it("does not take one wild depth for the bottom", () => {
    const wild = DOWN.with(3, 99);
    const { flag, reasons, cast } = preparedOf(recorded(wild));
    expect(flag[3]).toBe(4);
    expect(reasons[3]).toContain("depth jumps to 99 m from 1.6 m and back to 2.8 m");
    expect(Math.max(...cast.samples.depthM!)).toBe(5.2);
  });

  it("leaves out a cell in air where the deck reads a depth", () => {
    const depthM = [0.31, 0.33, 0.3, ...DOWN];
    const columns = recorded(depthM);
    const practicalSalinity = columns.practicalSalinity!.map((salinity, i) => (i < 3 ? 0.001 : salinity));
    const { use, reasons } = preparedOf({ ...columns, practicalSalinity });
    expect([...use.slice(0, 4)]).toEqual([0, 0, 0, 1]);
    expect(reasons[1]).toContain("at the surface or on deck, before the lowering");
  });
});

describe("the end of a soak", () => {
  it("is the last time at the shallowest before going down", () => {
    expect(soakEnd([...SOAK, ...DOWN])).toBe(SOAK.length);
    expect(soakEnd([0.66, 0.94, 0.69, 0.91, 0.67, 0.92, 0.45, 0.67, 0.93, 1.19])).toBe(6);
  });

  it("is not made by a heave, a reversal in deep water or a plain way down", () => {
    expect(soakEnd([0.3, 0.7, 0.5, 1, 1.5, 2])).toBe(0);
    expect(soakEnd([0.3, 1, 2, 3, 4, 3.2, 3.1, 3.3, 5, 6])).toBe(0);
    expect(soakEnd([0.3, 0.4, 0.5, 0.6, 0.7, 1, 2])).toBe(0);
  });
});
