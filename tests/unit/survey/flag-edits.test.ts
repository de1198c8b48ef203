import { describe, expect, it } from "vitest";
import type { CastId } from "../../../src/cast/index.ts";
import { addFlagEdits, emptySurvey, removeFlagEdits } from "../../../src/survey/index.ts";

const [quay, ferry] = ["quay", "ferry"] as [CastId, CastId];
const words = ({ flagEdits }: typeof emptySurvey) =>
  flagEdits.map(({ castId, sampleIndex, flag }) => `${castId} ${sampleIndex} ${flag}`);

describe("flags by hand", () => {
  const flagged = addFlagEdits(emptySurvey, { castId: quay, fromIndex: 4, toIndex: 2 }, 4);

  it("are set for a range of samples, given from either end", () => {
    expect(words(flagged)).toEqual(["quay 2 4", "quay 3 4", "quay 4 4"]);
  });

  it("replace earlier ones, of that cast only", () => {
    const both = addFlagEdits(flagged, { castId: ferry, fromIndex: 3, toIndex: 3 }, 4);
    const changed = addFlagEdits(both, { castId: quay, fromIndex: 3, toIndex: 3 }, 1);
    expect(words(changed).sort()).toEqual(["ferry 3 4", "quay 2 4", "quay 3 1", "quay 4 4"]);
  });

  it("are taken back for a range of samples", () => {
    expect(words(removeFlagEdits(flagged, { castId: quay, fromIndex: 3, toIndex: 9 }))).toEqual(["quay 2 4"]);
  });

  it("change nothing where there was nothing to take back", () => {
    expect(removeFlagEdits(flagged, { castId: ferry, fromIndex: 0, toIndex: 9 })).toBe(flagged);
  });
});
