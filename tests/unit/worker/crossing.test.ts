import { describe, expect, it } from "vitest";
import type { SolvedCast, Survey } from "../../../src/survey/index.ts";
import { addFlagEdits, emptySurvey, solveCast, uncertaintyAtDepths } from "../../../src/survey/index.ts";
import { packCast, unpackCast } from "../../../src/worker/answered-cast.ts";
import { buffersOf } from "../../../src/worker/buffers.ts";
import { drawnProfile } from "../../../src/worker/drawn-profile.ts";
import { markedSamples } from "../../../src/worker/marked-samples.ts";
import { packRuns, unpackRuns } from "../../../src/worker/runs.ts";
import { castOf } from "../../support/cast-of.ts";

const smoothCast = (n: number) => {
  const depthM = Array.from({ length: n }, (_, i) => 0.5 + (20 * i) / n);
  return castOf({
    depthM,
    inSituTempC: depthM.map((depth) => 18 - 6 / (1 + Math.exp(8 - depth))),
    practicalSalinity: depthM.map((depth) => 4 + 20 / (1 + Math.exp(8 - depth))),
  });
};

const flagging = (cast: SolvedCast["cast"], fromIndex: number, toIndex: number): Survey =>
  addFlagEdits({ ...emptySurvey, casts: [cast] }, { castId: cast.id, fromIndex, toIndex }, 4);

describe("runs", () => {
  it("say equal neighbours once and come back as they were", () => {
    const items = ["a", "a", "b", "a"];
    expect(packRuns(items)).toEqual([
      { value: "a", count: 2 },
      { value: "b", count: 1 },
      { value: "a", count: 1 },
    ]);
    expect(unpackRuns(packRuns(items))).toEqual(items);
    expect(unpackRuns(packRuns([]))).toEqual([]);
  });
});

describe("buffersOf", () => {
  it("finds the memory of every array once, wherever it stands", () => {
    const values = new Float64Array(3);
    const found = buffersOf({
      a: values,
      b: [{ c: values.subarray(1) }, { c: new Uint8Array(2) }],
      d: null,
      e: "text",
    });
    expect(found.size).toBe(2);
    expect(found.has(values.buffer)).toBe(true);
  });
});

describe("a solved cast on its way between threads", () => {
  it("comes back as it was, and leaves the samples it was solved from where they are", () => {
    const cast = smoothCast(40);
    const solved = solveCast(flagging(cast, 3, 6), cast);
    const { packed, buffers } = packCast(solved, 0);
    const received = unpackCast(structuredClone(packed, { transfer: [...buffers] }), cast);
    expect(cast.samples.depthM!.length).toBe(40);
    expect(received.cast).toBe(cast);
    const again = solveCast(flagging(cast, 3, 6), cast);
    const { drawn: _, marked: __, bottomBudget, ...rest } = received;
    expect(rest).toEqual(again);
    const { column } = again.solution!;
    const atBottom = uncertaintyAtDepths(column, again.prepared.cast, [column.bottomDepthM]);
    expect(bottomBudget!.combinedKPa).toBe(atBottom.combinedKPa[0]);
  });
});

describe("drawnProfile", () => {
  const solutionOf = (n: number) => {
    const cast = smoothCast(n);
    return solveCast(emptySurvey, cast).solution!;
  };

  it("is the profile itself where it is short", () => {
    const solution = solutionOf(50);
    expect(drawnProfile(solution).rhoKgM3).toBe(solution.profile.rhoKgM3);
    expect(drawnProfile(solution)).toMatchObject({ firstSampleIndex: 1, lastSampleIndex: 50 });
  });

  it("keeps the ends and the extremes of a long one", () => {
    const solution = solutionOf(8000);
    const { profile } = solution;
    const drawn = drawnProfile(solution);
    expect(drawn.n).toBeLessThan(6000);
    expect([drawn.depthM[0], drawn.depthM.at(-1)]).toEqual([0, profile.depthM.at(-1)]);
    expect(drawn.depthM[drawn.firstSampleIndex]).toBe(profile.depthM[1]);
    expect(drawn.lastSampleIndex).toBe(drawn.n - 1);
    expect(Math.max(...drawn.rhoKgM3)).toBe(Math.max(...profile.rhoKgM3));
    expect([...drawn.depthM]).toEqual([...drawn.depthM].sort((a, b) => a - b));
  });
});

describe("markedSamples", () => {
  it("counts, places and explains what is left out, in runs of neighbours", () => {
    const cast = smoothCast(40);
    const marked = markedSamples(solveCast(flagging(cast, 3, 6), cast), 0);
    expect([marked.flaggedCount, marked.leftOutCount]).toEqual([0, 4]);
    expect(marked.runs).toEqual([
      // Samples stand from line 2 on.
      {
        fromLineIndex: 5,
        toLineIndex: 8,
        count: 4,
        isUsed: false,
        reasons: expect.arrayContaining([expect.any(String)]),
      },
    ]);
    expect([...marked.marks.sampleIndex]).toEqual([3, 4, 5, 6]);
    expect(marked.marks.depthM[0]).toBeCloseTo(cast.samples.depthM![3]!, 9);
    expect(marked.sampleDepthM.length).toBe(40);
  });

  it("places samples recorded in pressure on the column's own depths", () => {
    const { depthM } = smoothCast(40).samples;
    const cast = castOf({
      seaPressureDbar: Array.from(depthM!, (depth) => depth * 1.01),
      inSituTempC: Array.from(depthM!, () => 15),
      practicalSalinity: Array.from(depthM!, (depth) => depth),
    });
    const solved = solveCast(flagging(cast, 10, 10), cast);
    const { sampleDepthM } = markedSamples(solved, 0);
    const knots = [...solved.solution!.column.depthM];
    expect(sampleDepthM[9]).toBeCloseTo(knots[9]!, 9);
    expect(sampleDepthM[10]).toBeGreaterThan(knots[9]!);
    expect(sampleDepthM[10]).toBeLessThan(knots[10]!);
  });

  it("marks no more than can be told apart, and still counts all", () => {
    const cast = smoothCast(6000);
    const marked = markedSamples(solveCast(flagging(cast, 100, 4100), cast), 0);
    expect(marked.leftOutCount).toBeGreaterThanOrEqual(4001);
    expect(marked.marks.sampleIndex.length).toBeLessThanOrEqual(600);
  });
});
