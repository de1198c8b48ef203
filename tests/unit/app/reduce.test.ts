import { describe, expect, it } from "vitest";
import { type AppState, initialState, readingsOf, surveyOf } from "../../../src/app/state/app-state.ts";
import { type ReadFile, waitingLike } from "../../../src/app/state/files.ts";
import { type Action, reduce } from "../../../src/app/state/reduce.ts";
import { failed, type Issue, type Outcome } from "../../../src/base/index.ts";
import { type AnyFileReading, type CastId, type ReadingAnswers, readCastFile } from "../../../src/cast/index.ts";

const tableOf = (stations: readonly string[]): string =>
  `station,depth (m),temperature (degC),salinity\n${stations
    .flatMap((station) => [`${station},1,15,10`, `${station},2,14,20`])
    .join("\n")}\n`;

const NO_ANSWERS: ReadingAnswers = { columns: [] };

const outcomeOf = (fileName: string, text: string, answers = NO_ANSWERS): Outcome<AnyFileReading> => {
  const read = readCastFile(fileName, new TextEncoder().encode(text), answers);
  return read.ok ? { ...read, value: { ...read.value, sheet: null, sheets: [] } } : read;
};

const fileOf = (fileName: string, stations: readonly string[], over: Partial<ReadFile> = {}): ReadFile => ({
  fileName,
  sha256: stations.join(),
  outcome: outcomeOf(fileName, tableOf(stations)),
  answers: NO_ANSWERS,
  areAnswersRemembered: false,
  headerKey: "station\tdepth (m)\ttemperature (degC)\tsalinity",
  stations: null,
  ...over,
});

const badFile = (...issues: readonly Issue[]): ReadFile =>
  fileOf("bad.csv", [], { sha256: null, outcome: failed(...issues), headerKey: null });

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
    expect(readingsOf(state).map(({ fileName, sha256 }) => [fileName, sha256])).toEqual([["a.csv", "Pier,Quay"]]);
    const more = reduce(state, { ...reading(fileOf("b.csv", ["Weir"])), start: { name: "Other" } } as Action);
    expect(surveyOf(more).name).toBe("Spring");
    expect(names(more).length).toBe(3);
  });

  it("keeps what is wrong with one file apart from the casts of another", () => {
    const issue = { severity: "error", code: "x", message: "no depth" } as const;
    const state = reached(reading(badFile(issue), fileOf("a.csv", ["Pier", "Quay"])));
    expect(names(state)).toEqual(["Pier", "Quay"]);
    expect(state.troubles).toEqual([{ fileName: "bad.csv", wasRead: false, issues: [issue] }]);
    expect(reduce(state, { kind: "troubles-dismissed" }).troubles).toEqual([]);
  });

  it("starts no history entry for a file without casts", () => {
    expect(reached(reading(badFile())).history.past).toEqual([]);
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
    const state = reached(reading(fileOf("a.csv", [..."ABCDEFGHIJK"])));
    const colours = surveyOf(state).casts.map((cast) => state.colourIndexOf[cast.id]);
    expect(colours).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 0]);
    const fewer = reduce(state, { kind: "cast-removed", castId: idOf(state, "A") });
    expect(surveyOf(fewer).casts.map((cast) => fewer.colourIndexOf[cast.id])).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 0]);
    const more = reduce(fewer, reading(fileOf("b.csv", ["X", "Y"])));
    expect(more.colourIndexOf[idOf(more, "X")]).toBe(0);
    expect(more.colourIndexOf[idOf(more, "Y")]).toBe(1);
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

  it("takes a file that is there already in place of its first reading, and keeps another of the same name apart", () => {
    const state = reached(reading(fileOf("a.csv", ["A", "B"])), reading(fileOf("a.csv", ["A", "B"])));
    expect(names(state)).toEqual(["A", "B"]);
    expect(readingsOf(state).length).toBe(1);
    const other = reduce(state, reading(fileOf("a.csv", ["A", "C"])));
    expect(names(other)).toEqual(["A", "B", "A (2)", "C"]);
    expect(readingsOf(other).map(({ fileName }) => fileName)).toEqual(["a.csv", "a.csv (2)"]);
    expect(surveyOf(other).casts.map((cast) => cast.fileName)).toEqual(["a.csv", "a.csv", "a.csv (2)", "a.csv (2)"]);
  });
});

describe("reading a file again", () => {
  const inFeet: ReadingAnswers = { columns: [{ header: "depth (m)", role: "depth", unit: "ft" }] };
  const again = (over: Partial<ReadFile> = {}): ReadFile =>
    fileOf("a.csv", ["A", "B"], { outcome: outcomeOf("a.csv", tableOf(["A", "B"]), inFeet), answers: inFeet, ...over });
  const start = reached(reading(fileOf("a.csv", ["A", "B"]), fileOf("b.csv", ["C"])));
  const readAgain = (state: AppState, file: ReadFile, memory: "keep" | "forget" | "as-it-is" = "keep"): AppState =>
    reduce(state, { kind: "files-read-again", files: [{ ...file, sheet: null }], memory });

  it("puts its casts where they were, remembers the answers for its headers, and can be undone", () => {
    const state = readAgain(start, again());
    expect(names(state)).toEqual(["A", "B", "C"]);
    expect(readingsOf(state)[0]!.answers).toEqual(inFeet);
    expect(state.history.present.remembered).toEqual({ [again().headerKey!]: inFeet });
    const undone = reduce(state, { kind: "undone" });
    expect(readingsOf(undone)[0]!.answers).toEqual(NO_ANSWERS);
    expect(undone.history.present.remembered).toEqual({});
  });

  it("finds the files that wait with the same headers and nothing said about them", () => {
    const question = { code: "x", columnIndex: 1, message: "?", choices: [] };
    const [a, b] = readingsOf(start).map((one) => ({ ...one, questions: [question] }));
    expect(waitingLike(a!, [a!, b!])).toEqual([b]);
    expect(waitingLike(a!, [a!, { ...b!, headerKey: "other" }])).toEqual([]);
    expect(waitingLike(a!, [a!, { ...b!, answers: inFeet }])).toEqual([]);
  });

  it("forgets answers when told to", () => {
    const forgotten = readAgain(readAgain(start, again()), fileOf("a.csv", ["A", "B"]), "forget");
    expect(forgotten.history.present.remembered).toEqual({});
    expect(readingsOf(forgotten)[0]!.answers).toEqual(NO_ANSWERS);
  });

  it("takes the casts away and says why where the answers leave none", () => {
    const issue = { severity: "error", code: "no-depth", message: "no depth" } as const;
    const state = readAgain(start, again({ outcome: failed(issue), headerKey: null }));
    expect(names(state)).toEqual(["C"]);
    expect(readingsOf(state)[0]!).toMatchObject({ fileName: "a.csv", refusal: [issue], answers: inFeet });
    expect(names(readAgain(state, again()))).toEqual(["C", "A", "B"]);
  });

  it("keeps the user's flags on casts that have the same samples", () => {
    const castId = idOf(start, "A");
    const ranges = [{ castId, fromIndex: 0, toIndex: 1 }];
    const flagged = reduce(start, { kind: "samples-flagged", ranges, flag: 4 });
    expect(surveyOf(readAgain(flagged, again())).flagEdits.length).toBe(2);
    const fewer = again({ outcome: outcomeOf("a.csv", tableOf(["Z"])) });
    expect(surveyOf(readAgain(flagged, fewer)).flagEdits).toEqual([]);
  });
});

describe("flags and preparation", () => {
  const start = reached(reading(fileOf("a.csv", ["A", "B"])));
  const castId = idOf(start, "A");

  it("flags ranges of samples, takes the flags back, and undoes both", () => {
    const ranges = [{ castId, fromIndex: 0, toIndex: 0 }];
    const flagged = reduce(start, { kind: "samples-flagged", ranges, flag: 4 });
    expect(surveyOf(flagged).flagEdits).toEqual([{ castId, sampleIndex: 0, flag: 4 }]);
    const cleared = reduce(flagged, { kind: "samples-flagged", ranges, flag: null });
    expect(surveyOf(cleared).flagEdits).toEqual([]);
    expect(surveyOf(reduce(cleared, { kind: "undone" })).flagEdits.length).toBe(1);
  });

  it("changes one part of the preparation", () => {
    const state = reduce(start, { kind: "preparation-changed", change: { binM: 0.5 } });
    expect(surveyOf(state).preparation).toEqual({ way: "auto", binM: 0.5, waterKind: "any" });
  });
});
