import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { CastId } from "../../src/cast/index.ts";
import { defaultPreparation, type FlagEdit, prepareCast } from "../../src/quality/index.ts";
import { castOf } from "../support/cast-of.ts";

const SIGMA = 0.004;
const CAST_ID = "cast" as CastId;

/** In hundredths: what fails then shrinks in a moment, which doubles do not. */
const number = (min: number, max: number) =>
  fc.integer({ min: Math.round(100 * min), max: Math.round(100 * max) }).map((hundredths) => hundredths / 100);

/** A stable halocline and thermocline, many samples thick, at uneven depths, with the noise of a sensor. */
const smoothWater = (noise: number) =>
  fc
    .record({
      stepsM: fc.array(number(0.15, 0.35), { minLength: 40, maxLength: 80 }),
      middleM: number(2, 12),
      thicknessM: number(4, 8),
      salinityStep: number(2, 30),
      coolingC: number(0, 8),
      noises: fc.array(fc.tuple(number(-1, 1), number(-1, 1)), { minLength: 80, maxLength: 80 }),
    })
    .map(({ stepsM, middleM, thicknessM, salinityStep, coolingC, noises }) => {
      let reachedM = 0;
      const depthM = stepsM.map((step) => (reachedM += step));
      const share = depthM.map((z) => (1 + Math.tanh((z - middleM) / thicknessM)) / 2);
      const thousandths = (value: number): number => Math.round(value * 1000) / 1000;
      return {
        depthM,
        inSituTempC: share.map((s, i) => thousandths(18 - coolingC * s - 0.005 * i + noise * noises[i]![0])),
        practicalSalinity: share.map((s, i) => thousandths(1 + salinityStep * s + 0.01 * i + noise * noises[i]![1])),
      };
    });

/** A probe that goes down and up with heave, in the order of time. */
const rawRecord = fc
  .record({ water: smoothWater(SIGMA), heavesM: fc.array(number(-0.4, 0.4), { minLength: 80, maxLength: 80 }) })
  .map(({ water, heavesM }) => {
    const way = [...water.depthM.keys()];
    const inTime = [...way, ...way.toReversed()];
    return {
      depthM: inTime.map((i) => Math.max(0.2, water.depthM[i]! + heavesM[i]!)),
      inSituTempC: inTime.map((i) => water.inSituTempC[i]!),
      practicalSalinity: inTime.map((i) => water.practicalSalinity[i]!),
      timeS: inTime.map((_, k) => k),
    };
  });

const anyPreparation = fc.record({
  way: fc.constantFrom("auto", "down", "up", "all"),
  binM: fc.constantFrom(null, 0.1, 0.25, 0.5, 1),
  waterKind: fc.constantFrom("any", "fresh", "estuary", "sea"),
});

describe("preparing a cast", () => {
  it("hands a monotone smooth cast on as it is", () => {
    fc.assert(
      fc.property(smoothWater(SIGMA), (water) => {
        const cast = castOf(water);
        const prepared = prepareCast(cast, defaultPreparation, [], 0);
        expect(prepared.cast).toBe(cast);
        expect([...prepared.flag]).not.toContain(4);
      }),
    );
  });

  it("finds a spike of 20 sigma", () => {
    fc.assert(
      fc.property(
        smoothWater(SIGMA),
        fc.nat(),
        fc.constantFrom("inSituTempC", "practicalSalinity"),
        fc.constantFrom(-1, 1),
        (water, pick, column, sign) => {
          const at = 1 + (pick % (water.depthM.length - 2));
          const values = water[column];
          const middle = (values[at - 1]! + values[at + 1]!) / 2;
          const halfSpan = Math.abs(values[at + 1]! - values[at - 1]!) / 2;
          const spiked = values.with(at, middle + sign * (halfSpan + 20 * SIGMA));
          const { flag, reasons } = prepareCast(castOf({ ...water, [column]: spiked }), defaultPreparation, [], 0);
          expect(flag[at]).toBeGreaterThanOrEqual(3);
          expect(reasons[at]!.join()).toMatch(/sticks out|water (above|below) it/);
        },
      ),
    );
  });

  it("comes to the same when it is done twice", () => {
    // Means of bins are new values: only of calm water is it sure that the checks pass them too.
    const calmInBins = fc.tuple(smoothWater(SIGMA), anyPreparation);
    const wildAsMeasured = fc.tuple(
      fc.oneof(rawRecord, smoothWater(0.2)),
      anyPreparation.map((preparation) => ({ ...preparation, binM: null })),
    );
    fc.assert(
      fc.property(fc.oneof(calmInBins, wildAsMeasured), ([columns, preparation]) => {
        const once = prepareCast(castOf(columns), preparation, [], 0);
        const twice = prepareCast(once.cast, preparation, [], 0);
        expect(twice.cast.samples).toEqual(once.cast.samples);
      }),
    );
  });

  it("accounts for every sample", () => {
    fc.assert(
      fc.property(rawRecord, anyPreparation, (columns, preparation) => {
        const cast = castOf(columns);
        const { use, reasons, flag, binCount, sampleIndexOf, cast: prepared } = prepareCast(cast, preparation, [], 0);
        const usedCount = use.reduce((sum, used) => sum + used, 0);
        expect(binCount ? binCount.reduce((sum, count) => sum + count, 0) : prepared.samples.n).toBe(usedCount);
        for (let i = 0; i < cast.samples.n; i++) {
          if (use[i] === 0) expect(reasons[i]).not.toEqual([]);
          if (flag[i] !== 1) expect(reasons[i]).not.toEqual([]);
        }
        for (const i of sampleIndexOf) expect(use[i]).toBe(1);
      }),
    );
  });

  it("gives the user the last word", () => {
    const anyEdit = fc.record({
      castId: fc.constant(CAST_ID),
      sampleIndex: fc.nat(79),
      flag: fc.constantFrom(1, 4) as fc.Arbitrary<1 | 4>,
    });
    const editsOnce = fc.uniqueArray(anyEdit, { selector: ({ sampleIndex }: FlagEdit) => sampleIndex });
    fc.assert(
      fc.property(rawRecord, anyPreparation, editsOnce, (columns, preparation, edits) => {
        const { flag, use } = prepareCast(castOf(columns), preparation, edits, 0);
        for (const edit of edits) {
          expect(flag[edit.sampleIndex]).toBe(edit.flag);
          expect(use[edit.sampleIndex]).toBe(edit.flag === 1 ? 1 : 0);
        }
      }),
    );
  });

  it("keeps the means of a bin between its extremes, and in order of depth", () => {
    fc.assert(
      fc.property(rawRecord, fc.constantFrom(0.1, 0.25, 0.5, 1), (columns, binM) => {
        const { cast, use, binCount } = prepareCast(castOf(columns), { ...defaultPreparation, binM }, [], 0);
        const inBin = (i: number, meanDepthM: number): boolean =>
          use[i] === 1 && Math.round(columns.depthM[i]! / binM) === Math.round(meanDepthM / binM);
        cast.samples.depthM!.forEach((meanDepthM, bin) => {
          const members = [...columns.depthM.keys()].filter((i) => inBin(i, meanDepthM));
          expect(members).toHaveLength(binCount![bin]!);
          for (const [column, means] of [
            [columns.inSituTempC, cast.samples.inSituTempC],
            [columns.practicalSalinity, cast.samples.practicalSalinity!],
          ] as const) {
            const values = members.map((i) => column[i]!);
            expect(means[bin]).toBeGreaterThanOrEqual(Math.min(...values));
            expect(means[bin]).toBeLessThanOrEqual(Math.max(...values));
          }
          if (bin > 0) expect(meanDepthM).toBeGreaterThan(cast.samples.depthM![bin - 1]!);
        });
      }),
    );
  });
});
