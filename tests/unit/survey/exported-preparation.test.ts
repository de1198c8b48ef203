import { describe, expect, it } from "vitest";
import { PROFILE_TABLE, surveyJson, tableMetadata } from "../../../src/export/index.ts";
import { emptySurvey, type Survey, solve } from "../../../src/survey/index.ts";
import { castOf } from "../../support/cast-of.ts";

const survey: Survey = {
  ...emptySurvey,
  preparation: { way: "down", binM: 0.5, waterKind: "estuary" },
  casts: [
    castOf({
      depthM: [1, 2, Number.NaN, 4],
      inSituTempC: [15, 14.5, 14, 13.5],
      practicalSalinity: [20, Number.NaN, 22, 24],
    }),
  ],
};

interface Json {
  readonly preparation: unknown;
  readonly casts: readonly { readonly left_out: unknown }[];
}

describe("an export", () => {
  const json = surveyJson(survey, solve(survey)) as unknown as Json;

  it("lists every sample that is not in the column, with the reason", () => {
    expect(json.casts[0]!.left_out).toEqual([
      { line: 3, depth_m: 2, flag: 9, reasons: ["salinity missing"] },
      { line: 4, depth_m: null, flag: 9, reasons: ["depth missing"] },
    ]);
  });

  it("says beside the basis how the casts were prepared", () => {
    expect(json.preparation).toEqual({ way: "down", bin_m: 0.5, water_kind: "estuary" });
    const metadata = tableMetadata("a.csv", PROFILE_TABLE, { ...survey, sources: [] });
    expect(metadata.notes).toMatchObject([{ preparation: { way: "down", bin_m: 0.5, water_kind: "estuary" } }]);
  });
});
