import { describe, expect, test } from "vitest";
import { headerKey, parseAnswers, type ReadingAnswers } from "../../../src/cast/index.ts";
import { codesOf, issueOf, onlyCast, questionOf, readText } from "./reading.ts";

const said = (text: string): ReadingAnswers => {
  const outcome = parseAnswers(text);
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("\n"));
  return outcome.value;
};

const refusedFor = (text: string): readonly string[] => {
  const outcome = parseAnswers(text);
  if (outcome.ok) throw new Error("understood, expected errors");
  return outcome.issues.map((issue) => issue.message);
};

describe("what is said on the command line", () => {
  test.each([
    ["depth=Depth_ft:ft", { header: "Depth_ft", role: "depth", unit: "ft" }],
    ["temperature=T1", { header: "T1", role: "temperature", unit: null }],
    ["specific conductance = SC : uS/cm", { header: "SC", role: "specificConductance", unit: "uS/cm" }],
    ["salinity=S", { header: "S", role: "practicalSalinity", unit: null }],
    ["pressure=P:kPa", { header: "P", role: "seaPressure", unit: "kPa" }],
    ["absolute pressure=P:psi", { header: "P", role: "absolutePressure", unit: "psi" }],
    ["unused=T2", { header: "T2", role: "unused", unit: null }],
    ["date=Day:day-first", { header: "Day", role: "date", unit: "day-first" }],
    ["dateTime=t:hours since 2020-01-01", { header: "t", role: "dateTime", unit: "hours since 2020-01-01" }],
    ["depth=D:m decimal-comma", { header: "D", role: "depth", unit: "m decimal-comma" }],
    ["depth=#2:m", { header: "#2", role: "depth", unit: "m" }],
    ['depth="Depth, below: surface":m', { header: "Depth, below: surface", role: "depth", unit: "m" }],
    ['depth="6\\" probe"', { header: '6" probe', role: "depth", unit: null }],
  ])("%s", (text, answer) => {
    expect(said(text).columns).toEqual([answer]);
  });

  test("several answers", () => {
    expect(said("depth=D:ft, temperature=T").columns.length).toBe(2);
  });

  test("an unknown role lists the roles", () => {
    expect(refusedFor("wetness=T1")[0]).toMatch(/^"wetness" is no role of a column; expected one of depth, .*unused$/);
  });

  test("an unknown unit lists the units of the role", () => {
    expect(refusedFor("temperature=T1:degR")[0]).toContain(
      '"degR" is no unit of temperature; expected one of degC, degF, degC68, K',
    );
  });

  test.each(["", "depth", "depth=", "depth=:ft"])("%j is not understood", (text) => {
    expect(refusedFor(text).length).toBe(1);
  });
});

describe("answers stand above what the file says", () => {
  const TEXT = "A,B,C\n1,50,3\n2,41,4\n";

  test("columns without a known name", () => {
    const reading = readText(TEXT, said("depth=A:ft,temperature=B:degF,salinity=C"));
    const { samples } = onlyCast(reading);
    expect([...samples.depthM!]).toEqual([0.3048, 0.6096]);
    expect(samples.inSituTempC[0]).toBe(10);
    expect([...samples.practicalSalinity!]).toEqual([3, 4]);
    expect(reading.questions).toEqual([]);
    expect(reading.columns[0]).toMatchObject({ confidence: "sure", reason: "As you said depth; ft, as you said." });
  });

  test("columns without any header, by their places", () => {
    const { samples } = onlyCast(readText("1,50,3\n2,41,4\n", said("depth=#1:m,temperature=#2:degF,salinity=#3")));
    expect([...samples.depthM!]).toEqual([1, 2]);
    expect([...samples.practicalSalinity!]).toEqual([3, 4]);
    expect(samples.inSituTempC[0]).toBe(10);
  });

  test("a column may be left out", () => {
    const reading = readText("Depth (m),Temp (C),Sal\n1,10,3\n2,9,4\n", said("unused=Sal"));
    expect(onlyCast(reading).samples.practicalSalinity).toBeNull();
    expect(reading.columns[2]!.reason).toBe("Not used: as you said.");
  });

  test("another column takes the role", () => {
    const reading = readText("Depth (m),Temp (C),T2\n1,10,3\n2,9,4\n", said("temperature=T2"));
    expect(onlyCast(reading).samples.inSituTempC[0]).toBe(3);
    expect(reading.columns[1]!.reason).toContain("as you said");
  });

  test("names that repeat are told apart by their place", () => {
    const reading = readText("Depth (m),T,T\n1,10,3\n2,9,4\n", said("temperature=T#2:degC"));
    expect(onlyCast(reading).samples.inSituTempC[0]).toBe(3);
  });

  test("every choice of a question answers it", () => {
    const text = "Depth (m),Temp,Cond\n1,40,15\n2,39,15\n";
    const question = questionOf(readText(text), "no-unit-temperature");
    for (const { answer } of question.choices.filter((choice) => choice.answer.role !== "unused")) {
      const reading = readText(text, { columns: [answer] });
      expect(reading.questions.map((open) => open.code)).toEqual(["no-unit-conductivity"]);
      expect(reading.casts.length).toBe(1);
    }
  });

  test("what is said about a column that is not there is named", () => {
    const reading = readText("Depth (m),Temp (C)\n1,10\n2,9\n", said("depth=Tiefe:m"));
    expect(issueOf(reading.issues, "answer-not-used").message).toContain('no column is named "Tiefe"');
  });

  test("pressure is gauge or absolute as the user says", () => {
    const text = "Pressure (dbar),Temp (C)\n10.2,10\n15,9\n";
    const [absolute, gauge] = questionOf(readText(text), "pressure-may-be-absolute").choices;
    const first = (choice: typeof gauge): number | undefined =>
      readText(text, { columns: [choice!.answer] }).casts[0]!.samples.seaPressureDbar?.[0];
    expect(first(gauge)).toBe(10.2);
    expect(first(absolute)).toBe(10.2 - 10.1325);
  });

  test("day first or month first, as the user says", () => {
    const text = "Date,Depth (m),Temp (C)\n2/8/17,1,10\n2/8/17,2,9\n";
    const times = questionOf(readText(text), "date-order").choices.map(
      ({ answer }) => readText(text, { columns: [answer] }).casts[0]!.time,
    );
    expect(times).toEqual(["2017-02-08", "2017-08-02", null]);
  });
});

test("files with the same headers share a key", () => {
  const key = (text: string): string => headerKey(readText(text));
  expect(key("Depth (m),T (C)\n1,2\n3,4\n")).toBe(key("# other\nDepth (m);T (C)\n5;6\n7;8\n"));
  expect(key("Depth (m),T (C)\n1,2\n3,4\n")).not.toBe(key("T (C),Depth (m)\n1,2\n3,4\n"));
});

test("what was said about files that need no answer changes nothing", () => {
  expect(codesOf(readText("Depth (m),Temp (C),Sal\n1,10,3\n2,9,4\n", { columns: [] }).issues)).toEqual([]);
});

test.each(["constructor=X", "toString=X", "depth=D:m constructor", "dateTime=t:constructor since 2020-01-01"])(
  "words that a program knows are no words of ours: %s",
  (text) => {
    expect(refusedFor(text).length).toBe(1);
  },
);

test("to leave out the second of two columns of one name leaves the first alone", () => {
  const text = "Depth (m),Temp,Temp\n1,40,10\n2,39,9\n";
  const names = questionOf(readText(text), "same-name-twice").choices.map(({ answer }) => [answer.header, answer.role]);
  expect(names).toEqual([
    ["Temp#1", "temperature"],
    ["Temp#2", "temperature"],
    ["Temp#1", "unused"],
  ]);
});
