import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import type { Cast } from "../../../../src/cast/index.ts";
import {
  budgetOf,
  type Column,
  defaultAccuracy,
  defaultBasis,
  integrateCast,
  uncertaintyAtDepths,
  uncertaintyOf,
  whereToImprove,
} from "../../../../src/column/index.ts";
import { readCastFile } from "../../../../src/index.ts";
import { castOf } from "../../../support/cast-of.ts";

const columnOf = (cast: Cast, basis: Partial<Column["basis"]> = {}): Column => {
  const outcome = integrateCast(cast, { ...defaultBasis, ...basis });
  if (!outcome.ok) throw new Error("no column");
  return outcome.value;
};

/** Salt water under 0.9 m that nobody sampled. */
const gapped = castOf(
  { depthM: [0.9, 2, 4, 6], practicalSalinity: [24, 24.2, 24.4, 24.6], inSituTempC: [12, 12, 12, 12] },
  { latitudeDeg: 50 },
);
const exactLevels = { accuracy: { ...defaultAccuracy, levelDepthM: 0.002 } };

describe("the budget of a depth", () => {
  it("names what dominates, with its share, and what comes next", () => {
    const budget = budgetOf(uncertaintyAtDepths(columnOf(gapped, exactLevels), gapped, [5]), 0)!;
    // By hand: 9.81 * 0.9 * 18.3 / root 12 = 46.6 Pa against 9.81 * 1018 * 0.002 = 20.0 Pa, and little else.
    expect(budget.sentence).toBe("the unsampled top 0.9 m makes 84 % of it; depth of the level 15 %");
    expect(budget.shares[0]!.name).toBe("surface-gap");
    expect(budget.shares.reduce((sum, { shareFrac }) => sum + shareFrac, 0)).toBeCloseTo(1, 12);
    expect(budget.expandedKPa).toBe(2 * budget.combinedKPa);
    expect(budget.shares.every(({ standardKPa }) => standardKPa > 0)).toBe(true);
  });

  it("is none where there is no water, and says so where nothing is uncertain", () => {
    const column = columnOf(gapped, { bedDepthM: 7 });
    expect(budgetOf(uncertaintyAtDepths(column, gapped, [8]), 0)).toBeNull();
    expect(budgetOf(uncertaintyAtDepths(column, gapped, []), 0)).toBeNull();
    expect(budgetOf(uncertaintyOf(column, gapped), 0)!.sentence).toBe("nothing is uncertain here");
  });
});

describe("what would help most", () => {
  it("is a sample at the surface where nothing was sampled there", () => {
    const [best] = whereToImprove(columnOf(gapped, exactLevels), gapped, 5);
    expect(best).toMatchObject({ kind: "sample", depthM: 0 });
    expect(best!.gainFrac).toBeGreaterThan(0.2);
  });

  it("is a sample in the middle of the widest open step, which halves what that step may hide", () => {
    const cast = castOf(
      { depthM: [0, 2, 6, 8], practicalSalinity: [5, 6, 29, 30], inSituTempC: [12, 12, 12, 12] },
      { latitudeDeg: 50 },
    );
    const column = columnOf(cast, exactLevels);
    const [best] = whereToImprove(column, cast, 8);
    expect(best).toMatchObject({ kind: "sample", depthM: 4, words: "one more sample at 4.00 m" });
    const { boundKPa } = uncertaintyAtDepths(column, cast, [2, 6, 8]).sampling;
    const leftKPa = boundKPa[2]! - (boundKPa[1]! - boundKPa[0]!) / 2;
    const before = uncertaintyAtDepths(column, cast, [8]);
    const others = before.combinedKPa[0]! ** 2 - boundKPa[2]! ** 2 / 3;
    // Depths of samples weigh a little less too.
    expect(best!.combinedKPa / Math.sqrt(others + leftKPa ** 2 / 3)).toBeCloseTo(1, 2);
  });

  it("is the latitude, in deep uniform water without one", () => {
    const depthM = Array.from({ length: 400 }, (_, i) => i);
    const cast = castOf({ depthM, practicalSalinity: depthM.map(() => 35), inSituTempC: depthM.map(() => 4) });
    const [best] = whereToImprove(columnOf(cast), cast, 399);
    expect(best).toMatchObject({ kind: "sensor", words: "the latitude, for gravity" });
  });

  it("is nothing where there is no water", () => {
    expect(whereToImprove(columnOf(gapped, { bedDepthM: 7 }), gapped, 9)).toEqual([]);
  });
});

describe("real water", () => {
  /*
   * At the latitude of the place and no less than the equation of state and gravity alone make. No more than: in the bay,
   * sampled every metre from 1 m down, fresh water on top (75 Pa) and one density step a metre; in the channel, steps of
   * less than 0.5 kg/m3; in the lake and the reservoir, 0.2 of salinity that was not measured, down to 24 m.
   */
  it.each([
    ["usgs-sfbay-2017.csv", 37.6, 150],
    ["usgs-sfbay-2020.csv", 37.6, 150],
    ["usgs-sfbay-2022.csv", 37.6, 150],
    ["usbr-ship-channel.csv", 38.4, 20],
    ["ntl-mendota.csv", 43.1, 60],
    ["falling-creek-reservoir.csv", 37.3, 60],
  ])("%s has a finite and sensible budget at the bottom of every cast", (file, latitudeDeg, mostPa) => {
    const reading = readCastFile(file, readFileSync(`tests/data/${file}`));
    if (!reading.ok) throw new Error("not read");
    expect(reading.value.casts.length).toBeGreaterThan(5);
    for (const cast of reading.value.casts) {
      const column = columnOf(cast, { latitudeDeg });
      const uncertainty = uncertaintyOf(column, cast);
      expect(uncertainty.combinedKPa.every((kPa) => Number.isFinite(kPa) && kPa >= 0)).toBe(true);
      const bottomPa = uncertainty.combinedKPa.at(-1)! * 1000;
      expect(bottomPa).toBeGreaterThan(9.8 * column.bottomDepthM * Math.hypot(0.1, 0.004));
      expect(bottomPa).toBeLessThan(mostPa);
    }
  });
});
