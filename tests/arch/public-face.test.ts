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
    "defaultPreparation",
    "describeAtDepths",
    "emptySurvey",
    "isToolError",
    "joinStations",
    "levelsCsv",
    "parseAnswers",
    "profileCsv",
    "readCastFile",
    "readFile",
    "readStationList",
    "shortcutCosts",
    "solve",
    "solveCast",
    "stratificationOf",
    "summaryCsv",
    "surveyJson",
    "tableMetadata",
    "teos10",
    "waterAtPoints",
  ]);
});
