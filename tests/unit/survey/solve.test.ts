import { describe, expect, it } from "vitest";
import { emptySurvey, type Level, type LevelId, type Survey, solve, solveLevels } from "../../../src/survey/index.ts";
import { castOf } from "../../support/cast-of.ts";

const level = (name: string, depthM: number): Level => ({ id: name as LevelId, name, depthM });

const survey: Survey = {
  ...emptySurvey,
  casts: [
    castOf(
      { depthM: [1, 2, 6], inSituTempC: [15, 14, 12], practicalSalinity: [5, 10, 30] },
      { name: "Quay", latitudeDeg: 51 },
    ),
    castOf({ depthM: [Number.NaN], inSituTempC: [15] }, { name: "Lost" }),
  ],
  levels: [level("float", 0.4), level("sill", 4), level("anchor", 7.5)],
};

describe("solve", () => {
  const [quay, lost] = solve(survey);

  it("gives every cast a profile and its levels, or the reason why not", () => {
    expect(quay!.solution!.profile.n).toBe(4);
    expect([...quay!.solution!.levels.depthM]).toEqual([0.4, 4, 7.5]);
    expect(lost!.solution).toBeNull();
    expect(lost!.issues.at(-1)!.severity).toBe("error");
  });

  it("says which levels lean on water that was not sampled", () => {
    const about = (code: string) => quay!.issues.filter((issue) => issue.code === code).map((issue) => issue.message);
    expect(about("level-in-surface-gap")).toEqual([
      expect.stringContaining("level float at 0.4 m lies above the first sample"),
    ]);
    expect(about("level-in-bed-gap")).toEqual([
      expect.stringContaining("level anchor at 7.5 m lies 1.50 m below the last sample"),
    ]);
    expect(quay!.solution!.levels.seaPressureDbar[2]).toBeGreaterThan(7.4);
  });

  it("has no result at a level below a known bed, and says so", () => {
    const [bedded] = solve({ ...survey, basis: { ...survey.basis, bedDepthM: 7 } });
    expect(bedded!.solution!.levels.gaugePressureKPa[2]).toBeNaN();
    expect(bedded!.issues.map((issue) => issue.code)).toContain("level-below-bed");
  });

  it("flags rows without a sample as missing and good samples as passed", () => {
    expect([...quay!.solution!.flag]).toEqual([9, 1, 1, 1]);
  });

  it("leaves out what fails or what the user takes out, and carries the flag of what it uses", () => {
    const { id } = survey.casts[0]!;
    const [without] = solve({ ...survey, flagEdits: [{ castId: id, sampleIndex: 1, flag: 4 }] });
    expect([...without!.solution!.profile.depthM]).toEqual([0, 1, 6]);
    expect([...without!.prepared.use]).toEqual([1, 0, 1]);
    const [fresh] = solve({ ...survey, preparation: { ...survey.preparation, waterKind: "fresh" } });
    expect([...fresh!.solution!.flag]).toEqual([9, 3, 3, 3]);
    expect(fresh!.issues.map(({ code }) => code)).toContain("gross-range");
  });

  it("flags a bin as badly as its worst sample", () => {
    const [binned] = solve({
      ...survey,
      casts: [
        castOf({ depthM: [0.9, 1.1, 2, 3], inSituTempC: [15.1, 15, 14, 13], practicalSalinity: [5, 43, 44, 44.5] }),
      ],
      preparation: { ...survey.preparation, binM: 1 },
    });
    expect([...binned!.prepared.binCount!]).toEqual([2, 1, 1]);
    expect([...binned!.solution!.profile.depthM]).toEqual([0, 1, 2, 3]);
    expect([...binned!.solution!.flag].slice(0, 3)).toEqual([9, 3, 3]);
  });

  it("keeps what is said of the samples when none is left to integrate", () => {
    const edits = [0, 1, 2].map((sampleIndex) => ({ castId: survey.casts[0]!.id, sampleIndex, flag: 4 as const }));
    const [emptied] = solve({ ...survey, flagEdits: edits });
    expect(emptied!.solution).toBeNull();
    expect(emptied!.prepared.reasons).toEqual([["taken out by hand"], ["taken out by hand"], ["taken out by hand"]]);
  });

  it("gives elevations where the water surface has one", () => {
    const [raised] = solve({ ...survey, basis: { ...survey.basis, waterSurfaceElevationM: 1.5 } });
    expect([...raised!.solution!.profile.elevationM]).toEqual([1.5, 0.5, -0.5, -4.5]);
  });

  it("solves other levels on the same column to the same as solving anew", () => {
    const moved = { ...survey, levels: [level("sill", 3), level("deep", 9)] };
    const again = solveLevels(moved, quay!);
    expect(again).toEqual(solve(moved)[0]);
    expect(again.solution!.column).toBe(quay!.solution!.column);
    expect(solveLevels(moved, lost!)).toBe(lost);
  });

  it("is plain data that can be handed to another thread", () => {
    expect(structuredClone(quay)).toEqual(quay);
  });

  it("solves an empty survey to nothing", () => {
    expect(solve(emptySurvey)).toEqual([]);
  });
});
