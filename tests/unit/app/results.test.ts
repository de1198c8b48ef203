import { describe, expect, it } from "vitest";
import { steppedDepthM } from "../../../src/app/show/plumb-steps.ts";
import { shownPercent, shownValue } from "../../../src/app/show/shown.ts";
import { behindDepth, buoyancyAround, strongestStratification } from "../../../src/app/show/water-at.ts";
import { emptyWork, initialState } from "../../../src/app/state/app-state.ts";
import { exportFiles } from "../../../src/app/state/export-files.ts";
import { governingCast } from "../../../src/app/state/governing-cast.ts";
import { samplesKeysOf, statePacker, takeUp } from "../../../src/app/state/saved-state.ts";
import { nextShare, stillValid } from "../../../src/app/state/solved-share.ts";
import { type CastId, readCastFile } from "../../../src/cast/index.ts";
import {
  addFlagEdits,
  defaultBasis,
  emptySurvey,
  type LevelId,
  type Survey,
  solve,
  startHistory,
} from "../../../src/survey/index.ts";
import { castOf } from "../../support/cast-of.ts";

const TABLE = "station,depth (m),temperature (degC),salinity\nFresh,1,15,1\nFresh,2,14,2\nSalt,1,15,30\nSalt,2,14,31\n";

const castNamed = (name: string, salinity: number, deepestM = 4) =>
  castOf(
    {
      depthM: [1, 2, deepestM],
      inSituTempC: [15, 14, 12],
      practicalSalinity: [salinity, salinity + 2, salinity + 4],
    },
    { name },
  );

const surveyOf = (over: Partial<Survey> = {}): Survey => ({
  ...emptySurvey,
  name: "Spring neaps",
  casts: [castNamed("Fresh", 1), castNamed("Salt", 30)],
  basis: defaultBasis,
  levels: [{ id: "level-1" as LevelId, name: "Intake", depthM: 3 }],
  ...over,
});

describe("governingCast", () => {
  it("is the cast whose water is heaviest above the level", () => {
    const solved = solve(surveyOf());
    expect(governingCast(solved, 0)?.name).toBe("Salt");
    expect(governingCast(solved, 0)?.gaugePressureKPa).toBe(solved[1]!.solution!.levels.gaugePressureKPa[0]);
  });

  it("is nobody without casts, and at a level below every bed", () => {
    expect(governingCast([], 0)).toBeNull();
    const basis = { ...defaultBasis, bedDepthM: 5 };
    const levels = [{ id: "a" as LevelId, name: "a", depthM: 6 }];
    expect(governingCast(solve(surveyOf({ basis, levels })), 0)).toBeNull();
  });
});

describe("sharing out the work", () => {
  it("keeps a result as long as cast, basis and levels are the same", () => {
    const survey = surveyOf();
    const solved = { survey, casts: solve(survey) };
    const more = { ...survey, name: "Renamed", casts: [...survey.casts, castNamed("New", 5)] };
    expect(stillValid(solved, more).map(({ cast }) => cast.name)).toEqual(["Fresh", "Salt"]);
    expect(stillValid(solved, { ...survey, basis: { ...defaultBasis } })).toEqual([]);
    expect(stillValid(solved, { ...survey, preparation: { ...survey.preparation } })).toEqual([]);
    expect(stillValid(solved, { ...survey, levels: [] }).length).toBe(2);
  });

  it("solves again only the cast that was flagged", () => {
    const casts = [castNamed("Fresh", 1), { ...castNamed("Salt", 30), id: "salt" as CastId }];
    const survey = surveyOf({ casts });
    const flagged = addFlagEdits(survey, { castId: "salt" as CastId, fromIndex: 0, toIndex: 0 }, 4);
    const valid = stillValid({ survey, casts: solve(survey) }, flagged);
    expect(valid.map(({ cast }) => cast.name)).toEqual(["Fresh"]);
    expect(stillValid({ survey: flagged, casts: solve(flagged) }, { ...flagged, name: "x" }).length).toBe(2);
  });

  it("takes casts from the front up to a limit of samples, and at least one", () => {
    const withN = (n: number) => ({ ...castNamed("c", 1), samples: { ...castNamed("c", 1).samples, n } });
    const casts = [withN(3000), withN(900), withN(200), withN(1)];
    expect(nextShare(casts)).toEqual(casts.slice(0, 2));
    expect(nextShare([withN(100_000), withN(1)]).length).toBe(1);
    expect(nextShare([])).toEqual([]);
  });
});

describe("saved state", () => {
  const survey = surveyOf();
  const state = { ...initialState, history: startHistory({ ...emptyWork, survey }) };
  const keys = new Map(survey.casts.map(({ name, samples }) => [samples, `key of ${name}`]));
  const pack = statePacker((samples) => keys.get(samples)!);
  const samplesByKey = new Map(survey.casts.map(({ name, samples }) => [`key of ${name}`, samples]));

  it("names the samples by key, makes anew only what changed, and comes back whole", () => {
    const saved = pack(state);
    expect([...samplesKeysOf(saved)]).toEqual(["key of Fresh", "key of Salt"]);
    expect(JSON.stringify(saved)).not.toContain("inSituTempC");
    expect(pack({ ...state, system: "US" }).history.present).toBe(saved.history.present);
    expect(takeUp(structuredClone(saved), samplesByKey)).toEqual(state);
  });

  it("leaves out casts whose samples are lost", () => {
    const [first] = samplesByKey;
    const { casts } = takeUp(pack(state), new Map([first!])).history.present.survey;
    expect(casts.map(({ name }) => name)).toEqual(["Fresh"]);
  });

  it("completes work that was saved before a part of the survey existed", () => {
    const { levels: _, ...older } = survey;
    const { airPressureKPa: __, ...olderBasis } = survey.basis;
    const before = {
      ...state,
      history: startHistory({ ...emptyWork, survey: { ...older, basis: olderBasis } as Survey }),
    };
    expect(takeUp(pack(before), samplesByKey).history.present.survey).toEqual({ ...survey, levels: [] });
  });
});

describe("plumb line by keyboard", () => {
  const at = { depthM: 2, deepestM: 20 };

  it("steps a tenth of the unit shown, a twentieth of the axis, or to an end", () => {
    expect(steppedDepthM("ArrowDown", at, "SI")).toBe(2.1);
    expect(steppedDepthM("ArrowUp", { ...at, depthM: 0.05 }, "SI")).toBe(0);
    expect(steppedDepthM("PageDown", at, "SI")).toBe(3);
    expect(steppedDepthM("End", at, "SI")).toBe(20);
    expect(steppedDepthM("Home", at, "SI")).toBe(0);
    expect(steppedDepthM("a", at, "SI")).toBeNull();
  });

  it("steps in feet under US units", () => {
    // 1 ft is 0.3048 m.
    expect(steppedDepthM("ArrowDown", { depthM: 3.048, deepestM: 20 }, "US")).toBeCloseTo(3.07848, 6);
  });
});

describe("what stands behind a depth", () => {
  it("tells samples from held water and from no water", () => {
    const { column } = solve(surveyOf({ basis: { ...defaultBasis, bedDepthM: 5 } }))[0]!.solution!;
    expect(behindDepth(column, 0.5)).toBe("above-first-sample");
    expect(behindDepth(column, 1)).toBe("sampled");
    expect(behindDepth(column, 4)).toBe("sampled");
    expect(behindDepth(column, 4.5)).toBe("below-last-sample");
    expect(behindDepth(column, 5.5)).toBe("no-water");
    expect(behindDepth(column, Number.NaN)).toBe("no-water");
  });

  it("finds the buoyancy frequency between the samples around a depth", () => {
    const { profile } = solve(surveyOf())[0]!.solution!;
    const perS2 = profile.buoyancyFrequencySquaredPerS2;
    expect(buoyancyAround(profile, 1.5)).toBe(perS2[1]);
    expect(buoyancyAround(profile, 3)).toBe(perS2[2]);
    expect(buoyancyAround(profile, 0.5)).toBeNaN();
    expect(buoyancyAround(profile, 9)).toBeNaN();
    expect(strongestStratification(profile)).toEqual({ perS2: perS2[1], depthM: 1.5 });
  });
});

describe("exportFiles", () => {
  const read = readCastFile("spring.csv", new TextEncoder().encode(TABLE));
  if (!read.ok) throw new Error("unreadable");
  const { casts: readCasts, ...reading } = read.value;
  const survey = surveyOf({ casts: readCasts });
  const casts = solve(survey);
  const readings = [{ ...reading, sha256: "ab" }];
  const source = { survey, casts, inHand: casts[1]!, readings };

  it("puts metadata with the checksum beside each table", () => {
    const [table, metadata] = exportFiles("cast-profile", source);
    expect(table!.name).toBe("salt-profile.csv");
    expect(table!.text.split("\n")[1]).toMatch(/^Salt,0,/);
    expect(metadata!.name).toBe("salt-profile.csv-metadata.json");
    expect(JSON.parse(metadata!.text)).toMatchObject({
      url: "salt-profile.csv",
      notes: [{ sources: [{ sha256: "ab" }] }],
    });
  });

  it("names files after the survey, in letters every file system takes", () => {
    const named = { ...source, survey: { ...survey, name: "../Été: 2026 / α" } };
    expect(exportFiles("levels", named)[0]!.name).toBe("e-te-2026-α-levels.csv");
    expect(exportFiles("everything", { ...source, survey: { ...survey, name: "" } })[0]!.name).toBe("survey.json");
  });
});

describe("shown numbers", () => {
  it("carries unit and true minus, and a dash for what does not exist", () => {
    expect(shownValue(-0.5, "departure", "SI")).toBe("−0.500\u00a0kPa");
    expect(shownValue(3.048, "depth", "US")).toBe("10.00\u00a0ft");
    expect(shownValue(Number.NaN, "elevation", "SI")).toBe("–");
    expect(shownValue(0.00245, "buoyancyFrequencySquared", "SI")).toBe("2.45×10⁻³\u00a0s⁻²");
    expect(shownPercent(-0.01234)).toBe("−1.234");
  });
});
