import { describe, expect, it } from "vitest";
import { basisJson } from "../../../../src/export/basis-json.ts";
import {
  accuracyReasons,
  type Basis,
  defaultAccuracy,
  defaultBasis,
  emptySurvey,
  type Level,
  type LevelId,
  solveCast,
  solveLevels,
  uncertaintyAtDepths,
  uncertaintyOf,
} from "../../../../src/survey/index.ts";
import { castOf } from "../../../support/cast-of.ts";

const level = (depthM: number): Level => ({ id: `level-${depthM}` as LevelId, name: `${depthM} m`, depthM });
const cast = castOf({ depthM: [1, 4, 10], practicalSalinity: [5, 20, 30], inSituTempC: [18, 14, 12] });

describe("the uncertainty in a solution", () => {
  const survey = { ...emptySurvey, casts: [cast], levels: [level(4)] };
  const solved = solveCast(survey, cast);
  const solution = solved.solution!;

  it("is that of the column, row by row and level by level", () => {
    expect(solution.uncertaintyKPa).toEqual(uncertaintyOf(solution.column, solved.prepared.cast).combinedKPa);
    expect(solution.uncertaintyKPa).toHaveLength(solution.profile.n);
    expect(solution.levelUncertainty).toEqual(uncertaintyAtDepths(solution.column, solved.prepared.cast, [4]));
  });

  it("follows the levels where they are moved", () => {
    const levels = [level(2), level(8)];
    const moved = solveLevels({ levels }, solved).solution!;
    expect(moved.levelUncertainty).toEqual(solveCast({ ...survey, levels }, cast).solution!.levelUncertainty);
    expect(moved.uncertaintyKPa).toBe(solution.uncertaintyKPa);
  });

  it("can be handed to another thread", () => {
    expect(structuredClone(solution.levelUncertainty)).toEqual(solution.levelUncertainty);
  });
});

describe("the accuracies of a basis", () => {
  const names = Object.keys(defaultAccuracy) as (keyof Basis["accuracy"])[];

  it("each have a reason and limits", () => {
    expect(Object.keys(accuracyReasons).sort()).toEqual([...names].sort());
  });

  it("are each written out, under a name of their own", () => {
    const before = JSON.stringify(basisJson(defaultBasis));
    const written = names.map((name) =>
      JSON.stringify(basisJson({ ...defaultBasis, accuracy: { ...defaultAccuracy, [name]: 0.777 } })),
    );
    expect(new Set([before, ...written]).size).toBe(names.length + 1);
  });
});
