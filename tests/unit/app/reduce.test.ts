import { describe, expect, it } from "vitest";
import { type AppState, initialState, surveyOf } from "../../../src/app/state/app-state.ts";
import { type Action, type ReadFile, reduce } from "../../../src/app/state/reduce.ts";
import { failed, succeeded } from "../../../src/base/index.ts";
import type { CastId } from "../../../src/cast/index.ts";
import { readCastFile } from "../../../src/cast/index.ts";

const tableOf = (stations: readonly string[]): string =>
  `station,depth (m),temperature (degC),salinity\n${stations
    .flatMap((station) => [`${station},1,15,10`, `${station},2,14,20`])
    .join("\n")}\n`;

const fileOf = (fileName: string, stations: readonly string[]): ReadFile => ({
  fileName,
  sha256: "ab",
  outcome: readCastFile(fileName, new TextEncoder().encode(tableOf(stations))),
});

const reading = (...files: readonly ReadFile[]): Action => ({ kind: "files-read", files, start: { name: "Spring" } });
const reached = (...actions: readonly Action[]): AppState => actions.reduce(reduce, initialState);
const names = (state: AppState): readonly string[] => surveyOf(state).casts.map((cast) => cast.name);
const idOf = (state: AppState, name: string): CastId => surveyOf(state).casts.find((cast) => cast.name === name)!.id;

describe("reduce", () => {
  it("takes the casts of files in, names the survey once and takes the first cast in hand", () => {
    const state = reached(reading(fileOf("a.csv", ["Pier", "Quay"])));
    expect(names(state)).toEqual(["Pier", "Quay"]);
    expect(surveyOf(state).name).toBe("Spring");
    expect(state.castInHandId).toBe(idOf(state, "Pier"));
    expect(state.readings.map(({ fileName, sha256 }) => [fileName, sha256])).toEqual([["a.csv", "ab"]]);
    const more = reduce(state, { ...reading(fileOf("b.csv", ["Weir"])), start: { name: "Other" } } as Action);
    expect(surveyOf(more).name).toBe("Spring");
    expect(names(more).length).toBe(3);
  });

  it("keeps what is wrong with one file apart from the casts of another", () => {
    const issue = { severity: "error", code: "x", message: "no depth" } as const;
    const bad: ReadFile = { fileName: "bad.csv", sha256: null, outcome: failed(issue) };
    const state = reached(reading(bad, fileOf("a.csv", ["Pier", "Quay"])));
    expect(names(state)).toEqual(["Pier", "Quay"]);
    expect(state.troubles).toEqual([{ fileName: "bad.csv", wasRead: false, issues: [issue] }]);
    expect(reduce(state, { kind: "troubles-dismissed" }).troubles).toEqual([]);
  });

  it("starts no history entry for a file without casts", () => {
    const bad: ReadFile = { fileName: "bad.csv", sha256: null, outcome: failed() };
    expect(reached(reading(bad)).history.past).toEqual([]);
  });

  it("takes a basis only with the first files", () => {
    const basis = { airPressureKPa: 90 };
    const first = reached({
      kind: "files-read",
      files: [fileOf("a.csv", ["Pier", "Quay"])],
      start: { name: "s", basis },
    });
    expect(surveyOf(first).basis.airPressureKPa).toBe(90);
    const later = reduce(first, {
      kind: "files-read",
      files: [fileOf("b.csv", ["Weir", "Dam"])],
      start: { name: "s", basis: { airPressureKPa: 80 } },
    });
    expect(surveyOf(later).basis.airPressureKPa).toBe(90);
  });

  it("gives every cast a colour that stays when others go", () => {
    const state = reached(reading(fileOf("a.csv", ["A", "B", "C", "D", "E", "F", "G"])));
    const colours = surveyOf(state).casts.map((cast) => state.colourIndexOf[cast.id]);
    expect(colours).toEqual([0, 1, 2, 3, 4, 5, 0]);
    const fewer = reduce(state, { kind: "cast-removed", castId: idOf(state, "A") });
    expect(surveyOf(fewer).casts.map((cast) => fewer.colourIndexOf[cast.id])).toEqual([1, 2, 3, 4, 5, 0]);
    const more = reduce(fewer, reading(fileOf("b.csv", ["H", "I"])));
    expect(more.colourIndexOf[idOf(more, "H")]).toBe(0);
  });

  it("takes another cast in hand when the one in hand is removed, and none when all go", () => {
    const state = reached(reading(fileOf("a.csv", ["A", "B"])));
    const one = reduce(state, { kind: "cast-removed", castId: idOf(state, "A") });
    expect(one.castInHandId).toBe(idOf(state, "B"));
    expect(reduce(one, { kind: "survey-cleared" }).castInHandId).toBeNull();
  });

  it("shows a hidden cast again when it is taken in hand", () => {
    const state = reached(reading(fileOf("a.csv", ["A", "B"])));
    const castId = idOf(state, "B");
    const hidden = reduce(state, { kind: "cast-toggled", castId });
    expect(hidden.hiddenIds).toEqual([castId]);
    expect(reduce(hidden, { kind: "cast-taken", castId }).hiddenIds).toEqual([]);
    expect(reduce(hidden, { kind: "cast-toggled", castId }).hiddenIds).toEqual([]);
  });

  it("keeps levels in order of depth under names of their own", () => {
    const state = reached({ kind: "level-added", depthM: 8 }, { kind: "level-added", depthM: 3 });
    expect(surveyOf(state).levels.map(({ name, depthM }) => [name, depthM])).toEqual([
      ["Level 2", 3],
      ["Level 1", 8],
    ]);
    const [upper] = surveyOf(state).levels;
    const moved = reduce(state, { kind: "level-moved", levelId: upper!.id, depthM: 9 });
    expect(surveyOf(moved).levels.map(({ name }) => name)).toEqual(["Level 1", "Level 2"]);
    const renamed = reduce(moved, { kind: "level-renamed", levelId: upper!.id, name: "Intake" });
    const fewer = reduce(renamed, { kind: "level-removed", levelId: surveyOf(renamed).levels[0]!.id });
    const again = reduce(fewer, { kind: "level-added", depthM: 1 });
    expect(surveyOf(again).levels.map(({ name }) => name)).toEqual(["Level 1", "Intake"]);
  });

  it("undoes and redoes what changes the survey, and not how one looks at it", () => {
    const state = reached(reading(fileOf("a.csv", ["A", "B"])), { kind: "basis-changed", change: { latitudeDeg: 50 } });
    const looked = reduce(state, { kind: "system-chosen", system: "US" });
    const undone = reduce(looked, { kind: "undone" });
    expect(surveyOf(undone).basis.latitudeDeg).toBeNull();
    expect(undone.system).toBe("US");
    expect(surveyOf(reduce(undone, { kind: "redone" })).basis.latitudeDeg).toBe(50);
    const empty = reduce(undone, { kind: "undone" });
    expect(names(empty)).toEqual([]);
    expect(empty.castInHandId).toBeNull();
  });

  it("reads a file again in place of its first reading", () => {
    const value = readCastFile("a.csv", new TextEncoder().encode(tableOf(["A", "B"])));
    if (!value.ok) throw new Error("unreadable");
    const again: ReadFile = { fileName: "a.csv", sha256: "cd", outcome: succeeded(value.value) };
    const state = reached(reading(fileOf("a.csv", ["A", "B"])), reading(again));
    expect(state.readings.map(({ sha256 }) => sha256)).toEqual(["cd"]);
    expect(new Set(surveyOf(state).casts.map((cast) => cast.id)).size).toBe(4);
  });
});
