import { expect, it } from "vitest";
import * as layerhead from "../../src/index.ts";

it("exports these names and no others; adding one is a decision", () => {
  expect(Object.keys(layerhead).sort()).toEqual([
    "LEVELS_TABLE",
    "PROFILE_TABLE",
    "SUMMARY_TABLE",
    "ToolError",
    "VERSION",
    "addCasts",
    "csvText",
    "defaultBasis",
    "describeAtDepths",
    "emptySurvey",
    "isToolError",
    "levelsCsv",
    "profileCsv",
    "readCastFile",
    "solve",
    "solveCast",
    "summaryCsv",
    "surveyJson",
    "tableMetadata",
    "teos10",
    "waterAtPoints",
  ]);
});
