import { describe, expect, test } from "vitest";
import { codesOf, errorsOf, questionOf, readText } from "./reading.ts";

const messageOf = (content: string | Uint8Array, code: string): string => {
  const errors = errorsOf(content);
  expect(codesOf(errors)[0]).toBe(code);
  expect(errors[0]!.severity).toBe("error");
  return errors[0]!.message;
};

describe("one clear line for each", () => {
  test.each([
    ["no bytes", ""],
    ["blank lines", "\n \n\t\n"],
    ["a byte-order mark alone", "\ufeff"],
  ])("%s", (_, text) => {
    expect(messageOf(text, "empty-file")).toContain("the file is empty");
  });

  test.each([
    ["a workbook", [0x50, 0x4b, 0x03, 0x04, 0x14], "workbook (xlsx)"],
    ["an old workbook", [0xd0, 0xcf, 0x11, 0xe0, 0xa1], "old workbook (xls)"],
    ["netCDF-4", [0x89, 0x48, 0x44, 0x46, 0x0d], "netCDF-4"],
    ["classic netCDF", [0x43, 0x44, 0x46, 0x01, 0x00], "netCDF"],
  ])("%s is named, and the way out", (_, bytes, name) => {
    const message = messageOf(Uint8Array.from(bytes), "format-not-read");
    expect(message).toContain(name);
    expect(message).toContain("export the table as CSV");
  });

  test("other bytes", () => {
    messageOf(
      Uint8Array.from({ length: 300 }, (_, i) => (i * 7) % 256),
      "not-text",
    );
  });

  test.each([
    ["prose", "It was a calm day, the sea was flat.\nWe lowered the probe, twice, and went home.\n"],
    ["numbers in prose", "We went out on 3 May.\nAt 10, 20 and 30 m it was cold.\n"],
    ["one word", "depth"],
  ])("%s", (_, text) => {
    expect(messageOf(text, "no-table")).toContain("expected a row of headers");
  });

  test("numbers without headers: the columns go by their places", () => {
    const reading = readText("1,10,30\n2,10,30\n3,10,30\n");
    expect(reading.headers).toEqual(["#1", "#2", "#3"]);
    expect(reading.headerLineIndex).toBe(0);
    expect(reading.issues[0]!.message).toContain("say what they are, as in depth=#1:m");
    expect(reading.questions.map((question) => question.code)).toEqual(["no-depth-column", "no-temperature-column"]);
  });

  test("no depth: the headers found and what is expected, and which column of numbers could be meant", () => {
    const question = questionOf(readText("Level,Temp (C),Sal\n1,10,30\n2,10,30\n"), "no-depth-column");
    expect(question.message).toContain('among "Level", "Temp (C)", "Sal"');
    expect(question.message).toContain('"Depth (m)"');
    expect(question.choices[0]!.label).toBe('"Level" is depth in m');
  });

  test("no temperature", () => {
    expect(messageOf("Depth (m),Sal\n1,30\n2,30\n", "no-temperature-column")).toContain('"Temperature (degC)"');
  });

  test("no known name at all gives both questions, and no cast", () => {
    const reading = readText("a,b,c\n1,10,30\n2,10,30\n");
    expect(reading.questions.map((question) => question.code)).toEqual(["no-depth-column", "no-temperature-column"]);
    expect(reading.casts).toEqual([]);
  });

  test("headers and nothing below", () => {
    messageOf("Depth (m),Temp (C),Sal\n", "no-depth-column");
  });

  test("one sample", () => {
    expect(messageOf("Depth (m),Temp (C)\n1,10\n", "too-few-samples")).toBe(
      "one sample in the file; a cast needs at least two",
    );
  });

  test("no row that can be used: the reasons follow", () => {
    expect(codesOf(errorsOf("Depth (m),Temp (C)\n1,\n,10\n2,NA\n"))).toEqual([
      "too-few-samples",
      "no-depth",
      "no-temperature",
    ]);
  });

  test("depth counted upwards: a question, and the sign is changed when it is answered so", () => {
    const text = "Depth (m),Temp (C)\n-1,10\n-2,9\n-3,8\n";
    const question = questionOf(readText(text), "depth-upside-down");
    expect(question.message).toContain("change the sign");
    expect(readText(text).casts).toEqual([]);
    const answered = readText(text, { columns: [question.choices[0]!.answer] });
    expect([...answered.casts[0]!.samples.depthM!]).toEqual([1, 2, 3]);
  });

  test("decimal commas between delimiting commas", () => {
    const text = "Depth (m),Temp (C),Sal\n0,5,12,25,3,5\n1,0,12,1,4,1\n1,5,11,7,20,5\n";
    expect(messageOf(text, "rows-too-wide")).toContain("write decimals with a point");
  });

  test("a list of stations", () => {
    messageOf("Station,Lat,Lon,Depth (m)\nA,51,-3,10\nB,51.1,-3,12\n", "station-list");
  });
});
