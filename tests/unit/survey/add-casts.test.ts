import { expect, it } from "vitest";
import { addCasts, emptySurvey } from "../../../src/survey/index.ts";
import { castOf } from "../../support/cast-of.ts";

it("keeps names and ids apart, also when the same file is added twice", () => {
  const cast = castOf({ depthM: [1], inSituTempC: [10] }, { name: "Quay" });
  const once = addCasts(emptySurvey, [cast, cast]);
  const twice = addCasts(once, [cast]);
  expect(twice.casts.map(({ name }) => name)).toEqual(["Quay", "Quay (2)", "Quay (3)"]);
  expect(new Set(twice.casts.map(({ id }) => id)).size).toBe(3);
});
