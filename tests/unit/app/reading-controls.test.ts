import { describe, expect, it } from "vitest";
import { answerName, asAnswered, ROLE_GROUPS, unitsFor } from "../../../src/app/show/column-roles.ts";
import { selectSamples } from "../../../src/app/show/flag-selection.ts";
import { reasonsNear, sampleMarks } from "../../../src/app/show/sample-marks.ts";
import { emptyWork, type Work } from "../../../src/app/state/app-state.ts";
import { withAnswer } from "../../../src/app/state/files.ts";
import { correctStation, dropStations, joinList, withStations } from "../../../src/app/state/stations.ts";
import { type CastId, parseAnswers, type StationList } from "../../../src/cast/index.ts";
import { addFlagEdits, emptySurvey, solveCast } from "../../../src/survey/index.ts";
import { packCast, unpackCast } from "../../../src/worker/answered-cast.ts";
import { castOf } from "../../support/cast-of.ts";

describe("what a column can be", () => {
  it("offers only roles and units that the reader knows", () => {
    for (const { role, units } of ROLE_GROUPS.flatMap(({ choices }) => choices))
      for (const unit of [null, ...units]) {
        const said = parseAnswers(`${role}=x${unit === null ? "" : `:${unit}`}`);
        expect(said, `${role} in ${unit}`).toMatchObject({ ok: true, value: { columns: [{ role, unit }] } });
      }
  });

  it("has the unit a column was found in among the units to choose from", () => {
    expect(unitsFor("depth", "mm")).toEqual(["mm", "m", "ft", "cm", "fathom"]);
    expect(unitsFor("depth", "m")).toEqual(["m", "ft", "cm", "fathom"]);
    expect(unitsFor("practicalSalinity", "1")).toEqual([]);
  });

  it("names columns so that each means one", () => {
    const headers = ["T", "", "T", "S"];
    expect(headers.map((_, k) => answerName(headers, k))).toEqual(["T#1", "#2", "T#2", "S"]);
  });

  it("shows a column as answered, and keeps the last answer on a column", () => {
    const column = {
      columnIndex: 0,
      header: "T",
      role: null,
      unit: null,
      confidence: "doubtful",
      reason: "?",
    } as const;
    const first = withAnswer({ columns: [] }, { header: "T", role: "depth", unit: "m" });
    const answers = withAnswer(first, { header: "T", role: "temperature", unit: "degF" });
    expect(answers.columns.length).toBe(1);
    expect(asAnswered(column, answers.columns, ["T"])).toMatchObject({ role: "temperature", unit: "degF" });
    expect(asAnswered(column, [], ["T"])).toBe(column);
  });
});

describe("selecting samples to flag", () => {
  // Down and up again: the same depths come twice.
  const cast = castOf({
    depthM: [1, 2, 3, 4, 3, 2, 1],
    inSituTempC: [15, 14, 13, 12, 13, 14, 15],
    practicalSalinity: [1, 2, 3, 4, 3, 2, 1],
  });
  const survey = { ...emptySurvey, casts: [cast], preparation: { ...emptySurvey.preparation, way: "all" as const } };
  const answered = (over: Partial<typeof survey> = {}) => {
    const terms = { ...survey, ...over };
    return unpackCast(packCast(solveCast(terms, cast), 0).packed, cast);
  };

  it("takes every sample in the range, in runs of neighbours, whichever end comes first", () => {
    const { count, ranges } = selectSamples(answered(), { fromM: 3.5, toM: 1.5 });
    expect(count).toBe(4);
    expect(ranges).toEqual([
      { castId: cast.id, fromIndex: 1, toIndex: 2 },
      { castId: cast.id, fromIndex: 4, toIndex: 5 },
    ]);
    expect(selectSamples(answered(), { fromM: 8, toM: 9 })).toEqual({ count: 0, ranges: [] });
  });

  it("marks flagged samples with their own values and tells the reason near them", () => {
    const { flagEdits } = addFlagEdits(survey, { castId: cast.id, fromIndex: 3, toIndex: 3 }, 4);
    const solved = answered({ flagEdits });
    const mark = sampleMarks(solved, "SI").find(({ values }) => values.temperature === 12);
    expect(mark).toMatchObject({ kind: "left-out", values: { salinity: 4 } });
    expect(reasonsNear(solved, 4.02, 0.1)).toMatch(/^× left out: .*by hand/);
    expect(reasonsNear(answered(), 9, 0.1)).toBe("");
  });
});

describe("stations", () => {
  const at = (station: string, id: string) => ({
    ...castOf({ depthM: [1, 2], inSituTempC: [15, 14] }, { name: station, station }),
    id: id as CastId,
  });
  const listed = (station: string, distanceKm: number) => ({
    station,
    latitudeDeg: 50,
    longitudeDeg: 1,
    distanceKm,
    waterDepthM: 9,
  });
  const list: StationList = { fileName: "list.csv", stations: [listed("PIER", 1), listed("Dam", 2)] };
  const start: Work = { ...emptyWork, survey: { ...emptySurvey, casts: [at("Pier", "a"), at("Quay", "b")] } };
  const distances = (work: Work) => work.survey.casts.map((cast) => cast.distanceKm);

  it("gives casts their places, takes corrections, and gives the places back", () => {
    const work = joinList(start, list);
    expect(distances(work)).toEqual([1, null]);
    expect(work.stations!.matches.map(({ how }) => how)).toEqual(["tolerant", "none"]);
    const corrected = correctStation(correctStation(work, "Quay", "Dam"), "Pier", null);
    expect(distances(corrected)).toEqual([null, 2]);
    expect(dropStations(corrected)).toEqual(start);
  });

  it("keeps casts whose place does not change the very same", () => {
    const work = joinList(start, list);
    expect(work.survey.casts[1]).toBe(start.survey.casts[1]);
    expect(correctStation(work, "Quay", "Dam").survey.casts[0]).toBe(work.survey.casts[0]);
  });

  it("holds for casts that come later, and changes nothing where none come", () => {
    const work = joinList(start, list);
    const more = withStations(work, (plain) => ({
      ...plain,
      survey: { ...plain.survey, casts: [...plain.survey.casts, at("dam", "c")] },
    }));
    expect(distances(more)).toEqual([1, null, 2]);
    expect(more.survey.casts[0]).toBe(work.survey.casts[0]);
    expect(withStations(work, (plain) => plain)).toBe(work);
  });
});
